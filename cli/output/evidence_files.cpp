#include <fmt/format.h>

#include <nlohmann/json.hpp>

#include "cli/output/cautions.hpp"
#include "cli/output/csv.hpp"
#include "cli/output/evidence_report.hpp"
#include "cli/output/json_number.hpp"

namespace ringward::cli {
namespace {

constexpr int kDigits = 9;  // strains are among the figures

const char* comparison_words(Comparison comparison) {
  switch (comparison) {
    case Comparison::within:
      return "within";
    case Comparison::at_least:
      return "at least";
    case Comparison::at_most:
      return "at most";
  }
  return "";
}

nlohmann::ordered_json entry_of(const CheckResult& result) {
  return {{"group", result.group},
          {"name", result.name},
          {"source", result.source},
          {"locator", result.locator},
          {"quantity", result.quantity},
          {"unit", result.unit},
          {"expected", json_number(result.expected, kDigits)},
          {"computed", json_number(result.computed, kDigits)},
          {"difference", json_number(result.difference(), kDigits)},
          {"tolerance", json_number(result.tolerance, kDigits)},
          {"comparison", comparison_words(result.comparison)},
          {"provenance", provenance_words(result.provenance)},
          {"reason", result.reason},
          {"status", result.status()},
          {"known_gap", result.is_known_gap},
          {"note", result.note}};
}

/// A bar would end the cell.
std::string cell(std::string text) {
  for (std::size_t at = text.find('|'); at != std::string::npos; at = text.find('|', at + 2)) {
    text.insert(at, "\\");
  }
  return text;
}

std::string case_markdown(const ResultBlock& block) {
  std::string text = "### " + block.title +
                     "\n\n| quantity | unit | expected | computed | difference | tolerance | "
                     "status |\n|---|---|---:|---:|---:|---|---|\n";
  std::string notes;
  for (std::size_t i = 0; i < block.results.size(); ++i) {
    const CheckResult& r = block.results[i];
    text += fmt::format("| {} | {} | {} | {} | {} | {} | {} |\n", cell(r.quantity), r.unit,
                        figure(r.expected), figure(r.computed), difference_figure(r),
                        tolerance_words(r), r.passes ? "pass" : "**gap**");
    if (!r.note.empty()) notes += "- " + r.quantity + ": " + r.note + "\n";
    if (ends_a_check(block, i)) {
      notes += fmt::format("- {}; tolerance: {}\n", provenance_words(r.provenance), r.reason);
    }
  }
  return text + "\n" + notes + "\n";
}

}  // namespace

std::string evidence_markdown(const std::vector<CheckResult>& results) {
  std::string text = "# Published checks, rerun\n\n" + tally(results) + ".\n\n";
  for (const ResultBlock& group : by_group(results)) {
    text += "## " + group.title + "\n\n" + tally(group.results) + ".\n\n";
    for (const ResultBlock& block : by_case(group.results)) text += case_markdown(block);
  }
  return text + standing_cautions(CautionForm::full, Style(false));
}

std::string evidence_json(const std::vector<CheckResult>& results) {
  nlohmann::ordered_json cases = nlohmann::ordered_json::array();
  for (const CheckResult& result : results) cases.push_back(entry_of(result));
  return json_text({{"schema", "ringward-evidence/1"}, {"cases", cases}});
}

std::string evidence_csv(const std::vector<CheckResult>& results) {
  CsvTable table({"group", "name", "source", "locator", "quantity", "unit", "expected", "computed",
                  "tolerance", "status", "note"});
  for (const CheckResult& r : results) {
    table.add({r.group, r.name, r.source, r.locator, r.quantity, r.unit,
               csv_number(r.expected, kDigits), csv_number(r.computed, kDigits),
               csv_number(r.tolerance, kDigits), r.status(), r.note});
  }
  return table.text();
}

}  // namespace ringward::cli
