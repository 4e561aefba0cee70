#pragma once

#include <string>
#include <vector>

#include "cli/evidence/evidence_run.hpp"
#include "cli/terminal.hpp"

namespace ringward::cli {

// The rerun published checks in the forms that `evidence` can give them.
[[nodiscard]] std::string evidence_text(const std::vector<CheckResult>& results,
                                        const Style& style);
[[nodiscard]] std::string evidence_markdown(const std::vector<CheckResult>& results);
[[nodiscard]] std::string evidence_json(const std::vector<CheckResult>& results);
[[nodiscard]] std::string evidence_csv(const std::vector<CheckResult>& results);

/// The results of one case, or of one group, in the order of all groups.
struct ResultBlock {
  std::string title;
  std::vector<CheckResult> results;
};
[[nodiscard]] std::vector<ResultBlock> by_group(const std::vector<CheckResult>& results);
[[nodiscard]] std::vector<ResultBlock> by_case(const std::vector<CheckResult>& results);

/// How many pass, and how many of the gaps are known: "12 checks, 11 pass, 1 known gap, ...".
[[nodiscard]] std::string tally(const std::vector<CheckResult>& results);

/// Whether the result after it in its block has another origin or another tolerance.
[[nodiscard]] bool ends_a_check(const ResultBlock& block, std::size_t i);

/// A figure with six significant digits.
[[nodiscard]] std::string figure(double value);
/// Computed less expected, in three digits; noise of the last bits is none.
[[nodiscard]] std::string difference_figure(const CheckResult& result);
/// The tolerance as it is meant: "+/- 1", ">= -1" where only one side counts.
[[nodiscard]] std::string tolerance_words(const CheckResult& result);

}  // namespace ringward::cli
