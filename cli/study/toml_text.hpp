#pragma once

#include <string>

#include "cli/input/input_tree.hpp"

namespace ringward::cli {

/// A value as TOML text on one line: `50`, `"contact"`, `[[0, 120], [0, -120]]`, `{ a = 1 }`.
[[nodiscard]] std::string toml_value(const InputNode& node);

/// A key as TOML spells it, with quotes where it needs them.
[[nodiscard]] std::string toml_key(const std::string& key);

/// A whole file: top-level values, then a `[table]` for each table and `[[groups]]`.
[[nodiscard]] std::string toml_document(const InputNode& root);

}  // namespace ringward::cli
