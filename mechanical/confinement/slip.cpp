#include "mechanical/confinement/slip.hpp"

#include <algorithm>
#include <cmath>

#include "thermal/base/units.hpp"

namespace ringward::mechanical {
namespace {

constexpr double kSqrt3 = 1.7320508075688772;
constexpr double kSlipEndPhi = units::kPi / 6.0;

double hoop_of(double phi) { return std::cos(phi) - std::sin(phi) / kSqrt3; }
double xi_of(double phi) { return (kSqrt3 * phi - std::log(hoop_of(phi))) / 4.0; }
double xi_slope(double phi) { return std::cos(phi) / (kSqrt3 * std::cos(phi) - std::sin(phi)); }

/// Newton on the smooth, increasing, convex xi(phi); from the right end it converges monotonically.
double phi_of(double xi) {
  double phi = kSlipEndPhi;
  for (int iteration = 0; iteration < 50; ++iteration) {
    const double change = (xi_of(phi) - xi) / xi_slope(phi);
    phi -= change;
    if (std::abs(change) < 1e-15) break;
  }
  return phi;
}

}  // namespace

double slip_end_xi() { return xi_of(kSlipEndPhi); }

WallStress wall_stress(double xi) {
  const double phi = xi >= slip_end_xi() ? kSlipEndPhi : phi_of(std::max(xi, 0.0));
  return {.hoop = hoop_of(phi), .axial = 2.0 / kSqrt3 * std::sin(phi)};
}

TubeProfile tube_profile(double friction, double inner_diameter_m, double clear_height_m) {
  const double xi_mid = friction * clear_height_m / (2.0 * inner_diameter_m);
  const double xi_slip = std::min(xi_mid, slip_end_xi());
  const WallStress at_mid = wall_stress(xi_slip);
  const double slip_part = at_mid.axial / 2.0;
  const double plateau_part = (xi_mid - xi_slip) * at_mid.hoop;
  return {.mid_height_hoop = at_mid.hoop,
          .mean_hoop = (slip_part + plateau_part) / xi_mid,
          .slip_length_m = xi_slip * inner_diameter_m / friction};
}

}  // namespace ringward::mechanical
