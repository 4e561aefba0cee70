#pragma once

#include <memory>
#include <vector>

#include "thermal/boundary/exposure.hpp"
#include "thermal/cvode.hpp"
#include "thermal/heat_equation.hpp"
#include "thermal/temperature_history.hpp"

namespace ringward::thermal {

/// How a heat problem is followed in time.
struct HeatRun {
  double end_s = 0;
  TimeTolerance tolerance;
  /// Its kinks are never stepped over; reported by gas_C and kinks_s. May be left empty.
  GasTemperature gas;
  /// Times at which the field is kept, increasing; empty for the usual schedule. The end and the
  /// kinks are always kept.
  std::vector<double> kept_s;
};

/// 0.1 min apart at first, growing to 1 min from half an hour on.
[[nodiscard]] std::vector<double> usual_kept_times(double end_s);

/// The problem of a section in a fire, on the grid that suits it.
[[nodiscard]] HeatProblem heat_problem_of(const Section& section, const FireExposure& fire,
                                          const Resolution& resolution);

/// Solves any heat problem; solve_heat_flow poses a section in fire as one.
/// @throws Error(bad_input) when end_s is not above zero
/// @throws Error(solver_breakdown) with the time and the place when the integrator gives up
[[nodiscard]] TemperatureHistory solve_heat_problem(HeatProblem problem, const HeatRun& run);

}  // namespace ringward::thermal
