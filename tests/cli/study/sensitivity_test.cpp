#include <catch2/catch.hpp>
#include <nlohmann/json.hpp>

#include "cli/input/reader.hpp"
#include "cli/study/uncertain_inputs.hpp"
#include "tests/cli/commands/example_columns.hpp"
#include "tests/cli/commands/run_process.hpp"
#include "tests/cli/docs/tree.hpp"

using namespace ringward::testing;
using namespace ringward::cli;
using nlohmann::json;

namespace {

std::vector<UncertainInput> inputs_of(const std::string& text) {
  return uncertain_inputs(read_column({"column.toml", text, "."}));
}

const UncertainInput* find(const std::vector<UncertainInput>& inputs, const std::string& key) {
  for (const UncertainInput& input : inputs) {
    if (input.key == key) return &input;
  }
  return nullptr;
}

}  // namespace

TEST_CASE("Only inputs that the column has are uncertain", "[study]") {
  const std::vector<UncertainInput> bare = inputs_of(round_bare_column());
  CHECK(find(bare, "tube.thickness_mm") == nullptr);
  CHECK(find(bare, "protection.thickness_mm") == nullptr);
  CHECK(find(bare, "core.moisture_percent") != nullptr);
  const std::vector<UncertainInput> tubed = inputs_of(round_tubed_column());
  for (const char* key :
       {"tube.thickness_mm", "tube.yield_MPa", "tube.friction", "tube.contact_resistance_m2K_W",
        "bars[0].axis_mm", "bars[0].yield_MPa", "core.strength_MPa", "core.conductivity",
        "fire.surface.emissivity", "load.axial_kN", "member.imperfection_mm"}) {
    INFO(key);
    CHECK(find(tubed, key) != nullptr);
  }
}

TEST_CASE("Default low and high values follow their sources and stay within what is allowed",
          "[study]") {
  const std::vector<UncertainInput> inputs = inputs_of(round_tubed_column());
  // EN 1992-1-1 4.4.1.3 (from memory): 10 mm.
  CHECK(find(inputs, "bars[0].axis_mm")->low == "25");
  CHECK(find(inputs, "bars[0].axis_mm")->high == "45");
  // EN 13791 and EN 1992-1-1 Table 3.1 (from memory): 0.85 f, f + 8 MPa.
  CHECK(find(inputs, "core.strength_MPa")->low == "25.5");
  CHECK(find(inputs, "core.strength_MPa")->high == "38");
  // Buckling length 2000 mm over 1000 and 200.
  CHECK(find(inputs, "member.imperfection_mm")->low == "2");
  CHECK(find(inputs, "member.imperfection_mm")->high == "10");
  const std::string strong = round_bare_column();
  const std::size_t at = strong.find("strength_MPa = 30");
  const std::vector<UncertainInput> limited =
      inputs_of(strong.substr(0, at) + "strength_MPa = 88" + strong.substr(at + 17));
  CHECK(find(limited, "core.strength_MPa")->high == "90");
}

TEST_CASE("The source of every default is listed", "[study]") {
  const std::string listed = read_file("docs/sources.toml").text;
  std::string text = round_tubed_column();
  text +=
      "[protection]\nthickness_mm = 25\nconductivity_W_mK = 0.2\ndensity_kg_m3 = 800\n"
      "specific_heat_J_kgK = 1700\n";
  for (const UncertainInput& input : inputs_of(text)) {
    INFO(input.key << " gives " << input.source);
    const std::string key = input.source.substr(0, input.source.find_first_of(" ;"));
    CHECK((input.source == "common practice, no source" ||
           listed.find("[" + key + "]") != std::string::npos));
    CHECK_FALSE(input.basis.empty());
  }
}

TEST_CASE("The column's own ranges replace the defaults and add to them", "[study]") {
  const std::vector<UncertainInput> inputs =
      inputs_of(round_bare_column() +
                "[sensitivity]\n\"core.moisture_percent\" = [2, 5]\n\"bars[0].diameter_mm\" = "
                "[10, 14]\n");
  CHECK(find(inputs, "core.moisture_percent")->low == "2");
  CHECK(find(inputs, "core.moisture_percent")->high == "5");
  CHECK(find(inputs, "core.moisture_percent")->source == "column file");
  CHECK(find(inputs, "bars[0].diameter_mm")->high == "14");
}

TEST_CASE("Each answer is what rate says with that one value, the strongest input first",
          "[study]") {
  const TemporaryFolder folder;
  const std::string column = folder / "column.toml";
  write_content(column, round_bare_column());
  const auto run = [&](const std::string& jobs) {
    return run_ringward(
        {"sensitivity", column, "--json", "-", "--jobs", jobs, "--picture", folder / "bars.svg"});
  };
  const ProcessResult result = run("1");
  REQUIRE(result.exit_code == 0);
  CHECK(result.err.empty());
  CHECK(run("3").out == result.out);
  CHECK(run_program({"xmllint", "--noout", folder / "bars.svg"}).exit_code == 0);
  const json report = json::parse(result.out);
  CHECK(report.at("schema") == "ringward-sensitivity/1");
  double before = 1e9;
  for (const json& row : report.at("inputs")) {
    INFO(row.dump());
    CHECK(row.at("span_min").get<double>() <= before);
    before = row.at("span_min");
    for (const char* side : {"low", "high"}) {
      const std::string set = row.at("key").get<std::string>() + "=" + row.at(side).dump();
      const json rating =
          json::parse(run_ringward({"rate", column, "--json", "-", "--set", set}).out).at("rating");
      const json& answer = row.at(std::string("at_") + side);
      CHECK(answer.at("fire_resistance_min") == rating.at("fire_resistance_min"));
      CHECK(answer.at("uncertainty_min") == rating.at("uncertainty_min"));
    }
  }
  CHECK(before < 1e9);
}

TEST_CASE("A value that makes no valid column is told with its reason, the rest is rated",
          "[study]") {
  const TemporaryFolder folder;
  // Bars so near the face that 10 mm less leaves no cover.
  std::string text = round_bare_column();
  const std::size_t at = text.find("axis_mm = 35");
  text.replace(at, 12, "axis_mm = 12");
  write_content(folder / "column.toml", text);
  const ProcessResult run = run_ringward({"sensitivity", folder / "column.toml"});
  CHECK(run.exit_code == 0);
  CHECK(run.out.find("not rated at the low value") != std::string::npos);
  CHECK(run.out.find("the cover is below zero") != std::string::npos);
  CHECK(run.out.find("load.axial_kN") != std::string::npos);
}

TEST_CASE("Without gnuplot the bars are missing, the table is there and the exit status says it",
          "[study]") {
  const TemporaryFolder folder;
  write_content(folder / "column.toml", round_bare_column());
  const ProcessResult run =
      run_ringward({"sensitivity", folder / "column.toml", "--picture", folder / "bars.svg"},
                   {.variables = {{"PATH", folder / "nothing"}}});
  CHECK(run.exit_code == 5);
  CHECK(run.err.find("apt install gnuplot-nox") != std::string::npos);
  CHECK(run.out.find("One input changed at a time") != std::string::npos);
}
