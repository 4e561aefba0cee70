#pragma once

namespace ringward::mechanical {

/// Lateral (outward) strain of concrete under axial compression and a confining pressure, after
/// Teng, Huang, Lam & Ye 2007 (from memory):
///   e_c / e_co = 0.85 (1 + 8 p / f_c) phi(e_l / e_co),  phi(y) = (1 + 0.75 y)^0.7 - exp(-7 y).
/// The inverse y(z) of phi is tabulated once (cubic Hermite, relative error below 1e-7).
/// @source teng2007
class LateralStrainCurve {
 public:
  LateralStrainCurve();

  struct Ratio {
    double y = 0;      ///< e_l / e_co
    double slope = 0;  ///< dy/dz
  };
  /// @param z e_c / (0.85 e_co (1 + 8 p / f_c)); below zero (tension) the ratio is zero
  [[nodiscard]] Ratio inverse(double z) const;

  /// phi(y) itself, y >= 0.
  [[nodiscard]] static double phi(double y);
  [[nodiscard]] static double phi_slope(double y);

 private:
  static constexpr int kCount = 4096;
  static constexpr double kEnd = 64.0;
  double y_[kCount + 1];
  double slope_[kCount + 1];
};

/// The one shared table (constant after its first use).
[[nodiscard]] const LateralStrainCurve& lateral_strain_curve();

}  // namespace ringward::mechanical
