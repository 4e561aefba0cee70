#include "mechanical/rating/single_rating.hpp"

#include <algorithm>
#include <array>
#include <cmath>

#include "thermal/base/units.hpp"

namespace ringward::mechanical {
namespace {

constexpr std::array<double, 10> kClasses_min{15, 20, 30, 45, 60, 90, 120, 180, 240, 360};

constexpr std::size_t kKeptPoints = 600'000;  // about 40 MB of hot materials

void fill_temperatures(HistoryRow& row, const MaterialsInTime& in_time, const HotMaterials& hot,
                       const Column& column) {
  const thermal::TemperatureHistory& field = in_time.materials().history();
  row.gas_C = field.gas_C(row.time_s);
  if (column.section.tube) row.tube_C = field.tube_C(row.time_s);
  row.core_face_C = field.core_face_C(row.time_s);
  row.core_centre_C = field.core_centre_C(row.time_s);
  if (!column.section.bars.empty()) row.bar_max_C = hot.bar_max_C;
}

HistoryRow history_row(const Column& column, const CapacitySample& sample,
                       MaterialsInTime& in_time) {
  HistoryRow row;
  row.time_s = sample.time_s;
  row.capacity_N = sample.capacity_N;
  row.demand_N = column.load.axial_N;
  row.utilisation = column.load.axial_N / sample.capacity_N;
  fill_temperatures(row, in_time, *in_time.at(sample.time_s), column);
  if (column.section.tube) {
    row.tube_hoop_Pa = sample.hoop_Pa;
    row.lateral_pressure_Pa = sample.pressure_Pa;
    row.load_hoop_Pa = sample.load_hoop_Pa;
    row.load_pressure_Pa = sample.load_pressure_Pa;
  }
  return row;
}

/// The samples of the governing case, each replaced by that of a weaker case at the same time.
std::vector<CapacitySample> least_of(const std::vector<CaseHistory>& cases, std::size_t governing) {
  std::vector<CapacitySample> least = cases[governing].samples;
  for (const CaseHistory& other : cases) {
    for (CapacitySample& sample : least) {
      for (const CapacitySample& candidate : other.samples) {
        if (candidate.time_s == sample.time_s && candidate.capacity_N < sample.capacity_N) {
          sample = candidate;
        }
      }
    }
  }
  return least;
}

bool has_event(const CaseHistory& history, double t_s) {
  return std::any_of(history.events.begin(), history.events.end(), [&](const TubeEvent& e) {
    return std::abs(e.time_s - t_s) <= kTimeResolution_s;
  });
}

std::string criterion_of(const CaseHistory& governing, const Column& column) {
  if (!governing.fall_s) return "none reached";
  if (governing.fell_with_gap) return "loss of confinement when the end gap closes";
  if (*governing.fall_s == 0.0) return "load above the resistance at 20 C";
  const Load& load = column.load;
  const bool eccentric = load.moments_given
                             ? load.moment_x_Nm != 0.0 || load.moment_y_Nm != 0.0
                             : load.eccentricity_x_m != 0.0 || load.eccentricity_y_m != 0.0;
  if (eccentric) return "bending with axial force";
  return governing.fell_by_stability ? "buckling (second-order moment)" : "axial resistance";
}

}  // namespace

std::shared_ptr<const HotMaterials> MaterialsInTime::at(double t_s) {
  const auto place = std::lower_bound(
      kept_.begin(), kept_.end(), t_s,
      [](const std::shared_ptr<const HotMaterials>& hot, double t) { return hot->time_s < t; });
  if (place != kept_.end() && (*place)->time_s == t_s) return *place;
  auto made = std::make_shared<const HotMaterials>(materials_.at(t_s));
  if ((kept_.size() + 1) * made->concrete.size() <= kKeptPoints) kept_.insert(place, made);
  return made;
}

bool is_history_time(double t_s) {
  const double t_min = units::min_from_s(t_s);
  if (std::abs(t_min / 5.0 - std::round(t_min / 5.0)) < 1e-9) return true;
  return std::any_of(kClasses_min.begin(), kClasses_min.end(),
                     [&](double c) { return std::abs(t_min - c) < 1e-9; });
}

std::vector<double> search_times(const thermal::TemperatureHistory& history) {
  std::vector<double> times{history.end_s()};
  for (double t_s = 0.0; t_s < history.end_s(); t_s += t_s < 600.0 ? 30.0 : 60.0)
    times.push_back(t_s);
  for (const double kink_s : history.kinks_s()) times.push_back(kink_s);
  std::sort(times.begin(), times.end());
  const auto close = [](double a, double b) { return b - a < 1e-6; };
  times.erase(std::unique(times.begin(), times.end(), close), times.end());
  return times;
}

SingleRating rate_single(const Column& column, ConfinementModel model, const MemberSetup& setup,
                         MaterialsInTime& in_time) {
  const std::vector<double> times = search_times(in_time.materials().history());
  double until_s = in_time.materials().history().end_s();
  std::vector<CaseHistory> cases;
  std::size_t governing = 0;
  for (const BendingCase& bending : setup.cases) {
    const StandingCase fixed{column, in_time.materials(), setup.shape, bending,
                             model,  column.load.axial_N};
    cases.push_back(follow_case(fixed, in_time, times, until_s));
    if (cases.back().fall_s && (cases.size() == 1 || *cases.back().fall_s < until_s)) {
      governing = cases.size() - 1;
      until_s = *cases.back().fall_s;
    }
  }
  const CaseHistory& worst = cases[governing];
  SingleRating rating;
  rating.fire_resistance_s = worst.fall_s;
  rating.governing_case = governing;
  rating.criterion = criterion_of(worst, column);
  rating.events = worst.events;
  rating.regained = worst.regained;
  rating.reserve_N = worst.reserve_N;
  for (const CapacitySample& sample : least_of(cases, governing)) {
    if (rating.history.empty()) rating.cold_capacity_N = sample.capacity_N;
    const bool is_fall = worst.fall_s && sample.time_s == *worst.fall_s;
    const bool is_end = sample.time_s == times.back();
    if (is_fall || is_end || is_history_time(sample.time_s) || has_event(worst, sample.time_s)) {
      rating.history.push_back(history_row(column, sample, in_time));
    }
  }
  return rating;
}

}  // namespace ringward::mechanical
