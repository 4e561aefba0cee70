#include "mechanical/section/interaction.hpp"

#include <algorithm>
#include <cmath>
#include <optional>

#include "mechanical/section/hot_section.hpp"
#include "thermal/base/units.hpp"

namespace ringward::mechanical {
namespace {

constexpr int kForceLevels = 40;
constexpr double kFirstCurvature = 2e-5;  // times 1 / extent: far below any yield
constexpr double kLastCurvature = 0.12;
constexpr double kCurvatureGrowth = 1.12;
constexpr double kForceTolerance = 1e-9;  // of the plastic resistance
constexpr double kNoMomentAcross = 1e-5;  // of the plastic resistance times the extent

/// Maximum of a function by golden section; the bracket must hold one maximum.
template <class Function>
double argmax(Function f, double low, double high) {
  constexpr double kGolden = 0.6180339887498949;
  for (int k = 0; k < 40; ++k) {
    const double left = high - kGolden * (high - low);
    const double right = low + kGolden * (high - low);
    const bool left_is_higher = f(left) > f(right);
    (left_is_higher ? high : low) = left_is_higher ? right : left;
  }
  return 0.5 * (low + high);
}

class DiagramBuilder {
 public:
  explicit DiagramBuilder(const HotSection& section) : section_(section) {}

  std::vector<InteractionPoint> build() {
    find_top();
    const double tension_N = section_.response({-0.03 + section_.least_strain(), 0, 0}).N_N;
    std::vector<InteractionPoint> positive;
    std::vector<InteractionPoint> negative;
    for (int k = kForceLevels; k >= 1; --k) {
      const double share = 0.5 * (1.0 - std::cos(units::kPi * k / kForceLevels));
      const double N = tension_N + share * (top_.axial_N - tension_N);
      if (k == kForceLevels) continue;
      add_extreme(positive, N, 1.0);
      add_extreme(negative, N, -1.0);
    }
    std::vector<InteractionPoint> points;
    if (top_has_no_moment_across_) points.push_back(top_);
    points.insert(points.end(), positive.begin(), positive.end());
    points.push_back({tension_N, tension_moment()});
    points.insert(points.end(), negative.rbegin(), negative.rend());
    return points;
  }

 private:
  // Near the largest force there may be no equilibrium without a moment across the axis.
  void add_extreme(std::vector<InteractionPoint>& points, double N, double sign) const {
    const std::optional<double> moment = extreme_moment(N, sign);
    if (moment) points.push_back({N, *moment});
  }

  [[nodiscard]] double peak_strain(double kappa) const {
    const auto force = [&](double eps0) { return section_.response({eps0, kappa, 0}).N_N; };
    const double from = section_.least_strain() - 0.005;
    constexpr int kCount = 120;
    const double step = (0.03 - from) / kCount;
    double best = from;
    double best_N = force(from);
    for (int k = 1; k <= kCount; ++k) {
      const double N = force(from + k * step);
      if (N > best_N) {
        best_N = N;
        best = from + k * step;
      }
    }
    return argmax(force, best - step, best + step);
  }

  // One-sided heating: the largest force needs a curvature of its own.
  void find_top() {
    const double reach = 0.01 / section_.extent_m();
    const auto largest = [&](double kappa) {
      return section_.response({peak_strain(kappa), kappa, 0}).N_N;
    };
    top_kappa_ = argmax(largest, -reach, reach);
    if (largest(0.0) >= largest(top_kappa_) * (1.0 - 1e-6)) top_kappa_ = 0.0;
    top_strain_ = peak_strain(top_kappa_);
    const SectionResponse top = section_.response({top_strain_, top_kappa_, 0});
    top_ = {top.N_N, top.M_u_Nm};
    const double across = std::abs(top.M_v_Nm) / section_.extent_m();
    top_has_no_moment_across_ = across < kNoMomentAcross * section_.plastic_N();
  }

