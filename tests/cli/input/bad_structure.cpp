#include <catch2/catch.hpp>

#include "tests/cli/input/column_texts.hpp"

namespace ringward::cli::testing {

TEST_CASE(
    "A file of the wrong form is refused with its place, the value, the limit and the way out") {
  const std::vector<BadFile> files = {
      {"a syntax error carries its position", "round", "count = 8", "count = = 8",
       "column.toml:11:9: not valid TOML: Error while parsing value: could not determine value "
       "type; correct the syntax here"},
      {"an unknown key suggests the nearest of its table", "round", "thickness_mm = 5",
       "thicknes_mm = 5",
       "column.toml:6:1: tube.thicknes_mm: unknown key; did you mean tube.thickness_mm?"},
      {"a key without its unit suggests the one with it", "round", "thickness_mm = 5",
       "thickness = 5",
       "column.toml:6:1: tube.thickness: unknown key; did you mean tube.thickness_mm?"},
      {"an unknown table suggests the nearest", "round", "[core]", "[cor]",
       "column.toml:8:2: cor: unknown key; did you mean core?"},
      {"a missing key is reported at its table", "round", "yield_MPa = 355\n", "",
       "column.toml:5:1: tube.yield_MPa: missing; add e.g. yield_MPa = 355 (MPa) to [tube]"},
      {"a missing table names its required keys", "round", "[load]\naxial_kN = 1500\n", "",
       "column.toml:1:1: load: missing; add the table [load] with axial_kN"},
      {"text where a number belongs", "round", "strength_MPa = 40", "strength_MPa = \"40\"",
       "column.toml:9:16: core.strength_MPa: expected a number, found the text \"40\"; the unit is "
       "MPa; write e.g. strength_MPa = 40"},
      {"a truth value where a number belongs", "round", "strength_MPa = 40", "strength_MPa = true",
       "column.toml:9:16: core.strength_MPa: expected a number, found the truth value true; the "
       "unit is MPa; write e.g. strength_MPa = 40"},
      {"a date where text belongs", "round", "title = \"Round\"", "title = 2025-01-01",
       "column.toml:1:9: title: expected text in quotes, found the date or time 2025-01-01; write "
       "e.g. title = \"Column C1 (invented example)\""},
      {"a number where a table belongs", "round", "[fire]\ncurve = \"standard\"",
       "[confinement]\n[fire]\ncurve = \"standard\"\nsurface = 3",
       "column.toml:21:11: fire.surface: expected a table, found the number 3; write "
       "[fire.surface] on a line of its own"},
      {"one bracket for a group of bars", "round", "[[bars]]", "[bars]",
       "column.toml:10:1: bars: expected groups, found a table; write [[bars]] with two brackets"},
      {"a number that is not a number", "round", "axial_kN = 1500", "axial_kN = nan",
       "column.toml:17:12: load.axial_kN: nan is not a finite number; allowed is above 0, at most "
       "1000000 kN"},
      {"an infinite number", "round", "length_mm = 4000", "length_mm = inf",
       "column.toml:15:13: member.length_mm: inf is not a finite number; allowed is 100 to 100000 "
       "mm"},
      {"a value above its range", "round", "strength_MPa = 40", "strength_MPa = 95",
       "column.toml:9:16: core.strength_MPa: 95 MPa is above the largest allowed, 90 MPa; the laws "
       "of EN 1992-1-2 end at 90 MPa; give the cylinder strength in MPa"},
      {"moisture above its range", "round", "strength_MPa = 40",
       "strength_MPa = 40\nmoisture_percent = 12",
       "column.toml:10:20: core.moisture_percent: 12 % is above the largest allowed, 10 %; the law "
       "gives values from 0 to 10 % by mass"},
      {"friction above its range", "round", "yield_MPa = 355", "yield_MPa = 355\nfriction = 0.9",
       "column.toml:8:12: tube.friction: 0.9 is above the largest allowed, 0.8; 0.4 is usual"},
      {"a count that is not whole", "round", "count = 8", "count = 7.5",
       "column.toml:11:9: bars[0].count: 7.5 is not a whole number; allowed is 1 to 500"},
      {"an arc of one number", "round", "curve = \"standard\"",
       "curve = \"standard\"\narc_deg = [90]",
       "column.toml:20:11: fire.arc_deg: expected two numbers, [a, b], found a list of 1; the unit "
       "is deg; write e.g. arc_deg = [0, 180]"},
      {"a number in the submission", "round", "[member]", "[submission]\nproject = 5\n[member]",
       "column.toml:15:11: submission.project: expected text in quotes, found the number 5; write "
       "e.g. project = \"Invented project\""},
  };
  for (const BadFile& file : files) {
    DYNAMIC_SECTION(file.claim) {
      CHECK(refusal(edited(file.base, file.from, file.to)) == file.expected);
    }
  }
}

}  // namespace ringward::cli::testing
