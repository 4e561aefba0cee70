#pragma once

#include <cstddef>
#include <vector>

#include "thermal/grid/orthogonal_grid.hpp"

namespace ringward::cli {

/// The whole section as one structured grid, put together from the solved part and its images.
struct WholeSection {
  thermal::GridKind kind = thermal::GridKind::cartesian;
  bool is_rings = false;        ///< nothing changes with the angle
  std::vector<double> lines_1;  ///< x [m] or r [m], increasing
  std::vector<double> lines_2;  ///< y [m] or angle [rad], increasing; angles cover one full turn
  /// The solved cell that patch (i, j) shows, at i + j * count_1().
  std::vector<std::size_t> source_cell;

  [[nodiscard]] std::size_t count_1() const { return lines_1.size() - 1; }
  [[nodiscard]] std::size_t count_2() const { return lines_2.size() - 1; }
  [[nodiscard]] std::size_t source(std::size_t i, std::size_t j) const {
    return source_cell[i + j * count_1()];
  }
  /// Corner (i, j) of the patches.
  [[nodiscard]] thermal::Point corner(std::size_t i, std::size_t j) const;
};

/// Mirrors the solved part into the whole section. Arcs of polar grids are divided so that no
/// patch spans more than 5 degrees and straight edges stay close to the circle.
[[nodiscard]] WholeSection unfold(const thermal::OrthogonalGrid& grid);

/// The same section with more lines between the present ones, for drawing.
/// @param widest_m widest patch along an axis [m]; for angles, its arc at the outer radius [m]
/// @return without `source_cell`: the new patches are finer than the cells
[[nodiscard]] WholeSection refined(const WholeSection& whole, double widest_m);

/// The middle of patch (i, j).
[[nodiscard]] thermal::Point middle(const WholeSection& whole, std::size_t i, std::size_t j);

}  // namespace ringward::cli
