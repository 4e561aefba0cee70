#include "cli/output/text_table.hpp"

#include <fmt/format.h>

#include <algorithm>

#include "cli/output/numbers.hpp"

namespace ringward::cli {

void TextTable::add(const std::vector<std::optional<double>>& numbers) {
  std::vector<std::string> cells;
  for (std::size_t i = 0; i < numbers.size(); ++i) {
    cells.push_back(fixed(numbers[i], columns_.at(i).digits));
  }
  add_cells(std::move(cells));
}

void TextTable::add(const std::string& first, const std::vector<std::optional<double>>& numbers) {
  std::vector<std::string> cells{first};
  for (std::size_t i = 0; i < numbers.size(); ++i) {
    cells.push_back(fixed(numbers[i], columns_.at(i + 1).digits));
  }
  add_cells(std::move(cells));
}

std::size_t TextTable::width(std::size_t column) const {
  std::size_t width = std::max(columns_[column].name.size(), columns_[column].unit.size());
  for (const auto& row : rows_) width = std::max(width, row[column].size());
  return width;
}

bool TextTable::is_empty(std::size_t column) const {
  return !rows_.empty() && std::all_of(rows_.begin(), rows_.end(),
                                       [column](const auto& row) { return row[column] == "-"; });
}

std::string TextTable::text() const {
  std::vector<std::string> lines(rows_.size() + 2);
  for (std::size_t column = 0; column < columns_.size(); ++column) {
    if (is_empty(column)) continue;
    const std::size_t space = width(column) + 2;
    lines[0] += fmt::format("{:>{}}", columns_[column].name, space);
    lines[1] += fmt::format("{:>{}}", columns_[column].unit, space);
    for (std::size_t i = 0; i < rows_.size(); ++i) {
      lines[i + 2] += fmt::format("{:>{}}", rows_[i][column], space);
    }
  }
  std::string text;
  for (const std::string& line : lines)
    text += line.substr(0, line.find_last_not_of(' ') + 1) + "\n";
  return text;
}

}  // namespace ringward::cli
