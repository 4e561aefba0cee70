#pragma once

#include <optional>
#include <vector>

#include "mechanical/column.hpp"
#include "mechanical/section/concrete_fibres.hpp"

namespace ringward::mechanical {

/// What the tube can do to the core at one time (docs/theory.md, confinement).
struct TubeGrip {
  ConfinementModel model = ConfinementModel::none;
  HotSteel steel;                ///< stress-strain law of the hoop
  double pressure_per_hoop = 0;  ///< 2 t / D
  double hoop_cap_Pa = 0;        ///< s_h k_y f_y
  double free_hoop_strain = 0;   ///< mean thermal strain of the core - that of the tube - gap
};

/// Gap between tube and core from shrinkage, as a hoop strain (common practice, no source).
inline constexpr double kShrinkageGapStrain = 1e-4;

/// The section at one time, ready to be strained: immutable, safe to share between threads.
class HotSection {
 public:
  HotSection(const FibreLayout& layout, const HotMaterials& hot, const TubeGrip& grip,
             double cold_concrete_Pa);

  /// N, M and their tangent, with the pressure of the tube in equilibrium with the strains.
  /// @param likely_Pa where to look first for that pressure: the answer of a state close by
  [[nodiscard]] SectionResponse response(const StrainPlane& plane, double likely_Pa = 0.0) const;
  [[nodiscard]] double axial_force_N(double eps0) const { return response({eps0, 0, 0}).N_N; }

  /// Hoop stress under these strains if the tube were shorter by `contraction` than its grip
  /// credits (a cooling tube): for reports only.
  [[nodiscard]] double hoop_after_contraction_Pa(const StrainPlane& plane,
                                                 double contraction) const;

  [[nodiscard]] double plastic_N() const { return plastic_N_; }  ///< sum of area x hot strength
  [[nodiscard]] double extent_m() const { return extent_m_; }
  /// Range of total strain that contains every maximum of the axial force at zero curvature.
  [[nodiscard]] double least_strain() const { return -max_thermal_strain_; }
  [[nodiscard]] double largest_strain() const { return largest_strain_; }

 private:
  struct Steel {
    double u, v, area, eps_th;
    SteelCurve curve;
  };

  /// Pressure that the tube makes when pressed by `p`, less p, and its slopes.
  struct PressureGap {
    double value_Pa = 0;
    double slope = -1;
    Eigen::Vector3d per_plane = Eigen::Vector3d::Zero();  ///< of the root, not of the gap
  };
  [[nodiscard]] PressureGap pressure_gap(const StrainPlane& plane, double p_Pa) const;

  /// Pressure in equilibrium; sets its slope in the strain plane.
  double solve_pressure(const StrainPlane& plane, double likely_Pa, Eigen::Vector3d& slope) const;
  void add_contact(const StrainPlane& plane, double likely_Pa, SectionResponse& sum) const;
  void add_steel(const StrainPlane& plane, SectionResponse& sum) const;

  ConcreteFibres concrete_;
  std::optional<ConcreteFibres> confined_;  ///< by the constant pressure of the model "yield"
  std::vector<Steel> steel_;
  SteelCurve hoop_;
  TubeGrip grip_;
  double extent_m_ = 0;
  double plastic_N_ = 0;
  double max_thermal_strain_ = 0;
  double largest_strain_ = 0;
};

/// The grip of the tube under a model, from the materials at one time, with the hoop stress that
/// friction leaves at mid-height (slip.hpp). No grip without a tube.
[[nodiscard]] TubeGrip tube_grip(const Column& column, ConfinementModel model,
                                 const FibreLayout& layout, const HotMaterials& hot);

/// Area mean of the thermal strain of the core (concrete fibres).
[[nodiscard]] double mean_core_expansion(const FibreLayout& layout, const HotMaterials& hot);

}  // namespace ringward::mechanical
