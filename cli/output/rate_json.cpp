#include <cmath>
#include <nlohmann/json.hpp>

#include "cli/output/history_columns.hpp"
#include "cli/output/input_echo.hpp"
#include "cli/output/json_number.hpp"
#include "cli/output/numbers.hpp"
#include "cli/output/rate_report.hpp"

namespace ringward::cli {
namespace {

using nlohmann::ordered_json;

template <class Value>
ordered_json or_null(const std::optional<Value>& value) {
  if (!value) return nullptr;
  return *value;
}

ordered_json minutes_or_null(const std::optional<double>& time_s) {
  if (!time_s) return nullptr;
  return json_number(minutes_down(*time_s), kDigitsMinutes);
}

ordered_json rating_json(const RateReport& report) {
  const Verdict& verdict = report.verdict;
  return {{"outcome", verdict.survives() ? "survives" : "fails"},
          {"fire_resistance_min", json_number(verdict.fire_resistance_min, kDigitsMinutes)},
          {"uncertainty_min", json_number(verdict.uncertainty_min, kDigitsMinutes)},
          {"class_min", or_null(verdict.class_min)},
          {"required_min", or_null(verdict.required_min)},
          {"met", or_null(verdict.met)},
          {"criterion", report.rating.chosen.criterion}};
}

ordered_json history_json(const RateReport& report) {
  ordered_json history = ordered_json::array();
  for (const mechanical::HistoryRow& row : report.rating.chosen.history) {
    ordered_json entry;
    for (const HistoryColumn& column : history_columns()) {
      entry[column.key] = json_number(column.value(row), column.digits);
    }
    history.push_back(std::move(entry));
  }
  return history;
}

const char* symmetry_word(thermal::Symmetry symmetry) {
  switch (symmetry) {
    case thermal::Symmetry::none:
      return "none";
    case thermal::Symmetry::half:
      return "half";
    case thermal::Symmetry::quarter:
      return "quarter";
    case thermal::Symmetry::axisymmetric:
      return "axisymmetric";
  }
  return "none";
}

// Two significant digits: an order of magnitude, not a result.
double order_of_magnitude(double value) {
  if (value <= 0 || !std::isfinite(value)) return 0.0;
  const int digits = 1 - static_cast<int>(std::floor(std::log10(value)));
  return rounded(value, digits);
}

ordered_json numerics_json(const thermal::HeatFlowStatistics& heat_flow) {
  return {{"cells", heat_flow.cells},
          {"time_steps", heat_flow.time_steps},
          {"energy_balance_error", order_of_magnitude(heat_flow.energy_balance_error)},
          {"symmetry", symmetry_word(heat_flow.symmetry)}};
}

}  // namespace

std::string rate_json(const RateReport& report) {
  const mechanical::Bounds& bounds = report.rating.bounds.value();
  const ordered_json document{{"schema", "ringward-rate/1"},
                              {"program", {{"name", "ringward"}, {"version", RINGWARD_VERSION}}},
                              {"title", report.input.title},
                              {"input_sha256", report.input.input_sha256},
                              {"input", input_echo(report.input.echo)},
                              {"rating", rating_json(report)},
                              {"bounds",
                               {{"none_min", minutes_or_null(bounds.none_s)},
                                {"contact_min", minutes_or_null(bounds.contact_s)},
                                {"yield_min", minutes_or_null(bounds.yield_s)}}},
                              {"history", history_json(report)},
                              {"numerics", numerics_json(report.rating.heat_flow)},
                              {"notices", json_notices(report.notices)}};
  return json_text(document);
}

}  // namespace ringward::cli
