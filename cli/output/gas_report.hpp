#pragma once

#include <string>
#include <vector>

#include "cli/terminal.hpp"
#include "thermal/base/notice.hpp"

namespace ringward::cli {

struct GasPoint {
  double time_s = 0;
  double T_C = 0;
};

/// The gas temperature that a column sees.
struct GasReport {
  std::string title;
  std::string fire;  ///< name of the curve
  std::vector<GasPoint> points;
  Notices notices;
};

[[nodiscard]] std::string gas_text(const GasReport& report, const Style& style);

/// Schema ringward-gas/1.
[[nodiscard]] std::string gas_json(const GasReport& report);

/// time_min,temperature_C
[[nodiscard]] std::string gas_csv(const GasReport& report);

}  // namespace ringward::cli
