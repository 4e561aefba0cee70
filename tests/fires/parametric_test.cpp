#include <catch2/catch.hpp>
#include <cmath>

#include "fires/fire_curve.hpp"
#include "tests/support/published_table.hpp"
#include "thermal/base/error.hpp"
#include "thermal/base/units.hpp"

using namespace ringward;
using namespace ringward::fires;
using ringward::testing::PublishedTable;

namespace {

constexpr double kHour_s = 3600.0;

FireCurvePtr parametric(double opening_m05, double fire_load_MJ_m2, double inertia,
                        GrowthRate growth = GrowthRate::medium) {
  return parametric_curve({.opening_factor_m05 = opening_m05,
                           .fire_load_enclosure_J_m2 = fire_load_MJ_m2 * 1e6,
                           .thermal_inertia_J_m2s05K = inertia,
                           .growth = growth});
}

/// With O = 0.04 and b = 1160 expanded time is real time; t_max = q/200 h.
FireCurvePtr in_real_time(double fire_load_MJ_m2) {
  return parametric(0.04, fire_load_MJ_m2, 1160);
}

GrowthRate growth_of(double t_lim_min) {
  if (t_lim_min == 25.0) return GrowthRate::slow;
  return t_lim_min == 20.0 ? GrowthRate::medium : GrowthRate::fast;
}

}  // namespace

// Source: en1991-1-2-2002 Annex A (A.1) to (A.12), equations from memory, evaluated independently
// (no published worked example at hand). Ventilation-controlled and fuel-controlled fires, the
// latter with O > 0.04, q < 75, b < 1160. 0.05 K and 0.05 min: half a digit of the table.
TEST_CASE("The parametric curve meets its evaluated points, heating and cooling") {
  const PublishedTable table("EN1991-1-2_AnnexA_parametric_evaluated.csv");
  for (std::size_t row = 0; row < table.size(); ++row) {
    const FireCurvePtr curve =
        parametric(table.number(row, "O_m0.5"), table.number(row, "qtd_MJ/m2"),
                   table.number(row, "b"), growth_of(table.number(row, "tlim_min")));
    INFO("row " << row << ", " << table.number(row, "t_min") << " min");
    CHECK(curve->gas_C(units::s_from_min(table.number(row, "t_min"))) ==
          Approx(table.number(row, "theta_g")).margin(0.0501).epsilon(0));
    const double t_max_s = curve->kinks_s().front();
    CHECK(units::min_from_s(t_max_s) ==
          Approx(table.number(row, "tmax_min")).margin(0.0501).epsilon(0));
    CHECK(curve->gas_C(t_max_s) ==
          Approx(table.number(row, "theta_max")).margin(0.0501).epsilon(0));
  }
}

// Source: en1991-1-2-2002 Annex A (A.11), from memory: 625 K/h up to t*_max = 0.5 h, 250 (3 -
// t*_max) up to 2 h, 250 beyond. Exact slopes; 1e-6 relative is the rounding of the difference
// quotient.
TEST_CASE("The three cooling slopes of the annex hold in real time") {
  const struct {
    double fire_load_MJ_m2;
    double slope_K_h;
  } cases[] = {{80, 625.0},  {100, 625.0}, {200, 500.0}, {399, 251.25},
               {400, 250.0}, {420, 250.0}, {500, 250.0}};
  for (const auto& expected : cases) {
    const FireCurvePtr curve = in_real_time(expected.fire_load_MJ_m2);
    const double start_s = curve->kinks_s().front();
    INFO("fire load " << expected.fire_load_MJ_m2);
    CHECK(start_s == Approx(expected.fire_load_MJ_m2 / 200.0 * kHour_s));
    const double fall_K = curve->gas_C(start_s + 60.0) - curve->gas_C(start_s + 660.0);
    CHECK(fall_K * 6.0 == Approx(expected.slope_K_h).epsilon(1e-6));
  }
}

// Source: en1991-1-2-2002 Annex A (A.12), from memory: x = t_lim Gamma/t*_max carries the start of
// cooling to t_lim, so the gas does not jump. Exact: 1e-3 K for 1e-6 s at most 1e4 K/h.
TEST_CASE("The gas temperature does not jump where heating ends and where cooling ends") {
  for (const double fire_load : {50.0, 60.0, 90.0, 200.0, 900.0}) {
    for (const GrowthRate growth : {GrowthRate::slow, GrowthRate::medium, GrowthRate::fast}) {
      const FireCurvePtr curve = parametric(0.08, fire_load, 900, growth);
      REQUIRE(curve->kinks_s().size() == 2);
      for (const double kink_s : curve->kinks_s()) {
        INFO("fire load " << fire_load << ", kink at " << kink_s << " s");
        CHECK(curve->gas_C(kink_s - 1e-6) ==
              Approx(curve->gas_C(kink_s + 1e-6)).margin(1e-3).epsilon(0));
      }
      CHECK(curve->gas_C(curve->kinks_s().back()) == Approx(20.0).margin(1e-6));
      CHECK(curve->gas_C(curve->kinks_s().back() + kHour_s) == 20.0);
    }
  }
}

