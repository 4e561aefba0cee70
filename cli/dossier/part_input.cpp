#include <fmt/format.h>

#include "cli/dossier/dossier_writer.hpp"
#include "cli/dossier/section_drawing.hpp"
#include "cli/input/schema.hpp"
#include "cli/output/numbers.hpp"

namespace ringward::cli {
namespace {

std::string pair_words(const NumberPair& pair) {
  return "[" + shortest(pair[0]) + ", " + shortest(pair[1]) + "]";
}

struct ValueWords {
  std::string operator()(std::monostate) const { return "none"; }
  std::string operator()(double value) const { return shortest(rounded(value, 6)); }
  std::string operator()(const std::string& value) const { return value; }
  std::string operator()(const std::vector<std::string>& values) const {
    return fmt::format("{}", fmt::join(values, ", "));
  }
  std::string operator()(const NumberPair& pair) const { return pair_words(pair); }
  std::string operator()(const std::vector<NumberPair>& pairs) const {
    std::string words;
    for (const NumberPair& pair : pairs) words += (words.empty() ? "" : ", ") + pair_words(pair);
    return words;
  }
};

// What has no bearing on the rating stands elsewhere.
bool is_listed(const EchoEntry& entry) {
  return entry.key != "title" && entry.key.rfind("submission", 0) != 0 &&
         entry.key.rfind("sensitivity", 0) != 0;
}

std::vector<std::string> row_of(const EchoEntry& entry) {
  const KeySpec* spec = find_key(schema_spelling(entry.key));
  const std::string unit = spec != nullptr ? spec->unit : "";
  const std::string value = std::visit(ValueWords{}, entry.value);
  return {entry.key, value + (unit.empty() || value == "none" ? "" : " " + unit),
          entry.given ? "given" : "default", spec != nullptr ? spec->help : "",
          spec != nullptr ? spec->source : ""};
}

}  // namespace

void write_section(DossierWriter& writer) {
  const DossierData& data = writer.data;
  writer.part("Section");
  const int scale = drawing_scale(data.section());
  const std::string message =
      "Cross-section with outline, tube, bars, cover, protection and the faces that see the fire; "
      "the figures stand beside it and in the table of inputs.";
  writer.page.figure(
      section_drawing({"section", "The cross-section to scale", message}, data.section(),
                      data.report.input.fire.exposed),
      writer.figure_caption(fmt::format(
          "Cross-section, scale 1 to {} where the page is printed at its size; lengths in mm. The "
          "column is {} mm long, its buckling length in the fire is {} mm.",
          scale, shortest(rounded(data.column().member.length_m * 1e3, 1)),
          shortest(rounded(data.column().member.buckling_length_m * 1e3, 1)))));
}

void write_input(DossierWriter& writer) {
  writer.part("Input");
  writer.page.paragraph(
      "Every value that the calculation used. \"Given\" stands in the input file or on the command "
      "line; all else is a default of the program. The source is that of the default or of the law "
      "that takes the value; a key in it is resolved in the list of sources.");
  HtmlTable table(writer.table_caption("Input"), {{.name = "Key", .share_percent = 25},
                                                  {.name = "Value", .share_percent = 14},
                                                  {.name = "Origin", .share_percent = 11},
                                                  {.name = "Meaning", .share_percent = 31},
                                                  {.name = "Source", .share_percent = 19}});
  for (const EchoEntry& entry : writer.data.report.input.echo) {
    if (!is_listed(entry)) continue;
    const std::vector<std::string> row = row_of(entry);
    writer.cited += row.back() + "\n";
    table.add(row);
  }
  writer.page.table(table);
}

}  // namespace ringward::cli
