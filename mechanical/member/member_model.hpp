#pragma once

#include <Eigen/Core>
#include <cmath>

#include "mechanical/member/deflection.hpp"
#include "mechanical/section/hot_section.hpp"

namespace ringward::mechanical {

/// What bends the column, in the axes of its direction. First-order moments at mid-height are
/// N e + M; the imperfection and the deflection add N (e_imp + w).
struct MemberLoading {
  double imperfection_m = 0;  ///< along u, one half-sine
  double eccentricity_u_m = 0;
  double eccentricity_v_m = 0;
  double moment_u_Nm = 0;  ///< constant
  double moment_v_Nm = 0;
  bool biaxial = false;  ///< both curvatures are free
};

/// The second-order model column: equilibrium of every station with the deflection that all of
/// them make. Unknowns, scaled to order one: per station eps0, kappa_u (and kappa_v), then N.
class MemberModel {
 public:
  /// Keeps references to `section` and `shape`: both must outlive it.
  MemberModel(const HotSection& section, const DeflectedShape& shape, const MemberLoading& loading,
              double reference_N);

  [[nodiscard]] Eigen::Index unknowns() const { return equations() + 1; }
  [[nodiscard]] Eigen::Index equations() const { return shape_.stations() * per_station_; }

  /// Length of a vector of unknowns in which every station moves by one unit.
  [[nodiscard]] double length_scale() const {
    return std::sqrt(static_cast<double>(shape_.stations()));
  }

  struct Linearised {
    Eigen::VectorXd residual;  ///< [equations]
    Eigen::MatrixXd jacobian;  ///< [equations x unknowns]
    double pressure_Pa = 0;    ///< at mid-height
    double hoop_Pa = 0;
  };
  /// @param likely_Pa pressure at mid-height of a state close by
  [[nodiscard]] Linearised linearise(const Eigen::VectorXd& unknowns, double likely_Pa = 0.0) const;

  [[nodiscard]] double axial_N(const Eigen::VectorXd& q) const {
    return q(equations()) * reference_N_;
  }
  [[nodiscard]] double scaled_N(double axial_N) const { return axial_N / reference_N_; }
  [[nodiscard]] StrainPlane plane(const Eigen::VectorXd& q, Eigen::Index station) const;
  /// Unknowns with the same total strain eps0 at every station, no curvature and no force.
  [[nodiscard]] Eigen::VectorXd uniform_state(double eps0) const;
  [[nodiscard]] const HotSection& section() const { return section_; }

 private:
  [[nodiscard]] double lever(const Eigen::VectorXd& q, Eigen::Index station,
                             Eigen::Index part) const;
  /// @return the pressure there
  double fill_station(const Eigen::VectorXd& q, Eigen::Index station, double likely_Pa,
                      Linearised& out) const;

  const HotSection& section_;
  const DeflectedShape& shape_;
  MemberLoading loading_;
  double reference_N_;
  Eigen::Index per_station_;
};

inline constexpr double kStrainUnit = 1e-3;  ///< scaled strains are of order one

}  // namespace ringward::mechanical
