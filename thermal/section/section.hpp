#pragma once

#include <optional>
#include <vector>

#include "thermal/base/piecewise_linear.hpp"

namespace ringward::thermal {

// The cross-section of the column. The origin is its centroid, x to the right, y up.
// Thermal and mechanical models read the same description.

struct Point {
  double x_m = 0;
  double y_m = 0;
};

enum class Shape { circular, square, rectangular };
enum class TubeRole {
  confining,  ///< cut short at the joints: confines the core, carries no axial load
  composite   ///< loaded together with the core
};
enum class Aggregate { siliceous, calcareous };
enum class ConductivityLimit { upper, lower, joined };
enum class BarForming { hot_rolled, cold_worked };
enum class SteelShapeKind { i_section, cross };

/// Outside of the tube, or of the concrete where there is no tube.
struct Outline {
  Shape shape = Shape::circular;
  double width_m = 0;  ///< along x; the diameter of a circle
  double depth_m = 0;  ///< along y; the diameter of a circle
};

struct Tube {
  double thickness_m = 0;
  double yield_Pa = 0;
  TubeRole role = TubeRole::confining;
  double end_gap_m = 0;
  double friction = 0.4;
  double clear_height_m = 0;
  double contact_resistance_m2K_W = 0;  ///< heat, between tube and core
};

struct Core {
  double strength_Pa = 0;  ///< cylinder strength at 20 C
  Aggregate aggregate = Aggregate::siliceous;
  double moisture_fraction = 0.03;  ///< by mass
  double density_kg_m3 = 2300;
  ConductivityLimit conductivity = ConductivityLimit::upper;
};

struct BarGroup {
  double diameter_m = 0;
  double yield_Pa = 0;
  BarForming forming = BarForming::hot_rolled;
  std::vector<Point> positions;
};

/// A steel shape embedded in the core. "cross": two I shapes at right angles, sharing the centre.
struct SteelShape {
  SteelShapeKind kind = SteelShapeKind::i_section;
  double depth_m = 0;
  double width_m = 0;
  double web_m = 0;
  double flange_m = 0;
  double yield_Pa = 0;
  double rotation_rad = 0;  ///< anticlockwise; 0: the web along y
};

struct Protection {
  double thickness_m = 0;
  PiecewiseLinear conductivity_W_mK{0.0};
  double density_kg_m3 = 0;
  PiecewiseLinear specific_heat_J_kgK{0.0};
  double moisture_fraction = 0;
};

struct Section {
  Outline outline;
  std::optional<Tube> tube;
  Core core;
  std::vector<BarGroup> bars;
  std::optional<SteelShape> steel_shape;
  std::optional<Protection> protection;

  [[nodiscard]] bool is_circular() const { return outline.shape == Shape::circular; }
  [[nodiscard]] double tube_thickness_m() const { return tube ? tube->thickness_m : 0.0; }
  [[nodiscard]] double core_width_m() const { return outline.width_m - 2.0 * tube_thickness_m(); }
  [[nodiscard]] double core_depth_m() const { return outline.depth_m - 2.0 * tube_thickness_m(); }
};

}  // namespace ringward::thermal
