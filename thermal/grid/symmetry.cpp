#include "thermal/grid/symmetry.hpp"

#include <algorithm>
#include <cmath>

#include "thermal/base/units.hpp"

namespace ringward::thermal {
namespace {

constexpr double kSameAngle_rad = 1e-9;
constexpr double kTurn_rad = 2.0 * units::kPi;

bool is_multiple(double angle_rad, double of_rad) {
  const double ratio = angle_rad / of_rad;
  return std::abs(ratio - std::round(ratio)) * of_rad < kSameAngle_rad;
}

double middle(const Arc& arc) { return 0.5 * (arc.from_rad + arc.to_rad); }

bool covers_all(const Arc& arc) { return arc.to_rad - arc.from_rad > kTurn_rad - kSameAngle_rad; }

/// Mirrors of an I lie every 90 degrees from its web, of a cross every 45 degrees.
bool is_mirror_of_shape(const std::optional<SteelShape>& shape, double axis_rad) {
  if (!shape) return true;
  const double spacing =
      shape->kind == SteelShapeKind::cross ? 0.25 * units::kPi : 0.5 * units::kPi;
  return is_multiple(axis_rad - shape->rotation_rad, spacing);
}

bool contains(const Arc& arc, double angle_rad) {
  const double after = angle_rad - arc.from_rad;
  return after - kTurn_rad * std::floor(after / kTurn_rad) < arc.to_rad - arc.from_rad;
}

Image mirror_about(double axis_rad) {
  const double c = std::cos(2.0 * axis_rad);
  const double s = std::sin(2.0 * axis_rad);
  return {c, s, s, -c};
}

}  // namespace

RectangleSymmetry rectangle_symmetry(const Section& section, const ExposedParts& exposed) {
  const bool shape = is_mirror_of_shape(section.steel_shape, 0.0);
  return {shape && exposed.face(Face::left) == exposed.face(Face::right),
          shape && exposed.face(Face::bottom) == exposed.face(Face::top)};
}

std::vector<Arc> partial_arcs(const ExposedParts& exposed) {
  std::vector<Arc> arcs;
  for (const std::optional<Arc>& arc : {exposed.heated_arc, exposed.built_in_arc}) {
    if (arc && !covers_all(*arc)) arcs.push_back(*arc);
  }
  return arcs;
}

CirclePart circle_part(const Section& section, const ExposedParts& exposed) {
  const std::vector<Arc> arcs = partial_arcs(exposed);
  if (arcs.empty() && !section.steel_shape) return {Symmetry::axisymmetric, 0.0, kTurn_rad};
  if (arcs.empty()) {
    return {Symmetry::quarter, section.steel_shape->rotation_rad, 0.5 * units::kPi};
  }
  const double axis_rad = middle(arcs.front());
  const bool shared = std::all_of(arcs.begin(), arcs.end(), [&](const Arc& arc) {
    return is_multiple(middle(arc) - axis_rad, units::kPi);
  });
  if (shared && is_mirror_of_shape(section.steel_shape, axis_rad)) {
    return {Symmetry::half, axis_rad, units::kPi};
  }
  return {Symmetry::none, arcs.front().from_rad, kTurn_rad};
}

FaceCondition circle_condition(const ExposedParts& exposed, double angle_rad) {
  if (exposed.heated_arc && contains(*exposed.heated_arc, angle_rad)) return FaceCondition::heated;
  if (exposed.built_in_arc && contains(*exposed.built_in_arc, angle_rad)) {
    return FaceCondition::built_in;
  }
  return exposed.heated_arc ? FaceCondition::ambient : FaceCondition::heated;
}

std::vector<Image> rectangle_images(const RectangleSymmetry& symmetry) {
  std::vector<Image> images{Image{}};
  if (symmetry.left_right) images.push_back({-1, 0, 0, 1});
  if (symmetry.bottom_top) images.push_back({1, 0, 0, -1});
  if (symmetry.left_right && symmetry.bottom_top) images.push_back({-1, 0, 0, -1});
  return images;
}

std::vector<Image> circle_images(const CirclePart& part) {
  std::vector<Image> images{Image{}};
  if (part.symmetry == Symmetry::half || part.symmetry == Symmetry::quarter) {
    images.push_back(mirror_about(part.from_rad));
  }
  if (part.symmetry == Symmetry::quarter) {
    images.push_back(mirror_about(part.from_rad + part.extent_rad));
    images.push_back({-1, 0, 0, -1});
  }
  return images;
}

}  // namespace ringward::thermal
