#include <algorithm>

#include "thermal/base/error.hpp"
#include "thermal/materials/tabulated_range.hpp"
#include "thermal/materials/thermal_law.hpp"

namespace ringward::thermal {
namespace {

// The water of a protection layer boils over a spread of temperatures, so that the capacity stays
// a function; the spread is that of the constant peak of EN 1992-1-2 3.3.2.
constexpr double kBoilingFrom_C = 100.0;
constexpr double kBoilingTo_C = 115.0;
constexpr double kLatentHeat_J_kg = 2257e3;  ///< of water at 100 C and 1 atm, common practice

class ProtectionLaw final : public ThermalLaw {
 public:
  explicit ProtectionLaw(const Protection& protection)
      : conductivity_(protection.conductivity_W_mK),
        specific_heat_(protection.specific_heat_J_kgK),
        density_(protection.density_kg_m3),
        latent_J_m3_(protection.density_kg_m3 * protection.moisture_fraction * kLatentHeat_J_kg),
        integral_at_zero_(protection.specific_heat_J_kgK.integral(0.0)) {}

  std::string name() const override { return "protection"; }
  double conductivity_W_mK(double T_C) const override { return conductivity_.value(T_C); }

  /// rho c + rho u L/15 K within 100..115 C.
  double heat_capacity_J_m3K(double T_C) const override {
    const bool boils = T_C >= kBoilingFrom_C && T_C < kBoilingTo_C;
    const double boiling = boils ? latent_J_m3_ / (kBoilingTo_C - kBoilingFrom_C) : 0.0;
    return dried_heat_capacity_J_m3K(T_C) + boiling;
  }
  double enthalpy_J_m3(double T_C) const override {
    const double share = (T_C - kBoilingFrom_C) / (kBoilingTo_C - kBoilingFrom_C);
    return dried_enthalpy_J_m3(T_C) + latent_J_m3_ * std::clamp(share, 0.0, 1.0);
  }
  double dried_heat_capacity_J_m3K(double T_C) const override {
    return density_ * specific_heat_.value(T_C);
  }
  double dried_enthalpy_J_m3(double T_C) const override {
    return density_ * (specific_heat_.integral(T_C) - integral_at_zero_);
  }
  std::vector<double> kinks_C() const override {
    std::vector<double> kinks = kinks_of(conductivity_, specific_heat_);
    if (latent_J_m3_ > 0.0) kinks.insert(kinks.end(), {kBoilingFrom_C, kBoilingTo_C});
    std::sort(kinks.begin(), kinks.end());
    kinks.erase(std::unique(kinks.begin(), kinks.end()), kinks.end());
    return kinks;
  }
  double valid_from_C() const override {
    return common_range(conductivity_, specific_heat_).from_C;
  }
  double valid_to_C() const override { return common_range(conductivity_, specific_heat_).to_C; }

 private:
  PiecewiseLinear conductivity_;
  PiecewiseLinear specific_heat_;
  double density_;
  double latent_J_m3_;
  double integral_at_zero_;
};

}  // namespace

ThermalLawPtr protection_law(const Protection& protection) {
  require_positive(protection.conductivity_W_mK, "the conductivity of the protection");
  require_positive(protection.specific_heat_J_kgK, "the specific heat of the protection");
  if (!(protection.density_kg_m3 > 0.0)) {
    throw Error(ErrorKind::bad_input, "the density of the protection must be above zero");
  }
  if (!(protection.moisture_fraction >= 0.0)) {
    throw Error(ErrorKind::bad_input, "the moisture of the protection must not be negative");
  }
  return std::make_shared<ProtectionLaw>(protection);
}

}  // namespace ringward::thermal
