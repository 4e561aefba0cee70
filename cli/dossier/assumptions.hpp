#pragma once

#include <optional>
#include <string>
#include <vector>

#include "cli/input/column_input.hpp"
#include "cli/input/toml_reading.hpp"
#include "cli/output/rate_report.hpp"

namespace ringward::cli {

/// One thing that was assumed, or chosen, in place of another.
struct OtherChoice {
  std::string what;                         ///< "Contact resistance between tube and core"
  std::string used;                         ///< value and unit
  std::string other;                        ///< value and unit
  std::string why;                          ///< why the value used was taken
  std::vector<std::string> overrides = {};  ///< that make the other choice
};

/// The other choice with the answer that it gives.
struct AssumptionRow {
  OtherChoice choice = {};
  std::optional<double> fire_resistance_min = {};  ///< none: survives, or no result
  bool survives = false;
  std::string problem = {};  ///< why there is no result

  [[nodiscard]] bool has_result() const { return problem.empty(); }
};

/// What could have been chosen otherwise for this column, in a fixed order.
[[nodiscard]] std::vector<OtherChoice> other_choices(const ColumnInput& input);

/// Rates the column again with each other choice, several at a time; the order is that of the
/// choices. Confinement models come from the bounds of the rating.
[[nodiscard]] std::vector<AssumptionRow> rerun(const InputSource& source,
                                               const std::vector<std::string>& overrides,
                                               const std::vector<OtherChoice>& choices);

}  // namespace ringward::cli
