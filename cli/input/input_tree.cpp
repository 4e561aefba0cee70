#include "cli/input/input_tree.hpp"

#include <fmt/format.h>

#include <algorithm>

namespace ringward::cli {

const InputEntry* InputNode::find(const std::string& key) const {
  const auto found = std::find_if(entries.begin(), entries.end(),
                                  [&](const InputEntry& entry) { return entry.key == key; });
  return found == entries.end() ? nullptr : &*found;
}

InputEntry* InputNode::find(const std::string& key) {
  const auto found = std::find_if(entries.begin(), entries.end(),
                                  [&](const InputEntry& entry) { return entry.key == key; });
  return found == entries.end() ? nullptr : &*found;
}

std::string describe(const InputNode& node) {
  switch (node.kind) {
    case NodeKind::table:
      return "a table";
    case NodeKind::list:
      return fmt::format("a list of {}", node.items.size());
    case NodeKind::number:
      return fmt::format("the number {}", node.number);
    case NodeKind::text:
      return fmt::format("the text \"{}\"", node.text);
    case NodeKind::boolean:
      return node.boolean ? "the truth value true" : "the truth value false";
    case NodeKind::date:
      return fmt::format("the date or time {}", node.text);
  }
  return "something else";
}

std::string describe(const Location& location, const std::string& file_name) {
  if (!location.override_key.empty()) return "--set " + location.override_key;
  return fmt::format("{}:{}:{}", file_name, location.line, location.column);
}

}  // namespace ringward::cli
