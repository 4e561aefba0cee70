#include "thermal/boundary/surface.hpp"

#include <algorithm>
#include <cmath>

#include "thermal/base/units.hpp"

namespace ringward::thermal {
namespace {

constexpr int kMostIterations = 60;
constexpr double kFaceError_K = 1e-9;

struct Balance {
  double excess = 0;  // falls with the face temperature
  double slope = 0;   // negative
};

/// Root of a falling function between two temperatures: Newton, kept inside a shrinking bracket.
template <typename F>
double falling_root(double guess, double low, double high, const F& balance) {
  double T = std::clamp(guess, low, high);
  for (int k = 0; k < kMostIterations; ++k) {
    const Balance b = balance(T);
    (b.excess > 0.0 ? low : high) = T;
    double next = T - b.excess / b.slope;
    if (!(next >= low && next <= high)) next = 0.5 * (low + high);
    const double step = std::abs(next - T);
    T = next;
    if (step <= kFaceError_K) break;
  }
  return T;
}

struct GasFlux {
  double flux = 0;
  double slope = 0;
};

GasFlux gas_flux(const SurfaceCondition& c, double gas_C, double face_C) {
  const double gas_K = gas_C + units::kKelvinOffset;
  const double face_K = face_C + units::kKelvinOffset;
  const double radiation = c.emissivity * units::kStefanBoltzmann_W_m2K4;
  const double face_K3 = face_K * face_K * face_K;
  const double gas_K2 = gas_K * gas_K;
  return {c.convection_W_m2K * (gas_C - face_C) + radiation * (gas_K2 * gas_K2 - face_K3 * face_K),
          -c.convection_W_m2K - 4.0 * radiation * face_K3};
}

}  // namespace

FaceFlow surface_flow(const HalfCell& half, const EnthalpyCurve::State& cell,
                      const SurfaceCondition& condition, double gas_C) {
  FaceFlow flow;
  if (condition.prescribed) {
    flow.face_C = gas_C;
    flow.potential_slope = -1.0 / half.distance_m;
    flow.flux_W_m2 =
        (half.curve->conduction(gas_C).potential_W_m - cell.potential_W_m) / half.distance_m;
    return flow;
  }
  const auto balance = [&](double T) {
    const GasFlux gas = gas_flux(condition, gas_C, T);
    const EnthalpyCurve::Conduction face = half.curve->conduction(T);
    return Balance{gas.flux - (face.potential_W_m - cell.potential_W_m) / half.distance_m,
                   gas.slope - face.conductivity_W_mK / half.distance_m};
  };
  flow.face_C =
      falling_root(cell.T_C, std::min(cell.T_C, gas_C), std::max(cell.T_C, gas_C), balance);
  const GasFlux gas = gas_flux(condition, gas_C, flow.face_C);
  const double inner = half.curve->conduction(flow.face_C).conductivity_W_mK / half.distance_m;
  flow.flux_W_m2 = gas.flux;
  flow.potential_slope = gas.slope / (half.distance_m * (inner - gas.slope));
  return flow;
}

InterfaceFlow interface_flow(const HalfCell& half_a, const EnthalpyCurve::State& a,
                             const HalfCell& half_b, const EnthalpyCurve::State& b,
                             double resistance_m2K_W) {
  const double R = resistance_m2K_W;
  const auto balance = [&](double T) {
    const EnthalpyCurve::Conduction at_a = half_a.curve->conduction(T);
    const double flux = (a.potential_W_m - at_a.potential_W_m) / half_a.distance_m;
    const double flux_slope = -at_a.conductivity_W_mK / half_a.distance_m;
    const EnthalpyCurve::Conduction at_b = half_b.curve->conduction(T - R * flux);
    const double into_b = (at_b.potential_W_m - b.potential_W_m) / half_b.distance_m;
    const double into_b_slope = at_b.conductivity_W_mK / half_b.distance_m * (1.0 - R * flux_slope);
    return Balance{flux - into_b, flux_slope - into_b_slope};
  };
  const double k_a = a.potential_slope / a.T_slope / half_a.distance_m;
  const double k_b = b.potential_slope / b.T_slope / half_b.distance_m;
  const double share_b = k_b / (k_b + k_a * (1.0 + R * k_b));
  const double guess = a.T_C + (b.T_C - a.T_C) * share_b;
  InterfaceFlow flow;
  flow.face_a_C = falling_root(guess, std::min(a.T_C, b.T_C), std::max(a.T_C, b.T_C), balance);
  const EnthalpyCurve::Conduction at_a = half_a.curve->conduction(flow.face_a_C);
  flow.flux_W_m2 = (a.potential_W_m - at_a.potential_W_m) / half_a.distance_m;
  flow.face_b_C = flow.face_a_C - R * flow.flux_W_m2;
  const double inner_a = at_a.conductivity_W_mK / half_a.distance_m;
  const double inner_b =
      half_b.curve->conduction(flow.face_b_C).conductivity_W_mK / half_b.distance_m;
  const double series = inner_a + inner_b + R * inner_a * inner_b;
  flow.slope_a = inner_b / (series * half_a.distance_m);
  flow.slope_b = -inner_a / (series * half_b.distance_m);
  return flow;
}

}  // namespace ringward::thermal
