#pragma once

#include <cstddef>
#include <functional>
#include <optional>
#include <string>
#include <vector>

#include "mechanical/column.hpp"
#include "thermal/base/notice.hpp"
#include "thermal/temperature_history.hpp"

namespace ringward::mechanical {

/// The column at one time: temperatures, capacity, and what the tube does at the limit state and
/// under the applied load.
struct HistoryRow {
  double time_s = 0;
  double gas_C = 0;
  std::optional<double> tube_C;
  double core_face_C = 0;
  std::optional<double> bar_max_C;
  double core_centre_C = 0;
  std::optional<double> tube_hoop_Pa;
  std::optional<double> lateral_pressure_Pa;
  std::optional<double> load_hoop_Pa;
  std::optional<double> load_pressure_Pa;
  double capacity_N = 0;
  double demand_N = 0;
  double utilisation = 0;
};

enum class TubeEventKind { contact_lost, contact_regained, end_gap_closed };

/// Hoop stress that a cooling, shrinking tube regains under the load: reported, never credited.
struct RegainedGrip {
  double time_s = 0;
  double hoop_Pa = 0;  ///< the largest while cooling
};

/// Something the tube does under the applied load, with its time.
struct TubeEvent {
  TubeEventKind kind = TubeEventKind::contact_lost;
  double time_s = 0;
};

/// One column, one confinement model, one temperature history.
struct SingleRating {
  std::optional<double> fire_resistance_s;  ///< none: stands for the whole followed fire
  std::string criterion;                    ///< what ends it, e.g. "axial resistance"
  std::vector<HistoryRow> history;
  std::vector<TubeEvent> events;
  std::optional<RegainedGrip> regained;
  double cold_capacity_N = 0;
  std::size_t governing_case = 0;  ///< index of the bending case that falls first
  double reserve_N = 0;  ///< at the fall: largest force over all strains, never the rating
};

struct Bounds {
  std::optional<double> none_s;
  std::optional<double> contact_s;
  std::optional<double> yield_s;
};

/// The answer to the main question, with all that a reviewer needs beside it.
struct Rating {
  SingleRating chosen;
  double followed_s = 0;
  double uncertainty_s = 0;      ///< numerical only: grid and time step
  std::optional<Bounds> bounds;  ///< none: not asked for
  std::optional<double>
      cold_confinement_ratio;  ///< confined over unconfined member capacity at 20 C
  thermal::HeatFlowStatistics heat_flow;
  Notices notices;
};

/// Resistance at one time, as in the contract of `capacity`.
struct CapacityState {
  double time_s = 0;
  double plastic_N = 0;
  double section_N = 0;
  double capacity_N = 0;
  double reserve_N = 0;
  double demand_N = 0;
  double utilisation = 0;
  double lateral_pressure_Pa = 0;  ///< at the member's limit state
};

/// What of a rating is wanted, and where its temperatures come from.
struct RatingScope {
  bool bounds = true;       ///< the answers of the other confinement models
  bool uncertainty = true;  ///< rates again on a coarser grid; else it is 0, not known
  /// Temperatures of the column's section in its fire, for columns that share them; may be called
  /// with the resolution of the rating and, for the uncertainty, with a coarser one. None: solved
  /// for this rating alone.
  std::function<thermal::TemperatureHistory(const thermal::Resolution&)> heat_flow = {};
};

/// Rates the column: follows the equilibrium it stands on through the fire until it vanishes.
/// @throws Error(solver_breakdown) with the time when an equilibrium cannot be computed
[[nodiscard]] Rating rate(const Column& column, const thermal::FireExposure& fire,
                          thermal::Accuracy accuracy, const RatingScope& scope = {});

/// @param times_s increasing, within the history
[[nodiscard]] std::vector<CapacityState> capacities(const Column& column,
                                                    const thermal::TemperatureHistory& history,
                                                    const std::vector<double>& times_s);

}  // namespace ringward::mechanical
