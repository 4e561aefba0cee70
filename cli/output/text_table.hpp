#pragma once

#include <optional>
#include <string>
#include <vector>

namespace ringward::cli {

/// A table for human eyes: a line of names, a line of units, right-aligned columns.
class TextTable {
 public:
  struct Column {
    std::string name;
    std::string unit;
    int digits = 0;  ///< decimals of numbers in this column
  };

  explicit TextTable(std::vector<Column> columns) : columns_(std::move(columns)) {}

  /// Appends a row of numbers, one a column; a missing one is shown as "-".
  void add(const std::vector<std::optional<double>>& numbers);

  /// Appends a row whose first cell is a word and the rest numbers.
  void add(const std::string& first, const std::vector<std::optional<double>>& numbers);

  /// Appends a row of cells as they are to be shown, "-" for none.
  void add_cells(std::vector<std::string> cells) { rows_.push_back(std::move(cells)); }

  /// @return the lines, each indented by two spaces; columns without any number are left out
  [[nodiscard]] std::string text() const;

 private:
  [[nodiscard]] std::size_t width(std::size_t column) const;
  [[nodiscard]] bool is_empty(std::size_t column) const;

  std::vector<Column> columns_;
  std::vector<std::vector<std::string>> rows_;
};

}  // namespace ringward::cli
