#pragma once

#include <functional>
#include <memory>
#include <optional>
#include <vector>

#include "mechanical/rating/rating.hpp"
#include "mechanical/rating/standing_column.hpp"

namespace ringward::mechanical {

/// Capacity of one case at one time, with what the tube does there and under the load.
struct CapacitySample {
  double time_s = 0;
  double capacity_N = 0;
  double hoop_Pa = 0;
  double pressure_Pa = 0;
  double load_hoop_Pa = 0;
  double load_pressure_Pa = 0;
};

/// One case followed until its equilibrium vanishes, or to the end.
struct CaseHistory {
  std::optional<double> fall_s;
  std::vector<CapacitySample> samples;  ///< at the times asked for, then events and the fall
  std::vector<TubeEvent> events;
  std::optional<RegainedGrip> regained;
  double reserve_N = 0;            ///< largest force over all strains, at the fall
  bool fell_by_stability = false;  ///< the second-order moment ends it, not the section
  bool fell_with_gap = false;      ///< the closing of the end gap ends it
};

/// Times are found to this (0.005 min).
inline constexpr double kTimeResolution_s = 0.3;

/// The temperatures' materials at many times, computed once for all cases and models.
class MaterialsInTime {
 public:
  explicit MaterialsInTime(const SectionMaterials& materials) : materials_(materials) {}
  [[nodiscard]] std::shared_ptr<const HotMaterials> at(double t_s);
  [[nodiscard]] const SectionMaterials& materials() const { return materials_; }

 private:
  const SectionMaterials& materials_;
  std::vector<std::shared_ptr<const HotMaterials>> kept_;  ///< ordered by time
};

/// Follows one case.
/// @param sample_s increasing times from 0 at which capacity is wanted
/// @param until_s no further than this
/// @throws Error(solver_breakdown) with the time when the equilibrium is lost by the solver
[[nodiscard]] CaseHistory follow_case(const StandingCase& fixed, MaterialsInTime& in_time,
                                      const std::vector<double>& sample_s, double until_s);

/// Follows one case without sampling its capacity, and shows the standing column at each of the
/// times that it reaches.
/// @param times_s increasing
void follow_through(const StandingCase& fixed, MaterialsInTime& in_time,
                    const std::vector<double>& times_s,
                    const std::function<void(const StandingColumn&)>& show);

/// Rates one column with one model: the earliest fall of all cases.
[[nodiscard]] SingleRating rate_single(const Column& column, ConfinementModel model,
                                       const MemberSetup& setup, MaterialsInTime& in_time);

/// 0, every minute (closer at first), the kinks of the fire, the class times and the end.
[[nodiscard]] std::vector<double> search_times(const thermal::TemperatureHistory& history);

/// Times of the printed history: every 5 min and the class times, up to `end_s`.
[[nodiscard]] bool is_history_time(double t_s);

}  // namespace ringward::mechanical
