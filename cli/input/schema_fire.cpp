#include "cli/input/schema_tables.hpp"

namespace ringward::cli {
namespace {

const char* const kTemperatures = "temperatures are in deg C";
const char* const kAngles = "angles are in degrees, anticlockwise from +x";

std::vector<KeySpec> exposure_keys() {
  const std::vector<std::string> faces = {"left", "right", "bottom", "top"};
  return {
      {.key = "fire",
       .type = KeyType::table,
       .need = Need::required,
       .help = "The fire, and the parts of the column that see it."},
      {.key = "fire.curve",
       .type = KeyType::choice,
       .need = Need::required,
       .choices = {"standard", "external", "hydrocarbon", "slow", "astm-e119", "parametric",
                   "table", "constant"},
       .example = "\"standard\"",
       .help = "Gas temperature against time: standard (ISO 834), external, hydrocarbon, slow "
               "(EN 1363-2), astm-e119, parametric (EN 1991-1-2 Annex A), a table of points, or "
               "constant.",
       .source = "en1991-1-2-2002 3.2"},
      {.key = "fire.exposed",
       .type = KeyType::choice_or_list,
       .fallback = "\"all\"",
       .choices = faces,
       .help = "Heated faces: \"all\", or a list of left (-x), right (+x), bottom (-y), top (+y); "
               "the others lose heat to ambient unless built in."},
      {.key = "fire.built_in",
       .type = KeyType::choice_list,
       .computed = "no face",
       .choices = faces,
       .example = "[\"left\"]",
       .help = "Faces against a wall that shares the heat: no heat flow."},
      {.key = "fire.arc_deg",
       .type = KeyType::number_pair,
       .unit = "deg",
       .range = closed(-720, 720),
       .computed = "heated all round",
       .example = "[0, 180]",
       .help = "Circular sections: the heated arc [from, to], anticlockwise from +x, `to` raised "
               "by 360 while not above `from`; instead of exposed.",
       .advice = kAngles},
      {.key = "fire.built_in_arc_deg",
       .type = KeyType::number_pair,
       .unit = "deg",
       .range = closed(-720, 720),
       .computed = "no arc",
       .example = "[200, 340]",
       .help = "Circular sections: the arc against a wall that shares the heat: no heat flow.",
       .advice = kAngles},
      {.key = "fire.duration_min",
       .unit = "min",
       .range = closed(1, 1440),
       .fallback = "240",
       .help = "How long the fire is followed, cooling included.",
       .advice = "times are in minutes"},
  };
}

std::vector<KeySpec> curve_keys() {
  return {
      {.key = "fire.parametric",
       .type = KeyType::table,
       .need = Need::required,
       .only_if = {"fire.curve", "parametric"},
       .help = "The parametric fire of EN 1991-1-2 Annex A."},
      {.key = "fire.parametric.opening_m05",
       .need = Need::required,
       .unit = "m^0.5",
       .range = above(0, 1),
       .example = "0.04",
       .help = "Opening factor A_v sqrt(h_eq) / A_t; the annex covers 0.02 to 0.20.",
       .source = "en1991-1-2-2002 Annex A",
       .advice = "the annex covers 0.02 to 0.20"},
      {.key = "fire.parametric.fire_load_enclosure_MJ_m2",
       .need = Need::required,
       .unit = "MJ/m2",
       .range = above(0, 10000),
       .example = "200",
       .help = "Fire load q_t,d per m2 of the whole enclosure surface A_t, not of the floor; the "
               "annex covers 50 to 1000.",
       .source = "en1991-1-2-2002 Annex A",
       .advice = "the annex covers 50 to 1000 MJ per m2 of enclosure surface"},
      {.key = "fire.parametric.thermal_inertia_J_m2s05K",
       .need = Need::required,
       .unit = "J/m2s^0.5K",
       .range = above(0, 10000),
       .example = "1160",
       .help = "Thermal inertia b = sqrt(rho c lambda) of the enclosure; the annex covers 100 to "
               "2200.",
       .source = "en1991-1-2-2002 Annex A",
       .advice = "the annex covers 100 to 2200"},
      {.key = "fire.parametric.growth",
       .type = KeyType::choice,
       .fallback = "\"medium\"",
       .choices = {"slow", "medium", "fast"},
       .help = "Fire growth rate: t_lim of 25, 20 or 15 min.",
       .source = "en1991-1-2-2002 Annex A"},
      {.key = "fire.points_min_C",
       .type = KeyType::pair_list,
       .unit = "deg C",
       .range = closed(-50, 2000),
       .computed = "required for curve = \"table\" without points_csv",
       .only_if = {"fire.curve", "table"},
       .example = "[[0, 20], [10, 680], [60, 940], [120, 20]]",
       .help = "Gas temperatures as [time in min, T in deg C], times increasing; linear between "
               "points, constant after the last.",
       .advice = kTemperatures},
      {.key = "fire.points_csv",
       .type = KeyType::text,
       .computed = "required for curve = \"table\" without points_min_C",
       .only_if = {"fire.curve", "table"},
       .example = "\"fire.csv\"",
       .help = "The same points from a file, relative to the column file: time_min,temperature_C "
               "on each line, with or without that header."},
      {.key = "fire.constant_C",
       .need = Need::required,
       .unit = "deg C",
       .range = closed(20, 1500),
       .only_if = {"fire.curve", "constant"},
       .example = "1000",
       .help = "Gas temperature of a constant fire.",
       .advice = kTemperatures},
  };
}

std::vector<KeySpec> surface_keys() {
  return {
      {.key = "fire.surface",
       .type = KeyType::table,
       .need = Need::defaulted,
       .help = "Heat transfer at the heated surface."},
      {.key = "fire.surface.emissivity",
       .range = closed(0, 1),
       .fallback = "0.7",
       .help = "Emissivity of the surface times that of the fire.",
       .source = "en1991-1-2-2002 3.1",
       .advice = "0.7 is the value of EN 1991-1-2"},
      {.key = "fire.surface.convection_W_m2K",
       .unit = "W/m2K",
       .range = closed(0, 500),
       .computed = "by curve: 50 hydrocarbon, 35 parametric and table, 25 the others",
       .example = "25",
       .help = "Convection coefficient at the heated surface.",
       .source = "en1991-1-2-2002 3.2, 3.3",
       .advice = "EN 1991-1-2 gives 25 to 50"},
      {.key = "fire.ambient",
       .type = KeyType::table,
       .need = Need::defaulted,
       .help = "Surroundings of the faces that are not exposed."},
      {.key = "fire.ambient.temperature_C",
       .unit = "deg C",
       .range = closed(0, 60),
       .fallback = "20",
       .help = "Ambient temperature, also the initial temperature of the section.",
       .advice = "the material laws start at 20 deg C"},
      {.key = "fire.ambient.convection_W_m2K",
       .unit = "W/m2K",
       .range = closed(0, 100),
       .fallback = "9",
       .help = "Heat transfer coefficient of unexposed faces, radiation included.",
       .source = "en1991-1-2-2002 3.1",
       .advice = "EN 1991-1-2 gives 9 with radiation included"},
  };
}

}  // namespace

std::vector<KeySpec> fire_keys() {
  std::vector<KeySpec> keys = exposure_keys();
  for (const auto& part : {curve_keys(), surface_keys()}) {
    keys.insert(keys.end(), part.begin(), part.end());
  }
  return keys;
}

}  // namespace ringward::cli
