#pragma once

#include <string>
#include <vector>

namespace ringward::testing {

inline constexpr unsigned kUncertaintyColumns = 48;

/// One generated column: its fire resistance at standard accuracy, the uncertainty stated with it,
/// and its error against the fine grid.
struct UncertaintyRow {
  unsigned index = 0;
  std::string column;  ///< in words
  double load_kN = 0;
  double R_min = 0;
  double stated_s = 0;
  double error_s = 0;
  std::string breakdown = {};  ///< why there is no answer: counts as not covered

  [[nodiscard]] bool covered() const;
};

/// Rates column number `index` of the generated set on both grids.
[[nodiscard]] UncertaintyRow study_uncertainty(unsigned index);

[[nodiscard]] std::string csv_head();
[[nodiscard]] std::string csv_line(const UncertaintyRow& row);

/// The rows of tests/validation/uncertainty_study.csv.
[[nodiscard]] std::vector<UncertaintyRow> stored_uncertainty_rows();

}  // namespace ringward::testing
