#pragma once

namespace ringward::mechanical {

/// Strength and peak strain of confined concrete with their slopes in the pressure.
struct ConfinedPeak {
  double strength_Pa = 0;
  double eps_cc = 0;
  double strength_per_Pa = 0;  ///< d(strength)/dp
  double eps_per_Pa = 0;       ///< d(eps_cc)/dp
};

inline constexpr double kConfinementGain = 4.1;   ///< @source richart1928
inline constexpr double kConfinementLimit = 2.5;  ///< f_cc at most this many f_c
inline constexpr double kPeakStrainGain = 5.0;    ///< @source richart1928

/// Additive law: f_cc = f_c + 4.1 p, at most 2.5 f_c; eps_cc = eps_c1 (1 + 5 (f_cc/f_c - 1)).
/// Additive on the hot strength, because laws in p / f_c,T grow without bound in hot layers.
/// @param f_c_Pa strength of the fibre at its temperature, > 0
/// @param eps_c1 strain at its unconfined peak, > 0
/// @param p_Pa confining pressure, >= 0
/// @source richart1928
[[nodiscard]] inline ConfinedPeak confined_peak(double f_c_Pa, double eps_c1, double p_Pa) {
  const double gain_Pa = kConfinementGain * p_Pa;
  const double limit_Pa = (kConfinementLimit - 1.0) * f_c_Pa;
  if (gain_Pa >= limit_Pa) {
    return {.strength_Pa = kConfinementLimit * f_c_Pa,
            .eps_cc = eps_c1 * (1.0 + kPeakStrainGain * (kConfinementLimit - 1.0))};
  }
  const double eps_per_Pa = kPeakStrainGain * eps_c1 * kConfinementGain / f_c_Pa;
  return {.strength_Pa = f_c_Pa + gain_Pa,
          .eps_cc = eps_c1 + eps_per_Pa * p_Pa,
          .strength_per_Pa = kConfinementGain,
          .eps_per_Pa = eps_per_Pa};
}

}  // namespace ringward::mechanical