// Source: en1991-1-2-2002 Annex A (10), from memory: t_lim 25, 20, 15 min for slow, medium, fast.
// Exact to rounding.
TEST_CASE("A fuel-controlled fire peaks at the limit of its growth rate") {
  CHECK(parametric(0.1, 60, 1160, GrowthRate::slow)->kinks_s().front() == Approx(25.0 * 60.0));
  CHECK(parametric(0.1, 60, 1160, GrowthRate::medium)->kinks_s().front() == Approx(20.0 * 60.0));
  CHECK(parametric(0.1, 60, 1160, GrowthRate::fast)->kinks_s().front() == Approx(15.0 * 60.0));
}

// Source: en1991-1-2-2002 Annex A (A.10), from memory: k applies only while O > 0.04 and q < 75 and
// b < 1160, and is 1 at each of the three limits. 1e-3 K: the step of the input is 1e-6 of it.
TEST_CASE("The factor k enters without a jump at each of its three limits") {
  const double t_s = 600.0;
  CHECK(parametric(0.1, 75.0 - 1e-4, 800)->gas_C(t_s) ==
        Approx(parametric(0.1, 75.0, 800)->gas_C(t_s)).margin(1e-3).epsilon(0));
  CHECK(parametric(0.1, 60, 1160.0 - 1e-3)->gas_C(t_s) ==
        Approx(parametric(0.1, 60, 1160.0)->gas_C(t_s)).margin(1e-3).epsilon(0));
  // Gamma_lim follows q/t_lim, not O: without k the opening would not matter to the heating.
  CHECK(parametric(0.1, 60, 1160)->gas_C(t_s) == parametric(0.2, 60, 1160)->gas_C(t_s));
  CHECK(parametric(0.1, 60, 800)->gas_C(t_s) > parametric(0.2, 60, 800)->gas_C(t_s));
}

// Source: en1991-1-2-2002 Annex A (A.1) note, from memory: for Gamma = 1 the heating approximates
// the standard curve. "Approximates" is read as 25 K between 5 and 120 min.
TEST_CASE("For Gamma 1 the heating stays near the standard curve") {
  const FireCurvePtr curve = in_real_time(400);
  const FireCurvePtr standard = nominal_curve("standard");
  for (double t_s = 300.0; t_s <= 7200.0; t_s += 60.0) {
    INFO(t_s << " s");
    CHECK(curve->gas_C(t_s) == Approx(standard->gas_C(t_s)).margin(25.0).epsilon(0));
  }
}

// Source: en1991-1-2-2002 Annex A, limits from memory: O 0.02 to 0.20 m^0.5, b 100 to 2200
// J/m2s^0.5K, q_t,d 50 to 1000 MJ/m2 of the enclosure surface; the limits themselves are inside.
TEST_CASE("Each limit of the annex that is left is named in a notice") {
  CHECK(parametric(0.02, 50, 2200)->notices().empty());
  CHECK(parametric(0.20, 1000, 100)->notices().empty());
  const struct {
    FireCurvePtr curve;
    const char* words;
  } outside[] = {{parametric(0.019, 200, 1160), "opening factor of 0.019"},
                 {parametric(0.21, 200, 1160), "0.02 to 0.2 m^0.5"},
                 {parametric(0.04, 200, 99), "thermal inertia of 99"},
                 {parametric(0.04, 200, 2201), "100 to 2200"},
                 {parametric(0.04, 49, 1160), "fire load of 49"},
                 {parametric(0.04, 1001, 1160), "50 to 1000"}};
  for (const auto& expected : outside) {
    const Notices notices = expected.curve->notices();
    REQUIRE(notices.size() == 1);
    CHECK(notices.front().code == "parametric-limits");
    CHECK(notices.front().severity == Severity::caution);
    CHECK_THAT(notices.front().text, Catch::Contains(expected.words) && Catch::Contains("annex A"));
  }
  CHECK(parametric(0.3, 1100, 2300)->notices().size() == 3);
}

// Derived here: k = 1 + 4 (-1/3) (1060/1160) = -0.22 for O = 0.2, q = 50, b = 100, all inside the
// annex's limits; a negative Gamma_lim would cool the gas below ambient.
TEST_CASE("Where the annex's factor k falls below zero there is no fire and an error says why") {
  CHECK_THROWS_WITH(parametric(0.2, 50, 100), Catch::Contains("factor k falls to -0.218"));
}

TEST_CASE("A parametric fire without opening, fuel or walls is refused") {
  const double nan = std::nan("");
  for (const double bad : {0.0, -1.0, nan, std::numeric_limits<double>::infinity()}) {
    CHECK_THROWS_AS(parametric(bad, 200, 1160), Error);
    CHECK_THROWS_AS(parametric(0.04, bad, 1160), Error);
    CHECK_THROWS_AS(parametric(0.04, 200, bad), Error);
  }
}

// Source: en1991-1-2-2002 3.3.1, from memory: 35 W/m2K for natural fires. Exact: copied.
TEST_CASE("A parametric fire is no nominal curve and brings 35 W/m2K") {
  CHECK_FALSE(in_real_time(200)->is_nominal());
  CHECK(in_real_time(200)->convection_W_m2K() == 35.0);
  CHECK(in_real_time(200)->name() == "parametric");
}
