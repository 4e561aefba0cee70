#pragma once

#include <vector>

#include "thermal/section/section.hpp"

namespace ringward::thermal {

/// Corners of a convex polygon, anticlockwise.
using ConvexPolygon = std::vector<Point>;

/// The half plane normal_x x + normal_y y <= offset.
struct HalfPlane {
  double normal_x = 0;
  double normal_y = 0;
  double offset_m = 0;
};

[[nodiscard]] double area_m2(const ConvexPolygon& polygon);
[[nodiscard]] ConvexPolygon clipped(const ConvexPolygon& polygon, const HalfPlane& half_plane);

/// Whether a point lies in a polygon or on its outline.
[[nodiscard]] bool contains(const ConvexPolygon& polygon, const Point& point);

/// Area of a polygon within the circle of radius_m about the origin, exact: the sum over the
/// polygon's sides of the signed areas of triangles and circular sectors seen from the origin.
[[nodiscard]] double area_within_circle_m2(const ConvexPolygon& polygon, double radius_m);

}  // namespace ringward::thermal
