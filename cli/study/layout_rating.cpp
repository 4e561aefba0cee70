#include "cli/study/layout_rating.hpp"

#include <algorithm>
#include <cmath>

#include "cli/output/cautions.hpp"
#include "cli/output/numbers.hpp"
#include "thermal/base/error.hpp"
#include "thermal/base/units.hpp"

namespace ringward::cli {
namespace {

using mechanical::HistoryRow;

InputValue value_at(const ColumnInput& input, const std::string& key) {
  const auto found = std::find_if(input.echo.begin(), input.echo.end(),
                                  [&](const EchoEntry& entry) { return entry.key == key; });
  return found == input.echo.end() ? InputValue() : found->value;
}

/// The history holds the class times and every five minutes; other times are computed by
/// themselves.
std::optional<double> utilisation_at(double t_s, const ColumnInput& input,
                                     const mechanical::Rating& rating, const HeatFlow& heat_flow) {
  const std::optional<double>& fall_s = rating.chosen.fire_resistance_s;
  if (fall_s && *fall_s < t_s) return std::nullopt;
  for (const HistoryRow& row : rating.chosen.history) {
    if (std::abs(row.time_s - t_s) < 1e-6) return row.utilisation;
  }
  const thermal::TemperatureHistory history = heat_flow({.accuracy = input.accuracy, .scale = 1.0});
  return mechanical::capacities(input.column, history, {t_s}).front().utilisation;
}

void take_rating(LayoutRow& row, const ColumnInput& input, const HeatFlow& heat_flow) {
  const mechanical::Rating rating =
      mechanical::rate(input.column, input.fire, input.accuracy,
                       {.bounds = false, .uncertainty = true, .heat_flow = heat_flow});
  std::optional<double> required_min;
  if (input.required_s) required_min = units::min_from_s(*input.required_s);
  row.verdict = judge(rating, input.has_classes, required_min);
  row.criterion = rating.chosen.criterion;
  if (input.required_s) {
    row.utilisation_at_required = utilisation_at(*input.required_s, input, rating, heat_flow);
  }
  Notices all = input.notices;
  all.insert(all.end(), rating.notices.begin(), rating.notices.end());
  for (Notice& notice : ordered_notices(all)) {
    if (notice.severity == Severity::caution) row.cautions.push_back(std::move(notice));
  }
}

}  // namespace

std::optional<double> LayoutRow::margin_min() const {
  if (!verdict || !verdict->required_min) return std::nullopt;
  return rounded(verdict->assessed_min - *verdict->required_min, kDigitsMinutes);
}

LayoutRow rate_layout(const ColumnInput& input, const HeatFlow& heat_flow,
                      const std::vector<std::string>& keys) {
  LayoutRow row;
  row.input_sha256 = input.input_sha256;
  row.amounts = material_amounts(input.column.section);
  if (input.column.section.protection) {
    row.protection_mm = units::mm_from_m(input.column.section.protection->thickness_m);
  }
  for (const std::string& key : keys) row.values.push_back({key, value_at(input, key)});
  try {
    take_rating(row, input, heat_flow);
  } catch (const Error& error) {
    row.verdict = std::nullopt;
    row.criterion.clear();
    row.cautions.clear();
    row.reason = error.what();
  }
  return row;
}

}  // namespace ringward::cli
