#include "tests/validation/fire_tests.hpp"

#include <cmath>
#include <cstdio>
#include <stdexcept>

#include "fires/fire_curve.hpp"
#include "mechanical/rating/rating.hpp"
#include "tests/support/bar_positions.hpp"
#include "tests/support/published_table.hpp"
#include "thermal/base/units.hpp"

namespace ringward::testing {
namespace {

using thermal::Aggregate;

/// "4 x 25.4 (No.8)": number and diameter in mm.
TestedBars bars_from(const std::string& text) {
  TestedBars bars;
  double diameter_mm = 0;
  if (std::sscanf(text.c_str(), "%d x %lf", &bars.count, &diameter_mm) != 2) {
    throw std::runtime_error("no bars in \"" + text + "\"");
  }
  bars.diameter_m = units::m_from_mm(diameter_mm);
  return bars;
}

Aggregate aggregate_from(const std::string& text) {
  return text.starts_with("carbonate") ? Aggregate::calcareous : Aggregate::siliceous;
}

double leading_number(const std::string& text) { return std::stod(text); }

FireTest common_part(const PublishedTable& table, std::size_t row) {
  FireTest test;
  test.id = table.text(row, "id");
  test.width_m = units::m_from_mm(table.number(row, "D_mm_or_b"));
  test.strength_Pa = units::Pa_from_MPa(table.number(row, "fc_MPa_cyl_at_test"));
  test.aggregate = aggregate_from(table.text(row, "aggregate"));
  test.length_m = units::m_from_mm(table.number(row, "length_mm"));
  test.load_N = units::N_from_kN(table.number(row, "load_kN"));
  test.measured_min = table.number(row, "fire_resistance_min");
  test.confidence = table.text(row, "confidence");
  return test;
}

/// Clear cover of the main bars 48 mm; 444 MPa for bars of 25.4 mm, 442 for others (both from
/// memory, as the rows say in words).
FireTest concrete_test(const PublishedTable& table, std::size_t row) {
  FireTest test = common_part(table, row);
  test.family = test.aggregate == Aggregate::siliceous ? FireTestFamily::concrete_siliceous
                                                       : FireTestFamily::concrete_calcareous;
  TestedBars bars = bars_from(table.text(row, "bars"));
  bars.axis_m = 0.048 + 0.5 * bars.diameter_m;
  bars.yield_Pa = bars.diameter_m == 0.0254 ? 444e6 : 442e6;
  test.bars = bars;
  return test;
}

FireTestFamily tube_family(const std::string& section, Aggregate aggregate) {
  if (section.find("square") != std::string::npos) return FireTestFamily::square_tube;
  return aggregate == Aggregate::siliceous ? FireTestFamily::round_tube_siliceous
                                           : FireTestFamily::round_tube_calcareous;
}

/// Bars 23 mm clear of the tube (from memory, as the rows say in words).
FireTest tube_test(const PublishedTable& table, std::size_t row) {
  FireTest test = common_part(table, row);
  test.family = tube_family(table.text(row, "section"), test.aggregate);
  test.wall_m = units::m_from_mm(table.number(row, "t_mm"));
  test.tube_yield_Pa = units::Pa_from_MPa(leading_number(table.text(row, "fy_tube_MPa")));
  if (!table.is_blank(row, "bars")) {
    TestedBars bars = bars_from(table.text(row, "bars"));
    bars.axis_m = 0.023 + 0.5 * bars.diameter_m;
    bars.yield_Pa = units::Pa_from_MPa(leading_number(table.text(row, "fy_bar_MPa")));
    test.bars = bars;
  }
  return test;
}

thermal::Tube tube_of(const FireTest& test, const Assumptions& assumptions) {
  thermal::Tube tube;
  tube.thickness_m = test.wall_m;
  tube.yield_Pa = test.tube_yield_Pa;
  tube.role = thermal::TubeRole::composite;
  tube.contact_resistance_m2K_W = assumptions.contact_resistance_m2K_W;
  return tube;
}

thermal::BarGroup bars_of(const TestedBars& bars, double core_width_m) {
  thermal::BarGroup group;
  group.diameter_m = bars.diameter_m;
  group.yield_Pa = bars.yield_Pa;
  group.positions = bars_in_a_square(bars.count, 0.5 * core_width_m - bars.axis_m);
  return group;
}

bool is_round(FireTestFamily family) {
  return family == FireTestFamily::round_tube_siliceous ||
         family == FireTestFamily::round_tube_calcareous;
}

thermal::Section section_of(const FireTest& test, const Assumptions& assumptions) {
  thermal::Section section;
  section.outline = {is_round(test.family) ? thermal::Shape::circular : thermal::Shape::square,
                     test.width_m, test.width_m};
  section.core.strength_Pa = test.strength_Pa;
  section.core.aggregate = test.aggregate;
  section.core.moisture_fraction = assumptions.moisture_fraction;
  section.core.conductivity = assumptions.conductivity;
  if (test.wall_m > 0.0) section.tube = tube_of(test, assumptions);
  if (test.bars) section.bars.push_back(bars_of(*test.bars, section.core_width_m()));
  return section;
}

double own_weight_N(const FireTest& test, double density_kg_m3) {
  constexpr double kGravity_m_s2 = 9.81;
  return density_kg_m3 * kGravity_m_s2 * test.width_m * test.width_m * test.length_m;
}

}  // namespace

std::string family_name(FireTestFamily family) {
  switch (family) {
    case FireTestFamily::concrete_siliceous:
      return "reinforced concrete, siliceous";
    case FireTestFamily::concrete_calcareous:
      return "reinforced concrete, carbonate";
    case FireTestFamily::round_tube_siliceous:
      return "round filled tubes, siliceous";
    case FireTestFamily::round_tube_calcareous:
      return "round filled tubes, carbonate";
    case FireTestFamily::square_tube:
      break;
  }
  return "square filled tubes, carbonate";
}

const std::vector<FireTestFamily>& fire_test_families() {
  static const std::vector<FireTestFamily> families = {
      FireTestFamily::concrete_siliceous, FireTestFamily::concrete_calcareous,
      FireTestFamily::round_tube_siliceous, FireTestFamily::round_tube_calcareous,
      FireTestFamily::square_tube};
  return families;
}

bool is_tube(FireTestFamily family) {
  return family != FireTestFamily::concrete_siliceous &&
         family != FireTestFamily::concrete_calcareous;
}

std::vector<FireTest> fire_tests() {
  std::vector<FireTest> tests;
  const PublishedTable concrete("rc_columns.csv");
  for (std::size_t row = 0; row < concrete.size(); ++row) {
    tests.push_back(concrete_test(concrete, row));
  }
  const PublishedTable tubes("filled_tubes.csv");
  for (std::size_t row = 0; row < tubes.size(); ++row) tests.push_back(tube_test(tubes, row));
  return tests;
}

// Fixed before the first column was rated; where each comes from stands in docs/validation.md.
Assumptions assumptions_for(const FireTest& test) {
  if (is_tube(test.family)) {
    return {.conductivity = thermal::ConductivityLimit::upper,
            .moisture_fraction = 0.04,
            .buckling_length_m = 2.0,
            .length_per_imperfection = 400,
            .contact_resistance_m2K_W = 0.01};
  }
  return {.conductivity = thermal::ConductivityLimit::lower,
          .moisture_fraction = 0.03,
          .buckling_length_m = 0.5 * test.length_m,
          .length_per_imperfection = 400,
          .contact_resistance_m2K_W = 0.0};
}

mechanical::Column column_of(const FireTest& test, const Assumptions& assumptions) {
  mechanical::Column column;
  column.section = section_of(test, assumptions);
  column.confinement = mechanical::ConfinementModel::none;
  column.member = {
      .length_m = test.length_m,
      .buckling_length_m = assumptions.buckling_length_m,
      .imperfection_m = assumptions.buckling_length_m / assumptions.length_per_imperfection};
  column.load.axial_N =
      test.load_N > 0.0 ? test.load_N : own_weight_N(test, column.section.core.density_kg_m3);
  return column;
}

thermal::FireExposure test_fire(double duration_min) {
  thermal::FireExposure fire;
  fire.duration_s = units::s_from_min(duration_min);
  fire.gas = fires::gas_temperature(fires::nominal_curve("astm-e119"), fire.duration_s);
  return fire;
}

std::optional<double> predicted_min(const FireTest& test, const Assumptions& assumptions) {
  const mechanical::Rating rating =
      rate(column_of(test, assumptions), test_fire(2.0 * test.measured_min),
           thermal::Accuracy::standard, {.bounds = false, .uncertainty = false});
  if (!rating.chosen.fire_resistance_s) return std::nullopt;
  return units::min_from_s(*rating.chosen.fire_resistance_s);
}

}  // namespace ringward::testing
