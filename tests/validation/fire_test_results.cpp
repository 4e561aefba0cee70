#include "tests/validation/fire_test_results.hpp"

#include <cmath>

#include "mechanical/rating/rating.hpp"
#include "tests/validation/simple_rules.hpp"
#include "thermal/base/units.hpp"

namespace ringward::testing {
namespace {

constexpr double kHeatedLength_m = 3.048;

void change_strength(FireTest& test, double factor) { test.strength_Pa *= factor; }

std::vector<Variation> all_variations() {
  using thermal::ConductivityLimit;
  return {
      {"as assumed", true, true, [](FireTest&, Assumptions&) {}},
      {"conductivity: upper limit", true, false,
       [](FireTest&, Assumptions& a) { a.conductivity = ConductivityLimit::upper; }},
      {"conductivity: lower limit", false, true,
       [](FireTest&, Assumptions& a) { a.conductivity = ConductivityLimit::lower; }},
      {"moisture 1.5 %", true, true,
       [](FireTest&, Assumptions& a) { a.moisture_fraction = 0.015; }},
      {"moisture 10 %", true, true, [](FireTest&, Assumptions& a) { a.moisture_fraction = 0.1; }},
      {"no contact resistance", false, true,
       [](FireTest&, Assumptions& a) { a.contact_resistance_m2K_W = 0.0; }},
      {"imperfection l0/1000", true, true,
       [](FireTest&, Assumptions& a) { a.length_per_imperfection = 1000; }},
      {"buckling length 0.7 L", true, true,
       [](FireTest& t, Assumptions& a) { a.buckling_length_m = 0.7 * t.length_m; }},
      {"buckling length half the heated length", true, true,
       [](FireTest&, Assumptions& a) { a.buckling_length_m = 0.5 * kHeatedLength_m; }},
      {"no buckling (length 0.3 m)", true, true,
       [](FireTest&, Assumptions& a) { a.buckling_length_m = 0.3; }},
      {"concrete 10 % weaker", true, true,
       [](FireTest& t, Assumptions&) { change_strength(t, 0.9); }},
      {"concrete 10 % stronger", true, true,
       [](FireTest& t, Assumptions&) { change_strength(t, 1.1); }},
      {"load 10 % larger", true, true, [](FireTest& t, Assumptions&) { t.load_N *= 1.1; }},
      {"load 10 % smaller", true, true, [](FireTest& t, Assumptions&) { t.load_N *= 0.9; }},
  };
}

std::vector<double> minutes_up_to(double last_min) {
  std::vector<double> times_s;
  for (double t_min = 1.0; t_min <= last_min; t_min += 1.0) {
    times_s.push_back(units::s_from_min(t_min));
  }
  return times_s;
}

}  // namespace

std::vector<FireTestResult> fire_test_results() {
  std::vector<FireTestResult> results;
  for (const FireTest& test : fire_tests()) {
    FireTestResult result{.test = test,
                          .predicted_min = predicted_min(test, assumptions_for(test))};
    if (test.load_N > 0.0) result.rule_min = simple_rule_min(test);
    results.push_back(result);
  }
  return results;
}

Agreement agreement(const std::vector<double>& ratios) {
  Agreement result{.count = ratios.size()};
  const auto count = static_cast<double>(ratios.size());
  for (const double ratio : ratios) result.mean += ratio / count;
  double squares = 0;
  for (const double ratio : ratios) squares += (ratio - result.mean) * (ratio - result.mean);
  if (ratios.size() > 1) result.variation = std::sqrt(squares / (count - 1.0)) / result.mean;
  return result;
}

const std::vector<Variation>& variations() {
  static const std::vector<Variation> all = all_variations();
  return all;
}

std::vector<double> varied_ratios(FireTestFamily family, const Variation& variation) {
  std::vector<double> ratios;
  for (FireTest test : fire_tests()) {
    if (test.family != family || test.load_N <= 0.0) continue;
    Assumptions assumptions = assumptions_for(test);
    const double measured_min = test.measured_min;
    variation.change(test, assumptions);
    ratios.push_back(predicted_min(test, assumptions).value_or(2.0 * measured_min) / measured_min);
  }
  return ratios;
}

double reserve_min(const FireTest& test) {
  const mechanical::Column column = column_of(test, assumptions_for(test));
  const double last_min = 1.5 * test.measured_min;
  const thermal::TemperatureHistory history =
      solve_heat_flow(column.section, test_fire(last_min), {});
  const std::vector<mechanical::CapacityState> states =
      mechanical::capacities(column, history, minutes_up_to(last_min));
  double above_s = 0;
  for (const mechanical::CapacityState& state : states) {
    if (state.reserve_N >= state.demand_N) above_s = state.time_s;
  }
  return units::min_from_s(above_s);
}

}  // namespace ringward::testing
