#include "cli/study/csv_reading.hpp"

#include <fmt/format.h>

#include "thermal/base/error.hpp"

namespace ringward::cli {
namespace {

constexpr const char* kByteOrderMark = "\xEF\xBB\xBF";

[[noreturn]] void refuse(std::size_t line, std::size_t column, const std::string& what) {
  throw Error(ErrorKind::bad_input, fmt::format("{}:{}: {}", line, column, what));
}

std::string trimmed(const std::string& cell) {
  const std::size_t begin = cell.find_first_not_of(" \t");
  if (begin == std::string::npos) return {};
  return cell.substr(begin, cell.find_last_not_of(" \t") - begin + 1);
}

}  // namespace

CsvReader::CsvReader(const std::string& text, std::size_t offset, std::size_t line)
    : text_(text), at_(offset), line_(line) {
  if (at_ == 0 && text_.starts_with(kByteOrderMark)) at_ = 3;
}

bool CsvReader::next(CsvRecord& record) {
  skip_empty_lines();
  record.cells.clear();
  record.line = line_;
  if (at_ >= text_.size()) return false;
  for (;;) {
    record.cells.push_back(take_cell());
    if (at_ >= text_.size()) return true;
    if (at_line_end()) {
      take_line_end();
      return true;
    }
    advance();  // the comma
  }
}

void CsvReader::skip_empty_lines() {
  while (at_ < text_.size() && at_line_end()) take_line_end();
}

CsvCell CsvReader::take_cell() {
  if (at_ < text_.size() && text_[at_] == '"') return take_quoted();
  CsvCell cell{.text = {}, .line = line_, .column = column_};
  while (at_ < text_.size() && text_[at_] != ',' && !at_line_end()) {
    cell.text += text_[at_];
    advance();
  }
  cell.text = trimmed(cell.text);
  return cell;
}

CsvCell CsvReader::take_quoted() {
  CsvCell cell{.text = {}, .line = line_, .column = column_, .was_quoted = true};
  advance();
  for (;; advance()) {
    if (at_ >= text_.size()) refuse(cell.line, cell.column, "this quoted cell never ends");
    if (text_[at_] == '"') {
      advance();
      if (at_ >= text_.size() || text_[at_] != '"') break;
    }
    cell.text += text_[at_];
  }
  if (at_ < text_.size() && text_[at_] != ',' && !at_line_end()) {
    refuse(line_, column_, "text follows the closing quote of a cell; write quotes inside twice");
  }
  return cell;
}

bool CsvReader::at_line_end() const {
  return text_[at_] == '\n' || (text_[at_] == '\r' && text_.compare(at_, 2, "\r\n") == 0);
}

void CsvReader::take_line_end() {
  at_ = text_.find('\n', at_) + 1;
  ++line_;
  column_ = 1;
}

void CsvReader::advance() {
  if (text_[at_] == '\n') {
    ++line_;
    column_ = 0;
  }
  ++at_;
  ++column_;
}

}  // namespace ringward::cli
