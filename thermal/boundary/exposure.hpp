#pragma once

#include <array>
#include <functional>
#include <optional>
#include <vector>

namespace ringward::thermal {

enum class FaceCondition {
  heated,   ///< sees the gas of the fire
  ambient,  ///< loses heat to the surroundings
  built_in  ///< against a wall that shares the heat: no heat flow
};

enum class Face { left = 0, right = 1, bottom = 2, top = 3 };

/// An arc of a circular outline, anticlockwise from +x, from < to <= from + 2 pi.
struct Arc {
  double from_rad = 0;
  double to_rad = 0;
};

/// Which parts of the outline see the fire.
struct ExposedParts {
  /// Square and rectangular outlines, indexed by Face.
  std::array<FaceCondition, 4> faces{FaceCondition::heated, FaceCondition::heated,
                                     FaceCondition::heated, FaceCondition::heated};
  /// Circular outlines: none means heated all round.
  std::optional<Arc> heated_arc;
  std::optional<Arc> built_in_arc;

  [[nodiscard]] FaceCondition face(Face which) const {
    return faces[static_cast<std::size_t>(which)];
  }
};

/// Convection and radiation at the heated surface (EN 1991-1-2 3.1).
struct HeatedSurface {
  double convection_W_m2K = 25;
  double emissivity = 0.7;  ///< product of surface and fire emissivity
};

struct Ambient {
  double temperature_C = 20;    ///< also the initial temperature of the section
  double convection_W_m2K = 9;  ///< radiation included
};

/// The gas temperature against time: any function, with the times at which its slope jumps.
struct GasTemperature {
  std::function<double(double t_s)> T_C;
  std::vector<double> kinks_s;  ///< increasing
  bool has_cooling = false;     ///< the gas cools within the followed time
};

/// Everything about the fire that the heat flow needs.
struct FireExposure {
  ExposedParts exposed;
  HeatedSurface surface;
  Ambient ambient;
  GasTemperature gas;
  double duration_s = 0;
};

}  // namespace ringward::thermal
