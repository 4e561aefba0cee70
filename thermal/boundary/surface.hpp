#pragma once

#include <functional>
#include <limits>

#include "thermal/enthalpy_curve.hpp"

namespace ringward::thermal {

/// What a stretch of the outline sees. Exactly one of the temperatures is set.
struct SurfaceCondition {
  double convection_W_m2K = 0;
  double emissivity = 0;  ///< resultant, 0 to 1
  /// The face itself has the given temperature; convection and emissivity do not matter.
  bool prescribed = false;
  std::function<double(double t_s)> T_C;
  /// Instead of T_C: a temperature that varies along the outline (manufactured solutions).
  std::function<double(double t_s, double x_m, double y_m)> T_C_at;
};

/// Heat flow through a face out of a half cell, with its derivative for the Newton iteration.
struct FaceFlow {
  double flux_W_m2 = 0;        ///< into the cell
  double potential_slope = 0;  ///< d flux / d potential of the cell [1/m]
  double face_C = 0;
};

/// Half a cell between its middle and a face.
struct HalfCell {
  const EnthalpyCurve* curve = nullptr;
  double distance_m = 0;
};

/// Balance of the face: (potential(face) - potential(cell)) / distance = flux from the gas,
/// alpha_c (T_g - T_f) + eps sigma ((T_g + 273.15)^4 - (T_f + 273.15)^4).
/// @source en1991-1-2-2002 3.1
[[nodiscard]] FaceFlow surface_flow(const HalfCell& half, const EnthalpyCurve::State& cell,
                                    const SurfaceCondition& condition, double gas_C);

/// The two faces of an interface, the flux across it and its derivatives.
struct InterfaceFlow {
  double flux_W_m2 = 0;  ///< from a to b
  double slope_a = 0;    ///< d flux / d potential of a [1/m]
  double slope_b = 0;    ///< d flux / d potential of b [1/m], negative
  double face_a_C = 0;
  double face_b_C = 0;
};

/// Two half cells in series with a contact resistance [m2K/W] >= 0 between them.
[[nodiscard]] InterfaceFlow interface_flow(const HalfCell& half_a, const EnthalpyCurve::State& a,
                                           const HalfCell& half_b, const EnthalpyCurve::State& b,
                                           double resistance_m2K_W);

}  // namespace ringward::thermal
