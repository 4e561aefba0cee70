#pragma once

#include <nlohmann/json_fwd.hpp>
#include <string>

#include "cli/study/layout_row.hpp"

namespace ringward::cli {

/// "fails", "survives" or "no solution".
[[nodiscard]] std::string outcome_word(const LayoutRow& row);

/// One row with the keys of ringward-compare/1.
[[nodiscard]] nlohmann::ordered_json row_json(const LayoutRow& row);

}  // namespace ringward::cli
