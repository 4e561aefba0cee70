#pragma once

#include <cstddef>
#include <vector>

namespace ringward::mechanical {

/// Lateral (outward) strain of concrete under axial compression and a confining pressure, after
/// Teng, Huang, Lam & Ye 2007 (from memory):
///   e_c / e_co = 0.85 (1 + 8 p / f_c) phi(e_l / e_co),  phi(y) = (1 + 0.75 y)^0.7 - exp(-7 y).
/// The inverse y(z) of phi is tabulated once as cubics on a uniform grid (relative error below
/// 1e-8).
/// @source teng2007
class LateralStrainCurve {
 public:
  LateralStrainCurve();

  struct Ratio {
    double y = 0;      ///< e_l / e_co
    double slope = 0;  ///< dy/dz
  };
  /// @param z e_c / (0.85 e_co (1 + 8 p / f_c)); below zero (tension) the ratio is zero
  [[nodiscard]] Ratio inverse(double z) const {
    if (z <= 0.0) return {.y = 0.0, .slope = z < 0.0 ? 0.0 : cubics_[0].b};
    if (z >= kEnd) return {.y = last_y_ + last_slope_ * (z - kEnd), .slope = last_slope_};
    const double place = z * kPerUnit;
    const int k = static_cast<int>(place);
    const Cubic& c = cubics_[static_cast<std::size_t>(k)];
    const double s = z - k / kPerUnit;
    return {.y = c.a + s * (c.b + s * (c.c + s * c.d)),
            .slope = c.b + s * (2.0 * c.c + 3.0 * s * c.d)};
  }

  /// y(z) <= kBoundLinear z + kBoundSquare z^2 for every z >= 0 (tested over the whole table).
  static constexpr double kBoundLinear = 0.2;
  static constexpr double kBoundSquare = 0.5;

  /// phi(y) itself, y >= 0.
  [[nodiscard]] static double phi(double y);
  [[nodiscard]] static double phi_slope(double y);

 private:
  struct Cubic {
    double a = 0, b = 0, c = 0, d = 0;
  };
  static constexpr double kEnd = 64.0;
  static constexpr double kPerUnit = 128.0;
  std::vector<Cubic> cubics_;
  double last_y_ = 0;
  double last_slope_ = 0;
};

/// The one shared table (constant after its first use).
[[nodiscard]] const LateralStrainCurve& lateral_strain_curve();

}  // namespace ringward::mechanical
