#include "cli/input/bar_layout.hpp"

#include <algorithm>
#include <catch2/catch.hpp>
#include <cmath>

namespace ringward::cli::testing {
namespace {

using thermal::Point;

// Coordinates are sums and products of a few numbers below 1 m; rounding stays below 1e-15.
constexpr double kRounding_m = 1e-14;

bool holds(const std::vector<Point>& bars, const Point& wanted) {
  return std::any_of(bars.begin(), bars.end(), [&](const Point& bar) {
    return std::hypot(bar.x_m - wanted.x_m, bar.y_m - wanted.y_m) < kRounding_m;
  });
}

long on_side_parallel_to_x(const std::vector<Point>& bars, double y_m) {
  return std::count_if(bars.begin(), bars.end(),
                       [&](const Point& bar) { return std::abs(bar.y_m - y_m) < kRounding_m; });
}

double largest_spacing_m(const std::vector<Point>& bars) {
  double largest_m = 0;
  for (std::size_t i = 0; i < bars.size(); ++i) {
    const Point& next = bars[(i + 1) % bars.size()];
    largest_m = std::max(largest_m, std::hypot(next.x_m - bars[i].x_m, next.y_m - bars[i].y_m));
  }
  return largest_m;
}

/// The least largest spacing over every way of giving pairs to the two directions.
double least_spacing_by_trial_m(int count, const BarRectangle& rectangle) {
  double least_m = 1e9;
  const int pairs = (count - 4) / 2;
  for (int on_x = 0; on_x <= pairs; ++on_x) {
    least_m = std::min(least_m, std::max(2 * rectangle.half_width_m / (on_x + 1),
                                         2 * rectangle.half_depth_m / (pairs - on_x + 1)));
  }
  return least_m;
}

}  // namespace

TEST_CASE("A ring starts at its angle and turns anticlockwise in equal steps") {
  const auto bars = ring_layout(4, 0.2, 0.0);
  REQUIRE(bars.size() == 4);
  CHECK(holds({bars[0]}, {0.2, 0}));
  CHECK(holds({bars[1]}, {0, 0.2}));
  CHECK(holds({bars[2]}, {-0.2, 0}));
  const auto turned = ring_layout(6, 0.15, 0.5);
  for (int i = 0; i < 6; ++i) {
    const double angle_rad = 0.5 + i * 3.14159265358979323846 / 3;
    CHECK(holds({turned[static_cast<std::size_t>(i)]},
                {0.15 * std::cos(angle_rad), 0.15 * std::sin(angle_rad)}));
  }
}

TEST_CASE("Corners are the four corners of the bars' rectangle") {
  const auto bars = corner_layout({0.2, 0.1});
  REQUIRE(bars.size() == 4);
  for (const Point& corner :
       {Point{-0.2, -0.1}, Point{0.2, -0.1}, Point{0.2, 0.1}, Point{-0.2, 0.1}}) {
    CHECK(holds(bars, corner));
  }
}

TEST_CASE("Eight bars along a square are its corners and the middles of its sides") {
  const auto bars = perimeter_layout(8, {0.15, 0.15});
  REQUIRE(bars.size() == 8);
  for (const Point& middle : {Point{0, -0.15}, Point{0.15, 0}, Point{0, 0.15}, Point{-0.15, 0}}) {
    CHECK(holds(bars, middle));
  }
}

TEST_CASE("A tie along the perimeter goes to the sides parallel to x") {
  const auto bars = perimeter_layout(6, {0.15, 0.15});
  REQUIRE(bars.size() == 6);
  CHECK(on_side_parallel_to_x(bars, 0.15) == 3);
  CHECK(on_side_parallel_to_x(bars, -0.15) == 3);
  // Equal spacings that differ by rounding only: 3 x 0.1 m against 0.3 m.
  const auto rounded = perimeter_layout(6, {0.15, (0.1 + 0.1 + 0.1) / 2});
  CHECK(on_side_parallel_to_x(rounded, 0.15 + 1e-17) == 3);
}

TEST_CASE("Every perimeter layout is symmetric, complete, and has the least largest spacing") {
  for (const BarRectangle& rectangle :
       {BarRectangle{0.15, 0.15}, BarRectangle{0.21, 0.11}, BarRectangle{0.08, 0.31}}) {
    for (int count = 4; count <= 30; count += 2) {
      CAPTURE(count, rectangle.half_width_m, rectangle.half_depth_m);
      const auto bars = perimeter_layout(count, rectangle);
      REQUIRE(bars.size() == static_cast<std::size_t>(count));
      for (const Point& bar : bars) {
        CHECK(holds(bars, {-bar.x_m, bar.y_m}));
        CHECK(holds(bars, {bar.x_m, -bar.y_m}));
        const bool on_edge = std::abs(std::abs(bar.x_m) - rectangle.half_width_m) < kRounding_m ||
                             std::abs(std::abs(bar.y_m) - rectangle.half_depth_m) < kRounding_m;
        CHECK(on_edge);
      }
      CHECK(largest_spacing_m(bars) ==
            Approx(least_spacing_by_trial_m(count, rectangle)).epsilon(1e-12));
    }
  }
}

}  // namespace ringward::cli::testing
