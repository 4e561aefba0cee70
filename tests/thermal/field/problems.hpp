#pragma once

#include <cmath>
#include <functional>
#include <vector>

#include "fires/fire_curve.hpp"
#include "thermal/base/units.hpp"
#include "thermal/grid/cells.hpp"
#include "thermal/heat_flow_run.hpp"

// Problems that several tests of the heat flow pose.
namespace ringward::testing {

using namespace ringward::thermal;

inline ThermalLawPtr constant_law(double conductivity_W_mK, double capacity_J_m3K) {
  return table_law("constant", PiecewiseLinear(conductivity_W_mK), PiecewiseLinear(capacity_J_m3K));
}

inline std::vector<double> evenly(double from, double to, std::size_t cells) {
  std::vector<double> faces;
  for (std::size_t k = 0; k <= cells; ++k) {
    faces.push_back(from + (to - from) * static_cast<double>(k) / static_cast<double>(cells));
  }
  return faces;
}

inline Layer all_core(double, double) { return Layer::core; }

inline SurfaceCondition convection(double alpha_W_m2K, double gas_C) {
  SurfaceCondition condition;
  condition.convection_W_m2K = alpha_W_m2K;
  condition.T_C = [gas_C](double) { return gas_C; };
  return condition;
}

inline SurfaceCondition prescribed(std::function<double(double)> T_C) {
  SurfaceCondition condition;
  condition.prescribed = true;
  condition.T_C = std::move(T_C);
  return condition;
}

/// The whole side of a problem's grid under one of its conditions.
inline void set_side(HeatProblem& problem, Side side, int condition) {
  const std::size_t count = is_axis_1(side) ? problem.grid.count_2() : problem.grid.count_1();
  problem.sides[static_cast<std::size_t>(side)].assign(count, condition);
}

/// Tight enough that only the grid's error is left: `error_K` of a material of given capacity.
inline HeatRun exact_run(double end_s, double error_K, double capacity_J_m3K) {
  HeatRun run;
  run.end_s = end_s;
  run.tolerance.relative = 1e-8;
  run.tolerance.absolute = error_K * capacity_J_m3K / kEnthalpyUnit_J_m3;
  return run;
}

/// Invented columns; the concrete of the computed reference cases.
inline Section tubed(Shape shape, double width_m, double wall_m, double contact_m2K_W = 0.0) {
  Section section;
  section.outline = {shape, width_m, width_m};
  section.tube = Tube{};
  section.tube->thickness_m = wall_m;
  section.tube->contact_resistance_m2K_W = contact_m2K_W;
  section.core.moisture_fraction = 0.015;
  section.core.conductivity = ConductivityLimit::lower;
  return section;
}

inline FireExposure in_fire(const fires::FireCurvePtr& curve, double minutes) {
  FireExposure fire;
  fire.duration_s = units::s_from_min(minutes);
  fire.surface.convection_W_m2K = curve->convection_W_m2K();
  fire.gas = fires::gas_temperature(curve, fire.duration_s);
  return fire;
}

inline FireExposure standard_fire(double minutes) {
  return in_fire(fires::nominal_curve("standard"), minutes);
}

}  // namespace ringward::testing
