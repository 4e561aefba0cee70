#pragma once

#include <string>
#include <vector>

#include "mechanical/column.hpp"
#include "thermal/temperature_history.hpp"

namespace ringward::cli {

/// All of one material within one range of temperature. The ranges end where the strength tables
/// have their points, so that between them strength is linear in temperature and the factor at the
/// mean temperature is the mean factor.
struct HandCheckRow {
  std::string part;        ///< "Concrete", "Bars, group 1", ...
  std::string range;       ///< "200 to 300 C"
  double area_m2 = 0;      ///< negative: concrete that bars displace
  double mean_C = 0;       ///< by area
  double factor = 0;       ///< strength at temperature over strength at 20 C, mean by area
  double strength_Pa = 0;  ///< at 20 C, divided by its material factor
  double force_N = 0;      ///< area x factor x strength
};

/// The plastic resistance of the section at one time, in a table short enough to redo by hand.
struct HandCheck {
  double time_s = 0;
  std::vector<HandCheckRow> rows = {};
  double total_N = 0;
  /// Some part has been hotter than it is now: its factor does not follow from the temperature
  /// printed.
  bool has_cooled = false;
};

/// @param time_s within the history
/// @source en1992-1-2-2004 Table 3.1, Table 3.2a; en1993-1-2-2005 Table 3.1
[[nodiscard]] HandCheck hand_check(const mechanical::Column& column,
                                   const thermal::TemperatureHistory& history, double time_s);

}  // namespace ringward::cli
