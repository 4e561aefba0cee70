#include "tests/support/finer_reference.hpp"

#include <cmath>

#include "mechanical/rating/single_rating.hpp"

namespace ringward::testing {

using namespace mechanical;

FinerReference finer_reference(const Column& column, const thermal::FireExposure& fire,
                               const Rating& standard) {
  constexpr double kShareOfError = 1.0 - 0.45 * 0.45;
  const thermal::TemperatureHistory history =
      solve_heat_flow(column.section, fire, {.accuracy = thermal::Accuracy::fine});
  const SectionMaterials materials(column, history);
  MaterialsInTime in_time(materials);
  const MemberSetup all = member_setup(column, materials);
  const MemberSetup one{all.shape, {all.cases.at(standard.chosen.governing_case)}};
  const SingleRating fine = rate_single(column, column.confinement, one, in_time);
  FinerReference reference;
  reference.fire_resistance_s = fine.fire_resistance_s.value_or(fire.duration_s);
  const double R_s = standard.chosen.fire_resistance_s.value_or(fire.duration_s);
  reference.error_s = (R_s - reference.fire_resistance_s) / kShareOfError;
  return reference;
}

}  // namespace ringward::testing
