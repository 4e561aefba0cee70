#pragma once

#include <vector>

#include "cli/input/schema.hpp"

namespace ringward::cli {

// The parts that input_schema() joins, in the order of a column file.

[[nodiscard]] std::vector<KeySpec> section_keys();
[[nodiscard]] std::vector<KeySpec> reinforcement_keys();
[[nodiscard]] std::vector<KeySpec> member_keys();
[[nodiscard]] std::vector<KeySpec> fire_keys();
[[nodiscard]] std::vector<KeySpec> record_keys();

}  // namespace ringward::cli
