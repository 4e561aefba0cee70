#pragma once

#include <vector>

#include "thermal/section/section.hpp"

namespace ringward::cli {

/// Outermost corners of an embedded shape, rotated.
[[nodiscard]] std::vector<thermal::Point> steel_corners(const thermal::SteelShape& shape);

/// From a point to the steel of an embedded shape, 0 inside [m].
[[nodiscard]] double distance_to_steel_m(const thermal::SteelShape& shape,
                                         const thermal::Point& point);

}  // namespace ringward::cli
