#pragma once

#include <string>

namespace ringward::cli {

/// A commented starter file, itself a valid column: required keys with values, optional keys
/// commented out with their default or an example.
/// @param shape "circular", "square" or "rectangular"
/// @throws Error(bad_input) for another shape
[[nodiscard]] std::string new_file_text(const std::string& shape);

}  // namespace ringward::cli
