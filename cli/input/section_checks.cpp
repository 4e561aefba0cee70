#include <fmt/format.h>

#include <algorithm>
#include <array>
#include <cmath>

#include "cli/input/section_reading.hpp"
#include "cli/input/steel_outline.hpp"
#include "thermal/base/units.hpp"

// Comparisons with NaN are false, so a value that was refused raises no second problem here.

namespace ringward::cli {
namespace {

using namespace units;
using thermal::Point;
using thermal::Section;

// Positions are typed in mm; this much rounding is no overlap.
constexpr double kTouch_m = 1e-9;
// A coat of paint is no layer of the heat flow.
constexpr double kThinnestLayer_m = 1e-4;

/// From a point to the nearest face of the core, negative outside [m].
double depth_in_core_m(const Section& section, const Point& point) {
  if (section.is_circular()) {
    return section.core_width_m() / 2 - std::hypot(point.x_m, point.y_m);
  }
  return std::min(section.core_width_m() / 2 - std::abs(point.x_m),
                  section.core_depth_m() / 2 - std::abs(point.y_m));
}

/// In mm without the rounding of sines and cosines.
double clean_mm(double length_m) { return std::round(mm_from_m(length_m) * 1e6) / 1e6 + 0.0; }

std::string at_mm(const Point& point) {
  return fmt::format("({:.6g}, {:.6g}) mm", clean_mm(point.x_m), clean_mm(point.y_m));
}

class SectionChecks {
 public:
  SectionChecks(const Section& section, const InputValues& values, Problems& problems)
      : section_(section), values_(values), problems_(problems) {}

  void run() {
    check_tube();
    check_protection();
    if (section_.steel_shape) check_shape(*section_.steel_shape);
    for (std::size_t i = 0; i < section_.bars.size(); ++i) {
      check_cover(i);
      check_shape_overlap(i);
      for (std::size_t j = 0; j <= i; ++j) check_overlap(i, j);
    }
  }

 private:
  void refuse(const std::string& key, const std::string& text) {
    problems_.add(values_.location(key), key, text);
  }

  void check_tube() {
    const double half_m = std::min(section_.outline.width_m, section_.outline.depth_m) / 2;
    if (section_.tube_thickness_m() >= half_m) {
      refuse("tube.thickness_mm",
             fmt::format("{:.6g} mm leaves no core; it must be below half the section, {:.6g} mm",
                         mm_from_m(section_.tube_thickness_m()), mm_from_m(half_m)));
    }
  }

  void check_protection() {
    if (!section_.protection || section_.protection->thickness_m >= kThinnestLayer_m) return;
    refuse("protection.thickness_mm",
           fmt::format("{:.6g} mm is thinner than a layer can be, {:.6g} mm; give 0 for none",
                       mm_from_m(section_.protection->thickness_m), mm_from_m(kThinnestLayer_m)));
  }

  void check_shape(const thermal::SteelShape& shape) {
    if (2 * shape.flange_m >= shape.depth_m) {
      refuse("steel_shape.flange_mm",
             fmt::format("two flanges of {:.6g} mm leave no web; they must be below half the "
                         "depth, {:.6g} mm",
                         mm_from_m(shape.flange_m), mm_from_m(shape.depth_m / 2)));
    }
    if (shape.web_m > shape.width_m) {
      refuse("steel_shape.web_mm",
             fmt::format("{:.6g} mm is wider than the flanges, {:.6g} mm; check web_mm and "
                         "width_mm",
                         mm_from_m(shape.web_m), mm_from_m(shape.width_m)));
    }
    const double between_m = shape.depth_m - 2 * shape.flange_m;
    if (shape.kind == thermal::SteelShapeKind::cross && shape.width_m > between_m) {
      refuse("steel_shape.width_mm",
             fmt::format("{:.6g} mm makes the flanges of the two I shapes run into each other; at "
                         "most depth less two flanges, {:.6g} mm",
                         mm_from_m(shape.width_m), mm_from_m(between_m)));
    }
    check_shape_fits(shape);
  }

