#pragma once

#include "fires/fire_curve.hpp"
#include "mechanical/column.hpp"
#include "thermal/boundary/exposure.hpp"

// Invented columns that several tests share.
namespace ringward::testing {

/// Round, 400 x 5 confining tube S355, concrete C40 siliceous, lower conductivity.
struct RoundColumn {
  double moisture_fraction = 0.03;
  int bars = 0;                 ///< d 20, axis 40 mm from the core's face, the first at start_deg
  double start_deg = 22.5;
  double end_gap_m = 0.1;
};
[[nodiscard]] mechanical::Column round_column(const RoundColumn& wanted);

/// Square bare reinforced concrete, 4 bars d 25, axis 45 mm.
[[nodiscard]] mechanical::Column square_concrete_column(double side_m);

[[nodiscard]] thermal::FireExposure standard_fire(double duration_min);

}  // namespace ringward::testing
