#pragma once

#include <vector>

#include "mechanical/column.hpp"
#include "thermal/temperature_history.hpp"

namespace ringward::mechanical {

enum class Axis { x, y };

/// One point of the N-M diagram of the section: compression positive; a positive moment
/// compresses the + side of its axis.
struct InteractionPoint {
  double axial_N = 0;
  double moment_Nm = 0;
};

struct InteractionDiagram {
  double time_s = 0;
  Axis axis = Axis::x;                   ///< the axis along which the eccentricity is measured
  std::vector<InteractionPoint> points;  ///< closed: the last joins the first
};

/// The N-M diagram of the section at one time, unconfined strength or that of the chosen model.
[[nodiscard]] InteractionDiagram interaction(const Column& column,
                                             const thermal::TemperatureHistory& history,
                                             double time_s, Axis axis);

}  // namespace ringward::mechanical
