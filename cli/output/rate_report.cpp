#include "cli/output/rate_report.hpp"

#include "thermal/base/units.hpp"

namespace ringward::cli {

RateReport rate_report(ColumnInput input, const mechanical::RatingScope& scope) {
  RateReport report;
  report.rating = mechanical::rate(input.column, input.fire, input.accuracy, scope);
  std::optional<double> required_min;
  if (input.required_s) required_min = units::min_from_s(*input.required_s);
  report.verdict = judge(report.rating, input.has_classes, required_min);
  report.notices = input.notices;
  report.notices.insert(report.notices.end(), report.rating.notices.begin(),
                        report.rating.notices.end());
  report.input = std::move(input);
  return report;
}

}  // namespace ringward::cli
