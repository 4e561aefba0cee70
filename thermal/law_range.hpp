#pragma once

#include "thermal/base/notice.hpp"
#include "thermal/heat_equation.hpp"

namespace ringward::thermal {

/// A notice for each law that was used outside the temperatures its publication gives it for,
/// judged by the initial and the highest temperatures of the cells.
[[nodiscard]] Notices law_range_notices(const HeatEquation& equation);

}  // namespace ringward::thermal
