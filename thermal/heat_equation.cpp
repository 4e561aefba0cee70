#include "thermal/heat_equation.hpp"

#include <algorithm>
#include <cmath>
#include <limits>
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

constexpr double kUnknown = std::numeric_limits<double>::quiet_NaN();

}  // namespace

HeatEquation::HeatEquation(HeatProblem problem) : problem_(std::move(problem)) {
  assign_curves();
  connect();
  build_pattern();
  find_entries();
  if (!mixed_.empty()) {
    pure_core_.emplace(std::vector<MaterialShare>{{problem_.core, 1.0}});
    pure_shape_.emplace(std::vector<MaterialShare>{{problem_.steel_shape, 1.0}});
  }
  states_.resize(size());
  outside_C_.resize(problem_.conditions.size());
  peaks_ = initial_state();
  dried_shift_.assign(size(), kUnknown);
}

void HeatEquation::assign_curves() {
  std::map<std::pair<Layer, double>, std::size_t> known;
  for (const Cell& cell : grid().cells) {
    const bool all_steel = cell.steel_fraction >= 1.0;
    const std::pair key{cell.layer, all_steel ? 1.0 : cell.steel_fraction};
    const auto [found, is_new] = known.try_emplace(key, curves_.size());
    if (is_new) curves_.emplace_back(shares_of(problem_, cell));
    curve_of_cell_.push_back(found->second);
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

bool HeatEquation::is_cut_by_shape(std::size_t a, std::size_t b) const {
  const auto is_cut = [](const Cell& cell) {
    return cell.steel_fraction > 0.0 && cell.steel_fraction < 1.0;
  };
  const Cell& first = grid().cells[a];
  const Cell& second = grid().cells[b];
  return problem_.in_steel_shape && first.layer == Layer::core && second.layer == Layer::core &&
         (is_cut(first) || is_cut(second));
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

/// Parabola through the face (0) and two cells at d1 and d2:
/// gradient = -(1/d1 + 1/d2) P_f + d2/(d1 (d2 - d1)) P_1 - d1/(d2 (d2 - d1)) P_2.
HeatEquation::FaceStencil HeatEquation::stencil(CellIndex at, Side side) const {
  const std::size_t near = grid().index(at.i, at.j);
  const double d1 = half_distance_m(grid(), at, side);
  FaceStencil face{near, near, {&curve(near), 1.0 / d1}, 1.0 / d1, 0.0};
  const std::optional<CellIndex> next = neighbour(at, opposite(side));
  if (!next) return face;
  const std::size_t far = grid().index(next->i, next->j);
  if (&curve(far) != &curve(near) || far == near) return face;
  const double d2 = 2.0 * d1 + half_distance_m(grid(), *next, side);
  face.far = far;
  face.side.face_weight_1_m = 1.0 / d1 + 1.0 / d2;
  face.near_weight_1_m = d2 / (d1 * (d2 - d1));
  face.far_weight_1_m = -d1 / (d2 * (d2 - d1));
  return face;
}

void HeatEquation::connect_pair(CellIndex at, Side side) {
  const std::optional<CellIndex> other = neighbour(at, side);
  if (!other) return;
  const std::size_t a = grid().index(at.i, at.j);
  const std::size_t b = grid().index(other->i, other->j);
  const double length = face_length_m(grid(), at, side);
  if (is_cut_by_shape(a, b)) {
    mixed_.push_back(
        {a, b, length, mixed_path(grid(), at, *other, side, problem_.in_steel_shape), {}});
  } else if (&curve(a) == &curve(b)) {
    const double distance =
        half_distance_m(grid(), at, side) + half_distance_m(grid(), *other, side);
    inner_.push_back({a, b, length / distance, {}});
  } else {
    interfaces_.push_back(
        {stencil(at, side), stencil(*other, opposite(side)), length, resistance_m2K_W(a, b), {}});
  }
}

void HeatEquation::connect_surface(CellIndex at, Side side) {
  const SurfaceCondition* seen = condition(at, side);
  const double length = face_length_m(grid(), at, side);
  if (seen == nullptr || length == 0.0) return;
  const auto which = static_cast<std::size_t>(seen - problem_.conditions.data());
  surface_.push_back({stencil(at, side), length, which, face_point(grid(), at, side), {}});
}

void HeatEquation::build_pattern() {
  std::vector<std::vector<int>> columns(size());
  const auto add = [&](std::size_t row, std::size_t column) {
    columns[column].push_back(static_cast<int>(row));
  };
  for (std::size_t k = 0; k < size(); ++k) add(k, k);
  for (const InnerFace& face : inner_) {
    add(face.a, face.b);
    add(face.b, face.a);
  }
  for (const MixedFace& face : mixed_) {
    add(face.a, face.b);
    add(face.b, face.a);
  }
  for (const Interface& face : interfaces_) {
    for (std::size_t column : {face.a.near, face.a.far, face.b.near, face.b.far}) {
      add(face.a.near, column);
      add(face.b.near, column);
    }
  }
  pattern_.column_starts.push_back(0);
  for (std::vector<int>& rows : columns) {
    std::sort(rows.begin(), rows.end());
    rows.erase(std::unique(rows.begin(), rows.end()), rows.end());
    pattern_.rows.insert(pattern_.rows.end(), rows.begin(), rows.end());
    pattern_.column_starts.push_back(static_cast<int>(pattern_.rows.size()));
  }
}

void HeatEquation::find_entries() {
  const auto find_pair = [this](auto& f) {
    f.entries = {entry(f.a, f.a), entry(f.b, f.a), entry(f.a, f.b), entry(f.b, f.b)};
  };
  for (InnerFace& f : inner_) find_pair(f);
  for (MixedFace& f : mixed_) find_pair(f);
  for (Interface& f : interfaces_) {
    std::size_t k = 0;
    for (std::size_t column : {f.a.near, f.a.far, f.b.near, f.b.far}) {
      f.entries[k++] = entry(f.a.near, column);
      f.entries[k++] = entry(f.b.near, column);
    }
  }
  for (SurfaceFace& f : surface_) {
    f.entries = {entry(f.in.near, f.in.near), entry(f.in.near, f.in.far)};
  }
}

std::size_t HeatEquation::entry(std::size_t row, std::size_t column) const {
  const auto first = pattern_.rows.begin() + pattern_.column_starts[column];
  const auto last = pattern_.rows.begin() + pattern_.column_starts[column + 1];
  const auto found = std::lower_bound(first, last, static_cast<int>(row));
  return static_cast<std::size_t>(found - pattern_.rows.begin());
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
    dried_shift_[k] = kUnknown;
  }
}

void HeatEquation::update_state(std::size_t cell, double u) {
  const EnthalpyCurve& of_cell = curve(cell);
  if (u >= peaks_[cell] || !of_cell.dries()) {
    states_[cell] = of_cell.first_heating(u);
    return;
  }
  double& shift = dried_shift_[cell];
  if (std::isnan(shift)) {
    shift = of_cell.dried_enthalpy(of_cell.first_heating(peaks_[cell]).T_C) - peaks_[cell];
  }
  states_[cell] = of_cell.dried(u + shift);
}

void HeatEquation::update_states(std::span<const double> u) {
  for (std::size_t k = 0; k < u.size(); ++k) update_state(k, u[k]);
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

SurfaceFlow HeatEquation::flow(const SurfaceFace& face, double t_s) const {
  const SurfaceCondition& seen = problem_.conditions[face.condition];
  const double outside =
      seen.T_C_at ? seen.T_C_at(t_s, face.point.x_m, face.point.y_m) : outside_C_[face.condition];
  return surface_flow(face.in.side, inner_W_m2(face.in), seen, outside, states_[face.in.near].T_C);
}

InterfaceFlow HeatEquation::flow(const Interface& face) const {
  return interface_flow({face.a.side, inner_W_m2(face.a), states_[face.a.near].T_C},
                        {face.b.side, inner_W_m2(face.b), states_[face.b.near].T_C},
                        face.resistance_m2K_W);
}

MixedFlow HeatEquation::flow(const MixedFace& face) const {
  return mixed_flow(face.path, *pure_core_, *pure_shape_, states_[face.a].T_C, states_[face.b].T_C);
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
    const double heat = f.length_m * flow(f).flux_W_m2;
    du_dt[f.a.near] -= heat;
    du_dt[f.b.near] += heat;
  }
  for (const MixedFace& f : mixed_) {
    const double heat = f.length_m * flow(f).flux_W_m2;
    du_dt[f.a] -= heat;
    du_dt[f.b] += heat;
  }
  for (const SurfaceFace& f : surface_) du_dt[f.in.near] += f.length_m * flow(f, t_s).flux_W_m2;
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
  for (const InnerFace& f : inner_) {
    const double by_a = f.conductance * states_[f.a].potential_slope;
    const double by_b = f.conductance * states_[f.b].potential_slope;
    values[f.entries[0]] -= by_a * weight_[f.a];
    values[f.entries[1]] += by_a * weight_[f.b];
    values[f.entries[2]] += by_b * weight_[f.a];
    values[f.entries[3]] -= by_b * weight_[f.b];
  }
  add_interfaces(values);
  add_mixed(values);
  add_surface(t_s, values);
}

void HeatEquation::add_interfaces(std::span<double> values) const {
  for (const Interface& f : interfaces_) {
    const InterfaceFlow across = flow(f);
    const double by_inner_a = f.length_m * across.inner_a_slope;
    const double by_inner_b = f.length_m * across.inner_b_slope;
    const std::array<double, 4> by_column{
        by_inner_a * f.a.near_weight_1_m * states_[f.a.near].potential_slope,
        by_inner_a * f.a.far_weight_1_m * states_[f.a.far].potential_slope,
        by_inner_b * f.b.near_weight_1_m * states_[f.b.near].potential_slope,
        by_inner_b * f.b.far_weight_1_m * states_[f.b.far].potential_slope};
    for (std::size_t k = 0; k < by_column.size(); ++k) {
      values[f.entries[2 * k]] -= by_column[k] * weight_[f.a.near];
      values[f.entries[2 * k + 1]] += by_column[k] * weight_[f.b.near];
    }
  }
}

void HeatEquation::add_mixed(std::span<double> values) const {
  for (const MixedFace& f : mixed_) {
    const MixedFlow between = flow(f);
    const double by_a = f.length_m * between.slope_a * states_[f.a].T_slope;
    const double by_b = f.length_m * between.slope_b * states_[f.b].T_slope;
    values[f.entries[0]] -= by_a * weight_[f.a];
    values[f.entries[1]] += by_a * weight_[f.b];
    values[f.entries[2]] -= by_b * weight_[f.a];
    values[f.entries[3]] += by_b * weight_[f.b];
  }
}

void HeatEquation::add_surface(double t_s, std::span<double> values) const {
  for (const SurfaceFace& f : surface_) {
    const double by_inner = f.length_m * flow(f, t_s).inner_slope * weight_[f.in.near];
    values[f.entries[0]] += by_inner * f.in.near_weight_1_m * states_[f.in.near].potential_slope;
    values[f.entries[1]] += by_inner * f.in.far_weight_1_m * states_[f.in.far].potential_slope;
  }
}

double HeatEquation::absorbed_W_m(double t_s, std::span<const double> u) {
  update_outside(t_s);
  double sum = 0;
  for (const SurfaceFace& f : surface_) {
    update_state(f.in.near, u[f.in.near]);
    update_state(f.in.far, u[f.in.far]);
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
