#pragma once

#include <string>
#include <vector>

#include "cli/input/input_tree.hpp"

namespace ringward::cli {

/// Everything that is wrong with an input, gathered so that it is reported together.
class Problems {
 public:
  explicit Problems(std::string file_name) : file_name_(std::move(file_name)) {}

  /// @param text what is wrong, the value, the limit and what to do
  void add(const Location& location, const std::string& key, const std::string& text);
  /// A line that carries its own place (a CSV file), reported with what `location` points at.
  void add_foreign(const Location& location, const std::string& line);

  [[nodiscard]] bool empty() const { return problems_.empty(); }
  [[nodiscard]] const std::string& file_name() const { return file_name_; }

  /// @throws Error(bad_input) with one line a problem, sorted by position; overrides come last
  void throw_if_any() const;

 private:
  struct Problem {
    Location location;
    std::string line;
  };
  std::string file_name_;
  std::vector<Problem> problems_;
};

}  // namespace ringward::cli
