#include "cli/dossier/dossier_data.hpp"

#include <tbb/parallel_for.h>

#include <algorithm>
#include <cmath>
#include <memory>

#include "cli/commands/option_values.hpp"
#include "cli/evidence/case_reading.hpp"
#include "cli/input/reader.hpp"
#include "cli/output/rate_words.hpp"
#include "thermal/base/units.hpp"

namespace ringward::cli {
namespace {

using mechanical::Axis;
using mechanical::ConfinementModel;

constexpr double kDiagramTimes_min[] = {0, 30, 60, 90, 120};
constexpr double kSameTime_s = 0.5;

// The temperatures of the rating, kept for everything else; the coarser ones of its uncertainty are
// not.
class KeptHeatFlow {
 public:
  explicit KeptHeatFlow(const ColumnInput& input) : input_(input) {}

  [[nodiscard]] thermal::TemperatureHistory operator()(const thermal::Resolution& resolution) {
    const thermal::Section& section = input_.column.section;
    if (resolution.scale != 1.0) return thermal::solve_heat_flow(section, input_.fire, resolution);
    if (!kept_) kept_ = thermal::solve_heat_flow(section, input_.fire, resolution);
    return *kept_;
  }

 private:
  const ColumnInput& input_;
  std::optional<thermal::TemperatureHistory> kept_;
};

std::vector<double> class_times_before(double end_s) {
  std::vector<double> times_s = default_times_s(end_s, true);
  std::erase_if(times_s, [end_s](double time_s) { return time_s > end_s - kSameTime_s; });
  return times_s;
}

// The required time where the column reaches it, else its class, else its end.
double hand_check_time_s(const RateReport& report, double end_s) {
  const std::optional<double>& required_s = report.input.required_s;
  if (required_s && *required_s <= end_s) return *required_s;
  const std::optional<int>& class_min = report.verdict.class_min;
  if (class_min && *class_min > 0) return units::s_from_min(*class_min);
  return end_s;
}

// A confining tube may let go between two times of the history, which are 5 min apart.
std::vector<double> first_minutes_s(const RateReport& report, double end_s) {
  std::vector<double> times_s;
  if (!has_confining_tube(report)) return times_s;
  for (int k = 0; k <= 20; ++k) {
    const double time_s = 30.0 * k;
    if (time_s < end_s) times_s.push_back(time_s);
  }
  return times_s;
}

// Along y only where that is another diagram than along x.
std::vector<Axis> axes_of(const ColumnInput& input) {
  const thermal::Section& section = input.column.section;
  const thermal::ExposedParts& exposed = input.fire.exposed;
  const bool all_round =
      !exposed.heated_arc &&
      std::all_of(exposed.faces.begin(), exposed.faces.end(), [](thermal::FaceCondition face) {
        return face == thermal::FaceCondition::heated;
      });
  const bool alike =
      section.outline.shape != thermal::Shape::rectangular && !section.steel_shape && all_round;
  return alike ? std::vector{Axis::x} : std::vector{Axis::x, Axis::y};
}

std::vector<mechanical::InteractionDiagram> diagrams_of(
    const ColumnInput& input, const thermal::TemperatureHistory& history) {
  std::vector<std::pair<Axis, double>> wanted;
  for (const Axis axis : axes_of(input)) {
    for (const double time_min : kDiagramTimes_min) {
      const double time_s = units::s_from_min(time_min);
      if (time_s <= history.end_s()) wanted.emplace_back(axis, time_s);
    }
  }
  std::vector<mechanical::InteractionDiagram> diagrams(wanted.size());
  tbb::parallel_for(std::size_t{0}, wanted.size(), [&](std::size_t i) {
    diagrams[i] = mechanical::interaction(input.column, history, wanted[i].second, wanted[i].first);
  });
  return diagrams;
}

std::vector<ModelHistory> other_models(const RateReport& report,
                                       const thermal::TemperatureHistory& history) {
  std::vector<ModelHistory> others;
  if (!has_confining_tube(report)) return others;
  mechanical::RatingScope scope{.bounds = false, .uncertainty = false};
  scope.heat_flow = [&history](const thermal::Resolution&) { return history; };
  for (const ConfinementModel model :
       {ConfinementModel::none, ConfinementModel::contact, ConfinementModel::yield}) {
    if (model == report.input.column.confinement) continue;
    mechanical::Column column = report.input.column;
    column.confinement = model;
    others.push_back(
        {model,
         mechanical::rate(column, report.input.fire, report.input.accuracy, scope).chosen.history});
  }
  return others;
}

}  // namespace

DossierData dossier_data(InputSource source, const std::vector<std::string>& overrides) {
  ColumnInput input = read_column(source, overrides);
  KeptHeatFlow heat_flow(input);
  mechanical::RatingScope scope;
  scope.heat_flow = std::ref(heat_flow);
  RateReport report = rate_report(input, scope);
  thermal::TemperatureHistory history = heat_flow({.accuracy = input.accuracy, .scale = 1.0});
  const double end_s = report.rating.chosen.fire_resistance_s.value_or(report.rating.followed_s);

  std::vector<double> shown_s = class_times_before(end_s);
  const std::vector<double> state_times_s = shown_s;
  shown_s.push_back(end_s);
  const double check_s = hand_check_time_s(report, end_s);
  Field field = field_of(input.column.section, history, shown_s, {});
  std::vector<mechanical::CapacityState> states =
      mechanical::capacities(input.column, history, state_times_s);
  std::vector<mechanical::CapacityState> first_minutes =
      mechanical::capacities(input.column, history, first_minutes_s(report, end_s));
  const mechanical::CapacityState check_state =
      mechanical::capacities(input.column, history, {check_s}).front();
  std::vector<ModelHistory> others = other_models(report, history);
  return {.source = source,
          .overrides = overrides,
          .report = std::move(report),
          .history = history,
          .end_s = end_s,
          .field = std::move(field),
          .states = std::move(states),
          .first_minutes = std::move(first_minutes),
          .diagrams = diagrams_of(input, history),
          .other_models = std::move(others),
          .assumptions = rerun(source, overrides, other_choices(input)),
          .hand_check = hand_check(input.column, history, check_s),
          .hand_check_state = check_state,
          .evidence = run_cases(built_in_cases())};
}

}  // namespace ringward::cli
