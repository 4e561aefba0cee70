#pragma once

#include <Eigen/Core>
#include <vector>

#include "mechanical/column.hpp"
#include "mechanical/section/fibres.hpp"
#include "mechanical/section/hot_materials.hpp"

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
/// The lateral strain law takes f_c,T of at least this share of the cold strength.
inline constexpr double kLateralStrengthFloor = 0.01;

/// The section at one time, ready to be strained: immutable, safe to share between threads.
class HotSection {
 public:
  HotSection(const FibreLayout& layout, const HotMaterials& hot, const TubeGrip& grip,
             double cold_concrete_Pa);

  /// N, M and their tangent, with the pressure of the tube in equilibrium with the strains.
  [[nodiscard]] SectionResponse response(const StrainPlane& plane) const;
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
  struct Concrete {
    double u, v, area, f_c, eps_c1, drop, eps_th, lateral_f;
  };
  struct Steel {
    double u, v, area, eps_th;
    SteelCurve curve;
  };
  /// The same concrete as columns, for the loop that the processor takes two fibres at a time.
  struct Columns {
    Eigen::ArrayXd u, v, eps_th, force, peak_per_eps, slope, eps_cu;
  };
  struct Lateral {
    double mean = 0;    ///< area mean of the lateral strain
    double per_Pa = 0;  ///< its slope in the pressure
    Eigen::Vector3d per_plane = Eigen::Vector3d::Zero();
  };

  /// Pressure that the tube makes when pressed by `p`, less p, and its slopes.
  struct PressureGap {
    double value_Pa = 0;
    double slope = -1;
    Eigen::Vector3d per_plane = Eigen::Vector3d::Zero();  ///< of the root, not of the gap
  };
  [[nodiscard]] PressureGap pressure_gap(const StrainPlane& plane, double p_Pa) const;

  void add_concrete(const StrainPlane& plane, double p_Pa, SectionResponse& sum,
                    Eigen::Vector3d& per_Pa) const;
  void fill_columns();
  void add_unconfined(const StrainPlane& plane, SectionResponse& sum) const;
  void add_steel(const StrainPlane& plane, SectionResponse& sum) const;
  [[nodiscard]] Lateral lateral_strain(const StrainPlane& plane, double p_Pa) const;
  /// Pressure in equilibrium; sets its slope in the strain plane.
  double solve_pressure(const StrainPlane& plane, Eigen::Vector3d& slope) const;

  std::vector<Concrete> concrete_;
  Columns columns_;
  bool bends_in_u_only_ = true;
  std::vector<Steel> steel_;
  SteelCurve hoop_;
  TubeGrip grip_;
  double extent_m_ = 0;
  double area_m2_ = 0;
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
