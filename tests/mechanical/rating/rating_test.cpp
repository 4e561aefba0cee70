#include "mechanical/rating/rating.hpp"

#include <catch2/catch.hpp>

#include "tests/support/columns.hpp"
#include "thermal/base/units.hpp"

using namespace ringward;
using namespace ringward::mechanical;
using thermal::Accuracy;

namespace {

double minutes(const std::optional<double>& fire_resistance_s) {
  return units::min_from_s(fire_resistance_s.value());
}

bool has_notice(const Rating& rating, const std::string& code) {
  for (const Notice& notice : rating.notices) {
    if (notice.code == code) return true;
  }
  return false;
}

/// As the section of the snap-through example: so short that only the section matters.
Column stub(double load_N) {
  Column column = testing::round_column({});
  column.confinement = ConfinementModel::contact;
  column.member = {.length_m = 0.4, .buckling_length_m = 0.4, .imperfection_m = 1e-5};
  column.load.axial_N = load_N;
  return column;
}

}  // namespace

TEST_CASE("a tubed column under 4500 kN falls at its first peak and is not saved by the second") {
  // Independent rough calculation (derived, no publication): 400 x 5, C40: first peak 4443 kN at
  // 20 min and 4677 kN at 10 min, second peak 4849 kN at 0.9 % strain; lost at 17 to 18 min.
  const Rating rating = rate(stub(4.5e6), testing::standard_fire(60), Accuracy::standard);
  CHECK(minutes(rating.chosen.fire_resistance_s) > 17.0);
  CHECK(minutes(rating.chosen.fire_resistance_s) < 18.0);
  CHECK(rating.chosen.reserve_N > 4.8e6);
  CHECK(has_notice(rating, "reserve-at-larger-strain"));
}

TEST_CASE("the history ends at the fall, where capacity meets the load") {
  const Rating rating = rate(stub(4.2e6), testing::standard_fire(90), Accuracy::standard);
  const HistoryRow& last = rating.chosen.history.back();
  CHECK(last.time_s == rating.chosen.fire_resistance_s.value());
  // 0.005 min before the crossing, at a slope of about 20 kN/min: 0.1 kN, less than 1e-4.
  CHECK(last.capacity_N == Approx(4.2e6).epsilon(1e-4));
  CHECK(last.capacity_N >= 4.2e6 * (1.0 - 1e-8));
  double before_s = -1.0;
  for (const HistoryRow& row : rating.chosen.history) {
    CHECK(row.time_s > before_s);
    CHECK(row.capacity_N >= row.demand_N * (1.0 - 1e-8));
    before_s = row.time_s;
  }
}

TEST_CASE("more confinement never shortens the life of a stocky column that lives on it") {
  const auto or_end = [](const std::optional<double>& s) { return s.value_or(7200.0); };
  for (const double load_N : {4.2e6, 5.0e6}) {
    const Rating rating = rate(stub(load_N), testing::standard_fire(120), Accuracy::standard);
    CAPTURE(load_N);
    // Equal within the resolution of the search where the tube has no grip.
    CHECK(or_end(rating.bounds->none_s) <= or_end(rating.bounds->contact_s) + 0.6);
    CHECK(or_end(rating.bounds->contact_s) <= or_end(rating.bounds->yield_s) + 0.6);
  }
}

TEST_CASE("a bound that comes out of order is named, never hidden") {
  // After an hour the tube's pressure is small, and the law for confined concrete moves the peaks
  // of hot layers to strains where the core is past its own: "yield" then falls below "none".
  const Rating rating = rate(stub(3.0e6), testing::standard_fire(150), Accuracy::standard);
  REQUIRE(*rating.bounds->yield_s < *rating.bounds->none_s - 1.0);
  CHECK(has_notice(rating, "confinement-softens"));
}

