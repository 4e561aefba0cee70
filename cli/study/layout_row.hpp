#pragma once

#include <cstddef>
#include <optional>
#include <string>
#include <vector>

#include "cli/input/input_values.hpp"
#include "cli/output/verdict.hpp"
#include "cli/study/material_amounts.hpp"
#include "thermal/base/notice.hpp"

namespace ringward::cli {

/// What a study keeps of one rated layout.
struct LayoutRow {
  std::size_t index = 0;  ///< in the study, from 0
  std::string name;
  std::string input_sha256;
  std::optional<Verdict> verdict;  ///< none: no solution
  std::string criterion;
  std::string reason;                             ///< why there is no solution
  std::optional<double> utilisation_at_required;  ///< none: nothing required, or it fell before
  MaterialAmounts amounts;
  double protection_mm = 0;
  std::vector<EchoEntry>
      values;  ///< of the keys that the study varies; none where it has no such key
  Notices cautions;

  /// Above zero: longer than required, after the uncertainty is taken off.
  [[nodiscard]] std::optional<double> margin_min() const;
};

/// One line of results.jsonl, with its line end.
[[nodiscard]] std::string row_line(const LayoutRow& row);

/// @param line without its line end
/// @throws Error(bad_input) when it is no line that row_line() wrote
[[nodiscard]] LayoutRow row_of_line(const std::string& line);

}  // namespace ringward::cli
