#include <fmt/format.h>

#include <algorithm>

#include "cli/input/text_wrap.hpp"
#include "cli/output/cautions.hpp"
#include "cli/output/evidence_report.hpp"

namespace ringward::cli {
namespace {

constexpr std::size_t kNoteIndent = 6;

std::string line_of(const CheckResult& result, std::size_t width, const Style& style) {
  const std::string status = result.passes
                                 ? style.good("pass")
                                 : (result.is_known_gap ? style.caution("gap") : style.bad("gap"));
  return fmt::format("    {:<{}}  {:>7} {:>12} {:>12} {:>12}  {:<20} ", result.quantity, width,
                     result.unit, figure(result.expected), figure(result.computed),
                     difference_figure(result), tolerance_words(result)) +
         status + "\n";
}

std::string note_line(const std::string& note) {
  return std::string(kNoteIndent, ' ') + wrapped(note, kNoteIndent, std::string(kNoteIndent, ' ')) +
         "\n";
}

/// Where the figures come from and what the tolerance covers, once for results that share it.
std::string footing(const CheckResult& result) {
  return note_line(std::string(provenance_words(result.provenance)) +
                   "; tolerance: " + result.reason);
}

std::string case_text(const ResultBlock& block, const Style& style) {
  std::size_t width = 0;
  for (const CheckResult& result : block.results) width = std::max(width, result.quantity.size());
  std::string text =
      "  " + wrapped(block.title, 2, "  ") + "\n" +
      fmt::format("    {:<{}}  {:>7} {:>12} {:>12} {:>12}  {:<20} status\n", "quantity", width,
                  "unit", "expected", "computed", "difference", "tolerance");
  for (std::size_t i = 0; i < block.results.size(); ++i) {
    const CheckResult& result = block.results[i];
    text += line_of(result, width, style);
    if (!result.note.empty()) text += note_line(result.note);
    if (ends_a_check(block, i)) text += footing(result);
  }
  return text + "\n";
}

}  // namespace

std::string evidence_text(const std::vector<CheckResult>& results, const Style& style) {
  std::string text;
  for (const ResultBlock& group : by_group(results)) {
    text += style.bold(group.title) + " - " + tally(group.results) + "\n\n";
    for (const ResultBlock& block : by_case(group.results)) text += case_text(block, style);
  }
  return text + style.bold("All") + " - " + tally(results) + "\n\n" +
         "A figure from memory was not compared with the text of its source; one computed\n"
         "independently is no published value. docs/sources.toml lists the sources by their "
         "keys.\n\n" +
         standing_cautions(CautionForm::full, style);
}

}  // namespace ringward::cli
