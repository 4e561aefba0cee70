#include <fmt/format.h>

#include <algorithm>
#include <cmath>

#include "thermal/base/error.hpp"
#include "thermal/grid/section_grid.hpp"
#include "thermal/grid/steel_shape_cells.hpp"
#include "thermal/heat_flow_run.hpp"
#include "thermal/materials/thermal_law.hpp"
#include "thermal/temperature_history.hpp"

namespace ringward::thermal {
namespace {

enum Condition : int { kHeated = 0, kAmbient = 1 };

std::vector<SurfaceCondition> conditions_of(const FireExposure& fire) {
  std::vector<SurfaceCondition> conditions(2);
  conditions[kHeated].convection_W_m2K = fire.surface.convection_W_m2K;
  conditions[kHeated].emissivity = fire.surface.emissivity;
  conditions[kHeated].T_C = fire.gas.T_C;
  conditions[kAmbient].convection_W_m2K = fire.ambient.convection_W_m2K;
  conditions[kAmbient].T_C = [T_C = fire.ambient.temperature_C](double) { return T_C; };
  return conditions;
}

int condition_index(FaceCondition seen) {
  if (seen == FaceCondition::built_in) return HeatProblem::kNoFlow;
  return seen == FaceCondition::heated ? kHeated : kAmbient;
}

/// The steps are chosen for the heat balance (below 1e-4); for 0.1 K four times these would do.
TimeTolerance tolerance_of(const Resolution& resolution) {
  const double named = resolution.accuracy == Accuracy::coarse     ? 2.0
                       : resolution.accuracy == Accuracy::standard ? 1.0
                                                                   : 0.4;
  const double factor = named * resolution.scale;
  return {.relative = 5e-6 * factor, .absolute = 0.01 * factor, .highest_order = 5};
}

}  // namespace

HeatProblem heat_problem_of(const Section& section, const FireExposure& fire,
                            const Resolution& resolution) {
  SectionGrid built = grid_of_section(section, fire.exposed, resolution);
  HeatProblem problem;
  for (std::size_t side = 0; side < built.sides.size(); ++side) {
    for (FaceCondition seen : built.sides[side]) {
      problem.sides[side].push_back(condition_index(seen));
    }
  }
  problem.grid = std::move(built.grid);
  problem.closed_circle = built.closed_circle;
  problem.core = concrete_law_en1992(section.core);
  if (section.tube) {
    problem.tube = steel_law_en1993();
    problem.contact_resistance_m2K_W = section.tube->contact_resistance_m2K_W;
  }
  if (section.steel_shape) {
    problem.steel_shape = steel_law_en1993();
    problem.in_steel_shape = [parts = steel_shape_parts(*section.steel_shape)](const Point& point) {
      return std::any_of(parts.begin(), parts.end(),
                         [&](const ConvexPolygon& part) { return contains(part, point); });
    };
  }
  if (section.protection) problem.protection = protection_law(*section.protection);
  problem.conditions = conditions_of(fire);
  problem.initial_C = fire.ambient.temperature_C;
  return problem;
}

TemperatureHistory solve_heat_flow(const Section& section, const FireExposure& fire,
                                   const Resolution& resolution) {
  HeatRun run;
  run.end_s = fire.duration_s;
  run.tolerance = tolerance_of(resolution);
  run.gas = fire.gas;
  return solve_heat_problem(heat_problem_of(section, fire, resolution), run);
}

}  // namespace ringward::thermal
