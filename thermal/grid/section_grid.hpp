#pragma once

#include <array>
#include <vector>

#include "thermal/boundary/exposure.hpp"
#include "thermal/grid/distances.hpp"
#include "thermal/grid/orthogonal_grid.hpp"
#include "thermal/section/section.hpp"
#include "thermal/temperature_history.hpp"

namespace ringward::thermal {

/// The grid of a section with what the cells along each of its sides see.
struct SectionGrid {
  OrthogonalGrid grid;
  /// By Side; empty on lines of symmetry and at the centre of a circle.
  std::array<std::vector<FaceCondition>, 4> sides;
  bool closed_circle = false;
};

/// Builds the grid: lines on every interface, small cells at the exposed faces, the largest
/// symmetry that outline, exposure and steel shape share.
[[nodiscard]] SectionGrid grid_of_section(const Section& section, const ExposedParts& exposed,
                                          const Resolution& resolution);

}  // namespace ringward::thermal
