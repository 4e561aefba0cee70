#pragma once

#include <array>
#include <optional>
#include <string>
#include <variant>
#include <vector>

#include "cli/input/input_tree.hpp"
#include "cli/input/problems.hpp"
#include "cli/input/schema.hpp"

namespace ringward::cli {

using NumberPair = std::array<double, 2>;

/// A value in the units of the column file; `monostate` where there is none.
using InputValue = std::variant<std::monostate, double, std::string, std::vector<std::string>,
                                NumberPair, std::vector<NumberPair>>;

/// Checks type, finiteness, range and choice of one value against its line of the schema.
/// @param key in file spelling, for messages
/// @return the value, or `monostate` after a problem was added
[[nodiscard]] InputValue check_value(const KeySpec& spec, const std::string& key,
                                     const InputNode& node, Problems& problems);

/// The default of the schema; `monostate` where there is none or it follows from other keys.
[[nodiscard]] InputValue default_value(const KeySpec& spec);

}  // namespace ringward::cli
