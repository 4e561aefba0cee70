#include "thermal/grid/section_grid.hpp"

#include <algorithm>
#include <cmath>

#include "thermal/base/units.hpp"
#include "thermal/grid/cells.hpp"
#include "thermal/grid/graded_faces.hpp"
#include "thermal/grid/steel_shape_cells.hpp"
#include "thermal/grid/symmetry.hpp"

namespace ringward::thermal {
namespace {

// Sizes of the standard grid. Found by comparing with converged solutions of round and square
// tubed columns: they leave about 0.5 K.
constexpr double kFirstSize_m = 2.5e-3;
constexpr double kGrowth = 0.10;
// Late in a fire the temperature varies over the half width of the core, so that the largest
// cells follow it.
constexpr double kCellsToCentre = 18.0;
constexpr double kLargestFrom_m = 4e-3;
constexpr double kLargestTo_m = 16e-3;
constexpr double kTubeSize_m = 3e-3;
constexpr double kUnheatedFactor = 2.0;
constexpr int kLeastTubeCells = 2;
constexpr double kProtectionCells = 6.0;
constexpr SizeLaw kArcSize{.first_m = 6e-3, .growth = 0.2, .largest_m = 30e-3};
// One dimension costs little, so it is solved finer.
constexpr double kAxisymmetricFactor = 0.5;
// Cells cut by a steel shape converge with first order only, so that they are taken smaller.
constexpr double kCutCircleFactor = 0.6;
constexpr double kCutRectangleFactor = 0.8;
constexpr double kSameLine_m = 1e-6;

double factor_of(const Resolution& resolution) {
  const double named = resolution.accuracy == Accuracy::coarse     ? 2.0
                       : resolution.accuracy == Accuracy::standard ? 1.0
                                                                   : 0.45;
  return named * resolution.scale;
}

SizeLaw uniform(double size_m) { return {size_m, 1.0, size_m}; }

/// Half an axis, from the centre outward.
struct HalfAxis {
  double core_m = 0;
  double tube_m = 0;
  double protection_m = 0;
  bool heated = true;
  double factor = 1;
  std::vector<double> kept_lines_m;  // in the core, to be met by grid lines

  [[nodiscard]] std::vector<Stretch> stretches() const {
    std::vector<Stretch> outward;
    add_core(outward);
    if (tube_m > 0.0) {
      const double end = core_m + tube_m;
      const int least = std::max(1, static_cast<int>(std::lround(kLeastTubeCells / factor)));
      outward.push_back({core_m, end, end, uniform(kTubeSize_m * factor), least});
    }
    if (protection_m > 0.0) {
      const double start = core_m + tube_m;
      const double end = start + protection_m;
      const double size = protection_m * factor / kProtectionCells;
      outward.push_back({start, end, end, uniform(size), 2});
    }
    return outward;
  }

