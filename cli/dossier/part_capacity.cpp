#include <fmt/format.h>

#include <algorithm>

#include "cli/dossier/charts.hpp"
#include "cli/dossier/dossier_writer.hpp"
#include "cli/output/numbers.hpp"
#include "cli/output/rate_words.hpp"
#include "thermal/base/units.hpp"

namespace ringward::cli {
namespace {

using mechanical::Axis;
using mechanical::CapacityState;

std::string kN(double force_N) { return fixed(units::kN_from_N(force_N), kDigitsForce); }

void write_states(DossierWriter& writer) {
  HtmlTable table(writer.table_caption("Resistance at the times of classes"),
                  {{"Time", "min", CellKind::number},
                   {"Plastic", "kN", CellKind::number},
                   {"Section", "kN", CellKind::number},
                   {"Member (capacity)", "kN", CellKind::number},
                   {"Load", "kN", CellKind::number},
                   {"Load over capacity", "", CellKind::number}});
  for (const CapacityState& state : writer.data.states) {
    table.add({shortest(units::min_from_s(state.time_s)), kN(state.plastic_N), kN(state.section_N),
               kN(state.capacity_N), kN(state.demand_N), fixed(state.utilisation, 3)});
  }
  writer.page.table(table);
  writer.page.paragraph(
      "Plastic: sum of area times hot strength, core unconfined. Section: the largest axial force "
      "at zero curvature over all strains, thermal strains included, with the confinement model "
      "used. Member: with initial bow, eccentricity and second-order moment, on the equilibrium "
      "that the column stands on; it decides the fire resistance.");
}

bool has_diagrams(const DossierData& data, Axis axis) {
  return std::any_of(data.diagrams.begin(), data.diagrams.end(),
                     [axis](const auto& diagram) { return diagram.axis == axis; });
}

}  // namespace

void write_capacity(DossierWriter& writer) {
  const DossierData& data = writer.data;
  writer.part("Capacity");
  const std::string range =
      data.other_models.empty() ? "" : " The shaded range lies between the confinement models.";
  writer.page.figure(
      capacity_chart(data),
      writer.figure_caption("Capacity of the member against time, with the load." + range));
  write_states(writer);
  for (const Axis axis : {Axis::x, Axis::y}) {
    if (!has_diagrams(data, axis)) continue;
    const std::string name = axis == Axis::x ? "x" : "y";
    writer.page.figure(
        interaction_chart(data, axis),
        writer.figure_caption(fmt::format(
            "N-M diagrams of the section for bending along {}. A positive moment compresses the "
            "+{} side. The load stands at its first-order moment at mid-height, initial bow of {} "
            "mm included; second-order moments are not in this point but in the capacity.",
            name, name, shortest(rounded(data.column().member.imperfection_m * 1e3, 2)))));
  }
}

void write_tube(DossierWriter& writer) {
  const DossierData& data = writer.data;
  writer.part("The tube");
  if (!data.section().tube) {
    writer.page.paragraph("The column has no tube.");
    return;
  }
  if (!has_confining_tube(data.report)) {
    writer.page.paragraph(
        "The tube of this column is not credited with confining the core: only a round tube that "
        "carries no axial load is.");
    return;
  }
  writer.page.figure(
      hoop_chart(data),
      writer.figure_caption("Hoop stress of the tube against time, as long as it grips; points "
                            "every half minute for ten minutes, then every five minutes."));
  writer.page.figure(pressure_chart(data),
                     writer.figure_caption("Lateral pressure on the core against time."));
  HtmlTable table(writer.table_caption("What the tube does under the applied load"),
                  {{"Event"}, {"Time", "min", CellKind::number}});
  for (const mechanical::TubeEvent& event : data.report.rating.chosen.events) {
    table.add({event_word(event.kind), tenths_down(minutes_down(event.time_s))});
  }
  if (table.is_empty()) {
    writer.page.paragraph(
        "Under the applied load the tube keeps contact with the core, and its "
        "end gaps stay open.");
  } else {
    writer.page.table(table);
  }
}

}  // namespace ringward::cli
