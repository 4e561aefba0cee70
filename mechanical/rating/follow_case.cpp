#include <algorithm>
#include <cmath>

#include "mechanical/rating/single_rating.hpp"
#include "thermal/base/error.hpp"
#include "thermal/base/units.hpp"

namespace ringward::mechanical {
namespace {

/// The solver has broken down only when even this step of time loses the equilibrium.
constexpr double kShortestStep_s = 1e-4;
/// Above this utilisation the capacity is sampled at every search time.
constexpr double kCloseToLimit = 0.85;

/// One case on its way through the fire.
class CaseFollower {
 public:
  CaseFollower(const StandingCase& fixed, MaterialsInTime& in_time)
      : fixed_(fixed), in_time_(in_time), standing_(fixed) {}

  CaseHistory run(const std::vector<double>& sample_s, double until_s) {
    if (!load()) return std::move(history_);
    for (const double t_s : sample_s) {
      if (t_s > until_s) break;
      if (!go_to(t_s)) break;
      if (!wants_sample(t_s)) continue;
      add_sample();
      if (dips_between_samples() && !recheck_dip()) break;
    }
    return std::move(history_);
  }

  void run_through(const std::vector<double>& times_s,
                   const std::function<void(const StandingColumn&)>& show) {
    sampling_ = false;
    if (!load()) return;
    const std::vector<double> search_s = search_times(in_time_.materials().history());
    for (const double t_s : times_s) {
      for (const double to_s : search_s) {
        if (to_s > standing_.time_s() && to_s < t_s && !go_to(to_s)) return;
      }
      if (!go_to(t_s)) return;
      show(standing_);
    }
  }

 private:
  /// Loads the cold column. False when it cannot carry the load.
  bool load() {
    const Standing cold = standing_.load_cold(*in_time_.at(0.0));
    if (cold == Standing::lost) throw lost_at(0.0);
    if (cold == Standing::stands && !closes_gap(standing_)) return true;
    if (cold == Standing::stands && pass_event(standing_)) return true;
    if (cold == Standing::stands) return false;
    history_.fall_s = 0.0;
    if (sampling_) add_overloaded();
    return false;
  }

  [[nodiscard]] Error lost_at(double t_s) const {
    return {ErrorKind::solver_breakdown, "the equilibrium of the member could not be computed at " +
                                             std::to_string(units::min_from_s(t_s)) + " min"};
  }

  [[nodiscard]] bool in_contact(const StandingColumn& column) const {
    return column.stance().point.pressure_Pa > 0.0;
  }

  [[nodiscard]] bool closes_gap(const StandingColumn& column) const {
    if (fixed_.model != ConfinementModel::contact || column.gap_closed()) return false;
    return column.stance().gap_closure_m >= 2.0 * fixed_.column.section.tube->end_gap_m;
  }

  /// Anything but a quiet step: its time must be closed in on.
  [[nodiscard]] bool is_eventful(Standing standing, const StandingColumn& tried) const {
    if (standing != Standing::stands || closes_gap(tried)) return true;
    return fixed_.model == ConfinementModel::contact && in_contact(tried) != in_contact(standing_);
  }

  /// Moves to `t_s`, halving the step around every event. False when the column falls on the way.
  bool go_to(double t_s) {
    while (standing_.time_s() < t_s) {
      double step = t_s - standing_.time_s();
      for (;;) {
        StandingColumn tried = standing_;
        const double to_s = step == t_s - standing_.time_s() ? t_s : standing_.time_s() + step;
        const Standing standing = move(tried, to_s);
        const bool eventful = is_eventful(standing, tried);
        // Near a limit Newton needs shorter steps than the answer does.
        const double shortest_s = standing == Standing::lost ? kShortestStep_s : kTimeResolution_s;
        if (eventful && step > shortest_s) {
          step *= 0.5;
          continue;
        }
        if (standing == Standing::lost) throw lost_at(to_s);
        if (standing == Standing::falls || standing == Standing::jumps) return fall();
        if (eventful && !pass_event(tried)) return false;
        standing_ = std::move(tried);
        note_regained_grip();
        break;
      }
    }
    return true;
  }

  Standing move(StandingColumn& column, double to_s) {
    try {
      return column.move_to(*in_time_.at(to_s));
    } catch (const Error& error) {
      if (error.kind() != ErrorKind::solver_breakdown) throw;
      return Standing::lost;  // a shorter step may succeed
    }
  }

