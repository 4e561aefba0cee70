#pragma once

#include <Eigen/Core>

#include "mechanical/section/fibres.hpp"
#include "mechanical/section/hot_materials.hpp"
#include "mechanical/section/section_response.hpp"

namespace ringward::mechanical {

/// The lateral strain law takes f_c,T of at least this share of the cold strength.
inline constexpr double kLateralStrengthFloor = 0.01;

/// The concrete of a section at one time, a column of numbers for each property: its loops are the
/// inner ones of the program, written without a branch so that the processor takes two fibres at a
/// time.
class ConcreteFibres {
 public:
  ConcreteFibres(const FibreLayout& layout, const HotMaterials& hot, double cold_concrete_Pa);

  /// The same fibres with the peaks that a constant pressure gives them (confined_concrete.hpp):
  /// their "unconfined" forces are those under that pressure.
  [[nodiscard]] ConcreteFibres confined_by(double p_Pa) const;

  /// Adds forces and tangent without pressure.
  void add_unconfined(const StrainPlane& plane, SectionResponse& sum) const;

  /// Adds forces and tangent at constant pressure.
  /// @return slopes of N, M_u, M_v in the pressure
  [[nodiscard]] Eigen::Vector3d add_confined(const StrainPlane& plane, double p_Pa,
                                             SectionResponse& sum) const;

  struct Lateral {
    double mean = 0;    ///< area mean of the lateral strain; fibres in tension count zero
    double per_Pa = 0;  ///< its slope in the pressure
    Eigen::Vector3d per_plane = Eigen::Vector3d::Zero();
  };
  /// Concrete displaced by bars is no fibre of its own here.
  /// @source teng2007
  [[nodiscard]] Lateral lateral_strain(const StrainPlane& plane, double p_Pa) const;
  /// Never below the mean without pressure, and many times faster: tells a tube that is far away.
  [[nodiscard]] double lateral_strain_bound(const StrainPlane& plane) const;

  [[nodiscard]] bool lies_on_u() const { return lies_on_u_; }  ///< all v are zero
  [[nodiscard]] double plastic_N() const { return f_c_.matrix().dot(area_.matrix()); }
  [[nodiscard]] double max_thermal_strain() const;
  /// Total strain beyond which nothing carries at any pressure.
  [[nodiscard]] double largest_strain() const;

 private:
  /// Adds the sums over the fibres of forces and stiffnesses.
  void add_sums(const Eigen::ArrayXd& force, const Eigen::ArrayXd& stiffness,
                SectionResponse& sum) const;

  /// Sets what follows from strength and peak strain.
  void derive();

  Eigen::ArrayXd u_, v_, area_, f_c_, eps_c1_, drop_, eps_th_;
  Eigen::ArrayXd force_, per_eps_c1_, per_drop_, eps_cu_;  ///< area f_c, and reciprocals
  Eigen::ArrayXd peak_per_gain_;  ///< growth of the peak strain with the strength
  Eigen::ArrayXd lateral_area_;   ///< share of the mean; zero where bars displace
  Eigen::ArrayXd per_lateral_f_;  ///< 8 / f_c of the lateral strain law
  Eigen::ArrayXd bound_in_eps_;   ///< lateral_strain_bound: factor of the strain
  Eigen::ArrayXd bound_in_square_;
  bool lies_on_u_ = true;
};

}  // namespace ringward::mechanical
