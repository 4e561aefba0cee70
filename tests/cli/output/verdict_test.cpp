#include "cli/output/verdict.hpp"

#include <catch2/catch.hpp>
#include <cmath>

#include "cli/output/numbers.hpp"

using namespace ringward;
using namespace ringward::cli;

namespace {

mechanical::Rating fails_at(double resistance_min, double uncertainty_min) {
  mechanical::Rating rating;
  rating.chosen.fire_resistance_s = resistance_min * 60;
  rating.uncertainty_s = uncertainty_min * 60;
  rating.followed_s = 240 * 60;
  return rating;
}

mechanical::Rating survives(double followed_min) {
  mechanical::Rating rating;
  rating.uncertainty_s = 600;
  rating.followed_s = followed_min * 60;
  return rating;
}

}  // namespace

TEST_CASE("Class and requirement count the fire resistance less its uncertainty", "[cli]") {
  CHECK(judge(fails_at(118.4, 0.6), true, 117.8).met == true);
  CHECK(judge(fails_at(118.4, 0.6), true, 117.81).met == false);
  CHECK(judge(fails_at(90.5, 0.5), true, {}).class_min == 90);
  CHECK(judge(fails_at(90.5, 0.52), true, {}).class_min == 60);
}

TEST_CASE("A resistance shorter than its uncertainty counts as none", "[cli]") {
  const Verdict verdict = judge(fails_at(0.2, 0.5), true, 0.1);
  CHECK(verdict.assessed_min == 0);
  CHECK(verdict.class_min == 0);
  CHECK(verdict.met == false);
}

TEST_CASE("A column that survives is judged by the followed time, without the uncertainty",
          "[cli]") {
  const Verdict verdict = judge(survives(120), true, 120.0);
  CHECK(verdict.survives());
  CHECK(verdict.class_min == 120);
  CHECK(verdict.met == true);
  CHECK(judge(survives(119.99), true, {}).class_min == 90);
}

TEST_CASE("Without a class or a requirement there is no word on it", "[cli]") {
  const Verdict verdict = judge(fails_at(118.4, 0.6), false, {});
  CHECK_FALSE(verdict.class_min.has_value());
  CHECK_FALSE(verdict.met.has_value());
}

TEST_CASE("The verdict can be redone from the printed figures", "[cli]") {
  // 120.004 and 0.003 min are printed as 120.00 and 0.01, whose difference is below 120.
  const Verdict verdict = judge(fails_at(120.004, 0.003), true, 120.0);
  CHECK(verdict.fire_resistance_min == Approx(120.00));
  CHECK(verdict.uncertainty_min == Approx(0.01));
  CHECK(verdict.met == false);
  CHECK(verdict.class_min == 90);
}

TEST_CASE("The classes are those of the interface", "[cli]") {
  CHECK(fire_resistance_class(0) == 0);
  CHECK(fire_resistance_class(14.99) == 0);
  for (const int time : {15, 20, 30, 45, 60, 90, 120, 180, 240, 360}) {
    CHECK(fire_resistance_class(time) == time);
    CHECK(fire_resistance_class(time - 0.01) < time);
  }
  CHECK(fire_resistance_class(1000) == 360);
}

TEST_CASE("Times are rounded to the safe side, whole ones stay whole", "[cli]") {
  CHECK(minutes_down(118.409 * 60) == 118.40);
  CHECK(minutes_up(0.601 * 60) == 0.61);
  for (int minute = 0; minute <= 360; ++minute) {
    CHECK(minutes_down(minute * 60.0) == minute);
    CHECK(minutes_up(minute * 60.0) == minute);
  }
}

TEST_CASE("Rounding leaves no negative zero", "[cli]") {
  CHECK_FALSE(std::signbit(rounded(-0.001, 2)));
  CHECK(fixed(-0.001, 2) == "0.00");
}
