#include <catch2/catch.hpp>
#include <cmath>

#include "thermal/base/error.hpp"
#include "thermal/materials/thermal_law.hpp"

using namespace ringward;
using namespace ringward::thermal;

namespace {

Protection board() {
  Protection protection;
  protection.thickness_m = 0.025;
  protection.conductivity_W_mK = PiecewiseLinear({{20.0, 0.2}, {800.0, 0.35}});
  protection.density_kg_m3 = 800.0;
  protection.specific_heat_J_kgK = PiecewiseLinear({{20.0, 900.0}, {500.0, 1100.0}});
  return protection;
}

}  // namespace

// Latent heat 2257 kJ/kg at 100 C, spread over 100 to 115 C: common practice, no source. Exact to
// rounding of a difference of two enthalpies.
TEST_CASE("Moist protection takes the latent heat of its water once, between 100 and 115 C") {
  Protection moist = board();
  moist.moisture_fraction = 0.05;
  const ThermalLawPtr wet = protection_law(moist);
  const ThermalLawPtr dry = protection_law(board());
  const double latent_J_m3 = 800.0 * 0.05 * 2257e3;
  for (const double T_C : {-10.0, 20.0, 99.0, 100.0}) {
    CHECK(wet->enthalpy_J_m3(T_C) == Approx(dry->enthalpy_J_m3(T_C)).margin(1e-6));
  }
  CHECK(wet->enthalpy_J_m3(107.5) - dry->enthalpy_J_m3(107.5) == Approx(0.5 * latent_J_m3));
  for (const double T_C : {115.0, 300.0, 1300.0}) {
    CHECK(wet->enthalpy_J_m3(T_C) - dry->enthalpy_J_m3(T_C) == Approx(latent_J_m3));
    CHECK(wet->heat_capacity_J_m3K(T_C) == dry->heat_capacity_J_m3K(T_C));
  }
  CHECK(wet->heat_capacity_J_m3K(110.0) - dry->heat_capacity_J_m3K(110.0) ==
        Approx(latent_J_m3 / 15.0));
  for (const double T_C : {50.0, 107.5, 300.0}) {
    CHECK(wet->dried_heat_capacity_J_m3K(T_C) == dry->heat_capacity_J_m3K(T_C));
    CHECK(wet->dried_enthalpy_J_m3(T_C) == Approx(dry->enthalpy_J_m3(T_C)));
  }
}

TEST_CASE("Protection tells the range of its tables and every kink in them") {
  Protection moist = board();
  moist.moisture_fraction = 0.01;
  CHECK(protection_law(moist)->kinks_C() == std::vector<double>{20.0, 100.0, 115.0, 500.0, 800.0});
  CHECK(protection_law(board())->kinks_C() == std::vector<double>{20.0, 500.0, 800.0});
  CHECK(protection_law(board())->valid_from_C() == 20.0);
  CHECK(protection_law(board())->valid_to_C() == 500.0);
}

TEST_CASE("A material of constants has no kinks and no limits") {
  const ThermalLawPtr law = table_law("brass", PiecewiseLinear(120.0), PiecewiseLinear(3.2e6));
  CHECK(law->name() == "brass");
  CHECK(law->kinks_C().empty());
  CHECK(law->valid_from_C() < -273.15);
  CHECK(law->valid_to_C() > 1e6);
  CHECK(law->conductivity_W_mK(700.0) == 120.0);
  CHECK(law->enthalpy_J_m3(50.0) == Approx(1.6e8));
}

TEST_CASE("Protection and tables with a value of zero or below are refused") {
  Protection no_conduction = board();
  no_conduction.conductivity_W_mK = PiecewiseLinear(0.0);
  CHECK_THROWS_AS(protection_law(no_conduction), Error);
  Protection no_heat = board();
  no_heat.specific_heat_J_kgK = PiecewiseLinear({{20.0, 900.0}, {500.0, -1.0}});
  CHECK_THROWS_AS(protection_law(no_heat), Error);
  Protection no_weight = board();
  no_weight.density_kg_m3 = 0.0;
  CHECK_THROWS_AS(protection_law(no_weight), Error);
  Protection below_dry = board();
  below_dry.moisture_fraction = -0.01;
  CHECK_THROWS_AS(protection_law(below_dry), Error);
  CHECK_THROWS_AS(table_law("x", PiecewiseLinear(1.0), PiecewiseLinear(0.0)), Error);
  CHECK_THROWS_AS(table_law("x", PiecewiseLinear(-1.0), PiecewiseLinear(1.0)), Error);
}
