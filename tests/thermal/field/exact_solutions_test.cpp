#include <catch2/catch.hpp>

#include "tests/support/published_table.hpp"
#include "tests/thermal/field/problems.hpp"
#include "thermal/temperature_history.hpp"

using namespace ringward;
using namespace ringward::testing;

namespace {

constexpr double kHot_C = 1000.0;

/// A unit cylinder, lambda = rho c = 1, losing heat with alpha = 1 to 0 C: Bi = 1, Fo = t.
TemperatureHistory cooling_cylinder(std::size_t cells) {
  HeatProblem problem;
  problem.grid =
      polar_grid(evenly(0, 1, cells), {0.0, 2.0 * units::kPi}, Symmetry::axisymmetric, all_core);
  problem.core = constant_law(1, 1);
  problem.conditions = {convection(1, 0)};
  set_side(problem, Side::high_1, 0);
  problem.initial_C = kHot_C;
  HeatRun run = exact_run(1.6, 1e-4, 1);
  run.kept_s = evenly(0, 1.6, 160);
  return solve_heat_problem(std::move(problem), run);
}

/// A plate lambda = 1, rho c = 1000, 1 m thick; insulated at x = 0, alpha = 1 to 0 C at x = 1.
TemperatureHistory cooling_plate(std::size_t cells) {
  HeatProblem problem;
  problem.grid = cartesian_grid(evenly(0, 1, cells), {0, 1}, all_core);
  problem.core = constant_law(1, 1000);
  problem.conditions = {convection(1, 0)};
  set_side(problem, Side::high_1, 0);
  problem.initial_C = kHot_C;
  return solve_heat_problem(std::move(problem), exact_run(1800, 1e-4, 1000));
}

}  // namespace

// Source: Bessel series of the cylinder, computed; five digits of 1000 K are 0.005 K. Tolerance
// 0.1 K: 40 cells leave (1/40)^2/8 of the second derivative, about 0.05 K.
TEST_CASE("A cooling cylinder follows the Bessel series at its centre and its surface") {
  const TemperatureHistory history = cooling_cylinder(40);
  struct Row {
    double fourier, centre, surface;
  };
  // generic_heat_benchmarks.csv, rows "cylinder Bi=1"
  for (const Row& row :
       {Row{0.1, 0.97682, 0.68456}, Row{0.2, 0.87017, 0.57023}, Row{0.4, 0.64200, 0.41316},
        Row{0.8, 0.34185, 0.21979}, Row{1.6, 0.09681, 0.06225}}) {
    INFO("Fo = " << row.fourier);
    CHECK(history.core_centre_C(row.fourier) == Approx(kHot_C * row.centre).margin(0.1).epsilon(0));
    CHECK(history.core_face_C(row.fourier) == Approx(kHot_C * row.surface).margin(0.1).epsilon(0));
  }
  CHECK(history.statistics().energy_balance_error < 1e-4);
}

// Source: din-en1991-1-2-na annex CC example 1 (reference from memory, printed to 0.1 K) and its
// series solution (computed to 0.01 K). Tolerance 0.1 K to the series with 40 cells; to the
// printed row 0.15 K, its rounding more.
TEST_CASE("Annex CC example 1: a cooling plate follows its series and the printed row") {
  const PublishedTable table("DIN_NA_CC_ex1_cooling.csv");
  const TemperatureHistory history = cooling_plate(40);
  for (std::size_t row = 0; row < table.size(); ++row) {
    const double t_s = table.number(row, "t_s");
    INFO(t_s << " s");
    const double T_C = history.T_C({0.0, 0.5}, t_s);
    CHECK(T_C == Approx(table.number(row, "analytic_C")).margin(0.1).epsilon(0));
    CHECK(T_C == Approx(table.number(row, "reference_C")).margin(0.15).epsilon(0));
  }
}

// Source: nafems T3, from memory: 36.60 C at x = 0.08 m, t = 32 s, confirmed by an independent
// computation, 36.601. Tolerance 0.01 K: the printed digits.
TEST_CASE("NAFEMS T3: a bar with an oscillating end temperature") {
  const double capacity = 440.5 * 7200.0;
  HeatProblem problem;
  problem.grid = cartesian_grid(evenly(0, 0.1, 80), {0, 1}, all_core);
  problem.core = constant_law(35, capacity);
  problem.conditions = {prescribed([](double) { return 0.0; }), prescribed([](double t_s) {
                          return 100.0 * std::sin(units::kPi * t_s / 40.0);
                        })};
  set_side(problem, Side::low_1, 0);
  set_side(problem, Side::high_1, 1);
  problem.initial_C = 0;
  const TemperatureHistory history =
      solve_heat_problem(std::move(problem), exact_run(32, 1e-4, capacity));
  CHECK(history.T_C({0.08, 0.5}, 32) == Approx(36.60).margin(0.01).epsilon(0));
}

// Source: nafems T4, from memory: 18.25 C at (0.6, 0.2) m, confirmed by an independent
// computation, 18.254. Tolerance 0.1 K: the end of the 100 C edge is singular beside the point.
TEST_CASE("NAFEMS T4: a plate that loses heat at two edges in the steady state") {
  HeatProblem problem;
  problem.grid = cartesian_grid(evenly(0, 0.6, 48), evenly(0, 1, 80), all_core);
  problem.core = constant_law(52, 1e6);
  problem.conditions = {prescribed([](double) { return 100.0; }), convection(750, 0)};
  set_side(problem, Side::low_2, 0);
  set_side(problem, Side::high_1, 1);
  set_side(problem, Side::high_2, 1);
  problem.initial_C = 0;
  // L^2 / a = 2e4 s: after ten of them nothing changes any more.
  const TemperatureHistory history =
      solve_heat_problem(std::move(problem), exact_run(2e5, 1e-3, 1e6));
  CHECK(history.T_C({0.6, 0.2}, 2e5) == Approx(18.25).margin(0.1).epsilon(0));
}
