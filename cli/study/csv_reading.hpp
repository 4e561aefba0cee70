#pragma once

#include <cstddef>
#include <string>
#include <vector>

namespace ringward::cli {

/// One cell of a CSV text with its place.
struct CsvCell {
  std::string text;
  std::size_t line = 1;
  std::size_t column = 1;  ///< in characters, of the cell's first one
  bool was_quoted = false;
};

struct CsvRecord {
  std::vector<CsvCell> cells;
  std::size_t line = 1;
};

/// Reads CSV text record by record (RFC 4180; LF or CRLF, a byte order mark is passed over, empty
/// lines are no records), so that a long file is never held twice.
class CsvReader {
 public:
  explicit CsvReader(const std::string& text, std::size_t offset = 0, std::size_t line = 1);

  /// @return false at the end of the text
  /// @throws Error(bad_input) naming line and column when a quoted cell does not end, or goes on
  ///   after its closing quote
  [[nodiscard]] bool next(CsvRecord& record);

  [[nodiscard]] std::size_t offset() const { return at_; }  ///< where the next record starts
  [[nodiscard]] std::size_t line() const { return line_; }

 private:
  void skip_empty_lines();
  [[nodiscard]] CsvCell take_cell();
  [[nodiscard]] CsvCell take_quoted();
  [[nodiscard]] bool at_line_end() const;
  void take_line_end();
  void advance();

  const std::string& text_;
  std::size_t at_;
  std::size_t line_;
  std::size_t column_ = 1;
};

}  // namespace ringward::cli
