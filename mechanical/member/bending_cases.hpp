#pragma once

#include <vector>

#include "mechanical/column.hpp"
#include "mechanical/member/deflection.hpp"
#include "mechanical/member/member_model.hpp"
#include "mechanical/section/fibres.hpp"
#include "mechanical/section/hot_materials.hpp"

namespace ringward::mechanical {

/// One candidate for the worst direction of the imperfection.
struct BendingCase {
  Direction direction;  ///< u: the imperfection points this way
  FibreLayout layout;   ///< in the axes of the direction; merged when bending is uniaxial
  MemberLoading loading;
};

/// The member as it is computed: how it deflects, and the directions that are not equal to another
/// by symmetry of section, temperatures and load.
struct MemberSetup {
  DeflectedShape shape;
  std::vector<BendingCase> cases;
};

/// Intervals of the half length where the deflection is integrated.
inline constexpr int kHalfLengthIntervals = 8;

/// Directions: along the load's eccentricity, +-x, +-y, towards and away from the hotter side, and
/// in a round section towards and between the bars of each ring. A concentric load on a section
/// that is symmetric both ways, temperatures included, deflects as a half-sine; everything else is
/// integrated along the length.
[[nodiscard]] MemberSetup member_setup(const Column& column, const SectionMaterials& materials);

}  // namespace ringward::mechanical
