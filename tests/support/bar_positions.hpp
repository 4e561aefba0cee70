#pragma once

#include <cmath>
#include <vector>

#include "thermal/base/units.hpp"
#include "thermal/section/section.hpp"

namespace ringward::testing {

/// Bars on a circle, the first on +x.
[[nodiscard]] inline std::vector<thermal::Point> bars_in_a_ring(int count, double radius_m) {
  std::vector<thermal::Point> at;
  for (int k = 0; k < count; ++k) {
    const double angle = 2.0 * units::kPi * k / count;
    at.push_back({radius_m * std::cos(angle), radius_m * std::sin(angle)});
  }
  return at;
}

/// Four bars at the corners of a square; eight: four more in the middle of its sides.
[[nodiscard]] inline std::vector<thermal::Point> bars_in_a_square(int count, double half_side_m) {
  const double a = half_side_m;
  std::vector<thermal::Point> at = {{a, a}, {-a, a}, {-a, -a}, {a, -a}};
  if (count == 8) at.insert(at.end(), {{a, 0}, {0, a}, {-a, 0}, {0, -a}});
  return at;
}

/// The diameter of `count` equal bars with this area in all.
[[nodiscard]] inline double bar_diameter_m(double area_m2, int count) {
  return std::sqrt(4.0 * area_m2 / (units::kPi * count));
}

}  // namespace ringward::testing
