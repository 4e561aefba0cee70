#include "tests/support/columns.hpp"

#include <cmath>

#include "thermal/base/units.hpp"

namespace ringward::testing {

using namespace mechanical;
using thermal::BarGroup;

mechanical::Column round_column(const RoundColumn& wanted) {
  Column column;
  column.section.outline = {thermal::Shape::circular, 0.4, 0.4};
  thermal::Tube tube;
  tube.thickness_m = 0.005;
  tube.yield_Pa = 355e6;
  tube.end_gap_m = wanted.end_gap_m;
  tube.clear_height_m = 3.6;
  column.section.tube = tube;
  column.section.core.strength_Pa = 40e6;
  column.section.core.moisture_fraction = wanted.moisture_fraction;
  column.section.core.conductivity = thermal::ConductivityLimit::lower;
  if (wanted.bars > 0) {
    BarGroup group;
    group.diameter_m = 0.02;
    group.yield_Pa = 500e6;
    for (int k = 0; k < wanted.bars; ++k) {
      const double angle = units::rad_from_deg(wanted.start_deg + 360.0 * k / wanted.bars);
      group.positions.push_back({0.155 * std::cos(angle), 0.155 * std::sin(angle)});
    }
    column.section.bars.push_back(group);
  }
  column.member = {.length_m = 4.0, .buckling_length_m = 2.0, .imperfection_m = 0.005};
  column.load.axial_N = 2.4e6;
  return column;
}

mechanical::Column square_concrete_column(double side_m) {
  Column column;
  column.section.outline = {thermal::Shape::square, side_m, side_m};
  column.section.core.strength_Pa = 30e6;
  column.section.core.moisture_fraction = 0.015;
  column.section.core.conductivity = thermal::ConductivityLimit::lower;
  BarGroup group;
  group.diameter_m = 0.025;
  group.yield_Pa = 500e6;
  const double at = 0.5 * side_m - 0.045;
  group.positions = {{at, at}, {-at, at}, {-at, -at}, {at, -at}};
  column.section.bars.push_back(group);
  column.member = {.length_m = 3.0, .buckling_length_m = 3.0, .imperfection_m = 0.0075};
  column.load.axial_N = 8e5;
  return column;
}

thermal::FireExposure standard_fire(double duration_min) {
  thermal::FireExposure fire;
  fire.duration_s = units::s_from_min(duration_min);
  fire.gas = fires::gas_temperature(fires::nominal_curve("standard"), fire.duration_s);
  return fire;
}

}  // namespace ringward::testing
