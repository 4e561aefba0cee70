#include "thermal/grid/convex_area.hpp"

#include <algorithm>
#include <cmath>

namespace ringward::thermal {
namespace {

double cross(const Point& a, const Point& b) { return a.x_m * b.y_m - a.y_m * b.x_m; }
double dot(const Point& a, const Point& b) { return a.x_m * b.x_m + a.y_m * b.y_m; }

Point between(const Point& a, const Point& b, double s) {
  return {a.x_m + s * (b.x_m - a.x_m), a.y_m + s * (b.y_m - a.y_m)};
}

double sector_area(const Point& a, const Point& b, double radius_m) {
  return 0.5 * radius_m * radius_m * std::atan2(cross(a, b), dot(a, b));
}

/// Signed area of the triangle (origin, a, b) within the circle.
double side_area(const Point& a, const Point& b, double radius_m) {
  const Point step{b.x_m - a.x_m, b.y_m - a.y_m};
  const double length2 = dot(step, step);
  if (length2 == 0.0) return 0.0;
  const double half_b = dot(a, step);
  const double discriminant = half_b * half_b - length2 * (dot(a, a) - radius_m * radius_m);
  if (discriminant <= 0.0) return sector_area(a, b, radius_m);
  const double root = std::sqrt(discriminant);
  const double enter = std::clamp((-half_b - root) / length2, 0.0, 1.0);
  const double leave = std::clamp((-half_b + root) / length2, 0.0, 1.0);
  if (enter >= leave) return sector_area(a, b, radius_m);
  const Point in = between(a, b, enter);
  const Point out = between(a, b, leave);
  double area = 0.5 * cross(in, out);
  if (enter > 0.0) area += sector_area(a, in, radius_m);
  if (leave < 1.0) area += sector_area(out, b, radius_m);
  return area;
}

}  // namespace

double area_m2(const ConvexPolygon& polygon) {
  double area = 0;
  for (std::size_t k = 0; k < polygon.size(); ++k) {
    area += 0.5 * cross(polygon[k], polygon[(k + 1) % polygon.size()]);
  }
  return area;
}

ConvexPolygon clipped(const ConvexPolygon& polygon, const HalfPlane& half_plane) {
  const auto excess = [&](const Point& p) {
    return half_plane.normal_x * p.x_m + half_plane.normal_y * p.y_m - half_plane.offset_m;
  };
  ConvexPolygon kept;
  for (std::size_t k = 0; k < polygon.size(); ++k) {
    const Point& a = polygon[k];
    const Point& b = polygon[(k + 1) % polygon.size()];
    const double excess_a = excess(a);
    const double excess_b = excess(b);
    if (excess_a <= 0.0) kept.push_back(a);
    if ((excess_a < 0.0 && excess_b > 0.0) || (excess_a > 0.0 && excess_b < 0.0)) {
      kept.push_back(between(a, b, excess_a / (excess_a - excess_b)));
    }
  }
  return kept;
}

bool contains(const ConvexPolygon& polygon, const Point& point) {
  for (std::size_t k = 0; k < polygon.size(); ++k) {
    const Point& a = polygon[k];
    const Point& b = polygon[(k + 1) % polygon.size()];
    const Point side{b.x_m - a.x_m, b.y_m - a.y_m};
    if (cross(side, {point.x_m - a.x_m, point.y_m - a.y_m}) < 0.0) return false;
  }
  return true;
}

double area_within_circle_m2(const ConvexPolygon& polygon, double radius_m) {
  double area = 0;
  for (std::size_t k = 0; k < polygon.size(); ++k) {
    area += side_area(polygon[k], polygon[(k + 1) % polygon.size()], radius_m);
  }
  return std::max(0.0, area);
}

}  // namespace ringward::thermal
