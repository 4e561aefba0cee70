// Concrete that has been hotter: EN 1994-1-2 Annex C.

#include <catch2/catch.hpp>

#include "mechanical/materials/material_laws.hpp"

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
  for (const double strength_MPa : {25.0, 50.0, 58.0, 80.0, 90.0}) {
    for (const Aggregate aggregate : {Aggregate::siliceous, Aggregate::calcareous}) {
      const ConcreteLawPtr law = concrete_en1992(strength_MPa * 1e6, aggregate, 1.0);
      cases.push_back({law->name() + ", " + std::to_string(strength_MPa) + " MPa", law});
    }
  }
  return cases;
}

double factor(const ConcreteLaw& law, double T_C, double T_max_C) {
  return law.at(T_C, T_max_C).f_c_Pa / law.cold_strength_Pa();
}

}  // namespace

// Source: en1994-1-2-2005 Annex C, from memory: phi = k_c to 100 C, 1 - 0.235 (T_max - 100)/200 to
// 300 C, 0.9 k_c above; k_c of en1992-1-2-2004 Table 3.1. Values by hand; exact to rounding.
TEST_CASE("Siliceous concrete that is cold again keeps phi of its strength") {
  const ConcreteLawPtr law = concrete_en1992(40e6, Aggregate::siliceous, 1.0);
  const struct {
    double T_max_C;
    double phi;
  } cases[] = {{80.0, 1.0},    {100.0, 1.0},  {200.0, 0.8825}, {260.0, 0.812},
               {300.0, 0.765}, {500.0, 0.54}, {800.0, 0.135},  {1200.0, 0.0}};
  for (const auto& expected : cases) {
    INFO("T_max " << expected.T_max_C << " C");
    CHECK(factor(*law, 20.0, expected.T_max_C) == Approx(expected.phi).margin(1e-12));
    CHECK(factor(*law, 5.0, expected.T_max_C) == Approx(expected.phi).margin(1e-12));
  }
}

// Assumption of the program, stated where the law stands: the straight part of Annex C is fitted to
// siliceous concrete up to 50 MPa, so all others take 0.9 k_c(T_max) from 100 C. Exact to rounding.
TEST_CASE("Calcareous and high-strength concrete keep 0.9 k_c from 100 C on") {
  const ConcreteLawPtr calcareous = concrete_en1992(40e6, Aggregate::calcareous, 1.0);
  CHECK(factor(*calcareous, 20.0, 100.0) == Approx(1.0));
  CHECK(factor(*calcareous, 20.0, 200.0) == Approx(0.9 * 0.97));
  CHECK(factor(*calcareous, 20.0, 600.0) == Approx(0.9 * 0.60));
  const ConcreteLawPtr strong = concrete_en1992(80e6, Aggregate::siliceous, 1.0);
  CHECK(factor(*strong, 20.0, 75.0) == Approx(0.875));
  CHECK(factor(*strong, 20.0, 200.0) == Approx(0.9 * 0.75));
}

// Source: en1994-1-2-2005 Annex C, from memory: linear in T between T_max and 20 C. Exact.
TEST_CASE("Cooling concrete loses strength linearly down to phi") {
  const ConcreteLawPtr law = concrete_en1992(40e6, Aggregate::siliceous, 1.0);
  CHECK(factor(*law, 310.0, 600.0) == Approx(0.5 * (0.45 + 0.9 * 0.45)));
  CHECK(factor(*law, 110.0, 200.0) == Approx(0.5 * (0.95 + 0.8825)));
}

// Identity: without cooling there is no residual. Exact.
TEST_CASE("At its highest temperature concrete follows the hot law exactly") {
  for (const Case& test_case : all_laws()) {
    for (double T_C = 0.0; T_C <= 1300.0; T_C += 7.3) {
      INFO(test_case.label << " at " << T_C << " C");
      const HotConcrete hot = test_case.law->at(T_C, T_C);
      // 1e-9 C below its peak it must be the same state, to the slope of the line times 1e-9.
      const HotConcrete nearly = test_case.law->at(T_C - 1e-9, T_C);
      CHECK(nearly.f_c_Pa == Approx(hot.f_c_Pa).margin(1e-6 * test_case.law->cold_strength_Pa()));
      CHECK(nearly.eps_c1 == hot.eps_c1);
      CHECK(nearly.eps_cu1 == hot.eps_cu1);
    }
  }
}

// Safety: cooling never gives strength back (en1994-1-2-2005 Annex C, from memory). 1e-12:
// rounding.
TEST_CASE("Residual strength is never above k_c(T_max), nor rises in cooling or with T_max") {
  for (const Case& test_case : all_laws()) {
    INFO(test_case.label);
    double above_hot = 0.0;
    double rise_in_cooling = 0.0;
    double rise_with_T_max = 0.0;
    for (double T_max_C = 20.0; T_max_C <= 1250.0; T_max_C += 10.0) {
      for (double T_C = 20.0; T_C < T_max_C; T_C += 10.0) {
        const double k = factor(*test_case.law, T_C, T_max_C);
        above_hot = std::max(above_hot, k - factor(*test_case.law, T_max_C, T_max_C));
        rise_in_cooling =
            std::max(rise_in_cooling, k - factor(*test_case.law, T_C + 10.0, T_max_C));
        rise_with_T_max =
            std::max(rise_with_T_max, factor(*test_case.law, T_C, T_max_C + 10.0) - k);
        if (k < 0.0) above_hot = 1.0;
      }
    }
    CHECK(above_hot < 1e-12);
    CHECK(rise_in_cooling < 1e-12);
    CHECK(rise_with_T_max < 1e-12);
  }
}

// Assumption of the program (safe, stated in the notices): the strains keep the values of T_max,
// the thermal strain follows the temperature now. Exact.
TEST_CASE("Cooled concrete keeps the strains of T_max and shrinks back with its temperature") {
  for (const Case& test_case : all_laws()) {
    for (const double T_max_C : {150.0, 480.0, 900.0}) {
      INFO(test_case.label << ", T_max " << T_max_C << " C");
      const HotConcrete cooled = test_case.law->at(70.0, T_max_C);
      CHECK(cooled.eps_c1 == test_case.law->at(T_max_C, T_max_C).eps_c1);
      CHECK(cooled.eps_cu1 == test_case.law->at(T_max_C, T_max_C).eps_cu1);
      CHECK(cooled.thermal_strain == test_case.law->at(70.0, 70.0).thermal_strain);
    }
  }
}
