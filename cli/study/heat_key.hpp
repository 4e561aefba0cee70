#pragma once

#include <string>
#include <vector>

#include "cli/input/column_input.hpp"

namespace ringward::cli {

/// Input keys that the heat flow does not depend on, in schema spelling; an entry that ends with a
/// dot stands for every key that starts with it. A key that is not listed counts as one that it
/// depends on.
[[nodiscard]] const std::vector<std::string>& keys_without_heat();

/// Two columns of one study have the same temperatures when this text is the same.
[[nodiscard]] std::string heat_key(const ColumnInput& input);

}  // namespace ringward::cli
