#pragma once

#include <string>

#include "cli/output/field_states.hpp"
#include "cli/terminal.hpp"
#include "thermal/base/notice.hpp"
#include "thermal/section/section.hpp"

namespace ringward::cli {

/// The temperatures of a section with what is told beside them.
struct FieldReport {
  std::string title;
  std::string fire;  ///< name of the curve
  thermal::Section section;
  Field field;
  Notices notices;
};

/// Tube, core face, centre and each bar group's hottest and coldest bar; probes where there are.
[[nodiscard]] std::string field_text(const FieldReport& report, const Style& style);

/// Schema ringward-field/1.
[[nodiscard]] std::string field_json(const FieldReport& report);

/// time_min,x_mm,y_mm,temperature_C: one row a time and probe.
[[nodiscard]] std::string field_csv(const FieldReport& report);

}  // namespace ringward::cli
