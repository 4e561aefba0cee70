#pragma once

#include "mechanical/rating/rating.hpp"

namespace ringward::testing {

/// A rating on the fine grid for comparison, in the direction that governs on the standard one.
struct FinerReference {
  double fire_resistance_s = 0;  ///< the followed time when it stands
  /// Of a result of standard accuracy. Cells and time tolerance of "fine" are 0.45 and 0.4 of
  /// "standard": with an error of order two the difference of both is 1 - 0.45^2 of the error, so
  /// that it is divided by this.
  double error_s = 0;
};

[[nodiscard]] FinerReference finer_reference(const mechanical::Column& column,
                                             const thermal::FireExposure& fire,
                                             const mechanical::Rating& standard);

}  // namespace ringward::testing
