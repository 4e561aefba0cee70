#include <algorithm>
#include <array>
#include <limits>

#include "mechanical/rating/single_rating.hpp"
#include "thermal/base/error.hpp"

namespace ringward::mechanical {
namespace {

/// Shares of the applied load under which a column that has fallen is followed instead.
constexpr std::array<double, 7> kLighterLoads{1.0, 0.75, 0.5, 0.25, 0.1, 0.01, 0.001};

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

struct MemberState {
  double capacity_N = 0;
  double reserve_N = 0;
  double pressure_Pa = 0;
};

MemberState state_of(const StandingColumn& standing) {
  const PathPoint limit = standing.limit();
  const double capacity_N = standing.force_N(limit);
  return {capacity_N, std::max(capacity_N, standing.reserve_N()), limit.pressure_Pa};
}

/// The states of one case at all times. From its fall on, the same column under a lighter load is
/// followed in its place; one that cannot even carry that has no capacity left.
std::vector<MemberState> member_states(StandingCase fixed, MaterialsInTime& in_time,
                                       const std::vector<double>& times_s) {
  const double load_N = fixed.load_N;
  std::vector<MemberState> states;
  for (const double share : kLighterLoads) {
    fixed.load_N = share * load_N;
    const std::vector<double> left(times_s.begin() + static_cast<std::ptrdiff_t>(states.size()),
                                   times_s.end());
    if (left.empty()) break;
    follow_through(fixed, in_time, left,
                   [&](const StandingColumn& standing) { states.push_back(state_of(standing)); });
  }
  states.resize(times_s.size());
  return states;
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

void take(CapacityState& state, const MemberState& member) {
  state.capacity_N = member.capacity_N;
  state.reserve_N = member.reserve_N;
  state.lateral_pressure_Pa = member.pressure_Pa;
  state.utilisation = member.capacity_N > 0.0 ? state.demand_N / member.capacity_N
                                              : std::numeric_limits<double>::infinity();
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
    states.push_back({.time_s = t_s,
                      .plastic_N = plastic_N(column, materials, hot),
                      .section_N = section_N(column, materials, hot),
                      .demand_N = column.load.axial_N});
  }
  bool first = true;
  for (const BendingCase& bending : setup.cases) {
    const StandingCase fixed{column,  materials,          setup.shape,
                             bending, column.confinement, column.load.axial_N};
    const std::vector<MemberState> members = member_states(fixed, in_time, times_s);
    for (std::size_t k = 0; k < states.size(); ++k) {
      if (first || members[k].capacity_N < states[k].capacity_N) take(states[k], members[k]);
    }
    first = false;
  }
  return states;
}

}  // namespace ringward::mechanical
