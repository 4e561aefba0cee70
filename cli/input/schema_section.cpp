#include "cli/input/schema_tables.hpp"

namespace ringward::cli {
namespace {

const char* const kLengths = "lengths are in mm";
const char* const kStrengths = "strengths are in MPa";

std::vector<KeySpec> outline_keys() {
  return {
      {.key = "title",
       .type = KeyType::text,
       .fallback = "\"\"",
       .example = "\"Column C1 (invented example)\"",
       .help = "Name of the column, printed on every result."},
      {.key = "section",
       .type = KeyType::table,
       .need = Need::required,
       .help = "Outline of the cross-section; the origin is its centroid, x to the right, y up."},
      {.key = "section.shape",
       .type = KeyType::choice,
       .need = Need::required,
       .choices = {"circular", "square", "rectangular"},
       .example = "\"circular\"",
       .help = "Shape of the outline."},
      {.key = "section.diameter_mm",
       .need = Need::required,
       .unit = "mm",
       .range = closed(50, 10000),
       .only_if = {"section.shape", "circular"},
       .example = "400",
       .help = "Outside diameter of the tube, or of the concrete where there is no tube.",
       .advice = kLengths},
      {.key = "section.side_mm",
       .need = Need::required,
       .unit = "mm",
       .range = closed(50, 10000),
       .only_if = {"section.shape", "square"},
       .example = "400",
       .help = "Outside width of the tube, or of the concrete where there is no tube.",
       .advice = kLengths},
      {.key = "section.width_mm",
       .need = Need::required,
       .unit = "mm",
       .range = closed(50, 10000),
       .only_if = {"section.shape", "rectangular"},
       .example = "500",
       .help = "Outside width along x.",
       .advice = kLengths},
      {.key = "section.depth_mm",
       .need = Need::required,
       .unit = "mm",
       .range = closed(50, 10000),
       .only_if = {"section.shape", "rectangular"},
       .example = "300",
       .help = "Outside depth along y.",
       .advice = kLengths},
  };
}

std::vector<KeySpec> tube_keys() {
  return {
      {.key = "tube",
       .type = KeyType::table,
       .help = "Steel tube around the core; leave the table out for a bare reinforced-concrete "
               "column."},
      {.key = "tube.thickness_mm",
       .need = Need::required,
       .unit = "mm",
       .range = closed(0.5, 200),
       .example = "5",
       .help = "Wall thickness of the tube.",
       .advice = kLengths},
      {.key = "tube.yield_MPa",
       .need = Need::required,
       .unit = "MPa",
       .range = closed(100, 1000),
       .example = "355",
       .help = "Yield strength of the tube at 20 C.",
       .source = "en1993-1-2-2005 3.2",
       .advice = kStrengths},
      {.key = "tube.role",
       .type = KeyType::choice,
       .fallback = "\"confining\"",
       .choices = {"confining", "composite"},
       .help = "confining: cut short at the joints, carries no axial load; composite: loaded "
               "together with the core."},
      {.key = "tube.end_gap_mm",
       .unit = "mm",
       .range = closed(0, 500),
       .fallback = "10",
       .help = "Clear gap at each end of a confining tube; decides when the heated tube bears.",
       .source = "common practice, no source",
       .advice = kLengths},
      {.key = "tube.friction",
       .range = closed(0.1, 0.8),
       .fallback = "0.4",
       .help = "Coefficient of friction between tube and concrete.",
       .source = "common practice, no source",
       .advice = "0.4 is usual"},
      {.key = "tube.clear_height_mm",
       .unit = "mm",
       .range = above(0, 100000),
       .computed = "member.length_mm less two end gaps",
       .example = "3980",
       .help = "Height of the tube between its cut ends.",
       .advice = kLengths},
      {.key = "tube.contact_resistance_m2K_W",
       .unit = "m2K/W",
       .range = closed(0, 0.1),
       .fallback = "0",
       .help = "Resistance to heat between tube and core; 0 is perfect contact, the hotter and "
               "safe assumption, published values are about 0.005 to 0.01.",
       .source = "common practice, no source",
       .advice = "rate with 0"},
  };
}

std::vector<KeySpec> core_keys() {
  return {
      {.key = "core",
       .type = KeyType::table,
       .need = Need::required,
       .help = "Concrete of the column."},
      {.key = "core.strength_MPa",
       .need = Need::required,
       .unit = "MPa",
       .range = closed(10, 90),
       .example = "40",
       .help = "Cylinder strength at 20 C; Table 3.1 up to 50, the classes of Table 6.1N above.",
       .source = "en1992-1-2-2004 3.2.2, 6.1",
       .advice = "the laws of EN 1992-1-2 end at 90 MPa; give the cylinder strength in MPa"},
      {.key = "core.aggregate",
       .type = KeyType::choice,
       .fallback = "\"siliceous\"",
       .choices = {"siliceous", "calcareous"},
       .help = "Aggregate, which sets loss of strength and thermal strain.",
       .source = "en1992-1-2-2004 Table 3.1, 3.3.1"},
      {.key = "core.moisture_percent",
       .unit = "%",
       .range = closed(0, 10),
       .fallback = "3",
       .help = "Water by mass of concrete; its evaporation holds the core back near 100 C.",
       .source = "en1992-1-2-2004 3.3.2",
       .advice = "the law gives values from 0 to 10 % by mass"},
      {.key = "core.density_kg_m3",
       .unit = "kg/m3",
       .range = closed(1800, 3000),
       .fallback = "2300",
       .help = "Density at 20 C.",
       .source = "en1992-1-2-2004 3.3.2",
       .advice = "the laws hold for normal-weight concrete, in kg/m3"},
      {.key = "core.conductivity",
       .type = KeyType::choice,
       .fallback = "\"upper\"",
       .choices = {"upper", "lower", "joined"},
       .help = "Limit curve of conductivity: the two of EN 1992-1-2:2004, or joined as in the "
               "second generation.",
       .source = "en1992-1-2-2004 3.3.3"},
  };
}

std::vector<KeySpec> joined(std::vector<KeySpec> first, const std::vector<KeySpec>& second) {
  first.insert(first.end(), second.begin(), second.end());
  return first;
}

}  // namespace

std::vector<KeySpec> section_keys() {
  return joined(joined(outline_keys(), tube_keys()), core_keys());
}

}  // namespace ringward::cli
