#include "thermal/enthalpy_curve.hpp"

#include <algorithm>
#include <cmath>

#include "thermal/base/error.hpp"

namespace ringward::thermal {
namespace {

constexpr double kLowest_C = -100.0;
constexpr double kHighest_C = 1600.0;
constexpr double kWidestPiece_K = 5.0;
constexpr double kNarrowestPiece_K = 0.02;
constexpr double kInverseError_K = 1e-3;
constexpr double kBucket_K = 2.0;
constexpr std::size_t kBucketsPerPiece = 4;

class Mixture {
 public:
  explicit Mixture(const std::vector<MaterialShare>& shares) : shares_(shares) {}

  double enthalpy(double T_C) const {
    double sum = 0;
    for (const MaterialShare& s : shares_) sum += s.share * s.law->enthalpy_J_m3(T_C);
    return sum / kEnthalpyUnit_J_m3;
  }
  double dried_enthalpy(double T_C) const {
    double sum = 0;
    for (const MaterialShare& s : shares_) sum += s.share * s.law->dried_enthalpy_J_m3(T_C);
    return sum / kEnthalpyUnit_J_m3;
  }
  double conductivity(double T_C) const {
    double sum = 0;
    for (const MaterialShare& s : shares_) sum += s.share * s.law->conductivity_W_mK(T_C);
    return sum;
  }
  std::string name() const {
    std::string name;
    for (const MaterialShare& s : shares_) name += (name.empty() ? "" : " with ") + s.law->name();
    return name;
  }
  std::vector<double> kinks() const {
    std::vector<double> kinks{kLowest_C, kHighest_C, 0.0};
    for (const MaterialShare& s : shares_) {
      for (double T_C : s.law->kinks_C()) {
        if (T_C > kLowest_C && T_C < kHighest_C) kinks.push_back(T_C);
      }
    }
    std::sort(kinks.begin(), kinks.end());
    kinks.erase(std::unique(kinks.begin(), kinks.end()), kinks.end());
    return kinks;
  }

