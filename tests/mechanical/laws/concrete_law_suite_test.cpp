// One suite of identities over every concrete law.

#include <algorithm>
#include <catch2/catch.hpp>
#include <cmath>

#include "mechanical/materials/material_laws.hpp"
#include "thermal/base/error.hpp"

using namespace ringward;
using namespace ringward::mechanical;
using thermal::Aggregate;

namespace {

struct Case {
  std::string label;
  ConcreteLawPtr law;
};

std::vector<Case> all_laws() {
  std::vector<Case> cases;
  for (const double strength_MPa : {20.0, 40.0, 50.0, 55.0, 75.0, 90.0}) {
    for (const Aggregate aggregate : {Aggregate::siliceous, Aggregate::calcareous}) {
      const ConcreteLawPtr law = concrete_en1992(strength_MPa * 1e6, aggregate, 1.0);
      cases.push_back({law->name() + ", " + std::to_string(strength_MPa) + " MPa", law});
    }
  }
  return cases;
}

HotConcrete heated(const ConcreteLaw& law, double T_C) { return law.at(T_C, T_C); }

constexpr double kTemperatures_C[] = {20.0,  60.0,  100.0, 250.0,  437.0,
                                      500.0, 699.0, 850.0, 1100.0, 1190.0};

}  // namespace

// Source: en1992-1-2-2004 Tables 3.1 and 6.1N: all strength columns fall, all strain columns rise.
// Exact but for rounding, 1e-12.
TEST_CASE("Concrete's strength starts at 1 and never rises with heating") {
  for (const Case& test_case : all_laws()) {
    INFO(test_case.label);
    const double cold_Pa = test_case.law->cold_strength_Pa();
    CHECK(heated(*test_case.law, 20.0).f_c_Pa == Approx(cold_Pa).epsilon(1e-14));
    CHECK(heated(*test_case.law, -10.0).f_c_Pa == Approx(cold_Pa).epsilon(1e-14));
    double largest_rise = 0.0;
    double least = 1.0;
    bool strains_grow = true;
    HotConcrete before = heated(*test_case.law, 20.0);
    for (double T_C = 20.0; T_C <= 1400.0; T_C += 0.5) {
      const HotConcrete hot = heated(*test_case.law, T_C);
      largest_rise = std::max(largest_rise, (hot.f_c_Pa - before.f_c_Pa) / cold_Pa);
      least = std::min(least, hot.f_c_Pa / cold_Pa);
      strains_grow = strains_grow && hot.eps_c1 > before.eps_c1 - 1e-12 &&
                     hot.eps_cu1 > before.eps_cu1 - 1e-12 && hot.eps_cu1 > hot.eps_c1;
      before = hot;
    }
    CHECK(largest_rise < 1e-12);
    CHECK(least >= 0.0);
    CHECK(strains_grow);
  }
}

// Source: en1992-1-2-2004 3.2.2.1: the curve peaks at (eps_c1, f_c), ends at eps_cu1, and concrete
// takes no tension. Exact to rounding.
TEST_CASE("Concrete's stress peaks at its strength, ends at eps_cu1 and is never tension") {
  for (const Case& test_case : all_laws()) {
    for (const double T_C : kTemperatures_C) {
      INFO(test_case.label << " at " << T_C << " C");
      const HotConcrete hot = heated(*test_case.law, T_C);
      CHECK(concrete_stress(hot, hot.eps_c1).stress_Pa == Approx(hot.f_c_Pa));
      CHECK(concrete_stress(hot, hot.eps_cu1).stress_Pa == 0.0);
      CHECK(concrete_stress(hot, hot.eps_cu1 - 1e-12).stress_Pa ==
            Approx(0.0).margin(1e-9 * hot.f_c_Pa));
      CHECK(concrete_stress(hot, 2.0 * hot.eps_cu1).stress_Pa == 0.0);
      double largest = 0.0;
      double least = 0.0;
      for (double eps = -0.01; eps <= 0.06; eps += 1e-4) {
        const double stress_Pa = concrete_stress(hot, eps).stress_Pa;
        largest = std::max(largest, stress_Pa);
        least = std::min(least, stress_Pa);
        if (eps <= -1e-9) least = std::min(least, -std::abs(stress_Pa));
      }
      CHECK(largest <= hot.f_c_Pa * (1.0 + 1e-12));
      CHECK(least == 0.0);
    }
  }
}

