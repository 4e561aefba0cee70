#include "mechanical/section/fibres.hpp"

#include <algorithm>
#include <cmath>

#include "thermal/base/units.hpp"

namespace ringward::mechanical {
namespace {

using thermal::Cell;
using thermal::Layer;
using thermal::OrthogonalGrid;
using thermal::Section;
using thermal::Symmetry;

struct XY {
  double x = 0;
  double y = 0;
};

class LayoutBuilder {
 public:
  LayoutBuilder(const Section& section, const Direction& direction)
      : direction_(direction),
        tube_carries_(section.tube && section.tube->role == thermal::TubeRole::composite) {}

  void add_cell(const Cell& cell, std::size_t source, const XY& at, double share) {
    if (cell.layer == Layer::core) {
      add(layout_.concrete, at, share * cell.area_m2 * (1.0 - cell.steel_fraction), source);
      add(layout_.steel, at, share * cell.area_m2 * cell.steel_fraction, source);
    } else if (cell.layer == Layer::tube && tube_carries_) {
      add(layout_.steel, at, share * cell.area_m2, source);
    }
  }

  void add_bar(const Fibre& bar) {
    const XY at{bar.u_m, bar.v_m};
    add(layout_.steel, at, bar.area_m2, bar.source);
    add(layout_.concrete, at, -bar.area_m2, bar.source);
  }

  FibreLayout finish() {
    for (const Fibre& fibre : layout_.concrete) {
      layout_.concrete_area_m2 += std::max(0.0, fibre.area_m2);
    }
    return std::move(layout_);
  }

 private:
  void add(std::vector<Fibre>& fibres, const XY& at, double area_m2, std::size_t source) {
    if (area_m2 == 0.0) return;
    const double u = at.x * direction_.x + at.y * direction_.y;
    const double v = at.y * direction_.x - at.x * direction_.y;
    fibres.push_back({u, v, area_m2, source});
    layout_.extent_m = std::max(layout_.extent_m, std::hypot(u, v));
  }

  FibreLayout layout_;
  Direction direction_;
  bool tube_carries_;
};

/// A ring becomes sectors that start at the direction of bending, each a point at the radius of
/// gyration of the ring: area and second moment of the ring are then exact.
void add_ring(LayoutBuilder& builder, const OrthogonalGrid& grid, std::size_t i,
              const Direction& direction) {
  const double r0 = grid.faces_1[i];
  const double r1 = grid.faces_1[i + 1];
  const double radius = std::sqrt(0.5 * (r0 * r0 + r1 * r1));
  const double start = std::atan2(direction.y, direction.x);
  for (int k = 0; k < kRingSectors; ++k) {
    const double angle = start + 2.0 * units::kPi * (k + 0.5) / kRingSectors;
    builder.add_cell(grid.cells[i], i, {radius * std::cos(angle), radius * std::sin(angle)},
                     1.0 / kRingSectors);
  }
}

void add_images(LayoutBuilder& builder, const OrthogonalGrid& grid, std::size_t index) {
  const Cell& cell = grid.cells[index];
  for (const thermal::Image& image : grid.images) {
    const XY at{image.xx * cell.x_m + image.xy * cell.y_m,
                image.yx * cell.x_m + image.yy * cell.y_m};
    builder.add_cell(cell, index, at, 1.0);
  }
}

std::vector<Fibre> merged(std::vector<Fibre> fibres, double tolerance_m) {
  const auto before = [](const Fibre& a, const Fibre& b) {
    return a.source != b.source ? a.source < b.source : a.u_m < b.u_m;
  };
  std::sort(fibres.begin(), fibres.end(), before);
  std::vector<Fibre> result;
  for (const Fibre& fibre : fibres) {
    const bool same = !result.empty() && result.back().source == fibre.source &&
                      std::abs(result.back().u_m - fibre.u_m) < tolerance_m &&
                      (result.back().area_m2 > 0) == (fibre.area_m2 > 0);
    if (same) {
      result.back().area_m2 += fibre.area_m2;
    } else {
      result.push_back({fibre.u_m, 0.0, fibre.area_m2, fibre.source});
    }
  }
  return result;
}

}  // namespace

std::vector<Fibre> bar_fibres(const Section& section, std::size_t first_source) {
  std::vector<Fibre> bars;
  for (const thermal::BarGroup& group : section.bars) {
    const double area_m2 = units::kPi * group.diameter_m * group.diameter_m / 4.0;
    for (const thermal::Point& at : group.positions) {
      bars.push_back({at.x_m, at.y_m, area_m2, first_source + bars.size()});
    }
  }
  return bars;
}

FibreLayout fibre_layout(const Section& section, const OrthogonalGrid& grid,
                         const Direction& direction) {
  LayoutBuilder builder(section, direction);
  for (std::size_t index = 0; index < grid.cells.size(); ++index) {
    if (grid.symmetry == Symmetry::axisymmetric) {
      add_ring(builder, grid, index, direction);
    } else {
      add_images(builder, grid, index);
    }
  }
  for (const Fibre& bar : bar_fibres(section, grid.cells.size())) builder.add_bar(bar);
  return builder.finish();
}

FibreLayout merged_in_v(const FibreLayout& layout) {
  const double tolerance_m = 1e-9 * layout.extent_m;
  FibreLayout result = layout;
  result.concrete = merged(layout.concrete, tolerance_m);
  result.steel = merged(layout.steel, tolerance_m);
  return result;
}

}  // namespace ringward::mechanical
