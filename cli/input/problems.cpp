#include "cli/input/problems.hpp"

#include <algorithm>
#include <tuple>

#include "thermal/base/error.hpp"

namespace ringward::cli {

void Problems::add(const Location& location, const std::string& key, const std::string& text) {
  problems_.push_back({location, describe(location, file_name_) + ": " +
                                     (key.empty() ? std::string() : key + ": ") + text});
}

void Problems::add_foreign(const Location& location, const std::string& line) {
  problems_.push_back({location, line});
}

void Problems::throw_if_any() const {
  if (problems_.empty()) return;
  std::vector<Problem> sorted = problems_;
  const auto order = [](const Problem& problem) {
    const Location& at = problem.location;
    return at.override_key.empty() ? std::tuple(0ul, at.line, at.column)
                                   : std::tuple(1ul, at.override_rank, 0ul);
  };
  std::stable_sort(sorted.begin(), sorted.end(),
                   [&](const Problem& a, const Problem& b) { return order(a) < order(b); });
  std::string message;
  for (const Problem& problem : sorted) {
    if (!message.empty()) message += '\n';
    message += problem.line;
  }
  throw Error(ErrorKind::bad_input, message);
}

}  // namespace ringward::cli
