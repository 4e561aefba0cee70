#include <algorithm>
#include <array>

#include "mechanical/rating/single_rating.hpp"
#include "thermal/base/error.hpp"

namespace ringward::mechanical {
namespace {

/// Shares of the applied load under which a column that has fallen is followed instead.
constexpr std::array<double, 5> kLighterLoads{1.0, 0.5, 0.1, 0.01, 0.001};

/// Largest value of a function that may have several maxima: sampled closely, then refined around
/// the best sample by golden section.
template <class Function>
double largest_value(Function f, double from, double to, int count) {
  const double step = (to - from) / count;
  double best_at = from;
  double best = f(from);
  for (int k = 1; k <= count; ++k) {
    const double value = f(from + k * step);
    if (value > best) {
      best = value;
      best_at = from + k * step;
    }
  }
  constexpr double kGolden = 0.6180339887498949;
  double low = best_at - step;
  double high = best_at + step;
  for (int k = 0; k < 30; ++k) {
    const double left = high - kGolden * (high - low);
    const double right = low + kGolden * (high - low);
    if (f(left) > f(right)) {
      high = right;
    } else {
      low = left;
    }
  }
  return std::max(best, f(0.5 * (low + high)));
}

/// Follows one case under a load from the cold state to `t_s`. None when it does not stand there.
std::optional<StandingColumn> stand_at(const StandingCase& fixed, MaterialsInTime& in_time,
                                       double t_s) {
  CaseHistory history;
  std::optional<StandingColumn> last = follow_to(fixed, in_time, t_s, history);
  if (history.fall_s) return std::nullopt;
  return last;
}

struct MemberState {
  double capacity_N = 0;
  double reserve_N = 0;
  double pressure_Pa = 0;
};

MemberState member_state(StandingCase fixed, MaterialsInTime& in_time, double t_s) {
  const double load_N = fixed.load_N;
  for (const double share : kLighterLoads) {
    fixed.load_N = share * load_N;
    const std::optional<StandingColumn> standing = stand_at(fixed, in_time, t_s);
    if (!standing) continue;
    const PathPoint limit = standing->limit();
    const double capacity_N = standing->force_N(limit);
    return {capacity_N, std::max(capacity_N, standing->reserve_N()), limit.pressure_Pa};
  }
  return {};
}

double section_N(const Column& column, const SectionMaterials& materials, const HotMaterials& hot) {
  const FibreLayout layout =
      merged_in_v(fibre_layout(column.section, materials.history().grid(), Direction{1, 0}));
  const TubeGrip grip = tube_grip(column, column.confinement, layout, hot);
  const HotSection section(layout, hot, grip, materials.cold_concrete_Pa());
  const auto force = [&](double eps0) { return section.axial_force_N(eps0); };
  return largest_value(force, section.least_strain(), section.largest_strain(), 1500);
}

double plastic_N(const Column& column, const SectionMaterials& materials, const HotMaterials& hot) {
  const FibreLayout layout =
      fibre_layout(column.section, materials.history().grid(), Direction{1, 0});
  return HotSection(layout, hot, TubeGrip{}, materials.cold_concrete_Pa()).plastic_N();
}

}  // namespace

std::vector<CapacityState> capacities(const Column& column,
                                      const thermal::TemperatureHistory& history,
                                      const std::vector<double>& times_s) {
  const SectionMaterials materials(column, history);
  MaterialsInTime in_time(materials);
  const MemberSetup setup = member_setup(column, materials);
  std::vector<CapacityState> states;
  for (const double t_s : times_s) {
    const HotMaterials& hot = *in_time.at(t_s);
    CapacityState state{.time_s = t_s,
                        .plastic_N = plastic_N(column, materials, hot),
                        .section_N = section_N(column, materials, hot),
                        .demand_N = column.load.axial_N};
    bool first = true;
    for (const BendingCase& bending : setup.cases) {
      const StandingCase fixed{column,  materials,          setup.shape,
                               bending, column.confinement, column.load.axial_N};
      const MemberState member = member_state(fixed, in_time, t_s);
      if (first || member.capacity_N < state.capacity_N) {
        state.capacity_N = member.capacity_N;
        state.reserve_N = member.reserve_N;
        state.lateral_pressure_Pa = member.pressure_Pa;
      }
      first = false;
    }
    state.utilisation = state.demand_N / state.capacity_N;
    states.push_back(state);
  }
  return states;
}

}  // namespace ringward::mechanical
