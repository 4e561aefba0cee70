#include <cmath>

#include "mechanical/materials/material_laws.hpp"

namespace ringward::mechanical {

/// sigma = f_p - c + (b/a) sqrt(a^2 - (eps_y - eps)^2) with
/// c = (f_y - f_p)^2/((eps_y - eps_p) E - 2 (f_y - f_p)), written with (b/a)^2 = c E/(eps_y -
/// eps_p) and the radicand as a sum of positive terms, so that nothing cancels where f_p nears f_y.
/// @source en1993-1-2-2005 3.2.2 Table/Figure 3.1
SteelCurve::SteelCurve(const HotSteel& steel) {
  if (!(steel.f_y_Pa > 0.0 && steel.E_Pa > 0.0)) return;
  f_y_Pa_ = steel.f_y_Pa;
  E_Pa_ = steel.E_Pa;
  eps_p_ = steel.f_p_Pa / steel.E_Pa;
  ellipse_end_ = eps_p_;
  if (steel.f_p_Pa >= steel.f_y_Pa || eps_p_ >= kSteelYieldStrain) return;
  const double rise = steel.f_y_Pa - steel.f_p_Pa;
  const double width = kSteelYieldStrain - eps_p_;
  const double c = rise * rise / (width * steel.E_Pa - 2.0 * rise);
  radicand_at_p_ = width * c / steel.E_Pa;
  if (!(radicand_at_p_ > 0.0)) return;  // f_p = f_y to rounding: the ellipse is a line
  ellipse_end_ = kSteelYieldStrain;
  ellipse_base_Pa_ = steel.f_p_Pa - c;
  b_over_a_ = std::sqrt(c * steel.E_Pa / width);
}

StressAndTangent SteelCurve::in_tension(double eps) const {
  if (eps < eps_p_) return {E_Pa_ * eps, E_Pa_};
  if (eps < ellipse_end_) {
    const double left = (eps - eps_p_) * (2.0 * kSteelYieldStrain - eps_p_ - eps);
    const double root = std::sqrt(left + radicand_at_p_);
    return {ellipse_base_Pa_ + b_over_a_ * root, b_over_a_ * (kSteelYieldStrain - eps) / root};
  }
  if (eps < kSteelDescentStrain) return {f_y_Pa_, 0.0};
  if (eps < kSteelRuptureStrain) {
    const double slope = -f_y_Pa_ / (kSteelRuptureStrain - kSteelDescentStrain);
    return {slope * (eps - kSteelRuptureStrain), slope};
  }
  return {};
}

StressAndTangent SteelCurve::at(double eps) const {
  const StressAndTangent state = in_tension(std::abs(eps));
  return {eps < 0.0 ? 0.0 - state.stress_Pa : state.stress_Pa, state.tangent_Pa};
}

StressAndTangent concrete_stress(const HotConcrete& concrete, double eps) {
  const double f_c = concrete.f_c_Pa;
  if (eps < 0.0 || eps >= concrete.eps_cu1 || !(f_c > 0.0)) return {};
  if (eps < concrete.eps_c1) {
    const double x = eps / concrete.eps_c1;
    const double denominator = 2.0 + x * x * x;
    return {3.0 * f_c * x / denominator,
            6.0 * f_c * (1.0 - x * x * x) / (concrete.eps_c1 * denominator * denominator)};
  }
  const double slope = -f_c / (concrete.eps_cu1 - concrete.eps_c1);
  return {slope * (eps - concrete.eps_cu1), slope};
}

StressAndTangent steel_stress(const HotSteel& steel, double eps) {
  return SteelCurve(steel).at(eps);
}

}  // namespace ringward::mechanical
