#pragma once

#include <string>

#include "thermal/boundary/exposure.hpp"
#include "thermal/section/section.hpp"

namespace ringward::cli {

/// Tube, protection, embedded shape and bars as SVG lines, to scale, centroid at (0, 0), y up
/// turned into SVG's y down.
/// @param px_per_m scale of the drawing
[[nodiscard]] std::string section_outlines(const thermal::Section& section, double px_per_m);

/// A bold line beside every part of the outline that sees the fire.
[[nodiscard]] std::string heated_outline(const thermal::Section& section,
                                         const thermal::ExposedParts& exposed, double px_per_m);

/// Width and depth over everything, protection included.
[[nodiscard]] thermal::Outline overall_outline(const thermal::Section& section);

}  // namespace ringward::cli
