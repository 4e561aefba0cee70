// The least concrete filled hollow sections of EN 1994-1-2, from outside: does the hot section
// carry the load that the table allows it?

#include <algorithm>
#include <catch2/catch.hpp>

#include "mechanical/rating/rating.hpp"
#include "tests/support/bar_positions.hpp"
#include "tests/support/columns.hpp"
#include "tests/support/published_table.hpp"
#include "thermal/base/units.hpp"

using namespace ringward;
using namespace ringward::mechanical;
using ringward::testing::PublishedTable;

namespace {

// The table gives neither: C30, S500, eight bars in a ring, their axis distance measured from the
// inner face of the tube, a round section and a wall of d/25, the thickest that the table counts.
constexpr double kConcrete_Pa = 30e6;
constexpr double kBars_Pa = 500e6;
constexpr double kTube_Pa = 235e6;
constexpr int kBars = 8;

struct Entry {
  double load_level = 0;
  double class_min = 0;
  double diameter_m = 0;
  double bar_share = 0;
  double bar_axis_m = 0;
};

/// None where the table has no entry.
std::optional<Entry> entry(const PublishedTable& table, std::size_t row) {
  if (table.text(row, "min_b_h_or_d_mm") == "-") return std::nullopt;
  return Entry{.load_level = table.number(row, "eta_fi_max"),
               .class_min = std::stod(table.text(row, "R").substr(1)),
               .diameter_m = units::m_from_mm(table.number(row, "min_b_h_or_d_mm")),
               .bar_share = table.number(row, "min_As_percent") / 100.0,
               .bar_axis_m = table.is_blank(row, "min_us_mm")
                                 ? 0.0
                                 : units::m_from_mm(table.number(row, "min_us_mm"))};
}

double circle_m2(double diameter_m) { return units::kPi * diameter_m * diameter_m / 4.0; }
double core_m(const Entry& e) { return e.diameter_m * (1.0 - 2.0 / 25.0); }

Column column_of(const Entry& e) {
  Column column = testing::round_column({.moisture_fraction = 0.03});
  column.section.outline = {thermal::Shape::circular, e.diameter_m, e.diameter_m};
  column.section.tube->thickness_m = e.diameter_m / 25.0;
  column.section.tube->yield_Pa = kTube_Pa;
  column.section.tube->role = thermal::TubeRole::composite;
  column.section.core.strength_Pa = kConcrete_Pa;
  if (e.bar_share > 0.0) {
    thermal::BarGroup group;
    group.diameter_m = testing::bar_diameter_m(e.bar_share * circle_m2(core_m(e)), kBars);
    group.yield_Pa = kBars_Pa;
    group.positions = testing::bars_in_a_ring(kBars, 0.5 * core_m(e) - e.bar_axis_m);
    column.section.bars.push_back(group);
  }
  // Only the section is asked here; the member is a stub under next to no load.
  column.member = {.length_m = 0.2, .buckling_length_m = 0.2, .imperfection_m = 1e-6};
  column.load.axial_N = 1e4;
  return column;
}

/// en1994-1-2-2005 Table 4.7 (from memory): f_y 235, wall of at most d/25, at most 3 % of bars
/// counted; gamma 1.0 for steel, 1.5 for concrete, 1.15 for bars.
double cold_design_resistance_N(const Entry& e) {
  const double core_m2 = circle_m2(core_m(e));
  const double tube_m2 = circle_m2(e.diameter_m) - core_m2;
  return tube_m2 * kTube_Pa / 1.0 + core_m2 * (1.0 - e.bar_share) * kConcrete_Pa / 1.5 +
         core_m2 * std::min(e.bar_share, 0.03) * kBars_Pa / 1.15;
}

double hot_ratio(const Entry& e) {
  const Column column = column_of(e);
  const thermal::TemperatureHistory history =
      thermal::solve_heat_flow(column.section, testing::standard_fire(e.class_min), {});
  const CapacityState hot = capacities(column, history, {units::s_from_min(e.class_min)}).front();
  return hot.plastic_N / cold_design_resistance_N(e);
}

}  // namespace

TEST_CASE("The least filled sections of the code carry the load level they are listed for") {
  // Source: en1994-1-2-2005 Table 4.7, from memory; the ratios beside it computed independently.
  const PublishedTable table("EN1994-1-2_2005_T4.7_CFHS.csv");
  const PublishedTable computed("computed_EN1994-1-2_T4.7_ratios.csv");
  std::size_t checked = 0;
  for (std::size_t row = 0; row < table.size(); ++row) {
    const std::optional<Entry> e = entry(table, row);
    if (!e) continue;
    REQUIRE(computed.text(checked, "R") == table.text(row, "R"));
    REQUIRE(computed.number(checked, "eta_fi_max") == e->load_level);
    const double listed = computed.number(checked, "ratio");
    const double ratio = hot_ratio(*e);
    INFO("load level " << e->load_level << ", " << table.text(row, "R") << ": " << ratio
                       << ", computed independently " << listed);
    // One-sided, because the table is a simplification to round numbers: it may leave a reserve,
    // and does (0.33 for 0.28), but a section of it must not fail. 0.01: its load levels have two
    // digits, and lambda and moisture are choices.
    CHECK(ratio >= e->load_level - 0.01);
    // 0.015: half a digit of the listed ratio, and 0.01 for the bar layout and the strength of the
    // concrete, which the computation did not state (C40 instead of C30 moves it by 0.01 to 0.06).
    CHECK(ratio == Approx(listed).margin(0.015));
    ++checked;
  }
  CHECK(checked == computed.size());
}
