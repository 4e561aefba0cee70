#include "thermal/mixed_face.hpp"

#include <algorithm>
#include <cmath>

namespace ringward::thermal {
namespace {

constexpr int kLines = 8;
constexpr int kPointsPerLine = 32;

/// Mean conductivity between two temperatures with its derivatives.
struct MeanConductivity {
  double value = 0;
  double slope_a = 0;
  double slope_b = 0;
};

MeanConductivity mean_conductivity(const EnthalpyCurve& curve, double a_C, double b_C) {
  const EnthalpyCurve::Conduction a = curve.conduction(a_C);
  const EnthalpyCurve::Conduction b = curve.conduction(b_C);
  const double difference = a_C - b_C;
  // Closer together, the quotient would lose its digits.
  if (std::abs(difference) < 1e-3) return {0.5 * (a.conductivity_W_mK + b.conductivity_W_mK), 0, 0};
  const double mean = (a.potential_W_m - b.potential_W_m) / difference;
  return {mean, (a.conductivity_W_mK - mean) / difference,
          (mean - b.conductivity_W_mK) / difference};
}

void add_line(MixedPath& path, const MixedPath::Line& line) {
  const auto same = [&](const MixedPath::Line& known) {
    return std::abs(known.steel_m - line.steel_m) < 1e-12 &&
           std::abs(known.concrete_m - line.concrete_m) < 1e-12;
  };
  const auto found = std::find_if(path.lines.begin(), path.lines.end(), same);
  if (found == path.lines.end()) {
    path.lines.push_back(line);
  } else {
    found->share += line.share;
  }
}

double at_share(double from, double to, double share) { return from + share * (to - from); }

}  // namespace

MixedPath mixed_path(const OrthogonalGrid& grid, CellIndex a, CellIndex b, Side side,
                     const InShape& in_shape) {
  const bool axis_1 = is_axis_1(side);
  const double length = half_distance_m(grid, a, side) + half_distance_m(grid, b, opposite(side));
  const double start_1 = middle_1(grid, a.i);
  const double start_2 = middle_2(grid, a.j);
  const double end_1 = axis_1 ? middle_1(grid, b.i) : start_1;
  // Across the seam of a closed circle the neighbour lies a turn further on.
  const double step_2 =
      0.5 * (grid.faces_2[a.j + 1] - grid.faces_2[a.j] + grid.faces_2[b.j + 1] - grid.faces_2[b.j]);
  const double end_2 = axis_1 ? start_2 : start_2 + step_2;
  MixedPath path;
  for (int line = 0; line < kLines; ++line) {
    const double across = (line + 0.5) / kLines;
    int in_steel = 0;
    for (int k = 0; k < kPointsPerLine; ++k) {
      const double along = (k + 0.5) / kPointsPerLine;
      const double at_1 = axis_1 ? at_share(start_1, end_1, along)
                                 : at_share(grid.faces_1[a.i], grid.faces_1[a.i + 1], across);
      const double at_2 = axis_1 ? at_share(grid.faces_2[a.j], grid.faces_2[a.j + 1], across)
                                 : at_share(start_2, end_2, along);
      in_steel += in_shape(section_point(grid, at_1, at_2)) ? 1 : 0;
    }
    const double steel = length * in_steel / kPointsPerLine;
    add_line(path, {1.0 / kLines, length - steel, steel});
  }
  return path;
}

MixedFlow mixed_flow(const MixedPath& path, const EnthalpyCurve& concrete,
                     const EnthalpyCurve& steel, double a_C, double b_C) {
  const MeanConductivity c = mean_conductivity(concrete, a_C, b_C);
  const MeanConductivity s = mean_conductivity(steel, a_C, b_C);
  double conductance = 0;
  double by_c = 0;
  double by_s = 0;
  for (const MixedPath::Line& line : path.lines) {
    const double k = 1.0 / (line.concrete_m / c.value + line.steel_m / s.value);
    conductance += line.share * k;
    by_c += line.share * k * k * line.concrete_m / (c.value * c.value);
    by_s += line.share * k * k * line.steel_m / (s.value * s.value);
  }
  const double difference = a_C - b_C;
  return {conductance * difference,
          conductance + difference * (by_c * c.slope_a + by_s * s.slope_a),
          -conductance + difference * (by_c * c.slope_b + by_s * s.slope_b)};
}

}  // namespace ringward::thermal
