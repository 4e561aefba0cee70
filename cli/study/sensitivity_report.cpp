#include "cli/study/sensitivity_report.hpp"

#include <fmt/format.h>

#include <nlohmann/json.hpp>

#include "cli/input/schema.hpp"
#include "cli/output/cautions.hpp"
#include "cli/output/csv.hpp"
#include "cli/output/json_number.hpp"
#include "cli/output/numbers.hpp"
#include "cli/output/text_table.hpp"
#include "cli/pictures/bar_picture.hpp"
#include "cli/study/compare_report.hpp"
#include "cli/study/layout_row_json.hpp"

namespace ringward::cli {
namespace {

using nlohmann::ordered_json;

double base_min(const SensitivityReport& report) {
  return SensitivityAnswer{report.base.verdict, ""}.time_min().value();
}

std::string plain(const std::string& toml) {
  return toml.size() >= 2 && toml.front() == '"' ? toml.substr(1, toml.size() - 2) : toml;
}

std::string time_words(const SensitivityAnswer& answer) {
  if (!answer.verdict) return "-";
  return (answer.verdict->survives() ? ">" : "") + tenths_down(answer.time_min().value());
}

std::string change_words(const SensitivityReport& report, const SensitivityAnswer& answer) {
  if (!answer.verdict) return "-";
  return fmt::format("{:+.1f}", rounded(answer.time_min().value() - base_min(report), 1));
}

std::string table(const SensitivityReport& report) {
  TextTable table({{"input", "", 0},
                   {"unit", "", 0},
                   {"low", "", 0},
                   {"base", "", 0},
                   {"high", "", 0},
                   {"at low", "min", 1},
                   {"change", "min", 1},
                   {"at high", "min", 1},
                   {"change", "min", 1}});
  for (const SensitivityRow& row : report.rows) {
    const KeySpec* spec = find_key(schema_spelling(row.input.key));
    table.add_cells({row.input.key, spec == nullptr || spec->unit.empty() ? "" : spec->unit,
                     plain(row.input.low), plain(row.input.base), plain(row.input.high),
                     time_words(row.at_low), change_words(report, row.at_low),
                     time_words(row.at_high), change_words(report, row.at_high)});
  }
  return table.text();
}

std::string basis_list(const SensitivityReport& report) {
  std::string text;
  for (const SensitivityRow& row : report.rows) {
    text += "  " + row.input.key + ": " + row.input.basis + " [" + row.input.source + "]\n";
    for (const SensitivityAnswer* answer : {&row.at_low, &row.at_high}) {
      if (answer->reason.empty()) continue;
      text += fmt::format("    not rated at the {} value: {}\n",
                          answer == &row.at_low ? "low" : "high", answer->reason);
    }
  }
  return text;
}

ordered_json answer_json(const SensitivityAnswer& answer) {
  if (!answer.verdict) return {{"outcome", "no solution"}, {"reason", answer.reason}};
  return {{"outcome", answer.verdict->survives() ? "survives" : "fails"},
          {"fire_resistance_min", json_number(answer.verdict->fire_resistance_min, kDigitsMinutes)},
          {"uncertainty_min", json_number(answer.verdict->uncertainty_min, kDigitsMinutes)},
          {"time_min", json_number(answer.time_min(), kDigitsMinutes)}};
}

}  // namespace

std::string sensitivity_text(const SensitivityReport& report, const Style& style) {
  const Verdict& verdict = *report.base.verdict;
  std::string text = style.bold(report.title) + "\n\n";
  text += "  Fire resistance   " + style.bold(resistance_words(report.base) + " min");
  if (!verdict.survives()) text += " +/- " + tenths_up(verdict.uncertainty_min) + " min numerical";
  text += "\n\n" + style.bold("One input changed at a time, the strongest first") + "\n" +
          table(report) + "\n" + style.bold("Where the low and high values come from") + "\n" +
          basis_list(report) + "\n";
  return text + notices_text(report.base.cautions, style) +
         standing_cautions(CautionForm::full, style);
}

std::string sensitivity_json(const SensitivityReport& report) {
  ordered_json document{{"schema", "ringward-sensitivity/1"},
                        {"program", {{"name", "ringward"}, {"version", RINGWARD_VERSION}}},
                        {"title", report.title},
                        {"input_sha256", report.input_sha256},
                        {"base", answer_json({report.base.verdict, ""})},
                        {"inputs", ordered_json::array()},
                        {"notices", json_notices(report.base.cautions)}};
  for (const SensitivityRow& row : report.rows) {
    document["inputs"].push_back(
        {{"key", row.input.key},
         {"low", ordered_json::parse(row.input.low)},
         {"base", ordered_json::parse(row.input.base)},
         {"high", ordered_json::parse(row.input.high)},
         {"at_low", answer_json(row.at_low)},
         {"at_high", answer_json(row.at_high)},
         {"span_min", json_number(row.span_min(base_min(report)), kDigitsMinutes)},
         {"basis", row.input.basis},
         {"source", row.input.source}});
  }
  return json_text(document);
}

std::string sensitivity_csv(const SensitivityReport& report) {
  CsvTable table({"key", "low", "base", "high", "time_low_min", "time_base_min", "time_high_min",
                  "span_min", "source"});
  for (const SensitivityRow& row : report.rows) {
    table.add({row.input.key, plain(row.input.low), plain(row.input.base), plain(row.input.high),
               csv_number(row.at_low.time_min(), kDigitsMinutes),
               csv_number(base_min(report), kDigitsMinutes),
               csv_number(row.at_high.time_min(), kDigitsMinutes),
               csv_number(row.span_min(base_min(report)), kDigitsMinutes), row.input.source});
  }
  return table.text();
}

Picture sensitivity_picture(const SensitivityReport& report) {
  BarPicture picture{
      .about = {.id = "sensitivity",
                .title = "How the fire resistance moves with each uncertain input",
                .message =
                    report.rows.empty()
                        ? ""
                        : fmt::format("{} moves it most, by {} min", report.rows[0].input.key,
                                      fixed(report.rows[0].span_min(base_min(report)), 1))},
      .axis_label = "Fire resistance [min]",
      .centre = base_min(report),
      .rows = {}};
  for (const SensitivityRow& row : report.rows) {
    picture.rows.push_back({.name = fmt::format("{}  {} .. {}", row.input.key, plain(row.input.low),
                                                plain(row.input.high)),
                            .at_low = row.at_low.time_min().value_or(kNoValue),
                            .at_high = row.at_high.time_min().value_or(kNoValue)});
  }
  return draw(picture);
}

}  // namespace ringward::cli
