#include "thermal/grid/distances.hpp"

#include <cmath>

namespace ringward::thermal {

Point section_point(const OrthogonalGrid& grid, double along_1, double along_2) {
  if (grid.kind == GridKind::cartesian) return {along_1, along_2};
  if (grid.symmetry == Symmetry::axisymmetric) return {along_1, 0.0};
  return {along_1 * std::cos(along_2), along_1 * std::sin(along_2)};
}

Point face_point(const OrthogonalGrid& grid, CellIndex at, Side side) {
  double along_1 = middle_1(grid, at.i);
  double along_2 = middle_2(grid, at.j);
  if (side == Side::low_1) along_1 = grid.faces_1[at.i];
  if (side == Side::high_1) along_1 = grid.faces_1[at.i + 1];
  if (side == Side::low_2) along_2 = grid.faces_2[at.j];
  if (side == Side::high_2) along_2 = grid.faces_2[at.j + 1];
  return section_point(grid, along_1, along_2);
}

Point middle_point(const OrthogonalGrid& grid, CellIndex at) {
  return section_point(grid, middle_1(grid, at.i), middle_2(grid, at.j));
}

}  // namespace ringward::thermal
