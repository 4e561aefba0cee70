#pragma once

// What an engineer would otherwise use; only to compare with.
namespace ringward::testing {

/// The quantities of EN 1992-1-2 eq. (5.7).
struct ConcreteColumnRule {
  double mu_fi = 0;       ///< load over cold design resistance
  double omega = 0;       ///< A_s f_yd / (A_c f_cd)
  double alpha_cc = 1.0;  ///< 0.85 to 1
  double axis_mm = 0;     ///< of the bars, 25 to 80
  double l_0fi_m = 0;     ///< 2 to 6
  double b_mm = 0;        ///< 2 A_c / (b + h), 200 to 450
  bool over_4_bars = false;
};

/// Fire resistance in min of a reinforced-concrete column:
/// R = 120 ((R_eta + R_a + R_l + R_b + R_n) / 120)^1.8, lengths below their range taken at its end.
/// @source en1992-1-2-2004 5.3.2 eq. (5.7)
[[nodiscard]] double concrete_rule_min(const ConcreteColumnRule& rule);

/// The quantities of the North American equation for filled tubes.
struct FilledTubeRule {
  double f = 0;  ///< by shape, aggregate and filling
  double strength_MPa = 0;
  double KL_mm = 0;
  double D_mm = 0;  ///< diameter or side, outside
  double load_kN = 0;
};

/// Fire resistance in min: R = f (f'_c + 20) / (KL - 1000) D^2 sqrt(D / C).
/// @source lie-stringer1994; kodur1999
[[nodiscard]] double filled_tube_rule_min(const FilledTubeRule& rule);

}  // namespace ringward::testing
