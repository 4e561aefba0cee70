#pragma once

#include <memory>
#include <optional>

#include "mechanical/member/bending_cases.hpp"
#include "mechanical/member/equilibrium_path.hpp"

namespace ringward::mechanical {

/// What does not change while one column stands in one fire.
struct StandingCase {
  const Column& column;
  const SectionMaterials& materials;
  const DeflectedShape& shape;
  const BendingCase& bending;
  ConfinementModel model = ConfinementModel::none;
  double load_N = 0;
};

/// The column at one time under its load: the equilibrium it stands on.
struct Stance {
  PathPoint point;
  StrainPlane mid_height;
  double gap_closure_m = 0;  ///< of both end gaps together; closed at 2 end_gap
};

/// `jumps`: the nearest equilibrium under the load is farther away than one step may move; `lost`:
/// the solver found none. Both call for a shorter step; what still jumps then is no longer the
/// equilibrium that the column stood on.
enum class Standing { stands, falls, jumps, lost };

/// Largest change of a scaled strain or curvature (0.1 %) in one step of time.
inline constexpr double kLargestMove = 0.3;

/// Follows the equilibrium of one column, at constant load, from one time to the next. A copy is
/// cheap, so that a step can be tried and thrown away.
class StandingColumn {
 public:
  explicit StandingColumn(const StandingCase& fixed) : fixed_(&fixed) {}

  /// Loads the cold column. `falls` when the load exceeds the cold capacity.
  [[nodiscard]] Standing load_cold(const HotMaterials& cold);

  /// Moves on to another time.
  [[nodiscard]] Standing move_to(const HotMaterials& hot);
  /// At the present time, from now on without the tube (its end gaps have closed). The state may
  /// move far: only the loss of equilibrium is a fall.
  [[nodiscard]] Standing close_gap(const HotMaterials& hot);

  [[nodiscard]] const Stance& stance() const { return stance_; }
  [[nodiscard]] double time_s() const { return time_s_; }
  [[nodiscard]] bool gap_closed() const { return gap_closed_; }
  /// The limit point ahead of the present equilibrium: the member's capacity.
  [[nodiscard]] PathPoint limit() const;
  /// The largest force over all strains ahead of the present equilibrium.
  [[nodiscard]] double reserve_N() const;
  [[nodiscard]] double force_N(const PathPoint& point) const;
  /// Hoop stress under the load that a cooling tube regains by its contraction; not credited.
  [[nodiscard]] double regained_hoop_Pa() const;
  [[nodiscard]] const HotSection& section() const { return *section_; }

 private:
  void build(const HotMaterials& hot);
  [[nodiscard]] Standing settle(const PathPoint& from);
  [[nodiscard]] Standing settle_near(const Eigen::VectorXd& before);

  const StandingCase* fixed_;
  std::shared_ptr<const HotSection> section_;
  std::shared_ptr<const MemberModel> model_;
  Stance stance_;
  double time_s_ = 0;
  double tube_strain_ = 0;       ///< thermal strain of the tube now
  double tube_contraction_ = 0;  ///< below its strain at its peak temperature
  bool gap_closed_ = false;
};

}  // namespace ringward::mechanical
