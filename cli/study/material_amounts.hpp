#pragma once

#include "thermal/section/section.hpp"

namespace ringward::cli {

/// What one metre of column is made of, without laps, links, joints or waste.
struct MaterialAmounts {
  double tube_kg_m = 0;
  double bars_kg_m = 0;
  double shape_kg_m = 0;
  double concrete_m3_m = 0;

  [[nodiscard]] double steel_kg_m() const { return tube_kg_m + bars_kg_m + shape_kg_m; }
};

/// Areas times 7850 kg/m3; the concrete is the core less bars and steel shape.
/// @source en1991-1-1-2002 Table A.4 (density of steel, 77.0 to 78.5 kN/m3)
[[nodiscard]] MaterialAmounts material_amounts(const thermal::Section& section);

}  // namespace ringward::cli
