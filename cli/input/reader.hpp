#pragma once

#include <string>
#include <vector>

#include "cli/input/column_input.hpp"
#include "cli/input/toml_reading.hpp"

namespace ringward::cli {

/// Reads and checks a column.
/// @param overrides `KEY=VALUE` in order, VALUE in TOML syntax
/// @throws Error(bad_input) with one line for everything that is wrong, each as
///   `file:line:column: key: what is wrong, the limit, what to do`, sorted by position
[[nodiscard]] ColumnInput read_column(const InputSource& source,
                                      const std::vector<std::string>& overrides = {});

/// The same for a path, or "-" for standard input.
[[nodiscard]] ColumnInput read_column_file(const std::string& path,
                                           const std::vector<std::string>& overrides = {});

}  // namespace ringward::cli
