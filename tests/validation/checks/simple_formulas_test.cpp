#include "tests/support/simple_formulas.hpp"

#include <catch2/catch.hpp>

#include "tests/validation/simple_rules.hpp"

using namespace ringward::testing;

namespace {

const FireTest& test_named(const std::vector<FireTest>& tests, const std::string& end_of_id) {
  for (const FireTest& test : tests) {
    if (test.id.ends_with(end_of_id)) return test;
  }
  throw std::runtime_error("no fire test " + end_of_id);
}

}  // namespace

// Source: en1992-1-2-2004 eq. (5.7), from memory; the figures below were worked out by hand. That
// the equation returns the classes of Table 5.2a is tested in the mechanical room.
TEST_CASE("The rule for concrete columns gives the figure worked out by hand") {
  // mu 0.5, omega 0.1, alpha_cc 1: R_eta = 83 (1 - 0.55/0.95) = 34.947; R_a = 1.6 (40 - 30) = 16;
  // R_l = 9.6 (5 - 3) = 19.2; R_b = 0.09 300 = 27; sum 97.147; (97.147/120)^1.8 = 0.68367.
  const ConcreteColumnRule rule{
      .mu_fi = 0.5, .omega = 0.1, .axis_mm = 40, .l_0fi_m = 3, .b_mm = 300};
  CHECK(concrete_rule_min(rule) == Approx(82.04).margin(0.02));  // digits of the hand calculation
}

TEST_CASE("More than four bars are worth 12 in the sum of the rule for concrete columns") {
  ConcreteColumnRule rule{.mu_fi = 0.5, .omega = 0.1, .axis_mm = 40, .l_0fi_m = 3, .b_mm = 300};
  rule.over_4_bars = true;  // sum 109.147; (109.147/120)^1.8 = 0.84318
  CHECK(concrete_rule_min(rule) == Approx(101.18).margin(0.02));
}

TEST_CASE("The rule for concrete columns holds its lengths within their range") {
  const ConcreteColumnRule at_ends{
      .mu_fi = 0.3, .omega = 0.5, .axis_mm = 80, .l_0fi_m = 2, .b_mm = 450};
  ConcreteColumnRule beyond = at_ends;
  beyond.axis_mm = 95;
  beyond.l_0fi_m = 1.5;
  beyond.b_mm = 600;
  CHECK(concrete_rule_min(beyond) == concrete_rule_min(at_ends));
}

// Source: lie-stringer1994, from memory; worked out by hand.
TEST_CASE("The rule for filled tubes gives the figure worked out by hand") {
  // 0.07 (30 + 20)/(2500 - 1000) 200^2 sqrt(200/800) = 0.07 0.033333 40000 0.5
  const FilledTubeRule rule{
      .f = 0.07, .strength_MPa = 30, .KL_mm = 2500, .D_mm = 200, .load_kN = 800};
  CHECK(filled_tube_rule_min(rule) == Approx(46.667).margin(0.001));
}

TEST_CASE("A tested concrete column enters its rule as its row says") {
  // I-2, by hand: A_c 0.092903 m2, f_cd 24.6 MPa, bars 2026.8 mm2 at 386.09 MPa = 782.5 kN, omega
  // 0.34239, mu_fi 1333/3067.9 = 0.43450; R_eta 42.40, R_a 49.12, R_l 28.8, R_b 27.43: sum 147.75.
  CHECK(simple_rule_min(test_named(fire_tests(), "I-2")) == Approx(174.51).margin(0.1));
}

TEST_CASE("Tested tubes enter their rule with the factor of their filling") {
  const std::vector<FireTest> tests = fire_tests();
  // By hand: C-11 0.07 (51.0)/1476.5 219.1^2 sqrt(219.1/492).
  CHECK(simple_rule_min(test_named(tests, "C-11")) == Approx(77.46).margin(0.05));
  // SQ-12: square, carbonate, four bars of 16 mm, 2.2 % of the core: f = 0.075.
  CHECK(simple_rule_min(test_named(tests, "SQ-12")) == Approx(89.58).margin(0.1));
}
