#pragma once

#include <string>
#include <vector>

#include "cli/output/field_states.hpp"
#include "cli/pictures/picture.hpp"
#include "thermal/boundary/exposure.hpp"
#include "thermal/section/section.hpp"
#include "thermal/temperature_history.hpp"

namespace ringward::cli {

/// The section whose temperatures are drawn.
struct MapSubject {
  const thermal::Section* section = nullptr;
  const thermal::ExposedParts* exposed = nullptr;
  const thermal::TemperatureHistory* history = nullptr;
};

/// The temperatures of the section at several times, small, side by side, with one key to the
/// bands.
[[nodiscard]] Picture map_panels(const PictureAbout& about, const MapSubject& subject,
                                 const std::vector<FieldState>& states);

/// One large map with labelled isotherms. Its field is a group of the class "map-field", behind an
/// empty image of the class "map-image", and its heading has the class "map-heading": the page's
/// script can show another time there.
[[nodiscard]] Picture large_map(const PictureAbout& about, const MapSubject& subject,
                                const FieldState& state);

/// What the script of the page needs to draw the large map at other times: JSON with the bands, and
/// the temperatures at the times on a raster over the section, in steps of 5 K.
[[nodiscard]] std::string map_frames_json(const MapSubject& subject, const FieldState& shown,
                                          const std::vector<double>& times_s);

/// The script that moves the large map with the slider "map-time".
[[nodiscard]] const char* map_script();

}  // namespace ringward::cli
