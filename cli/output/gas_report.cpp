#include "cli/output/gas_report.hpp"

#include <nlohmann/json.hpp>

#include "cli/output/cautions.hpp"
#include "cli/output/csv.hpp"
#include "cli/output/json_number.hpp"
#include "cli/output/numbers.hpp"
#include "cli/output/text_table.hpp"
#include "thermal/base/units.hpp"

namespace ringward::cli {

std::string gas_text(const GasReport& report, const Style& style) {
  TextTable table({{"time", "min", kDigitsMinutes}, {"gas", "C", kDigitsFieldTemperature}});
  for (const GasPoint& point : report.points) {
    table.add({units::min_from_s(point.time_s), point.T_C});
  }
  return style.bold(report.title) + "\n\n  Gas temperature, fire \"" + report.fire + "\"\n\n" +
         table.text() + "\n" + notices_text(report.notices, style) +
         standing_cautions(CautionForm::brief, style);
}

std::string gas_json(const GasReport& report) {
  nlohmann::ordered_json points = nlohmann::ordered_json::array();
  for (const GasPoint& point : report.points) {
    points.push_back({{"time_min", json_number(units::min_from_s(point.time_s), kDigitsMinutes)},
                      {"temperature_C", json_number(point.T_C, kDigitsFieldTemperature)}});
  }
  return json_text({{"schema", "ringward-gas/1"},
                    {"title", report.title},
                    {"curve", report.fire},
                    {"points", points},
                    {"notices", json_notices(report.notices)}});
}

std::string gas_csv(const GasReport& report) {
  CsvTable table({"time_min", "temperature_C"});
  for (const GasPoint& point : report.points) {
    table.add({csv_number(units::min_from_s(point.time_s), kDigitsMinutes),
               csv_number(point.T_C, kDigitsFieldTemperature)});
  }
  return table.text();
}

}  // namespace ringward::cli
