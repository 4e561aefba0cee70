#pragma once

#include <array>
#include <cstddef>
#include <vector>

#include "thermal/section/section.hpp"

namespace ringward::thermal {

enum class GridKind { cartesian, polar };
enum class Layer { core, tube, protection };
enum class Symmetry { none, half, quarter, axisymmetric };

/// One cell of the solved part of the section.
struct Cell {
  double x_m = 0;  ///< centroid; axisymmetric: the ring's mean radius by area, with y = 0
  double y_m = 0;
  double area_m2 = 0;  ///< axisymmetric: the whole ring
  Layer layer = Layer::core;
  double steel_fraction = 0;  ///< share of the area taken by an embedded steel shape, 0..1
};

/// An image of the solved part in the whole section: (x, y) -> (xx x + xy y, yx x + yy y).
struct Image {
  double xx = 1, xy = 0, yx = 0, yy = 1;
};

/// A structured grid, Cartesian (axis 1 = x, axis 2 = y) or polar (axis 1 = r, axis 2 = angle),
/// with grid lines on every interface between layers. Cell (i, j) has index i + j * count_1.
struct OrthogonalGrid {
  GridKind kind = GridKind::cartesian;
  Symmetry symmetry = Symmetry::none;
  std::vector<double> faces_1;  ///< x [m] or r [m], increasing, count_1 + 1
  std::vector<double> faces_2;  ///< y [m] or angle [rad], increasing, count_2 + 1
  std::vector<Cell> cells;
  /// The copies that make up the whole section, the identity first. One entry (the identity)
  /// when the grid is axisymmetric or covers the section.
  std::vector<Image> images;

  [[nodiscard]] std::size_t count_1() const { return faces_1.size() - 1; }
  [[nodiscard]] std::size_t count_2() const { return faces_2.size() - 1; }
  [[nodiscard]] std::size_t index(std::size_t i, std::size_t j) const { return i + j * count_1(); }
};

}  // namespace ringward::thermal
