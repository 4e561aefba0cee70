#pragma once

#include <cstddef>
#include <vector>

#include "mechanical/column.hpp"
#include "thermal/grid/orthogonal_grid.hpp"

namespace ringward::mechanical {

/// A unit vector of the section. Bending is described in axes u (along it) and v (anticlockwise
/// from u by a right angle).
struct Direction {
  double x = 1;
  double y = 0;
};

/// A piece of area at one temperature. `source` indexes the temperature points: first the cells of
/// the grid, then the bars in the order of the input.
struct Fibre {
  double u_m = 0;
  double v_m = 0;
  double area_m2 = 0;
  std::size_t source = 0;
};

/// The whole section as fibres, in the axes of one direction.
struct FibreLayout {
  std::vector<Fibre> concrete;  ///< negative areas: concrete that bars displace
  std::vector<Fibre> steel;     ///< bars, steel shape, and the tube where it carries axial load
  double extent_m = 0;          ///< largest distance of a fibre from the centroid
  double concrete_area_m2 = 0;  ///< of the positive concrete fibres
};

/// How many sectors a full ring of an axisymmetric grid is cut into.
inline constexpr int kRingSectors = 24;

/// @param grid the grid of the heat flow; its mirror images are unfolded here
[[nodiscard]] FibreLayout fibre_layout(const thermal::Section& section,
                                       const thermal::OrthogonalGrid& grid,
                                       const Direction& direction);

/// The same fibres with those merged that a bending about the v axis alone cannot tell apart.
[[nodiscard]] FibreLayout merged_in_v(const FibreLayout& layout);

/// All bars in the order of the input: position and area.
[[nodiscard]] std::vector<Fibre> bar_fibres(const thermal::Section& section,
                                            std::size_t first_source);

}  // namespace ringward::mechanical
