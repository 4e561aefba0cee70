#pragma once

#include "fires/fire_curve.hpp"

namespace ringward::fires {

// One nominal curve a file; the list of them stands in known_curves.cpp.
[[nodiscard]] FireCurvePtr standard_curve();
[[nodiscard]] FireCurvePtr external_curve();
[[nodiscard]] FireCurvePtr hydrocarbon_curve();
[[nodiscard]] FireCurvePtr slow_curve();
[[nodiscard]] FireCurvePtr astm_e119_curve();

/// The temperature of the gas before a nominal fire starts.
inline constexpr double kStart_C = 20.0;

}  // namespace ringward::fires
