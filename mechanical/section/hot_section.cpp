#include "mechanical/section/hot_section.hpp"

#include <algorithm>
#include <cmath>

#include "mechanical/confinement/slip.hpp"

namespace ringward::mechanical {
namespace {

// Of the pressure at yield: after a step of Newton this short the error is its square.
constexpr double kPressureTolerance = 1e-7;

/// Adds one fibre of given stress and tangent to the section forces.
inline void add_fibre(SectionResponse& sum, double u, double v, double force, double stiffness) {
  sum.N_N += force;
  sum.M_u_Nm += force * u;
  sum.M_v_Nm += force * v;
  sum.tangent(0, 0) += stiffness;
  sum.tangent(0, 1) += stiffness * u;
  sum.tangent(0, 2) += stiffness * v;
  sum.tangent(1, 1) += stiffness * u * u;
  sum.tangent(1, 2) += stiffness * u * v;
  sum.tangent(2, 2) += stiffness * v * v;
}

void mirror_tangent(SectionResponse& sum) {
  sum.tangent(1, 0) = sum.tangent(0, 1);
  sum.tangent(2, 0) = sum.tangent(0, 2);
  sum.tangent(2, 1) = sum.tangent(1, 2);
}

}  // namespace

HotSection::HotSection(const FibreLayout& layout, const HotMaterials& hot, const TubeGrip& grip,
                       double cold_concrete_Pa)
    : concrete_(layout, hot, cold_concrete_Pa),
      hoop_(grip.steel),
      grip_(grip),
      extent_m_(layout.extent_m),
      plastic_N_(concrete_.plastic_N()),
      max_thermal_strain_(concrete_.max_thermal_strain()),
      largest_strain_(std::max(kSteelYieldStrain, concrete_.largest_strain())) {
  for (const Fibre& fibre : layout.steel) {
    const HotSteel& s = hot.steel[fibre.source];
    steel_.push_back({fibre.u_m, fibre.v_m, fibre.area_m2, s.thermal_strain, SteelCurve(s)});
    plastic_N_ += fibre.area_m2 * s.f_y_Pa;
    max_thermal_strain_ = std::max(max_thermal_strain_, s.thermal_strain);
  }
  if (grip.model == ConfinementModel::yield) {
    confined_ = concrete_.confined_by(grip.pressure_per_hoop * grip.hoop_cap_Pa);
  }
}

void HotSection::add_steel(const StrainPlane& plane, SectionResponse& sum) const {
  for (const Steel& s : steel_) {
    const double eps = plane.eps0 + plane.kappa_u_1_m * s.u + plane.kappa_v_1_m * s.v + s.eps_th;
    const StressAndTangent answer = s.curve.at(eps);
    add_fibre(sum, s.u, s.v, s.area * answer.stress_Pa, s.area * answer.tangent_Pa);
  }
}

HotSection::PressureGap HotSection::pressure_gap(const StrainPlane& plane, double p_Pa) const {
  const ConcreteFibres::Lateral lateral = concrete_.lateral_strain(plane, p_Pa);
  const double hoop_strain = lateral.mean + grip_.free_hoop_strain;
  const StressAndTangent hoop = hoop_.at(std::max(0.0, hoop_strain));
  const bool capped = hoop.stress_Pa >= grip_.hoop_cap_Pa;
  const bool follows = hoop_strain > 0.0 && !capped;
  const double gain = follows ? grip_.pressure_per_hoop * hoop.tangent_Pa : 0.0;
  const double made_Pa = grip_.pressure_per_hoop * std::min(hoop.stress_Pa, grip_.hoop_cap_Pa);
  const double slope = gain * lateral.per_Pa - 1.0;
  return {
      .value_Pa = made_Pa - p_Pa, .slope = slope, .per_plane = -gain / slope * lateral.per_plane};
}

// The gap between the pressure that the tube makes and p falls with p, because pressure holds the
// lateral strain back: one root in [0, p at the cap], found by Newton inside a shrinking bracket.
// An end of the bracket is tried once, when Newton points past it.
double HotSection::solve_pressure(const StrainPlane& plane, double likely_Pa,
                                  Eigen::Vector3d& slope) const {
  slope.setZero();
  const double p_cap = grip_.pressure_per_hoop * grip_.hoop_cap_Pa;
  if (p_cap <= 0.0) return 0.0;
  if (concrete_.lateral_strain_bound(plane) + grip_.free_hoop_strain <= 0.0) return 0.0;
  double low = -1.0;  // not known to be below the root
  double high = 2.0 * p_cap;
  double p = std::clamp(likely_Pa, 0.0, p_cap);
  for (int iteration = 0; iteration < 80; ++iteration) {
    const PressureGap gap = pressure_gap(plane, p);
    slope = gap.per_plane;
    if (p == 0.0 && gap.value_Pa <= 0.0) return 0.0;
    if (p == p_cap && gap.value_Pa >= 0.0) return p_cap;
    (gap.value_Pa > 0.0 ? low : high) = p;
    double next = std::clamp(p - gap.value_Pa / gap.slope, 0.0, p_cap);
    if (!(next > low && next < high)) next = 0.5 * (std::max(0.0, low) + std::min(p_cap, high));
    if (std::abs(next - p) <= kPressureTolerance * p_cap) return next;
    p = next;
  }
  return p;
}

void HotSection::add_contact(const StrainPlane& plane, double likely_Pa,
                             SectionResponse& sum) const {
  Eigen::Vector3d p_slope;
  sum.pressure_Pa = solve_pressure(plane, likely_Pa, p_slope);
  if (sum.pressure_Pa > 0.0) {
    const Eigen::Vector3d per_Pa = concrete_.add_confined(plane, sum.pressure_Pa, sum);
    mirror_tangent(sum);
    sum.tangent += per_Pa * p_slope.transpose();
  } else {
    concrete_.add_unconfined(plane, sum);
    mirror_tangent(sum);
  }
}

SectionResponse HotSection::response(const StrainPlane& plane, double likely_Pa) const {
  SectionResponse sum;
  add_steel(plane, sum);
  if (grip_.model == ConfinementModel::contact) {
    add_contact(plane, likely_Pa, sum);
  } else {
    (confined_ ? *confined_ : concrete_).add_unconfined(plane, sum);
    mirror_tangent(sum);
    if (confined_) sum.pressure_Pa = grip_.pressure_per_hoop * grip_.hoop_cap_Pa;
  }
  sum.hoop_Pa = grip_.pressure_per_hoop > 0.0 ? sum.pressure_Pa / grip_.pressure_per_hoop : 0.0;
  return sum;
}

double HotSection::hoop_after_contraction_Pa(const StrainPlane& plane, double contraction) const {
  if (grip_.model == ConfinementModel::none) return 0.0;
  const double strain =
      concrete_.lateral_strain(plane, 0.0).mean + grip_.free_hoop_strain + contraction;
  return std::min(grip_.hoop_cap_Pa, hoop_.at(std::max(0.0, strain)).stress_Pa);
}

double mean_core_expansion(const FibreLayout& layout, const HotMaterials& hot) {
  double sum = 0.0;
  for (const Fibre& fibre : layout.concrete) {
    if (fibre.area_m2 > 0.0) sum += fibre.area_m2 * hot.concrete[fibre.source].thermal_strain;
  }
  return sum / layout.concrete_area_m2;
}

TubeGrip tube_grip(const Column& column, ConfinementModel model, const FibreLayout& layout,
                   const HotMaterials& hot) {
  if (model == ConfinementModel::none || !hot.tube) return {};
  const thermal::Tube& tube = *column.section.tube;
  const double core_diameter_m = column.section.core_width_m();
  const double core_expansion = mean_core_expansion(layout, hot);
  const TubeProfile profile = tube_profile(tube.friction, core_diameter_m, tube.clear_height_m);
  return {.model = model,
          .steel = *hot.tube,
          .pressure_per_hoop = 2.0 * tube.thickness_m / core_diameter_m,
          .hoop_cap_Pa = profile.mid_height_hoop * hot.tube->f_y_Pa,
          .free_hoop_strain = core_expansion - hot.tube->thermal_strain - kShrinkageGapStrain};
}

}  // namespace ringward::mechanical
