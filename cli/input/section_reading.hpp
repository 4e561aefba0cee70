#pragma once

#include "cli/input/input_values.hpp"
#include "cli/input/problems.hpp"
#include "thermal/section/section.hpp"

namespace ringward::cli {

/// The section in SI units. Refused or missing values become NaN, bars without valid data get no
/// positions; the caller reports the problems before it uses the section.
[[nodiscard]] thermal::Section read_section(InputValues& values, Problems& problems);

/// What contradicts itself in the geometry: tube against core, bars and steel shape inside the
/// core, overlaps.
void check_section(const thermal::Section& section, const InputValues& values, Problems& problems);

}  // namespace ringward::cli
