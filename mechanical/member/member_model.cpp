#include "mechanical/member/member_model.hpp"

namespace ringward::mechanical {

MemberModel::MemberModel(const HotSection& section, const DeflectedShape& shape,
                         const MemberLoading& loading, double reference_N)
    : section_(section),
      shape_(shape),
      loading_(loading),
      reference_N_(reference_N),
      per_station_(loading.biaxial ? 3 : 2) {}

StrainPlane MemberModel::plane(const Eigen::VectorXd& q, Eigen::Index station) const {
  const Eigen::Index first = station * per_station_;
  const double curvature_unit = kStrainUnit / section_.extent_m();
  return {.eps0 = q(first) * kStrainUnit,
          .kappa_u_1_m = q(first + 1) * curvature_unit,
          .kappa_v_1_m = per_station_ == 3 ? q(first + 2) * curvature_unit : 0.0};
}

Eigen::VectorXd MemberModel::uniform_state(double eps0) const {
  Eigen::VectorXd q = Eigen::VectorXd::Zero(unknowns());
  for (Eigen::Index s = 0; s < shape_.stations(); ++s) q(s * per_station_) = eps0 / kStrainUnit;
  return q;
}

/// Lever arm of N at a station from the deflection alone, along u (part 1) or v (part 2) [m].
double MemberModel::lever(const Eigen::VectorXd& q, Eigen::Index station, Eigen::Index part) const {
  const double curvature_unit = kStrainUnit / section_.extent_m();
  double sum = 0.0;
  for (Eigen::Index s = 0; s < shape_.stations(); ++s) {
    sum += shape_.lever_per_curvature(station, s) * q(s * per_station_ + part);
  }
  return sum * curvature_unit;
}

double MemberModel::fill_station(const Eigen::VectorXd& q, Eigen::Index station, double likely_Pa,
                                 Linearised& out) const {
  const SectionResponse answer = section_.response(plane(q, station), likely_Pa);
  const double N = axial_N(q);
  const double extent = section_.extent_m();
  const Eigen::Index row = station * per_station_;
  const Eigen::Index n_column = equations();
  // Residuals over the reference force, moments also over the extent of the section.
  const double arm_u = loading_.eccentricity_u_m +
                       loading_.imperfection_m * shape_.imperfection(station) +
                       lever(q, station, 1);
  out.residual(row) = (answer.N_N - N) / reference_N_;
  out.residual(row + 1) =
      (answer.M_u_Nm - N * arm_u - loading_.moment_u_Nm) / (reference_N_ * extent);
  out.jacobian(row, n_column) = -1.0;
  out.jacobian(row + 1, n_column) = -arm_u / extent;
  const double strain = kStrainUnit / reference_N_;
  for (Eigen::Index i = 0; i < per_station_; ++i) {
    for (Eigen::Index k = 0; k < per_station_; ++k) {
      const double row_scale = i == 0 ? strain : strain / extent;
      const double column_scale = k == 0 ? 1.0 : 1.0 / extent;
      out.jacobian(row + i, row + k) = answer.tangent(i, k) * row_scale * column_scale;
    }
  }
  const double lever_scale = q(n_column) * kStrainUnit / (extent * extent);
  for (Eigen::Index s = 0; s < shape_.stations(); ++s) {
    const double per_curvature = shape_.lever_per_curvature(station, s) * lever_scale;
    out.jacobian(row + 1, s * per_station_ + 1) -= per_curvature;
    if (per_station_ == 3) out.jacobian(row + 2, s * per_station_ + 2) -= per_curvature;
  }
  if (per_station_ == 3) {
    const double arm_v = loading_.eccentricity_v_m + lever(q, station, 2);
    out.residual(row + 2) =
        (answer.M_v_Nm - N * arm_v - loading_.moment_v_Nm) / (reference_N_ * extent);
    out.jacobian(row + 2, n_column) = -arm_v / extent;
  }
  if (station == 0) {
    out.pressure_Pa = answer.pressure_Pa;
    out.hoop_Pa = answer.hoop_Pa;
  }
  return answer.pressure_Pa;
}

MemberModel::Linearised MemberModel::linearise(const Eigen::VectorXd& q, double likely_Pa) const {
  Linearised out{.residual = Eigen::VectorXd::Zero(equations()),
                 .jacobian = Eigen::MatrixXd::Zero(equations(), unknowns())};
  for (Eigen::Index s = 0; s < shape_.stations(); ++s) {
    likely_Pa = fill_station(q, s, likely_Pa, out);
  }
  return out;
}

}  // namespace ringward::mechanical
