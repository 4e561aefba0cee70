#pragma once

#include <string>
#include <vector>

#include "tests/cli/commands/run_process.hpp"

namespace ringward::testing {

/// A folder with an invented round column and a study of it, both coarse and quick to rate.
class StudyFolder {
 public:
  /// @param layouts the part of the study file that lists them
  explicit StudyFolder(const std::string& layouts);

  [[nodiscard]] std::string operator/(const std::string& name) const { return folder_ / name; }
  [[nodiscard]] std::string study() const { return folder_ / "study.toml"; }
  [[nodiscard]] std::string column() const { return folder_ / "column.toml"; }

  /// Runs `ringward compare study.toml -o OUT --quiet`.
  [[nodiscard]] ProcessResult compare(const std::string& out,
                                      const std::vector<std::string>& more = {},
                                      ProcessSetup setup = {}) const;

 private:
  TemporaryFolder folder_;
};

/// results.jsonl, summary.csv and compare.html of a finished study, one after the other.
[[nodiscard]] std::string all_results(const std::string& folder);

/// The whole lines of a text.
[[nodiscard]] std::vector<std::string> whole_lines(const std::string& text);

/// A grid of loads and bars: `count` layouts that share their temperatures.
[[nodiscard]] std::string load_grid(int count);

}  // namespace ringward::testing
