#include "cli/output/capacity_report.hpp"

#include <functional>
#include <nlohmann/json.hpp>

#include "cli/input/text_wrap.hpp"
#include "cli/output/cautions.hpp"
#include "cli/output/csv.hpp"
#include "cli/output/json_number.hpp"
#include "cli/output/numbers.hpp"
#include "cli/output/text_table.hpp"
#include "thermal/base/units.hpp"

namespace ringward::cli {
namespace {

using mechanical::CapacityState;
using mechanical::ConfinementModel;

struct Column {
  std::string key;
  TextTable::Column shown;
  int digits = 0;  // in JSON and CSV
  std::function<double(const CapacityState&)> value;
};

Column force(const char* key, const char* heading, double CapacityState::*force_N) {
  return {key, {heading, "kN", 1}, kDigitsForce, [force_N](const CapacityState& state) {
            return units::kN_from_N(state.*force_N);
          }};
}

std::vector<Column> make_columns() {
  return {{"time_min",
           {"time", "min", kDigitsMinutes},
           kDigitsMinutes,
           [](const CapacityState& s) { return units::min_from_s(s.time_s); }},
          force("plastic_kN", "plastic", &CapacityState::plastic_N),
          force("section_kN", "section", &CapacityState::section_N),
          force("capacity_kN", "capacity", &CapacityState::capacity_N),
          force("reserve_kN", "reserve", &CapacityState::reserve_N),
          force("demand_kN", "load", &CapacityState::demand_N),
          {"utilisation",
           {"use", "-", 3},
           kDigitsRatio,
           [](const CapacityState& s) { return s.utilisation; }},
          {"lateral_pressure_MPa", {"press.", "MPa", 2}, kDigitsMPa, [](const CapacityState& s) {
             return units::MPa_from_Pa(s.lateral_pressure_Pa);
           }}};
}

const std::vector<Column>& columns() {
  static const std::vector<Column> list = make_columns();
  return list;
}

std::string state_table(const CapacityReport& report) {
  std::vector<TextTable::Column> shown;
  for (const Column& column : columns()) shown.push_back(column.shown);
  TextTable table(shown);
  for (const CapacityState& state : report.states) {
    std::vector<std::optional<double>> row;
    for (const Column& column : columns()) row.emplace_back(column.value(state));
    table.add(row);
  }
  return table.text();
}

std::string legend() {
  const auto entry = [](const std::string& name, const std::string& meaning) {
    return "  " + name + std::string(10 - name.size(), ' ') +
           wrapped(meaning, 12, std::string(12, ' ')) + "\n";
  };
  return entry("plastic", "sum of area times hot strength, core unconfined") +
         entry("section", "largest axial force of the section at zero curvature") +
         entry("capacity",
               "the member with imperfection, eccentricity and second-order moment, on the path it "
               "stands on") +
         entry("reserve", "the member's largest over all strains; never the rating") +
         entry("press.", "pressure of the tube on the core at the capacity");
}

}  // namespace

std::string confinement_word(ConfinementModel model) {
  switch (model) {
    case ConfinementModel::none:
      return "none";
    case ConfinementModel::contact:
      return "contact";
    case ConfinementModel::yield:
      return "yield";
  }
  return "";
}

std::string capacity_text(const CapacityReport& report, const Style& style) {
  return style.bold(report.title) + "\n\n  Resistance in the fire \"" + report.fire +
         "\", confinement model \"" + confinement_word(report.confinement) + "\"\n\n" +
         state_table(report) + "\n" + legend() + "\n" + notices_text(report.notices, style) +
         standing_cautions(CautionForm::full, style);
}

std::string capacity_json(const CapacityReport& report) {
  nlohmann::ordered_json states = nlohmann::ordered_json::array();
  for (const CapacityState& state : report.states) {
    nlohmann::ordered_json entry;
    for (const Column& column : columns()) {
      entry[column.key] = json_number(column.value(state), column.digits);
    }
    states.push_back(std::move(entry));
  }
  return json_text({{"schema", "ringward-capacity/1"},
                    {"title", report.title},
                    {"states", states},
                    {"notices", json_notices(report.notices)}});
}

std::string capacity_csv(const CapacityReport& report) {
  std::vector<std::string> header;
  for (const Column& column : columns()) header.push_back(column.key);
  CsvTable table(header);
  for (const CapacityState& state : report.states) {
    std::vector<std::string> cells;
    for (const Column& column : columns()) {
      cells.push_back(csv_number(column.value(state), column.digits));
    }
    table.add(cells);
  }
  return table.text();
}

}  // namespace ringward::cli
