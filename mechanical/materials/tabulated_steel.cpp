#include "mechanical/materials/tabulated_steel.hpp"

#include <algorithm>
#include <cmath>
#include <utility>

#include "mechanical/materials/thermal_strain.hpp"
#include "thermal/base/error.hpp"

namespace ringward::mechanical {
namespace {

constexpr double kMaxYield_Pa = 1000e6;

double design_yield_Pa(const std::string& name, const ColdSteel& cold) {
  if (!(cold.gamma > 0.0 && std::isfinite(cold.gamma))) {
    throw Error(ErrorKind::bad_input, name + ": the material factor must be above zero");
  }
  const double yield_Pa = cold.yield_Pa / cold.gamma;
  if (!(yield_Pa > 0.0 && yield_Pa <= kMaxYield_Pa)) {
    throw Error(ErrorKind::bad_input,
                name + ": the yield strength must be above 0 and not exceed 1000 MPa");
  }
  return yield_Pa;
}

}  // namespace

TabulatedSteel::TabulatedSteel(std::string name, const ColdSteel& cold, const SteelTables& tables)
    : name_(std::move(name)),
      f_y_Pa_(design_yield_Pa(name_, cold)),
      E_Pa_(cold.E_Pa),
      table_({tables.k_y, tables.k_p, tables.k_E}) {}

HotSteel TabulatedSteel::at(double T_C, double T_max_C) const {
  const auto [k_y, k_p, k_E] = table_.at(std::max(T_C, T_max_C));
  return {.f_y_Pa = k_y * f_y_Pa_,
          .f_p_Pa = k_p * f_y_Pa_,
          .E_Pa = k_E * E_Pa_,
          .thermal_strain = steel_thermal_strain(T_C)};
}

}  // namespace ringward::mechanical
