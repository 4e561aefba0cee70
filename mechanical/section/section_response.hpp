#pragma once

#include <Eigen/Core>

namespace ringward::mechanical {

/// Plane section: total strain eps0 + kappa_u u + kappa_v v, shortening positive.
struct StrainPlane {
  double eps0 = 0;
  double kappa_u_1_m = 0;
  double kappa_v_1_m = 0;
};

/// What a section answers to a strain plane. Compression positive; a positive moment compresses
/// the + side of its axis. `tangent` rows: N, M_u, M_v; columns: eps0, kappa_u, kappa_v.
struct SectionResponse {
  double N_N = 0;
  double M_u_Nm = 0;
  double M_v_Nm = 0;
  Eigen::Matrix3d tangent = Eigen::Matrix3d::Zero();
  double pressure_Pa = 0;  ///< of the tube on the core
  double hoop_Pa = 0;      ///< in the tube
};

}  // namespace ringward::mechanical
