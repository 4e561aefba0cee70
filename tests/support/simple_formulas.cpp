#include "tests/support/simple_formulas.hpp"

#include <algorithm>
#include <cmath>

namespace ringward::testing {

double concrete_rule_min(const ConcreteColumnRule& rule) {
  const double l_m = std::max(rule.l_0fi_m, 2.0);
  const double R_eta =
      83.0 * (1.0 - rule.mu_fi * (1.0 + rule.omega) / (0.85 / rule.alpha_cc + rule.omega));
  const double R_a = 1.60 * (std::min(rule.axis_mm, 80.0) - 30.0);
  const double R_l = 9.60 * (5.0 - l_m);
  const double R_b = 0.09 * std::min(rule.b_mm, 450.0);
  const double R_n = rule.over_4_bars ? 12.0 : 0.0;
  return 120.0 * std::pow((R_eta + R_a + R_l + R_b + R_n) / 120.0, 1.8);
}

double filled_tube_rule_min(const FilledTubeRule& rule) {
  return rule.f * (rule.strength_MPa + 20.0) / (rule.KL_mm - 1000.0) * rule.D_mm * rule.D_mm *
         std::sqrt(rule.D_mm / rule.load_kN);
}

}  // namespace ringward::testing
