#pragma once

#include <Eigen/Core>

namespace ringward::mechanical {

/// The column between hinges, bent symmetrically about mid-height: curvatures at stations give
/// lever arms at the same stations, linearly. Station 0 is mid-height.
struct DeflectedShape {
  Eigen::MatrixXd lever_per_curvature;  ///< [m / (1/m)], stations x stations
  Eigen::VectorXd imperfection;         ///< half-sine at the stations, 1 at mid-height
  [[nodiscard]] Eigen::Index stations() const { return imperfection.size(); }
};

/// One station at mid-height and a half-sine deflection: lever = kappa l_0^2 / pi^2.
/// Exact enough only for a concentric load and symmetric heating.
/// @param buckling_length_m l_0 > 0
[[nodiscard]] DeflectedShape half_sine_shape(double buckling_length_m);

/// The deflection integrated along the half length: the solution of w'' = -kappa with w'(0) = 0 at
/// mid-height and w = 0 at the hinge, kappa quadratic over pairs of intervals; exact for curvatures
/// that are quadratic in z (a uniform one gives kappa l^2 / 8).
/// @param intervals even, >= 2, of the half length
[[nodiscard]] DeflectedShape integrated_shape(double buckling_length_m, int intervals);

}  // namespace ringward::mechanical