  [[nodiscard]] double tension_moment() const {
    return section_.response({-0.03 + section_.least_strain(), 0, 0}).M_u_Nm;
  }

  /// eps0 on the rising branch for a force, at the curvature of the largest force: bisection below
  /// the strain of the largest force.
  [[nodiscard]] double first_strain(double N) const {
    double low = -0.03 + section_.least_strain();
    double high = top_strain_;
    for (int k = 0; k < 60; ++k) {
      const double middle = 0.5 * (low + high);
      (section_.response({middle, top_kappa_, 0}).N_N < N ? low : high) = middle;
    }
    return 0.5 * (low + high);
  }

  /// eps0 and kappa_v that give N and no moment across the axis; none beyond the limit of N.
  [[nodiscard]] std::optional<StrainPlane> balance(StrainPlane plane, double N) const {
    for (int iteration = 0; iteration < 25; ++iteration) {
      const SectionResponse r = section_.response(plane);
      const double scale = section_.plastic_N();
      const double across = r.M_v_Nm / section_.extent_m();
      if (std::abs(r.N_N - N) < kForceTolerance * scale && std::abs(across) < 1e-7 * scale) {
        return plane;
      }
      const double a = r.tangent(0, 0), b = r.tangent(0, 2), c = r.tangent(2, 0),
                   d = r.tangent(2, 2);
      const double determinant = a * d - b * c;
      if (!(a > 0.0)) return std::nullopt;
      if (std::abs(determinant) < 1e-12 * a * section_.extent_m() * section_.extent_m() * a) {
        plane.eps0 -= (r.N_N - N) / a;
        continue;
      }
      plane.eps0 -= ((r.N_N - N) * d - b * r.M_v_Nm) / determinant;
      plane.kappa_v_1_m -= (a * r.M_v_Nm - c * (r.N_N - N)) / determinant;
    }
    return std::nullopt;
  }

  /// The largest moment (of the sign) at a force, over all curvatures that can be reached; none
  /// where no equilibrium is found.
  [[nodiscard]] std::optional<double> extreme_moment(double N, double sign) const {
    StrainPlane plane{first_strain(N), top_kappa_, 0.0};
    std::optional<double> best;
    if (const std::optional<StrainPlane> start = balance(plane, N)) {
      plane = *start;
      best = sign * section_.response(plane).M_u_Nm;
    }
    for (double kappa = kFirstCurvature; kappa < kLastCurvature; kappa *= kCurvatureGrowth) {
      StrainPlane guess = plane;
      guess.kappa_u_1_m = top_kappa_ + sign * kappa / section_.extent_m();
      const std::optional<StrainPlane> next = balance(guess, N);
      if (!next) break;
      plane = *next;
      const double moment = sign * section_.response(plane).M_u_Nm;
      best = best ? std::max(*best, moment) : moment;
      const bool is_past_the_peak = best.value() > 0.0 && moment < 0.7 * best.value();
      if (is_past_the_peak) break;
    }
    if (!best) return std::nullopt;
    return sign * *best;
  }

  const HotSection& section_;
  InteractionPoint top_;
  double top_kappa_ = 0;
  double top_strain_ = 0;
  bool top_has_no_moment_across_ = true;
};

}  // namespace

InteractionDiagram interaction(const Column& column, const thermal::TemperatureHistory& history,
                               double time_s, Axis axis) {
  const SectionMaterials materials(column, history);
  const HotMaterials hot = materials.at(time_s);
  const Direction direction = axis == Axis::x ? Direction{1, 0} : Direction{0, 1};
  const FibreLayout layout = fibre_layout(column.section, history.grid(), direction);
  const HotSection section(layout, hot, tube_grip(column, column.confinement, layout, hot),
                           materials.cold_concrete_Pa());
  return {.time_s = time_s, .axis = axis, .points = DiagramBuilder(section).build()};
}

}  // namespace ringward::mechanical
