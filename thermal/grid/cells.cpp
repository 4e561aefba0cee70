#include "thermal/grid/cells.hpp"

#include <cmath>

#include "thermal/base/units.hpp"

namespace ringward::thermal {
namespace {

struct Extent {
  double from_1, to_1, from_2, to_2;
};

Cell cartesian_cell(const Extent& e) {
  Cell cell;
  cell.x_m = 0.5 * (e.from_1 + e.to_1);
  cell.y_m = 0.5 * (e.from_2 + e.to_2);
  cell.area_m2 = (e.to_1 - e.from_1) * (e.to_2 - e.from_2);
  return cell;
}

double mean_radius(const Extent& e) {
  const double sum = e.from_1 + e.to_1;
  return (2.0 / 3.0) * (sum * sum - e.from_1 * e.to_1) / sum;
}

Cell ring_cell(const Extent& e) {
  Cell cell;
  cell.x_m = mean_radius(e);
  cell.area_m2 = units::kPi * (e.to_1 - e.from_1) * (e.to_1 + e.from_1);
  return cell;
}

Cell sector_cell(const Extent& e) {
  const double half_opening = 0.5 * (e.to_2 - e.from_2);
  const double middle = 0.5 * (e.to_2 + e.from_2);
  const double radius = mean_radius(e) * std::sin(half_opening) / half_opening;
  Cell cell;
  cell.x_m = radius * std::cos(middle);
  cell.y_m = radius * std::sin(middle);
  cell.area_m2 = half_opening * (e.to_1 - e.from_1) * (e.to_1 + e.from_1);
  return cell;
}

Cell cell_of(const OrthogonalGrid& grid, const Extent& extent) {
  if (grid.kind == GridKind::cartesian) return cartesian_cell(extent);
  return grid.symmetry == Symmetry::axisymmetric ? ring_cell(extent) : sector_cell(extent);
}

}  // namespace

void fill_cells(OrthogonalGrid& grid, const LayerAt& layer_at) {
  grid.cells.clear();
  grid.cells.reserve(grid.count_1() * grid.count_2());
  for (std::size_t j = 0; j < grid.count_2(); ++j) {
    for (std::size_t i = 0; i < grid.count_1(); ++i) {
      const Extent extent{grid.faces_1[i], grid.faces_1[i + 1], grid.faces_2[j],
                          grid.faces_2[j + 1]};
      Cell cell = cell_of(grid, extent);
      cell.layer =
          layer_at(0.5 * (extent.from_1 + extent.to_1), 0.5 * (extent.from_2 + extent.to_2));
      grid.cells.push_back(cell);
    }
  }
}

OrthogonalGrid cartesian_grid(std::vector<double> faces_x_m, std::vector<double> faces_y_m,
                              const LayerAt& layer_at) {
  OrthogonalGrid grid;
  grid.faces_1 = std::move(faces_x_m);
  grid.faces_2 = std::move(faces_y_m);
  grid.images = {Image{}};
  fill_cells(grid, layer_at);
  return grid;
}

OrthogonalGrid polar_grid(std::vector<double> radii_m, std::vector<double> angles_rad,
                          Symmetry symmetry, const LayerAt& layer_at) {
  OrthogonalGrid grid;
  grid.kind = GridKind::polar;
  grid.symmetry = symmetry;
  grid.faces_1 = std::move(radii_m);
  grid.faces_2 = std::move(angles_rad);
  grid.images = {Image{}};
  fill_cells(grid, layer_at);
  return grid;
}

}  // namespace ringward::thermal
