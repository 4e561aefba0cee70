#pragma once

#include <functional>

#include "thermal/grid/orthogonal_grid.hpp"

namespace ringward::thermal {

/// Layer of the cell whose middle has the given coordinates (x, y) or (r, angle).
using LayerAt = std::function<Layer(double middle_1, double middle_2)>;

/// Fills grid.cells with exact areas and centroids from the grid's kind, symmetry and faces.
/// An annular sector r1..r2 of opening b has its centroid at the radius
/// (2/3) (r2^3 - r1^3)/(r2^2 - r1^2) sin(b/2)/(b/2). A ring of an axisymmetric grid has
/// x_m = (2/3) (r2^3 - r1^3)/(r2^2 - r1^2), its mean radius by area, y_m = 0 and the area of
/// the whole ring.
void fill_cells(OrthogonalGrid& grid, const LayerAt& layer_at);

/// A Cartesian grid of the whole section without symmetry.
[[nodiscard]] OrthogonalGrid cartesian_grid(std::vector<double> faces_x_m,
                                            std::vector<double> faces_y_m, const LayerAt& layer_at);
/// A polar grid; `angles_rad` of two entries 0 and 2 pi with axisymmetric symmetry is one sector.
[[nodiscard]] OrthogonalGrid polar_grid(std::vector<double> radii_m, std::vector<double> angles_rad,
                                        Symmetry symmetry, const LayerAt& layer_at);

}  // namespace ringward::thermal
