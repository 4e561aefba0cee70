#include "mechanical/member/equilibrium_path.hpp"

#include <Eigen/LU>
#include <algorithm>
#include <cmath>

#include "thermal/base/error.hpp"

namespace ringward::mechanical {
namespace {

constexpr double kResidualTolerance = 1e-9;  // of the reference force
constexpr int kNewtonLimit = 20;
constexpr int kHalvingLimit = 4;
constexpr double kFirstStep = 0.1;    // times the length scale of the model, as kLargestStep
constexpr double kLargestStep = 0.5;  // 0.05 % strain: far below the distance between two peaks
constexpr double kStartForce = 1e-3;  // of the plastic resistance
constexpr double kLeastStartForce = 1e-7;
constexpr double kCornerStep = 1e-3;
constexpr double kCornerReach = 0.2;
constexpr double kCornerStretch = 20.0;
constexpr double kSmallestStep = 1e-6;
constexpr double kSmallestWidth = 1e-9;
constexpr double kForceTolerance = 1e-8;
constexpr double kMaximumTolerance = 1e-7;
constexpr double kCrushedStrain = 0.06;  // beyond eps_cu1 of any temperature
constexpr int kWalkLimit = 1000;

Error path_lost(const char* what) {
  return {ErrorKind::solver_breakdown, std::string("equilibrium path of the member: ") + what};
}

}  // namespace

std::optional<PathPoint> EquilibriumPath::project(const Eigen::VectorXd& guess,
                                                  const Eigen::VectorXd& direction) const {
  const Eigen::Index m = model_.equations();
  Eigen::VectorXd q = guess;
  MemberModel::Linearised at = model_.linearise(q);
  for (int iteration = 0; iteration < kNewtonLimit; ++iteration) {
    const double norm = at.residual.lpNorm<Eigen::Infinity>();
    if (!std::isfinite(norm)) return std::nullopt;
    Eigen::MatrixXd bordered(m + 1, m + 1);
    bordered.topRows(m) = at.jacobian;
    bordered.bottomRows(1) = direction.transpose();
    const Eigen::PartialPivLU<Eigen::MatrixXd> lu(bordered);
    if (norm < kResidualTolerance) {
      Eigen::VectorXd along = lu.solve(Eigen::VectorXd::Unit(m + 1, m));
      if (!along.allFinite() || along.norm() == 0.0) return std::nullopt;
      along.normalize();
      return PathPoint{q, along, at.pressure_Pa, at.hoop_Pa};
    }
    Eigen::VectorXd right = Eigen::VectorXd::Zero(m + 1);
    right.head(m) = -at.residual;
    const Eigen::VectorXd change = lu.solve(right);
    if (!change.allFinite()) return std::nullopt;
    // Fibres that crack or crush bend the residual sharply: shorten what does not improve it.
    double share = 1.0;
    for (int halving = 0;; ++halving) {
      at = model_.linearise(q + share * change, at.pressure_Pa);
      const bool better = at.residual.lpNorm<Eigen::Infinity>() < norm;
      if (better || halving == kHalvingLimit) break;
      share *= 0.5;
    }
    q += share * change;
  }
  return std::nullopt;
}

std::optional<PathPoint> EquilibriumPath::start(double eps0) const {
  const Eigen::VectorXd guess = model_.uniform_state(eps0);
  if (std::optional<PathPoint> point = project(guess, model_.uniform_state(1.0).normalized())) {
    return point;
  }
  // Far out of the middle the mean strain is tensile from the first load on: give the force
  // instead, a smaller one the larger the lever arm is.
  const Eigen::Index force = model_.equations();
  for (double small = kStartForce; small > kLeastStartForce; small *= 0.2) {
    Eigen::VectorXd loaded = guess * (small / kStartForce);
    loaded(force) = small;
    std::optional<PathPoint> point = project(loaded, Eigen::VectorXd::Unit(force + 1, force));
    if (point) return point;
  }
  return std::nullopt;
}

std::optional<PathPoint> EquilibriumPath::try_advance(const PathPoint& from, double& step) const {
  bool tried_corner = false;
  while (std::abs(step) > kSmallestStep) {
    const std::optional<PathPoint> next = project(from.q + step * from.tangent, from.tangent);
    // A turn of more than 60 degrees means that Newton found another branch, or a corner.
    if (next && next->tangent.dot(from.tangent) > 0.5) return next;
    if (std::abs(step) < kCornerStep) {
      if (next && (next->q - from.q).norm() < kCornerStretch * std::abs(step)) return next;
      if (!tried_corner) {
        if (std::optional<PathPoint> beyond = turn_corner(from, step)) return beyond;
      }
      tried_corner = true;
    }
    step *= 0.5;
  }
  return std::nullopt;
}

PathPoint EquilibriumPath::advance(const PathPoint& from, double& step) const {
  if (std::optional<PathPoint> next = try_advance(from, step)) return *next;
  throw path_lost("no neighbouring equilibrium found");
}

// Where bars yield the path has corners, sharper than a right angle at times: no plane across the
// old direction meets the new one. Mid-height curvature or strain still moves on there, one way or
// the other; the way back along the old direction is not taken.
std::optional<PathPoint> EquilibriumPath::turn_corner(const PathPoint& from, double step) const {
  const double sense = step > 0.0 ? 1.0 : -1.0;
  for (const double reach : {1.0, 4.0, 16.0}) {
    for (const Eigen::Index control : {Eigen::Index{1}, Eigen::Index{0}}) {
      for (const double way : {1.0, -1.0}) {
        const Eigen::VectorXd axis = Eigen::VectorXd::Unit(from.q.size(), control) * way;
        const Eigen::VectorXd guess = from.q + sense * reach * kCornerStep * axis;
        const std::optional<PathPoint> beyond = project(guess, axis);
        if (!beyond) continue;
        const Eigen::VectorXd move = beyond->q - from.q;
        const bool is_back = sense * move.dot(from.tangent) < -0.95 * move.norm();
        if (!is_back && move.norm() < kCornerReach) return beyond;
      }
    }
  }
  return std::nullopt;
}

std::optional<PathPoint> EquilibriumPath::at_force(const PathPoint& from, double scaled_N) const {
  Eigen::VectorXd guess = from.q;
  const double gap = scaled_N - from.scaled_N();
  guess += from.tangent * (gap / from.N_slope());
  guess(guess.size() - 1) = scaled_N;
  std::optional<PathPoint> found =
      project(guess, Eigen::VectorXd::Unit(guess.size(), guess.size() - 1));
  if (!found) return std::nullopt;
  // `along` was normalised against the force axis: forward means rising force here.
  if (found->tangent.dot(from.tangent) <= 0.0) return std::nullopt;
  return found;
}

EquilibriumPath::Walk EquilibriumPath::walk_to_force(const PathPoint& from, double scaled_N) const {
  PathPoint current = from;
  double step = kFirstStep * model_.length_scale();
  const double sign = from.scaled_N() < scaled_N ? 1.0 : -1.0;
  for (int count = 0; count < kWalkLimit; ++count) {
    const double gap = scaled_N - current.scaled_N();
    if (std::abs(gap) < kForceTolerance) return {End::at_force, current};
    if (sign > 0.0 && current.N_slope() <= 0.0) return {End::at_limit, current};
    const double to_target = current.N_slope() > 0.0 ? std::abs(gap / current.N_slope()) : step;
    if (current.N_slope() > 0.0 && to_target <= 2.0 * step) {
      const std::optional<PathPoint> there = at_force(current, scaled_N);
      if (there && there->N_slope() > 0.0) {
        const double moved = (there->q - current.q).norm();
        if (moved < 4.0 * to_target + 1e-6) return {End::at_force, *there};
      }
    }
    double signed_step = sign * std::min(step, std::max(to_target, 1e-4));
    const PathPoint next = advance(current, signed_step);
    const bool passed = sign * (scaled_N - next.scaled_N()) < 0.0;
    if (sign > 0.0 && !passed && next.N_slope() <= 0.0) {
      PathPoint top = refine_maximum(current, signed_step);
      if (top.scaled_N() < scaled_N) return {End::at_limit, top};
      step = 0.5 * std::abs(signed_step);
      continue;
    }
    const bool turns_up = sign < 0.0 && current.N_slope() > 0.0 && next.N_slope() <= 0.0;
    if (!passed && turns_up) return {End::at_limit, next};
    if (passed) {
      // Close in from the near side: the step over the target was too long for Newton at the force.
      step = 0.5 * std::abs(signed_step);
      if (step < kSmallestStep) return {End::at_force, next};
      continue;
    }
    current = next;
    step = std::min(kLargestStep * model_.length_scale(), 1.6 * std::abs(signed_step));
  }
  throw path_lost("the applied force is not reached");
}

// The slope of N along the path falls through zero between `before` and `before` + step. The base
// moves up with every rising point, so that sharp turns of the path stay within reach.
PathPoint EquilibriumPath::refine_maximum(const PathPoint& before, double step) const {
  PathPoint base = before;
  PathPoint best = before;
  double width = step;
  double falling_slope = 0.0;  // unknown until a falling point is met
  for (int iteration = 0; iteration < 80 && width > kSmallestWidth; ++iteration) {
    double share = 0.5;
    if (falling_slope < 0.0 && iteration % 3 != 0) {
      share = std::clamp(base.N_slope() / (base.N_slope() - falling_slope), 0.02, 0.98);
    }
    const std::optional<PathPoint> point =
        project(base.q + share * width * base.tangent, base.tangent);
    const bool reached = point && point->tangent.dot(base.tangent) > 0.5;
    if (reached && point->scaled_N() > best.scaled_N()) best = *point;
    if (reached && point->N_slope() > 0.0) {
      base = *point;
      width *= 1.0 - share;
    } else {
      width *= share;
      falling_slope = reached ? point->N_slope() : 0.0;
    }
    // The force is within slope x width of the maximum.
    if (falling_slope < 0.0 &&
        width * std::max(base.N_slope(), -falling_slope) < kMaximumTolerance) {
      break;
    }
  }
  return best;
}

PathPoint EquilibriumPath::walk_to_maximum(const PathPoint& from) const {
  PathPoint current = from;
  double step = kFirstStep * model_.length_scale();
  for (int count = 0; count < kWalkLimit; ++count) {
    if (current.N_slope() <= 0.0) return current;
    const std::optional<PathPoint> next = try_advance(current, step);
    // Every point passed is an equilibrium: where the path cannot be followed on, as where one
    // station of the length snaps by itself, the force reached is a lower bound of the maximum.
    if (!next) return current;
    if (next->N_slope() <= 0.0) return refine_maximum(current, step);
    if (next->scaled_N() < current.scaled_N()) {  // a maximum and a minimum inside one step
      step *= 0.5;
      continue;
    }
    current = *next;
    step = std::min(kLargestStep * model_.length_scale(), 1.6 * step);
  }
  throw path_lost("no maximum of the force found");
}

double EquilibriumPath::largest_force(const PathPoint& from) const {
  PathPoint current = from;
  double step = kFirstStep * model_.length_scale();
  double largest = from.scaled_N();
  for (int count = 0; count < kWalkLimit; ++count) {
    const StrainPlane plane = model_.plane(current.q, 0);
    const double bending =
        std::hypot(plane.kappa_u_1_m, plane.kappa_v_1_m) * model_.section().extent_m();
    const bool crushed = plane.eps0 > kCrushedStrain || bending > 2.0 * kCrushedStrain;
    if (crushed || current.scaled_N() < 0.05 * largest) break;
    double tried = step;
    PathPoint next;
    try {
      next = advance(current, tried);
    } catch (const Error&) {
      break;  // the tail of the path: what was found so far stands
    }
    if (current.N_slope() > 0.0 && next.N_slope() <= 0.0) {
      largest = std::max(largest, refine_maximum(current, tried).scaled_N());
    }
    largest = std::max(largest, next.scaled_N());
    current = next;
    step = std::min(kLargestStep * model_.length_scale(), 1.6 * tried);
  }
  return largest;
}

}  // namespace ringward::mechanical
