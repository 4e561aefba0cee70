#pragma once

#include <string>
#include <vector>

#include "cli/input/input_tree.hpp"
#include "cli/input/problems.hpp"

namespace ringward::cli {

/// Puts `KEY=VALUE` overrides into the tree, in order. KEY is a path such as `bars[0].axis_mm`,
/// VALUE has the syntax of a TOML value; nodes that were set report `--set KEY` as their place.
/// Mistakes in an override go to `problems`; the tree is left unchanged by that override.
void apply_overrides(InputNode& root, const std::vector<std::string>& overrides,
                     Problems& problems);

}  // namespace ringward::cli
