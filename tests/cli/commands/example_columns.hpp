#pragma once

#include <string>

namespace ringward::testing {

// Invented columns, on the coarse grid so that the tests of the command line stay quick.

/// A round bare column with bars that fails well before the end of the followed fire.
[[nodiscard]] inline std::string round_bare_column() {
  return R"toml(title = "Round bare column (invented example)"
[section]
shape = "circular"
diameter_mm = 200
[core]
strength_MPa = 30
[[bars]]
count = 6
diameter_mm = 12
axis_mm = 35
yield_MPa = 500
[member]
length_mm = 2000
[load]
axial_kN = 500
[fire]
curve = "standard"
duration_min = 120
[numerics]
accuracy = "coarse"
)toml";
}

/// A square composite column with bars.
[[nodiscard]] inline std::string square_column() {
  return R"toml(title = "Square column (invented example)"
[section]
shape = "square"
side_mm = 200
[tube]
thickness_mm = 5
yield_MPa = 355
role = "composite"
[core]
strength_MPa = 30
[[bars]]
count = 4
diameter_mm = 12
axis_mm = 35
yield_MPa = 500
layout = "corners"
[member]
length_mm = 2000
[load]
axial_kN = 300
[fire]
curve = "standard"
duration_min = 60
[numerics]
accuracy = "coarse"
)toml";
}

/// A round column in a confining tube.
[[nodiscard]] inline std::string round_tubed_column() {
  return R"toml(title = "Round tubed column (invented example)"
[section]
shape = "circular"
diameter_mm = 200
[tube]
thickness_mm = 4
yield_MPa = 355
end_gap_mm = 10
[core]
strength_MPa = 30
[[bars]]
count = 6
diameter_mm = 12
axis_mm = 35
yield_MPa = 500
[member]
length_mm = 2000
[load]
axial_kN = 400
[fire]
curve = "standard"
duration_min = 60
[numerics]
accuracy = "coarse"
)toml";
}

}  // namespace ringward::testing
