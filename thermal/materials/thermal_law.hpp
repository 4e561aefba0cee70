#pragma once

#include <memory>
#include <string>
#include <vector>

#include "thermal/section/section.hpp"

namespace ringward::thermal {

/// Conductivity and volumetric heat of a material. Water boils away on first heating only:
/// `first heating` values hold while T is the highest temperature so far, `dried` values below it.
/// Both enthalpies are exact integrals of the capacities, zero at 0 C, and agree below 100 C.
class ThermalLaw {
 public:
  virtual ~ThermalLaw() = default;
  [[nodiscard]] virtual std::string name() const = 0;
  [[nodiscard]] virtual double conductivity_W_mK(double T_C) const = 0;
  [[nodiscard]] virtual double heat_capacity_J_m3K(double T_C) const = 0;
  [[nodiscard]] virtual double enthalpy_J_m3(double T_C) const = 0;
  [[nodiscard]] virtual double dried_heat_capacity_J_m3K(double T_C) const = 0;
  [[nodiscard]] virtual double dried_enthalpy_J_m3(double T_C) const = 0;
  /// Temperatures at which a value or a slope jumps, increasing.
  [[nodiscard]] virtual std::vector<double> kinks_C() const = 0;
  /// Range in which the publication gives the law [C].
  [[nodiscard]] virtual double valid_from_C() const = 0;
  [[nodiscard]] virtual double valid_to_C() const = 0;
};

using ThermalLawPtr = std::shared_ptr<const ThermalLaw>;

[[nodiscard]] ThermalLawPtr concrete_law_en1992(const Core& core);
[[nodiscard]] ThermalLawPtr steel_law_en1993();
[[nodiscard]] ThermalLawPtr protection_law(const Protection& protection);

/// A material with given tables of conductivity [W/mK] and volumetric capacity [J/m3K] against
/// T [C] (benchmarks, user materials); no moisture.
[[nodiscard]] ThermalLawPtr table_law(std::string name, PiecewiseLinear conductivity_W_mK,
                                      PiecewiseLinear heat_capacity_J_m3K);

}  // namespace ringward::thermal
