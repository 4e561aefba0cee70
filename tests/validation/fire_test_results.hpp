#pragma once

#include <functional>
#include <optional>
#include <string>
#include <vector>

#include "tests/validation/fire_tests.hpp"

namespace ringward::testing {

/// A tested column, the program's answer and the simple formula's.
struct FireTestResult {
  FireTest test;
  std::optional<double> predicted_min;  ///< none: stands for twice the measured time
  double rule_min = 0;                  ///< not set for a column tested without load
  [[nodiscard]] double ratio() const { return predicted_min.value_or(0.0) / test.measured_min; }
  [[nodiscard]] double rule_ratio() const { return rule_min / test.measured_min; }
};
[[nodiscard]] std::vector<FireTestResult> fire_test_results();

/// Predicted over measured times of columns that failed under load.
struct Agreement {
  std::size_t count = 0;
  double mean = 0;
  double variation = 0;  ///< sample standard deviation over mean
};
[[nodiscard]] Agreement agreement(const std::vector<double>& ratios);

/// One assumption changed for every column of the families it concerns.
struct Variation {
  std::string name;
  bool for_concrete = true;
  bool for_tubes = true;
  std::function<void(FireTest&, Assumptions&)> change;
};
[[nodiscard]] const std::vector<Variation>& variations();

/// Predicted over measured of every failed column of a family, with one assumption changed.
[[nodiscard]] std::vector<double> varied_ratios(FireTestFamily family, const Variation& variation);

/// The time in min at which the largest force over all strains falls to the load: what a column
/// would reach that survives every drop from one branch of its path to another.
[[nodiscard]] double reserve_min(const FireTest& test);

}  // namespace ringward::testing