  /// Contact lost or regained, or the end gap closed. False when the column falls with it.
  bool pass_event(StandingColumn& tried) {
    const bool contact_before = in_contact(standing_);
    if (closes_gap(tried)) {
      history_.events.push_back({TubeEventKind::end_gap_closed, standing_.time_s()});
      add_sample();
      const Standing after = tried.close_gap(*in_time_.at(tried.time_s()));
      if (after == Standing::lost) throw lost_at(tried.time_s());
      if (after == Standing::falls) {
        history_.fell_with_gap = true;
        return fall();
      }
      return true;
    }
    if (in_contact(tried) != contact_before) {
      history_.events.push_back(
          {contact_before ? TubeEventKind::contact_lost : TubeEventKind::contact_regained,
           standing_.time_s()});
      add_sample();
    }
    return true;
  }

  void note_regained_grip() {
    const double hoop_Pa = standing_.regained_hoop_Pa();
    if (hoop_Pa <= standing_.stance().point.hoop_Pa) return;
    if (!history_.regained) history_.regained = RegainedGrip{standing_.time_s(), 0.0};
    history_.regained->hoop_Pa = std::max(history_.regained->hoop_Pa, hoop_Pa);
  }

  /// The last time at which the column stood is its fire resistance.
  bool fall() {
    history_.fall_s = standing_.time_s();
    if (!sampling_) return false;
    add_sample();
    const CapacitySample& last = history_.samples.back();
    history_.reserve_N = std::max(last.capacity_N, standing_.reserve_N());
    history_.fell_by_stability = last.capacity_N < 0.9 * section_N();
    return false;
  }

  /// First maximum of the axial force at zero curvature, coarsely: only to name what governs.
  [[nodiscard]] double section_N() const {
    const HotSection& section = standing_.section();
    const double step = (0.02 - section.least_strain()) / 200;
    double largest = 0.0;
    for (int k = 0; k <= 200; ++k) {
      const double force = section.axial_force_N(section.least_strain() + k * step);
      if (force < largest) break;
      largest = force;
    }
    return largest;
  }

  /// Far below the capacity only the times of the printed history are sampled.
  [[nodiscard]] bool wants_sample(double t_s) const {
    if (is_history_time(t_s) || history_.samples.empty()) return true;
    return fixed_.load_N > kCloseToLimit * history_.samples.back().capacity_N;
  }

  void add_sample() {
    if (!sampling_) return;
    if (!history_.samples.empty() && history_.samples.back().time_s == standing_.time_s()) return;
    const PathPoint limit = standing_.limit();
    const PathPoint& load = standing_.stance().point;
    history_.samples.push_back({standing_.time_s(), standing_.force_N(limit), limit.hoop_Pa,
                                limit.pressure_Pa, load.hoop_Pa, load.pressure_Pa});
    before_last_ = last_;
    last_ = standing_;
  }

  void add_overloaded() {
    const PathPoint& limit = standing_.stance().point;
    history_.samples.push_back(
        {0.0, standing_.force_N(limit), limit.hoop_Pa, limit.pressure_Pa, 0.0, 0.0});
    history_.reserve_N = history_.samples.back().capacity_N;
  }

  /// An inner minimum of capacity close enough to the load to hide a fall between samples.
  [[nodiscard]] bool dips_between_samples() const {
    const std::size_t n = history_.samples.size();
    if (n < 3) return false;
    const double before = history_.samples[n - 3].capacity_N;
    const double middle = history_.samples[n - 2].capacity_N;
    const double after = history_.samples[n - 1].capacity_N;
    if (middle >= before || middle >= after) return false;
    return middle - fixed_.load_N < std::max(before, after) - middle;
  }

  /// Walks again through the two intervals around a minimum in short steps.
  bool recheck_dip() {
    if (!before_last_) return true;
    const std::size_t n = history_.samples.size();
    const double end_s = history_.samples[n - 1].time_s;
    StandingColumn walker = history_.samples[n - 2].time_s < end_s ? *before_last_ : standing_;
    std::swap(walker, standing_);
    constexpr int kSteps = 32;
    const double start_s = standing_.time_s();
    for (int k = 1; k <= kSteps; ++k) {
      if (!go_to(start_s + (end_s - start_s) * k / kSteps)) return false;
    }
    return true;
  }

  StandingCase fixed_;
  MaterialsInTime& in_time_;
  StandingColumn standing_;
  std::optional<StandingColumn> last_;
  std::optional<StandingColumn> before_last_;
  CaseHistory history_;
  bool sampling_ = true;
};

}  // namespace

CaseHistory follow_case(const StandingCase& fixed, MaterialsInTime& in_time,
                        const std::vector<double>& sample_s, double until_s) {
  return CaseFollower(fixed, in_time).run(sample_s, until_s);
}

void follow_through(const StandingCase& fixed, MaterialsInTime& in_time,
                    const std::vector<double>& times_s,
                    const std::function<void(const StandingColumn&)>& show) {
  CaseFollower(fixed, in_time).run_through(times_s, show);
}

}  // namespace ringward::mechanical
