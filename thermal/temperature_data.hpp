#pragma once

#include <functional>
#include <memory>
#include <vector>

#include "thermal/grid/location.hpp"
#include "thermal/heat_equation.hpp"
#include "thermal/temperature_history.hpp"

namespace ringward::thermal {

/// A face of a core cell that is part of the core's outline.
struct CoreFace {
  CellIndex at;
  Side side = Side::high_1;
};

/// What a TemperatureHistory keeps: the enthalpies and their rates, from which temperatures
/// between the kept times follow by a cubic (enthalpy is smooth in time where the temperature
/// has kinks, as at the ends of the moisture plateau).
struct TemperatureHistory::Data {
  std::unique_ptr<const HeatEquation> equation;
  HeatFlowStatistics statistics;
  Notices notices;
  std::function<double(double t_s)> gas_C;
  std::vector<double> kinks_s;

  std::vector<double> times_s;
  std::vector<std::vector<double>> u;  // by kept time, by cell
  std::vector<std::vector<double>> du_dt;
  /// Highest enthalpies so far; an empty one where every cell is at its highest.
  std::vector<std::vector<double>> peaks;

  std::vector<Probe> tube_strips;  // means over the wall
  std::vector<double> tube_C;      // by kept time, of the hottest strip
  std::vector<double> tube_peak_C;
  std::vector<CoreFace> core_faces;
  std::vector<GridPoint> core_corners;

  /// Prepares strips, faces, the tube's history and the notices once all fields are in.
  void finish();
};

}  // namespace ringward::thermal
