#pragma once

namespace ringward::mechanical {

// The tube along its height: friction feeds axial stress into the wall from each cut end, and von
// Mises yielding then leaves less hoop stress. With s = sigma / f_y, phi a parameter and
// xi = mu h / D the distance from the cut end:
//   s_v = (2/sqrt 3) sin phi,  s_h = cos phi - sin phi / sqrt 3,  xi = (sqrt 3 phi - ln s_h) / 4,
// the exact solution of ds_v/dxi = 2 s_h on s_h^2 + s_h s_v + s_v^2 = 1 (docs/theory.md derives
// it).

/// Distance from a cut end, xi = mu h / D, at which slip stops: there s_h = s_v = 1/sqrt 3
/// (dilation ratio 1). Equal to (sqrt 3 pi / 6 + ln sqrt 3) / 4 = 0.36405.
[[nodiscard]] double slip_end_xi();

/// Stresses of the wall over its yield strength: hoop in tension, axial in compression.
struct WallStress {
  double hoop = 1;
  double axial = 0;
};

/// Wall stress at xi = mu h / D from the cut end inside the slip zone; the plateau beyond it.
/// @param xi >= 0
[[nodiscard]] WallStress wall_stress(double xi);

/// What the height of the tube leaves of its hoop strength.
struct TubeProfile {
  double mid_height_hoop = 1;  ///< s_h at mid-height: the value that capacity uses
  double mean_hoop = 1;        ///< mean over the height: reported, never used to raise capacity
  double slip_length_m = 0;    ///< from each end: slip_end_xi D / mu, or half the height if less
};

/// @param friction mu, 0.1..0.8
/// @param inner_diameter_m D > 0
/// @param clear_height_m H > 0, between the cut ends
[[nodiscard]] TubeProfile tube_profile(double friction, double inner_diameter_m,
                                       double clear_height_m);

}  // namespace ringward::mechanical
