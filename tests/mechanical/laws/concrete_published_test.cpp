#include <catch2/catch.hpp>

#include "mechanical/materials/material_laws.hpp"
#include "tests/support/published_table.hpp"

using namespace ringward;
using namespace ringward::mechanical;
using ringward::testing::PublishedTable;
using thermal::Aggregate;

namespace {

constexpr double kStrength_Pa = 40e6;

double strength_factor(const ConcreteLaw& law, double T_C) {
  return law.at(T_C, T_C).f_c_Pa / law.cold_strength_Pa();
}

double thermal_strain(Aggregate aggregate, double T_C) {
  return concrete_en1992(kStrength_Pa, aggregate, 1.0)->at(T_C, T_C).thermal_strain;
}

/// The published column with its blanks on the line between the neighbours.
PiecewiseLinear filled_column(const PublishedTable& table, const std::string& column) {
  std::vector<PiecewiseLinear::Point> points;
  for (std::size_t row = 0; row < table.size(); ++row) {
    if (table.is_blank(row, column)) continue;
    points.push_back({table.number(row, "theta_C"), table.number(row, column)});
  }
  return PiecewiseLinear(points);
}

/// Largest difference of the law's strength factor from a table, every degree from 20 to 1200 C.
double worst_difference(const ConcreteLaw& law, const PiecewiseLinear& table) {
  double worst = 0.0;
  for (double T_C = 20.0; T_C <= 1200.0; T_C += 1.0) {
    worst = std::max(worst, std::abs(strength_factor(law, T_C) - table.value(T_C)));
  }
  return worst;
}

}  // namespace

// Source: en1992-1-2-2004 Table 3.1, from memory (strengths checked against a secondary listing).
// Exact to rounding: the law is the table.
TEST_CASE("Concrete up to 50 MPa has the strength and strains of Table 3.1") {
  const PublishedTable table("EN1992-1-2_2004_T3.1_concrete.csv");
  const ConcreteLawPtr siliceous = concrete_en1992(kStrength_Pa, Aggregate::siliceous, 1.0);
  const ConcreteLawPtr calcareous = concrete_en1992(50e6, Aggregate::calcareous, 1.0);
  for (std::size_t row = 0; row < table.size(); ++row) {
    const double T_C = table.number(row, "theta_C");
    INFO(T_C << " C");
    CHECK(strength_factor(*siliceous, T_C) ==
          Approx(table.number(row, "fc_theta/fck_siliceous")).margin(1e-12));
    CHECK(strength_factor(*calcareous, T_C) ==
          Approx(table.number(row, "fc_theta/fck_calcareous")).margin(1e-12));
    if (table.is_blank(row, "eps_c1_theta")) continue;
    for (const ConcreteLawPtr& law : {siliceous, calcareous}) {
      CHECK(law->at(T_C, T_C).eps_c1 == Approx(table.number(row, "eps_c1_theta")));
      CHECK(law->at(T_C, T_C).eps_cu1 == Approx(table.number(row, "eps_cu1_theta")));
    }
  }
}

// Source: en1992-1-2-2004 3.2.2(2), linear interpolation, from memory. 1e-12: rounding.
TEST_CASE("Concrete is linear between the rows of Table 3.1") {
  const PublishedTable table("EN1992-1-2_2004_T3.1_concrete.csv");
  const ConcreteLawPtr siliceous = concrete_en1992(kStrength_Pa, Aggregate::siliceous, 1.0);
  const ConcreteLawPtr calcareous = concrete_en1992(kStrength_Pa, Aggregate::calcareous, 1.0);
  CHECK(worst_difference(*siliceous, filled_column(table, "fc_theta/fck_siliceous")) < 1e-12);
  CHECK(worst_difference(*calcareous, filled_column(table, "fc_theta/fck_calcareous")) < 1e-12);
  const PiecewiseLinear eps_c1 = filled_column(table, "eps_c1_theta");
  const PiecewiseLinear eps_cu1 = filled_column(table, "eps_cu1_theta");
  double worst = 0.0;
  for (double T_C = 20.0; T_C <= 1200.0; T_C += 1.0) {
    const HotConcrete hot = siliceous->at(T_C, T_C);
    worst = std::max({worst, std::abs(hot.eps_c1 - eps_c1.value(T_C)),
                      std::abs(hot.eps_cu1 - eps_cu1.value(T_C))});
  }
  CHECK(worst < 1e-12);
}