 private:
  void add_core(std::vector<Stretch>& outward) const {
    const double largest = std::clamp(core_m / kCellsToCentre, kLargestFrom_m, kLargestTo_m);
    SizeLaw size = SizeLaw{kFirstSize_m, kGrowth, largest}.scaled(factor);
    if (!heated) size.first_m *= kUnheatedFactor;
    double from = 0;
    std::vector<double> lines = kept_lines_m;
    lines.push_back(core_m);
    std::sort(lines.begin(), lines.end());
    for (double line : lines) {
      if (line < from + kSameLine_m || line > core_m) continue;
      outward.push_back({from, line, core_m, size, 1});
      from = line;
    }
  }
};

std::vector<Stretch> mirrored(std::vector<Stretch> outward) {
  std::reverse(outward.begin(), outward.end());
  for (Stretch& s : outward) {
    const double from = s.from_m;
    s.from_m = -s.to_m;
    s.to_m = -from;
    s.exposed_m = -s.exposed_m;
  }
  return outward;
}

std::vector<double> whole_axis(const HalfAxis& low, const HalfAxis& high) {
  std::vector<Stretch> all = mirrored(low.stretches());
  const std::vector<Stretch> upper = high.stretches();
  all.insert(all.end(), upper.begin(), upper.end());
  return graded_faces(all);
}

std::vector<double> lines_on_side(const std::vector<double>& lines_m, double sign) {
  std::vector<double> kept;
  for (double line : lines_m) {
    if (sign * line > kSameLine_m) kept.push_back(sign * line);
  }
  return kept;
}

double protection_m(const Section& section) {
  return section.protection ? section.protection->thickness_m : 0.0;
}

/// Layers are nested, so the depth below the outside names the layer.
LayerAt rectangle_layers(const Section& section) {
  const double half_x = 0.5 * section.core_width_m();
  const double half_y = 0.5 * section.core_depth_m();
  const double tube = section.tube_thickness_m();
  return [=](double x, double y) {
    const double outside = std::max(std::abs(x) - half_x, std::abs(y) - half_y);
    return outside < 0.0 ? Layer::core : outside < tube ? Layer::tube : Layer::protection;
  };
}

class RectangleGrid {
 public:
  RectangleGrid(const Section& section, const ExposedParts& exposed, const Resolution& resolution)
      : section_(section),
        exposed_(exposed),
        factor_(factor_of(resolution)),
        symmetry_(rectangle_symmetry(section, exposed)) {
    if (!section.steel_shape) return;
    edges_ = steel_shape_edges(*section.steel_shape);
    if (edges_.x_m.empty()) factor_ *= kCutRectangleFactor;
  }

  [[nodiscard]] SectionGrid build() const {
    SectionGrid built;
    built.grid.faces_1 = faces(symmetry_.left_right, half_x(Face::left), half_x(Face::right));
    built.grid.faces_2 = faces(symmetry_.bottom_top, half_y(Face::bottom), half_y(Face::top));
    built.grid.symmetry = symmetry_.left_right && symmetry_.bottom_top   ? Symmetry::quarter
                          : symmetry_.left_right || symmetry_.bottom_top ? Symmetry::half
                                                                         : Symmetry::none;
    built.grid.images = rectangle_images(symmetry_);
    fill_cells(built.grid, rectangle_layers(section_));
    set_sides(built);
    return built;
  }

 private:
  static std::vector<double> faces(bool is_mirrored, const HalfAxis& low, const HalfAxis& high) {
    return is_mirrored ? graded_faces(high.stretches()) : whole_axis(low, high);
  }
  [[nodiscard]] HalfAxis half_x(Face face) const {
    return half(0.5 * section_.core_width_m(), face,
                lines_on_side(edges_.x_m, face == Face::right ? 1.0 : -1.0));
  }
  [[nodiscard]] HalfAxis half_y(Face face) const {
    return half(0.5 * section_.core_depth_m(), face,
                lines_on_side(edges_.y_m, face == Face::top ? 1.0 : -1.0));
  }
  [[nodiscard]] HalfAxis half(double core_m, Face face, std::vector<double> lines_m) const {
    return {core_m,
            section_.tube_thickness_m(),
            protection_m(section_),
            exposed_.face(face) == FaceCondition::heated,
            factor_,
            std::move(lines_m)};
  }
  void set_sides(SectionGrid& built) const {
    const auto set = [&](Side side, Face face, std::size_t count) {
      built.sides[static_cast<std::size_t>(side)].assign(count, exposed_.face(face));
    };
    const std::size_t n1 = built.grid.count_1();
    const std::size_t n2 = built.grid.count_2();
    if (!symmetry_.left_right) set(Side::low_1, Face::left, n2);
    set(Side::high_1, Face::right, n2);
    if (!symmetry_.bottom_top) set(Side::low_2, Face::bottom, n1);
    set(Side::high_2, Face::top, n1);
  }

