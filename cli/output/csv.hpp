#pragma once

#include <optional>
#include <string>
#include <vector>

namespace ringward::cli {

/// A CSV text after RFC 4180, with a header row, "." as decimal mark and LF as line end.
class CsvTable {
 public:
  explicit CsvTable(const std::vector<std::string>& header) { add(header); }

  /// Appends one row; cells with a comma, a quote or a line break are quoted.
  void add(const std::vector<std::string>& cells);

  [[nodiscard]] const std::string& text() const { return text_; }

 private:
  std::string text_;
};

/// A number for a CSV cell: rounded, without superfluous zeros; empty when there is none.
[[nodiscard]] std::string csv_number(const std::optional<double>& value, int digits);

}  // namespace ringward::cli
