#include "cli/study/material_amounts.hpp"

#include "thermal/base/units.hpp"

namespace ringward::cli {
namespace {

constexpr double kSteel_kg_m3 = 7850;

double area_m2(thermal::Shape shape, double width_m, double depth_m) {
  return shape == thermal::Shape::circular ? units::kPi * width_m * width_m / 4 : width_m * depth_m;
}

double bars_m2(const std::vector<thermal::BarGroup>& groups) {
  double area = 0;
  for (const thermal::BarGroup& group : groups) {
    area += static_cast<double>(group.positions.size()) *
            area_m2(thermal::Shape::circular, group.diameter_m, group.diameter_m);
  }
  return area;
}

/// Two I shapes at right angles share the square where their webs cross.
double shape_m2(const thermal::SteelShape& shape) {
  const double web_height_m = shape.depth_m - 2 * shape.flange_m;
  const double one = 2 * shape.width_m * shape.flange_m + web_height_m * shape.web_m;
  if (shape.kind == thermal::SteelShapeKind::i_section) return one;
  return 2 * one - shape.web_m * shape.web_m;
}

}  // namespace

MaterialAmounts material_amounts(const thermal::Section& section) {
  const thermal::Outline& outline = section.outline;
  const double whole_m2 = area_m2(outline.shape, outline.width_m, outline.depth_m);
  const double core_m2 = area_m2(outline.shape, section.core_width_m(), section.core_depth_m());
  const double shape = section.steel_shape ? shape_m2(*section.steel_shape) : 0.0;
  const double bars = bars_m2(section.bars);
  return {.tube_kg_m = kSteel_kg_m3 * (whole_m2 - core_m2),
          .bars_kg_m = kSteel_kg_m3 * bars,
          .shape_kg_m = kSteel_kg_m3 * shape,
          .concrete_m3_m = core_m2 - bars - shape};
}

}  // namespace ringward::cli
