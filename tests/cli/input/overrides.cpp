#include "cli/input/overrides.hpp"

#include <catch2/catch.hpp>

#include "cli/input/reader.hpp"
#include "tests/cli/input/column_texts.hpp"

namespace ringward::cli::testing {
namespace {

ColumnInput read_with(const std::vector<std::string>& overrides) {
  return read_column({"column.toml", base_text("round"), "."}, overrides);
}

}  // namespace

TEST_CASE("An override replaces a value, adds one, reaches into a group and adds a whole table") {
  const ColumnInput input = read_with(
      {"load.axial_kN=2000", " tube.friction = 0.3 ", "bars[0].axis_mm=50",
       "rating.required_min=90", "fire.curve=\"hydrocarbon\"",
       "sensitivity.\"core.moisture_percent\"=[1.5, 10]",
       "protection={thickness_mm=20, conductivity_W_mK=[[20, 0.2], [600, 0.3]], density_kg_m3=700, "
       "specific_heat_J_kgK=1000}"});
  // Exact: the values are products of short decimals with powers of ten; one rounding allowed.
  CHECK(input.column.load.axial_N == Approx(2e6).epsilon(1e-15));
  CHECK(input.column.section.tube->friction == 0.3);
  CHECK(input.column.section.bars[0].positions[0].x_m == Approx(0.145).epsilon(1e-14));
  CHECK(input.required_s == 5400.0);
  CHECK(input.curve->name() == "hydrocarbon");
  CHECK(input.column.section.protection->conductivity_W_mK.value(310) ==
        Approx(0.25).epsilon(1e-14));
  REQUIRE(input.sensitivity.size() == 1);
  CHECK(input.sensitivity[0].key == "core.moisture_percent");
  CHECK(input.sensitivity[0].high == 10);
}

TEST_CASE("Of two overrides of one key the last one holds") {
  CHECK(read_with({"load.axial_kN=1", "load.axial_kN=900"}).column.load.axial_N == 900e3);
}

TEST_CASE("A bad override is refused with --set and its key as the place") {
  const std::vector<std::pair<std::string, std::string>> cases = {
      {"fire.curve=standard",
       "--set fire.curve: fire.curve: standard is not a TOML value; text needs quotes: --set "
       "'fire.curve=\"standard\"'"},
      {"core.strength_MPa=40 MPa",
       "--set core.strength_MPa: core.strength_MPa: 40 MPa is not a TOML value; write the number "
       "alone, without its unit"},
      {"tube.yield_MPa=",
       "--set tube.yield_MPa: tube.yield_MPa: nothing is not a TOML value; write a number, "
       "\"text\" or [a list]"},
      {"bars[1].axis_mm=50",
       "--set bars[1].axis_mm: bars[1].axis_mm: bars[1] does not exist: bars has 1 element; use "
       "index 0"},
      {"bars.axis_mm=50",
       "--set bars.axis_mm: bars.axis_mm: bars is a list of 1; name the element, as in "
       "bars[0].axis_mm"},
      {"tube.yield_MPa[0]=3",
       "--set tube.yield_MPa[0]: tube.yield_MPa[0]: tube.yield_MPa is not a list; leave out [0]"},
      {"title.x=3", "--set title.x: title.x: title is the text \"Round\", not a table"},
      {"title=\"a\"\nload.axial_kN=5",
       "--set title: title: the value holds a line break; give one TOML value"},
      {"tube", "--set tube: has no value; write KEY=VALUE, e.g. --set tube.thickness_mm=6"},
      {"=3",
       "--set =3: is not the name of an input key; write e.g. tube.thickness_mm or "
       "bars[0].axis_mm"},
      {"tube..friction=0.3",
       "--set tube..friction: is not the name of an input key; write e.g. tube.thickness_mm or "
       "bars[0].axis_mm"},
      {"tube.thicknes=6",
       "--set tube.thicknes: tube.thicknes: unknown key; did you mean tube.thickness_mm?"},
      {"tube.thickness_mm=600",
       "--set tube.thickness_mm: tube.thickness_mm: 600 mm is above the largest allowed, 200 mm; "
       "lengths are in mm"},
      {"protection.thickness_mm=20",
       "--set protection.thickness_mm: protection.conductivity_W_mK: missing; add e.g. "
       "conductivity_W_mK = 0.2 (W/mK) to [protection]\n"
       "--set protection.thickness_mm: protection.density_kg_m3: missing; add e.g. density_kg_m3 "
       "= 800 (kg/m3) to [protection]\n"
       "--set protection.thickness_mm: protection.specific_heat_J_kgK: missing; add e.g. "
       "specific_heat_J_kgK = 1700 (J/kgK) to [protection]"}};
  for (const auto& [assignment, expected] : cases) {
    DYNAMIC_SECTION(assignment) { CHECK(refusal(base_text("round"), {assignment}) == expected); }
  }
}

TEST_CASE("An element of a list that the file does not have is refused with the count") {
  const std::string without_bars =
      edited("round", "[[bars]]\ncount = 8\ndiameter_mm = 20\naxis_mm = 45\n", "");
  CHECK(refusal(without_bars, {"bars[0].axis_mm=40"}) ==
        "--set bars[0].axis_mm: bars[0].axis_mm: bars[0] does not exist: bars has 0 elements; add "
        "one to the file first");
}

TEST_CASE("A refused override leaves the rest of the file checked, and overrides are listed last") {
  CHECK(refusal(edited("round", "strength_MPa = 40", "strength_MPa = 5"),
                {"bars[3].count=4", "load.axial_kN=-1"}) ==
        "column.toml:9:16: core.strength_MPa: 5 MPa is below the least allowed, 10 MPa; the laws "
        "of EN 1992-1-2 end at 90 MPa; give the cylinder strength in MPa\n"
        "--set bars[3].count: bars[3].count: bars[3] does not exist: bars has 1 element; use index "
        "0\n"
        "--set load.axial_kN: load.axial_kN: -1 kN must be above 0 kN; compression is positive, "
        "and columns without load or in tension are not covered");
}

}  // namespace ringward::cli::testing
