#pragma once

#include "cli/input/input_values.hpp"
#include "cli/input/problems.hpp"
#include "mechanical/column.hpp"

namespace ringward::cli {

/// Confinement, member, load and material factors, and the tube's height, which follows from the
/// member. Contradictions are added to the problems.
/// @param section already read; its tube receives the height
[[nodiscard]] mechanical::Column read_column_of(thermal::Section section, InputValues& values,
                                                Problems& problems);

}  // namespace ringward::cli