// Identity. Central difference over 2e-8: its rounding is 1e-16/1e-8 of the strain's range, its
// truncation h^2 sigma'''/6 below 1e-8; 1e-5 of the starting slope.
TEST_CASE("Concrete's tangent is the slope of its stress, and 3/2 f_c/eps_c1 at the start") {
  constexpr double kStep = 1e-8;
  for (const Case& test_case : all_laws()) {
    for (const double T_C : kTemperatures_C) {
      const HotConcrete hot = heated(*test_case.law, T_C);
      INFO(test_case.label << " at " << T_C << " C");
      const double start_Pa = 1.5 * hot.f_c_Pa / hot.eps_c1;
      CHECK(concrete_stress(hot, 0.0).tangent_Pa == Approx(start_Pa));
      double worst_Pa = 0.0;
      for (double eps = -0.00513; eps < 0.06; eps += 0.000717) {
        const bool at_kink = std::abs(eps) < 1e-6 || std::abs(eps - hot.eps_c1) < 1e-6 ||
                             std::abs(eps - hot.eps_cu1) < 1e-6;
        if (at_kink) continue;
        const double slope_Pa = (concrete_stress(hot, eps + kStep).stress_Pa -
                                 concrete_stress(hot, eps - kStep).stress_Pa) /
                                (2.0 * kStep);
        worst_Pa = std::max(worst_Pa, std::abs(slope_Pa - concrete_stress(hot, eps).tangent_Pa));
      }
      CHECK(worst_Pa < 1e-5 * start_Pa);
    }
  }
}

// Source: en1992-1-2-2004 3.3.1, from memory. The polynomials miss their caps by 9e-6 at 700 C and
// by 1.32e-5 at 805 C, the publication's own rounding; elsewhere the strain never falls.
TEST_CASE("Concrete's thermal strain starts at zero and never falls but at its cap") {
  for (const Case& test_case : all_laws()) {
    INFO(test_case.label);
    const auto strain = [&](double T_C) { return heated(*test_case.law, T_C).thermal_strain; };
    CHECK(strain(20.0) == Approx(0.0).margin(2e-7));
    double deepest_fall = 0.0;
    for (double T_C = 20.0; T_C <= 1300.0; T_C += 0.5) {
      if (T_C == 700.0 || T_C == 805.0) continue;
      deepest_fall = std::min(deepest_fall, strain(T_C + 0.5) - strain(T_C));
    }
    CHECK(deepest_fall == 0.0);
    CHECK(strain(700.5) - strain(700.0) > -1.0e-5);
    CHECK(strain(805.5) - strain(805.0) > -1.4e-5);
  }
}

// Source: en1992-1-2-2004 Table 3.1: strength 0 at 1200 C, strains blank there. Exact.
TEST_CASE("Concrete without strength has no stress and finite strains") {
  for (const Case& test_case : all_laws()) {
    for (const double T_C : {1200.0, 1250.0, 1400.0}) {
      INFO(test_case.label << " at " << T_C << " C");
      const HotConcrete hot = heated(*test_case.law, T_C);
      CHECK(hot.f_c_Pa == 0.0);
      CHECK(hot.eps_c1 == Approx(0.025));
      CHECK(hot.eps_cu1 == Approx(0.0475));
      for (const double eps : {-0.01, 0.0, 0.01, 0.03, 0.1}) {
        CHECK(concrete_stress(hot, eps).stress_Pa == 0.0);
        CHECK(concrete_stress(hot, eps).tangent_Pa == 0.0);
      }
    }
  }
}

// Identity: gamma_M,fi divides the strength (en1992-1-2-2004 2.3(1), from memory). Exact to
// rounding.
TEST_CASE("The material factor divides concrete's strength and leaves its strains and class") {
  const ConcreteLawPtr full = concrete_en1992(60e6, Aggregate::siliceous, 1.0);
  const ConcreteLawPtr reduced = concrete_en1992(60e6, Aggregate::siliceous, 1.3);
  CHECK(reduced->cold_strength_Pa() == Approx(60e6 / 1.3));
  for (const double T_C : kTemperatures_C) {
    CHECK(heated(*reduced, T_C).f_c_Pa == Approx(heated(*full, T_C).f_c_Pa / 1.3));
    CHECK(heated(*reduced, T_C).eps_c1 == heated(*full, T_C).eps_c1);
    CHECK(heated(*reduced, T_C).thermal_strain == heated(*full, T_C).thermal_strain);
  }
}

TEST_CASE("Concrete above 90 MPa, without strength or with a bad factor is refused") {
  CHECK_THROWS_WITH(concrete_en1992(90.1e6, Aggregate::siliceous, 1.0), Catch::Contains("90 MPa"));
  CHECK_THROWS_AS(concrete_en1992(0.0, Aggregate::siliceous, 1.0), Error);
  CHECK_THROWS_AS(concrete_en1992(std::nan(""), Aggregate::siliceous, 1.0), Error);
  CHECK_THROWS_AS(concrete_en1992(40e6, Aggregate::siliceous, 0.0), Error);
}
