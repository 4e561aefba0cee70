#include "tests/validation/simple_rules.hpp"

#include "tests/support/simple_formulas.hpp"
#include "thermal/base/units.hpp"

namespace ringward::testing {
namespace {

double bars_area_m2(const TestedBars& bars) {
  return bars.count * 0.25 * units::kPi * bars.diameter_m * bars.diameter_m;
}

/// The tested strengths stand for the characteristic ones.
ConcreteColumnRule concrete_rule(const FireTest& test) {
  const double A_c_m2 = test.width_m * test.width_m;
  const double f_cd_Pa = test.strength_Pa / 1.5;
  const double steel_N = bars_area_m2(*test.bars) * test.bars->yield_Pa / 1.15;
  ConcreteColumnRule rule;
  rule.omega = steel_N / (A_c_m2 * f_cd_Pa);
  rule.mu_fi = test.load_N / (A_c_m2 * f_cd_Pa + steel_N);
  rule.axis_mm = units::mm_from_m(test.bars->axis_m);
  rule.l_0fi_m = 0.5 * test.length_m;
  rule.b_mm = units::mm_from_m(test.width_m);
  rule.over_4_bars = test.bars->count > 4;
  return rule;
}

/// Filled with plain concrete: 0.07 (round) and 0.06 (square), 0.01 more with carbonate aggregate;
/// 0.005 more with bars of less than 3 % of the core, 0.01 with more.
double tube_factor(const FireTest& test) {
  const double core_m = test.width_m - 2.0 * test.wall_m;
  double f = test.family == FireTestFamily::square_tube ? 0.06 : 0.07;
  if (test.aggregate == thermal::Aggregate::calcareous) f += 0.01;
  if (test.bars) f += bars_area_m2(*test.bars) < 0.03 * core_m * core_m ? 0.005 : 0.01;
  return f;
}

FilledTubeRule tube_rule(const FireTest& test) {
  return {.f = tube_factor(test),
          .strength_MPa = units::MPa_from_Pa(test.strength_Pa),
          .KL_mm = 0.65 * units::mm_from_m(test.length_m),
          .D_mm = units::mm_from_m(test.width_m),
          .load_kN = units::kN_from_N(test.load_N)};
}

}  // namespace

double simple_rule_min(const FireTest& test) {
  return is_tube(test.family) ? filled_tube_rule_min(tube_rule(test))
                              : concrete_rule_min(concrete_rule(test));
}

}  // namespace ringward::testing
