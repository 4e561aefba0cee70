#pragma once

#include <vector>

#include "thermal/section/section.hpp"

namespace ringward::cli {

/// Half the sides of the rectangle on which the axes of the bars stand.
struct BarRectangle {
  double half_width_m = 0;
  double half_depth_m = 0;
};

/// `count` bars evenly around a circle, anticlockwise.
/// @param radius_m of the circle through the bars' axes [m], > 0
/// @param start_rad angle of the first bar from +x [rad]
[[nodiscard]] std::vector<thermal::Point> ring_layout(int count, double radius_m, double start_rad);

/// Four bars, anticlockwise from the lower left corner.
[[nodiscard]] std::vector<thermal::Point> corner_layout(const BarRectangle& rectangle);

/// Four corners and the rest spread evenly over the sides, anticlockwise from the lower left
/// corner. Extra bars come in pairs on opposite sides, placed so that the largest spacing is
/// least; a tie goes to the sides parallel to x.
/// @param count even, >= 4
[[nodiscard]] std::vector<thermal::Point> perimeter_layout(int count,
                                                           const BarRectangle& rectangle);

}  // namespace ringward::cli
