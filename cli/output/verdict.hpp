#pragma once

#include <optional>
#include <string>

#include "mechanical/rating/rating.hpp"

namespace ringward::cli {

/// What a rating means for its fire-resistance class and the required time. Judged on the rounded
/// figures that are printed, so that a reader who redoes it by hand gets the same.
struct Verdict {
  std::optional<double> fire_resistance_min;  ///< none: stands for the whole followed fire
  double uncertainty_min = 0;
  double assessed_min = 0;       ///< resistance minus uncertainty; surviving: the followed time
  std::optional<int> class_min;  ///< none: the fire has no classes
  std::optional<double> required_min;  ///< none: nothing is required
  std::optional<bool> met;

  [[nodiscard]] bool survives() const { return !fire_resistance_min.has_value(); }
};

/// The largest of 0, 15, 20, 30, 45, 60, 90, 120, 180, 240, 360 that is not above `time_min`.
/// The periods are those of the European classification (EN 13501-2, from memory).
[[nodiscard]] int fire_resistance_class(double time_min);

/// The class times above zero, increasing.
[[nodiscard]] const std::vector<int>& class_times_min();

/// @param nominal_fire whether the fire has classes (not parametric, table or constant)
/// @param required_min required time [min], none when nothing is required
[[nodiscard]] Verdict judge(const mechanical::Rating& rating, bool nominal_fire,
                            std::optional<double> required_min);

}  // namespace ringward::cli
