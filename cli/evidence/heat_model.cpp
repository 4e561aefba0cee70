#include <algorithm>
#include <cmath>
#include <set>

#include "cli/evidence/case_model.hpp"
#include "cli/evidence/heat_boundary.hpp"
#include "cli/evidence/thermal_law_reading.hpp"
#include "thermal/base/units.hpp"
#include "thermal/grid/cells.hpp"
#include "thermal/heat_flow_run.hpp"

namespace ringward::cli {
namespace {

using namespace thermal;

/// Layers from the inside to the outside: where each ends, and the lines of the grid.
struct Lines {
  std::vector<double> faces_m{0.0};
  std::vector<double> ends_m;
};

void add_evenly(std::vector<double>& faces, double thickness_m, int cells) {
  const double start = faces.back();
  for (int k = 1; k <= cells; ++k) faces.push_back(start + thickness_m * k / cells);
}

Lines lines_of(const CaseInput& input) {
  Lines lines;
  for (const CaseInput& layer : input.tables("layers")) {
    layer.allow({"thickness_m", "cells", "material"});
    add_evenly(lines.faces_m, layer.number("thickness_m"), static_cast<int>(layer.number("cells")));
    lines.ends_m.push_back(lines.faces_m.back());
  }
  if (lines.ends_m.size() > 3) input.fail("layers", "must be three at most");
  return lines;
}

Layer layer_at(const std::vector<double>& ends_m, double distance_m) {
  const auto end = std::upper_bound(ends_m.begin(), ends_m.end(), distance_m);
  return static_cast<Layer>(std::min<std::ptrdiff_t>(
      end - ends_m.begin(), static_cast<std::ptrdiff_t>(ends_m.size()) - 1));
}

/// slab: along x, 1 m high; square: a quarter, the layers wrapped around; rectangle: one layer,
/// with its own height; cylinder: along the radius.
OrthogonalGrid grid_of(const CaseInput& input) {
  const Lines lines = lines_of(input);
  const auto by_first = [ends = lines.ends_m](double a, double) { return layer_at(ends, a); };
  const auto by_both = [ends = lines.ends_m](double a, double b) {
    return layer_at(ends, std::max(a, b));
  };
  const std::string shape = input.text("shape");
  if (shape == "slab") return cartesian_grid(lines.faces_m, {0.0, 1.0}, by_first);
  if (shape == "square") return cartesian_grid(lines.faces_m, lines.faces_m, by_both);
  if (shape == "cylinder") {
    return polar_grid(lines.faces_m, {0.0, 2.0 * units::kPi}, Symmetry::axisymmetric, by_first);
  }
  if (shape != "rectangle") input.fail("shape", "must be slab, square, rectangle or cylinder");
  std::vector<double> up{0.0};
  add_evenly(up, input.number("height_m"), static_cast<int>(input.number("height_cells")));
  return cartesian_grid(lines.faces_m, up, by_first);
}

void add_boundary(const CaseInput& input, const char* key, Side side, HeatProblem& problem) {
  if (!input.has(key)) return;
  const int condition = static_cast<int>(problem.conditions.size());
  problem.conditions.push_back(read_boundary(input.table(key)));
  const std::size_t count = is_axis_1(side) ? problem.grid.count_2() : problem.grid.count_1();
  problem.sides[static_cast<std::size_t>(side)].assign(count, condition);
}

void add_materials(const CaseInput& input, HeatProblem& problem) {
  const std::array<ThermalLawPtr*, 3> places{&problem.core, &problem.tube, &problem.protection};
  std::size_t k = 0;
  for (const CaseInput& layer : input.tables("layers")) {
    *places.at(k++) = read_thermal_law(layer.table("material")).law;
  }
}

HeatProblem problem_of(const CaseInput& input) {
  input.allow({"shape", "layers", "height_m", "height_cells", "initial_C", "left", "right",
               "bottom", "top", "time_error_K"});
  HeatProblem problem;
  problem.grid = grid_of(input);
  add_materials(input, problem);
  problem.initial_C = input.number("initial_C");
  // A face that is not given is one without flow; the outside of a cylinder is its right side.
  add_boundary(input, "left", Side::low_1, problem);
  add_boundary(input, "right", Side::high_1, problem);
  add_boundary(input, "bottom", Side::low_2, problem);
  add_boundary(input, "top", Side::high_2, problem);
  return problem;
}

std::vector<double> times_asked_s(const EvidenceCase& evidence) {
  std::set<double> times;
  for (const Check& check : evidence.checks) {
    for (const ExpectedPoint& point : check.points) times.insert(time_argument_s(point.at));
  }
  times.erase(0.0);
  return {times.begin(), times.end()};
}

/// Tight enough that only the grid's error is left.
HeatRun run_of(const CaseInput& input, const EvidenceCase& evidence, const HeatProblem& problem) {
  HeatRun run;
  run.kept_s = times_asked_s(evidence);
  if (run.kept_s.empty()) input.fail("", "asks for no time after the start");
  run.end_s = run.kept_s.back();
  run.tolerance.relative = 1e-8;
  run.tolerance.absolute = input.number_or("time_error_K", 1e-3) *
                           problem.core->heat_capacity_J_m3K(20.0) / kEnthalpyUnit_J_m3;
  return run;
}

class HeatModel : public CaseModel {
 public:
  HeatModel(const CaseInput& input, const EvidenceCase& evidence)
      : history_(solve(input, evidence)), is_slab_(input.text("shape") == "slab") {}

  double value(const std::string& quantity, const Arguments& at) override {
    if (quantity != "temperature") unknown_quantity(quantity);
    const auto y = at.find("y_m");
    const double y_m = y != at.end() ? y->second : (is_slab_ ? 0.5 : 0.0);
    return history_.T_C({argument(at, "x_m"), y_m}, time_argument_s(at));
  }

 private:
  static TemperatureHistory solve(const CaseInput& input, const EvidenceCase& evidence) {
    HeatProblem problem = problem_of(input);
    const HeatRun run = run_of(input, evidence, problem);
    return solve_heat_problem(std::move(problem), run);
  }

  TemperatureHistory history_;
  bool is_slab_;
};

}  // namespace

CaseModelPtr heat_model(const CaseInput& input, const EvidenceCase& evidence) {
  return std::make_unique<HeatModel>(input, evidence);
}

}  // namespace ringward::cli
