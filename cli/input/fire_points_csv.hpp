#pragma once

#include <string>
#include <vector>

#include "cli/input/input_value.hpp"

namespace ringward::cli {

/// Points of a fire from CSV text, `time_min,temperature_C` on each line, a header allowed.
/// @param file_name for messages
/// @param limits of the temperatures
/// @param mistakes receives `file:line: what is wrong` for every bad line
/// @return [time in min, T in deg C], times strictly increasing
[[nodiscard]] std::vector<NumberPair> parse_fire_points(const std::string& text,
                                                        const std::string& file_name,
                                                        const Range& limits,
                                                        std::vector<std::string>& mistakes);

}  // namespace ringward::cli
