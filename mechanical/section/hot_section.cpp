#include "mechanical/section/hot_section.hpp"

#include <algorithm>
#include <cmath>

#include "mechanical/confinement/confined_concrete.hpp"
#include "mechanical/confinement/lateral_strain.hpp"
#include "mechanical/confinement/slip.hpp"

namespace ringward::mechanical {
namespace {

constexpr double kPressureTolerance = 1e-10;  // of the pressure at yield

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
    : hoop_(grip.steel),
      grip_(grip),
      extent_m_(layout.extent_m),
      area_m2_(layout.concrete_area_m2) {
  const double floor_Pa = kLateralStrengthFloor * cold_concrete_Pa;
  for (const Fibre& fibre : layout.concrete) {
    const HotConcrete& c = hot.concrete[fibre.source];
    concrete_.push_back({fibre.u_m, fibre.v_m, fibre.area_m2, c.f_c_Pa, c.eps_c1,
                         c.eps_cu1 - c.eps_c1, c.thermal_strain, std::max(c.f_c_Pa, floor_Pa)});
    plastic_N_ += fibre.area_m2 * c.f_c_Pa;
    max_thermal_strain_ = std::max(max_thermal_strain_, c.thermal_strain);
    const double confined_peak = c.eps_c1 * (1.0 + kPeakStrainGain * (kConfinementLimit - 1.0));
    largest_strain_ = std::max(largest_strain_, confined_peak + c.eps_cu1 - c.thermal_strain);
  }
  for (const Fibre& fibre : layout.steel) {
    const HotSteel& s = hot.steel[fibre.source];
    steel_.push_back({fibre.u_m, fibre.v_m, fibre.area_m2, s.thermal_strain, SteelCurve(s)});
    bends_in_u_only_ = bends_in_u_only_ && fibre.v_m == 0.0;
    plastic_N_ += fibre.area_m2 * s.f_y_Pa;
    max_thermal_strain_ = std::max(max_thermal_strain_, s.thermal_strain);
  }
  largest_strain_ = std::max(largest_strain_, kSteelYieldStrain);
  fill_columns();
}

void HotSection::fill_columns() {
  const auto count = static_cast<Eigen::Index>(concrete_.size());
  for (Eigen::ArrayXd* column : {&columns_.u, &columns_.v, &columns_.eps_th, &columns_.force,
                                 &columns_.peak_per_eps, &columns_.slope, &columns_.eps_cu}) {
    column->resize(count);
  }
  for (Eigen::Index k = 0; k < count; ++k) {
    const Concrete& c = concrete_[static_cast<std::size_t>(k)];
    columns_.u(k) = c.u;
    columns_.v(k) = c.v;
    columns_.eps_th(k) = c.eps_th;
    columns_.force(k) = c.area * c.f_c;
    columns_.peak_per_eps(k) = 1.0 / c.eps_c1;
    columns_.slope(k) = -c.area * c.f_c / c.drop;
    columns_.eps_cu(k) = c.eps_c1 + c.drop;
    bends_in_u_only_ = bends_in_u_only_ && c.v == 0.0;
  }
}

// The inner loop of the program: the law of EN 1992-1-2 3.2.2.1 without a branch, so that the
// compiler can take two fibres at a time. Rising to x = 1, falling in a line to eps_cu, else zero.
void HotSection::add_unconfined(const StrainPlane& plane, SectionResponse& sum) const {
  const Eigen::Index count = columns_.u.size();
  thread_local Eigen::ArrayXd force;
  thread_local Eigen::ArrayXd stiffness;
  force.resize(count);
  stiffness.resize(count);
  const Columns& c = columns_;
  for (Eigen::Index k = 0; k < count; ++k) {
    const double eps =
        plane.eps0 + plane.kappa_u_1_m * c.u(k) + plane.kappa_v_1_m * c.v(k) + c.eps_th(k);
    const double x = eps * c.peak_per_eps(k);
    const double cube = x * x * x;
    const double inverse = 1.0 / (2.0 + cube);
    const double rising = 3.0 * c.force(k) * x * inverse;
    const double rising_slope =
        6.0 * c.force(k) * c.peak_per_eps(k) * (1.0 - cube) * inverse * inverse;
    const bool falls = x > 1.0;
    const bool carries = eps >= 0.0 && eps < c.eps_cu(k);
    const double branch = falls ? c.slope(k) * (eps - c.eps_cu(k)) : rising;
    const double branch_slope = falls ? c.slope(k) : rising_slope;
    force(k) = carries ? branch : 0.0;
    stiffness(k) = carries ? branch_slope : 0.0;
  }
  sum.N_N += force.sum();
  sum.M_u_Nm += force.matrix().dot(c.u.matrix());
  sum.tangent(0, 0) += stiffness.sum();
  sum.tangent(0, 1) += stiffness.matrix().dot(c.u.matrix());
  sum.tangent(1, 1) += (stiffness * c.u * c.u).sum();
  if (bends_in_u_only_) return;
  sum.M_v_Nm += force.matrix().dot(c.v.matrix());
  sum.tangent(0, 2) += stiffness.matrix().dot(c.v.matrix());
  sum.tangent(1, 2) += (stiffness * c.u * c.v).sum();
  sum.tangent(2, 2) += (stiffness * c.v * c.v).sum();
}

void HotSection::add_concrete(const StrainPlane& plane, double p_Pa, SectionResponse& sum,
                              Eigen::Vector3d& per_Pa) const {
  for (const Concrete& c : concrete_) {
    const double eps = plane.eps0 + plane.kappa_u_1_m * c.u + plane.kappa_v_1_m * c.v + c.eps_th;
    if (eps < 0.0 || c.f_c <= 0.0) continue;
    const ConfinedPeak peak = confined_peak(c.f_c, c.eps_c1, p_Pa);
    const double x = eps / peak.eps_cc;
    const double force = c.area * peak.strength_Pa;
    double in_force = 0.0;
    double slope_in_p = 0.0;
    if (x <= 1.0) {
      const double cube = x * x * x;
      const double inverse = 1.0 / (2.0 + cube);
      in_force = 3.0 * force * x * inverse;
      const double stiffness = 6.0 * force / peak.eps_cc * (1.0 - cube) * inverse * inverse;
      add_fibre(sum, c.u, c.v, in_force, stiffness);
      slope_in_p =
          in_force / peak.strength_Pa * peak.strength_per_Pa - stiffness * x * peak.eps_per_Pa;
    } else if (eps < peak.eps_cc + c.drop) {
      in_force = force * (peak.eps_cc + c.drop - eps) / c.drop;
      add_fibre(sum, c.u, c.v, in_force, -force / c.drop);
      slope_in_p =
          in_force / peak.strength_Pa * peak.strength_per_Pa + force / c.drop * peak.eps_per_Pa;
    }
    per_Pa += slope_in_p * Eigen::Vector3d(1.0, c.u, c.v);
  }
}

void HotSection::add_steel(const StrainPlane& plane, SectionResponse& sum) const {
  for (const Steel& s : steel_) {
    const double eps = plane.eps0 + plane.kappa_u_1_m * s.u + plane.kappa_v_1_m * s.v + s.eps_th;
    const StressAndTangent answer = s.curve.at(eps);
    add_fibre(sum, s.u, s.v, s.area * answer.stress_Pa, s.area * answer.tangent_Pa);
  }
}

// @source teng2007. Fibres in tension count zero; concrete displaced by bars is no fibre of its
// own.
HotSection::Lateral HotSection::lateral_strain(const StrainPlane& plane, double p_Pa) const {
  const LateralStrainCurve& curve = lateral_strain_curve();
  double mean = 0.0, per_Pa = 0.0, per_eps0 = 0.0, per_u = 0.0, per_v = 0.0;
  for (const Concrete& c : concrete_) {
    const double eps = plane.eps0 + plane.kappa_u_1_m * c.u + plane.kappa_v_1_m * c.v + c.eps_th;
    if (c.area <= 0.0 || eps <= 0.0) continue;
    const double pressure_factor = 1.0 + 8.0 * p_Pa / c.lateral_f;
    const double scale = 0.85 * pressure_factor;
    const double z = eps / (c.eps_c1 * scale);
    const LateralStrainCurve::Ratio ratio = curve.inverse(z);
    mean += c.area * ratio.y * c.eps_c1;
    per_Pa -= c.area * c.eps_c1 * ratio.slope * z * 8.0 / (c.lateral_f * pressure_factor);
    const double per_eps = c.area * ratio.slope / scale;
    per_eps0 += per_eps;
    per_u += per_eps * c.u;
    per_v += per_eps * c.v;
  }
  return {.mean = mean / area_m2_,
          .per_Pa = per_Pa / area_m2_,
          .per_plane = Eigen::Vector3d(per_eps0, per_u, per_v) / area_m2_};
}

HotSection::PressureGap HotSection::pressure_gap(const StrainPlane& plane, double p_Pa) const {
  const Lateral lateral = lateral_strain(plane, p_Pa);
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
double HotSection::solve_pressure(const StrainPlane& plane, Eigen::Vector3d& slope) const {
  slope.setZero();
  const double p_cap = grip_.pressure_per_hoop * grip_.hoop_cap_Pa;
  if (grip_.model == ConfinementModel::yield) return p_cap;
  if (p_cap <= 0.0) return 0.0;
  double low = 0.0;
  double high = p_cap;
  double p = 0.0;
  for (int iteration = 0; iteration < 80; ++iteration) {
    const PressureGap gap = pressure_gap(plane, p);
    if (p == 0.0 && gap.value_Pa <= 0.0) return 0.0;
    if (p == p_cap && gap.value_Pa >= 0.0) return p_cap;
    slope = gap.per_plane;
    (gap.value_Pa > 0.0 ? low : high) = p;
    double next = p - gap.value_Pa / gap.slope;
    if (next >= p_cap && high == p_cap && low < p_cap && p < p_cap) {
      next = p_cap;
    } else if (!(next > low && next < high)) {
      next = 0.5 * (low + high);
    }
    if (std::abs(next - p) <= kPressureTolerance * p_cap) return next;
    p = next;
  }
  return p;
}

SectionResponse HotSection::response(const StrainPlane& plane) const {
  SectionResponse sum;
  Eigen::Vector3d p_slope = Eigen::Vector3d::Zero();
  const double p_Pa = grip_.model == ConfinementModel::none ? 0.0 : solve_pressure(plane, p_slope);
  Eigen::Vector3d per_Pa = Eigen::Vector3d::Zero();
  if (p_Pa > 0.0) {
    add_concrete(plane, p_Pa, sum, per_Pa);
  } else {
    add_unconfined(plane, sum);
  }
  add_steel(plane, sum);
  mirror_tangent(sum);
  sum.tangent += per_Pa * p_slope.transpose();
  sum.pressure_Pa = p_Pa;
  sum.hoop_Pa = grip_.pressure_per_hoop > 0.0 ? p_Pa / grip_.pressure_per_hoop : 0.0;
  return sum;
}

double HotSection::hoop_after_contraction_Pa(const StrainPlane& plane, double contraction) const {
  if (grip_.model == ConfinementModel::none) return 0.0;
  const double strain = lateral_strain(plane, 0.0).mean + grip_.free_hoop_strain + contraction;
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
