#include <fmt/format.h>

#include "cli/dossier/dossier_writer.hpp"
#include "cli/output/numbers.hpp"
#include "cli/output/rate_words.hpp"
#include "thermal/base/units.hpp"

namespace ringward::cli {
namespace {

std::string signed_minutes(double minutes) {
  const double shown = rounded(minutes, 1);
  return (shown > 0 ? "+" : "") + fixed(shown, 1);
}

// With the uncertainty left out on both sides, because both come from the same grid.
std::vector<std::string> row_of(const AssumptionRow& row, const RateReport& report) {
  const Verdict& verdict = report.verdict;
  const OtherChoice& choice = row.choice;
  std::vector<std::string> cells{choice.what, choice.used, choice.other};
  if (!row.has_result()) {
    cells.insert(cells.end(), {"no result: " + row.problem, ""});
  } else if (row.survives) {
    cells.insert(cells.end(),
                 {"above " + tenths_down(units::min_from_s(report.rating.followed_s)), "survives"});
  } else {
    cells.push_back(tenths_down(*row.fire_resistance_min));
    cells.push_back(verdict.survives()
                        ? "fails"
                        : signed_minutes(*row.fire_resistance_min - *verdict.fire_resistance_min));
  }
  cells.push_back(choice.why);
  return cells;
}

}  // namespace

void write_assumptions(DossierWriter& writer) {
  HtmlPage& page = writer.page;
  writer.part("Assumptions and what they are worth");
  page.paragraph(
      "The column was rated again with each other choice alone, on the same grid. The last numbers "
      "are the change of the fire resistance: negative where the other choice is the worse one.");
  HtmlTable table(writer.table_caption("Other choices, each rated by itself"),
                  {{"Assumption"},
                   {"Used"},
                   {"Other choice"},
                   {"Fire resistance", "min", CellKind::number},
                   {"Change", "min", CellKind::number},
                   {"Why the first was used"}});
  for (const AssumptionRow& row : writer.data.assumptions) {
    table.add(row_of(row, writer.data.report));
  }
  page.table(table);
  if (has_confining_tube(writer.data.report)) {
    page.paragraph("Confinement models: " + band_words(writer.data.report) +
                   ". \"none\" takes no help from the tube, \"contact\" only what the tube gives "
                   "where the core's own dilation presses on it, \"yield\" the full pressure of a "
                   "yielding tube whatever the strain.");
  }
  page.heading(3, "Assumed for every column, without another choice");
  page.list({"One column between hinges at the ends of its buckling length; the load is constant.",
             "Plane sections; full bond of the bars; the bars have the temperature of the concrete "
             "at their axis and do not buckle.",
             "The temperature does not vary along the column.",
             "The concrete does not spall and carries no tension; its creep under heating is "
             "contained in the stress-strain law.",
             "Bars, steel shape and tube win back no strength in cooling; concrete loses a further "
             "share.",
             "Material strengths are those given, divided by the material factors of the table of "
             "inputs."});
}

}  // namespace ringward::cli
