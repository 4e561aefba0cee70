#include "cli/output/rate_words.hpp"

#include <fmt/format.h>

#include "cli/output/numbers.hpp"
#include "thermal/base/units.hpp"

namespace ringward::cli {
namespace {

using mechanical::ConfinementModel;
using mechanical::TubeEvent;
using mechanical::TubeEventKind;

std::string bound(const RateReport& report, const char* name, ConfinementModel model,
                  const std::optional<double>& time_s) {
  const std::string used = report.input.column.confinement == model ? " (used)" : "";
  if (!time_s) {
    return fmt::format("{}{} above {}", name, used,
                       tenths_down(units::min_from_s(report.rating.followed_s)));
  }
  return fmt::format("{}{} {}", name, used, tenths_down(minutes_down(*time_s)));
}

}  // namespace

bool has_confining_tube(const RateReport& report) {
  const thermal::Section& section = report.input.column.section;
  return section.is_circular() && section.tube &&
         section.tube->role == thermal::TubeRole::confining;
}

std::string resistance_words(const RateReport& report, const Style& style) {
  const Verdict& verdict = report.verdict;
  if (verdict.survives()) {
    return style.bold("above " + tenths_down(verdict.assessed_min) + " min") +
           ": still stands at the end of the followed fire";
  }
  return style.bold(tenths_down(*verdict.fire_resistance_min) + " min") + " +/- " +
         tenths_up(verdict.uncertainty_min) + " min numerical uncertainty";
}

std::string class_words(const RateReport& report, const Style& style) {
  const Verdict& verdict = report.verdict;
  if (!verdict.class_min)
    return "none: the fire \"" + report.input.curve->name() + "\" has no classes";
  if (*verdict.class_min == 0) return "none: below R 15";
  return style.bold(fmt::format("R {}", *verdict.class_min));
}

std::string requirement_words(const Verdict& verdict, const Style& style) {
  if (!verdict.required_min) return "nothing (rating.required_min is not given)";
  return shortest(*verdict.required_min) +
         " min: " + (*verdict.met ? style.good("met") : style.bad("NOT MET"));
}

std::string band_words(const RateReport& report) {
  if (!has_confining_tube(report)) return "none: no tube confines this column";
  const mechanical::Bounds& bounds = report.rating.bounds.value();
  return bound(report, "none", ConfinementModel::none, bounds.none_s) + ", " +
         bound(report, "contact", ConfinementModel::contact, bounds.contact_s) + ", " +
         bound(report, "yield", ConfinementModel::yield, bounds.yield_s) + " min";
}

std::string event_word(TubeEventKind kind) {
  switch (kind) {
    case TubeEventKind::contact_lost:
      return "contact lost";
    case TubeEventKind::contact_regained:
      return "contact regained";
    case TubeEventKind::end_gap_closed:
      return "end gap closed";
  }
  return "";
}

std::string event_words(const std::vector<TubeEvent>& events) {
  std::string words;
  for (const TubeEvent& event : events) {
    words += (words.empty() ? "" : ", ") + event_word(event.kind) + " at " +
             tenths_down(minutes_down(event.time_s)) + " min";
  }
  return words;
}

}  // namespace ringward::cli
