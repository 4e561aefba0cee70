#pragma once

#include <functional>
#include <vector>

#include "thermal/enthalpy_curve.hpp"
#include "thermal/grid/distances.hpp"
#include "thermal/grid/orthogonal_grid.hpp"

namespace ringward::thermal {

/// Whether a point of the section lies in the embedded steel shape.
using InShape = std::function<bool(const Point& point)>;

/// Lines from the middle of one cell to the middle of the next, by how much of them is steel.
/// Cells that the shape cuts conduct along each line as the materials in series, and over the
/// face as the lines side by side.
struct MixedPath {
  struct Line {
    double share = 0;  ///< of the face
    double concrete_m = 0;
    double steel_m = 0;
  };
  std::vector<Line> lines;
};

/// Samples the lines between a cell and its neighbour beyond `side` (high_1 or high_2).
[[nodiscard]] MixedPath mixed_path(const OrthogonalGrid& grid, CellIndex a, CellIndex b, Side side,
                                   const InShape& in_shape);

struct MixedFlow {
  double flux_W_m2 = 0;  ///< from a to b
  double slope_a = 0;    ///< d flux / d T_a
  double slope_b = 0;    ///< d flux / d T_b
};

/// Flux between two cells along the lines, with the mean conductivity of each material between
/// the two temperatures.
[[nodiscard]] MixedFlow mixed_flow(const MixedPath& path, const EnthalpyCurve& concrete,
                                   const EnthalpyCurve& steel, double a_C, double b_C);

}  // namespace ringward::thermal
