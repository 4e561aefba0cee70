#pragma once

#include <string>

#include "cli/input/column_input.hpp"
#include "cli/output/verdict.hpp"
#include "cli/terminal.hpp"
#include "mechanical/rating/rating.hpp"
#include "thermal/base/notice.hpp"

namespace ringward::cli {

/// A rating with all that is told beside it.
struct RateReport {
  ColumnInput input;
  mechanical::Rating rating;
  Verdict verdict;
  Notices notices;  ///< of the input and of the rating
};

/// Rates the column and judges it.
/// @throws Error(solver_breakdown)
[[nodiscard]] RateReport rate_report(ColumnInput input, const mechanical::RatingScope& scope = {});

/// The result in ten seconds, then notices, history and cautions.
[[nodiscard]] std::string rate_text(const RateReport& report, const Style& style);

/// Schema ringward-rate/1.
[[nodiscard]] std::string rate_json(const RateReport& report);

/// The history, one row a time, with the keys of the JSON history.
[[nodiscard]] std::string rate_csv(const RateReport& report);

}  // namespace ringward::cli
