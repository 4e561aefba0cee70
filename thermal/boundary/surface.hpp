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

/// The material side of a face: the heat flow from the face into the material is
/// face_weight potential(T_face) - inner, where inner is a weighted sum of the potentials of the
/// next one or two cells. With one cell at distance d both weights are 1/d; with two the gradient
/// is that of the parabola through the face and both, which is a further order better.
struct FaceSide {
  const EnthalpyCurve* curve = nullptr;
  double face_weight_1_m = 0;
};

/// Heat flow through a surface with its derivative for the Newton iteration.
struct SurfaceFlow {
  double flux_W_m2 = 0;    ///< into the material
  double inner_slope = 0;  ///< d flux / d inner, negative
  double face_C = 0;
};

/// Balance of a surface: flow into the material = flux from the gas,
/// alpha_c (T_g - T_f) + eps sigma ((T_g + 273.15)^4 - (T_f + 273.15)^4).
/// @param inner_W_m2 see FaceSide
/// @param guess_C start of the iteration, e.g. the temperature of the next cell
/// @source en1991-1-2-2002 3.1
[[nodiscard]] SurfaceFlow surface_flow(const FaceSide& side, double inner_W_m2,
                                       const SurfaceCondition& condition, double gas_C,
                                       double guess_C);

/// The two faces of an interface, the flux across it and its derivatives.
struct InterfaceFlow {
  double flux_W_m2 = 0;      ///< from a to b
  double inner_a_slope = 0;  ///< d flux / d inner of a
  double inner_b_slope = 0;  ///< d flux / d inner of b, negative
  double face_a_C = 0;
  double face_b_C = 0;
};

/// One side of an interface as interface_flow takes it.
struct InterfaceSide {
  FaceSide side;
  double inner_W_m2 = 0;
  double guess_C = 0;
};

/// The flow across an interface with a contact resistance [m2K/W] >= 0 between its faces.
[[nodiscard]] InterfaceFlow interface_flow(const InterfaceSide& a, const InterfaceSide& b,
                                           double resistance_m2K_W);

}  // namespace ringward::thermal
