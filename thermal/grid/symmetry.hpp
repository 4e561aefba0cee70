#pragma once

#include <vector>

#include "thermal/boundary/exposure.hpp"
#include "thermal/grid/orthogonal_grid.hpp"
#include "thermal/section/section.hpp"

namespace ringward::thermal {

/// Mirror axes that the outline, the exposure and the steel shape of a rectangle share.
struct RectangleSymmetry {
  bool left_right = false;
  bool bottom_top = false;
};
[[nodiscard]] RectangleSymmetry rectangle_symmetry(const Section& section,
                                                   const ExposedParts& exposed);

/// The part of a circle that has to be solved, starting on a mirror axis where there is one.
struct CirclePart {
  Symmetry symmetry = Symmetry::none;
  double from_rad = 0;
  double extent_rad = 0;
};
[[nodiscard]] CirclePart circle_part(const Section& section, const ExposedParts& exposed);

/// Condition of a circular outline at an angle; where arcs overlap the heated one counts.
[[nodiscard]] FaceCondition circle_condition(const ExposedParts& exposed, double angle_rad);
/// The arcs that cover less than the whole circle.
[[nodiscard]] std::vector<Arc> partial_arcs(const ExposedParts& exposed);

[[nodiscard]] std::vector<Image> rectangle_images(const RectangleSymmetry& symmetry);
[[nodiscard]] std::vector<Image> circle_images(const CirclePart& part);

}  // namespace ringward::thermal
