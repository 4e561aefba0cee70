#include <fmt/format.h>

#include <cmath>

#include "cli/dossier/dossier_writer.hpp"
#include "cli/output/numbers.hpp"
#include "cli/output/rate_words.hpp"
#include "thermal/base/units.hpp"

namespace ringward::cli {
namespace {

std::string kN(double force_N) { return fixed(units::kN_from_N(force_N), kDigitsForce); }

std::vector<std::string> row_of(const HandCheckRow& row) {
  return {row.part,
          row.range,
          fixed(row.area_m2 * 1e6, 0),
          fixed(row.mean_C, 1),
          fixed(row.factor, 4),
          fixed(units::MPa_from_Pa(row.strength_Pa), 1),
          kN(row.force_N)};
}

// Why the section cannot have all strengths at once, or has more.
std::string difference_words(const DossierData& data) {
  const double plastic_N = data.hand_check_state.plastic_N;
  const double section_N = data.hand_check_state.section_N;
  const std::string figures =
      fmt::format("The program's section value at this time is {} kN, {} % {} the plastic sum. ",
                  kN(section_N), fixed(100 * std::abs(section_N / plastic_N - 1), 1),
                  section_N < plastic_N ? "below" : "above");
  if (section_N < plastic_N) {
    return figures +
           "The sum lets every layer reach its strength. In the section all layers share one "
           "strain, each less or more by its own thermal strain: cold concrete reaches its peak at "
           "a small strain, hot concrete and steel only at a large one, so they do not reach their "
           "strengths together.";
  }
  return figures +
         "The sum takes the core unconfined; the section value takes the pressure of the tube of "
         "the confinement model used.";
}

void write_member_words(const DossierWriter& writer) {
  const mechanical::CapacityState& state = writer.data.hand_check_state;
  writer.page.paragraph(fmt::format(
      "The member carries {} kN at this time, less than the section, because of the initial bow, "
      "any eccentricity, and the second-order moment.",
      kN(state.capacity_N)));
}

}  // namespace

void write_hand_check(DossierWriter& writer) {
  const DossierData& data = writer.data;
  const HandCheck& check = data.hand_check;
  const std::string time = shortest(minutes_down(check.time_s));
  writer.part("Hand check at " + time + " min");
  writer.citing_paragraph(
      "The plastic resistance of the section, to be redone with a calculator: area times factor "
      "times strength, added up. Each row holds all of a material within one range of temperature. "
      "The ranges end at the points of the strength tables [en1992-1-2-2004 Table 3.1, Table 3.2a; "
      "en1993-1-2-2005 Table 3.1], so the factor is read off the table at the mean temperature, "
      "linearly between the points.");
  if (check.has_cooled) {
    writer.citing_paragraph(
        "Parts of the section have been hotter than they are at this time. Their strength is that "
        "of the highest temperature, less the further loss of concrete in cooling "
        "[en1994-1-2-2005 Annex C]: these factors cannot be read off at the temperature printed.");
  }
  HtmlTable table(writer.table_caption("Plastic resistance at " + time + " min, row by row"),
                  {{"Part"},
                   {"Temperature"},
                   {"Area", "mm\xC2\xB2", CellKind::number},
                   {"Mean temperature",
                    "\xC2\xB0"
                    "C",
                    CellKind::number},
                   {"Factor", "", CellKind::number},
                   {"Strength at 20 C", "MPa", CellKind::number},
                   {"Force", "kN", CellKind::number}});
  for (const HandCheckRow& row : check.rows) table.add(row_of(row));
  table.add({"Sum", "", "", "", "", "", kN(check.total_N)});
  writer.page.table(table);
  writer.citing_paragraph("The program's plastic resistance is " +
                          kN(data.hand_check_state.plastic_N) + " kN. " + difference_words(data));
  write_member_words(writer);
}

}  // namespace ringward::cli
