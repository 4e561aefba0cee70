#include "mechanical/section/fibres.hpp"

#include <catch2/catch.hpp>
#include <cmath>

#include "tests/support/columns.hpp"
#include "thermal/base/units.hpp"
#include "thermal/temperature_history.hpp"

using namespace ringward;
using namespace ringward::mechanical;

namespace {

struct Sums {
  double area_m2 = 0, first_u_m3 = 0, second_u_m4 = 0, second_v_m4 = 0;
};

Sums sums_of(const std::vector<Fibre>& fibres) {
  Sums s;
  for (const Fibre& f : fibres) {
    s.area_m2 += f.area_m2;
    s.first_u_m3 += f.area_m2 * f.u_m;
    s.second_u_m4 += f.area_m2 * f.u_m * f.u_m;
    s.second_v_m4 += f.area_m2 * f.v_m * f.v_m;
  }
  return s;
}

thermal::TemperatureHistory heated(const Column& column) {
  return thermal::solve_heat_flow(column.section, testing::standard_fire(1), {});
}

}  // namespace

TEST_CASE("the fibres of a ring have its exact area and second moment, in any direction") {
  const Column column = testing::round_column({});
  const auto history = heated(column);
  const double r = 0.195;
  for (const double angle : {0.0, 0.3, 2.0}) {
    const FibreLayout layout =
        fibre_layout(column.section, history.grid(), Direction{std::cos(angle), std::sin(angle)});
    const Sums s = sums_of(layout.concrete);
    // Geometry of a disc: pi r^2 and pi r^4 / 4; sectors at the radius of gyration: only rounding.
    CHECK(s.area_m2 == Approx(units::kPi * r * r).epsilon(1e-12));
    CHECK(s.second_u_m4 == Approx(units::kPi * std::pow(r, 4) / 4.0).epsilon(1e-12));
    CHECK(s.first_u_m3 == Approx(0.0).margin(1e-15));
  }
}

TEST_CASE("bars displace the concrete they stand in") {
  const Column column = testing::round_column({.bars = 8});
  const auto history = heated(column);
  const FibreLayout layout = fibre_layout(column.section, history.grid(), Direction{1, 0});
  const double bars_m2 = 8.0 * units::kPi * 0.02 * 0.02 / 4.0;
  CHECK(sums_of(layout.steel).area_m2 == Approx(bars_m2).epsilon(1e-12));
  CHECK(sums_of(layout.concrete).area_m2 ==
        Approx(units::kPi * 0.195 * 0.195 - bars_m2).epsilon(1e-12));
}

TEST_CASE("merging what uniaxial bending cannot tell apart keeps area and moments") {
  const Column column = testing::square_concrete_column(0.3);
  const auto history = heated(column);
  const FibreLayout layout = fibre_layout(column.section, history.grid(), Direction{0, 1});
  const FibreLayout merged = merged_in_v(layout);
  CHECK(merged.concrete.size() < layout.concrete.size());
  const Sums before = sums_of(layout.concrete);
  const Sums after = sums_of(merged.concrete);
  CHECK(after.area_m2 == Approx(before.area_m2).epsilon(1e-13));
  CHECK(after.second_u_m4 == Approx(before.second_u_m4).epsilon(1e-13));
}

TEST_CASE("a tube carries axial force only where it is loaded with the core") {
  Column column = testing::round_column({});
  const auto history = heated(column);
  CHECK(fibre_layout(column.section, history.grid(), Direction{1, 0}).steel.empty());
  column.section.tube->role = thermal::TubeRole::composite;
  const FibreLayout composite = fibre_layout(column.section, history.grid(), Direction{1, 0});
  // pi (0.2^2 - 0.195^2), exact.
  CHECK(sums_of(composite.steel).area_m2 ==
        Approx(units::kPi * (0.04 - 0.195 * 0.195)).epsilon(1e-12));
}
