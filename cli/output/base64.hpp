#pragma once

#include <string>

namespace ringward::cli {

/// Bytes as base64 with padding, on one line.
[[nodiscard]] std::string base64(const std::string& bytes);

}  // namespace ringward::cli
