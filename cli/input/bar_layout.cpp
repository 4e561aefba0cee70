#include "cli/input/bar_layout.hpp"

#include <algorithm>
#include <cmath>
#include <limits>

#include "thermal/base/units.hpp"

namespace ringward::cli {
namespace {

using thermal::Point;

/// Bars between the corners on each of the two sides parallel to x.
int extra_on_x_sides(int pairs, const BarRectangle& rectangle) {
  int best = 0;
  double least = std::numeric_limits<double>::infinity();
  for (int on_x = pairs; on_x >= 0; --on_x) {
    const double spacing_x_m = 2.0 * rectangle.half_width_m / (on_x + 1);
    const double spacing_y_m = 2.0 * rectangle.half_depth_m / (pairs - on_x + 1);
    const double largest_m = std::max(spacing_x_m, spacing_y_m);
    // Equal spacings may differ by rounding; that must not decide a tie.
    if (largest_m < least * (1.0 - 1e-9)) {
      least = largest_m;
      best = on_x;
    }
  }
  return best;
}

/// From `from` up to, not including, `to`: the corner and `extra` bars after it.
void add_side(std::vector<Point>& bars, const Point& from, const Point& to, int extra) {
  for (int i = 0; i <= extra; ++i) {
    const double share = static_cast<double>(i) / (extra + 1);
    bars.push_back(
        {from.x_m + share * (to.x_m - from.x_m), from.y_m + share * (to.y_m - from.y_m)});
  }
}

}  // namespace

std::vector<Point> ring_layout(int count, double radius_m, double start_rad) {
  std::vector<Point> bars;
  for (int i = 0; i < count; ++i) {
    const double angle_rad = start_rad + 2.0 * units::kPi * i / count;
    bars.push_back({radius_m * std::cos(angle_rad), radius_m * std::sin(angle_rad)});
  }
  return bars;
}

std::vector<Point> corner_layout(const BarRectangle& rectangle) {
  return perimeter_layout(4, rectangle);
}

std::vector<Point> perimeter_layout(int count, const BarRectangle& rectangle) {
  const int pairs = (count - 4) / 2;
  const int on_x = extra_on_x_sides(pairs, rectangle);
  const int on_y = pairs - on_x;
  const double a_m = rectangle.half_width_m;
  const double b_m = rectangle.half_depth_m;
  std::vector<Point> bars;
  add_side(bars, {-a_m, -b_m}, {a_m, -b_m}, on_x);
  add_side(bars, {a_m, -b_m}, {a_m, b_m}, on_y);
  add_side(bars, {a_m, b_m}, {-a_m, b_m}, on_x);
  add_side(bars, {-a_m, b_m}, {-a_m, -b_m}, on_y);
  return bars;
}

}  // namespace ringward::cli
