#include "cli/study/toml_text.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <cctype>
#include <functional>

namespace ringward::cli {
namespace {

std::string quoted(const std::string& text) {
  std::string result = "\"";
  for (const char c : text) {
    const auto code = static_cast<unsigned char>(c);
    if (c == '"' || c == '\\') {
      result += '\\';
      result += c;
    } else if (code < 0x20 || code == 0x7f) {
      result += fmt::format("\\u{:04x}", static_cast<unsigned>(code));
    } else {
      result += c;
    }
  }
  return result + "\"";
}

/// `open` item, item `close`
template <class Item>
std::string enclosed(const char* open, const std::vector<Item>& items, const char* close,
                     const std::function<std::string(const Item&)>& text) {
  std::string result = open;
  for (std::size_t i = 0; i < items.size(); ++i) result += (i > 0 ? ", " : "") + text(items[i]);
  return result + close;
}

std::string assignment(const InputEntry& entry) {
  return toml_key(entry.key) + " = " + toml_value(entry.value);
}

bool is_group_list(const InputNode& node) {
  return node.kind == NodeKind::list && !node.items.empty() &&
         std::all_of(node.items.begin(), node.items.end(),
                     [](const InputNode& item) { return item.kind == NodeKind::table; });
}

bool has_heading(const InputNode& node) {
  return node.kind == NodeKind::table || is_group_list(node);
}

std::string lines_of(const InputNode& table) {
  std::string text;
  for (const InputEntry& entry : table.entries) text += assignment(entry) + "\n";
  return text;
}

}  // namespace

std::string toml_key(const std::string& key) {
  const bool is_bare = !key.empty() && std::all_of(key.begin(), key.end(), [](char c) {
    return std::isalnum(static_cast<unsigned char>(c)) != 0 || c == '_' || c == '-';
  });
  return is_bare ? key : quoted(key);
}

std::string toml_value(const InputNode& node) {
  switch (node.kind) {
    case NodeKind::number:
      return fmt::format("{}", node.number);
    case NodeKind::text:
      return quoted(node.text);
    case NodeKind::boolean:
      return node.boolean ? "true" : "false";
    case NodeKind::date:
      return node.text;
    case NodeKind::list:
      return enclosed<InputNode>("[", node.items, "]", toml_value);
    case NodeKind::table:
      return enclosed<InputEntry>("{ ", node.entries, " }", assignment);
  }
  return {};
}

std::string toml_document(const InputNode& root) {
  std::string text;
  for (const InputEntry& entry : root.entries) {
    if (!has_heading(entry.value)) text += assignment(entry) + "\n";
  }
  for (const InputEntry& entry : root.entries) {
    if (!has_heading(entry.value)) continue;
    const std::string key = toml_key(entry.key);
    if (entry.value.kind == NodeKind::table) {
      text += "\n[" + key + "]\n" + lines_of(entry.value);
      continue;
    }
    for (const InputNode& group : entry.value.items)
      text += "\n[[" + key + "]]\n" + lines_of(group);
  }
  return text;
}

}  // namespace ringward::cli
