// Tested reinforced-concrete columns rated end to end, as an engineer would before the test.

#include <catch2/catch.hpp>
#include <cmath>

#include "mechanical/rating/rating.hpp"
#include "tests/support/bar_positions.hpp"
#include "tests/support/columns.hpp"
#include "tests/support/published_table.hpp"
#include "thermal/base/units.hpp"

using namespace ringward;
using namespace ringward::mechanical;
using ringward::testing::PublishedTable;

namespace {

// One set of assumptions for every column, chosen before the first was rated:
// - siliceous, lower conductivity (what en1992-1-2-2004 3.3.3 gives for concrete columns),
//   moisture 3 %, density 2300: not measured in the data set;
// - fixed at both ends: buckling length half the total length of 3.81 m, of which 3.05 m stand in
//   the furnace (common practice, no source); imperfection buckling length / 400, the default;
// - cylinder strength at the day of the test (read); bars 4 x 25.4 mm, 61 mm from the faces to
//   their centres, 444 MPa, hot rolled (from memory); concentric load (from memory), constant;
// - fire and surface as the program's defaults for astm-e119.
constexpr double kBarDiameter_m = 0.0254;
constexpr double kBarAxis_m = 0.061;
constexpr double kBarYield_Pa = 444e6;

Column column_of(const PublishedTable& tests, std::size_t row) {
  const double side_m = units::m_from_mm(tests.number(row, "D_mm_or_b"));
  Column column = testing::square_concrete_column(side_m);
  column.section.core.strength_Pa = units::Pa_from_MPa(tests.number(row, "fc_MPa_cyl_at_test"));
  column.section.core.moisture_fraction = 0.03;
  thermal::BarGroup& group = column.section.bars.front();
  group.diameter_m = kBarDiameter_m;
  group.yield_Pa = kBarYield_Pa;
  group.positions = testing::bars_in_a_square(4, 0.5 * side_m - kBarAxis_m);
  const double length_m = units::m_from_mm(tests.number(row, "length_mm"));
  column.member = {.length_m = length_m,
                   .buckling_length_m = 0.5 * length_m,
                   .imperfection_m = 0.5 * length_m / 400.0};
  column.load.axial_N = units::N_from_kN(tests.number(row, "load_kN"));
  return column;
}

thermal::FireExposure astm_fire(double duration_min) {
  thermal::FireExposure fire;
  fire.duration_s = units::s_from_min(duration_min);
  fire.gas = fires::gas_temperature(fires::nominal_curve("astm-e119"), fire.duration_s);
  return fire;
}

/// The loaded siliceous 305 mm columns with four bars of the programme's first series: the load is
/// what varies between them. Those of the second series differ in what is only remembered.
bool belongs(const PublishedTable& tests, std::size_t row) {
  return tests.text(row, "id").find("NRC I-") != std::string::npos &&
         tests.number(row, "D_mm_or_b") == 304.8 && tests.text(row, "aggregate") == "siliceous" &&
         tests.number(row, "load_kN") > 0.0;
}

}  // namespace

// Source: rilem306cfr (CC BY 4.0; size, strength, duration read), loads and details from memory of
// lie-woollerton1988 and lin1992. Band of 30 %: two such columns under the same load in this very
// set, with 4 % apart in strength, lasted 170 and 187 min; moisture, end fixity, cover and load in
// a furnace are known to some 10 % each in their effect, and calculated over measured times of
// column tests are commonly found to scatter with a coefficient of variation of 0.15 (common
// practice, no source): twice that. Nothing was adjusted to the results.
TEST_CASE("Tested concrete columns are rated within the scatter of fire tests") {
  const PublishedTable tests("rc_columns.csv");
  int rated = 0;
  for (std::size_t row = 0; row < tests.size(); ++row) {
    if (!belongs(tests, row)) continue;
    const double measured_min = tests.number(row, "fire_resistance_min");
    const Rating rating =
        rate(column_of(tests, row), astm_fire(1.5 * measured_min), thermal::Accuracy::standard);
    INFO(tests.text(row, "id") << " under " << tests.text(row, "load_kN") << " kN, measured "
                               << measured_min << " min");
    REQUIRE(rating.chosen.fire_resistance_s.has_value());
    const double predicted_min = units::min_from_s(*rating.chosen.fire_resistance_s);
    INFO("predicted " << predicted_min << " min, " << predicted_min / measured_min
                      << " of measured");
    CHECK(predicted_min / measured_min == Approx(1.0).margin(0.30));
    ++rated;
  }
  CHECK(rated == 6);
}
