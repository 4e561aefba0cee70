#include <fmt/format.h>

#include <filesystem>

#include "cli/dossier/dossier_writer.hpp"
#include "cli/dossier/source_list.hpp"
#include "cli/output/cautions.hpp"
#include "cli/output/evidence_report.hpp"
#include "cli/output/rate_words.hpp"

namespace ringward::cli {
namespace {

std::string read_words(const std::string& read) {
  if (read == "text") return "the passage was read";
  if (read == "abstract") return "only the abstract was read";
  if (read == "computed") return "values computed independently";
  return "from memory: compare with the text";
}

std::string with_comma(const std::string& text) { return text.empty() ? "" : ", " + text; }

// For a shell, as it would have to be typed.
std::string quoted(const std::string& word) {
  std::string text = "'";
  for (const char c : word) text += c == '\'' ? std::string("'\\''") : std::string(1, c);
  return text + "'";
}

std::string file_name(const InputSource& source) {
  const std::string name = std::filesystem::path(source.name).filename().string();
  return source.name == "stdin" || name.empty() ? "column.toml" : name;
}

std::string command(const DossierData& data, const std::string& rest) {
  std::string words = "ringward " + rest + " " + quoted(file_name(data.source));
  for (const std::string& assignment : data.overrides) words += " --set " + quoted(assignment);
  return words;
}

}  // namespace

void write_evidence(DossierWriter& writer) {
  writer.part("Evidence");
  writer.page.paragraph(
      "Published values that this program was held against when this page was made: " +
      tally(writer.data.evidence) +
      ". A gap is a published figure that is not met within its tolerance; each has its reason. "
      "\"ringward evidence\" prints them all with expected value, computed value, tolerance and "
      "source.");
  HtmlTable table(writer.table_caption("Published checks by group"),
                  {{"Group"},
                   {"Checks", "", CellKind::number},
                   {"Pass", "", CellKind::number},
                   {"Gap", "", CellKind::number}});
  for (const ResultBlock& block : by_group(writer.data.evidence)) {
    std::size_t passes = 0;
    for (const CheckResult& result : block.results) passes += result.passes ? 1 : 0;
    table.add({block.title, std::to_string(block.results.size()), std::to_string(passes),
               std::to_string(block.results.size() - passes)});
  }
  writer.page.table(table);
}

void write_limits(DossierWriter& writer) {
  writer.part("Limits of use and notices");
  writer.page.list(
      {"Left out: spalling; joints, and the bare ring of core at a tube's end gaps; vent holes and "
       "steam pressure; restraint and redistribution by the rest of the building; construction "
       "defects; shear and torsion; local buckling of the wall and buckling of bars; impact, "
       "explosion, earthquake before the fire.",
       "Concrete of normal weight up to 90 MPa; no lightweight concrete, no stainless steel.",
       "Confinement is credited to round tubes that carry no axial load, and to no others.",
       "In cooling the calculation is meant to be safe, not fine."});
  HtmlTable table(writer.table_caption("Every notice of this calculation"),
                  {{"Kind"}, {"Notice"}, {"Source"}});
  for (const Notice& notice : ordered_notices(writer.data.report.notices)) {
    table.add(
        {notice.severity == Severity::caution ? "caution" : "note", notice.text, notice.source});
    writer.cited += notice.source + "\n";
  }
  if (!table.is_empty()) writer.page.table(table);
}

void write_checklist(DossierWriter& writer) {
  const thermal::Section& section = writer.data.section();
  writer.part("Checklist for the reviewer");
  std::vector<std::string> items{
      "Section, materials, length and load of the input agree with the drawings and with the "
      "design "
      "for the fire situation.",
      "The load is that of the fire situation, with its combination factors.",
      "The buckling length suits the frame, and its ends stay cold.",
      "The exposed faces and the fire are those of the building.",
      "Every default in the table of inputs is accepted for this column.",
      "The worst row of the table of other choices is accepted, or excluded for a reason.",
      "Cover and aggregate make spalling unlikely, or it is dealt with elsewhere.",
      "The hand check was redone and agrees.",
      "The calculation was run again and agrees (next part).",
      "The margin is enough for the error of the models, for which no number is given."};
  if (section.tube) {
    items.push_back("The tube has vent holes at the top and bottom of each storey.");
    items.push_back("The joints at the tube's ends, and the concrete bare there, are designed.");
  }
  if (section.protection) {
    items.push_back(
        "The protection has test data for its properties, and stays on for the "
        "whole time.");
  }
  if (!section.bars.empty()) items.push_back("Ties or the tube keep the bars from buckling.");
  Markup entries;
  for (const std::string& item : items) entries += Markup::element("li", Markup::text(item));
  writer.page.block(Markup::own("<ul class=\"checklist\">" + entries.html() + "</ul>"));
}

void write_reproduction(DossierWriter& writer) {
  const DossierData& data = writer.data;
  writer.part("How to reproduce this");
  writer.page.paragraph(
      "Ringward " RINGWARD_VERSION
      " with the input below gives these figures, and this page byte by byte where the same "
      "version of gnuplot draws the curves. The SHA-256 is that of the input file, followed by the "
      "overrides of the command line and the points of a fire from a CSV file where there are "
      "any.");
  writer.page.verbatim(command(data, "dossier") + " -o dossier.html\n" + command(data, "rate") +
                       "\nsha256: " + data.report.input.input_sha256);
  writer.page.heading(3, "The input file");
  writer.page.verbatim(data.source.text);
}

void write_sources(DossierWriter& writer) {
  writer.part("Sources");
  writer.page.paragraph(
      "The keys used above. Where a text was not at hand, formulas and tables were written from "
      "memory and say so; whoever has the text should compare.");
  HtmlTable table(writer.table_caption("Sources"), {{"Key"}, {"Source"}, {"How it was read"}});
  for (const ListedSource& source : sources_cited_in(writer.cited)) {
    table.add({source.key,
               source.author + with_comma(source.title) + with_comma(source.edition) +
                   with_comma(source.year),
               read_words(source.read)});
  }
  writer.page.table(table);
}

}  // namespace ringward::cli
