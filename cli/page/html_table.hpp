#pragma once

#include <string>
#include <vector>

#include "cli/page/markup.hpp"

namespace ringward::cli {

enum class CellKind { words, number };

/// A table with a caption, a row of headings, and a heading in the first cell of each row.
class HtmlTable {
 public:
  struct Column {
    std::string name;
    std::string unit = {};  ///< below the name
    CellKind kind = CellKind::words;
    int share_percent = 0;  ///< of the width; 0 leaves it to the browser
  };

  HtmlTable(std::string caption, std::vector<Column> columns)
      : caption_(std::move(caption)), columns_(std::move(columns)) {}

  /// Appends a row of plain text, escaped; one cell a column.
  void add(const std::vector<std::string>& cells);
  void add_marked(std::vector<Markup> cells) { rows_.push_back(std::move(cells)); }

  [[nodiscard]] bool is_empty() const { return rows_.empty(); }
  [[nodiscard]] Markup markup() const;

 private:
  [[nodiscard]] bool has_shares() const;
  [[nodiscard]] std::string widths() const;
  [[nodiscard]] std::string heading() const;
  [[nodiscard]] std::string body() const;

  std::string caption_;
  std::vector<Column> columns_;
  std::vector<std::vector<Markup>> rows_;
};

}  // namespace ringward::cli
