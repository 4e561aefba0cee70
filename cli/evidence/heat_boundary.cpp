#include "cli/evidence/heat_boundary.hpp"

#include <cmath>

#include "fires/fire_curve.hpp"
#include "thermal/base/units.hpp"

namespace ringward::cli {

thermal::SurfaceCondition read_boundary(const CaseInput& input) {
  input.allow(
      {"temperature_C", "sine_C", "period_s", "convection_W_m2K", "emissivity", "gas_C", "fire"});
  thermal::SurfaceCondition condition;
  if (input.has("temperature_C")) {
    condition.prescribed = true;
    condition.T_C = [T_C = input.number("temperature_C")](double) { return T_C; };
    return condition;
  }
  if (input.has("sine_C")) {
    condition.prescribed = true;
    condition.T_C = [amplitude_C = input.number("sine_C"),
                     rate = 2.0 * units::kPi / input.number("period_s")](double t_s) {
      return amplitude_C * std::sin(rate * t_s);
    };
    return condition;
  }
  condition.convection_W_m2K = input.number("convection_W_m2K");
  condition.emissivity = input.number_or("emissivity", 0.0);
  if (input.has("fire")) {
    condition.T_C = [curve = fires::nominal_curve(input.text("fire"))](double t_s) {
      return curve->gas_C(t_s);
    };
  } else {
    condition.T_C = [gas_C = input.number("gas_C")](double) { return gas_C; };
  }
  return condition;
}

}  // namespace ringward::cli
