#pragma once

#include "cli/input/column_input.hpp"
#include "cli/input/input_values.hpp"

namespace ringward::cli {

/// Limits of validity and assumptions that the input alone shows, without a calculation.
[[nodiscard]] Notices input_notices(const ColumnInput& input, const InputValues& values);

}  // namespace ringward::cli
