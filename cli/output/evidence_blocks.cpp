#include <fmt/format.h>

#include <algorithm>
#include <cmath>

#include "cli/output/evidence_report.hpp"
#include "cli/output/numbers.hpp"

namespace ringward::cli {
namespace {

constexpr int kDigitsFigure = 9;  // strains are among the figures

}  // namespace

std::vector<ResultBlock> by_group(const std::vector<CheckResult>& results) {
  std::vector<ResultBlock> blocks;
  for (const std::string& group : evidence_groups()) {
    ResultBlock block{group, {}};
    std::copy_if(results.begin(), results.end(), std::back_inserter(block.results),
                 [&group](const CheckResult& result) { return result.group == group; });
    if (!block.results.empty()) blocks.push_back(std::move(block));
  }
  return blocks;
}

std::vector<ResultBlock> by_case(const std::vector<CheckResult>& results) {
  std::vector<ResultBlock> blocks;
  for (const CheckResult& result : results) {
    const std::string title = result.name + " [" + result.source + " " + result.locator + "]";
    if (blocks.empty() || blocks.back().title != title) blocks.push_back({title, {}});
    blocks.back().results.push_back(result);
  }
  return blocks;
}

std::string tally(const std::vector<CheckResult>& results) {
  std::size_t passed = 0, known = 0;
  for (const CheckResult& result : results) {
    if (result.passes) ++passed;
    if (!result.passes && result.is_known_gap) ++known;
  }
  return fmt::format("{} checks: {} pass, {} known gap{}, {} unexpected gap{}", results.size(),
                     passed, known, known == 1 ? "" : "s", results.size() - passed - known,
                     results.size() - passed - known == 1 ? "" : "s");
}

bool ends_a_check(const ResultBlock& block, std::size_t i) {
  if (i + 1 == block.results.size()) return true;
  const CheckResult& next = block.results[i + 1];
  const CheckResult& here = block.results[i];
  return next.reason != here.reason || next.provenance != here.provenance;
}

std::string difference_figure(const CheckResult& result) {
  return fmt::format("{:.3g}", rounded(result.difference(), kDigitsFigure));
}

std::string figure(double value) {
  return std::isfinite(value) ? fmt::format("{:.6g}", rounded(value, kDigitsFigure)) : "-";
}

std::string tolerance_words(const CheckResult& result) {
  switch (result.comparison) {
    case Comparison::within:
      return "+/- " + figure(result.tolerance);
    case Comparison::at_least:
      return "at least -" + figure(result.tolerance);
    case Comparison::at_most:
      return "at most +" + figure(result.tolerance);
  }
  return "";
}

}  // namespace ringward::cli
