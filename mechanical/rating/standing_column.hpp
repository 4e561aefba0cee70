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

enum class Standing { stands, falls, lost };

/// Follows the equilibrium of one column, at constant load, from one time to the next. A copy is
/// cheap, so that a step can be tried and thrown away.
class StandingColumn {
 public:
  explicit StandingColumn(const StandingCase& fixed) : fixed_(&fixed) {}

  /// Loads the cold column. `falls` when the load exceeds the cold capacity.
  [[nodiscard]] Standing load_cold(const HotMaterials& cold);

  /// Moves on to another time; `lost` when the step was too long for the solver.
  [[nodiscard]] Standing move_to(const HotMaterials& hot);

  [[nodiscard]] const Stance& stance() const { return stance_; }
  [[nodiscard]] double time_s() const { return time_s_; }
  [[nodiscard]] bool gap_closed() const { return gap_closed_; }
  /// From now on the tube no longer confines (model contact only).
  void close_gap() { gap_closed_ = true; }

  /// The limit point ahead of the present equilibrium: the member's capacity.
  [[nodiscard]] PathPoint limit() const;
  /// The largest force over all strains ahead of the present equilibrium.
  [[nodiscard]] double reserve_N() const;
  [[nodiscard]] double force_N(const PathPoint& point) const;
  [[nodiscard]] const HotSection& section() const { return *section_; }

 private:
  void build(const HotMaterials& hot);
  [[nodiscard]] Standing settle(const PathPoint& from);

  const StandingCase* fixed_;
  std::shared_ptr<const HotSection> section_;
  std::shared_ptr<const MemberModel> model_;
  Stance stance_;
  double time_s_ = 0;
  double tube_strain_ = 0;  ///< thermal strain of the tube now
  bool gap_closed_ = false;
};

}  // namespace ringward::mechanical
