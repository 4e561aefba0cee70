#include "cli/output/verdict.hpp"

#include <algorithm>

#include "cli/output/numbers.hpp"
#include "thermal/base/units.hpp"

namespace ringward::cli {
namespace {

// Minutes to seconds and back may lose the last bit of a time.
constexpr double kRoundTrip_min = 1e-9;

}  // namespace

const std::vector<int>& class_times_min() {
  static const std::vector<int> times{15, 20, 30, 45, 60, 90, 120, 180, 240, 360};
  return times;
}

int fire_resistance_class(double time_min) {
  int reached = 0;
  for (const int time : class_times_min()) {
    if (time <= time_min + kRoundTrip_min) reached = time;
  }
  return reached;
}

Verdict judge(const mechanical::Rating& rating, bool nominal_fire,
              std::optional<double> required_min) {
  Verdict verdict;
  verdict.required_min = required_min;
  verdict.uncertainty_min = minutes_up(rating.uncertainty_s);
  if (rating.chosen.fire_resistance_s) {
    verdict.fire_resistance_min = minutes_down(*rating.chosen.fire_resistance_s);
    verdict.assessed_min = std::max(
        0.0, rounded(*verdict.fire_resistance_min - verdict.uncertainty_min, kDigitsMinutes));
  } else {
    verdict.assessed_min = units::min_from_s(rating.followed_s);
  }
  if (nominal_fire) verdict.class_min = fire_resistance_class(verdict.assessed_min);
  if (required_min) verdict.met = verdict.assessed_min + kRoundTrip_min >= *required_min;
  return verdict;
}

}  // namespace ringward::cli