  const Section& section_;
  const ExposedParts& exposed_;
  double factor_;
  RectangleSymmetry symmetry_;
  ShapeEdges edges_;
};

/// Ends of the partial arcs inside the solved part, with its own two ends around them.
struct AngleBreak {
  double at_rad = 0;
  bool is_arc_end = false;
};

std::vector<AngleBreak> angle_breaks(const ExposedParts& exposed, const CirclePart& part) {
  const double turn = 2.0 * units::kPi;
  const double hair = 1e-9;
  std::vector<AngleBreak> breaks{{part.from_rad, false}, {part.from_rad + part.extent_rad, false}};
  for (const Arc& arc : partial_arcs(exposed)) {
    for (double end : {arc.from_rad, arc.to_rad}) {
      const double after = end - part.from_rad;
      const double within = after - turn * std::floor(after / turn);
      if (within < hair || within > turn - hair) {
        if (part.symmetry == Symmetry::none) breaks[0].is_arc_end = breaks[1].is_arc_end = true;
      } else if (within < part.extent_rad - hair) {
        breaks.push_back({part.from_rad + within, true});
      }
    }
  }
  std::sort(breaks.begin(), breaks.end(),
            [](const AngleBreak& a, const AngleBreak& b) { return a.at_rad < b.at_rad; });
  const auto same = [&](const AngleBreak& a, const AngleBreak& b) {
    return b.at_rad - a.at_rad < hair;
  };
  breaks.erase(std::unique(breaks.begin(), breaks.end(), same), breaks.end());
  return breaks;
}

std::vector<double> angles(const std::vector<AngleBreak>& breaks, double radius_m, double factor) {
  const SizeLaw graded = kArcSize.scaled(factor);
  std::vector<Stretch> stretches;
  for (std::size_t k = 0; k + 1 < breaks.size(); ++k) {
    const AngleBreak& a = breaks[k];
    const AngleBreak& b = breaks[k + 1];
    const double from = a.at_rad * radius_m;
    const double to = b.at_rad * radius_m;
    const double middle = 0.5 * (from + to);
    if (a.is_arc_end && b.is_arc_end) {
      stretches.push_back({from, middle, from, graded, 2});
      stretches.push_back({middle, to, to, graded, 2});
    } else if (a.is_arc_end || b.is_arc_end) {
      stretches.push_back({from, to, a.is_arc_end ? from : to, graded, 3});
    } else {
      stretches.push_back({from, to, from, uniform(0.5 * graded.largest_m), 6});
    }
  }
  std::vector<double> faces = graded_faces(stretches);
  for (double& face : faces) face /= radius_m;
  faces.front() = breaks.front().at_rad;
  faces.back() = breaks.back().at_rad;
  return faces;
}

SectionGrid circle_grid(const Section& section, const ExposedParts& exposed,
                        const Resolution& resolution) {
  const CirclePart part = circle_part(section, exposed);
  const bool one_dimensional = part.symmetry == Symmetry::axisymmetric;
  const double for_kind = one_dimensional       ? kAxisymmetricFactor
                          : section.steel_shape ? kCutCircleFactor
                                                : 1.0;
  const double factor = factor_of(resolution) * for_kind;
  const double core_m = 0.5 * section.core_width_m();
  const double tube_m = section.tube_thickness_m();
  const HalfAxis radius{core_m, tube_m, protection_m(section), true, factor, {}};
  SectionGrid built;
  built.closed_circle = part.symmetry == Symmetry::none;
  OrthogonalGrid& grid = built.grid;
  grid.kind = GridKind::polar;
  grid.symmetry = part.symmetry;
  grid.images = circle_images(part);
  grid.faces_1 = graded_faces(radius.stretches());
  grid.faces_2 = one_dimensional ? std::vector<double>{0.0, part.extent_rad}
                                 : angles(angle_breaks(exposed, part), core_m, factor);
  fill_cells(grid, [=](double r, double) {
    return r < core_m ? Layer::core : r < core_m + tube_m ? Layer::tube : Layer::protection;
  });
  for (std::size_t j = 0; j < grid.count_2(); ++j) {
    built.sides[static_cast<std::size_t>(Side::high_1)].push_back(
        circle_condition(exposed, middle_2(grid, j)));
  }
  return built;
}

}  // namespace

SectionGrid grid_of_section(const Section& section, const ExposedParts& exposed,
                            const Resolution& resolution) {
  SectionGrid built = section.is_circular() ? circle_grid(section, exposed, resolution)
                                            : RectangleGrid(section, exposed, resolution).build();
  if (section.steel_shape) set_steel_fractions(*section.steel_shape, built.grid);
  return built;
}

}  // namespace ringward::thermal
