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

// Nodes at z = kEnd (k / kCount)^2: close together near zero, where the curve bends.
LateralStrainCurve::LateralStrainCurve() {
  y_[0] = 0.0;
  slope_[0] = 1.0 / phi_slope(0.0);
  for (int k = 1; k <= kCount; ++k) {
    const double s = static_cast<double>(k) / kCount;
    y_[k] = solve_phi(kEnd * s * s, y_[k - 1]);
    slope_[k] = 1.0 / phi_slope(y_[k]);
  }
}

LateralStrainCurve::Ratio LateralStrainCurve::inverse(double z) const {
  if (z <= 0.0) return {.y = 0.0, .slope = z < 0.0 ? 0.0 : slope_[0]};
  if (z >= kEnd) return {.y = y_[kCount] + slope_[kCount] * (z - kEnd), .slope = slope_[kCount]};
  const int k = std::min(kCount - 1, static_cast<int>(std::sqrt(z / kEnd) * kCount));
  const double z0 = kEnd * (static_cast<double>(k) / kCount) * (static_cast<double>(k) / kCount);
  const double z1 =
      kEnd * (static_cast<double>(k + 1) / kCount) * (static_cast<double>(k + 1) / kCount);
  const double h = z1 - z0;
  const double s = (z - z0) / h;
  const double rise = y_[k + 1] - y_[k];
  const double a = h * slope_[k] - rise;
  const double b = rise - h * slope_[k + 1];
  const double y = y_[k] + s * rise + s * (1.0 - s) * (a * (1.0 - s) + b * s);
  const double dy = rise + (1.0 - 2.0 * s) * (a * (1.0 - s) + b * s) + s * (1.0 - s) * (b - a);
  return {.y = y, .slope = dy / h};
}

const LateralStrainCurve& lateral_strain_curve() {
  static const LateralStrainCurve curve;
  return curve;
}

}  // namespace ringward::mechanical
