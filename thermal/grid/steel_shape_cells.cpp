#include "thermal/grid/steel_shape_cells.hpp"

#include <algorithm>
#include <cmath>

#include "thermal/base/units.hpp"

namespace ringward::thermal {
namespace {

struct Box {
  double x0, x1, y0, y1;
};

std::vector<Box> upright_i(const SteelShape& s) {
  const double half_depth = 0.5 * s.depth_m;
  const double half_width = 0.5 * s.width_m;
  const double clear = half_depth - s.flange_m;
  return {{-0.5 * s.web_m, 0.5 * s.web_m, -clear, clear},
          {-half_width, half_width, clear, half_depth},
          {-half_width, half_width, -half_depth, -clear}};
}

std::vector<Box> boxes_of(const SteelShape& shape) {
  std::vector<Box> boxes = upright_i(shape);
  if (shape.kind == SteelShapeKind::cross) {
    for (const Box& b : upright_i(shape)) boxes.push_back({b.y0, b.y1, b.x0, b.x1});
  }
  return boxes;
}

std::vector<double> sorted_unique(std::vector<double> values) {
  std::sort(values.begin(), values.end());
  const auto same = [](double a, double b) { return b - a < 1e-9; };
  values.erase(std::unique(values.begin(), values.end(), same), values.end());
  return values;
}

std::vector<double> edges(const std::vector<Box>& boxes, double Box::*low, double Box::*high) {
  std::vector<double> values;
  for (const Box& box : boxes) {
    values.push_back(box.*low);
    values.push_back(box.*high);
  }
  return sorted_unique(values);
}

/// The union of overlapping boxes, cut along all their edges into boxes that do not overlap.
std::vector<Box> disjoint(const std::vector<Box>& boxes) {
  const std::vector<double> x = edges(boxes, &Box::x0, &Box::x1);
  const std::vector<double> y = edges(boxes, &Box::y0, &Box::y1);
  std::vector<Box> parts;
  for (std::size_t j = 0; j + 1 < y.size(); ++j) {
    for (std::size_t i = 0; i + 1 < x.size(); ++i) {
      const double mx = 0.5 * (x[i] + x[i + 1]);
      const double my = 0.5 * (y[j] + y[j + 1]);
      const bool covered = std::any_of(boxes.begin(), boxes.end(), [&](const Box& b) {
        return mx > b.x0 && mx < b.x1 && my > b.y0 && my < b.y1;
      });
      if (covered) parts.push_back({x[i], x[i + 1], y[j], y[j + 1]});
    }
  }
  return parts;
}

ConvexPolygon turned(const Box& box, double angle_rad) {
  const double c = std::cos(angle_rad);
  const double s = std::sin(angle_rad);
  ConvexPolygon polygon;
  for (const Point& p : {Point{box.x0, box.y0}, Point{box.x1, box.y0}, Point{box.x1, box.y1},
                         Point{box.x0, box.y1}}) {
    polygon.push_back({c * p.x_m - s * p.y_m, s * p.x_m + c * p.y_m});
  }
  return polygon;
}

double area_in_box(const ConvexPolygon& part, const std::array<double, 4>& extent) {
  ConvexPolygon cut = clipped(part, {-1, 0, -extent[0]});
  cut = clipped(cut, {1, 0, extent[1]});
  cut = clipped(cut, {0, -1, -extent[2]});
  return area_m2(clipped(cut, {0, 1, extent[3]}));
}

double area_in_sector(const ConvexPolygon& part, const std::array<double, 4>& extent) {
  const ConvexPolygon above = clipped(part, {std::sin(extent[2]), -std::cos(extent[2]), 0});
  const ConvexPolygon wedge = clipped(above, {-std::sin(extent[3]), std::cos(extent[3]), 0});
  return area_within_circle_m2(wedge, extent[1]) - area_within_circle_m2(wedge, extent[0]);
}

}  // namespace

std::vector<ConvexPolygon> steel_shape_parts(const SteelShape& shape) {
  std::vector<ConvexPolygon> parts;
  for (const Box& box : disjoint(boxes_of(shape))) parts.push_back(turned(box, shape.rotation_rad));
  return parts;
}

ShapeEdges steel_shape_edges(const SteelShape& shape) {
  const double quarter_turns = shape.rotation_rad / (0.5 * units::kPi);
  if (std::abs(quarter_turns - std::round(quarter_turns)) > 1e-9) return {};
  const std::vector<Box> boxes = boxes_of(shape);
  ShapeEdges found{edges(boxes, &Box::x0, &Box::x1), edges(boxes, &Box::y0, &Box::y1)};
  if (std::lround(quarter_turns) % 2 != 0) std::swap(found.x_m, found.y_m);
  return found;
}

void set_steel_fractions(const SteelShape& shape, OrthogonalGrid& grid) {
  const std::vector<ConvexPolygon> parts = steel_shape_parts(shape);
  for (std::size_t j = 0; j < grid.count_2(); ++j) {
    for (std::size_t i = 0; i < grid.count_1(); ++i) {
      Cell& cell = grid.cells[grid.index(i, j)];
      if (cell.layer != Layer::core) continue;
      const std::array<double, 4> extent{grid.faces_1[i], grid.faces_1[i + 1], grid.faces_2[j],
                                         grid.faces_2[j + 1]};
      double steel_m2 = 0;
      for (const ConvexPolygon& part : parts) {
        steel_m2 += grid.kind == GridKind::cartesian ? area_in_box(part, extent)
                                                     : area_in_sector(part, extent);
      }
      const double fraction = std::clamp(steel_m2 / cell.area_m2, 0.0, 1.0);
      cell.steel_fraction = fraction < 1e-9 ? 0.0 : fraction > 1.0 - 1e-9 ? 1.0 : fraction;
    }
  }
}

}  // namespace ringward::thermal
