#include "thermal/temperature_data.hpp"

#include <algorithm>
#include <cmath>
#include <limits>

#include "thermal/field_at_time.hpp"
#include "thermal/law_range.hpp"

namespace ringward::thermal {
namespace {

bool is_tube(const OrthogonalGrid& grid, std::size_t i, std::size_t j) {
  return grid.cells[grid.index(i, j)].layer == Layer::tube;
}

Probe mean_of(const OrthogonalGrid& grid, const std::vector<std::size_t>& cells) {
  double area = 0;
  for (std::size_t cell : cells) area += grid.cells[cell].area_m2;
  Probe mean;
  for (std::size_t cell : cells) mean.terms.push_back({cell, grid.cells[cell].area_m2 / area});
  return mean;
}

/// Unbroken tube cells along one axis, [from, to).
struct Run {
  std::size_t from = 0, to = 0;
};

Run run_along_1(const OrthogonalGrid& grid, std::size_t i, std::size_t j) {
  Run run{i, i + 1};
  while (run.from > 0 && is_tube(grid, run.from - 1, j)) --run.from;
  while (run.to < grid.count_1() && is_tube(grid, run.to, j)) ++run.to;
  return run;
}

Run run_along_2(const OrthogonalGrid& grid, std::size_t i, std::size_t j) {
  Run run{j, j + 1};
  while (run.from > 0 && is_tube(grid, i, run.from - 1)) --run.from;
  while (run.to < grid.count_2() && is_tube(grid, i, run.to)) ++run.to;
  return run;
}

/// Cells of the block of tube cells that starts at (i, j) with the wall across axis 1, axis 2 or
/// both. Each block is met once, at its first cell.
class StripFinder {
 public:
  explicit StripFinder(const OrthogonalGrid& grid) : grid_(grid) {
    seen_.assign(grid.cells.size(), 0);
  }

  std::vector<Probe> strips() {
    std::vector<Probe> found;
    for (std::size_t j = 0; j < grid_.count_2(); ++j) {
      for (std::size_t i = 0; i < grid_.count_1(); ++i) {
        if (!is_tube(grid_, i, j) || seen_[grid_.index(i, j)] != 0) continue;
        found.push_back(mean_of(grid_, block_at(i, j)));
      }
    }
    return found;
  }

 private:
  std::vector<std::size_t> block_at(std::size_t i, std::size_t j) {
    const Run along_1 = run_along_1(grid_, i, j);
    const Run along_2 = run_along_2(grid_, i, j);
    std::vector<std::size_t> cells;
    if (grid_.kind == GridKind::polar || crosses_wall(along_1, j)) {
      for (std::size_t a = along_1.from; a < along_1.to; ++a) add(a, j, cells);
    } else if (crosses_wall_2(along_2, i)) {
      for (std::size_t b = along_2.from; b < along_2.to; ++b) add(i, b, cells);
    } else {
      add_corner(i, j, cells);
    }
    return cells;
  }

  /// Whether a run along axis 1 goes through the wall from side to side: it ends at a core cell.
  bool crosses_wall(const Run& run, std::size_t j) const {
    return (run.from > 0 && layer(run.from - 1, j) == Layer::core) ||
           (run.to < grid_.count_1() && layer(run.to, j) == Layer::core);
  }
  bool crosses_wall_2(const Run& run, std::size_t i) const {
    return (run.from > 0 && layer(i, run.from - 1) == Layer::core) ||
           (run.to < grid_.count_2() && layer(i, run.to) == Layer::core);
  }

  /// All tube cells of the corner around (i, j): neither their row nor their column meets the core.
  void add_corner(std::size_t i, std::size_t j, std::vector<std::size_t>& cells) {
    const auto in_corner = [&](std::size_t a, std::size_t b) {
      return is_tube(grid_, a, b) && !crosses_wall(run_along_1(grid_, a, b), b) &&
             !crosses_wall_2(run_along_2(grid_, a, b), a);
    };
    std::size_t end_i = i;
    while (end_i < grid_.count_1() && in_corner(end_i, j)) ++end_i;
    std::size_t end_j = j;
    while (end_j < grid_.count_2() && in_corner(i, end_j)) ++end_j;
    for (std::size_t b = j; b < end_j; ++b) {
      for (std::size_t a = i; a < end_i; ++a) add(a, b, cells);
    }
  }

  void add(std::size_t i, std::size_t j, std::vector<std::size_t>& cells) {
    seen_[grid_.index(i, j)] = 1;
    cells.push_back(grid_.index(i, j));
  }
  Layer layer(std::size_t i, std::size_t j) const { return grid_.cells[grid_.index(i, j)].layer; }

  const OrthogonalGrid& grid_;
  std::vector<char> seen_;
};

bool is_core(const OrthogonalGrid& grid, CellIndex at) {
  return grid.cells[grid.index(at.i, at.j)].layer == Layer::core;
}

std::vector<CoreFace> faces_of_core(const HeatEquation& equation) {
  const OrthogonalGrid& grid = equation.grid();
  std::vector<CoreFace> faces;
  for (std::size_t j = 0; j < grid.count_2(); ++j) {
    for (std::size_t i = 0; i < grid.count_1(); ++i) {
      if (!is_core(grid, {i, j})) continue;
      for (Side side : kSides) {
        const std::optional<CellIndex> next = equation.neighbour({i, j}, side);
        const bool is_outline =
            next ? !is_core(grid, *next) : equation.condition({i, j}, side) != nullptr;
        if (is_outline) faces.push_back({{i, j}, side});
      }
    }
  }
  return faces;
}

/// Where two faces of one core cell meet: the corners of a rectangular core.
std::vector<GridPoint> corners_of_core(const OrthogonalGrid& grid,
                                       const std::vector<CoreFace>& faces) {
  std::vector<GridPoint> corners;
  for (const CoreFace& a : faces) {
    if (!is_axis_1(a.side)) continue;
    for (const CoreFace& b : faces) {
      if (is_axis_1(b.side) || a.at.i != b.at.i || a.at.j != b.at.j) continue;
      corners.push_back({grid.faces_1[a.at.i + (is_low(a.side) ? 0 : 1)],
                         grid.faces_2[a.at.j + (is_low(b.side) ? 0 : 1)]});
    }
  }
  return corners;
}

double hottest(const std::vector<Probe>& strips, std::span<const double> cells_C) {
  double highest = -std::numeric_limits<double>::infinity();
  for (const Probe& strip : strips) highest = std::max(highest, strip.T_C(cells_C));
  return highest;
}

}  // namespace

void TemperatureHistory::Data::finish() {
  tube_strips = StripFinder(equation->grid()).strips();
  core_faces = faces_of_core(*equation);
  core_corners = corners_of_core(equation->grid(), core_faces);
  notices = law_range_notices(*equation);
  if (tube_strips.empty()) return;
  std::vector<double> cells_C(equation->size());
  for (double t_s : times_s) {
    const FieldAtTime field(*this, t_s);
    for (const Probe& strip : tube_strips) {
      for (const Probe::Term& term : strip.terms) cells_C[term.cell] = field.state(term.cell).T_C;
    }
    tube_C.push_back(hottest(tube_strips, cells_C));
    tube_peak_C.push_back(
        std::max(tube_C.back(), tube_peak_C.empty() ? tube_C.back() : tube_peak_C.back()));
  }
}

}  // namespace ringward::thermal
