#pragma once

#include <string>

#include "cli/study/size_search.hpp"
#include "cli/study/sized_column.hpp"
#include "cli/terminal.hpp"

namespace ringward::cli {

/// What a search was asked and what it found.
struct SizeReport {
  std::string title;
  std::string key;
  std::string unit;
  SizeBracket bracket;
  double required_min = 0;
  SizeResult result;

  [[nodiscard]] const SizeTrial* chosen() const {
    return result.chosen ? &result.trials[*result.chosen] : nullptr;
  }
};

[[nodiscard]] std::string size_text(const SizeReport& report, const Style& style);

/// Schema ringward-size/1.
[[nodiscard]] std::string size_json(const SizeReport& report);

/// The rated values, one row a value.
[[nodiscard]] std::string size_csv(const SizeReport& report);

}  // namespace ringward::cli
