#pragma once

#include "cli/evidence/case_input.hpp"
#include "thermal/materials/thermal_law.hpp"

namespace ringward::cli {

/// A thermal law with the density that its heat is stored per [kg/m3].
struct GivenLaw {
  thermal::ThermalLawPtr law;
  double density_kg_m3 = 0;
};

/// `{ law = "concrete" | "steel" | "numbers", ... }`: concrete takes moisture_percent,
/// density_kg_m3 and conductivity (upper, lower, joined); numbers takes conductivity_W_mK,
/// specific_heat_J_kgK (each a number or [[T_C, value], ...]) and density_kg_m3.
/// @throws Error(bad_input) for anything else
[[nodiscard]] GivenLaw read_thermal_law(const CaseInput& input);

}  // namespace ringward::cli
