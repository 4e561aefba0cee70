#include "cli/output/history_columns.hpp"

#include "cli/output/numbers.hpp"
#include "thermal/base/units.hpp"

namespace ringward::cli {
namespace {

using mechanical::HistoryRow;
using Value = std::optional<double>;

Value MPa(const Value& stress_Pa) {
  if (!stress_Pa) return std::nullopt;
  return units::MPa_from_Pa(*stress_Pa);
}

HistoryColumn temperature(const char* key, const char* heading,
                          std::function<Value(const HistoryRow&)> value) {
  return {key, heading, "C", kDigitsTemperature, 0, std::move(value)};
}

HistoryColumn stress(const char* key, const char* heading, int shown_digits,
                     std::function<Value(const HistoryRow&)> value_Pa) {
  return {key,
          heading,
          "MPa",
          kDigitsMPa,
          shown_digits,
          [value_Pa = std::move(value_Pa)](const HistoryRow& row) { return MPa(value_Pa(row)); }};
}

HistoryColumn force(const char* key, const char* heading, double HistoryRow::*force_N) {
  return {key,  heading,
          "kN", kDigitsForce,
          0,    [force_N](const HistoryRow& row) { return Value(units::kN_from_N(row.*force_N)); }};
}

std::vector<HistoryColumn> make_columns() {
  return {
      {"time_min", "time", "min", kDigitsMinutes, kDigitsMinutes,
       [](const HistoryRow& row) { return Value(minutes_down(row.time_s)); }},
      temperature("gas_C", "gas", [](const HistoryRow& row) { return Value(row.gas_C); }),
      temperature("tube_C", "tube", [](const HistoryRow& row) { return row.tube_C; }),
      temperature("core_face_C", "face",
                  [](const HistoryRow& row) { return Value(row.core_face_C); }),
      temperature("bar_max_C", "bar", [](const HistoryRow& row) { return row.bar_max_C; }),
      temperature("core_centre_C", "centre",
                  [](const HistoryRow& row) { return Value(row.core_centre_C); }),
      stress("tube_hoop_MPa", "hoop", 1, [](const HistoryRow& row) { return row.tube_hoop_Pa; }),
      stress("lateral_pressure_MPa", "press.", 2,
             [](const HistoryRow& row) { return row.lateral_pressure_Pa; }),
      stress("load_hoop_MPa", "hoop*", 1, [](const HistoryRow& row) { return row.load_hoop_Pa; }),
      stress("load_pressure_MPa", "press.*", 2,
             [](const HistoryRow& row) { return row.load_pressure_Pa; }),
      force("capacity_kN", "capacity", &HistoryRow::capacity_N),
      force("demand_kN", "load", &HistoryRow::demand_N),
      {"utilisation", "use", "-", kDigitsRatio, 3,
       [](const HistoryRow& row) { return Value(row.utilisation); }},
  };
}

}  // namespace

const std::vector<HistoryColumn>& history_columns() {
  static const std::vector<HistoryColumn> columns = make_columns();
  return columns;
}

}  // namespace ringward::cli
