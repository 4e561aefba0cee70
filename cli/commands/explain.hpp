#pragma once

#include <optional>
#include <string>

namespace ringward::cli {

/// What an input key means: unit, range, default, choices, source; for a table, its keys; without
/// a key, the list of all.
/// @param key as in a column file; `bars[0].axis_mm`, `bars[].axis_mm` and `bars.axis_mm` are one
/// @throws Error(bad_input) for an unknown key, with the nearest one
[[nodiscard]] std::string explain_text(const std::optional<std::string>& key);

/// docs/input.md: every key with unit, range, default, meaning and source.
[[nodiscard]] std::string input_reference_markdown();

}  // namespace ringward::cli