 private:
  const std::vector<MaterialShare>& shares_;
};

struct End {
  double T_C;
  double wet;
  double dry;
};

/// How far a straight inverse is off in the middle of a piece [K].
double inverse_error_K(double width_K, double low, double middle, double high) {
  return std::abs(middle - 0.5 * (low + high)) / (high - low) * width_K;
}

/// Appends the knots right of `a` up to and with `b`, halving until the inverse is close enough.
void subdivide(const Mixture& mixture, const End& a, const End& b, std::vector<double>& knots) {
  const double width = b.T_C - a.T_C;
  const double T_C = 0.5 * (a.T_C + b.T_C);
  const End middle{T_C, mixture.enthalpy(T_C), mixture.dried_enthalpy(T_C)};
  const bool close = inverse_error_K(width, a.wet, middle.wet, b.wet) < kInverseError_K &&
                     inverse_error_K(width, a.dry, middle.dry, b.dry) < kInverseError_K;
  if (width <= kNarrowestPiece_K || (width <= kWidestPiece_K && close)) {
    knots.push_back(b.T_C);
    return;
  }
  subdivide(mixture, a, middle, knots);
  subdivide(mixture, middle, b, knots);
}

std::vector<double> knots_of(const Mixture& mixture) {
  const std::vector<double> kinks = mixture.kinks();
  std::vector<double> knots{kinks.front()};
  const auto end = [&](double T) { return End{T, mixture.enthalpy(T), mixture.dried_enthalpy(T)}; };
  for (std::size_t k = 1; k < kinks.size(); ++k) {
    subdivide(mixture, end(kinks[k - 1]), end(kinks[k]), knots);
  }
  return knots;
}

void require_rising(const std::vector<double>& u, const std::vector<double>& T_C,
                    const std::string& name) {
  for (std::size_t k = 1; k < u.size(); ++k) {
    if (!std::isfinite(u[k]) || !(u[k] > u[k - 1])) {
      throw Error(ErrorKind::bad_input, name +
                                            ": the enthalpy does not rise with temperature near " +
                                            std::to_string(T_C[k]) + " C");
    }
  }
}

/// Simpson's rule a piece; a hair inside its ends, where a conductivity may jump.
std::vector<double> potentials(const Mixture& mixture, const std::vector<double>& T_C) {
  std::vector<double> potential(T_C.size(), 0.0);
  for (std::size_t k = 1; k < T_C.size(); ++k) {
    const double width = T_C[k] - T_C[k - 1];
    const double hair = 1e-9 * width;
    const double mean = (mixture.conductivity(T_C[k - 1] + hair) +
                         4.0 * mixture.conductivity(0.5 * (T_C[k - 1] + T_C[k])) +
                         mixture.conductivity(T_C[k] - hair)) /
                        6.0;
    potential[k] = potential[k - 1] + mean * width;
  }
  const auto zero = std::lower_bound(T_C.begin(), T_C.end(), 0.0) - T_C.begin();
  const double at_zero = potential[static_cast<std::size_t>(zero)];
  for (double& value : potential) value -= at_zero;
  return potential;
}

}  // namespace

EnthalpyCurve::EnthalpyCurve(const std::vector<MaterialShare>& shares) {
  const Mixture mixture(shares);
  const std::vector<double> T_C = knots_of(mixture);
  std::vector<double> wet;
  std::vector<double> dry;
  for (double T : T_C) {
    wet.push_back(mixture.enthalpy(T));
    dry.push_back(mixture.dried_enthalpy(T));
    dries_ = dries_ || std::abs(wet.back() - dry.back()) > 1e-9;
  }
  require_rising(wet, T_C, mixture.name());
  require_rising(dry, T_C, mixture.name());
  const std::vector<double> potential = potentials(mixture, T_C);
  first_ = tabulate(T_C, wet, potential);
  dried_ = tabulate(T_C, dry, potential);
  std::uint32_t piece = 0;
  for (double T = kLowest_C; T < kHighest_C; T += kBucket_K) {
    while (T_C[piece + 1] <= T) ++piece;
    pieces_by_T_.push_back(piece);
  }
}

EnthalpyCurve::Table EnthalpyCurve::tabulate(const std::vector<double>& T_C,
                                             const std::vector<double>& u,
                                             const std::vector<double>& potential) {
  Table table;
  for (std::size_t k = 0; k < u.size(); ++k) {
    Knot knot{u[k], {T_C[k], potential[k], 0.0, 0.0}};
    if (k + 1 < u.size()) {
      knot.state.T_slope = (T_C[k + 1] - T_C[k]) / (u[k + 1] - u[k]);
      knot.state.potential_slope = (potential[k + 1] - potential[k]) / (u[k + 1] - u[k]);
    }
    table.knots.push_back(knot);
  }
  const std::size_t count = kBucketsPerPiece * u.size();
  table.buckets_per_u = static_cast<double>(count) / (u.back() - u.front());
  std::uint32_t piece = 0;
  for (std::size_t b = 0; b < count; ++b) {
    const double left = u.front() + static_cast<double>(b) / table.buckets_per_u;
    while (piece + 2 < u.size() && u[piece + 1] <= left) ++piece;
    table.buckets.push_back(piece);
  }
  return table;
}

const EnthalpyCurve::Knot& EnthalpyCurve::knot_below(double T_C) const {
  const double raw = (T_C - kLowest_C) / kBucket_K;
  const double last = static_cast<double>(pieces_by_T_.size() - 1);
  const double bucket = !(raw > 0.0) ? 0.0 : raw > last ? last : raw;
  std::size_t piece = pieces_by_T_[static_cast<std::size_t>(bucket)];
  const std::size_t last_piece = first_.knots.size() - 2;
  while (piece < last_piece && T_C >= first_.knots[piece + 1].state.T_C) ++piece;
  return first_.knots[piece];
}

EnthalpyCurve::Conduction EnthalpyCurve::conduction(double T_C) const {
  const State& left = knot_below(T_C).state;
  const double conductivity = left.potential_slope / left.T_slope;
  return {left.potential_W_m + conductivity * (T_C - left.T_C), conductivity};
}

double EnthalpyCurve::enthalpy(double T_C) const {
  const Knot& left = knot_below(T_C);
  return left.u + (T_C - left.state.T_C) / left.state.T_slope;
}

double EnthalpyCurve::dried_enthalpy(double T_C) const {
  const auto piece = static_cast<std::size_t>(&knot_below(T_C) - first_.knots.data());
  const Knot& left = dried_.knots[piece];
  return left.u + (T_C - left.state.T_C) / left.state.T_slope;
}

}  // namespace ringward::thermal
