#pragma once

#include <cstdlib>
#include <fstream>
#include <stdexcept>
#include <string>
#include <vector>

namespace ringward::testing {

/// A table under tests/published/: comment lines with its source, a header, rows of text.
class PublishedTable {
 public:
  explicit PublishedTable(const std::string& file) : file_(file) {
    std::ifstream in(std::string(RINGWARD_SOURCE_DIR) + "/tests/published/" + file);
    std::string line;
    while (std::getline(in, line)) {
      if (line.empty() || line.front() == '#') continue;
      if (header_.empty()) {
        header_ = split(line);
      } else {
        rows_.push_back(split(line));
      }
    }
    if (rows_.empty()) throw std::runtime_error("no rows in tests/published/" + file);
  }

  [[nodiscard]] std::size_t size() const { return rows_.size(); }

  [[nodiscard]] const std::string& text(std::size_t row, const std::string& column) const {
    for (std::size_t i = 0; i < header_.size(); ++i) {
      if (header_[i] == column) return rows_.at(row).at(i);
    }
    throw std::runtime_error("no column " + column + " in tests/published/" + file_);
  }

  [[nodiscard]] bool is_blank(std::size_t row, const std::string& column) const {
    return text(row, column).empty();
  }

  [[nodiscard]] double number(std::size_t row, const std::string& column) const {
    const std::string& field = text(row, column);
    char* end = nullptr;
    const double value = std::strtod(field.c_str(), &end);
    if (field.empty() || *end != '\0') {
      throw std::runtime_error("not a number in tests/published/" + file_ + ": \"" + field + "\"");
    }
    return value;
  }

 private:
  /// Fields between commas; a comma inside double quotes belongs to its field.
  [[nodiscard]] static std::vector<std::string> split(const std::string& line) {
    std::vector<std::string> fields(1);
    bool quoted = false;
    for (const char c : line) {
      if (c == '"') {
        quoted = !quoted;
      } else if (c == ',' && !quoted) {
        fields.emplace_back();
      } else {
        fields.back() += c;
      }
    }
    return fields;
  }

  std::string file_;
  std::vector<std::string> header_;
  std::vector<std::vector<std::string>> rows_;
};

}  // namespace ringward::testing
