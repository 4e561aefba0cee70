#include "mechanical/confinement/slip.hpp"

#include <array>
#include <catch2/catch.hpp>
#include <cmath>

using namespace ringward::mechanical;

namespace {

struct SlipRow {
  double xi, hoop, axial;
};

/// ds_v/dxi = 2 s_h with s_h from the yield circle, by the classical Runge-Kutta rule: no closed
/// form.
double axial_by_integration(double xi_end, int steps) {
  const auto hoop = [](double v) { return 0.5 * (-v + std::sqrt(4.0 - 3.0 * v * v)); };
  const double h = xi_end / steps;
  double v = 0.0;
  for (int k = 0; k < steps; ++k) {
    const double k1 = 2.0 * hoop(v);
    const double k2 = 2.0 * hoop(v + 0.5 * h * k1);
    const double k3 = 2.0 * hoop(v + 0.5 * h * k2);
    const double k4 = 2.0 * hoop(v + h * k3);
    v += h * (k1 + 2.0 * k2 + 2.0 * k3 + k4) / 6.0;
  }
  return v;
}

}  // namespace

TEST_CASE("the slip solution has the four-digit values of its closed form") {
  // Computed by hand from the closed form of docs/theory.md (derived there, no publication);
  // the tolerance is half a unit of the fourth digit.
  const std::array<SlipRow, 6> rows{{{0.0, 1.0, 0.0},
                                     {0.1, 0.8917, 0.1894},
                                     {0.2, 0.7733, 0.3560},
                                     {0.3, 0.6527, 0.4986},
                                     {0.36405, 0.5774, 0.5773},
                                     {0.4, 0.5774, 0.5774}}};
  for (const SlipRow& row : rows) {
    CAPTURE(row.xi);
    CHECK(wall_stress(row.xi).hoop == Approx(row.hoop).margin(1e-4));
    CHECK(wall_stress(row.xi).axial == Approx(row.axial).margin(1e-4));
  }
}

TEST_CASE("the slip solution satisfies its differential equation, integrated numerically") {
  for (const double xi : {0.05, 0.15, 0.25, 0.36}) {
    // Fourth-order rule with 400 steps: error far below 1e-10.
    CHECK(wall_stress(xi).axial == Approx(axial_by_integration(xi, 400)).margin(1e-10));
  }
}

TEST_CASE("the wall is at yield everywhere in the slip zone") {
  for (double xi = 0.0; xi <= 0.5; xi += 0.01) {
    const WallStress s = wall_stress(xi);
    CHECK(s.hoop * s.hoop + s.hoop * s.axial + s.axial * s.axial == Approx(1.0).margin(1e-13));
  }
}

TEST_CASE("the mean hoop stress of the height equals the integral of its profile") {
  for (const double height_m : {0.2, 0.6, 1.5, 3.6}) {
    const double friction = 0.4;
    const double diameter_m = 0.39;
    const TubeProfile profile = tube_profile(friction, diameter_m, height_m);
    constexpr int kCount = 20000;
    double sum = 0.0;
    for (int k = 0; k < kCount; ++k) {
      const double h = (k + 0.5) / kCount * 0.5 * height_m;
      sum += wall_stress(friction * h / diameter_m).hoop / kCount;
    }
    // Midpoint rule with a kink at the end of slip: error about 1e-9.
    CHECK(profile.mean_hoop == Approx(sum).margin(1e-7));
    CHECK(profile.mid_height_hoop <= profile.mean_hoop);
  }
}

TEST_CASE("slip ends where hoop and axial stress are equal, near 0.4 D / mu") {
  // The trade's rule for the slip zone is 0.4 D / mu: common practice, no source.
  CHECK(slip_end_xi() == Approx(0.36405).margin(5e-6));
  CHECK(tube_profile(0.4, 0.39, 3.6).slip_length_m == Approx(0.36405 * 0.39 / 0.4).epsilon(1e-5));
  CHECK(tube_profile(0.4, 0.39, 0.2).slip_length_m == Approx(0.1).epsilon(1e-12));
}
