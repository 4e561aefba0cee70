#include <fmt/format.h>

#include "cli/input/text_wrap.hpp"
#include "cli/output/cautions.hpp"
#include "cli/output/history_columns.hpp"
#include "cli/output/numbers.hpp"
#include "cli/output/rate_report.hpp"
#include "cli/output/rate_words.hpp"
#include "cli/output/text_table.hpp"

namespace ringward::cli {
namespace {

constexpr std::size_t kLabelWidth = 20;

std::string line(const std::string& label, const std::string& value) {
  return fmt::format("  {:<{}}", label, kLabelWidth - 2) +
         wrapped(value, kLabelWidth, std::string(kLabelWidth, ' ')) + "\n";
}

std::string summary(const RateReport& report, const Style& style) {
  std::string text = style.bold(report.input.title) + "\n\n";
  text += line("Fire resistance", resistance_words(report, style));
  text += line("Class", class_words(report, style));
  text += line("Required", requirement_words(report.verdict, style));
  text += line("Confinement band", band_words(report));
  text += line("Governs", report.rating.chosen.criterion);
  if (!report.rating.chosen.events.empty()) {
    text += line("Tube under load", event_words(report.rating.chosen.events));
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
