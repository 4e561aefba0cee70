// Section and member capacity against an independent throw-away program (radial heat flow, fibre
// section, model column; no code shared): computed, not published.

#include <catch2/catch.hpp>

#include "mechanical/rating/rating.hpp"
#include "tests/support/columns.hpp"
#include "tests/support/published_table.hpp"
#include "thermal/base/units.hpp"

using namespace ringward;
using namespace ringward::mechanical;
using ringward::testing::PublishedTable;

namespace {

std::vector<double> times_of(const PublishedTable& table) {
  std::vector<double> times_s;
  for (std::size_t row = 0; row < table.size(); ++row) {
    times_s.push_back(units::s_from_min(table.number(row, "time_min")));
  }
  return times_s;
}

std::vector<CapacityState> states_of(const Column& column, const std::vector<double>& times_s) {
  const thermal::FireExposure fire = testing::standard_fire(units::min_from_s(times_s.back()));
  const thermal::TemperatureHistory history = thermal::solve_heat_flow(column.section, fire, {});
  return capacities(column, history, times_s);
}

}  // namespace

TEST_CASE("section and member capacities agree with an independent program") {
  // column_capacity.csv, computed, stated uncertainty 0.2 %; the project asks for 0.5 %.
  const PublishedTable table("column_capacity.csv");
  Column column = testing::round_column({.moisture_fraction = 0.015, .bars = 8});
  column.member = {.length_m = 3.6, .buckling_length_m = 1.8, .imperfection_m = 0.0108};
  column.load.axial_N = 1e6;
  const std::vector<CapacityState> states = states_of(column, times_of(table));
  for (std::size_t row = 0; row < table.size(); ++row) {
    CAPTURE(table.number(row, "time_min"));
    CHECK(units::kN_from_N(states[row].section_N) ==
          Approx(table.number(row, "section_kN")).epsilon(0.005));
    CHECK(units::kN_from_N(states[row].capacity_N) ==
          Approx(table.number(row, "column_kN")).epsilon(0.005));
  }
}

TEST_CASE("the three confinement answers agree with an independent program") {
  // confinement.csv, computed: largest force over all strains of the core; 1 % (none, yield), 2 %
  // where contact changes fast, as the file states; the project asks for 1.5 % and 4 %.
  const PublishedTable table("confinement.csv");
  Column column = testing::round_column({.moisture_fraction = 0.03});
  column.load.axial_N = 1e5;
  const std::vector<double> times_s = times_of(table);
  const auto check = [&](ConfinementModel model, const char* key, double tolerance) {
    column.confinement = model;
    const std::vector<CapacityState> states = states_of(column, times_s);
    for (std::size_t row = 0; row < table.size(); ++row) {
      CAPTURE(key, table.number(row, "time_min"));
      CHECK(units::kN_from_N(states[row].section_N) ==
            Approx(table.number(row, key)).epsilon(tolerance));
    }
  };
  check(ConfinementModel::none, "none_kN", 0.015);
  check(ConfinementModel::yield, "yield_kN", 0.015);
  check(ConfinementModel::contact, "contact_kN", 0.04);
}

TEST_CASE("the plastic resistance of the cold section is the sum of area times strength") {
  Column column = testing::round_column({.bars = 8});
  const std::vector<CapacityState> states = states_of(column, {0.0, 60.0});
  const double core_m2 = units::kPi * 0.39 * 0.39 / 4.0;
  const double bars_m2 = 8.0 * units::kPi * 0.02 * 0.02 / 4.0;
  // Exact areas: only rounding.
  CHECK(states.front().plastic_N ==
        Approx((core_m2 - bars_m2) * 40e6 + bars_m2 * 500e6).epsilon(1e-9));
}
