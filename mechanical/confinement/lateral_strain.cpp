#include "mechanical/confinement/lateral_strain.hpp"

#include <algorithm>
#include <cmath>

namespace ringward::mechanical {
namespace {

/// Bisection-safe Newton for phi(y) = z, starting from a point left of the root.
double solve_phi(double z, double y) {
  for (int iteration = 0; iteration < 60; ++iteration) {
    const double change = (LateralStrainCurve::phi(y) - z) / LateralStrainCurve::phi_slope(y);
    y = std::max(0.0, y - change);
    if (std::abs(change) < 1e-14 * (1.0 + y)) break;
  }
  return y;
}

}  // namespace

double LateralStrainCurve::phi(double y) {
  return std::pow(1.0 + 0.75 * y, 0.7) - std::exp(-7.0 * y);
}

double LateralStrainCurve::phi_slope(double y) {
  return 0.525 * std::pow(1.0 + 0.75 * y, -0.3) + 7.0 * std::exp(-7.0 * y);
}

// Hermite cubics from the exact values and slopes at the nodes.
LateralStrainCurve::LateralStrainCurve() {
  const int count = static_cast<int>(kEnd * kPerUnit);
  const double h = 1.0 / kPerUnit;
  double y0 = 0.0;
  double slope0 = 1.0 / phi_slope(0.0);
  for (int k = 1; k <= count; ++k) {
    const double y1 = solve_phi(k * h, y0);
    const double slope1 = 1.0 / phi_slope(y1);
    const double secant = (y1 - y0) / h;
    cubics_.push_back({y0, slope0, (3.0 * secant - 2.0 * slope0 - slope1) / h,
                       (slope0 + slope1 - 2.0 * secant) / (h * h)});
    y0 = y1;
    slope0 = slope1;
  }
  last_y_ = y0;
  last_slope_ = slope0;
}

const LateralStrainCurve& lateral_strain_curve() {
  static const LateralStrainCurve curve;
  return curve;
}

}  // namespace ringward::mechanical
