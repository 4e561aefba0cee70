#include <catch2/catch.hpp>
#include <limits>

#include "tests/thermal/field/problems.hpp"
#include "thermal/base/error.hpp"
#include "thermal/temperature_history.hpp"

using namespace ringward;
using namespace ringward::testing;

namespace {

std::string message_of(std::function<double(double)> gas_C) {
  FireExposure fire = standard_fire(60);
  fire.gas.T_C = std::move(gas_C);
  try {
    static_cast<void>(solve_heat_flow(tubed(Shape::circular, 0.2, 0.005), fire, {}));
  } catch (const Error& error) {
    CHECK(error.kind() == ErrorKind::solver_breakdown);
    return error.what();
  }
  return "no error";
}

}  // namespace

TEST_CASE("A gas that stops being a number breaks the solver down, with time and place") {
  const std::string message = message_of(
      [](double t_s) { return t_s < 600 ? 500.0 : std::numeric_limits<double>::quiet_NaN(); });
  CHECK(message.find("no solution after") != std::string::npos);
  CHECK(message.find("min") != std::string::npos);
  CHECK(message.find("x = ") != std::string::npos);
}

TEST_CASE("What the fire throws during a step comes out of the solver with the time") {
  const std::string message = message_of([](double t_s) -> double {
    if (t_s > 600) throw Error(ErrorKind::solver_breakdown, "the fire went out");
    return 500.0;
  });
  CHECK(message.find("heat flow at ") == 0);
  CHECK(message.find("the fire went out") != std::string::npos);
}

TEST_CASE("A law whose enthalpy does not rise is refused") {
  class Falling final : public ThermalLaw {
   public:
    std::string name() const override { return "falling"; }
    double conductivity_W_mK(double) const override { return 1; }
    double heat_capacity_J_m3K(double T_C) const override { return T_C < 500 ? 1e6 : -1e6; }
    double enthalpy_J_m3(double T_C) const override {
      return T_C < 500 ? 1e6 * T_C : 1e6 * (1000 - T_C);
    }
    double dried_heat_capacity_J_m3K(double T_C) const override { return heat_capacity_J_m3K(T_C); }
    double dried_enthalpy_J_m3(double T_C) const override { return enthalpy_J_m3(T_C); }
    std::vector<double> kinks_C() const override { return {500}; }
    double valid_from_C() const override { return 0; }
    double valid_to_C() const override { return 1200; }
  };
  CHECK_THROWS_AS(EnthalpyCurve({{std::make_shared<Falling>(), 1.0}}), Error);
}

// The inverse is tabulated for 1e-3 K; values and slopes come from the same straight pieces.
TEST_CASE("The enthalpy curve inverts the law, wet and dried, with matching slopes") {
  Core wet;
  wet.moisture_fraction = 0.10;
  for (const ThermalLawPtr& law : {concrete_law_en1992(wet), steel_law_en1993()}) {
    const EnthalpyCurve curve({{law, 1.0}});
    for (double T_C = 20.5; T_C < 1200; T_C += 0.7) {
      INFO(law->name() << " " << T_C);
      const double u = law->enthalpy_J_m3(T_C) / kEnthalpyUnit_J_m3;
      CHECK(curve.first_heating(u).T_C == Approx(T_C).margin(2e-3).epsilon(0));
      const double dry = law->dried_enthalpy_J_m3(T_C) / kEnthalpyUnit_J_m3;
      CHECK(curve.dried(dry).T_C == Approx(T_C).margin(2e-3).epsilon(0));
      const EnthalpyCurve::State here = curve.first_heating(u);
      const EnthalpyCurve::State near = curve.first_heating(u + 1e-7);
      CHECK(near.T_C - here.T_C == Approx(1e-7 * here.T_slope).epsilon(0.2));
      CHECK(curve.conduction(here.T_C).potential_W_m == Approx(here.potential_W_m).epsilon(1e-9));
    }
  }
}

// Derivatives by central differences of the rate; their error is about 1e-6 of the entry.
TEST_CASE("The Jacobian of the heat equation is the derivative of its rate") {
  Section section = tubed(Shape::square, 0.1, 0.006, 0.01);
  section.steel_shape = SteelShape{SteelShapeKind::i_section, 0.05, 0.05, 0.008, 0.01, 355e6, 0.3};
  HeatEquation equation(heat_problem_of(section, standard_fire(60), {Accuracy::coarse, 2.0}));
  const std::size_t n = equation.size();
  std::vector<double> u(n);
  for (std::size_t k = 0; k < n; ++k) {
    u[k] = equation.curve(k).enthalpy(150.3 + 37.0 * static_cast<double>(k % 7));
  }
  equation.note_peaks(u);
  const SparsePattern& pattern = equation.pattern();
  std::vector<double> values(pattern.rows.size()), up(n), down(n);
  equation.jacobian(600, u, values);
  double largest = 0;
  for (double value : values) largest = std::max(largest, std::abs(value));
  std::size_t compared = 0;
  for (std::size_t column = 0; column < n; ++column) {
    const double h = 1e-6;
    const double kept = u[column];
    u[column] = kept + h;
    equation.rate(600, u, up);
    // Stay above the peak: below it the dried law has another slope.
    u[column] = kept;
    equation.rate(600, u, down);
    for (int k = pattern.column_starts[column]; k < pattern.column_starts[column + 1]; ++k) {
      const auto row = static_cast<std::size_t>(pattern.rows[static_cast<std::size_t>(k)]);
      const double difference = (up[row] - down[row]) / h;
      CHECK(values[static_cast<std::size_t>(k)] ==
            Approx(difference).margin(1e-5 * largest).epsilon(1e-4));
      ++compared;
    }
  }
  CHECK(compared == values.size());
}
