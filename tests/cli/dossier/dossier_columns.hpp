#pragma once

#include <string>

#include "tests/cli/commands/example_columns.hpp"

namespace ringward::testing {

/// The round tubed column with a requirement that it does not meet, and a submission.
[[nodiscard]] inline std::string submitted_column() {
  return round_tubed_column() + R"toml([rating]
required_min = 60
[submission]
project = "Invented hall"
element = "C7"
author = "A. Author"
checker = "C. Checker"
revision = "B"
date = "2026-02-03"
authority = "Invented authority"
)toml";
}

/// A rectangular column that is heated on one side and still stands at the end.
[[nodiscard]] inline std::string surviving_column() {
  return R"toml(title = "Rectangular column (invented example)"
[section]
shape = "rectangular"
width_mm = 300
depth_mm = 200
[core]
strength_MPa = 30
[[bars]]
count = 4
diameter_mm = 16
axis_mm = 40
yield_MPa = 500
layout = "corners"
[member]
length_mm = 2000
[load]
axial_kN = 150
[fire]
curve = "standard"
exposed = ["left"]
duration_min = 30
[numerics]
accuracy = "coarse"
)toml";
}

}  // namespace ringward::testing
