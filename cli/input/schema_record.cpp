#include "cli/input/schema_tables.hpp"

namespace ringward::cli {
namespace {

KeySpec record_text(const std::string& leaf, const std::string& example, const std::string& help) {
  return {.key = "submission." + leaf,
          .type = KeyType::text,
          .computed = "left blank",
          .example = "\"" + example + "\"",
          .help = help};
}

KeySpec factor(const std::string& leaf, const std::string& material, const std::string& source) {
  return {
      .key = "rating." + leaf,
      .range = closed(0.5, 2),
      .fallback = "1.0",
      .help = "Material factor of " + material + " in the fire situation; national annexes differ.",
      .source = source,
      .advice = "the recommended value is 1.0"};
}

}  // namespace

std::vector<KeySpec> record_keys() {
  return {
      {.key = "rating",
       .type = KeyType::table,
       .need = Need::defaulted,
       .help = "What the column has to reach."},
      {.key = "rating.required_min",
       .unit = "min",
       .range = above(0, 1440),
       .computed = "nothing required",
       .example = "60",
       .help = "Required fire resistance; not longer than fire.duration_min.",
       .advice = "times are in minutes"},
      factor("gamma_concrete", "concrete", "en1992-1-2-2004 2.3"),
      factor("gamma_bar", "reinforcing bars", "en1992-1-2-2004 2.3"),
      factor("gamma_steel", "tube and steel shape", "en1993-1-2-2005 2.3"),
      {.key = "numerics",
       .type = KeyType::table,
       .need = Need::defaulted,
       .help = "How finely the column is computed."},
      {.key = "numerics.accuracy",
       .type = KeyType::choice,
       .fallback = "\"standard\"",
       .choices = {"coarse", "standard", "fine"},
       .help = "Grid and time tolerance of the heat flow; results state their numerical "
               "uncertainty."},
      {.key = "submission",
       .type = KeyType::table,
       .help = "Particulars for the submission to code review; kept, not used in the rating."},
      record_text("project", "Invented project", "Name of the project."),
      record_text("element", "Column C1", "Name of the element in the project."),
      record_text("author", "A. Author", "Who made the calculation."),
      record_text("checker", "C. Checker", "Who checked it."),
      record_text("revision", "A", "Revision of the submission."),
      record_text("date", "2025-01-01", "Date of the submission, as text."),
      record_text("authority", "Invented authority", "Authority that it goes to."),
      {.key = "sensitivity",
       .type = KeyType::ranges_by_key,
       .example = "\"core.moisture_percent\" = [1.5, 10]",
       .help = "Low and high value for each uncertain input, as \"key\" = [low, high]; kept for "
               "the sensitivity study.",
       .advice = "write \"core.moisture_percent\" = [1.5, 10]"},
  };
}

}  // namespace ringward::cli
