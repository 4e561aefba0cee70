#pragma once

#include <functional>

#include "cli/input/column_input.hpp"
#include "cli/study/layout_row.hpp"
#include "mechanical/rating/rating.hpp"

namespace ringward::cli {

using HeatFlow = std::function<thermal::TemperatureHistory(const thermal::Resolution&)>;

/// Rates one column without the bounds of the other confinement models: fire resistance,
/// uncertainty and verdict are those of `rate`, to the last bit.
/// @param heat_flow temperatures of this column, perhaps shared with others
/// @param keys whose values the row is to hold
/// @return a column that cannot be solved is a row with its reason
[[nodiscard]] LayoutRow rate_layout(const ColumnInput& input, const HeatFlow& heat_flow,
                                    const std::vector<std::string>& keys);

}  // namespace ringward::cli
