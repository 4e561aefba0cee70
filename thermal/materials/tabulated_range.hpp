#pragma once

#include "thermal/base/piecewise_linear.hpp"

namespace ringward::thermal {

/// Range in which a pair of tables holds values of its own; a single point is a constant without
/// limits.
struct TabulatedRange {
  double from_C = 0;
  double to_C = 0;
};

[[nodiscard]] TabulatedRange common_range(const PiecewiseLinear& a, const PiecewiseLinear& b);

/// The points' temperatures of both tables, sorted, each once; of a constant none.
[[nodiscard]] std::vector<double> kinks_of(const PiecewiseLinear& a, const PiecewiseLinear& b);

/// @throws Error(bad_input) unless every value of the table is above zero
void require_positive(const PiecewiseLinear& table, const char* what);

}  // namespace ringward::thermal
