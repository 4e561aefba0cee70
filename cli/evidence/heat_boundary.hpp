#pragma once

#include "cli/evidence/case_input.hpp"
#include "thermal/boundary/surface.hpp"

namespace ringward::cli {

/// What a face sees: `{ temperature_C = x }` or `{ sine_C = x, period_s = y }` on the face itself;
/// else convection_W_m2K, emissivity and gas_C = x or fire = a nominal curve.
/// @throws Error(bad_input) for anything else
[[nodiscard]] thermal::SurfaceCondition read_boundary(const CaseInput& input);

}  // namespace ringward::cli
