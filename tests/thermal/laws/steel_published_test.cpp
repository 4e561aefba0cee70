#include <catch2/catch.hpp>
#include <cmath>

#include "tests/support/published_table.hpp"
#include "thermal/materials/thermal_law.hpp"

using namespace ringward;
using namespace ringward::thermal;
using ringward::testing::PublishedTable;

// Source: en1993-1-2-2005 3.4.1.2, 3.4.1.3, formulas from memory (parts also seen in secondary
// texts), evaluated independently: c_a to 0.01 J/kgK, lambda_a to 0.001 W/mK, half a digit each.
// The density 7850 kg/m3 is 3.2.3.
TEST_CASE("Steel stores and conducts as EN 1993-1-2 at every evaluated temperature") {
  const PublishedTable table("EN1993-1-2_2005_thermal_steel_evaluated.csv");
  const ThermalLawPtr law = steel_law_en1993();
  for (std::size_t row = 0; row < table.size(); ++row) {
    const double T_C = table.number(row, "theta_C");
    INFO(T_C << " C");
    CHECK(law->heat_capacity_J_m3K(T_C) / 7850.0 ==
          Approx(table.number(row, "c_a_J/kgK")).margin(0.00501).epsilon(0));
    CHECK(law->conductivity_W_mK(T_C) ==
          Approx(table.number(row, "lambda_a_W/mK")).margin(0.000501).epsilon(0));
  }
}

// Derived here from en1993-1-2-2005 3.4.1.2: the integrals of the four parts by hand, from 20 C:
// 425 T + 0.773 T^2/2 - 1.69e-3 T^3/3 + 2.22e-6 T^4/4; 666 T - 13002 ln(738 - T);
// 545 T + 17820 ln(T - 731); 650 T. Exact to rounding.
TEST_CASE("Steel heated through its peak stores the hand-made integral of c_a") {
  const auto first = [](double T) {
    return 425.0 * T + 0.773 * T * T / 2.0 - 1.69e-3 * std::pow(T, 3) / 3.0 +
           2.22e-6 * std::pow(T, 4) / 4.0;
  };
  const double to_600 = first(600.0) - first(20.0);
  const double to_735 = to_600 + 666.0 * 135.0 + 13002.0 * std::log(138.0 / 3.0);
  const double to_900 = to_735 + 545.0 * 165.0 + 17820.0 * std::log(169.0 / 4.0);
  const double to_1000 = to_900 + 650.0 * 100.0;
  const ThermalLawPtr law = steel_law_en1993();
  const auto stored = [&law](double T_C) {
    return (law->enthalpy_J_m3(T_C) - law->enthalpy_J_m3(20.0)) / 7850.0;
  };
  CHECK(stored(600.0) == Approx(to_600).epsilon(1e-12));
  CHECK(stored(735.0) == Approx(to_735).epsilon(1e-12));
  CHECK(stored(900.0) == Approx(to_900).epsilon(1e-12));
  CHECK(stored(1000.0) == Approx(to_1000).epsilon(1e-12));
}
