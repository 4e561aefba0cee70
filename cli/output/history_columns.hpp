#pragma once

#include <functional>
#include <optional>
#include <string>
#include <vector>

#include "mechanical/rating/rating.hpp"

namespace ringward::cli {

/// One quantity of the rating's history, in the units of the interface.
struct HistoryColumn {
  std::string key;      ///< in JSON and CSV
  std::string heading;  ///< in the table for a person
  std::string unit;
  int digits = 0;        ///< in JSON and CSV
  int shown_digits = 0;  ///< in the table for a person
  std::function<std::optional<double>(const mechanical::HistoryRow&)> value;
};

/// The columns in their fixed order; JSON, CSV and text are all made from this one list.
[[nodiscard]] const std::vector<HistoryColumn>& history_columns();

}  // namespace ringward::cli