namespace {

std::vector<double> capacities_by_minute(const Column& column, Accuracy accuracy) {
  const thermal::FireExposure fire = testing::standard_fire(60);
  const auto history = thermal::solve_heat_flow(column.section, fire, {.accuracy = accuracy});
  std::vector<double> times_s;
  for (int k = 0; k <= 60; ++k) times_s.push_back(60.0 * k);
  std::vector<double> result;
  for (const CapacityState& state : capacities(column, history, times_s)) {
    result.push_back(state.capacity_N);
  }
  return result;
}

double largest_rise(const std::vector<double>& values) {
  double lowest = values.front();
  double rise = 0.0;
  for (const double value : values) {
    rise = std::max(rise, value - lowest);
    lowest = std::min(lowest, value);
  }
  return rise / values.front();
}

}  // namespace

TEST_CASE("under all-round heating without confinement the capacity does not rise") {
  // 0.1 % of the cold value is what thermal self-stress may do to a stocky or a slender column.
  Column column = testing::round_column({.bars = 8});
  column.load.axial_N = 1.2e6;
  for (const double length_m : {0.4, 4.0}) {
    column.member = {length_m, length_m, length_m / 400.0};
    CAPTURE(length_m);
    CHECK(largest_rise(capacities_by_minute(column, Accuracy::standard)) < 1e-3);
  }
}

TEST_CASE("at medium slenderness the capacity rises a little in the first minutes, on any grid") {
  // The peak strain of concrete grows from 0.25 % at 20 C to 0.4 % at 100 C at full strength
  // (EN 1992-1-2 Table 3.1), so the warmed outer ring still carries when the core is at its peak.
  // 0.19 % was found; a grid of twice the cells agrees to a hundredth of a percent.
  Column column = testing::round_column({.bars = 8});
  column.load.axial_N = 1.2e6;
  const double rise = largest_rise(capacities_by_minute(column, Accuracy::standard));
  CHECK(rise < 2.5e-3);
  CHECK(rise == Approx(largest_rise(capacities_by_minute(column, Accuracy::fine))).margin(1e-4));
}

TEST_CASE("a load above the cold capacity is a resistance of zero, with its notice") {
  const Rating rating = rate(stub(9e6), testing::standard_fire(30), Accuracy::coarse);
  CHECK(rating.chosen.fire_resistance_s.value() == 0.0);
  CHECK(has_notice(rating, "load-above-cold-resistance"));
  CHECK(rating.chosen.history.size() == 1);
}

TEST_CASE("end moments beyond what the hot section can bear leave no capacity, and no error") {
  Column column = testing::round_column({.bars = 8});
  column.load.moments_given = true;
  column.load.moment_x_Nm = 150e3;
  const auto history = thermal::solve_heat_flow(column.section, testing::standard_fire(180), {});
  for (const ConfinementModel model : {ConfinementModel::none, ConfinementModel::contact}) {
    column.confinement = model;
    const std::vector<CapacityState> states = capacities(column, history, {0.0, 1800.0, 10800.0});
    CHECK(states[0].capacity_N > states[1].capacity_N);
    CHECK(states[1].capacity_N > column.load.axial_N);
    CHECK(states[2].capacity_N == 0.0);
  }
}

TEST_CASE("a column loaded far out of its middle is followed from its first load on") {
  // Half the width out, a tenth of a percent of the section in bars: the mean strain is tensile
  // from the start.
  Column column = testing::square_concrete_column(0.4);
  column.member = {.length_m = 3.46, .buckling_length_m = 3.46, .imperfection_m = 0.00865};
  column.load.eccentricity_x_m = 0.2;
  column.load.axial_N = 1e5;
  const Rating rating = rate(column, testing::standard_fire(120), Accuracy::coarse);
  CHECK(rating.chosen.cold_capacity_N > 1e5);
  CHECK(rating.chosen.fire_resistance_s.value_or(7200.0) > 600.0);
}

TEST_CASE("a lightly loaded column survives the followed fire") {
  const Rating rating = rate(stub(3e5), testing::standard_fire(60), Accuracy::coarse);
  CHECK_FALSE(rating.chosen.fire_resistance_s.has_value());
  CHECK(rating.chosen.history.back().time_s == 3600.0);
}

