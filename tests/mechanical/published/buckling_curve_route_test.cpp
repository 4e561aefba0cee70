// A route by hand through a code, as a check of the order of the member's resistance.

#include <catch2/catch.hpp>
#include <cmath>

#include "mechanical/materials/material_laws.hpp"
#include "mechanical/rating/rating.hpp"
#include "tests/support/columns.hpp"
#include "thermal/base/units.hpp"

using namespace ringward;
using namespace ringward::mechanical;

namespace {

/// Invented: tube 400 x 5, S355, loaded with the core; C40, eight bars d 20 at 155 mm radius.
Column filled_tube(double length_m) {
  Column column = testing::round_column({.moisture_fraction = 0.03, .bars = 8});
  column.section.tube->role = thermal::TubeRole::composite;
  column.member = {
      .length_m = length_m, .buckling_length_m = length_m, .imperfection_m = length_m / 400.0};
  column.load.axial_N = 2e5;
  return column;
}

struct Stiffness {
  double plastic_N = 0;
  double EI_Nm2 = 0;
};

double secant_Pa(const HotConcrete& concrete) { return concrete.f_c_Pa / concrete.eps_c1; }

/// N_fi,pl,R = sum A f and (EI)_fi,eff = sum phi E I with phi = 1, ring by ring.
/// E of the concrete: secant to the peak, f_c,T / eps_c1,T.
Stiffness hot_stiffness(const Column& column, const thermal::TemperatureHistory& history,
                        double t_s) {
  const thermal::Section& section = column.section;
  const ConcreteLawPtr concrete =
      concrete_en1992(section.core.strength_Pa, section.core.aggregate, 1.0);
  const SteelLawPtr tube = structural_steel_en1993(section.tube->yield_Pa, 1.0);
  const SteelLawPtr bar = bars_en1992(500e6, thermal::BarForming::hot_rolled, 1.0);
  const thermal::OrthogonalGrid& grid = history.grid();
  std::vector<double> T_C(grid.cells.size());
  history.temperatures_C(t_s, T_C);
  Stiffness sum;
  for (std::size_t i = 0; i < T_C.size(); ++i) {
    const double r0 = grid.faces_1[i];
    const double r1 = grid.faces_1[i + 1];
    const double area_m2 = units::kPi * (r1 * r1 - r0 * r0);
    const double second_m4 = 0.25 * units::kPi * (std::pow(r1, 4) - std::pow(r0, 4));
    if (grid.cells[i].layer == thermal::Layer::core) {
      const HotConcrete hot = concrete->at(T_C[i], T_C[i]);
      sum.plastic_N += area_m2 * hot.f_c_Pa;
      sum.EI_Nm2 += second_m4 * secant_Pa(hot);
    } else {
      const HotSteel hot = tube->at(T_C[i], T_C[i]);
      sum.plastic_N += area_m2 * hot.f_y_Pa;
      sum.EI_Nm2 += second_m4 * hot.E_Pa;
    }
  }
  for (const thermal::Point& at : section.bars.front().positions) {
    const double bar_C = history.T_C(at, t_s);
    const HotSteel steel = bar->at(bar_C, bar_C);
    const HotConcrete displaced = concrete->at(bar_C, bar_C);
    const double area_m2 = 0.25 * units::kPi * 0.02 * 0.02;
    sum.plastic_N += area_m2 * (steel.f_y_Pa - displaced.f_c_Pa);
    sum.EI_Nm2 += area_m2 * at.x_m * at.x_m * (steel.E_Pa - secant_Pa(displaced));
  }
  return sum;
}

double relative_slenderness(const Stiffness& hot, double length_m) {
  const double critical_N = units::kPi * units::kPi * hot.EI_Nm2 / (length_m * length_m);
  return std::sqrt(hot.plastic_N / critical_N);
}

/// Buckling curve c: alpha = 0.49.
double reduction(double slenderness) {
  if (slenderness <= 0.2) return 1.0;
  const double phi = 0.5 * (1.0 + 0.49 * (slenderness - 0.2) + slenderness * slenderness);
  return 1.0 / (phi + std::sqrt(phi * phi - slenderness * slenderness));
}

}  // namespace

// Source: en1994-1-2-2005 4.3.5.1 (from memory): N_fi,Rd = chi N_fi,pl,Rd, curve c of
// en1993-1-1-2005 6.3.1, lambda = sqrt(N_fi,pl,R / N_fi,cr). The reduction factors phi of the
// stiffness, for thermal stresses, are 1 here because the clause leaves them to sources not at
// hand. 15 %: common practice, no source, for an order check of a buckling curve against a model
// column; the curve's own imperfection is not l/400, and the route knows no thermal strain.
TEST_CASE("Up to middling slenderness the member keeps within 15 % of the buckling curve route") {
  std::size_t slender = 0;
  for (const double length_m : {2.0, 3.0, 4.0}) {
    const Column column = filled_tube(length_m);
    const thermal::TemperatureHistory history =
        thermal::solve_heat_flow(column.section, testing::standard_fire(120), {});
    for (const CapacityState& state : capacities(column, history, {1800, 3600, 5400, 7200})) {
      const Stiffness hot = hot_stiffness(column, history, state.time_s);
      const double slenderness = relative_slenderness(hot, length_m);
      const double ratio = state.capacity_N / (reduction(slenderness) * hot.plastic_N);
      INFO(length_m << " m, " << units::min_from_s(state.time_s) << " min, slenderness "
                    << slenderness << ": " << ratio << " of the route");
      // The same sum over other points of the same field: rounding and bar temperature only.
      CHECK(state.plastic_N == Approx(hot.plastic_N).epsilon(1e-3));
      CHECK(ratio < 1.15);
      // Beyond, stiffness factors of 1 no longer hold: the hot rim, held back by the cool core, is
      // pressed past its peak and lends no stiffness. With thermal strains left out, an
      // independent model column (4 m) rises from 2830 to 3199 kN at 60 min, against 3201 by the
      // route; the model stays below the route, on the safe side.
      if (slenderness <= 0.9) CHECK(ratio > 0.85);
      if (slenderness > 0.9) ++slender;
    }
  }
  CHECK(slender == 2);  // 4 m at 90 and 120 min
}
