#pragma once

#include "cli/input/input_values.hpp"
#include "cli/input/problems.hpp"
#include "thermal/boundary/exposure.hpp"

namespace ringward::cli {

/// Heated, built-in and ambient faces or arcs; contradictions are added to the problems.
[[nodiscard]] thermal::ExposedParts read_exposed_parts(const InputValues& values,
                                                       Problems& problems);

}  // namespace ringward::cli
