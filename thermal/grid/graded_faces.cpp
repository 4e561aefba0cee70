#include "thermal/grid/graded_faces.hpp"

#include <algorithm>
#include <cmath>

namespace ringward::thermal {
namespace {

double depth_of_the_bound(const SizeLaw& law) { return (law.largest_m - law.first_m) / law.growth; }

void append_faces(const Stretch& stretch, std::vector<double>& faces) {
  const bool from_the_left = stretch.exposed_m <= stretch.from_m;
  const double sign = from_the_left ? 1.0 : -1.0;
  const double n_from = stretch.size.count(std::abs(stretch.from_m - stretch.exposed_m));
  const double n_to = stretch.size.count(std::abs(stretch.to_m - stretch.exposed_m));
  // A tenth of a cell more than a whole number does not earn a further cell.
  const int cells =
      std::max(stretch.least_cells, static_cast<int>(std::ceil(std::abs(n_to - n_from) - 0.1)));
  for (int k = 1; k < cells; ++k) {
    const double n = n_from + (n_to - n_from) * k / cells;
    faces.push_back(stretch.exposed_m + sign * stretch.size.depth(n));
  }
  faces.push_back(stretch.to_m);
}

}  // namespace

double SizeLaw::count(double d_m) const {
  const double bound = depth_of_the_bound(*this);
  const double graded = std::log1p(growth * std::min(d_m, bound) / first_m) / growth;
  return graded + std::max(0.0, d_m - bound) / largest_m;
}

double SizeLaw::depth(double cells) const {
  const double bound = depth_of_the_bound(*this);
  const double cells_to_bound = count(bound);
  if (cells <= cells_to_bound) return first_m * std::expm1(growth * cells) / growth;
  return bound + (cells - cells_to_bound) * largest_m;
}

std::vector<double> graded_faces(const std::vector<Stretch>& stretches) {
  std::vector<double> faces{stretches.front().from_m};
  for (const Stretch& stretch : stretches) append_faces(stretch, faces);
  return faces;
}

}  // namespace ringward::thermal
