#pragma once

#include "cli/pictures/picture.hpp"
#include "thermal/boundary/exposure.hpp"
#include "thermal/section/section.hpp"

namespace ringward::cli {

/// The cross-section to a round scale with its dimensions, numbered parts and the faces that see
/// the fire, with a list of the parts beside it.
[[nodiscard]] Picture section_drawing(const PictureAbout& about, const thermal::Section& section,
                                      const thermal::ExposedParts& exposed);

/// "1 to 5": of the drawing, printed at its size.
[[nodiscard]] int drawing_scale(const thermal::Section& section);

}  // namespace ringward::cli
