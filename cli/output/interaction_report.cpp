#include "cli/output/interaction_report.hpp"

#include <algorithm>
#include <nlohmann/json.hpp>

#include "cli/output/cautions.hpp"
#include "cli/output/csv.hpp"
#include "cli/output/json_number.hpp"
#include "cli/output/numbers.hpp"
#include "cli/output/text_table.hpp"
#include "thermal/base/units.hpp"

namespace ringward::cli {
namespace {

using mechanical::Axis;
using mechanical::InteractionDiagram;
using mechanical::InteractionPoint;
using nlohmann::ordered_json;

constexpr int kDigitsMoment = 2;

std::string axis_word(Axis axis) { return axis == Axis::x ? "x" : "y"; }

std::string corner_line(const std::string& what, const InteractionPoint& point) {
  return "  " + what + std::string(32 - what.size(), ' ') +
         "N = " + fixed(units::kN_from_N(point.axial_N), kDigitsForce) +
         " kN, M = " + fixed(units::kNm_from_Nm(point.moment_Nm), kDigitsMoment) + " kNm\n";
}

// The four corners that a person looks for first.
std::string corners(const InteractionDiagram& diagram) {
  const auto by_axial = [](const InteractionPoint& a, const InteractionPoint& b) {
    return a.axial_N < b.axial_N;
  };
  const auto by_moment = [](const InteractionPoint& a, const InteractionPoint& b) {
    return a.moment_Nm < b.moment_Nm;
  };
  const auto [tension, compression] =
      std::minmax_element(diagram.points.begin(), diagram.points.end(), by_axial);
  const auto [negative, positive] =
      std::minmax_element(diagram.points.begin(), diagram.points.end(), by_moment);
  return corner_line("largest compression", *compression) +
         corner_line("largest tension", *tension) +
         corner_line("largest moment, + side pressed", *positive) +
         corner_line("largest moment, - side pressed", *negative);
}

std::string diagram_text(const InteractionDiagram& diagram, const Style& style) {
  const std::string heading =
      style.bold(shortest(rounded(units::min_from_s(diagram.time_s), kDigitsMinutes)) +
                 " min, eccentricity along " + axis_word(diagram.axis)) +
      "\n";
  if (diagram.points.empty()) return heading + "  the section has no resistance left\n\n";
  TextTable table({{"N", "kN", kDigitsForce}, {"M", "kNm", kDigitsMoment}});
  for (const InteractionPoint& point : diagram.points) {
    table.add({units::kN_from_N(point.axial_N), units::kNm_from_Nm(point.moment_Nm)});
  }
  return heading + corners(diagram) + "\n" + table.text() + "\n";
}

}  // namespace

std::string interaction_text(const InteractionReport& report, const Style& style) {
  std::string text =
      style.bold(report.title) + "\n\n  N-M diagrams of the section, fire \"" + report.fire +
      "\", confinement model \"" + report.confinement +
      "\"\n  Compression positive; a positive moment presses the + side of its axis. "
      "No second-order effects.\n\n";
  for (const InteractionDiagram& diagram : report.diagrams) text += diagram_text(diagram, style);
  return text + notices_text(report.notices, style) + standing_cautions(CautionForm::full, style);
}

std::string interaction_json(const InteractionReport& report) {
  ordered_json diagrams = ordered_json::array();
  for (const InteractionDiagram& diagram : report.diagrams) {
    ordered_json points = ordered_json::array();
    for (const InteractionPoint& point : diagram.points) {
      points.push_back(
          {{"axial_kN", json_number(units::kN_from_N(point.axial_N), kDigitsForce)},
           {"moment_kNm", json_number(units::kNm_from_Nm(point.moment_Nm), kDigitsMoment)}});
    }
    diagrams.push_back(
        {{"time_min", json_number(units::min_from_s(diagram.time_s), kDigitsMinutes)},
         {"axis", axis_word(diagram.axis)},
         {"points", points}});
  }
  return json_text({{"schema", "ringward-interaction/1"},
                    {"title", report.title},
                    {"diagrams", diagrams},
                    {"notices", json_notices(report.notices)}});
}

std::string interaction_csv(const InteractionReport& report) {
  CsvTable table({"time_min", "axis", "axial_kN", "moment_kNm"});
  for (const InteractionDiagram& diagram : report.diagrams) {
    for (const InteractionPoint& point : diagram.points) {
      table.add({csv_number(units::min_from_s(diagram.time_s), kDigitsMinutes),
                 axis_word(diagram.axis), csv_number(units::kN_from_N(point.axial_N), kDigitsForce),
                 csv_number(units::kNm_from_Nm(point.moment_Nm), kDigitsMoment)});
    }
  }
  return table.text();
}

}  // namespace ringward::cli
