#include "mechanical/section/concrete_fibres.hpp"

#include <algorithm>

#include "mechanical/confinement/confined_concrete.hpp"
#include "mechanical/confinement/lateral_strain.hpp"

namespace ringward::mechanical {
namespace {

constexpr double kLateralScale = 0.85;  ///< of the law of teng2007

/// Room for the values of every fibre, kept from call to call.
struct Workspace {
  Eigen::ArrayXd force;
  Eigen::ArrayXd stiffness;
  Eigen::ArrayXd per_Pa;
  explicit Workspace(Eigen::Index count) : force(count), stiffness(count), per_Pa(count) {}
};

Workspace& workspace(Eigen::Index count) {
  thread_local Workspace kept(0);
  if (kept.force.size() != count) kept = Workspace(count);
  return kept;
}

// Below this strength a fibre carries nothing, with or without pressure.
constexpr double kNoStrength_Pa = 1.0;

inline double strain_at(const StrainPlane& plane, double u, double v, double eps_th) {
  return plane.eps0 + plane.kappa_u_1_m * u + plane.kappa_v_1_m * v + eps_th;
}

}  // namespace

ConcreteFibres::ConcreteFibres(const FibreLayout& layout, const HotMaterials& hot,
                               double cold_concrete_Pa) {
  const auto count = static_cast<Eigen::Index>(layout.concrete.size());
  for (Eigen::ArrayXd* column :
       {&u_, &v_, &area_, &f_c_, &eps_c1_, &drop_, &eps_th_, &lateral_area_, &per_lateral_f_}) {
    column->resize(count);
  }
  const double floor_Pa = kLateralStrengthFloor * cold_concrete_Pa;
  for (Eigen::Index k = 0; k < count; ++k) {
    const Fibre& fibre = layout.concrete[static_cast<std::size_t>(k)];
    const HotConcrete& c = hot.concrete[fibre.source];
    u_(k) = fibre.u_m;
    v_(k) = fibre.v_m;
    area_(k) = fibre.area_m2;
    f_c_(k) = c.f_c_Pa;
    eps_c1_(k) = c.eps_c1;
    drop_(k) = c.eps_cu1 - c.eps_c1;
    eps_th_(k) = c.thermal_strain;
    lateral_area_(k) = std::max(0.0, fibre.area_m2) / layout.concrete_area_m2;
    per_lateral_f_(k) = 8.0 / std::max(c.f_c_Pa, floor_Pa);
    lies_on_u_ = lies_on_u_ && fibre.v_m == 0.0;
  }
  derive();
}

void ConcreteFibres::derive() {
  force_ = area_ * f_c_;
  per_eps_c1_ = eps_c1_.inverse();
  per_drop_ = drop_.inverse();
  eps_cu_ = eps_c1_ + drop_;
  bound_in_eps_ = LateralStrainCurve::kBoundLinear / kLateralScale * lateral_area_;
  bound_in_square_ = LateralStrainCurve::kBoundSquare / (kLateralScale * kLateralScale) *
                     lateral_area_ * per_eps_c1_;
  peak_per_gain_ = kPeakStrainGain * eps_c1_ / f_c_.max(kNoStrength_Pa);
}

ConcreteFibres ConcreteFibres::confined_by(double p_Pa) const {
  ConcreteFibres confined = *this;
  for (Eigen::Index k = 0; k < f_c_.size(); ++k) {
    if (f_c_(k) <= 0.0) continue;
    const ConfinedPeak peak = confined_peak(f_c_(k), eps_c1_(k), p_Pa);
    confined.f_c_(k) = peak.strength_Pa;
    confined.eps_c1_(k) = peak.eps_cc;
  }
  confined.derive();
  return confined;
}

double ConcreteFibres::max_thermal_strain() const {
  return eps_th_.size() > 0 ? std::max(0.0, eps_th_.maxCoeff()) : 0.0;
}

double ConcreteFibres::largest_strain() const {
  constexpr double kLargestPeak = 1.0 + kPeakStrainGain * (kConfinementLimit - 1.0);
  // The drop runs from the peak to eps_cu1: the confined one starts later by the same length.
  return eps_c1_.size() > 0 ? (eps_c1_ * (kLargestPeak + 1.0) + drop_ - eps_th_).maxCoeff() : 0.0;
}

void ConcreteFibres::add_sums(const Eigen::ArrayXd& force, const Eigen::ArrayXd& stiffness,
                              SectionResponse& sum) const {
  sum.N_N += force.sum();
  sum.M_u_Nm += force.matrix().dot(u_.matrix());
  sum.tangent(0, 0) += stiffness.sum();
  sum.tangent(0, 1) += stiffness.matrix().dot(u_.matrix());
  sum.tangent(1, 1) += (stiffness * u_ * u_).sum();
  if (lies_on_u_) return;
  sum.M_v_Nm += force.matrix().dot(v_.matrix());
  sum.tangent(0, 2) += stiffness.matrix().dot(v_.matrix());
  sum.tangent(1, 2) += (stiffness * u_ * v_).sum();
  sum.tangent(2, 2) += (stiffness * v_ * v_).sum();
}

// The law of EN 1992-1-2 3.2.2.1: rising to x = 1, falling in a line to eps_cu, else zero.
void ConcreteFibres::add_unconfined(const StrainPlane& plane, SectionResponse& sum) const {
  Workspace& w = workspace(u_.size());
  for (Eigen::Index k = 0; k < u_.size(); ++k) {
    const double eps = strain_at(plane, u_(k), v_(k), eps_th_(k));
    const double fall = -force_(k) * per_drop_(k);
    const double x = eps * per_eps_c1_(k);
    const double cube = x * x * x;
    const double inverse = 1.0 / (2.0 + cube);
    const double rising = 3.0 * force_(k) * x * inverse;
    const double rising_slope = 6.0 * force_(k) * per_eps_c1_(k) * (1.0 - cube) * inverse * inverse;
    const bool falls = x > 1.0;
    const bool carries = eps >= 0.0 && eps < eps_cu_(k);
    w.force(k) = carries ? (falls ? fall * (eps - eps_cu_(k)) : rising) : 0.0;
    w.stiffness(k) = carries ? (falls ? fall : rising_slope) : 0.0;
  }
  add_sums(w.force, w.stiffness, sum);
}

// The same law with the peak of confined_peak() (confined_concrete.hpp), and its slope in p.
Eigen::Vector3d ConcreteFibres::add_confined(const StrainPlane& plane, double p_Pa,
                                             SectionResponse& sum) const {
  Workspace& w = workspace(u_.size());
  const double gain_Pa = kConfinementGain * p_Pa;
  for (Eigen::Index k = 0; k < u_.size(); ++k) {
    const double eps = strain_at(plane, u_(k), v_(k), eps_th_(k));
    const double limit_Pa = (kConfinementLimit - 1.0) * f_c_(k);
    const bool capped = gain_Pa >= limit_Pa;
    const double more_Pa = capped ? limit_Pa : gain_Pa;
    const double eps_cc = eps_c1_(k) + peak_per_gain_(k) * more_Pa;
    const double force = area_(k) * (f_c_(k) + more_Pa);
    const double per_eps = 1.0 / eps_cc;
    const double fall = -per_drop_(k);
    const double x = eps * per_eps;
    const double cube = x * x * x;
    const double inverse = 1.0 / (2.0 + cube);
    const bool falls = x > 1.0;
    const double eps_cu = eps_cc + drop_(k);
    const bool carries = eps >= 0.0 && eps < eps_cu;
    const double share = carries ? (falls ? fall * (eps - eps_cu) : 3.0 * x * inverse) : 0.0;
    const double rising = 6.0 * per_eps * (1.0 - cube) * inverse * inverse;
    const double slope = carries ? (falls ? fall : rising) : 0.0;
    // A later peak shifts the falling branch and stretches the rising one.
    const double per_peak = -slope * (falls ? 1.0 : x);
    const double per_gain_force = area_(k) * share + force * per_peak * peak_per_gain_(k);
    w.force(k) = force * share;
    w.stiffness(k) = force * slope;
    w.per_Pa(k) = capped ? 0.0 : kConfinementGain * per_gain_force;
  }
  add_sums(w.force, w.stiffness, sum);
  return {w.per_Pa.sum(), w.per_Pa.matrix().dot(u_.matrix()), w.per_Pa.matrix().dot(v_.matrix())};
}

ConcreteFibres::Lateral ConcreteFibres::lateral_strain(const StrainPlane& plane,
                                                       double p_Pa) const {
  const LateralStrainCurve& curve = lateral_strain_curve();
  Workspace& w = workspace(u_.size());
  double mean = 0.0;
  double per_Pa = 0.0;
  for (Eigen::Index k = 0; k < u_.size(); ++k) {
    const double eps = std::max(0.0, strain_at(plane, u_(k), v_(k), eps_th_(k)));
    const double per_scale = 1.0 / (kLateralScale * (1.0 + per_lateral_f_(k) * p_Pa));
    const LateralStrainCurve::Ratio ratio = curve.inverse(eps * per_scale * per_eps_c1_(k));
    mean += lateral_area_(k) * ratio.y * eps_c1_(k);
    const double per_eps = eps > 0.0 ? lateral_area_(k) * ratio.slope * per_scale : 0.0;
    per_Pa -= per_eps * eps * kLateralScale * per_lateral_f_(k) * per_scale;
    w.stiffness(k) = per_eps;
  }
  return {.mean = mean,
          .per_Pa = per_Pa,
          .per_plane = {w.stiffness.sum(), w.stiffness.matrix().dot(u_.matrix()),
                        w.stiffness.matrix().dot(v_.matrix())}};
}

double ConcreteFibres::lateral_strain_bound(const StrainPlane& plane) const {
  Workspace& w = workspace(u_.size());
  for (Eigen::Index k = 0; k < u_.size(); ++k) {
    const double strain = strain_at(plane, u_(k), v_(k), eps_th_(k));
    const double eps = strain > 0.0 ? strain : 0.0;
    w.force(k) = eps * (bound_in_eps_(k) + eps * bound_in_square_(k));
  }
  return w.force.sum();
}

}  // namespace ringward::mechanical
