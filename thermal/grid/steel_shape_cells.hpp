#pragma once

#include <vector>

#include "thermal/grid/convex_area.hpp"
#include "thermal/grid/orthogonal_grid.hpp"
#include "thermal/section/section.hpp"

namespace ringward::thermal {

/// The embedded shape as rectangles that do not overlap, turned by its rotation. An I is web and
/// two flanges; a cross is the union of two such at right angles.
[[nodiscard]] std::vector<ConvexPolygon> steel_shape_parts(const SteelShape& shape);

/// Edges of the shape along x and along y, when its rotation is a multiple of 90 degrees;
/// otherwise empty.
struct ShapeEdges {
  std::vector<double> x_m;
  std::vector<double> y_m;
};
[[nodiscard]] ShapeEdges steel_shape_edges(const SteelShape& shape);

/// Sets steel_fraction of every core cell: exact area of the shape in the cell over its area.
void set_steel_fractions(const SteelShape& shape, OrthogonalGrid& grid);

}  // namespace ringward::thermal
