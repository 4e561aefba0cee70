#pragma once

#include <string>

namespace ringward::cli {

/// SHA-256 of bytes as 64 lower-case hexadecimal digits.
[[nodiscard]] std::string sha256_hex(const std::string& bytes);

/// The same as its 32 bytes.
[[nodiscard]] std::string sha256_bytes(const std::string& bytes);

}  // namespace ringward::cli
