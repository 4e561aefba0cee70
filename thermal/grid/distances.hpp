#pragma once

#include "thermal/grid/orthogonal_grid.hpp"

namespace ringward::thermal {

/// The four sides of a cell, and of a grid.
enum class Side { low_1 = 0, high_1 = 1, low_2 = 2, high_2 = 3 };
inline constexpr std::array<Side, 4> kSides{Side::low_1, Side::high_1, Side::low_2, Side::high_2};

[[nodiscard]] constexpr bool is_axis_1(Side side) {
  return side == Side::low_1 || side == Side::high_1;
}
[[nodiscard]] constexpr bool is_low(Side side) {
  return side == Side::low_1 || side == Side::low_2;
}

[[nodiscard]] constexpr Side opposite(Side side) {
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

/// Column and row of a cell.
struct CellIndex {
  std::size_t i = 0;
  std::size_t j = 0;
};

/// Middle of a cell's extent; temperatures are taken there. In a polar grid it lies a little
/// inside the centroid.
[[nodiscard]] inline double middle_1(const OrthogonalGrid& grid, std::size_t i) {
  return 0.5 * (grid.faces_1[i] + grid.faces_1[i + 1]);
}
[[nodiscard]] inline double middle_2(const OrthogonalGrid& grid, std::size_t j) {
  return 0.5 * (grid.faces_2[j] + grid.faces_2[j + 1]);
}

/// Distance from the middle of a cell to its face on the given side [m].
[[nodiscard]] inline double half_distance_m(const OrthogonalGrid& grid, CellIndex at, Side side) {
  if (is_axis_1(side)) return 0.5 * (grid.faces_1[at.i + 1] - grid.faces_1[at.i]);
  const double half = 0.5 * (grid.faces_2[at.j + 1] - grid.faces_2[at.j]);
  return grid.kind == GridKind::polar ? half * middle_1(grid, at.i) : half;
}

/// Length of a cell's face on the given side [m].
[[nodiscard]] inline double face_length_m(const OrthogonalGrid& grid, CellIndex at, Side side) {
  if (!is_axis_1(side)) return grid.faces_1[at.i + 1] - grid.faces_1[at.i];
  const double extent = grid.faces_2[at.j + 1] - grid.faces_2[at.j];
  if (grid.kind == GridKind::cartesian) return extent;
  return extent * grid.faces_1[side == Side::low_1 ? at.i : at.i + 1];
}

/// A point given along the axes in the section's coordinates; axisymmetric: (r, 0).
[[nodiscard]] Point section_point(const OrthogonalGrid& grid, double along_1, double along_2);
/// The middle of a face of a cell in the section's coordinates; axisymmetric: (r, 0).
[[nodiscard]] Point face_point(const OrthogonalGrid& grid, CellIndex at, Side side);
/// The middle of a cell in the section's coordinates; axisymmetric: (r, 0).
[[nodiscard]] Point middle_point(const OrthogonalGrid& grid, CellIndex at);

}  // namespace ringward::thermal
