#pragma once

#include <string>
#include <vector>

#include "cli/input/column_input.hpp"

namespace ringward::cli {

/// One input with the values that it may well have instead, as TOML.
struct UncertainInput {
  std::string key;  ///< in file spelling
  std::string low;
  std::string base;
  std::string high;
  std::string basis;   ///< where the two come from, in words
  std::string source;  ///< key in docs/sources.toml, "common practice, no source", "column file"
};

/// The uncertain inputs that this column has: the defaults, and in their place or beside them what
/// the column's [sensitivity] gives. Values that the input does not allow are moved to its limit.
[[nodiscard]] std::vector<UncertainInput> uncertain_inputs(const ColumnInput& input);

}  // namespace ringward::cli
