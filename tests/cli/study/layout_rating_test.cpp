#include "cli/study/layout_rating.hpp"

#include <catch2/catch.hpp>

#include "cli/input/reader.hpp"
#include "cli/study/shared_heat_flow.hpp"
#include "tests/cli/commands/example_columns.hpp"
#include "thermal/base/error.hpp"

using namespace ringward;
using namespace ringward::cli;
using namespace ringward::testing;

namespace {

ColumnInput column(const std::string& text, const std::vector<std::string>& overrides = {}) {
  return read_column({"column.toml", text, "."}, overrides);
}

HeatFlow from(SharedHeatFlow& shared, const ColumnInput& input) {
  return [&shared, &input](const thermal::Resolution& resolution) {
    return shared.get(0, input.column.section, input.fire, resolution);
  };
}

}  // namespace

TEST_CASE(
    "A row holds the fire resistance and uncertainty of the column rated alone, to the last "
    "bit",
    "[study]") {
  for (const std::string& text : {round_bare_column(), square_column(), round_tubed_column()}) {
    SharedHeatFlow shared({0, 0});
    for (const std::string load : {"load.axial_kN=300", "load.axial_kN=450"}) {
      const ColumnInput input = column(text, {load});
      INFO(input.title << ", " << load);
      const mechanical::Rating alone = mechanical::rate(input.column, input.fire, input.accuracy);
      const HeatFlow heat_flow = from(shared, input);
      const mechanical::Rating together =
          mechanical::rate(input.column, input.fire, input.accuracy,
                           {.bounds = false, .uncertainty = true, .heat_flow = heat_flow});
      CHECK(together.chosen.fire_resistance_s == alone.chosen.fire_resistance_s);
      CHECK(together.uncertainty_s == alone.uncertainty_s);
      const LayoutRow row = rate_layout(input, heat_flow, {});
      REQUIRE(row.verdict);
      const Verdict expected = judge(alone, true, std::nullopt);
      CHECK(row.verdict->fire_resistance_min == expected.fire_resistance_min);
      CHECK(row.verdict->uncertainty_min == expected.uncertainty_min);
      CHECK(row.criterion == alone.chosen.criterion);
    }
    CHECK(shared.solved() <= 2);
  }
}

TEST_CASE("Layouts of one group solve the heat flow once a grid, and it is dropped after the last",
          "[study]") {
  SharedHeatFlow shared({0, 0, 0});
  for (const std::string load : {"load.axial_kN=400", "load.axial_kN=500", "load.axial_kN=600"}) {
    const ColumnInput input = column(round_bare_column(), {load});
    (void)rate_layout(input, from(shared, input), {});
    CHECK(shared.solved() == 2);
    CHECK(shared.kept() == 2);
    if (load == "load.axial_kN=600") shared.release(0), shared.release(0), shared.release(0);
  }
  CHECK(shared.kept() == 0);
}

TEST_CASE("A layout that cannot be solved is a row with its reason", "[study]") {
  const ColumnInput input = column(round_bare_column(), {"rating.required_min=30"});
  const HeatFlow broken = [](const thermal::Resolution&) -> thermal::TemperatureHistory {
    throw Error(ErrorKind::solver_breakdown, "the integrator gave up at 12.5 min");
  };
  const LayoutRow row = rate_layout(input, broken, {"load.axial_kN"});
  CHECK_FALSE(row.verdict);
  CHECK(row.reason == "the integrator gave up at 12.5 min");
  CHECK(row.amounts.bars_kg_m > 0);
  CHECK_FALSE(row.margin_min());
  const LayoutRow read_back = row_of_line(row_line(row));
  CHECK_FALSE(read_back.verdict);
  CHECK(read_back.reason == row.reason);
}

TEST_CASE("The use at the required time is load over capacity there, and missing after the fall",
          "[study]") {
  const auto rated = [](const std::string& required) {
    const ColumnInput input = column(round_bare_column(), {"rating.required_min=" + required});
    SharedHeatFlow shared({0});
    return rate_layout(input, from(shared, input), {});
  };
  const ColumnInput input = column(round_bare_column());
  const thermal::TemperatureHistory history = thermal::solve_heat_flow(
      input.column.section, input.fire, {.accuracy = input.accuracy, .scale = 1.0});
  // 15 min stands in the history of a rating, 17 min does not.
  for (const double t_min : {15.0, 17.0}) {
    const double expected =
        mechanical::capacities(input.column, history, {60 * t_min}).front().utilisation;
    // The history and `capacity` walk to the same time in other steps: the last digits differ.
    CHECK(rated(std::to_string(t_min)).utilisation_at_required.value() ==
          Approx(expected).epsilon(1e-3));
  }
  CHECK_FALSE(rated("119").utilisation_at_required);
}

// Areas by hand: tube pi (200^2 - 195^2) = 6204.6 mm2, eight bars of 20 mm 2513.3 mm2, I of 250 x
// 250 x 9 x 14 2 * 250 * 14 + 222 * 9 = 8998 mm2; core pi 195^2 = 119459.1 mm2.
TEST_CASE("Steel and concrete of one metre are the areas of the section", "[study]") {
  thermal::Section section;
  section.outline = {thermal::Shape::circular, 0.4, 0.4};
  section.tube = thermal::Tube{.thickness_m = 0.005};
  section.bars = {{.diameter_m = 0.02,
                   .yield_Pa = 500e6,
                   .forming = thermal::BarForming::hot_rolled,
                   .positions = std::vector<thermal::Point>(8)}};
  section.steel_shape =
      thermal::SteelShape{.depth_m = 0.25, .width_m = 0.25, .web_m = 0.009, .flange_m = 0.014};
  const MaterialAmounts one = material_amounts(section);
  CHECK(one.tube_kg_m == Approx(7850 * 6204.6e-6).epsilon(1e-4));
  CHECK(one.bars_kg_m == Approx(7850 * 2513.3e-6).epsilon(1e-4));
  CHECK(one.shape_kg_m == Approx(7850 * 8998e-6).epsilon(1e-9));
  CHECK(one.concrete_m3_m == Approx(119459.1e-6 - 2513.3e-6 - 8998e-6).epsilon(1e-5));
  section.steel_shape->kind = thermal::SteelShapeKind::cross;
  CHECK(material_amounts(section).shape_kg_m == Approx(7850 * (2 * 8998e-6 - 81e-6)).epsilon(1e-9));
  section.outline = {thermal::Shape::rectangular, 0.5, 0.3};
  CHECK(material_amounts(section).tube_kg_m ==
        Approx(7850 * (0.5 * 0.3 - 0.49 * 0.29)).epsilon(1e-9));
}
