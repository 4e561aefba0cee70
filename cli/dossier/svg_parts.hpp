#pragma once

#include <string>

#include "cli/pictures/picture.hpp"

namespace ringward::cli {

// Parts of the dossier's own drawings.

/// Opens an <svg> element with its alternative text.
[[nodiscard]] std::string svg_opening(const PictureAbout& about, double width_px, double height_px);

/// Escaped text at a place in px.
/// @param attributes further ones of ours, e.g. `font-size="11"`
[[nodiscard]] std::string svg_text(const PicturePoint& at, const std::string& attributes,
                                   const std::string& text);

/// Small centred text on a white edge, to be read on any ground.
[[nodiscard]] std::string svg_label(const PicturePoint& at, const std::string& text);

}  // namespace ringward::cli
