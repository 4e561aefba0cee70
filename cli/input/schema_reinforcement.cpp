#include "cli/input/schema_tables.hpp"

namespace ringward::cli {
namespace {

const char* const kLengths = "lengths are in mm";
const char* const kStrengths = "strengths are in MPa";

std::vector<KeySpec> bar_keys() {
  return {
      {.key = "bars[]",
       .type = KeyType::table_list,
       .help = "Groups of reinforcing bars, any number of them."},
      {.key = "bars[].count",
       .type = KeyType::integer,
       .range = closed(1, 500),
       .computed = "required without positions_mm",
       .example = "8",
       .help = "Number of bars in the group.",
       .advice = "split larger groups"},
      {.key = "bars[].diameter_mm",
       .need = Need::required,
       .unit = "mm",
       .range = closed(4, 75),
       .example = "20",
       .help = "Diameter of a bar.",
       .advice = kLengths},
      {.key = "bars[].axis_mm",
       .unit = "mm",
       .range = closed(0, 5000),
       .computed = "required without positions_mm",
       .example = "45",
       .help = "From the bar's axis to the nearest face of the core.",
       .advice = kLengths},
      {.key = "bars[].yield_MPa",
       .unit = "MPa",
       .range = closed(200, 1000),
       .fallback = "500",
       .help = "Yield strength of the bars at 20 C.",
       .source = "en1992-1-2-2004 3.2.3",
       .advice = kStrengths},
      {.key = "bars[].forming",
       .type = KeyType::choice,
       .fallback = "\"hot-rolled\"",
       .choices = {"hot-rolled", "cold-worked"},
       .help = "How the bars were formed, which sets their loss of strength (class N).",
       .source = "en1992-1-2-2004 Table 3.2a"},
      {.key = "bars[].start_deg",
       .unit = "deg",
       .range = closed(-360, 360),
       .fallback = "0",
       .help = "Ring: angle of the first bar, anticlockwise from +x.",
       .advice = "angles are in degrees"},
      {.key = "bars[].layout",
       .type = KeyType::choice,
       .computed = "\"ring\" in a circle, \"perimeter\" in a square or rectangle",
       .choices = {"ring", "corners", "perimeter"},
       .example = "\"ring\"",
       .help = "ring: circular sections; corners: 4 bars; perimeter: four corners and the rest "
               "spread evenly over the sides (an even count; extra pairs go to opposite sides so "
               "that the largest spacing is least, a tie to the sides parallel to x)."},
      {.key = "bars[].positions_mm",
       .type = KeyType::pair_list,
       .unit = "mm",
       .range = closed(-5000, 5000),
       .example = "[[0, 120], [0, -120]]",
       .help = "Bar axes as [x, y], instead of count, axis_mm and layout.",
       .advice = kLengths},
  };
}

std::vector<KeySpec> shape_keys() {
  return {
      {.key = "steel_shape",
       .type = KeyType::table,
       .help = "Steel shape embedded in the core, centred in it."},
      {.key = "steel_shape.kind",
       .type = KeyType::choice,
       .need = Need::required,
       .choices = {"I", "cross"},
       .example = "\"I\"",
       .help = "I, or a cross of two I shapes at right angles."},
      {.key = "steel_shape.depth_mm",
       .need = Need::required,
       .unit = "mm",
       .range = closed(20, 5000),
       .example = "200",
       .help = "Overall depth, along the web.",
       .advice = kLengths},
      {.key = "steel_shape.width_mm",
       .need = Need::required,
       .unit = "mm",
       .range = closed(10, 5000),
       .example = "150",
       .help = "Width of the flanges.",
       .advice = kLengths},
      {.key = "steel_shape.web_mm",
       .need = Need::required,
       .unit = "mm",
       .range = closed(1, 300),
       .example = "8",
       .help = "Thickness of the web.",
       .advice = kLengths},
      {.key = "steel_shape.flange_mm",
       .need = Need::required,
       .unit = "mm",
       .range = closed(1, 300),
       .example = "12",
       .help = "Thickness of the flanges.",
       .advice = kLengths},
      {.key = "steel_shape.yield_MPa",
       .need = Need::required,
       .unit = "MPa",
       .range = closed(100, 1000),
       .example = "355",
       .help = "Yield strength of the shape at 20 C.",
       .source = "en1993-1-2-2005 3.2",
       .advice = kStrengths},
      {.key = "steel_shape.rotation_deg",
       .unit = "deg",
       .range = closed(-360, 360),
       .fallback = "0",
       .help = "Anticlockwise rotation; 0 puts the web along y.",
       .advice = "angles are in degrees"},
  };
}

std::vector<KeySpec> protection_keys() {
  return {
      {.key = "protection", .type = KeyType::table, .help = "Insulating layer outside the tube."},
      {.key = "protection.thickness_mm",
       .need = Need::required,
       .unit = "mm",
       .range = closed(0, 500),
       .example = "25",
       .help = "Thickness of the layer; 0: no layer, the other keys of the table then count for "
               "nothing.",
       .advice = kLengths},
      {.key = "protection.conductivity_W_mK",
       .type = KeyType::number_or_pair_list,
       .need = Need::required,
       .unit = "W/mK",
       .range = above(0, 100),
       .example = "0.2",
       .help = "Conductivity: a number, or a table [[T_C, value], ...].",
       .advice = "take it from the manufacturer's fire tests, in W/mK"},
      {.key = "protection.density_kg_m3",
       .need = Need::required,
       .unit = "kg/m3",
       .range = closed(10, 5000),
       .example = "800",
       .help = "Density of the layer.",
       .advice = "densities are in kg/m3"},
      {.key = "protection.specific_heat_J_kgK",
       .type = KeyType::number_or_pair_list,
       .need = Need::required,
       .unit = "J/kgK",
       .range = closed(50, 20000),
       .example = "1700",
       .help = "Specific heat: a number, or a table [[T_C, value], ...].",
       .advice = "specific heat is in J/kgK"},
      {.key = "protection.moisture_percent",
       .unit = "%",
       .range = closed(0, 50),
       .fallback = "0",
       .help = "Water by mass; its latent heat of 2257 kJ/kg is spread over 100 to 115 C, on "
               "first heating only.",
       .advice = "moisture is in percent by mass"},
  };
}

}  // namespace

std::vector<KeySpec> reinforcement_keys() {
  std::vector<KeySpec> keys = bar_keys();
  for (const auto& part : {shape_keys(), protection_keys()}) {
    keys.insert(keys.end(), part.begin(), part.end());
  }
  return keys;
}

}  // namespace ringward::cli
