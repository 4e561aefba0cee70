#pragma once

#include <optional>

#include "thermal/section/section.hpp"

namespace ringward::mechanical {

enum class ConfinementModel { none, contact, yield };

struct Member {
  double length_m = 0;           ///< between restraints
  double buckling_length_m = 0;  ///< in the fire situation
  double imperfection_m = 0;     ///< amplitude of one half-sine
};

/// Equal at both ends. Either the eccentricities are proportional to the axial force, or the
/// moments are given and constant (`moments_given`). A positive one compresses the + side.
struct Load {
  double axial_N = 0;  ///< in the fire situation, compression positive, constant in time
  bool moments_given = false;
  double eccentricity_x_m = 0;
  double eccentricity_y_m = 0;
  double moment_x_Nm = 0;
  double moment_y_Nm = 0;
};

/// gamma_M,fi of concrete, bars and structural steel (1 in EN 1992-1-2 and EN 1993-1-2).
struct MaterialFactors {
  double concrete = 1.0;
  double bar = 1.0;
  double steel = 1.0;
};

struct Column {
  thermal::Section section;
  ConfinementModel confinement = ConfinementModel::none;
  Member member;
  Load load;
  MaterialFactors factors;
};

}  // namespace ringward::mechanical
