#include "cli/study/heat_key.hpp"

#include <catch2/catch.hpp>
#include <map>

#include "cli/input/reader.hpp"
#include "tests/cli/input/column_texts.hpp"

using namespace ringward;
using namespace ringward::cli;

namespace {

using Overrides = std::vector<std::string>;

/// A column that has every part, so that every key can be changed.
ColumnInput full_column(const std::string& shape, const Overrides& overrides) {
  const std::string text =
      cli::testing::edited(shape, "[member]",
                           "[steel_shape]\nkind = \"I\"\ndepth_mm = 150\nwidth_mm = 100\nweb_mm = "
                           "8\nflange_mm = 12\nyield_MPa = 355\n[protection]\nthickness_mm = "
                           "20\nconductivity_W_mK = 0.2\ndensity_kg_m3 = "
                           "800\nspecific_heat_J_kgK = 1700\n[member]") +
      "duration_min = 15\n[numerics]\naccuracy = \"coarse\"\n";
  return read_column({"column.toml", text, "."}, overrides);
}

/// One valid change of every key that is listed as one without heat.
const std::map<std::string, Overrides>& changes() {
  static const std::map<std::string, Overrides> all{
      {"title", {"title=\"Another\""}},
      {"tube.yield_MPa", {"tube.yield_MPa=275"}},
      {"tube.role", {"tube.role=\"composite\""}},
      {"tube.end_gap_mm", {"tube.end_gap_mm=25"}},
      {"tube.friction", {"tube.friction=0.2"}},
      {"tube.clear_height_mm", {"tube.clear_height_mm=3000"}},
      {"core.strength_MPa", {"core.strength_MPa=55"}},
      {"bars[].count", {"bars[0].count=6"}},
      {"bars[].diameter_mm", {"bars[0].diameter_mm=16"}},
      {"bars[].axis_mm", {"bars[0].axis_mm=40"}},
      {"bars[].yield_MPa", {"bars[0].yield_MPa=420"}},
      {"bars[].forming", {"bars[0].forming=\"cold-worked\""}},
      {"bars[].start_deg", {"bars[0].start_deg=22.5"}},
      {"bars[].layout", {"bars[0].layout=\"corners\"", "bars[0].count=4"}},
      {"bars[].positions_mm",
       {"bars=[{diameter_mm=20, yield_MPa=500, positions_mm=[[0, 140], [0, -140]]}]"}},
      {"steel_shape.yield_MPa", {"steel_shape.yield_MPa=460"}},
      {"confinement.model", {"confinement.model=\"yield\""}},
      {"member.length_mm", {"member.length_mm=5000"}},
      {"member.buckling_length_mm", {"member.buckling_length_mm=3000"}},
      {"member.buckling_factor", {"member.buckling_factor=0.7"}},
      {"member.imperfection_mm", {"member.imperfection_mm=3"}},
      {"load.axial_kN", {"load.axial_kN=1000"}},
      {"load.eccentricity_x_mm", {"load.eccentricity_x_mm=10"}},
      {"load.eccentricity_y_mm", {"load.eccentricity_y_mm=10"}},
      {"load.moment_x_kNm", {"load.moment_x_kNm=10"}},
      {"load.moment_y_kNm", {"load.moment_y_kNm=10"}},
      {"rating.required_min", {"rating.required_min=10"}},
      {"rating.gamma_concrete", {"rating.gamma_concrete=1.2"}},
      {"rating.gamma_bar", {"rating.gamma_bar=1.1"}},
      {"rating.gamma_steel", {"rating.gamma_steel=1.1"}},
      {"submission.project", {"submission.project=\"P\""}},
      {"submission.element", {"submission.element=\"E\""}},
      {"submission.author", {"submission.author=\"A\""}},
      {"submission.checker", {"submission.checker=\"C\""}},
      {"submission.revision", {"submission.revision=\"R\""}},
      {"submission.date", {"submission.date=\"D\""}},
      {"submission.authority", {"submission.authority=\"B\""}}};
  return all;
}

std::vector<double> temperatures(const ColumnInput& input) {
  const thermal::TemperatureHistory history = thermal::solve_heat_flow(
      input.column.section, input.fire, {.accuracy = input.accuracy, .scale = 1.0});
  std::vector<double> all;
  std::vector<double> cells(history.grid().cells.size());
  for (const double t_s : {0.0, 77.0, 450.0, 900.0}) {
    history.temperatures_C(t_s, cells);
    all.insert(all.end(), cells.begin(), cells.end());
  }
  return all;
}

bool is_without_heat(const std::string& key) {
  for (const std::string& listed : keys_without_heat()) {
    if (listed.back() == '.' ? key.starts_with(listed) : key == listed) return true;
  }
  return false;
}

}  // namespace

TEST_CASE("No key that is listed as one without heat changes a temperature by a single bit",
          "[study]") {
  for (const std::string shape : {"round", "square"}) {
    const ColumnInput base = full_column(shape, {});
    const std::vector<double> expected = temperatures(base);
    for (const KeySpec& spec : input_schema()) {
      if (spec.is_table() || !is_without_heat(spec.key)) continue;
      INFO(shape << ", " << spec.key << ": every listed key needs a change in this test");
      REQUIRE(changes().count(spec.key) == 1);
      const bool round_only = spec.key == "confinement.model" || spec.key == "bars[].start_deg";
      const bool square_only = spec.key == "bars[].layout";
      if ((round_only && shape == "square") || (square_only && shape == "round")) continue;
      const ColumnInput changed = full_column(shape, changes().at(spec.key));
      CHECK(heat_key(changed) == heat_key(base));
      CHECK(temperatures(changed) == expected);
    }
  }
}

TEST_CASE("Every change of outline, materials, layers or fire changes the key of the heat flow",
          "[study]") {
  const std::string key = heat_key(full_column("round", {}));
  for (const std::string change : {"section.diameter_mm=410",
                                   "tube.thickness_mm=6",
                                   "tube.contact_resistance_m2K_W=0.005",
                                   "core.aggregate=\"calcareous\"",
                                   "core.moisture_percent=4",
                                   "core.density_kg_m3=2400",
                                   "core.conductivity=\"lower\"",
                                   "steel_shape.kind=\"cross\"",
                                   "steel_shape.depth_mm=160",
                                   "steel_shape.width_mm=110",
                                   "steel_shape.web_mm=9",
                                   "steel_shape.flange_mm=13",
                                   "steel_shape.rotation_deg=30",
                                   "protection.thickness_mm=21",
                                   "protection.conductivity_W_mK=[[20, 0.2], [600, 0.3]]",
                                   "protection.density_kg_m3=700",
                                   "protection.specific_heat_J_kgK=1500",
                                   "protection.moisture_percent=1",
                                   "fire.curve=\"hydrocarbon\"",
                                   "fire.arc_deg=[0, 180]",
                                   "fire.duration_min=20",
                                   "fire.surface.emissivity=0.6",
                                   "fire.surface.convection_W_m2K=30",
                                   "fire.ambient.temperature_C=25",
                                   "fire.ambient.convection_W_m2K=8",
                                   "numerics.accuracy=\"standard\""}) {
    INFO(change);
    CHECK(heat_key(full_column("round", {change})) != key);
  }
}
