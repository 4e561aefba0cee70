#pragma once

#include <string>

#include "cli/pictures/picture.hpp"
#include "cli/study/sensitivity.hpp"
#include "cli/terminal.hpp"

namespace ringward::cli {

[[nodiscard]] std::string sensitivity_text(const SensitivityReport& report, const Style& style);

/// Schema ringward-sensitivity/1.
[[nodiscard]] std::string sensitivity_json(const SensitivityReport& report);

/// One row an input, the one that moves the fire resistance most first.
[[nodiscard]] std::string sensitivity_csv(const SensitivityReport& report);

/// Bars from the base to the answers at the low and at the high value.
[[nodiscard]] Picture sensitivity_picture(const SensitivityReport& report);

}  // namespace ringward::cli
