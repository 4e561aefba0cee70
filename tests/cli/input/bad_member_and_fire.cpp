#include <catch2/catch.hpp>

#include "tests/cli/input/column_texts.hpp"

namespace ringward::cli::testing {

TEST_CASE(
    "A member, load or fire that contradicts itself is refused with its place and the way out") {
  const std::vector<BadFile> files = {
      {"a key in the wrong table suggests where it belongs", "round", "[member]",
       "[member]\nfriction = 0.4",
       "column.toml:15:1: member.friction: unknown key; did you mean tube.friction?"},
      {"a load of zero", "round", "axial_kN = 1500", "axial_kN = 0",
       "column.toml:17:12: load.axial_kN: 0 kN must be above 0 kN; compression is positive, and "
       "columns without load or in tension are not covered"},
      {"a load in tension", "round", "axial_kN = 1500", "axial_kN = -10",
       "column.toml:17:12: load.axial_kN: -10 kN must be above 0 kN; compression is positive, and "
       "columns without load or in tension are not covered"},
      {"an unknown choice", "round", "curve = \"standard\"", "curve = \"standart\"",
       "column.toml:19:9: fire.curve: \"standart\" is none of \"standard\", \"external\", "
       "\"hydrocarbon\", \"slow\", \"astm-e119\", \"parametric\", \"table\", \"constant\"; did you "
       "mean \"standard\"?"},
      {"confinement of a square", "square", "[member]",
       "[confinement]\nmodel = \"contact\"\n[member]",
       "column.toml:15:9: confinement.model: \"contact\" holds for circular confining tubes only, "
       "this column is square; use \"none\""},
      {"confinement without a tube", "round", "[tube]\nthickness_mm = 5\nyield_MPa = 355\n",
       "[confinement]\nmodel = \"contact\"\n",
       "column.toml:6:9: confinement.model: \"contact\" holds for circular confining tubes only, "
       "this column is bare concrete without a tube; use \"none\""},
      {"confinement of a tube with role composite", "round", "yield_MPa = 355\n",
       "yield_MPa = 355\nrole = \"composite\"\n[confinement]\nmodel = \"contact\"\n",
       "column.toml:10:9: confinement.model: \"contact\" holds for circular confining tubes only, "
       "this column is circular with role \"composite\"; use \"none\""},
      {"a load outside the round section", "round", "axial_kN = 1500",
       "axial_kN = 1500\neccentricity_x_mm = 150\neccentricity_y_mm = 150",
       "column.toml:18:21: load.eccentricity_x_mm: the load acts 212.132 mm from the centroid, "
       "outside the section; at most 200 mm; give a moment for a load that bends more than it "
       "presses"},
      {"a load outside the rectangular section", "rectangular", "axial_kN = 1500",
       "axial_kN = 1500\neccentricity_y_mm = -160",
       "column.toml:19:21: load.eccentricity_y_mm: the load acts 160 mm from the centroid, outside "
       "the section; at most 150 mm; give a moment for a load that bends more than it presses"},
      {"an eccentricity and a moment", "round", "axial_kN = 1500",
       "axial_kN = 1500\neccentricity_x_mm = 20\nmoment_y_kNm = 5",
       "column.toml:18:21: load.eccentricity_x_mm: an eccentricity (20 mm) and an end moment "
       "(load.moment_y_kNm = 5 kNm) exclude each other; remove one of the two"},
      {"buckling length and factor", "round", "length_mm = 4000",
       "length_mm = 4000\nbuckling_length_mm = 2000\nbuckling_factor = 0.5",
       "column.toml:17:19: member.buckling_factor: buckling_factor = 0.5 and buckling_length_mm = "
       "2000 mm exclude each other; remove one of the two"},
      {"a tube and its gaps longer than the member", "round", "yield_MPa = 355",
       "yield_MPa = 355\nclear_height_mm = 3990",
       "column.toml:8:19: tube.clear_height_mm: 3990 mm with two end gaps of 10 mm is longer than "
       "member.length_mm, 4000 mm; at most 3980 mm"},
      {"an arc of zero", "round", "curve = \"standard\"",
       "curve = \"standard\"\narc_deg = [90, 90]",
       "column.toml:20:11: fire.arc_deg: [90, 90] is an arc of zero; leave it out for none, or "
       "write [0, 360] for the whole circle"},
      {"an arc of more than a turn", "round", "curve = \"standard\"",
       "curve = \"standard\"\narc_deg = [0, 450]",
       "column.toml:20:11: fire.arc_deg: [0, 450] covers 450 deg; an arc covers at most 360 deg"},
      {"a built-in arc inside the heated arc", "round", "curve = \"standard\"",
       "curve = \"standard\"\narc_deg = [0, 180]\nbuilt_in_arc_deg = [170, 300]",
       "column.toml:21:20: fire.built_in_arc_deg: [170, 300] overlaps the heated arc [0, 180]; an "
       "arc is either heated or built in, so shorten one of them"},
      {"a built-in arc that runs round into the heated arc", "round", "curve = \"standard\"",
       "curve = \"standard\"\narc_deg = [0, 180]\nbuilt_in_arc_deg = [200, 10]",
       "column.toml:21:20: fire.built_in_arc_deg: [200, 370] overlaps the heated arc [0, 180]; an "
       "arc is either heated or built in, so shorten one of them"},
      {"a built-in arc of a column heated all round", "round", "curve = \"standard\"",
       "curve = \"standard\"\nbuilt_in_arc_deg = [200, 340]",
       "column.toml:20:20: fire.built_in_arc_deg: the column is heated all round, so the built-in "
       "arc is heated too; give the heated arc with arc_deg"},
      {"faces of a circle", "round", "curve = \"standard\"",
       "curve = \"standard\"\nexposed = [\"left\"]",
       "column.toml:20:11: fire.exposed: a circular section has no faces; use arc_deg = [from, "
       "to], e.g. [0, 180]"},
      {"exposed beside an arc", "round", "curve = \"standard\"",
       "curve = \"standard\"\nexposed = \"all\"\narc_deg = [0, 90]",
       "column.toml:20:11: fire.exposed: exposed and arc_deg exclude each other; remove one of the "
       "two"},
      {"an arc of a square", "square", "curve = \"standard\"",
       "curve = \"standard\"\narc_deg = [0, 90]",
       "column.toml:20:11: fire.arc_deg: an arc belongs to circular sections, this one is square; "
       "list faces with exposed and built_in"},
      {"a face both exposed and built in", "square", "curve = \"standard\"",
       "curve = \"standard\"\nexposed = [\"left\", \"top\"]\nbuilt_in = [\"top\"]",
       "column.toml:21:12: fire.built_in: the face \"top\" is both exposed and built in; list only "
       "the heated faces in exposed"},
      {"built in while all faces are exposed", "square", "curve = \"standard\"",
       "curve = \"standard\"\nbuilt_in = [\"top\"]",
       "column.toml:20:12: fire.built_in: the face \"top\" is both exposed and built in; list only "
       "the heated faces in exposed"},
      {"no heated face", "square", "curve = \"standard\"", "curve = \"standard\"\nexposed = []",
       "column.toml:20:11: fire.exposed: no face is heated; list at least one face or use \"all\""},
      {"a face that does not exist", "square", "curve = \"standard\"",
       "curve = \"standard\"\nexposed = [\"north\"]",
       "column.toml:20:12: fire.exposed: \"north\" is none of \"left\", \"right\", \"bottom\", "
       "\"top\"; use one of these"},
      {"a face listed twice", "square", "curve = \"standard\"",
       "curve = \"standard\"\nexposed = [\"left\", \"left\"]",
       "column.toml:20:20: fire.exposed: \"left\" is listed twice; list each once"},
      {"a fire table that does not increase", "round", "curve = \"standard\"",
       "curve = \"table\"\npoints_min_C = [[0, 20], [10, 600], [10, 700]]",
       "column.toml:20:38: fire.points_min_C: the table does not increase: the time 10 follows 10; "
       "put the points in increasing order of time, each once"},
      {"a fire table without points", "round", "curve = \"standard\"", "curve = \"table\"",
       "column.toml:18:1: fire.points_min_C: missing; curve = \"table\" needs points_min_C = "
       "[[min, C], ...] or points_csv = \"file.csv\""},
      {"an empty fire table", "round", "curve = \"standard\"",
       "curve = \"table\"\npoints_min_C = []",
       "column.toml:20:16: fire.points_min_C: the list is empty; give at least one pair"},
      {"points and a CSV file", "round", "curve = \"standard\"",
       "curve = \"table\"\npoints_min_C = [[0, 20]]\npoints_csv = \"f.csv\"",
       "column.toml:21:14: fire.points_csv: points_csv and points_min_C exclude each other; remove "
       "one of the two"},
      {"a CSV file that does not exist", "round", "curve = \"standard\"",
       "curve = \"table\"\npoints_csv = \"no-such.csv\"",
       "column.toml:20:14: fire.points_csv: \"no-such.csv\" cannot be read; the path is relative "
       "to the column file"},
      {"points for another curve", "round", "curve = \"standard\"",
       "curve = \"standard\"\npoints_min_C = [[0, 20]]",
       "column.toml:20:16: fire.points_min_C: belongs to fire.curve = \"table\", but fire.curve is "
       "\"standard\"; remove it or change fire.curve"},
      {"a parametric fire without its table", "round", "curve = \"standard\"",
       "curve = \"parametric\"",
       "column.toml:18:1: fire.parametric: missing; add the table [fire.parametric] with "
       "opening_m05, fire_load_enclosure_MJ_m2, thermal_inertia_J_m2s05K"},
      {"a parametric table for another curve", "round", "curve = \"standard\"",
       "curve = \"standard\"\nparametric = { opening_m05 = 0.04, fire_load_enclosure_MJ_m2 = 200, "
       "thermal_inertia_J_m2s05K = 1160 }",
       "column.toml:20:14: fire.parametric: belongs to fire.curve = \"parametric\", but fire.curve "
       "is \"standard\"; remove it or change fire.curve"},
      {"a constant fire without its temperature", "round", "curve = \"standard\"",
       "curve = \"constant\"",
       "column.toml:18:1: fire.constant_C: missing; add e.g. constant_C = 1000 (deg C) to [fire]"},
      {"a property table that does not increase", "round", "[member]",
       "[protection]\nthickness_mm = 25\nconductivity_W_mK = [[20, 0.2], [20, 0.3]]\ndensity_kg_m3 "
       "= 800\nspecific_heat_J_kgK = 1700\n[member]",
       "column.toml:16:34: protection.conductivity_W_mK: the table does not increase: the "
       "temperature 20 follows 20; put the points in increasing order of temperature, each once"},
      {"a property of zero", "round", "[member]",
       "[protection]\nthickness_mm = 25\nconductivity_W_mK = [[20, 0.2], [400, 0]]\ndensity_kg_m3 "
       "= 800\nspecific_heat_J_kgK = 1700\n[member]",
       "column.toml:16:39: protection.conductivity_W_mK: 0 W/mK must be above 0 W/mK; take it from "
       "the manufacturer's fire tests, in W/mK"},
      {"a required rating longer than the fire", "round", "curve = \"standard\"",
       "curve = \"standard\"\nduration_min = 60\n[rating]\nrequired_min = 90",
       "column.toml:22:16: rating.required_min: 90 min is longer than the fire is followed, "
       "fire.duration_min = 60 min; raise fire.duration_min"},
      {"a sensitivity range upside down", "round", "[member]",
       "[sensitivity]\n\"core.moisture_percent\" = [10, 1.5]\n[member]",
       "column.toml:15:27: sensitivity.\"core.moisture_percent\": the low value 10 is not below "
       "the high value 1.5; write [low, high]"},
      {"a sensitivity of an unknown key", "round", "[member]",
       "[sensitivity]\n\"core.moisture\" = [1.5, 10]\n[member]",
       "column.toml:15:1: sensitivity.\"core.moisture\": \"core.moisture\" is no input key; did "
       "you mean \"core.moisture_percent\"?"},
      {"a sensitivity of a choice", "round", "[member]",
       "[sensitivity]\n\"fire.curve\" = [1, 2]\n[member]",
       "column.toml:15:1: sensitivity.\"fire.curve\": \"fire.curve\" is not a number, so it has no "
       "low and high value; leave it out"},
      {"a sensitivity of bars without a number", "round", "[member]",
       "[sensitivity]\n\"bars[].axis_mm\" = [40, 50]\n[member]",
       "column.toml:15:1: sensitivity.\"bars[].axis_mm\": \"bars[].axis_mm\" names no value of "
       "this column; bars are numbered, as in bars[0].axis_mm; correct it or leave it out"},
      {"a sensitivity outside the range of the key", "round", "[member]",
       "[sensitivity]\n\"core.moisture_percent\" = [1, 20]\n[member]",
       "column.toml:15:31: sensitivity.\"core.moisture_percent\": 20 % is above the largest "
       "allowed, 10 %; the law gives values from 0 to 10 % by mass"},
  };
  for (const BadFile& file : files) {
    DYNAMIC_SECTION(file.claim) {
      CHECK(refusal(edited(file.base, file.from, file.to)) == file.expected);
    }
  }
}

}  // namespace ringward::cli::testing
