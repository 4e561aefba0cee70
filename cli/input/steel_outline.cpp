#include "cli/input/steel_outline.hpp"

#include <algorithm>
#include <cmath>
#include <limits>

#include "thermal/base/units.hpp"

namespace ringward::cli {
namespace {

using thermal::Point;
using thermal::SteelShape;

Point rotated(const Point& point, double angle_rad) {
  const double c = std::cos(angle_rad);
  const double s = std::sin(angle_rad);
  return {c * point.x_m - s * point.y_m, s * point.x_m + c * point.y_m};
}

/// Rotations of the I shapes that make up the steel.
std::vector<double> rotations_rad(const SteelShape& shape) {
  if (shape.kind == thermal::SteelShapeKind::i_section) return {shape.rotation_rad};
  return {shape.rotation_rad, shape.rotation_rad + units::kPi / 2};
}

double distance_to_plate_m(const Point& point, const Point& centre, double half_width_m,
                           double half_depth_m) {
  const double dx_m = std::max(0.0, std::abs(point.x_m - centre.x_m) - half_width_m);
  const double dy_m = std::max(0.0, std::abs(point.y_m - centre.y_m) - half_depth_m);
  return std::hypot(dx_m, dy_m);
}

}  // namespace

std::vector<Point> steel_corners(const SteelShape& shape) {
  std::vector<Point> corners;
  for (const double angle_rad : rotations_rad(shape)) {
    for (const double x_sign : {-1.0, 1.0}) {
      for (const double y_sign : {-1.0, 1.0}) {
        corners.push_back(
            rotated({x_sign * shape.width_m / 2, y_sign * shape.depth_m / 2}, angle_rad));
      }
    }
  }
  return corners;
}

double distance_to_steel_m(const SteelShape& shape, const Point& point) {
  double least_m = std::numeric_limits<double>::infinity();
  const double flange_centre_m = (shape.depth_m - shape.flange_m) / 2;
  for (const double angle_rad : rotations_rad(shape)) {
    const Point local = rotated(point, -angle_rad);
    least_m = std::min(
        {least_m, distance_to_plate_m(local, {}, shape.web_m / 2, shape.depth_m / 2),
         distance_to_plate_m(local, {0, flange_centre_m}, shape.width_m / 2, shape.flange_m / 2),
         distance_to_plate_m(local, {0, -flange_centre_m}, shape.width_m / 2, shape.flange_m / 2)});
  }
  return least_m;
}

}  // namespace ringward::cli
