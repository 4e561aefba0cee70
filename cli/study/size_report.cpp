#include "cli/study/size_report.hpp"

#include <fmt/format.h>

#include <nlohmann/json.hpp>

#include "cli/input/text_wrap.hpp"
#include "cli/output/cautions.hpp"
#include "cli/output/csv.hpp"
#include "cli/output/json_number.hpp"
#include "cli/output/numbers.hpp"
#include "cli/output/text_table.hpp"
#include "cli/study/compare_report.hpp"
#include "cli/study/layout_row_json.hpp"

namespace ringward::cli {
namespace {

using nlohmann::ordered_json;

constexpr std::size_t kLabelWidth = 20;

std::string line(const std::string& label, const std::string& value) {
  const std::string indent(kLabelWidth, ' ');
  return "  " + label + std::string(kLabelWidth - 2 - label.size(), ' ') +
         wrapped(value, kLabelWidth, indent) + "\n";
}

std::string with_unit(double value, const std::string& unit) {
  return shortest(value) + (unit.empty() ? "" : " " + unit);
}

const char* response_word(Response response) {
  switch (response) {
    case Response::rises:
      return "rises";
    case Response::falls:
      return "falls";
    case Response::flat:
      return "does not change";
  }
  return "";
}

std::string resistance_line(const LayoutRow& row) {
  if (row.verdict->survives()) {
    return resistance_words(row) + " min: still stands at the end of the followed fire";
  }
  return resistance_words(row) + " min +/- " + tenths_up(row.verdict->uncertainty_min) +
         " min numerical uncertainty";
}

std::string found_line(const SizeReport& report, const Style& style) {
  const SizeTrial* chosen = report.chosen();
  if (chosen == nullptr) {
    return style.bad("nothing works") +
           fmt::format(": neither end of {} to {} meets {} min, the better one misses it by {} min",
                       shortest(report.bracket.low), with_unit(report.bracket.high, report.unit),
                       shortest(report.required_min), tenths_up(report.result.misses_by_min()));
  }
  const bool rises = report.result.response != Response::falls;
  const std::string value = report.key + " = " + with_unit(chosen->value, report.unit);
  if (!report.result.next) {
    return style.bold(value) +
           (rises ? ": even the smallest value of the bracket meets "
                  : ": even the largest value of the bracket meets ") +
           shortest(report.required_min) + " min";
  }
  return style.bold(value) + (rises ? ": the smallest that meets " : ": the largest that meets ") +
         fmt::format("{} min, in steps of {}", shortest(report.required_min),
                     with_unit(report.bracket.step, report.unit));
}

std::string next_line(const SizeReport& report) {
  const SizeTrial& next = report.result.trials[*report.result.next];
  std::string text = fmt::format("{} misses by {} min", with_unit(next.value, report.unit),
                                 tenths_up(-next.margin_min()));
  if (!report.result.is_narrowed) {
    text += fmt::format("; no closer value was tried, {} ratings are the most", kMostRatings);
  }
  return text;
}

std::string summary(const SizeReport& report, const Style& style) {
  std::string text = style.bold(report.title) + "\n\n" + line("Sized", found_line(report, style));
  if (const SizeTrial* chosen = report.chosen()) {
    text += line("Fire resistance", resistance_line(chosen->row));
    text += line("Governs", chosen->row.criterion);
    if (report.result.next) text += line("The step before", next_line(report));
  }
  text += line("Response", fmt::format("the fire resistance {} with {} in the bracket",
                                       response_word(report.result.response), report.key));
  for (const std::string& pair : report.result.contradictions) {
    text += line("Contradiction", style.caution(pair) +
                                      ": the response is not monotone, another "
                                      "value may work as well or better");
  }
  return text + "\n";
}

std::string trial_table(const SizeReport& report, const Style& style) {
  TextTable table({{"value", report.unit, 0},
                   {"fire res.", "min", 1},
                   {"+/-", "min", 1},
                   {"margin", "min", 1},
                   {"met", "", 0}});
  for (const SizeTrial& trial : report.result.trials) {
    const Verdict& verdict = *trial.row.verdict;
    table.add_cells({shortest(trial.value), resistance_words(trial.row),
                     verdict.survives() ? "-" : tenths_up(verdict.uncertainty_min),
                     margin_words(trial.margin_min()), trial.met() ? "yes" : "no"});
  }
  return style.bold(fmt::format("Rated values ({})", report.result.trials.size())) + "\n" +
         table.text() + "\n";
}

ordered_json trial_json(const SizeTrial& trial) {
  const Verdict& verdict = *trial.row.verdict;
  return {{"value", trial.value},
          {"outcome", outcome_word(trial.row)},
          {"fire_resistance_min", json_number(verdict.fire_resistance_min, kDigitsMinutes)},
          {"uncertainty_min", json_number(verdict.uncertainty_min, kDigitsMinutes)},
          {"margin_min", json_number(trial.margin_min(), kDigitsMinutes)},
          {"met", trial.met()}};
}

}  // namespace

std::string size_text(const SizeReport& report, const Style& style) {
  const SizeTrial* chosen = report.chosen();
  return summary(report, style) + trial_table(report, style) +
         (chosen == nullptr ? "" : notices_text(chosen->row.cautions, style)) +
         standing_cautions(CautionForm::full, style);
}

std::string size_json(const SizeReport& report) {
  const SizeTrial* chosen = report.chosen();
  ordered_json document{{"schema", "ringward-size/1"},
                        {"program", {{"name", "ringward"}, {"version", RINGWARD_VERSION}}},
                        {"title", report.title},
                        {"key", report.key},
                        {"unit", report.unit},
                        {"between", {report.bracket.low, report.bracket.high}},
                        {"step", report.bracket.step},
                        {"required_min", report.required_min},
                        {"response", response_word(report.result.response)},
                        {"found", chosen != nullptr},
                        {"value", nullptr},
                        {"rating", nullptr},
                        {"misses_by_min", nullptr},
                        {"narrowed_to_step", report.result.is_narrowed},
                        {"contradictions", report.result.contradictions},
                        {"trials", ordered_json::array()},
                        {"notices", ordered_json::array()}};
  if (chosen != nullptr) {
    document["value"] = chosen->value;
    document["rating"] = row_json(chosen->row);
    for (const char* key : {"layout", "name", "values", "reason", "cautions"}) {
      document["rating"].erase(key);
    }
    document["notices"] = json_notices(chosen->row.cautions);
  } else {
    document["misses_by_min"] = json_number(report.result.misses_by_min(), kDigitsMinutes);
  }
  for (const SizeTrial& trial : report.result.trials) {
    document["trials"].push_back(trial_json(trial));
  }
  return json_text(document);
}

std::string size_csv(const SizeReport& report) {
  CsvTable table(
      {"value", "outcome", "fire_resistance_min", "uncertainty_min", "margin_min", "met"});
  for (const SizeTrial& trial : report.result.trials) {
    const Verdict& verdict = *trial.row.verdict;
    table.add({shortest(trial.value), outcome_word(trial.row),
               csv_number(verdict.fire_resistance_min, kDigitsMinutes),
               csv_number(verdict.uncertainty_min, kDigitsMinutes),
               csv_number(trial.margin_min(), kDigitsMinutes), trial.met() ? "true" : "false"});
  }
  return table.text();
}

}  // namespace ringward::cli
