#include "mechanical/member/deflection.hpp"

#include <algorithm>
#include <array>
#include <cmath>

#include "thermal/base/units.hpp"

namespace ringward::mechanical {
namespace {

/// Lagrange polynomials on the nodes -1, 0, 1.
std::array<double, 3> quadratic_basis(double s) {
  return {0.5 * s * (s - 1.0), 1.0 - s * s, 0.5 * s * (s + 1.0)};
}

/// Three-point Gauss rule on [-1, 1]: exact for the cubic integrands here.
struct GaussPoint {
  double at;
  double weight;
};
constexpr std::array<GaussPoint, 3> kGauss{
    {{-0.7745966692414834, 5.0 / 9.0}, {0.0, 8.0 / 9.0}, {0.7745966692414834, 5.0 / 9.0}}};

/// Adds the integral over [from, to] of (L - max(z, x)) kappa(x) dx, kappa quadratic on the pair of
/// intervals that starts at node `first`.
void add_part(Eigen::MatrixXd& lever, Eigen::Index row, Eigen::Index first,
              const std::array<double, 5>& z_from_to_h_length) {
  const auto [z, from, to, h, length] = z_from_to_h_length;
  const double middle = static_cast<double>(first + 1) * h;
  for (const GaussPoint& gauss : kGauss) {
    const double x = 0.5 * (from + to) + 0.5 * (to - from) * gauss.at;
    const double kernel = length - std::max(z, x);
    const std::array<double, 3> basis = quadratic_basis((x - middle) / h);
    for (std::size_t k = 0; k < 3; ++k) {
      lever(row, first + static_cast<Eigen::Index>(k)) +=
          gauss.weight * 0.5 * (to - from) * kernel * basis[k];
    }
  }
}

}  // namespace

DeflectedShape half_sine_shape(double buckling_length_m) {
  const double lever = buckling_length_m * buckling_length_m / (units::kPi * units::kPi);
  return {.lever_per_curvature = Eigen::MatrixXd::Constant(1, 1, lever),
          .imperfection = Eigen::VectorXd::Ones(1)};
}

DeflectedShape integrated_shape(double buckling_length_m, int intervals) {
  const double length = 0.5 * buckling_length_m;
  const double h = length / intervals;
  DeflectedShape shape{.lever_per_curvature = Eigen::MatrixXd::Zero(intervals + 1, intervals + 1),
                       .imperfection = Eigen::VectorXd(intervals + 1)};
  for (Eigen::Index row = 0; row <= intervals; ++row) {
    const double z = static_cast<double>(row) * h;
    shape.imperfection(row) = std::cos(0.5 * units::kPi * z / length);
    for (Eigen::Index first = 0; first < intervals; first += 2) {
      const double from = static_cast<double>(first) * h;
      // The kernel bends at z, which is a node: each half is integrated by itself.
      add_part(shape.lever_per_curvature, row, first, {z, from, from + h, h, length});
      add_part(shape.lever_per_curvature, row, first, {z, from + h, from + 2.0 * h, h, length});
    }
  }
  return shape;
}

}  // namespace ringward::mechanical
