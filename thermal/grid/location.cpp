#include "thermal/grid/location.hpp"

#include <algorithm>
#include <cmath>

#include "thermal/base/units.hpp"

namespace ringward::thermal {
namespace {

constexpr double kHair_m = 1e-9;

/// Brings a coordinate that lies a hair outside onto the end; false when it lies further out.
bool settle(double& value, const std::vector<double>& faces, double hair) {
  if (value < faces.front() - hair || value > faces.back() + hair) return false;
  value = std::clamp(value, faces.front(), faces.back());
  return true;
}

std::optional<GridPoint> polar_point(const OrthogonalGrid& grid, const Point& p) {
  GridPoint at{std::hypot(p.x_m, p.y_m), 0.0};
  if (!settle(at.along_1, grid.faces_1, kHair_m)) return std::nullopt;
  const double start = grid.faces_2.front();
  // At the centre every angle is the same.
  if (grid.symmetry == Symmetry::axisymmetric || at.along_1 <= kHair_m) {
    at.along_2 = 0.5 * (start + grid.faces_2.back());
    return at;
  }
  const double turn = 2.0 * units::kPi;
  const double raw = std::atan2(p.y_m, p.x_m) - start;
  at.along_2 = start + raw - turn * std::floor(raw / turn);
  // Just below the start is as good as on it.
  if (start + turn - at.along_2 < 1e-12) at.along_2 = start;
  if (!settle(at.along_2, grid.faces_2, 1e-9)) return std::nullopt;
  return at;
}

std::optional<GridPoint> in_grid(const OrthogonalGrid& grid, const Point& p) {
  if (grid.kind == GridKind::polar) return polar_point(grid, p);
  GridPoint at{p.x_m, p.y_m};
  if (!settle(at.along_1, grid.faces_1, kHair_m)) return std::nullopt;
  if (!settle(at.along_2, grid.faces_2, kHair_m)) return std::nullopt;
  return at;
}

std::size_t interval(const std::vector<double>& faces, double value) {
  const auto right = std::upper_bound(faces.begin(), faces.end(), value) - faces.begin();
  const auto last = static_cast<std::ptrdiff_t>(faces.size()) - 2;
  return static_cast<std::size_t>(std::clamp<std::ptrdiff_t>(right - 1, 0, last));
}

bool on_line(double value, double line) { return std::abs(value - line) <= 2.0 * kHair_m; }

/// The lower of the two layers that meet at a line next to the point is the inner one.
Layer layer(const OrthogonalGrid& grid, CellIndex at) {
  return grid.cells[grid.index(at.i, at.j)].layer;
}

}  // namespace

std::optional<GridPoint> in_solved_part(const OrthogonalGrid& grid, const Point& point) {
  for (const Image& image : grid.images) {
    // The images are turns and mirrors: their inverse is their transpose.
    const Point source{image.xx * point.x_m + image.yx * point.y_m,
                       image.xy * point.x_m + image.yy * point.y_m};
    if (const std::optional<GridPoint> at = in_grid(grid, source)) return at;
  }
  return std::nullopt;
}

CellIndex cell_at(const OrthogonalGrid& grid, const GridPoint& at) {
  const CellIndex found{interval(grid.faces_1, at.along_1), interval(grid.faces_2, at.along_2)};
  CellIndex best = found;
  const auto consider = [&](CellIndex candidate) {
    if (layer(grid, candidate) < layer(grid, best)) best = candidate;
  };
  const bool low_1 = found.i > 0 && on_line(at.along_1, grid.faces_1[found.i]);
  const bool high_1 =
      found.i + 1 < grid.count_1() && on_line(at.along_1, grid.faces_1[found.i + 1]);
  const bool is_cartesian = grid.kind == GridKind::cartesian;
  const bool low_2 = is_cartesian && found.j > 0 && on_line(at.along_2, grid.faces_2[found.j]);
  const bool high_2 = is_cartesian && found.j + 1 < grid.count_2() &&
                      on_line(at.along_2, grid.faces_2[found.j + 1]);
  for (std::size_t dj = low_2 ? found.j - 1 : found.j; dj <= (high_2 ? found.j + 1 : found.j);
       ++dj) {
    for (std::size_t di = low_1 ? found.i - 1 : found.i; di <= (high_1 ? found.i + 1 : found.i);
         ++di) {
      consider({di, dj});
    }
  }
  return best;
}

}  // namespace ringward::thermal