  void check_shape_fits(const thermal::SteelShape& shape) {
    double least_m = 0;
    for (const Point& corner : steel_corners(shape)) {
      least_m = std::min(least_m, depth_in_core_m(section_, corner));
    }
    if (least_m >= -kTouch_m) return;
    refuse("steel_shape.depth_mm",
           fmt::format("the shape of {:.6g} x {:.6g} mm, rotated by {:.6g} deg, reaches {:.4g} mm "
                       "outside the core of {:.6g} x {:.6g} mm; take a smaller shape or another "
                       "rotation",
                       mm_from_m(shape.depth_m), mm_from_m(shape.width_m),
                       deg_from_rad(shape.rotation_rad), -mm_from_m(least_m),
                       mm_from_m(section_.core_width_m()), mm_from_m(section_.core_depth_m())));
  }

  /// The key that places the bars of a group.
  std::string placing_key(std::size_t group) const {
    const std::string prefix = fmt::format("bars[{}].", group);
    return prefix + (values_.given(prefix + "positions_mm") ? "positions_mm" : "axis_mm");
  }

  void check_cover(std::size_t group) {
    const double radius_m = section_.bars[group].diameter_m / 2;
    for (const Point& bar : section_.bars[group].positions) {
      const double depth_m = depth_in_core_m(section_, bar);
      if (depth_m < 0) {
        return refuse(placing_key(group),
                      fmt::format("the bar at {} lies {:.4g} mm outside the core; place it inside",
                                  at_mm(bar), -mm_from_m(depth_m)));
      }
      if (depth_m < radius_m - kTouch_m) {
        return refuse(placing_key(group),
                      fmt::format("the cover is below zero: the axis is {:.6g} mm from the core's "
                                  "face, the bar's radius is {:.6g} mm; move the bar inwards",
                                  mm_from_m(depth_m), mm_from_m(radius_m)));
      }
    }
  }

  void check_overlap(std::size_t a, std::size_t b) {
    const auto& first = section_.bars[a];
    const auto& second = section_.bars[b];
    const double least_m = (first.diameter_m + second.diameter_m) / 2;
    for (std::size_t i = 0; i < first.positions.size(); ++i) {
      const std::size_t end = a == b ? i : second.positions.size();
      for (std::size_t j = 0; j < end; ++j) {
        const Point& p = first.positions[i];
        const Point& q = second.positions[j];
        const double distance_m = std::hypot(p.x_m - q.x_m, p.y_m - q.y_m);
        if (!(distance_m < least_m - kTouch_m)) continue;
        return refuse(
            placing_key(a),
            fmt::format("the bars at {} and {} (bars[{}]) overlap: {:.4g} mm between "
                        "axes, at least {:.6g} mm needed; use fewer or smaller bars or "
                        "move them",
                        at_mm(p), at_mm(q), b, mm_from_m(distance_m), mm_from_m(least_m)));
      }
    }
  }

  void check_shape_overlap(std::size_t group) {
    if (!section_.steel_shape) return;
    const double radius_m = section_.bars[group].diameter_m / 2;
    for (const Point& bar : section_.bars[group].positions) {
      const double distance_m = distance_to_steel_m(*section_.steel_shape, bar);
      if (!(distance_m < radius_m - kTouch_m)) continue;
      return refuse(placing_key(group),
                    fmt::format("the bar at {} overlaps the steel shape: {:.4g} mm from its axis "
                                "to the steel, at least {:.6g} mm needed; move one of them",
                                at_mm(bar), clean_mm(distance_m), mm_from_m(radius_m)));
    }
  }

  const Section& section_;
  const InputValues& values_;
  Problems& problems_;
};

}  // namespace

void check_section(const Section& section, const InputValues& values, Problems& problems) {
  if (values.text("section.shape").empty()) return;
  SectionChecks(section, values, problems).run();
}

}  // namespace ringward::cli
