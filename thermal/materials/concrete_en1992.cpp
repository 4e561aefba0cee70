#include <algorithm>
#include <array>

#include "thermal/base/error.hpp"
#include "thermal/base/piecewise_linear.hpp"
#include "thermal/materials/piecewise_capacity.hpp"
#include "thermal/materials/thermal_law.hpp"

namespace ringward::thermal {
namespace {

constexpr double kFrom_C = 20.0;
constexpr double kTo_C = 1200.0;
constexpr double kPeakFrom_C = 100.0;
constexpr double kPeakTo_C = 115.0;
constexpr double kPeakEnd_C = 200.0;
constexpr double kDryAtPeakTo_J_kgK = 915.0;  // 900 + (115 - 100)
constexpr double kMaxMoisture = 0.10;

/// A straight line a + b T.
struct Line {
  double a = 0;
  double b = 0;
};

Line line_through(double T1_C, double y1, double T2_C, double y2) {
  const double slope = (y2 - y1) / (T2_C - T1_C);
  return {y1 - slope * T1_C, slope};
}

CapacityPiece piece(double from_C, Line c_p, Line rho) {
  return {.from_C = from_C,
          .poly = {c_p.a * rho.a, c_p.a * rho.b + c_p.b * rho.a, c_p.b * rho.b, 0.0}};
}

/// c_p,peak by moisture content u, linear between.
/// @return [J/kgK]
/// @source en1992-1-2-2004 3.3.2(2): u = 0, 1.5, 3 %; en1994-1-2-2005 3.3.2: u = 10 %
double peak_specific_heat_J_kgK(double moisture_fraction) {
  const PiecewiseLinear peak({{0.0, 900.0}, {0.015, 1470.0}, {0.03, 2020.0}, {0.10, 5600.0}});
  return peak.value(moisture_fraction);
}

/// rho(T) c_p(T): 900 to 100 C, 900 + (T-100) to 200, 1000 + (T-200)/2 to 400, 1100 above; with
/// moisture c_p,peak from 100 to 115 C, then linear to 1000 at 200 C.
/// rho/rho_20: 1 to 115 C, 1 - 0.02 (T-115)/85, 0.98 - 0.03 (T-200)/200, 0.95 - 0.07 (T-400)/800.
/// @source en1992-1-2-2004 3.3.2
/// @deviates below u = 0.04 % the peak would lie under the dry law; the dry law is taken there
PiecewiseCapacity volumetric_capacity(double rho_20, double moisture_fraction) {
  const double peak = peak_specific_heat_J_kgK(moisture_fraction);
  const bool is_dry = peak < kDryAtPeakTo_J_kgK;
  const Line at_peak = is_dry ? Line{800.0, 1.0} : Line{peak, 0.0};
  const Line after_peak = is_dry ? at_peak : line_through(kPeakTo_C, peak, kPeakEnd_C, 1000.0);
  const Line rho{rho_20, 0.0};
  return {{piece(kFrom_C, {900.0, 0.0}, rho), piece(kPeakFrom_C, at_peak, rho),
           piece(kPeakTo_C, after_peak, line_through(115.0, rho_20, 200.0, 0.98 * rho_20)),
           piece(200.0, {900.0, 0.5}, line_through(200.0, 0.98 * rho_20, 400.0, 0.95 * rho_20)),
           piece(400.0, {1100.0, 0.0}, line_through(400.0, 0.95 * rho_20, kTo_C, 0.88 * rho_20))},
          kTo_C};
}

/// lambda upper = 2 - 0.2451 (T/100) + 0.0107 (T/100)^2.
/// @source en1992-1-2-2004 3.3.3(2)
double upper_limit(double T_C) {
  const double x = T_C / 100.0;
  return 2.0 - 0.2451 * x + 0.0107 * x * x;
}

/// lambda lower = 1.36 - 0.136 (T/100) + 0.0057 (T/100)^2.
/// @source en1992-1-2-2004 3.3.3(2)
double lower_limit(double T_C) {
  const double x = T_C / 100.0;
  return 1.36 - 0.136 * x + 0.0057 * x * x;
}

/// Upper limit to 140 C, 5.324 - 0.02604 T to 160 C, lower limit above.
/// @source en1992-1-2-2023 3.3.3
double joined_limits(double T_C) {
  if (T_C <= 140.0) return upper_limit(T_C);
  if (T_C < 160.0) return 5.324 - 0.02604 * T_C;
  return lower_limit(T_C);
}

class ConcreteEn1992 final : public ThermalLaw {
 public:
  explicit ConcreteEn1992(const Core& core)
      : limit_(core.conductivity),
        first_heating_(volumetric_capacity(core.density_kg_m3, core.moisture_fraction)),
        dried_(volumetric_capacity(core.density_kg_m3, 0.0)) {}

  std::string name() const override { return "concrete EN 1992-1-2"; }

  double conductivity_W_mK(double T_C) const override {
    const double T = std::clamp(T_C, kFrom_C, kTo_C);
    if (limit_ == ConductivityLimit::upper) return upper_limit(T);
    if (limit_ == ConductivityLimit::lower) return lower_limit(T);
    return joined_limits(T);
  }
  double heat_capacity_J_m3K(double T_C) const override { return first_heating_.capacity(T_C); }
  double enthalpy_J_m3(double T_C) const override { return first_heating_.enthalpy(T_C); }
  double dried_heat_capacity_J_m3K(double T_C) const override { return dried_.capacity(T_C); }
  double dried_enthalpy_J_m3(double T_C) const override { return dried_.enthalpy(T_C); }

  std::vector<double> kinks_C() const override {
    if (limit_ == ConductivityLimit::joined) {
      return {kFrom_C, 100.0, 115.0, 140.0, 160.0, 200.0, 400.0, kTo_C};
    }
    return {kFrom_C, 100.0, 115.0, 200.0, 400.0, kTo_C};
  }
  double valid_from_C() const override { return kFrom_C; }
  double valid_to_C() const override { return kTo_C; }

 private:
  ConductivityLimit limit_;
  PiecewiseCapacity first_heating_;
  PiecewiseCapacity dried_;
};

}  // namespace

ThermalLawPtr concrete_law_en1992(const Core& core) {
  if (!(core.moisture_fraction >= 0.0 && core.moisture_fraction <= kMaxMoisture)) {
    throw Error(ErrorKind::bad_input, "the moisture of the concrete must lie within 0 to 10 %");
  }
  if (!(core.density_kg_m3 > 0.0)) {
    throw Error(ErrorKind::bad_input, "the density of the concrete must be above zero");
  }
  return std::make_shared<ConcreteEn1992>(core);
}

}  // namespace ringward::thermal
