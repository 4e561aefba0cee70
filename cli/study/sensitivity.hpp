#pragma once

#include <optional>
#include <string>
#include <vector>

#include "cli/input/toml_reading.hpp"
#include "cli/study/layout_row.hpp"
#include "cli/study/uncertain_inputs.hpp"

namespace ringward::cli {

/// The answer with one input at one of its values.
struct SensitivityAnswer {
  std::optional<Verdict> verdict;
  std::string reason;  ///< why there is none

  /// Fire resistance, or what was followed where the column survives [min].
  [[nodiscard]] std::optional<double> time_min() const;
};

struct SensitivityRow {
  UncertainInput input;
  SensitivityAnswer at_low;
  SensitivityAnswer at_high;

  /// From the shortest to the longest of the answers at low, base and high [min].
  [[nodiscard]] double span_min(double base_min) const;
};

struct SensitivityReport {
  std::string title;
  std::string input_sha256;
  LayoutRow base;
  std::vector<SensitivityRow> rows;  ///< the one that moves the fire resistance most comes first
};

/// Rates the column with each uncertain input at its low and at its high value, one at a time.
/// @param jobs threads; 0: as many as there are cores. Changes no result
/// @throws Error(bad_input) for the column itself; Error(solver_breakdown) when it has no solution
[[nodiscard]] SensitivityReport sensitivity_of(const InputSource& source,
                                               const std::vector<std::string>& overrides,
                                               std::size_t jobs);

}  // namespace ringward::cli