// Source: en1992-1-2-2004 Table 6.1N, from memory with medium confidence; blanks are interpolated
// as the table's head says; classes by 6.1(5): 1 for C55 and C60, 2 for C70 and C80, 3 for C90.
// 1e-12: rounding.
TEST_CASE("Concrete above 50 MPa has the strength of its class in Table 6.1N") {
  const PublishedTable table("EN1992-1-2_2004_T6.1N_HSC.csv");
  const struct {
    double strength_Pa;
    const char* column;
  } classes[] = {{50.1e6, "Class1"}, {55e6, "Class1"}, {60e6, "Class1"},   {60.1e6, "Class2"},
                 {70e6, "Class2"},   {80e6, "Class2"}, {80.1e6, "Class3"}, {90e6, "Class3"}};
  for (const auto& expected : classes) {
    INFO(expected.strength_Pa << " Pa");
    const PiecewiseLinear column = filled_column(table, expected.column);
    for (const Aggregate aggregate : {Aggregate::siliceous, Aggregate::calcareous}) {
      const ConcreteLawPtr law = concrete_en1992(expected.strength_Pa, aggregate, 1.0);
      CHECK(worst_difference(*law, column) < 1e-12);
      CHECK(law->at(500.0, 500.0).eps_c1 == Approx(0.015));
      CHECK(law->at(500.0, 500.0).eps_cu1 == Approx(0.0325));
    }
  }
}

// Source: en1992-1-2-2004 3.3.1, formulas from memory, evaluated independently to 1e-7: half a
// digit.
TEST_CASE("The thermal strain of concrete meets its evaluated points") {
  const PublishedTable table("EN1992-1-2_2004_thermal_concrete_evaluated.csv");
  for (std::size_t row = 0; row < table.size(); ++row) {
    const double T_C = table.number(row, "theta_C");
    INFO(T_C << " C");
    CHECK(thermal_strain(Aggregate::siliceous, T_C) ==
          Approx(table.number(row, "dl/l_siliceous")).margin(0.501e-7).epsilon(0));
    CHECK(thermal_strain(Aggregate::calcareous, T_C) ==
          Approx(table.number(row, "dl/l_calcareous")).margin(0.501e-7).epsilon(0));
  }
}

// Source: din-en1991-1-2-na annex CC example 4, elongation of 100 mm, temperatures from memory,
// values evaluated independently to 1e-5 mm. At 700 C the law to the letter still takes the
// polynomial, 1.4009 mm, where the example gives the plateau, 1.4000 mm: 0.001 mm is allowed there.
TEST_CASE("Concrete grows as annex CC example 4 says") {
  const PublishedTable table("DIN_NA_CC_ex4_elongation.csv");
  constexpr double kLength_mm = 100.0;
  for (std::size_t row = 0; row < table.size(); ++row) {
    const double T_C = table.number(row, "theta_C");
    const double tolerance_mm = T_C == 700.0 ? 1e-3 : 0.51e-5;
    INFO(T_C << " C");
    CHECK(kLength_mm * thermal_strain(Aggregate::siliceous, T_C) ==
          Approx(table.number(row, "dl_concrete_siliceous_mm")).margin(tolerance_mm).epsilon(0));
    CHECK(kLength_mm * thermal_strain(Aggregate::calcareous, T_C) ==
          Approx(table.number(row, "dl_concrete_calcareous_mm")).margin(0.51e-5).epsilon(0));
  }
}
