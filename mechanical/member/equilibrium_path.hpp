#pragma once

#include <Eigen/Core>
#include <optional>

#include "mechanical/member/member_model.hpp"

namespace ringward::mechanical {

/// A state of equilibrium, with the direction in which the path leaves it.
struct PathPoint {
  Eigen::VectorXd q;        ///< unknowns of the member model
  Eigen::VectorXd tangent;  ///< unit vector along the path, forward
  double pressure_Pa = 0;
  double hoop_Pa = 0;
  [[nodiscard]] double scaled_N() const { return q(q.size() - 1); }
  [[nodiscard]] double N_slope() const { return tangent(tangent.size() - 1); }
};

/// Follows the equilibrium path of a member at one time by arc length (predictor, and Newton in
/// the plane across the path), so that limit points and descending parts are passed.
class EquilibriumPath {
 public:
  explicit EquilibriumPath(const MemberModel& model) : model_(model) {}

  /// The equilibrium nearest to `guess` in the plane through it across `direction`; its force is a
  /// result. None when Newton does not converge.
  [[nodiscard]] std::optional<PathPoint> project(const Eigen::VectorXd& guess,
                                                 const Eigen::VectorXd& direction) const;

  /// The start of the path: a little uniform shortening beyond `eps0`, as good as unloaded.
  [[nodiscard]] std::optional<PathPoint> start(double eps0) const;

  /// What a walk along the path ended at.
  enum class End { at_force, at_limit };
  struct Walk {
    End end = End::at_force;
    PathPoint point;
  };
  /// From `from` to the force N, the way the column would move: forward while the resistance is
  /// below N, backward while it is above. Ends at the limit that comes first: a maximum below N,
  /// or, going back, a minimum above N (constant end moments need some axial force).
  /// @throws Error(solver_breakdown) when the path cannot be followed
  [[nodiscard]] Walk walk_to_force(const PathPoint& from, double scaled_N) const;

  /// Forward to the first maximum of the force, or to the last equilibrium that can be reached.
  /// @throws Error(solver_breakdown) when the path cannot be followed
  [[nodiscard]] PathPoint walk_to_maximum(const PathPoint& from) const;

  /// The largest force on the whole path forward of `from`, up to strains where all is crushed.
  [[nodiscard]] double largest_force(const PathPoint& from) const;

 private:
  [[nodiscard]] std::optional<PathPoint> at_force(const PathPoint& from, double scaled_N) const;
  [[nodiscard]] PathPoint refine_maximum(const PathPoint& before, double step) const;
  /// One step of at most `step` (negative: backward); shortens it until Newton converges.
  [[nodiscard]] PathPoint advance(const PathPoint& from, double& step) const;
  [[nodiscard]] std::optional<PathPoint> try_advance(const PathPoint& from, double& step) const;
  [[nodiscard]] std::optional<PathPoint> turn_corner(const PathPoint& from, double step) const;

  const MemberModel& model_;
};

}  // namespace ringward::mechanical
