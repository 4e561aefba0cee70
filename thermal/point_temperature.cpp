#include "thermal/point_temperature.hpp"

#include <algorithm>
#include <cmath>
#include <map>

#include "thermal/base/units.hpp"

namespace ringward::thermal {
namespace {

constexpr std::size_t kStencil = 4;

/// A place on an axis where the temperature is known.
struct Node {
  double position = 0;
  std::size_t index = 0;  // column or row of the cell it belongs to
  enum class Kind { cell, low_face, high_face, opposite } kind = Kind::cell;
};

struct WeightedNode {
  Node node;
  double weight = 0;
};

/// Columns [i0, i1) and rows [j0, j1) of one material around a cell.
struct Region {
  std::size_t i0 = 0, i1 = 0, j0 = 0, j1 = 0;
};

bool same_material(const HeatEquation& eq, std::size_t a, std::size_t b) {
  return &eq.curve(a) == &eq.curve(b);
}

Region region_around(const HeatEquation& eq, CellIndex at) {
  const OrthogonalGrid& grid = eq.grid();
  const std::size_t cell = grid.index(at.i, at.j);
  Region r{at.i, at.i + 1, at.j, at.j + 1};
  const auto same = [&](std::size_t i, std::size_t j) {
    return same_material(eq, cell, grid.index(i, j));
  };
  while (r.i0 > 0 && same(r.i0 - 1, at.j)) --r.i0;
  while (r.i1 < grid.count_1() && same(r.i1, at.j)) ++r.i1;
  const auto whole_row = [&](std::size_t j) {
    for (std::size_t i = r.i0; i < r.i1; ++i) {
      if (!same(i, j)) return false;
    }
    return true;
  };
  while (r.j0 > 0 && whole_row(r.j0 - 1)) --r.j0;
  while (r.j1 < grid.count_2() && whole_row(r.j1)) ++r.j1;
  return r;
}

/// A side of the grid that is a line of symmetry (or an insulated face).
bool is_mirror(const HeatEquation& eq, CellIndex at, Side side) {
  return !eq.neighbour(at, side) && eq.condition(at, side) == nullptr;
}

bool is_pole(const OrthogonalGrid& grid, std::size_t i0) {
  return grid.kind == GridKind::polar && i0 == 0 && grid.faces_1.front() == 0.0;
}

void add_mirrored(std::vector<Node>& nodes, double line, Node::Kind kind) {
  const std::size_t count = std::min<std::size_t>(nodes.size(), kStencil);
  const bool at_low_end = line <= nodes.front().position;
  std::vector<Node> mirrored;
  for (std::size_t k = 0; k < count; ++k) {
    Node node = at_low_end ? nodes[k] : nodes[nodes.size() - 1 - k];
    node.position = 2.0 * line - node.position;
    if (kind == Node::Kind::opposite) node.kind = kind;
    mirrored.push_back(node);
  }
  if (at_low_end) {
    nodes.insert(nodes.begin(), mirrored.rbegin(), mirrored.rend());
  } else {
    nodes.insert(nodes.end(), mirrored.begin(), mirrored.end());
  }
}

enum class Faces { with, without };

std::vector<Node> nodes_along_1(const HeatEquation& eq, const Region& r, std::size_t j,
                                Faces faces) {
  const OrthogonalGrid& grid = eq.grid();
  std::vector<Node> nodes;
  for (std::size_t i = r.i0; i < r.i1; ++i) nodes.push_back({middle_1(grid, i), i});
  const std::size_t last = r.i1 - 1;
  const bool axisymmetric = grid.symmetry == Symmetry::axisymmetric;
  const bool all_angles = r.j0 == 0 && r.j1 == grid.count_2();
  if (is_pole(grid, r.i0) && all_angles) {
    add_mirrored(nodes, 0.0, axisymmetric ? Node::Kind::cell : Node::Kind::opposite);
  } else if (is_mirror(eq, {r.i0, j}, Side::low_1) && !is_pole(grid, r.i0)) {
    add_mirrored(nodes, grid.faces_1[r.i0], Node::Kind::cell);
  } else if (faces == Faces::with && !is_pole(grid, r.i0)) {
    nodes.insert(nodes.begin(), {grid.faces_1[r.i0], r.i0, Node::Kind::low_face});
  }
  if (is_mirror(eq, {last, j}, Side::high_1)) {
    add_mirrored(nodes, grid.faces_1[r.i1], Node::Kind::cell);
  } else if (faces == Faces::with) {
    nodes.push_back({grid.faces_1[r.i1], last, Node::Kind::high_face});
  }
  return nodes;
}

std::vector<Node> whole_circle(const OrthogonalGrid& grid) {
  std::vector<Node> nodes;
  const std::size_t n = grid.count_2();
  const std::size_t margin = std::min(n, kStencil);
  const double turn = 2.0 * units::kPi;
  for (std::size_t k = n - margin; k < n; ++k) nodes.push_back({middle_2(grid, k) - turn, k});
  for (std::size_t k = 0; k < n; ++k) nodes.push_back({middle_2(grid, k), k});
  for (std::size_t k = 0; k < margin; ++k) nodes.push_back({middle_2(grid, k) + turn, k});
  return nodes;
}

std::vector<Node> nodes_along_2(const HeatEquation& eq, const Region& r, std::size_t i,
                                Faces faces) {
  const OrthogonalGrid& grid = eq.grid();
  if (eq.problem().closed_circle && r.j0 == 0 && r.j1 == grid.count_2()) return whole_circle(grid);
  std::vector<Node> nodes;
  for (std::size_t j = r.j0; j < r.j1; ++j) nodes.push_back({middle_2(grid, j), j});
  const std::size_t last = r.j1 - 1;
  if (is_mirror(eq, {i, r.j0}, Side::low_2)) {
    add_mirrored(nodes, grid.faces_2[r.j0], Node::Kind::cell);
  } else if (faces == Faces::with) {
    nodes.insert(nodes.begin(), {grid.faces_2[r.j0], r.j0, Node::Kind::low_face});
  }
  if (is_mirror(eq, {i, last}, Side::high_2)) {
    add_mirrored(nodes, grid.faces_2[r.j1], Node::Kind::cell);
  } else if (faces == Faces::with) {
    nodes.push_back({grid.faces_2[r.j1], last, Node::Kind::high_face});
  }
  return nodes;
}

/// Lagrange weights of the nodes next to a position.
std::vector<WeightedNode> weights_at(const std::vector<Node>& nodes, double position,
                                     std::size_t most) {
  const std::size_t count = std::min(most, nodes.size());
  const auto above = std::upper_bound(nodes.begin(), nodes.end(), position,
                                      [](double p, const Node& n) { return p < n.position; });
  const std::ptrdiff_t centred = (above - nodes.begin()) - static_cast<std::ptrdiff_t>(count / 2);
  const auto room = static_cast<std::ptrdiff_t>(nodes.size() - count);
  const auto first = static_cast<std::size_t>(std::clamp<std::ptrdiff_t>(centred, 0, room));
  std::vector<WeightedNode> weighted;
  for (std::size_t a = first; a < first + count; ++a) {
    double weight = 1;
    for (std::size_t b = first; b < first + count; ++b) {
      if (b == a) continue;
      weight *= (position - nodes[b].position) / (nodes[a].position - nodes[b].position);
    }
    weighted.push_back({nodes[a], weight});
  }
  return weighted;
}

double opposite_angle(const OrthogonalGrid& grid, double angle) {
  const double far = 0.5 * (grid.faces_1.front() + grid.faces_1.back());
  const Point mirrored{-far * std::cos(angle), -far * std::sin(angle)};
  const std::optional<GridPoint> found = in_solved_part(grid, mirrored);
  return found ? found->along_2 : angle;
}

double value_at(const FieldView& field, const Node& along_1, const Node& along_2) {
  const CellIndex at{along_1.index, along_2.index};
  if (along_1.kind == Node::Kind::low_face) return face_temperature_C(field, at, Side::low_1);
  if (along_1.kind == Node::Kind::high_face) return face_temperature_C(field, at, Side::high_1);
  if (along_2.kind == Node::Kind::low_face) return face_temperature_C(field, at, Side::low_2);
  if (along_2.kind == Node::Kind::high_face) return face_temperature_C(field, at, Side::high_2);
  return field.state(field.equation->grid().index(at.i, at.j)).T_C;
}

bool is_face(const Node& node) {
  return node.kind == Node::Kind::low_face || node.kind == Node::Kind::high_face;
}

double angle_or_y(const OrthogonalGrid& grid, const Node& along_1, double along_2) {
  return along_1.kind == Node::Kind::opposite ? opposite_angle(grid, along_2) : along_2;
}

InterfaceSide interface_side(const FieldView& field, const HeatEquation::FaceStencil& face) {
  const EnthalpyCurve::State near = field.state(face.near);
  const EnthalpyCurve::State far = field.state(face.far);
  return {face.side,
          face.near_weight_1_m * near.potential_W_m + face.far_weight_1_m * far.potential_W_m,
          near.T_C};
}

}  // namespace

double face_temperature_C(const FieldView& field, CellIndex at, Side side) {
  const HeatEquation& eq = *field.equation;
  const OrthogonalGrid& grid = eq.grid();
  const std::size_t cell = grid.index(at.i, at.j);
  if (const std::optional<CellIndex> next = eq.neighbour(at, side)) {
    const std::size_t other = grid.index(next->i, next->j);
    if (same_material(eq, cell, other)) {
      const double own_C = field.state(cell).T_C;
      const double near = half_distance_m(grid, at, side);
      const double share = near / (near + half_distance_m(grid, *next, side));
      return own_C + share * (field.state(other).T_C - own_C);
    }
    return interface_flow(interface_side(field, eq.stencil(at, side)),
                          interface_side(field, eq.stencil(*next, opposite(side))),
                          eq.resistance_m2K_W(cell, other))
        .face_a_C;
  }
  const InterfaceSide in = interface_side(field, eq.stencil(at, side));
  const SurfaceCondition* seen = eq.condition(at, side);
  if (seen == nullptr) return in.guess_C;
  const double outside = eq.outside_C(*seen, face_point(grid, at, side), field.t_s);
  return surface_flow(in.side, in.inner_W_m2, *seen, outside, in.guess_C).face_C;
}

double point_temperature_C(const FieldView& field, const GridPoint& at) {
  const HeatEquation& eq = *field.equation;
  const CellIndex home = cell_at(eq.grid(), at);
  const Region region = region_around(eq, home);
  double T_C = 0;
  for (const WeightedNode& a :
       weights_at(nodes_along_1(eq, region, home.j, Faces::with), at.along_1, kStencil)) {
    const Faces faces = is_face(a.node) ? Faces::without : Faces::with;
    const double along_2 = angle_or_y(eq.grid(), a.node, at.along_2);
    const std::vector<Node> nodes = nodes_along_2(eq, region, a.node.index, faces);
    double inner = 0;
    for (const WeightedNode& b : weights_at(nodes, along_2, kStencil)) {
      inner += b.weight * value_at(field, a.node, b.node);
    }
    T_C += a.weight * inner;
  }
  return T_C;
}

Probe cell_probe(const HeatEquation& equation, const GridPoint& at) {
  const OrthogonalGrid& grid = equation.grid();
  const CellIndex home = cell_at(grid, at);
  const Region region = region_around(equation, home);
  std::map<std::size_t, double> weights;
  for (const WeightedNode& a :
       weights_at(nodes_along_1(equation, region, home.j, Faces::without), at.along_1, kStencil)) {
    const double along_2 = angle_or_y(grid, a.node, at.along_2);
    const std::vector<Node> nodes = nodes_along_2(equation, region, a.node.index, Faces::without);
    for (const WeightedNode& b : weights_at(nodes, along_2, kStencil)) {
      weights[grid.index(a.node.index, b.node.index)] += a.weight * b.weight;
    }
  }
  Probe probe;
  for (const auto& [cell, weight] : weights) probe.terms.push_back({cell, weight});
  return probe;
}

}  // namespace ringward::thermal
