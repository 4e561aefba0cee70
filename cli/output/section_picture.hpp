#pragma once

#include <string>
#include <vector>

#include "cli/output/field_states.hpp"
#include "thermal/boundary/exposure.hpp"
#include "thermal/section/section.hpp"
#include "thermal/temperature_history.hpp"

namespace ringward::cli {

/// What stands above the picture and what it shows.
struct PictureSubject {
  std::string title;
  std::string fire;  ///< name of the fire curve
  const thermal::Section* section = nullptr;
  const thermal::ExposedParts* exposed = nullptr;
};

/// The temperature field of the whole section as an SVG picture, drawn to scale: one panel a time,
/// filled temperature bands with a legend in C (values
/// between cells interpolated as for probes), bars, tube and embedded shape.
[[nodiscard]] std::string section_picture(const PictureSubject& subject,
                                          const thermal::TemperatureHistory& history,
                                          const std::vector<FieldState>& states);

}  // namespace ringward::cli
