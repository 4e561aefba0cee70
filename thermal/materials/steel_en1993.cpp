#include <algorithm>

#include "thermal/materials/piecewise_capacity.hpp"
#include "thermal/materials/thermal_law.hpp"

namespace ringward::thermal {
namespace {

constexpr double kFrom_C = 20.0;
constexpr double kTo_C = 1200.0;
constexpr double kDensity_kg_m3 = 7850.0;

CapacityPiece polynomial(double from_C, std::array<double, 4> c_a) {
  for (double& c : c_a) c *= kDensity_kg_m3;
  return {.from_C = from_C, .poly = c_a};
}

/// c_a = constant + A/(T - T0).
CapacityPiece hyperbola(double from_C, double constant, double A, double T0_C) {
  CapacityPiece piece = polynomial(from_C, {constant, 0.0, 0.0, 0.0});
  piece.pole_J_m3 = kDensity_kg_m3 * A;
  piece.pole_at_C = T0_C;
  return piece;
}

/// c_a = 425 + 0.773 T - 1.69e-3 T^2 + 2.22e-6 T^3 to 600 C, 666 + 13002/(738 - T) to 735 C,
/// 545 + 17820/(T - 731) to 900 C, 650 above; times rho_a = 7850 kg/m3.
/// @source en1993-1-2-2005 3.4.1.2
PiecewiseCapacity volumetric_capacity() {
  return {{polynomial(kFrom_C, {425.0, 0.773, -1.69e-3, 2.22e-6}),
           hyperbola(600.0, 666.0, -13002.0, 738.0), hyperbola(735.0, 545.0, 17820.0, 731.0),
           polynomial(900.0, {650.0, 0.0, 0.0, 0.0})},
          kTo_C};
}

class SteelEn1993 final : public ThermalLaw {
 public:
  std::string name() const override { return "steel EN 1993-1-2"; }

  /// lambda_a = 54 - 0.0333 T to 800 C, 27.3 above.
  /// @source en1993-1-2-2005 3.4.1.3
  double conductivity_W_mK(double T_C) const override {
    return T_C < 800.0 ? 54.0 - 3.33e-2 * std::max(T_C, kFrom_C) : 27.3;
  }
  double heat_capacity_J_m3K(double T_C) const override { return capacity_.capacity(T_C); }
  double enthalpy_J_m3(double T_C) const override { return capacity_.enthalpy(T_C); }
  double dried_heat_capacity_J_m3K(double T_C) const override { return capacity_.capacity(T_C); }
  double dried_enthalpy_J_m3(double T_C) const override { return capacity_.enthalpy(T_C); }
  std::vector<double> kinks_C() const override { return {kFrom_C, 600.0, 735.0, 800.0, 900.0}; }
  double valid_from_C() const override { return kFrom_C; }
  double valid_to_C() const override { return kTo_C; }

 private:
  PiecewiseCapacity capacity_ = volumetric_capacity();
};

}  // namespace

ThermalLawPtr steel_law_en1993() { return std::make_shared<SteelEn1993>(); }

}  // namespace ringward::thermal