TEST_CASE("end gaps of 10 mm close early and take the confinement with them") {
  // Independent rough calculation (derived, no publication): a bare 3.5 m tube closes 10 mm gaps at
  // about 11 min; the load's own shortening brings it forward.
  Column column = testing::round_column({.end_gap_m = 0.010});
  column.confinement = ConfinementModel::contact;
  column.load.axial_N = 1.5e6;
  const Rating rating = rate(column, testing::standard_fire(60), Accuracy::standard);
  double closed_min = -1.0;
  for (const TubeEvent& event : rating.chosen.events) {
    if (event.kind == TubeEventKind::end_gap_closed) closed_min = units::min_from_s(event.time_s);
  }
  CHECK(closed_min > 8.0);
  CHECK(closed_min < 12.0);
  CHECK(has_notice(rating, "end-gap-closed"));
}

TEST_CASE("the closing of the end gap ends a column that lives on its confinement") {
  Column column = stub(6.0e6);
  column.section.tube->end_gap_m = 0.1;
  const Rating open = rate(column, testing::standard_fire(30), Accuracy::standard);
  column.section.tube->end_gap_m = 0.014;
  const Rating closing = rate(column, testing::standard_fire(30), Accuracy::standard);
  CHECK(minutes(closing.chosen.fire_resistance_s) < minutes(open.chosen.fire_resistance_s) - 1.0);
  CHECK(closing.chosen.criterion == "loss of confinement when the end gap closes");
  // So small a gap closes under the load itself, before the fire.
  column.section.tube->end_gap_m = 0.002;
  const Rating at_once = rate(column, testing::standard_fire(30), Accuracy::standard);
  CHECK(*at_once.chosen.fire_resistance_s == 0.0);
  CHECK(has_notice(at_once, "end-gap-closed"));
}

TEST_CASE("a column heated on one side is rated the same from whichever side") {
  const auto rated = [](thermal::Face heated) {
    thermal::FireExposure fire = testing::standard_fire(180);
    fire.exposed.faces.fill(thermal::FaceCondition::ambient);
    fire.exposed.faces[static_cast<std::size_t>(heated)] = thermal::FaceCondition::heated;
    Column column = testing::square_concrete_column(0.25);
    column.load.axial_N = 1.5e6;
    return rate(column, fire, Accuracy::coarse);
  };
  const Rating left = rated(thermal::Face::left);
  const Rating top = rated(thermal::Face::top);
  REQUIRE(left.chosen.fire_resistance_s.has_value());
  // The same problem turned by a right angle: different cell numbering, so solver tolerance.
  CHECK(minutes(left.chosen.fire_resistance_s) ==
        Approx(minutes(top.chosen.fire_resistance_s)).margin(0.02));
}

TEST_CASE("a round column heated on half its arc is rated the same wherever the arc points") {
  const auto rated = [](double from_deg) {
    thermal::FireExposure fire = testing::standard_fire(180);
    fire.exposed.heated_arc =
        thermal::Arc{units::rad_from_deg(from_deg), units::rad_from_deg(from_deg + 180.0)};
    Column column = testing::round_column({.bars = 8, .start_deg = from_deg});
    column.member = {.length_m = 3.0, .buckling_length_m = 3.0, .imperfection_m = 0.0075};
    column.load.axial_N = 3.2e6;
    return rate(column, fire, Accuracy::coarse).chosen.fire_resistance_s;
  };
  // The same body turned with its bars, on a grid turned with its arc: only the search differs. The
  // worst direction is the axis of the heating, wherever it points.
  CHECK(minutes(rated(45.0)) == Approx(minutes(rated(0.0))).margin(0.02));
  CHECK(minutes(rated(20.0)) == Approx(minutes(rated(0.0))).margin(0.02));
}

