#include "thermal/heat_flow_run.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <cmath>
#include <set>

#include "thermal/base/error.hpp"
#include "thermal/base/units.hpp"
#include "thermal/field_at_time.hpp"
#include "thermal/temperature_data.hpp"

namespace ringward::thermal {
namespace {

constexpr double kSameTime_s = 1e-6;
constexpr double kSharpTurn_C_s = 5.0 / 60.0;
constexpr double kPeakLeft = 0.01;  // enthalpy units below the peak that count as cooling

/// The equation with the names of its places, as the integrator wants it.
class System final : public OdeSystem {
 public:
  explicit System(HeatEquation& equation) : equation_(equation) {}
  const SparsePattern& pattern() const override { return equation_.pattern(); }
  void rate(double t_s, std::span<const double> u, std::span<double> du_dt) override {
    equation_.rate(t_s, u, du_dt);
  }
  void jacobian(double t_s, std::span<const double> u, std::span<double> values) override {
    equation_.jacobian(t_s, u, values);
  }
  std::string place(std::size_t k) const override {
    const Cell& cell = equation_.grid().cells[k];
    return fmt::format("x = {:.1f} mm, y = {:.1f} mm", units::mm_from_m(cell.x_m),
                       units::mm_from_m(cell.y_m));
  }

 private:
  HeatEquation& equation_;
};

std::vector<double> without_repeats(std::vector<double> times) {
  std::sort(times.begin(), times.end());
  const auto same = [](double a, double b) { return b - a < kSameTime_s; };
  times.erase(std::unique(times.begin(), times.end(), same), times.end());
  return times;
}

std::vector<double> stop_times(const HeatRun& run) {
  std::vector<double> stops;
  for (double t_s : run.gas.kinks_s) {
    if (t_s > kSameTime_s && t_s < run.end_s - kSameTime_s) stops.push_back(t_s);
  }
  stops = without_repeats(std::move(stops));
  stops.push_back(run.end_s);
  return stops;
}

/// Stops come first, so that of two times a hair apart the exact stop is the one kept.
std::vector<double> all_kept_times(const HeatRun& run, const std::vector<double>& stops) {
  std::vector<double> kept = stops;
  kept.push_back(0.0);
  const std::vector<double> wanted = run.kept_s.empty() ? usual_kept_times(run.end_s) : run.kept_s;
  for (double t_s : wanted) {
    const bool is_near = std::any_of(stops.begin(), stops.end(), [&](double stop) {
      return std::abs(stop - t_s) < kSameTime_s;
    });
    if (!is_near && t_s > 0.0 && t_s < run.end_s) kept.push_back(t_s);
  }
  return without_repeats(std::move(kept));
}

bool turns_sharply(const GasTemperature& gas, double t_s) {
  if (!gas.T_C) return true;
  const double dt = 1e-3;
  const double turn = (gas.T_C(t_s + dt) - 2.0 * gas.T_C(t_s) + gas.T_C(t_s - dt)) / dt;
  return std::abs(turn) > kSharpTurn_C_s;
}

/// One run from start to end, filling the data as it goes.
class Runner {
 public:
  Runner(HeatEquation& equation, const HeatRun& run, TemperatureHistory::Data& data)
      : equation_(equation),
        run_(run),
        data_(data),
        system_(equation),
        integrator_(system_, equation.initial_state(), run.tolerance),
        stops_(stop_times(run)),
        kept_(all_kept_times(run, stops_)),
        scratch_(equation.size()) {}

  void follow() {
    start();
    for (double stop_s : stops_) {
      integrator_.stop_at(stop_s);
      while (t_s_ < stop_s - kSameTime_s) advance();
      if (stop_s < run_.end_s && turns_sharply(run_.gas, stop_s)) integrator_.restart();
    }
    close();
  }

 private:
  void start() {
    const std::vector<double> u = equation_.initial_state();
    start_J_m_ = equation_.enthalpy_J_m(u);
    equation_.rate(0.0, u, scratch_);
    keep(u);
    flow_W_m_ = equation_.absorbed_W_m(0.0, u);
  }

  void advance() {
    const double before_s = t_s_;
    t_s_ = integrator_.step();
    add_absorbed(before_s);
    while (next_ < kept_.size() && kept_[next_] <= t_s_ + kSameTime_s) keep_interpolated();
    equation_.note_peaks(integrator_.state());
  }

