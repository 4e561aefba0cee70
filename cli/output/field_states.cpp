#include "cli/output/field_states.hpp"

#include <algorithm>

namespace ringward::cli {
namespace {

using thermal::BarGroup;
using thermal::Point;
using thermal::Section;
using thermal::TemperatureHistory;

BarGroupRange range_of(const BarGroup& group, const TemperatureHistory& history, double time_s) {
  std::vector<double> temperatures_C;
  for (const Point& position : group.positions) {
    temperatures_C.push_back(history.T_C(position, time_s));
  }
  const auto [coldest, hottest] = std::minmax_element(temperatures_C.begin(), temperatures_C.end());
  return {.hottest_C = *hottest, .coldest_C = *coldest};
}

FieldState state_at(const Section& section, const TemperatureHistory& history, double time_s,
                    const std::vector<Point>& probes) {
  FieldState state;
  state.time_s = time_s;
  state.gas_C = history.gas_C(time_s);
  if (section.tube) state.tube_C = history.tube_C(time_s);
  state.core_face_C = history.core_face_C(time_s);
  state.core_centre_C = history.core_centre_C(time_s);
  state.cells_C.resize(history.grid().cells.size());
  history.temperatures_C(time_s, state.cells_C);
  const auto [coldest, hottest] = std::minmax_element(state.cells_C.begin(), state.cells_C.end());
  state.min_C = *coldest;
  state.max_C = *hottest;
  for (const BarGroup& group : section.bars) state.bars.push_back(range_of(group, history, time_s));
  for (const Point& probe : probes) state.probes_C.push_back(history.T_C(probe, time_s));
  return state;
}

}  // namespace

Field field_of(const Section& section, const TemperatureHistory& history,
               const std::vector<double>& times_s, const std::vector<Point>& probes) {
  Field field;
  field.probes = probes;
  for (const double time_s : times_s) {
    field.states.push_back(state_at(section, history, time_s, probes));
  }
  return field;
}

ColourBands bands_for(const std::vector<FieldState>& states) {
  double min_C = states.front().min_C;
  double max_C = states.front().max_C;
  for (const FieldState& state : states) {
    min_C = std::min(min_C, state.min_C);
    max_C = std::max(max_C, state.max_C);
  }
  return {min_C, max_C};
}

}  // namespace ringward::cli
