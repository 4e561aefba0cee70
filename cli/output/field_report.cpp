#include "cli/output/field_report.hpp"

#include <fmt/format.h>

#include <nlohmann/json.hpp>

#include "cli/output/cautions.hpp"
#include "cli/output/csv.hpp"
#include "cli/output/json_number.hpp"
#include "cli/output/numbers.hpp"
#include "cli/output/text_table.hpp"
#include "thermal/base/units.hpp"

namespace ringward::cli {
namespace {

using nlohmann::ordered_json;

constexpr int kDigitsLength = 3;  // of a mm

std::string section_table(const FieldReport& report) {
  std::vector<TextTable::Column> columns{{"time", "min", kDigitsMinutes},
                                         {"gas", "C", 0},
                                         {"tube", "C", 1},
                                         {"face", "C", 1},
                                         {"centre", "C", 1}};
  for (std::size_t group = 0; group < report.section.bars.size(); ++group) {
    columns.push_back({fmt::format("bars[{}] max", group), "C", 1});
    columns.push_back({fmt::format("bars[{}] min", group), "C", 1});
  }
  TextTable table(columns);
  for (const FieldState& state : report.field.states) {
    std::vector<std::optional<double>> row{units::min_from_s(state.time_s), state.gas_C,
                                           state.tube_C, state.core_face_C, state.core_centre_C};
    for (const BarGroupRange& bars : state.bars) {
      row.insert(row.end(), {bars.hottest_C, bars.coldest_C});
    }
    table.add(row);
  }
  return table.text() +
         "  tube: mean of the wall where it is hottest; face: hottest point of the core's face\n\n";
}

std::string probe_table(const FieldReport& report, const Style& style) {
  if (report.field.probes.empty()) return "";
  TextTable table({{"time", "min", kDigitsMinutes},
                   {"x", "mm", kDigitsLength},
                   {"y", "mm", kDigitsLength},
                   {"probe", "C", kDigitsFieldTemperature}});
  for (const FieldState& state : report.field.states) {
    for (std::size_t k = 0; k < report.field.probes.size(); ++k) {
      const thermal::Point& probe = report.field.probes[k];
      table.add({units::min_from_s(state.time_s), units::mm_from_m(probe.x_m),
                 units::mm_from_m(probe.y_m), state.probes_C[k]});
    }
  }
  return style.bold("Probes") + "\n" + table.text() + "\n";
}

ordered_json bars_json(const FieldReport& report, const FieldState& state) {
  ordered_json groups = ordered_json::array();
  for (std::size_t group = 0; group < state.bars.size(); ++group) {
    groups.push_back(
        {{"group", group},
         {"count", report.section.bars[group].positions.size()},
         {"max_C", json_number(state.bars[group].hottest_C, kDigitsFieldTemperature)},
         {"min_C", json_number(state.bars[group].coldest_C, kDigitsFieldTemperature)}});
  }
  return groups;
}

ordered_json probes_json(const Field& field, const FieldState& state) {
  ordered_json probes = ordered_json::array();
  for (std::size_t k = 0; k < field.probes.size(); ++k) {
    probes.push_back({{"x_mm", json_number(units::mm_from_m(field.probes[k].x_m), kDigitsLength)},
                      {"y_mm", json_number(units::mm_from_m(field.probes[k].y_m), kDigitsLength)},
                      {"temperature_C", json_number(state.probes_C[k], kDigitsFieldTemperature)}});
  }
  return probes;
}

ordered_json state_json(const FieldReport& report, const FieldState& state) {
  const auto T_C = [](const std::optional<double>& value) {
    return json_number(value, kDigitsFieldTemperature);
  };
  return {{"time_min", json_number(units::min_from_s(state.time_s), kDigitsMinutes)},
          {"gas_C", T_C(state.gas_C)},
          {"tube_C", T_C(state.tube_C)},
          {"core_face_C", T_C(state.core_face_C)},
          {"core_centre_C", T_C(state.core_centre_C)},
          {"min_C", T_C(state.min_C)},
          {"max_C", T_C(state.max_C)},
          {"bars", bars_json(report, state)},
          {"probes", probes_json(report.field, state)}};
}

}  // namespace

std::string field_text(const FieldReport& report, const Style& style) {
  return style.bold(report.title) + "\n\n  Temperatures of the section, fire \"" + report.fire +
         "\"\n\n" + section_table(report) + probe_table(report, style) +
         notices_text(report.notices, style) + standing_cautions(CautionForm::brief, style);
}

std::string field_json(const FieldReport& report) {
  ordered_json states = ordered_json::array();
  for (const FieldState& state : report.field.states) states.push_back(state_json(report, state));
  return json_text({{"schema", "ringward-field/1"},
                    {"title", report.title},
                    {"states", states},
                    {"notices", json_notices(report.notices)}});
}

std::string field_csv(const FieldReport& report) {
  CsvTable table({"time_min", "x_mm", "y_mm", "temperature_C"});
  for (const FieldState& state : report.field.states) {
    for (std::size_t k = 0; k < report.field.probes.size(); ++k) {
      const thermal::Point& probe = report.field.probes[k];
      table.add({csv_number(units::min_from_s(state.time_s), kDigitsMinutes),
                 csv_number(units::mm_from_m(probe.x_m), kDigitsLength),
                 csv_number(units::mm_from_m(probe.y_m), kDigitsLength),
                 csv_number(state.probes_C[k], kDigitsFieldTemperature)});
    }
  }
  return table.text();
}

}  // namespace ringward::cli
