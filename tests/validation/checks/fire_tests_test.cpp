#include "tests/validation/fire_tests.hpp"

#include <catch2/catch.hpp>
#include <set>

#include "tests/validation/fire_test_results.hpp"

using namespace ringward;
using namespace ringward::testing;

namespace {

bool belongs_to(const FireTest& test, FireTestFamily family) {
  return test.family == family && test.load_N > 0.0;
}

}  // namespace

// Source: rilem306cfr (CC BY 4.0; size, strength, duration read), loads and details from memory of
// lie-woollerton1988 and lin1992. Band of 30 %: two such columns under the same load in this very
// set, with 4 % apart in strength, lasted 170 and 187 min; moisture, end fixity, cover and load in
// a furnace are known to some 10 % each in their effect, and calculated over measured times of
// column tests are commonly found to scatter with a coefficient of variation of 0.15 (common
// practice, no source): twice that. Nothing was adjusted to the results.
TEST_CASE("Tested siliceous concrete columns are rated within the scatter of fire tests") {
  int rated = 0;
  for (const FireTest& test : fire_tests()) {
    if (!belongs_to(test, FireTestFamily::concrete_siliceous)) continue;
    const std::optional<double> predicted = predicted_min(test, assumptions_for(test));
    INFO(test.id << ", measured " << test.measured_min << " min");
    REQUIRE(predicted.has_value());
    CHECK(*predicted / test.measured_min == Approx(1.0).margin(0.30));
    ++rated;
  }
  CHECK(rated == 10);
}

// The same sources; the columns carried nothing but themselves and did not fail (from memory), so
// that the time at which the fire was put out is a lower bound.
TEST_CASE("Columns that were tested without load and did not fail do not fail in the program") {
  int rated = 0;
  for (const FireTest& test : fire_tests()) {
    if (test.load_N > 0.0) continue;
    INFO(test.id);
    const std::optional<double> predicted = predicted_min(test, assumptions_for(test));
    CHECK(predicted.value_or(2.0 * test.measured_min) >= test.measured_min);
    ++rated;
  }
  CHECK(rated == 2);
}

// Source: lie-chabot1992, all from memory. One-sided, since the program falls short of all of them
// (docs/validation.md says why): a filled tube in the furnace must not be promised more than it
// lasted and the 30 % of scatter from above.
TEST_CASE("Tested filled tubes are not rated above the scatter of fire tests") {
  int rated = 0;
  for (const FireTest& test : fire_tests()) {
    if (!is_tube(test.family)) continue;
    INFO(test.id << ", measured " << test.measured_min << " min");
    const std::optional<double> predicted = predicted_min(test, assumptions_for(test));
    REQUIRE(predicted.has_value());
    CHECK(*predicted / test.measured_min <= 1.30);
    ++rated;
  }
  CHECK(rated == 13);
}

TEST_CASE("Every tested column of a kind is given the same assumptions") {
  std::set<std::vector<double>> concrete;
  std::set<std::vector<double>> tubes;
  for (const FireTest& test : fire_tests()) {
    const Assumptions a = assumptions_for(test);
    (is_tube(test.family) ? tubes : concrete)
        .insert({static_cast<double>(a.conductivity), a.moisture_fraction, a.buckling_length_m,
                 a.length_per_imperfection, a.contact_resistance_m2K_W});
  }
  CHECK(concrete.size() == 1);
  CHECK(tubes.size() == 1);
}

TEST_CASE("Mean and coefficient of variation are those worked out by hand") {
  // 0.8, 1.0, 1.2: mean 1, squares 0.04 + 0 + 0.04 over 2 = 0.04.
  const Agreement a = agreement({0.8, 1.0, 1.2});
  CHECK(a.count == 3);
  CHECK(a.mean == Approx(1.0));
  CHECK(a.variation == Approx(0.2));
}
