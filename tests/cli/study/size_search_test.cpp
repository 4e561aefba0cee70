#include "cli/study/size_search.hpp"

#include <catch2/catch.hpp>
#include <cmath>
#include <functional>
#include <map>
#include <random>

#include "cli/study/sized_column.hpp"

using namespace ringward::cli;

namespace {

constexpr double kRequired_min = 60;
constexpr double kFollowed_min = 90;
constexpr double kUncertainty_min = 0.1;

/// A rating whose fire resistance is given; it survives where that is longer than is followed.
LayoutRow rated(double fire_resistance_min) {
  Verdict verdict;
  verdict.uncertainty_min = kUncertainty_min;
  verdict.required_min = kRequired_min;
  verdict.assessed_min = kFollowed_min;
  if (fire_resistance_min < kFollowed_min) {
    verdict.fire_resistance_min = fire_resistance_min;
    verdict.assessed_min = std::max(0.0, fire_resistance_min - kUncertainty_min);
  }
  verdict.met = verdict.assessed_min >= kRequired_min;
  LayoutRow row;
  row.verdict = verdict;
  return row;
}

SizeResult found(const SizeBracket& bracket, const std::function<double(double)>& resistance_min,
                 std::map<double, int>* calls = nullptr) {
  return find_size(bracket, [&](double value) {
    if (calls != nullptr) ++(*calls)[value];
    return rated(resistance_min(value));
  });
}

}  // namespace

TEST_CASE(
    "The smallest multiple of the step that meets the rating is found in at most 15 ratings, "
    "each value rated once",
    "[study]") {
  std::mt19937 random(3);
  std::uniform_real_distribution<double> share(0.02, 0.98);
  std::uniform_real_distribution<double> power(0.2, 4.0);
  std::size_t most = 0;
  for (int round = 0; round < 400; ++round) {
    const double crossing = 60 * share(random);
    const double bend = power(random);
    const auto resistance = [&](double value) {
      return (kRequired_min + kUncertainty_min) * std::pow(value / crossing, bend);
    };
    const SizeBracket bracket{0, 60, 1};
    std::map<double, int> calls;
    const SizeResult result = found(bracket, resistance, &calls);
    REQUIRE(result.chosen);
    const double value = result.trials[*result.chosen].value;
    INFO("crossing at " << crossing << ", power " << bend);
    CHECK(value == std::ceil(crossing));
    CHECK(result.is_narrowed);
    CHECK(result.contradictions.empty());
    CHECK(result.response == Response::rises);
    for (const auto& [tried, count] : calls) CHECK(count == 1);
    CHECK(calls.size() == result.trials.size());
    most = std::max(most, calls.size());
  }
  CHECK(most <= kMostRatings);
}

TEST_CASE("Where the rating falls with the value the largest one comes out", "[study]") {
  const SizeResult result =
      found({500, 4500, 10}, [](double load) { return 60.1 * 2003.0 / load; });
  REQUIRE(result.chosen);
  CHECK(result.response == Response::falls);
  CHECK(result.trials[*result.chosen].value == 2000);
  CHECK(result.trials[*result.next].value == 2010);
}

TEST_CASE("A step that is no whole number gives values that read as they were meant", "[study]") {
  const SizeResult result = found({0, 2, 0.1}, [](double value) { return 60.1 + value - 0.25; });
  CHECK(result.trials[*result.chosen].value == 0.3);
  const SizeResult odd_ends =
      found({0.55, 3.35, 0.5}, [](double value) { return 60.1 + 10 * (value - 3.2); });
  CHECK(odd_ends.trials[*odd_ends.chosen].value == 3.35);
  CHECK(odd_ends.trials[*odd_ends.next].value == 3.0);
}

TEST_CASE("An end that works is taken when all of the bracket works", "[study]") {
  const SizeResult rising = found({10, 20, 1}, [](double value) { return 70 + value; });
  CHECK(rising.trials[*rising.chosen].value == 10);
  CHECK_FALSE(rising.next);
  CHECK(rising.trials.size() == 2);
  const SizeResult falling = found({10, 20, 1}, [](double value) { return 100 - value; });
  CHECK(falling.trials[*falling.chosen].value == 20);
  const SizeResult flat = found({10, 20, 1}, [](double) { return 200.0; });
  CHECK(flat.response == Response::flat);
  CHECK(flat.trials[*flat.chosen].value == 10);
}

TEST_CASE("When nothing works the better end says by how much it misses", "[study]") {
  const SizeResult result = found({10, 20, 1}, [](double value) { return 30 + value; });
  CHECK_FALSE(result.chosen);
  CHECK(result.trials.size() == 2);
  CHECK(result.misses_by_min() == Approx(60 - (50 - kUncertainty_min)).epsilon(1e-12));
}

TEST_CASE(
    "A rating against a response that only rises is reported, and what comes out lies beyond "
    "every one that misses",
    "[study]") {
  // A dip below what is required between 40 and 50.
  const auto dips = [](double value) { return value > 40 && value < 50 ? 55 : 30 + value; };
  const SizeResult result = found({0, 60, 1}, dips);
  REQUIRE(result.chosen);
  const double value = result.trials[*result.chosen].value;
  for (const SizeTrial& trial : result.trials) {
    if (trial.value >= value) CHECK(trial.met());
  }
  // A step down far from the crossing is seen when it is met.
  const auto falls_late = [](double x) { return x < 5 ? 10 + x : x < 31 ? 62 + x / 10 : 60.2; };
  const SizeResult late = found({0, 60, 1}, falls_late);
  REQUIRE(late.chosen);
  CHECK(late.contradictions.size() == 1);
}

TEST_CASE("A column that survives counts as longer than what was followed", "[study]") {
  const SizeResult result = found({0, 60, 1}, [](double value) { return value < 20 ? 50 : 1000; });
  CHECK(result.trials[*result.chosen].value == 20);
  CHECK(result.contradictions.empty());
}

TEST_CASE("A miss that rounds to zero is a miss all the same", "[study]") {
  const SizeResult result =
      found({0, 60, 1}, [](double value) { return value < 30 ? 60.0999 : 60.2; });
  REQUIRE(result.chosen);
  CHECK(result.trials[*result.chosen].value == 30);
  CHECK(result.trials[*result.next].value == 29);
}

TEST_CASE("With a step too fine for 15 ratings the safe side of what was rated comes out",
          "[study]") {
  const SizeResult result =
      found({0, 1, 1e-9}, [](double value) { return value < 0.123456789 ? 59.0 : 61.0; });
  REQUIRE(result.chosen);
  CHECK_FALSE(result.is_narrowed);
  CHECK(result.trials.size() == kMostRatings);
  CHECK(result.trials[*result.chosen].met());
  CHECK(result.trials[*result.chosen].value >= 0.123456789);
}

TEST_CASE("The step is a power of ten, at most a fiftieth of the bracket, and whole for counts",
          "[study]") {
  CHECK(default_step(varied_key("protection.thickness_mm"), 0, 60) == 1);
  CHECK(default_step(varied_key("load.axial_kN"), 500, 4500) == 10);
  CHECK(default_step(varied_key("tube.friction"), 0.1, 0.8) == 0.01);
  CHECK(default_step(varied_key("bars[0].count"), 4, 12) == 1);
}