TEST_CASE("an eccentricity and its mirror image give the same resistance") {
  const auto rated = [](double e_x_m, double e_y_m) {
    Column column = testing::square_concrete_column(0.3);
    column.load.eccentricity_x_m = e_x_m;
    column.load.eccentricity_y_m = e_y_m;
    return minutes(
        rate(column, testing::standard_fire(120), Accuracy::coarse).chosen.fire_resistance_s);
  };
  const double along_x = rated(0.03, 0.0);
  // Symmetric section: only the resolution of the search (0.005 min) and rounding differ.
  CHECK(rated(-0.03, 0.0) == Approx(along_x).margin(0.02));
  CHECK(rated(0.0, 0.03) == Approx(along_x).margin(0.02));
  const double oblique = rated(0.02, 0.02);
  CHECK(rated(-0.02, 0.02) == Approx(oblique).margin(0.02));
}

TEST_CASE("a longer column, a larger load and a larger eccentricity never last longer") {
  const auto rated = [](double length_m, double load_N, double e_m) {
    Column column = testing::square_concrete_column(0.3);
    column.member = {length_m, length_m, length_m / 400.0};
    column.load.axial_N = load_N;
    column.load.eccentricity_x_m = e_m;
    return units::min_from_s(rate(column, testing::standard_fire(240), Accuracy::coarse)
                                 .chosen.fire_resistance_s.value_or(1e9));
  };
  const double base = rated(3.0, 8e5, 0.0);
  CHECK(rated(4.0, 8e5, 0.0) < base);
  CHECK(rated(3.0, 1e6, 0.0) < base);
  CHECK(rated(3.0, 8e5, 0.03) < base);
}

TEST_CASE("the stated uncertainty covers the distance to a finer solution") {
  for (const double load_N : {3.0e6, 3.6e6}) {
    const Rating standard = rate(stub(load_N), testing::standard_fire(120), Accuracy::standard);
    const Rating fine = rate(stub(load_N), testing::standard_fire(120), Accuracy::fine);
    const double error_s =
        std::abs(*standard.chosen.fire_resistance_s - *fine.chosen.fire_resistance_s);
    CAPTURE(load_N, error_s, standard.uncertainty_s);
    CHECK(error_s <= standard.uncertainty_s);
  }
}

TEST_CASE("a column can fall while the fire cools, and the tube's new grip is not credited") {
  // Reported for such columns under real fires (Liu, Yang & Yang 2018, read as abstract): heat
  // moves inward after the peak. Peak of this parametric fire at 60 min (EN 1991-1-2 Annex A).
  const fires::FireCurvePtr curve = fires::parametric_curve({.opening_factor_m05 = 0.06,
                                                             .fire_load_enclosure_J_m2 = 300e6,
                                                             .thermal_inertia_J_m2s05K = 1200.0,
                                                             .growth = fires::GrowthRate::medium});
  thermal::FireExposure fire;
  fire.surface.convection_W_m2K = curve->convection_W_m2K();
  fire.duration_s = units::s_from_min(240);
  fire.gas = fires::gas_temperature(curve, fire.duration_s);
  Column column = testing::round_column({.bars = 8, .start_deg = 0.0});
  column.confinement = ConfinementModel::contact;
  column.load.axial_N = 3.6e6;
  const Rating falling = rate(column, fire, Accuracy::standard);
  CHECK(minutes(falling.chosen.fire_resistance_s) > 60.0);
  CHECK(has_notice(falling, "cooling-simplified"));
  column.load.axial_N = 2.0e6;
  const Rating standing = rate(column, fire, Accuracy::standard);
  REQUIRE_FALSE(standing.chosen.fire_resistance_s.has_value());
  REQUIRE(standing.chosen.regained.has_value());
  CHECK(units::min_from_s(standing.chosen.regained->time_s) > 60.0);
  CHECK(standing.chosen.regained->hoop_Pa > 1e6);
  // Not credited: the pressure under the load stays zero to the end.
  CHECK(standing.chosen.history.back().load_pressure_Pa == 0.0);
}