  /// Simpson's rule over the step, independent of the integrator's own sums.
  void add_absorbed(double before_s) {
    const double middle_s = 0.5 * (before_s + t_s_);
    integrator_.interpolate(middle_s, 0, scratch_);
    const double middle_W_m = equation_.absorbed_W_m(middle_s, scratch_);
    const double after_W_m = equation_.absorbed_W_m(t_s_, integrator_.state());
    absorbed_J_m_ += (t_s_ - before_s) * (flow_W_m_ + 4.0 * middle_W_m + after_W_m) / 6.0;
    flow_W_m_ = after_W_m;
    largest_J_m_ = std::max(largest_J_m_, std::abs(absorbed_J_m_));
  }

  void keep_interpolated() {
    const double t_s = std::min(kept_[next_], t_s_);
    std::vector<double> u(equation_.size());
    integrator_.interpolate(t_s, 0, u);
    integrator_.interpolate(t_s, 1, scratch_);
    keep(std::move(u));
  }

  /// Keeps u, and the rate in scratch_, for the next kept time.
  void keep(std::vector<double> u) {
    const std::vector<double>& peaks = equation_.peaks();
    bool cools = false;
    for (std::size_t k = 0; k < u.size(); ++k) cools = cools || peaks[k] - u[k] > kPeakLeft;
    data_.peaks.emplace_back();
    if (cools) {
      data_.peaks.back() = peaks;
      for (std::size_t k = 0; k < u.size(); ++k) {
        data_.peaks.back()[k] = std::max(peaks[k], u[k]);
      }
    }
    data_.times_s.push_back(kept_[next_++]);
    data_.u.push_back(std::move(u));
    data_.du_dt.push_back(scratch_);
  }

  void close() {
    const auto copies = static_cast<double>(equation_.grid().images.size());
    HeatFlowStatistics& s = data_.statistics;
    s.cells = equation_.size();
    s.time_steps = integrator_.steps();
    s.absorbed_J_m = absorbed_J_m_ * copies;
    s.stored_J_m = (equation_.enthalpy_J_m(integrator_.state()) - start_J_m_) * copies;
    const double largest = std::max(largest_J_m_ * copies, 1e-6);
    s.energy_balance_error = std::abs(s.absorbed_J_m - s.stored_J_m) / largest;
    s.symmetry = equation_.grid().symmetry;
  }

  HeatEquation& equation_;
  const HeatRun& run_;
  TemperatureHistory::Data& data_;
  System system_;
  CvodeIntegrator integrator_;
  std::vector<double> stops_;
  std::vector<double> kept_;
  std::vector<double> scratch_;
  std::size_t next_ = 0;
  double t_s_ = 0;
  double start_J_m_ = 0;
  double flow_W_m_ = 0;
  double absorbed_J_m_ = 0;
  double largest_J_m_ = 0;
};

}  // namespace

std::vector<double> usual_kept_times(double end_s) {
  struct Stage {
    double until_min, step_min;
  };
  std::vector<double> times;
  double t_min = 0;
  for (const Stage& stage : {Stage{1, 0.1}, Stage{5, 0.25}, Stage{30, 0.5}, Stage{1e9, 1.0}}) {
    const double from_min = t_min;
    for (int k = 0; t_min < stage.until_min - 1e-9 && units::s_from_min(t_min) < end_s; ++k) {
      times.push_back(units::s_from_min(t_min));
      t_min = from_min + (k + 1) * stage.step_min;
    }
  }
  times.push_back(end_s);
  return times;
}

TemperatureHistory solve_heat_problem(HeatProblem problem, const HeatRun& run) {
  if (!(run.end_s > 0.0)) {
    throw Error(ErrorKind::bad_input, "a fire must be followed for a time above zero");
  }
  auto data = std::make_shared<TemperatureHistory::Data>();
  auto equation = std::make_unique<HeatEquation>(std::move(problem));
  data->gas_C = run.gas.T_C;
  data->kinks_s = stop_times(run);
  data->kinks_s.pop_back();
  Runner(*equation, run, *data).follow();
  data->equation = std::move(equation);
  data->finish();
  return TemperatureHistory(std::move(data));
}

}  // namespace ringward::thermal
