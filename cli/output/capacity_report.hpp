#pragma once

#include <string>
#include <vector>

#include "cli/terminal.hpp"
#include "mechanical/rating/rating.hpp"
#include "thermal/base/notice.hpp"

namespace ringward::cli {

/// Resistance at given times with what is told beside it.
struct CapacityReport {
  std::string title;
  std::string fire;  ///< name of the curve
  mechanical::ConfinementModel confinement = mechanical::ConfinementModel::none;
  std::vector<mechanical::CapacityState> states;
  Notices notices;
};

[[nodiscard]] std::string capacity_text(const CapacityReport& report, const Style& style);

/// Schema ringward-capacity/1.
[[nodiscard]] std::string capacity_json(const CapacityReport& report);

/// One row a time, with the keys of the JSON states.
[[nodiscard]] std::string capacity_csv(const CapacityReport& report);

/// The model as it is spelt in the input.
[[nodiscard]] std::string confinement_word(mechanical::ConfinementModel model);

}  // namespace ringward::cli
