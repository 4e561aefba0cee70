#pragma once

#include <optional>
#include <vector>

#include "cli/output/colour_bands.hpp"
#include "thermal/section/section.hpp"
#include "thermal/temperature_history.hpp"

namespace ringward::cli {

/// The hottest and the coldest bar of one group.
struct BarGroupRange {
  double hottest_C = 0;
  double coldest_C = 0;
};

/// The section's temperatures at one time.
struct FieldState {
  double time_s = 0;
  double gas_C = 0;
  std::optional<double> tube_C;
  double core_face_C = 0;
  double core_centre_C = 0;
  double min_C = 0;  ///< over all cells
  double max_C = 0;
  std::vector<BarGroupRange> bars;  ///< one a group
  std::vector<double> probes_C;     ///< one a probe
  std::vector<double> cells_C;      ///< one a cell of the solved grid
};

/// What `field` found, for every form it is shown in.
struct Field {
  std::vector<thermal::Point> probes;
  std::vector<FieldState> states;
};

/// Reads the temperatures at the wanted times out of the solved history.
/// @param times_s increasing, within the history
/// @throws Error(bad_input) when a probe lies outside the section
[[nodiscard]] Field field_of(const thermal::Section& section,
                             const thermal::TemperatureHistory& history,
                             const std::vector<double>& times_s,
                             const std::vector<thermal::Point>& probes);

/// Bands for the temperatures of all the states.
[[nodiscard]] ColourBands bands_for(const std::vector<FieldState>& states);

}  // namespace ringward::cli
