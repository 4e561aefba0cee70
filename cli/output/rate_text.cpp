#include <fmt/format.h>

#include <cmath>

#include "cli/input/text_wrap.hpp"
#include "cli/output/cautions.hpp"
#include "cli/output/history_columns.hpp"
#include "cli/output/numbers.hpp"
#include "cli/output/rate_report.hpp"
#include "cli/output/text_table.hpp"
#include "thermal/base/units.hpp"

namespace ringward::cli {
namespace {

constexpr std::size_t kLabelWidth = 20;
constexpr int kShownDigits = 1;

using mechanical::ConfinementModel;
using mechanical::TubeEvent;
using mechanical::TubeEventKind;

// Only a round tube that carries no axial load is credited with holding the core.
bool has_confining_tube(const RateReport& report) {
  const thermal::Section& section = report.input.column.section;
  return section.is_circular() && section.tube &&
         section.tube->role == thermal::TubeRole::confining;
}

std::string line(const std::string& label, const std::string& value) {
  return fmt::format("  {:<{}}", label, kLabelWidth - 2) +
         wrapped(value, kLabelWidth, std::string(kLabelWidth, ' ')) + "\n";
}

// To one decimal, on the safe side of the exact value.
std::string down(double minutes) {
  return fixed(std::floor(minutes * 10 + 1e-6) / 10, kShownDigits);
}
std::string up(double minutes) { return fixed(std::ceil(minutes * 10 - 1e-6) / 10, kShownDigits); }

std::string resistance(const RateReport& report, const Style& style) {
  const Verdict& verdict = report.verdict;
  if (verdict.survives()) {
    return style.bold("above " + down(verdict.assessed_min) + " min") +
           ": still stands at the end of the followed fire";
  }
  return style.bold(down(*verdict.fire_resistance_min) + " min") + " +/- " +
         up(verdict.uncertainty_min) + " min numerical uncertainty";
}

std::string class_words(const RateReport& report, const Style& style) {
  const Verdict& verdict = report.verdict;
  if (!verdict.class_min)
    return "none: the fire \"" + report.input.curve->name() + "\" has no classes";
  if (*verdict.class_min == 0) return "none: below R 15";
  return style.bold(fmt::format("R {}", *verdict.class_min));
}

std::string requirement(const Verdict& verdict, const Style& style) {
  if (!verdict.required_min) return "nothing (rating.required_min is not given)";
  return shortest(*verdict.required_min) +
         " min: " + (*verdict.met ? style.good("met") : style.bad("NOT MET"));
}

std::string bound(const RateReport& report, const char* name, ConfinementModel model,
                  const std::optional<double>& time_s) {
  const std::string used = report.input.column.confinement == model ? " (used)" : "";
  if (!time_s) {
    return fmt::format("{}{} above {}", name, used,
                       down(units::min_from_s(report.rating.followed_s)));
  }
  return fmt::format("{}{} {}", name, used, down(minutes_down(*time_s)));
}

std::string band(const RateReport& report) {
  if (!has_confining_tube(report)) return "none: no tube confines this column";
  const mechanical::Bounds& bounds = report.rating.bounds.value();
  return bound(report, "none", ConfinementModel::none, bounds.none_s) + ", " +
         bound(report, "contact", ConfinementModel::contact, bounds.contact_s) + ", " +
         bound(report, "yield", ConfinementModel::yield, bounds.yield_s) + " min";
}

std::string event_words(TubeEventKind kind) {
  switch (kind) {
    case TubeEventKind::contact_lost:
      return "contact lost at ";
    case TubeEventKind::contact_regained:
      return "contact regained at ";
    case TubeEventKind::end_gap_closed:
      return "end gap closed at ";
  }
  return "";
}

std::string tube_events(const std::vector<TubeEvent>& events) {
  std::string words;
  for (const TubeEvent& event : events) {
    words += (words.empty() ? "" : ", ") + event_words(event.kind) +
             down(minutes_down(event.time_s)) + " min";
  }
  return words;
}

std::string summary(const RateReport& report, const Style& style) {
  std::string text = style.bold(report.input.title) + "\n\n";
  text += line("Fire resistance", resistance(report, style));
  text += line("Class", class_words(report, style));
  text += line("Required", requirement(report.verdict, style));
  text += line("Confinement band", band(report));
  text += line("Governs", report.rating.chosen.criterion);
  if (!report.rating.chosen.events.empty()) {
    text += line("Tube under load", tube_events(report.rating.chosen.events));
  }
  return text + line("Fire", report.input.curve->name()) + "\n";
}

std::string history(const RateReport& report, const Style& style) {
  std::vector<TextTable::Column> columns;
  for (const HistoryColumn& column : history_columns()) {
    columns.push_back({column.heading, column.unit, column.shown_digits});
  }
  TextTable table(columns);
  for (const mechanical::HistoryRow& row : report.rating.chosen.history) {
    std::vector<std::optional<double>> numbers;
    for (const HistoryColumn& column : history_columns()) numbers.push_back(column.value(row));
    table.add(numbers);
  }
  const std::string key =
      has_confining_tube(report)
          ? "  hoop, press.: hoop stress of the tube and its pressure on the core at the capacity; "
            "with *: under the load\n"
          : "";
  return style.bold("History") + "\n" + table.text() + key + "\n";
}

}  // namespace

std::string rate_text(const RateReport& report, const Style& style) {
  return summary(report, style) + notices_text(report.notices, style) + history(report, style) +
         standing_cautions(CautionForm::full, style);
}

}  // namespace ringward::cli
