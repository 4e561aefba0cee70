#pragma once

#include <map>
#include <optional>
#include <string>
#include <vector>

#include "cli/input/input_values.hpp"
#include "fires/fire_curve.hpp"
#include "mechanical/column.hpp"
#include "thermal/base/notice.hpp"
#include "thermal/boundary/exposure.hpp"
#include "thermal/temperature_history.hpp"

namespace ringward::cli {

/// One column file, checked and in SI units, with everything that a result repeats of it.
struct ColumnInput {
  std::string title;
  mechanical::Column column;
  thermal::FireExposure fire;
  fires::FireCurvePtr curve;
  thermal::Accuracy accuracy = thermal::Accuracy::standard;
  std::optional<double> required_s;
  bool has_classes = true;  ///< a nominal fire, for which fire-resistance classes exist
  Notices notices;          ///< limits of validity that show in the input alone
  std::vector<EchoEntry> echo;
  std::string input_sha256;  ///< of the file, the overrides and fire.points_csv
  std::map<std::string, std::string> submission;  ///< the keys given
  std::vector<SensitivityRange> sensitivity;
};

}  // namespace ringward::cli
