#pragma once

#include <filesystem>
#include <string>

#include "cli/input/input_tree.hpp"

namespace ringward::cli {

/// The text of a column file and the name under which errors report it.
struct InputSource {
  std::string name;  ///< the path as given, or "stdin"
  std::string text;
  std::filesystem::path folder;  ///< relative paths in the file start here
};

/// Reads a whole file, or standard input for "-".
/// @throws Error(bad_input) when it cannot be read
[[nodiscard]] InputSource load_source(const std::string& path);

/// Parses TOML into a tree with the position of every key and value.
/// @throws Error(bad_input) with `name:line:column` at a syntax error
[[nodiscard]] InputNode parse_toml(const std::string& text, const std::string& name);

}  // namespace ringward::cli
