#include "thermal/boundary/surface.hpp"

#include <algorithm>
#include <cmath>

#include "thermal/base/units.hpp"

namespace ringward::thermal {
namespace {

constexpr int kMostIterations = 60;
constexpr double kFaceError_K = 1e-7;  // of the last step; Newton leaves far less
constexpr double kLowest_C = -units::kKelvinOffset;
constexpr double kHighest_C = 5000.0;

struct Balance {
  double excess = 0;  // falls with the face temperature
  double slope = 0;   // negative
};

/// Root of a falling function of temperature: Newton, kept inside a shrinking bracket.
template <typename F>
double falling_root(double guess, const F& balance) {
  double low = kLowest_C;
  double high = kHighest_C;
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

SurfaceFlow surface_flow(const FaceSide& side, double inner_W_m2, const SurfaceCondition& condition,
                         double gas_C, double guess_C) {
  SurfaceFlow flow;
  const double weight = side.face_weight_1_m;
  if (condition.prescribed) {
    flow.face_C = gas_C;
    flow.inner_slope = -1.0;
    flow.flux_W_m2 = weight * side.curve->conduction(gas_C).potential_W_m - inner_W_m2;
    return flow;
  }
  const auto balance = [&](double T) {
    const GasFlux gas = gas_flux(condition, gas_C, T);
    const EnthalpyCurve::Conduction face = side.curve->conduction(T);
    return Balance{gas.flux - (weight * face.potential_W_m - inner_W_m2),
                   gas.slope - weight * face.conductivity_W_mK};
  };
  flow.face_C = falling_root(guess_C, balance);
  const GasFlux gas = gas_flux(condition, gas_C, flow.face_C);
  const double inward = weight * side.curve->conduction(flow.face_C).conductivity_W_mK;
  flow.flux_W_m2 = gas.flux;
  flow.inner_slope = gas.slope / (inward - gas.slope);
  return flow;
}

InterfaceFlow interface_flow(const InterfaceSide& a, const InterfaceSide& b,
                             double resistance_m2K_W) {
  const double R = resistance_m2K_W;
  const double weight_a = a.side.face_weight_1_m;
  const double weight_b = b.side.face_weight_1_m;
  const auto balance = [&](double T) {
    const EnthalpyCurve::Conduction at_a = a.side.curve->conduction(T);
    const double flux = a.inner_W_m2 - weight_a * at_a.potential_W_m;
    const double flux_slope = -weight_a * at_a.conductivity_W_mK;
    const EnthalpyCurve::Conduction at_b = b.side.curve->conduction(T - R * flux);
    const double into_b = weight_b * at_b.potential_W_m - b.inner_W_m2;
    const double into_b_slope = weight_b * at_b.conductivity_W_mK * (1.0 - R * flux_slope);
    return Balance{flux - into_b, flux_slope - into_b_slope};
  };
  InterfaceFlow flow;
  flow.face_a_C = falling_root(a.guess_C, balance);
  const EnthalpyCurve::Conduction at_a = a.side.curve->conduction(flow.face_a_C);
  flow.flux_W_m2 = a.inner_W_m2 - weight_a * at_a.potential_W_m;
  flow.face_b_C = flow.face_a_C - R * flow.flux_W_m2;
  const double inward_a = weight_a * at_a.conductivity_W_mK;
  const double inward_b = weight_b * b.side.curve->conduction(flow.face_b_C).conductivity_W_mK;
  const double series = inward_a + inward_b + R * inward_a * inward_b;
  flow.inner_a_slope = inward_b / series;
  flow.inner_b_slope = -inward_a / series;
  return flow;
}

}  // namespace ringward::thermal
