#pragma once

#include <map>
#include <optional>
#include <string>

#include "cli/input/column_input.hpp"
#include "cli/input/toml_reading.hpp"

namespace ringward::cli {

/// The text of a column file with numbers replaced where they stand, or added below the heading of
/// their table; everything else, comments included, stays as it is. A number that has no such
/// place is left out: the caller checks what came of it.
[[nodiscard]] std::string with_numbers(const std::string& text,
                                       const std::map<std::string, double>& numbers);

/// The number written at `tube.thickness_mm` or `bars[0].axis_mm`, if there is one.
[[nodiscard]] std::optional<double> number_in(const InputNode& root, const std::string& key);

/// Whether a text reads as a column with the same values as `wanted`.
[[nodiscard]] bool same_values(const ColumnInput& wanted, const InputSource& text);

}  // namespace ringward::cli
