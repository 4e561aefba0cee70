#include <cmath>

#include "mechanical/materials/material_laws.hpp"

namespace ringward::mechanical {
namespace {

/// sigma = f_p - c + (b/a) sqrt(a^2 - (eps_y - eps)^2) with
/// c = (f_y - f_p)^2/((eps_y - eps_p) E - 2 (f_y - f_p)), written with (b/a)^2 = c E/(eps_y -
/// eps_p) and the radicand as a sum of positive terms, so that nothing cancels where f_p nears f_y.
/// @source en1993-1-2-2005 3.2.2 Table/Figure 3.1
StressAndTangent on_ellipse(const HotSteel& steel, double eps_p, double eps) {
  const double rise = steel.f_y_Pa - steel.f_p_Pa;
  const double width = kSteelYieldStrain - eps_p;
  const double c = rise * rise / (width * steel.E_Pa - 2.0 * rise);
  const double b_over_a = std::sqrt(c * steel.E_Pa / width);
  const double radicand =
      (eps - eps_p) * (2.0 * kSteelYieldStrain - eps_p - eps) + width * c / steel.E_Pa;
  if (!(radicand > 0.0)) return {steel.f_y_Pa, 0.0};  // f_p = f_y: the ellipse is a line
  const double root = std::sqrt(radicand);
  return {steel.f_p_Pa - c + b_over_a * root, b_over_a * (kSteelYieldStrain - eps) / root};
}

/// The law for eps >= 0.
StressAndTangent in_tension(const HotSteel& steel, double eps) {
  if (!(steel.f_y_Pa > 0.0 && steel.E_Pa > 0.0)) return {};
  const double eps_p = steel.f_p_Pa / steel.E_Pa;
  if (eps < eps_p) return {steel.E_Pa * eps, steel.E_Pa};
  if (eps < kSteelYieldStrain && steel.f_p_Pa < steel.f_y_Pa) return on_ellipse(steel, eps_p, eps);
  if (eps < kSteelDescentStrain) return {steel.f_y_Pa, 0.0};
  if (eps < kSteelRuptureStrain) {
    const double slope = -steel.f_y_Pa / (kSteelRuptureStrain - kSteelDescentStrain);
    return {slope * (eps - kSteelRuptureStrain), slope};
  }
  return {};
}

}  // namespace

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
  const StressAndTangent state = in_tension(steel, std::abs(eps));
  return {eps < 0.0 ? 0.0 - state.stress_Pa : state.stress_Pa, state.tangent_Pa};
}

}  // namespace ringward::mechanical
