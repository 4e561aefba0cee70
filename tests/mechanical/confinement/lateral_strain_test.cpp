#include "mechanical/confinement/lateral_strain.hpp"

#include <catch2/catch.hpp>
#include <cmath>

#include "mechanical/confinement/confined_concrete.hpp"

using namespace ringward::mechanical;

TEST_CASE("the tabulated lateral strain inverts its law") {
  // Teng, Huang, Lam & Ye 2007, from memory. Cubic Hermite on 8192 even nodes: a relative error
  // of 1e-7 was measured; 1e-6 leaves room.
  const LateralStrainCurve& curve = lateral_strain_curve();
  for (double z = 1e-4; z < 60.0; z *= 1.07) {
    CAPTURE(z);
    CHECK(LateralStrainCurve::phi(curve.inverse(z).y) == Approx(z).epsilon(1e-6));
  }
}

TEST_CASE("the slope of the lateral strain equals its finite difference") {
  const LateralStrainCurve& curve = lateral_strain_curve();
  for (double z = 0.01; z < 60.0; z *= 1.31) {
    CAPTURE(z);
    const double h = 1e-6 * z;
    const double difference = (curve.inverse(z + h).y - curve.inverse(z - h).y) / (2.0 * h);
    // Central difference of a C1 cubic: its second derivative jumps at nodes, of order 1e-4 here.
    CHECK(curve.inverse(z).slope == Approx(difference).epsilon(1e-3));
  }
}

TEST_CASE("concrete under a small load expands sideways by a Poisson ratio of about 0.16") {
  // phi'(0) = 0.525 + 7 and the factor 0.85 give 1 / (0.85 x 7.525) = 0.1563.
  const double small = 1e-6;
  CHECK(lateral_strain_curve().inverse(small / 0.85).y / small == Approx(0.1563).epsilon(1e-3));
}

TEST_CASE("the quadratic bound of the lateral strain is never below it") {
  // A bound by claim, not by proof: checked closer than the nodes of the table (128 a unit), in
  // whose cubics y is smooth, and beyond its end, where it goes on in a line. No tolerance.
  const LateralStrainCurve& curve = lateral_strain_curve();
  double least_margin = 1.0;
  for (int k = 1; k < 1'000'000; ++k) {
    const double z = 1e-4 * k;
    const double bound =
        LateralStrainCurve::kBoundLinear * z + LateralStrainCurve::kBoundSquare * z * z;
    least_margin = std::min(least_margin, (bound - curve.inverse(z).y) / bound);
  }
  CHECK(least_margin >= 0.0);
  CHECK(least_margin < 0.01);  // and it is a tight one
}

TEST_CASE("tension makes no lateral strain") {
  CHECK(lateral_strain_curve().inverse(-0.5).y == 0.0);
}

TEST_CASE("confined strength follows Richart, Brandtzaeg & Brown and stops at 2.5 f_c") {
  // f_cc = f_c + 4.1 p and eps_cc = eps_c1 (1 + 5 (f_cc / f_c - 1)): exact arithmetic.
  const ConfinedPeak peak = confined_peak(40e6, 0.0025, 5e6);
  CHECK(peak.strength_Pa == Approx(60.5e6).epsilon(1e-14));
  CHECK(peak.eps_cc == Approx(0.0025 * (1.0 + 5.0 * 20.5 / 40.0)).epsilon(1e-14));
  const ConfinedPeak capped = confined_peak(4e6, 0.015, 5e6);
  CHECK(capped.strength_Pa == Approx(10e6).epsilon(1e-14));
  CHECK(capped.eps_cc == Approx(0.015 * 8.5).epsilon(1e-14));
  CHECK(capped.strength_per_Pa == 0.0);
}
