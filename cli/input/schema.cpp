#include "cli/input/schema.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <cmath>

#include "cli/input/schema_tables.hpp"

namespace ringward::cli {
namespace {

std::vector<KeySpec> join_tables() {
  std::vector<KeySpec> all;
  for (const auto& part :
       {section_keys(), reinforcement_keys(), member_keys(), fire_keys(), record_keys()}) {
    all.insert(all.end(), part.begin(), part.end());
  }
  return all;
}

std::string with_unit(double value, const std::string& unit) {
  return unit.empty() ? fmt::format("{}", value) : fmt::format("{} {}", value, unit);
}

}  // namespace

const std::vector<KeySpec>& input_schema() {
  static const std::vector<KeySpec> schema = join_tables();
  return schema;
}

const KeySpec* find_key(const std::string& schema_key) {
  const auto& schema = input_schema();
  const auto found = std::find_if(schema.begin(), schema.end(),
                                  [&](const KeySpec& spec) { return spec.key == schema_key; });
  return found == schema.end() ? nullptr : &*found;
}

std::string schema_spelling(const std::string& key) {
  std::string spelt;
  for (std::size_t i = 0; i < key.size(); ++i) {
    spelt += key[i];
    if (key[i] == '[') {
      while (i + 1 < key.size() && key[i + 1] >= '0' && key[i + 1] <= '9') ++i;
    }
  }
  if (find_key(spelt) != nullptr) return spelt;
  const std::string table = spelt.substr(0, spelt.find('.'));
  const std::string group = table + "[]";
  if (find_key(group) == nullptr) return spelt;
  return group + spelt.substr(table.size());
}

std::string table_of(const std::string& key) {
  const auto dot = key.rfind('.');
  return dot == std::string::npos ? std::string() : key.substr(0, dot);
}

std::string leaf_of(const std::string& key) {
  const auto dot = key.rfind('.');
  return dot == std::string::npos ? key : key.substr(dot + 1);
}

std::vector<const KeySpec*> keys_in(const std::string& table) {
  std::vector<const KeySpec*> inside;
  for (const KeySpec& spec : input_schema()) {
    if (table_of(spec.key) == table) inside.push_back(&spec);
  }
  return inside;
}

std::string range_text(const KeySpec& spec) {
  const Range& range = spec.range;
  const bool has_low = std::isfinite(range.low);
  const bool has_high = std::isfinite(range.high);
  if (!has_low && !has_high) return {};
  if (!has_high) {
    return (range.low_is_open ? "above " : "at least ") + with_unit(range.low, spec.unit);
  }
  if (!has_low) return "at most " + with_unit(range.high, spec.unit);
  if (range.low_is_open) {
    return fmt::format("above {}, at most {}", range.low, with_unit(range.high, spec.unit));
  }
  return fmt::format("{} to {}", range.low, with_unit(range.high, spec.unit));
}

std::string default_text(const KeySpec& spec) {
  if (spec.need == Need::required) {
    const Condition& condition = spec.only_if;
    if (condition.key.empty()) return "required";
    return fmt::format("required for {} = \"{}\"", leaf_of(condition.key), condition.value);
  }
  if (!spec.fallback.empty()) return spec.fallback;
  return spec.computed.empty() ? "none" : spec.computed;
}

std::string quoted_list(const std::vector<std::string>& words) {
  std::string list;
  for (const std::string& word : words) {
    list += (list.empty() ? "\"" : ", \"") + word + "\"";
  }
  return list;
}

std::string type_text(const KeySpec& spec) {
  switch (spec.type) {
    case KeyType::text:
      return "text in quotes";
    case KeyType::choice:
      return "one of " + quoted_list(spec.choices);
    case KeyType::number:
      return "a number";
    case KeyType::integer:
      return "a whole number";
    case KeyType::number_pair:
      return "two numbers, [a, b]";
    case KeyType::pair_list:
      return "a list of pairs, [[a, b], ...]";
    case KeyType::number_or_pair_list:
      return "a number or a list of pairs, [[T_C, value], ...]";
    case KeyType::choice_list:
      return "a list of " + quoted_list(spec.choices);
    case KeyType::choice_or_list:
      return spec.fallback + " or a list of " + quoted_list(spec.choices);
    default:
      return "a table";
  }
}

}  // namespace ringward::cli
