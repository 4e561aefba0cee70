#pragma once

#include <string>
#include <vector>

#include "cli/output/colour_bands.hpp"
#include "cli/output/whole_section.hpp"

namespace ringward::cli {

/// The filled temperature bands of one time as SVG paths, to scale, centroid at (0, 0), with thin
/// lines where one band meets the next.
/// @param patches_C one temperature a patch [C], at i + j * count_1()
/// @param px_per_m scale of the drawing
[[nodiscard]] std::string temperature_patches(const WholeSection& whole,
                                              const std::vector<double>& patches_C,
                                              const ColourBands& bands, double px_per_m);

}  // namespace ringward::cli
