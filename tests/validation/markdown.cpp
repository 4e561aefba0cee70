#include "tests/validation/markdown.hpp"

#include <fmt/format.h>

namespace ringward::testing {

std::string markdown_row(const std::vector<std::string>& cells) {
  return fmt::format("| {} |\n", fmt::join(cells, " | "));
}

std::string markdown_head(const std::vector<std::string>& names) {
  const std::vector<std::string> line(names.size(), "---");
  return markdown_row(names) + fmt::format("|{}|\n", fmt::join(line, "|"));
}

}  // namespace ringward::testing
