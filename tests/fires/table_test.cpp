#include <catch2/catch.hpp>
#include <cmath>
#include <limits>

#include "fires/fire_curve.hpp"
#include "thermal/base/error.hpp"

using namespace ringward;
using namespace ringward::fires;

namespace {

FireCurvePtr natural_fire() {
  return table_curve({{0.0, 20.0}, {600.0, 680.0}, {3600.0, 940.0}, {7200.0, 20.0}});
}

/// Points of a nominal curve, rounded to whole degrees as by hand.
FireCurvePtr table_of(const std::string& name) {
  const FireCurvePtr curve = nominal_curve(name);
  std::vector<TablePoint> points;
  for (double t_s = 0.0; t_s <= 7200.0; t_s += 300.0) {
    points.push_back({t_s, std::round(curve->gas_C(t_s))});
  }
  return table_curve(points);
}

}  // namespace

// Identity: linear between the points, constant outside. Exact to rounding.
TEST_CASE("A table is linear between its points and constant outside them") {
  const FireCurvePtr curve = natural_fire();
  CHECK(curve->gas_C(300.0) == Approx(350.0));
  CHECK(curve->gas_C(600.0) == 680.0);
  CHECK(curve->gas_C(5400.0) == Approx(480.0));
  CHECK(curve->gas_C(1e6) == 20.0);
  CHECK(table_curve({{60.0, 100.0}, {120.0, 200.0}})->gas_C(0.0) == 100.0);
}

TEST_CASE("A table's kinks are its points") {
  CHECK(natural_fire()->kinks_s() == std::vector<double>{0.0, 600.0, 3600.0, 7200.0});
}

TEST_CASE("A table cools from the first point after which it falls") {
  CHECK(natural_fire()->cooling_starts_s() == 3600.0);
  CHECK(natural_fire()->has_cooling());
  CHECK_FALSE(table_curve({{0.0, 20.0}, {600.0, 680.0}, {1200.0, 680.0}})->has_cooling());
  CHECK(table_curve({{0.0, 20.0}, {10.0, 50.0}, {20.0, 40.0}, {30.0, 60.0}, {40.0, 50.0}})
            ->cooling_starts_s() == 10.0);
}

// Source: en1991-1-2-2002 3.3.1 and 3.2, from memory: 35 W/m2K for natural fires, 25 or 50 for the
// nominal curves. Exact: copied.
TEST_CASE("A table that holds a nominal curve asks for that curve's convection") {
  for (const std::string& name : nominal_curve_names()) {
    INFO(name);
    const FireCurvePtr table = table_of(name);
    CHECK(table->convection_W_m2K() == 35.0);
    const Notices notices = table->notices();
    REQUIRE(notices.size() == 1);
    CHECK(notices.front().code == "table-follows-nominal-curve");
    const char* asked = name == "hydrocarbon" ? "convection_W_m2K = 50" : "convection_W_m2K = 25";
    CHECK_THAT(notices.front().text, Catch::Contains(asked) && Catch::Contains(name));
  }
}

TEST_CASE("A natural fire in a table, or too few points to tell, draws no notice") {
  CHECK(natural_fire()->notices().empty());
  CHECK(table_curve({{0.0, 20.0}, {1800.0, 842.0}, {3600.0, 945.0}})->notices().empty());
  CHECK(table_curve({{0.0, 20.0}, {1800.0, 842.0}, {3600.0, 945.0}, {5400.0, 900.0}})
            ->notices()
            .empty());
}

TEST_CASE("A table that is empty, unordered, negative or not a number is refused") {
  const double nan = std::nan("");
  const double infinity = std::numeric_limits<double>::infinity();
  CHECK_THROWS_AS(table_curve({}), Error);
  CHECK_THROWS_AS(table_curve({{0.0, 20.0}, {0.0, 30.0}}), Error);
  CHECK_THROWS_AS(table_curve({{60.0, 20.0}, {0.0, 30.0}}), Error);
  CHECK_THROWS_AS(table_curve({{-1.0, 20.0}, {60.0, 30.0}}), Error);
  CHECK_THROWS_AS(table_curve({{0.0, nan}, {60.0, 30.0}}), Error);
  CHECK_THROWS_AS(table_curve({{nan, 20.0}}), Error);
  CHECK_THROWS_AS(table_curve({{0.0, 20.0}, {infinity, 30.0}}), Error);
  CHECK_THROWS_AS(table_curve({{0.0, 20.0}, {60.0, infinity}}), Error);
  CHECK_THROWS_AS(table_curve({{0.0, -273.15}}), Error);
}

TEST_CASE("A constant fire keeps its temperature from the first moment") {
  const FireCurvePtr curve = constant_curve(1000.0);
  CHECK(curve->gas_C(0.0) == 1000.0);
  CHECK(curve->gas_C(1e6) == 1000.0);
  CHECK_FALSE(curve->has_cooling());
  CHECK_FALSE(curve->is_nominal());
  CHECK(curve->kinks_s().empty());
  CHECK(curve->convection_W_m2K() == 25.0);  // as for the standard curve, common practice
  CHECK_THROWS_AS(constant_curve(std::nan("")), Error);
  CHECK_THROWS_AS(constant_curve(-300.0), Error);
}

TEST_CASE("The heat flow is told the kinks inside the followed time only") {
  CHECK(gas_temperature(natural_fire(), 7200.0).kinks_s == std::vector<double>{600.0, 3600.0});
  CHECK(gas_temperature(natural_fire(), 600.0).kinks_s.empty());
  CHECK(gas_temperature(nominal_curve("slow"), 1260.0).kinks_s.empty());
  CHECK(gas_temperature(nominal_curve("slow"), 1261.0).kinks_s == std::vector<double>{1260.0});
}

TEST_CASE("The heat flow is told of cooling only when it happens within the followed time") {
  CHECK_FALSE(gas_temperature(natural_fire(), 3600.0).has_cooling);
  CHECK(gas_temperature(natural_fire(), 3601.0).has_cooling);
  CHECK_FALSE(gas_temperature(nominal_curve("standard"), 1e6).has_cooling);
}

TEST_CASE("The heat flow's gas temperature is the curve's and outlives the caller's pointer") {
  FireCurvePtr curve = natural_fire();
  const thermal::GasTemperature gas = gas_temperature(curve, 7200.0);
  curve.reset();
  CHECK(gas.T_C(600.0) == 680.0);
}
