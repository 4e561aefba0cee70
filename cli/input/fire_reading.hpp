#pragma once

#include <filesystem>
#include <string>
#include <vector>

#include "cli/input/input_values.hpp"
#include "cli/input/problems.hpp"
#include "fires/fire_curve.hpp"
#include "thermal/boundary/exposure.hpp"

namespace ringward::cli {

/// The fire of an input; without a valid curve, `curve` is null and a problem was added.
struct FireReading {
  fires::FireCurvePtr curve;
  thermal::FireExposure exposure;
  std::string csv_text;  ///< content of fire.points_csv, part of the effective input
};

/// @param folder of the column file, where relative paths start
[[nodiscard]] FireReading read_fire(InputValues& values, const std::filesystem::path& folder,
                                    Problems& problems);

}  // namespace ringward::cli
