#include "mechanical/materials/thermal_strain.hpp"

namespace ringward::mechanical {

double siliceous_thermal_strain(double T_C) {
  return T_C <= 700.0 ? -1.8e-4 + T_C * (9e-6 + 2.3e-11 * T_C * T_C) : 14e-3;
}

double calcareous_thermal_strain(double T_C) {
  return T_C <= 805.0 ? -1.2e-4 + T_C * (6e-6 + 1.4e-11 * T_C * T_C) : 12e-3;
}

double steel_thermal_strain(double T_C) {
  if (T_C < 750.0) return T_C * (1.2e-5 + 0.4e-8 * T_C) - 2.416e-4;
  return T_C <= 860.0 ? 11e-3 : 2e-5 * T_C - 6.2e-3;
}

}  // namespace ringward::mechanical
