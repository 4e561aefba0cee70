#include <catch2/catch.hpp>

#include "mechanical/materials/material_laws.hpp"
#include "tests/support/published_table.hpp"

using namespace ringward;
using namespace ringward::mechanical;
using ringward::testing::PublishedTable;
using thermal::BarForming;

namespace {

struct Columns {
  std::string k_y;
  std::string k_p;
  std::string k_E;
};

PiecewiseLinear column_of(const PublishedTable& table, const std::string& column) {
  std::vector<PiecewiseLinear::Point> points;
  for (std::size_t row = 0; row < table.size(); ++row) {
    points.push_back({table.number(row, "theta_C"), table.number(row, column)});
  }
  return PiecewiseLinear(points);
}

/// Compares the three factors with the table at its rows and linearly between them.
void check_factors(const SteelLaw& law, const PublishedTable& table, const Columns& columns) {
  const PiecewiseLinear k_y = column_of(table, columns.k_y);
  const PiecewiseLinear k_p = column_of(table, columns.k_p);
  const PiecewiseLinear k_E = column_of(table, columns.k_E);
  const HotSteel cold = law.at(20.0, 20.0);
  double worst = 0.0;
  for (double T_C = 20.0; T_C <= 1200.0; T_C += 1.0) {
    const HotSteel hot = law.at(T_C, T_C);
    worst = std::max({worst, std::abs(hot.f_y_Pa / cold.f_y_Pa - k_y.value(T_C)),
                      std::abs(hot.f_p_Pa / cold.f_y_Pa - k_p.value(T_C)),
                      std::abs(hot.E_Pa / cold.E_Pa - k_E.value(T_C))});
  }
  INFO(law.name());
  CHECK(worst < 1e-12);
}

}  // namespace

// Source: en1992-1-2-2004 Table 3.2a, from memory with high confidence; E_20 = 200 GPa:
// en1992-1-1-2004 3.2.7(4), from memory. 1e-12: rounding, the law is the table.
TEST_CASE("Bars have the factors of Table 3.2a, class N") {
  const PublishedTable table("EN1992-1-2_2004_T3.2a_rebar_classN.csv");
  const SteelLawPtr hot_rolled = bars_en1992(500e6, BarForming::hot_rolled, 1.0);
  const SteelLawPtr cold_worked = bars_en1992(500e6, BarForming::cold_worked, 1.0);
  check_factors(*hot_rolled, table,
                {"fsy/fyk_hot_rolled", "fsp/fyk_hot_rolled", "Es/Es20_hot_rolled"});
  check_factors(*cold_worked, table,
                {"fsy/fyk_cold_worked", "fsp/fyk_cold_worked", "Es/Es20_cold_worked"});
  for (const SteelLawPtr& law : {hot_rolled, cold_worked}) {
    CHECK(law->at(20.0, 20.0).f_y_Pa == Approx(500e6));
    CHECK(law->at(20.0, 20.0).E_Pa == Approx(200e9));
  }
}

// Source: en1993-1-2-2005 Table 3.1, from memory with high confidence; E_20 = 210 GPa: 3.2.1, from
// memory. 1e-12: rounding, the law is the table.
TEST_CASE("Structural steel has the factors of EN 1993-1-2 Table 3.1") {
  const SteelLawPtr law = structural_steel_en1993(355e6, 1.0);
  check_factors(*law, PublishedTable("EN1993-1-2_2005_T3.1_steel.csv"), {"k_y", "k_p", "k_E"});
  CHECK(law->at(20.0, 20.0).f_y_Pa == Approx(355e6));
  CHECK(law->at(20.0, 20.0).E_Pa == Approx(210e9));
}

// Source: en1993-1-2-2005 3.4.1.1 and en1992-1-2-2004 3.4, formulas from memory, evaluated
// independently to 1e-7: half a digit.
TEST_CASE("The thermal strain of steel and bars meets its evaluated points") {
  const PublishedTable table("EN1993-1-2_2005_thermal_steel_evaluated.csv");
  const SteelLawPtr laws[] = {structural_steel_en1993(355e6, 1.0),
                              bars_en1992(500e6, BarForming::hot_rolled, 1.0),
                              bars_en1992(500e6, BarForming::cold_worked, 1.0)};
  for (std::size_t row = 0; row < table.size(); ++row) {
    const double T_C = table.number(row, "theta_C");
    for (const SteelLawPtr& law : laws) {
      INFO(law->name() << " at " << T_C << " C");
      CHECK(law->at(T_C, T_C).thermal_strain ==
            Approx(table.number(row, "dl/l")).margin(0.501e-7).epsilon(0));
    }
  }
}

// Source: din-en1991-1-2-na annex CC example 4, elongation of 100 mm; temperatures and steel values
// from memory, evaluated independently to 1e-5 mm: half a digit.
TEST_CASE("Steel grows as annex CC example 4 says") {
  const PublishedTable table("DIN_NA_CC_ex4_elongation.csv");
  const SteelLawPtr law = structural_steel_en1993(355e6, 1.0);
  for (std::size_t row = 0; row < table.size(); ++row) {
    const double T_C = table.number(row, "theta_C");
    INFO(T_C << " C");
    CHECK(100.0 * law->at(T_C, T_C).thermal_strain ==
          Approx(table.number(row, "dl_steel_mm")).margin(0.51e-5).epsilon(0));
  }
}
