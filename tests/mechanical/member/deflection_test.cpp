#include "mechanical/member/deflection.hpp"

#include <catch2/catch.hpp>
#include <cmath>

#include "thermal/base/units.hpp"

using namespace ringward::mechanical;

TEST_CASE("a uniform curvature bows the column by kappa l^2 / 8") {
  const DeflectedShape shape = integrated_shape(4.0, 8);
  const Eigen::VectorXd kappa = Eigen::VectorXd::Constant(9, 0.01);
  const Eigen::VectorXd lever = shape.lever_per_curvature * kappa;
  // Beam theory, exact: the rule integrates quadratics exactly, so only rounding remains.
  CHECK(lever(0) == Approx(0.01 * 16.0 / 8.0).epsilon(1e-13));
  CHECK(lever(8) == Approx(0.0).margin(1e-14));
}

TEST_CASE("a half-sine curvature bows the column by kappa l^2 / pi^2 at fourth order") {
  const auto error = [](int intervals) {
    const DeflectedShape shape = integrated_shape(3.0, intervals);
    const Eigen::VectorXd lever = shape.lever_per_curvature * shape.imperfection;
    const double pi = ringward::units::kPi;
    return std::abs(lever(0) - 9.0 / (pi * pi));
  };
  // Quadratic interpolation of a smooth curvature: error h^4 at least; measured order 4.0.
  CHECK(std::log2(error(8) / error(16)) > 3.7);
  CHECK(error(8) < 1e-4);
}

TEST_CASE("the half-sine shape is the eigenshape of the integrated one") {
  const double pi = ringward::units::kPi;
  CHECK(half_sine_shape(3.0).lever_per_curvature(0, 0) == Approx(9.0 / (pi * pi)).epsilon(1e-14));
  CHECK(half_sine_shape(3.0).imperfection(0) == 1.0);
}
