#pragma once

#include <cstddef>
#include <string>
#include <vector>

namespace ringward::cli {

/// Where a value was written: a line and column of the file, or a `--set` on the command line.
struct Location {
  std::size_t line = 1;
  std::size_t column = 1;
  std::string override_key;       ///< not empty: set by `--set KEY=...`
  std::size_t override_rank = 0;  ///< order among the overrides
};

enum class NodeKind { table, list, number, text, boolean, date };

struct InputEntry;

/// One value of an input file with its position, free of the TOML library's types.
struct InputNode {
  NodeKind kind = NodeKind::table;
  Location location;
  double number = 0;
  bool boolean = false;
  std::string text;                 ///< text, or a date as it was written
  std::vector<InputNode> items;     ///< of a list
  std::vector<InputEntry> entries;  ///< of a table, in the order of the file

  [[nodiscard]] const InputEntry* find(const std::string& key) const;
  [[nodiscard]] InputEntry* find(const std::string& key);
};

struct InputEntry {
  std::string key;
  Location key_location;
  InputNode value;
};

/// The node in words for an error message, e.g. `the text "five"`.
[[nodiscard]] std::string describe(const InputNode& node);

/// `name:line:column`, or `--set KEY`.
[[nodiscard]] std::string describe(const Location& location, const std::string& file_name);

}  // namespace ringward::cli
