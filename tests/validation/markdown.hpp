#pragma once

#include <string>
#include <vector>

namespace ringward::testing {

/// "| a | b |\n"
[[nodiscard]] std::string markdown_row(const std::vector<std::string>& cells);

/// The row of names with the line under it.
[[nodiscard]] std::string markdown_head(const std::vector<std::string>& names);

}  // namespace ringward::testing
