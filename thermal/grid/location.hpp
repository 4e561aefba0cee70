#pragma once

#include <optional>

#include "thermal/grid/distances.hpp"
#include "thermal/grid/orthogonal_grid.hpp"

namespace ringward::thermal {

/// Coordinates along the axes of the grid: (x, y) or (r, angle).
struct GridPoint {
  double along_1 = 0;
  double along_2 = 0;
};

/// The image of a point of the section in the solved part; none when it lies outside the section.
/// A hair (1e-9 m) beyond the outline counts as on it.
[[nodiscard]] std::optional<GridPoint> in_solved_part(const OrthogonalGrid& grid,
                                                      const Point& point);

/// The cell that holds a point. On a line between two layers: the inner one.
[[nodiscard]] CellIndex cell_at(const OrthogonalGrid& grid, const GridPoint& at);

}  // namespace ringward::thermal
