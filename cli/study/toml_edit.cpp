#include "cli/study/toml_edit.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <nlohmann/json.hpp>

#include "cli/input/reader.hpp"
#include "cli/input/schema.hpp"
#include "cli/output/input_echo.hpp"
#include "cli/output/numbers.hpp"
#include "thermal/base/error.hpp"

namespace ringward::cli {
namespace {

/// The node at `tube.thickness_mm` or `bars[0].axis_mm`; none when it is not written.
const InputNode* node_at(const InputNode& root, const std::string& key) {
  const InputNode* node = &root;
  std::size_t at = 0;
  while (node != nullptr && at < key.size()) {
    const std::size_t end = std::min(key.find_first_of(".[", at), key.size());
    const InputEntry* entry = node->find(key.substr(at, end - at));
    if (entry == nullptr) return nullptr;
    node = &entry->value;
    at = end;
    if (at < key.size() && key[at] == '[') {
      const std::size_t index = std::stoul(key.substr(at + 1));
      if (index >= node->items.size()) return nullptr;
      node = &node->items[index];
      at = key.find(']', at) + 1;
    }
    if (at < key.size()) ++at;  // the dot
  }
  return node;
}

/// Columns of TOML count characters, of which the text before a number may have longer ones.
std::size_t offset_of(const std::string& text, const Location& location) {
  std::size_t at = 0;
  for (std::size_t line = 1; line < location.line; ++line) at = text.find('\n', at) + 1;
  for (std::size_t column = 1; column < location.column && at < text.size(); ++column) {
    ++at;
    while (at < text.size() && (static_cast<unsigned char>(text[at]) & 0xC0) == 0x80) ++at;
  }
  return at;
}

std::string replaced(const std::string& text, const InputNode& node, double value) {
  const std::size_t begin = offset_of(text, node.location);
  const std::size_t end = text.find_first_not_of("+-0123456789._eE", begin);
  return text.substr(0, begin) + shortest(value) +
         (end == std::string::npos ? "" : text.substr(end));
}

std::string added(const std::string& text, const InputNode& root, const std::string& key,
                  double value) {
  const std::string line = leaf_of(key) + " = " + shortest(value) + "\n";
  const InputNode* table = node_at(root, table_of(key));
  if (table == nullptr) {
    const std::string end = text.empty() || text.back() == '\n' ? "" : "\n";
    return text + end + "\n[" + table_of(key) + "]\n" + line;
  }
  const std::size_t heading = offset_of(text, table->location);
  const std::size_t below = text.find('\n', heading);
  if (below == std::string::npos) return text + "\n" + line;
  return text.substr(0, below + 1) + line + text.substr(below + 1);
}

}  // namespace

std::string with_numbers(const std::string& text, const std::map<std::string, double>& numbers) {
  std::string edited = text;
  for (const auto& [key, value] : numbers) {
    const InputNode root = parse_toml(edited, "column");
    const InputNode* node = node_at(root, key);
    edited = node == nullptr ? added(edited, root, key, value) : replaced(edited, *node, value);
  }
  return edited;
}

std::optional<double> number_in(const InputNode& root, const std::string& key) {
  const InputNode* node = node_at(root, key);
  if (node == nullptr || node->kind != NodeKind::number) return std::nullopt;
  return node->number;
}

bool same_values(const ColumnInput& wanted, const InputSource& text) {
  try {
    return input_echo(read_column(text).echo) == input_echo(wanted.echo);
  } catch (const Error&) {
    return false;
  }
}

}  // namespace ringward::cli
