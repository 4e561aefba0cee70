#include <algorithm>
#include <cmath>
#include <vector>

#include "mechanical/materials/hot_table.hpp"
#include "mechanical/materials/material_laws.hpp"
#include "mechanical/materials/thermal_strain.hpp"
#include "thermal/base/error.hpp"
#include "thermal/base/units.hpp"

namespace ringward::mechanical {
namespace {

constexpr double kCold_C = 20.0;
constexpr double kNormalStrengthTo_Pa = 50e6;
constexpr double kClass1To_Pa = 60e6;
constexpr double kClass2To_Pa = 80e6;
constexpr double kClass3To_Pa = 90e6;

/// f_c,theta/f_ck of normal-strength concrete.
/// @source en1992-1-2-2004 Table 3.1
PiecewiseLinear table_3_1_strength(thermal::Aggregate aggregate) {
  if (aggregate == thermal::Aggregate::siliceous) {
    return PiecewiseLinear({{20, 1.0},
                            {100, 1.0},
                            {200, 0.95},
                            {300, 0.85},
                            {400, 0.75},
                            {500, 0.60},
                            {600, 0.45},
                            {700, 0.30},
                            {800, 0.15},
                            {900, 0.08},
                            {1000, 0.04},
                            {1100, 0.01},
                            {1200, 0.0}});
  }
  return PiecewiseLinear({{20, 1.0},
                          {100, 1.0},
                          {200, 0.97},
                          {300, 0.91},
                          {400, 0.85},
                          {500, 0.74},
                          {600, 0.60},
                          {700, 0.43},
                          {800, 0.27},
                          {900, 0.15},
                          {1000, 0.06},
                          {1100, 0.02},
                          {1200, 0.0}});
}

/// f_c,theta/f_ck of high-strength concrete; blank entries lie on the line between neighbours.
/// @source en1992-1-2-2004 Table 6.1N, classes by 6.1(5)
PiecewiseLinear table_6_1_strength(double strength_Pa) {
  if (strength_Pa <= kClass1To_Pa) {
    return PiecewiseLinear({{20, 1.0},
                            {50, 1.0},
                            {100, 0.90},
                            {250, 0.90},
                            {300, 0.85},
                            {400, 0.75},
                            {800, 0.15},
                            {900, 0.08},
                            {1000, 0.04},
                            {1100, 0.01},
                            {1200, 0.0}});
  }
  if (strength_Pa <= kClass2To_Pa) {
    return PiecewiseLinear(
        {{20, 1.0}, {50, 1.0}, {100, 0.75}, {400, 0.75}, {800, 0.15}, {1200, 0.0}});
  }
  return PiecewiseLinear({{20, 1.0},
                          {50, 1.0},
                          {100, 0.75},
                          {200, 0.70},
                          {300, 0.65},
                          {400, 0.45},
                          {500, 0.30},
                          {600, 0.25},
                          {800, 0.15},
                          {900, 0.08},
                          {1000, 0.04},
                          {1100, 0.01},
                          {1200, 0.0}});
}

/// eps_c1,theta.
/// @source en1992-1-2-2004 Table 3.1; at 1200 C, where the table is blank, the value of 1100 C
PiecewiseLinear table_3_1_peak_strain() {
  return PiecewiseLinear({{20, 0.0025},
                          {100, 0.0040},
                          {200, 0.0055},
                          {300, 0.0070},
                          {400, 0.0100},
                          {500, 0.0150},
                          {600, 0.0250}});
}

/// eps_cu1,theta.
/// @source en1992-1-2-2004 Table 3.1; at 1200 C, where the table is blank, the value of 1100 C
PiecewiseLinear table_3_1_ultimate_strain() {
  return PiecewiseLinear({{20, 0.0200}, {100, 0.0225}, {1100, 0.0475}});
}

PiecewiseLinear strength_table(double strength_Pa, thermal::Aggregate aggregate) {
  return strength_Pa <= kNormalStrengthTo_Pa ? table_3_1_strength(aggregate)
                                             : table_6_1_strength(strength_Pa);
}

class ConcreteEn1992 final : public ConcreteLaw {
 public:
  ConcreteEn1992(double strength_Pa, thermal::Aggregate aggregate, double gamma)
      : cold_strength_Pa_(strength_Pa / gamma),
        is_siliceous_(aggregate == thermal::Aggregate::siliceous),
        has_residual_ramp_(is_siliceous_ && strength_Pa <= kNormalStrengthTo_Pa),
        table_({strength_table(strength_Pa, aggregate), table_3_1_peak_strain(),
                table_3_1_ultimate_strain()}) {}

  std::string name() const override {
    return is_siliceous_ ? "concrete EN 1992-1-2, siliceous" : "concrete EN 1992-1-2, calcareous";
  }

  HotConcrete at(double T_C, double T_max_C) const override {
    const double hottest_C = std::max(T_C, T_max_C);
    const auto [k_c, eps_c1, eps_cu1] = table_.at(hottest_C);
    const double k = T_C < hottest_C ? cooled_factor(T_C, hottest_C, k_c) : k_c;
    return {.f_c_Pa = k * cold_strength_Pa_,
            .eps_c1 = eps_c1,
            .eps_cu1 = eps_cu1,
            .thermal_strain =
                is_siliceous_ ? siliceous_thermal_strain(T_C) : calcareous_thermal_strain(T_C)};
  }

  double cold_strength_Pa() const override { return cold_strength_Pa_; }

 private:
  /// phi, the share of the cold strength left at 20 C after T_max.
  /// @source en1994-1-2-2005 Annex C
  /// @deviates calcareous and high-strength concrete take 0.9 k_c(T_max) from 100 C on, since the
  /// straight part of the annex is fitted to k_c of siliceous concrete
  [[nodiscard]] double residual_factor(double T_max_C, double k_c) const {
    if (T_max_C <= 100.0) return k_c;
    if (has_residual_ramp_ && T_max_C < 300.0) {
      return std::min(k_c, 1.0 - 0.235 * (T_max_C - 100.0) / 200.0);
    }
    return 0.9 * k_c;
  }

  /// Linear between k_c(T_max) at T_max and phi at 20 C.
  /// @source en1994-1-2-2005 Annex C
  [[nodiscard]] double cooled_factor(double T_C, double T_max_C, double k_c) const {
    if (T_max_C <= kCold_C) return k_c;
    const double phi = residual_factor(T_max_C, k_c);
    const double share = (std::max(T_C, kCold_C) - kCold_C) / (T_max_C - kCold_C);
    return phi + (k_c - phi) * share;
  }

  double cold_strength_Pa_;
  bool is_siliceous_;
  bool has_residual_ramp_;
  HotTable<3> table_;
};

}  // namespace

ConcreteLawPtr concrete_en1992(double strength_Pa, thermal::Aggregate aggregate, double gamma) {
  if (!(strength_Pa > 0.0 && std::isfinite(strength_Pa))) {
    throw Error(ErrorKind::bad_input, "the strength of the concrete must be above zero");
  }
  if (strength_Pa > kClass3To_Pa) {
    throw Error(ErrorKind::bad_input,
                "the strength of the concrete must not exceed 90 MPa: EN 1992-1-2 6.1 ends there");
  }
  if (!(gamma > 0.0 && std::isfinite(gamma))) {
    throw Error(ErrorKind::bad_input, "the material factor of the concrete must be above zero");
  }
  return std::make_shared<ConcreteEn1992>(strength_Pa, aggregate, gamma);
}

}  // namespace ringward::mechanical
