#include "mechanical/rating/rating.hpp"

#include <algorithm>
#include <cmath>

#include "mechanical/rating/rating_notices.hpp"
#include "mechanical/rating/single_rating.hpp"

namespace ringward::mechanical {
namespace {

// The second grid of the error estimate: every cell and time tolerance this much coarser. Twice as
// coarse was tried: the error changes sign on the way in some columns, and the difference vanishes.
constexpr double kCoarserScale = 1.5;
// With an error of order p the error of the finer answer is the difference over 1.5^p - 1. The
// fields converge with order two, but the time of a fall with less, because strength is lost step
// by step as cells pass the plateau of the moisture and fibres their peak strain: orders near one
// were found (docs/validation.md), and order one makes it twice the difference.
constexpr double kErrorPerDifference = 2.0;

bool tube_confines(const Column& column) {
  return column.section.is_circular() && column.section.tube &&
         column.section.tube->role == thermal::TubeRole::confining;
}

/// All models on one temperature history; the setup is shared, because neither directions nor
/// fibres depend on the model.
class HistoryRating {
 public:
  HistoryRating(const Column& column, const thermal::TemperatureHistory& history)
      : column_(column),
        materials_(column, history),
        in_time_(materials_),
        setup_(member_setup(column, materials_)) {}

  /// Only the case that governed on another grid: directions keep their order.
  SingleRating rate_case(std::size_t index) {
    MemberSetup one{setup_.shape, {setup_.cases.at(index)}};
    return rate_single(column_, column_.confinement, one, in_time_);
  }

  SingleRating rate(ConfinementModel model) {
    return rate_single(column_, model, setup_, in_time_);
  }

 private:
  const Column& column_;
  SectionMaterials materials_;
  MaterialsInTime in_time_;
  MemberSetup setup_;
};

double resistance_or(const std::optional<double>& fire_resistance_s, double followed_s) {
  return fire_resistance_s.value_or(followed_s);
}

double numerical_uncertainty_s(const Column& column, const thermal::TemperatureHistory& coarser,
                               const SingleRating& chosen) {
  const SingleRating again = HistoryRating(column, coarser).rate_case(chosen.governing_case);
  const double followed_s = coarser.end_s();
  const double difference_s = std::abs(resistance_or(chosen.fire_resistance_s, followed_s) -
                                       resistance_or(again.fire_resistance_s, followed_s));
  return kErrorPerDifference * difference_s + kTimeResolution_s;
}

void add_bounds(Rating& rating, const Column& column, HistoryRating& rerate) {
  const std::optional<double>& chosen_s = rating.chosen.fire_resistance_s;
  if (!tube_confines(column)) {
    rating.bounds = Bounds{chosen_s, chosen_s, chosen_s};
    return;
  }
  const auto with = [&](ConfinementModel model) {
    return model == column.confinement ? rating.chosen : rerate.rate(model);
  };
  const SingleRating none = with(ConfinementModel::none);
  rating.bounds = Bounds{none.fire_resistance_s, with(ConfinementModel::contact).fire_resistance_s,
                         with(ConfinementModel::yield).fire_resistance_s};
  rating.cold_confinement_ratio = rating.chosen.cold_capacity_N / none.cold_capacity_N;
}

}  // namespace

Rating rate(const Column& column, const thermal::FireExposure& fire, thermal::Accuracy accuracy,
            const RatingScope& scope) {
  const auto heat_flow = [&](const thermal::Resolution& resolution) {
    return scope.heat_flow ? scope.heat_flow(resolution)
                           : solve_heat_flow(column.section, fire, resolution);
  };
  const thermal::TemperatureHistory history = heat_flow({.accuracy = accuracy});
  HistoryRating rerate(column, history);
  Rating rating;
  rating.chosen = rerate.rate(column.confinement);
  rating.followed_s = history.end_s();
  rating.heat_flow = history.statistics();
  if (scope.bounds) add_bounds(rating, column, rerate);
  if (scope.uncertainty && resistance_or(rating.chosen.fire_resistance_s, 1.0) > 0.0) {
    const thermal::TemperatureHistory coarser =
        heat_flow({.accuracy = accuracy, .scale = kCoarserScale});
    rating.uncertainty_s = numerical_uncertainty_s(column, coarser, rating.chosen);
  }
  rating.notices = rating_notices(column, fire, rating);
  rating.notices.insert(rating.notices.end(), history.notices().begin(), history.notices().end());
  return rating;
}

}  // namespace ringward::mechanical
