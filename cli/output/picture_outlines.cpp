#include "cli/output/picture_outlines.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <cmath>
#include <vector>

#include "cli/output/numbers.hpp"
#include "thermal/base/units.hpp"

namespace ringward::cli {
namespace {

using thermal::ExposedParts;
using thermal::Face;
using thermal::FaceCondition;
using thermal::Outline;
using thermal::Point;
using thermal::Section;
using thermal::SteelShape;

constexpr double kSmallestBar_px = 2.5;
constexpr double kBesideOutline_px = 7.0;
constexpr const char* kThinLine = "fill=\"none\" stroke=\"#000\" stroke-width=\"1\"";
constexpr const char* kHeatedLine =
    "fill=\"none\" stroke=\"#000\" stroke-width=\"3\" stroke-dasharray=\"7 4\"";

Outline grown(const Outline& outline, double by_m) {
  return {outline.shape, outline.width_m + 2 * by_m, outline.depth_m + 2 * by_m};
}

std::string outline_shape(const Outline& outline, double px_per_m, const char* line) {
  const double width = outline.width_m * px_per_m;
  const double depth = outline.depth_m * px_per_m;
  if (outline.shape == thermal::Shape::circular) {
    return fmt::format("<circle cx=\"0\" cy=\"0\" r=\"{:.2f}\" {}/>\n", width / 2, line);
  }
  return fmt::format("<rect x=\"{:.2f}\" y=\"{:.2f}\" width=\"{:.2f}\" height=\"{:.2f}\" {}/>\n",
                     -width / 2, -depth / 2, width, depth, line);
}

// One I: down the right side of the web from the top flange, and round.
std::vector<Point> i_corners(const SteelShape& shape) {
  const double b = shape.width_m / 2;
  const double h = shape.depth_m / 2;
  const double w = shape.web_m / 2;
  const double inner = h - shape.flange_m;
  return {{-b, h}, {b, h},   {b, inner},   {w, inner},   {w, -inner}, {b, -inner},
          {b, -h}, {-b, -h}, {-b, -inner}, {-w, -inner}, {-w, inner}, {-b, inner}};
}

std::string i_outline(const SteelShape& shape, double rotation_rad, double px_per_m) {
  std::string points;
  for (const Point& p : i_corners(shape)) {
    const double x = p.x_m * std::cos(rotation_rad) - p.y_m * std::sin(rotation_rad);
    const double y = p.x_m * std::sin(rotation_rad) + p.y_m * std::cos(rotation_rad);
    points +=
        fmt::format("{}{:.2f},{:.2f}", points.empty() ? "" : " ", x * px_per_m, -y * px_per_m);
  }
  return fmt::format("<polygon points=\"{}\" {}/>\n", points, kThinLine);
}

std::string steel_shape_outline(const SteelShape& shape, double px_per_m) {
  std::string lines = i_outline(shape, shape.rotation_rad, px_per_m);
  if (shape.kind == thermal::SteelShapeKind::cross) {
    lines += i_outline(shape, shape.rotation_rad + units::kPi / 2, px_per_m);
  }
  return lines;
}

std::string bar_circles(const thermal::BarGroup& group, double px_per_m) {
  const double radius = std::max(kSmallestBar_px, group.diameter_m / 2 * px_per_m);
  std::string circles;
  for (const Point& position : group.positions) {
    circles += fmt::format(
        "<circle cx=\"{:.2f}\" cy=\"{:.2f}\" r=\"{:.2f}\" fill=\"#fff\" stroke=\"#000\" "
        "stroke-width=\"1.2\"/>\n",
        position.x_m * px_per_m, -position.y_m * px_per_m, radius);
  }
  return circles;
}

std::string heated_arc(double radius_px, const thermal::Arc& arc) {
  const double span = arc.to_rad - arc.from_rad;
  const double middle = arc.from_rad + span / 2;
  // Two halves, because SVG cannot draw a full turn as one arc.
  std::string path = fmt::format("M{:.2f} {:.2f}", radius_px * std::cos(arc.from_rad),
                                 -radius_px * std::sin(arc.from_rad));
  for (const double to : {middle, arc.to_rad}) {
    path += fmt::format(" A{0:.2f} {0:.2f} 0 {1} 0 {2:.2f} {3:.2f}", radius_px,
                        span / 2 > units::kPi ? 1 : 0, radius_px * std::cos(to),
                        -radius_px * std::sin(to));
  }
  return fmt::format("<path d=\"{}\" {}/>\n", path, kHeatedLine);
}

std::string heated_face(const Outline& outline, Face face, double px_per_m) {
  const double x = outline.width_m / 2 * px_per_m;
  const double y = outline.depth_m / 2 * px_per_m;
  const double off = kBesideOutline_px;
  std::string ends;
  switch (face) {
    case Face::left:
      ends = fmt::format("M{0:.2f} {1:.2f} V{2:.2f}", -x - off, -y, y);
      break;
    case Face::right:
      ends = fmt::format("M{0:.2f} {1:.2f} V{2:.2f}", x + off, -y, y);
      break;
    case Face::bottom:
      ends = fmt::format("M{0:.2f} {1:.2f} H{2:.2f}", -x, y + off, x);
      break;
    case Face::top:
      ends = fmt::format("M{0:.2f} {1:.2f} H{2:.2f}", -x, -y - off, x);
      break;
  }
  return fmt::format("<path d=\"{}\" {}/>\n", ends, kHeatedLine);
}

}  // namespace

Outline overall_outline(const Section& section) {
  return grown(section.outline, section.protection ? section.protection->thickness_m : 0.0);
}

std::string section_outlines(const Section& section, double px_per_m) {
  std::string lines = outline_shape(overall_outline(section), px_per_m, kThinLine);
  if (section.protection) lines += outline_shape(section.outline, px_per_m, kThinLine);
  if (section.tube) {
    lines +=
        outline_shape(grown(section.outline, -section.tube_thickness_m()), px_per_m, kThinLine);
  }
  if (section.steel_shape) lines += steel_shape_outline(*section.steel_shape, px_per_m);
  for (const thermal::BarGroup& group : section.bars) lines += bar_circles(group, px_per_m);
  return lines;
}

std::string heated_outline(const Section& section, const ExposedParts& exposed, double px_per_m) {
  const Outline outline = overall_outline(section);
  if (section.is_circular()) {
    const thermal::Arc all_round{0.0, 2 * units::kPi};
    return heated_arc(outline.width_m / 2 * px_per_m + kBesideOutline_px,
                      exposed.heated_arc.value_or(all_round));
  }
  std::string lines;
  for (const Face face : {Face::left, Face::right, Face::bottom, Face::top}) {
    if (exposed.face(face) == FaceCondition::heated) lines += heated_face(outline, face, px_per_m);
  }
  return lines;
}

}  // namespace ringward::cli
