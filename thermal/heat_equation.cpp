#include "thermal/heat_equation.hpp"

#include <algorithm>
#include <map>
#include <numeric>
#include <utility>

#include "thermal/base/error.hpp"

namespace ringward::thermal {
namespace {

const ThermalLawPtr& law_of(const HeatProblem& problem, Layer layer) {
  const ThermalLawPtr& law = layer == Layer::core   ? problem.core
                             : layer == Layer::tube ? problem.tube
                                                    : problem.protection;
  if (!law) throw Error(ErrorKind::bad_input, "the heat flow lacks the law of a layer");
  return law;
}

std::vector<MaterialShare> shares_of(const HeatProblem& problem, const Cell& cell) {
  const ThermalLawPtr& law = law_of(problem, cell.layer);
  if (cell.steel_fraction <= 0.0) return {{law, 1.0}};
  if (!problem.steel_shape) throw Error(ErrorKind::bad_input, "the steel shape lacks its law");
  if (cell.steel_fraction >= 1.0) return {{problem.steel_shape, 1.0}};
  return {{law, 1.0 - cell.steel_fraction}, {problem.steel_shape, cell.steel_fraction}};
}

constexpr Side opposite(Side side) {
  switch (side) {
    case Side::low_1:
      return Side::high_1;
    case Side::high_1:
      return Side::low_1;
    case Side::low_2:
      return Side::high_2;
    default:
      return Side::low_2;
  }
}

}  // namespace

HeatEquation::HeatEquation(HeatProblem problem) : problem_(std::move(problem)) {
  assign_curves();
  connect();
  build_pattern();
  for (InnerFace& face : inner_) face.entries = pair_entries(face.a, face.b);
  for (Interface& face : interfaces_) face.entries = pair_entries(face.a, face.b);
  for (SurfaceFace& face : surface_) face.entry = entry(face.cell, face.cell);
  peaks_.assign(size(), 0.0);
  dried_shift_.assign(size(), 0.0);
  states_.resize(size());
  outside_C_.resize(problem_.conditions.size());
  const std::vector<double> start = initial_state();
  peaks_.assign(size(), -1e300);
  note_peaks(start);
}

void HeatEquation::assign_curves() {
  std::map<std::pair<Layer, double>, std::size_t> known;
  for (const Cell& cell : grid().cells) {
    const bool all_steel = cell.steel_fraction >= 1.0;
    const std::pair key{cell.layer, all_steel ? 1.0 : cell.steel_fraction};
    const auto [found, is_new] = known.try_emplace(key, curves_.size());
    if (is_new) curves_.emplace_back(shares_of(problem_, cell));
    curve_of_cell_.push_back(found->second);
    may_dry_.push_back(curves_[found->second].dries() ? 1 : 0);
    weight_.push_back(1.0 / (cell.area_m2 * kEnthalpyUnit_J_m3));
  }
}

std::optional<CellIndex> HeatEquation::neighbour(CellIndex at, Side side) const {
  const std::size_t n1 = grid().count_1();
  const std::size_t n2 = grid().count_2();
  switch (side) {
    case Side::low_1:
      return at.i == 0 ? std::nullopt : std::optional(CellIndex{at.i - 1, at.j});
    case Side::high_1:
      return at.i + 1 == n1 ? std::nullopt : std::optional(CellIndex{at.i + 1, at.j});
    case Side::low_2:
      if (at.j == 0 && !problem_.closed_circle) return std::nullopt;
      return CellIndex{at.i, at.j == 0 ? n2 - 1 : at.j - 1};
    case Side::high_2:
      if (at.j + 1 == n2 && !problem_.closed_circle) return std::nullopt;
      return CellIndex{at.i, at.j + 1 == n2 ? 0 : at.j + 1};
  }
  return std::nullopt;
}

const SurfaceCondition* HeatEquation::condition(CellIndex at, Side side) const {
  const std::vector<int>& along = problem_.sides[static_cast<std::size_t>(side)];
  if (along.empty()) return nullptr;
  const int which = along.at(is_axis_1(side) ? at.j : at.i);
  return which < 0 ? nullptr : &problem_.conditions.at(static_cast<std::size_t>(which));
}

double HeatEquation::resistance_m2K_W(std::size_t a, std::size_t b) const {
  const Layer layer_a = grid().cells[a].layer;
  const Layer layer_b = grid().cells[b].layer;
  const bool core_and_tube = (layer_a == Layer::core && layer_b == Layer::tube) ||
                             (layer_a == Layer::tube && layer_b == Layer::core);
  return core_and_tube ? problem_.contact_resistance_m2K_W : 0.0;
}

void HeatEquation::connect() {
  for (std::size_t j = 0; j < grid().count_2(); ++j) {
    for (std::size_t i = 0; i < grid().count_1(); ++i) {
      const CellIndex at{i, j};
      middle_.push_back(middle_point(grid(), at));
      connect_pair(at, Side::high_1);
      if (grid().count_2() > 1) connect_pair(at, Side::high_2);
      for (Side side : kSides) {
        if (!neighbour(at, side)) connect_surface(at, side);
      }
    }
  }
}

void HeatEquation::connect_pair(CellIndex at, Side side) {
  const std::optional<CellIndex> other = neighbour(at, side);
  if (!other) return;
  const std::size_t a = grid().index(at.i, at.j);
  const std::size_t b = grid().index(other->i, other->j);
  const double length = face_length_m(grid(), at, side);
  const HalfCell half_a{&curve(a), half_distance_m(grid(), at, side)};
  const HalfCell half_b{&curve(b), half_distance_m(grid(), *other, opposite(side))};
  const double resistance = resistance_m2K_W(a, b);
  if (half_a.curve == half_b.curve) {
    inner_.push_back({a, b, length / (half_a.distance_m + half_b.distance_m), {}});
  } else {
    interfaces_.push_back({a, b, half_a, half_b, length, resistance, {}});
  }
}

void HeatEquation::connect_surface(CellIndex at, Side side) {
  const SurfaceCondition* seen = condition(at, side);
  const double length = face_length_m(grid(), at, side);
  if (seen == nullptr || length == 0.0) return;
  const std::size_t cell = grid().index(at.i, at.j);
  const auto which = static_cast<std::size_t>(seen - problem_.conditions.data());
  surface_.push_back({cell,
                      {&curve(cell), half_distance_m(grid(), at, side)},
                      length,
                      which,
                      face_point(grid(), at, side),
                      0});
}

void HeatEquation::build_pattern() {
  std::vector<std::vector<int>> columns(size());
  for (std::size_t k = 0; k < size(); ++k) columns[k].push_back(static_cast<int>(k));
  const auto join = [&](std::size_t a, std::size_t b) {
    columns[a].push_back(static_cast<int>(b));
    columns[b].push_back(static_cast<int>(a));
  };
  for (const InnerFace& face : inner_) join(face.a, face.b);
  for (const Interface& face : interfaces_) join(face.a, face.b);
  pattern_.column_starts.push_back(0);
  for (std::vector<int>& rows : columns) {
    std::sort(rows.begin(), rows.end());
    rows.erase(std::unique(rows.begin(), rows.end()), rows.end());
    pattern_.rows.insert(pattern_.rows.end(), rows.begin(), rows.end());
    pattern_.column_starts.push_back(static_cast<int>(pattern_.rows.size()));
  }
}

std::size_t HeatEquation::entry(std::size_t row, std::size_t column) const {
  const auto first = pattern_.rows.begin() + pattern_.column_starts[column];
  const auto last = pattern_.rows.begin() + pattern_.column_starts[column + 1];
  const auto found = std::lower_bound(first, last, static_cast<int>(row));
  return static_cast<std::size_t>(found - pattern_.rows.begin());
}

std::array<std::size_t, 4> HeatEquation::pair_entries(std::size_t a, std::size_t b) const {
  return {entry(a, a), entry(b, a), entry(a, b), entry(b, b)};
}

std::vector<double> HeatEquation::initial_state() const {
  std::vector<double> u(size());
  for (std::size_t k = 0; k < size(); ++k) {
    const Point& at = middle_[k];
    u[k] = curve(k).enthalpy(problem_.initial_C_at ? problem_.initial_C_at(at.x_m, at.y_m)
                                                   : problem_.initial_C);
  }
  return u;
}

EnthalpyCurve::State HeatEquation::state(std::size_t cell, double u, double peak) const {
  const EnthalpyCurve& of_cell = curve(cell);
  if (u >= peak || !of_cell.dries()) return of_cell.first_heating(u);
  const double peak_C = of_cell.first_heating(peak).T_C;
  return of_cell.dried(u - peak + of_cell.dried_enthalpy(peak_C));
}

void HeatEquation::note_peaks(std::span<const double> u) {
  for (std::size_t k = 0; k < u.size(); ++k) {
    if (!(u[k] > peaks_[k])) continue;
    peaks_[k] = u[k];
    if (may_dry_[k] == 0) continue;
    const double peak_C = curve(k).first_heating(u[k]).T_C;
    dried_shift_[k] = curve(k).dried_enthalpy(peak_C) - u[k];
  }
}

void HeatEquation::update_states(std::span<const double> u) {
  for (std::size_t k = 0; k < u.size(); ++k) {
    const EnthalpyCurve& of_cell = curve(k);
    states_[k] = u[k] >= peaks_[k] || may_dry_[k] == 0 ? of_cell.first_heating(u[k])
                                                       : of_cell.dried(u[k] + dried_shift_[k]);
  }
}

void HeatEquation::update_outside(double t_s) {
  for (std::size_t k = 0; k < outside_C_.size(); ++k) {
    const SurfaceCondition& seen = problem_.conditions[k];
    outside_C_[k] = seen.T_C ? seen.T_C(t_s) : 0.0;
  }
}

double HeatEquation::outside_C(const SurfaceCondition& condition, const Point& point,
                               double t_s) const {
  return condition.T_C_at ? condition.T_C_at(t_s, point.x_m, point.y_m) : condition.T_C(t_s);
}

FaceFlow HeatEquation::flow(const SurfaceFace& face, double t_s) const {
  const SurfaceCondition& seen = problem_.conditions[face.condition];
  const double outside =
      seen.T_C_at ? seen.T_C_at(t_s, face.point.x_m, face.point.y_m) : outside_C_[face.condition];
  return surface_flow(face.half, states_[face.cell], seen, outside);
}

void HeatEquation::rate(double t_s, std::span<const double> u, std::span<double> du_dt) {
  update_states(u);
  update_outside(t_s);
  std::fill(du_dt.begin(), du_dt.end(), 0.0);
  for (const InnerFace& f : inner_) {
    const double heat = f.conductance * (states_[f.a].potential_W_m - states_[f.b].potential_W_m);
    du_dt[f.a] -= heat;
    du_dt[f.b] += heat;
  }
  for (const Interface& f : interfaces_) {
    const double heat = f.length_m * interface_flow(f.half_a, states_[f.a], f.half_b, states_[f.b],
                                                    f.resistance_m2K_W)
                                         .flux_W_m2;
    du_dt[f.a] -= heat;
    du_dt[f.b] += heat;
  }
  for (const SurfaceFace& f : surface_) du_dt[f.cell] += f.length_m * flow(f, t_s).flux_W_m2;
  for (std::size_t k = 0; k < u.size(); ++k) du_dt[k] *= weight_[k];
  if (!problem_.source_W_m3) return;
  for (std::size_t k = 0; k < u.size(); ++k) {
    du_dt[k] += problem_.source_W_m3(t_s, middle_[k].x_m, middle_[k].y_m) / kEnthalpyUnit_J_m3;
  }
}

void HeatEquation::jacobian(double t_s, std::span<const double> u, std::span<double> values) {
  update_states(u);
  update_outside(t_s);
  std::fill(values.begin(), values.end(), 0.0);
  const auto add_pair = [&](const auto& f, double by_a, double by_b) {
    values[f.entries[0]] -= by_a * weight_[f.a];
    values[f.entries[1]] += by_a * weight_[f.b];
    values[f.entries[2]] -= by_b * weight_[f.a];
    values[f.entries[3]] += by_b * weight_[f.b];
  };
  for (const InnerFace& f : inner_) {
    add_pair(f, f.conductance * states_[f.a].potential_slope,
             -f.conductance * states_[f.b].potential_slope);
  }
  for (const Interface& f : interfaces_) {
    const InterfaceFlow across =
        interface_flow(f.half_a, states_[f.a], f.half_b, states_[f.b], f.resistance_m2K_W);
    add_pair(f, f.length_m * across.slope_a * states_[f.a].potential_slope,
             f.length_m * across.slope_b * states_[f.b].potential_slope);
  }
  for (const SurfaceFace& f : surface_) {
    values[f.entry] += f.length_m * flow(f, t_s).potential_slope * states_[f.cell].potential_slope *
                       weight_[f.cell];
  }
}

double HeatEquation::absorbed_W_m(double t_s, std::span<const double> u) {
  update_outside(t_s);
  double sum = 0;
  for (const SurfaceFace& f : surface_) {
    states_[f.cell] = state(f.cell, u[f.cell], peaks_[f.cell]);
    sum += f.length_m * flow(f, t_s).flux_W_m2;
  }
  return sum;
}

double HeatEquation::enthalpy_J_m(std::span<const double> u) const {
  double sum = 0;
  for (std::size_t k = 0; k < u.size(); ++k) sum += u[k] / weight_[k];
  return sum;
}

}  // namespace ringward::thermal
