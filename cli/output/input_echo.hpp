#pragma once

#include <nlohmann/json_fwd.hpp>
#include <vector>

#include "cli/input/input_values.hpp"

namespace ringward::cli {

/// Every input key, as `--set` spells it, with the value used; null where there is none.
[[nodiscard]] nlohmann::ordered_json input_echo(const std::vector<EchoEntry>& echo);

}  // namespace ringward::cli
