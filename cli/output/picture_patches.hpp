#pragma once

#include <string>
#include <vector>

#include "cli/output/colour_bands.hpp"
#include "cli/output/whole_section.hpp"
#include "thermal/temperature_history.hpp"

namespace ringward::cli {

/// The filled temperature bands of one time as SVG paths, to scale, centroid at (0, 0), with thin
/// lines where one band meets the next.
/// @param patches_C one temperature a patch [C], at i + j * count_1()
/// @param px_per_m scale of the drawing
[[nodiscard]] std::string temperature_patches(const WholeSection& whole,
                                              const std::vector<double>& patches_C,
                                              const ColourBands& bands, double px_per_m);

/// The temperature in the middle of each patch at one time, between cells interpolated as for
/// probes.
[[nodiscard]] std::vector<double> patch_temperatures(const WholeSection& whole,
                                                     const thermal::TemperatureHistory& history,
                                                     double time_s);

}  // namespace ringward::cli
