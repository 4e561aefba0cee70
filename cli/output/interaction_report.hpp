#pragma once

#include <string>
#include <vector>

#include "cli/terminal.hpp"
#include "mechanical/section/interaction.hpp"
#include "thermal/base/notice.hpp"

namespace ringward::cli {

/// N-M diagrams of the section, both axes at every time, with what is told beside them.
struct InteractionReport {
  std::string title;
  std::string fire;         ///< name of the curve
  std::string confinement;  ///< model, as in the input
  std::vector<mechanical::InteractionDiagram> diagrams;
  Notices notices;
};

[[nodiscard]] std::string interaction_text(const InteractionReport& report, const Style& style);

/// Schema ringward-interaction/1.
[[nodiscard]] std::string interaction_json(const InteractionReport& report);

/// time_min,axis,axial_kN,moment_kNm
[[nodiscard]] std::string interaction_csv(const InteractionReport& report);

}  // namespace ringward::cli
