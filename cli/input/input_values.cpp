#include "cli/input/input_values.hpp"

#include <fmt/format.h>

#include <limits>

#include "cli/input/key_suggestion.hpp"

namespace ringward::cli {
namespace {

std::string joined(const std::string& table, const std::string& leaf) {
  return table.empty() ? leaf : table + "." + leaf;
}

std::string file_leaf(const KeySpec& spec) {
  std::string leaf = leaf_of(spec.key);
  if (spec.type == KeyType::table_list) leaf.resize(leaf.size() - 2);
  return leaf;
}

const KeySpec* find_in(const std::string& schema_table, const std::string& leaf) {
  const std::string key = joined(schema_table, leaf);
  const KeySpec* spec = find_key(key);
  return spec != nullptr ? spec : find_key(key + "[]");
}

std::string how_to_add(const KeySpec& spec, const std::string& table) {
  const std::string value = spec.example.empty() ? spec.fallback : spec.example;
  const std::string unit = spec.unit.empty() ? "" : " (" + spec.unit + ")";
  if (spec.is_table()) {
    std::string keys;
    for (const KeySpec* inside : keys_in(spec.key)) {
      if (inside->need != Need::required || !inside->only_if.key.empty()) continue;
      keys += (keys.empty() ? "" : ", ") + leaf_of(inside->key);
    }
    return fmt::format("add the table [{}] with {}", spec.key, keys);
  }
  return fmt::format("add e.g. {} = {}{} to [{}]", leaf_of(spec.key), value, unit, table);
}

}  // namespace

InputValues::InputValues(const InputNode& root, Problems& problems) {
  read_table(root, "", "", problems);
  check_conditions(problems);
}

void InputValues::report_missing(const KeySpec& spec, const std::string& table,
                                 Problems& problems) const {
  const std::string key = joined(table, file_leaf(spec));
  if (misspelt_.count(key) > 0) return;
  problems.add(location(table), key, "missing; " + how_to_add(spec, table));
}

void InputValues::add(Entry entry) {
  index_[entry.key] = entries_.size();
  entries_.push_back(std::move(entry));
}

void InputValues::read_table(const InputNode& node, const std::string& schema_table,
                             const std::string& table, Problems& problems) {
  tables_[table] = node.location;
  report_unknown(node, schema_table, table, problems);
  for (const KeySpec* spec : keys_in(schema_table)) {
    if (spec->is_table()) {
      read_subtable(*spec, node, table, problems);
      continue;
    }
    const std::string key = joined(table, leaf_of(spec->key));
    const InputEntry* entry = node.find(leaf_of(spec->key));
    if (entry != nullptr) {
      add({spec, key, check_value(*spec, key, entry->value, problems), entry->value.location,
           true});
      continue;
    }
    const bool always = spec->need == Need::required && spec->only_if.key.empty();
    if (always) report_missing(*spec, table, problems);
    add({spec, key, default_value(*spec), node.location, false});
  }
}

void InputValues::read_subtable(const KeySpec& spec, const InputNode& parent,
                                const std::string& table, Problems& problems) {
  const std::string leaf = file_leaf(spec);
  const std::string key = joined(table, leaf);
  const InputEntry* entry = parent.find(leaf);
  if (entry == nullptr) {
    if (spec.need == Need::defaulted) {
      InputNode empty;
      empty.location = parent.location;
      read_table(empty, spec.key, key, problems);
    } else if (spec.need == Need::required && spec.only_if.key.empty()) {
      report_missing(spec, table, problems);
    }
    return;
  }
  if (spec.type == KeyType::table_list) return read_groups(spec, *entry, problems);
  if (entry->value.kind != NodeKind::table) {
    problems.add(entry->value.location, key,
                 fmt::format("expected a table, found {}; write [{}] on a line of its own",
                             describe(entry->value), key));
    return;
  }
  if (spec.type == KeyType::ranges_by_key) return read_sensitivity(*entry, problems);
  read_table(entry->value, spec.key, key, problems);
}

void InputValues::read_groups(const KeySpec& spec, const InputEntry& entry, Problems& problems) {
  if (entry.value.kind != NodeKind::list) {
    problems.add(entry.value.location, entry.key,
                 fmt::format("expected groups, found {}; write [[{}]] with two brackets",
                             describe(entry.value), entry.key));
    return;
  }
  groups_[entry.key] = entry.value.items.size();
  for (std::size_t i = 0; i < entry.value.items.size(); ++i) {
    const InputNode& group = entry.value.items[i];
    const std::string key = fmt::format("{}[{}]", entry.key, i);
    if (group.kind == NodeKind::table) {
      read_table(group, spec.key, key, problems);
    } else {
      problems.add(group.location, key,
                   fmt::format("expected a table, found {}; write [[{}]] and its keys below",
                               describe(group), entry.key));
    }
  }
}

void InputValues::read_sensitivity(const InputEntry& entry, Problems& problems) {
  for (const InputEntry& range : entry.value.entries) read_range(range, problems);
}

void InputValues::read_range(const InputEntry& entry, Problems& problems) {
  const std::string key = "sensitivity.\"" + entry.key + "\"";
  const KeySpec* varied = find_key(schema_spelling(entry.key));
  if (varied == nullptr || varied->is_table()) {
    const auto meant = nearest_key(schema_spelling(entry.key));
    problems.add(
        entry.key_location, key,
        fmt::format("\"{}\" is no input key; {}", entry.key,
                    meant ? "did you mean \"" + *meant + "\"?" : find_key("sensitivity")->advice));
    return;
  }
  if (varied->type != KeyType::number && varied->type != KeyType::integer &&
      varied->type != KeyType::number_or_pair_list) {
    problems.add(entry.key_location, key,
                 fmt::format("\"{}\" is not a number, so it has no low and high value; leave it "
                             "out",
                             entry.key));
    return;
  }
  if (find(entry.key) == nullptr) {
    problems.add(entry.key_location, key,
                 fmt::format("\"{}\" names no value of this column; bars are numbered, as in "
                             "bars[0].axis_mm; correct it or leave it out",
                             entry.key));
    return;
  }
  KeySpec range = *varied;
  range.type = KeyType::number_pair;
  range.example = "[low, high]";
  const InputValue value = check_value(range, key, entry.value, problems);
  const auto* pair = std::get_if<NumberPair>(&value);
  if (pair == nullptr) return;
  if ((*pair)[0] >= (*pair)[1]) {
    problems.add(entry.value.location, key,
                 fmt::format("the low value {} is not below the high value {}; write [low, high]",
                             (*pair)[0], (*pair)[1]));
    return;
  }
  sensitivity_.push_back({entry.key, (*pair)[0], (*pair)[1]});
}

void InputValues::report_unknown(const InputNode& node, const std::string& schema_table,
                                 const std::string& table, Problems& problems) {
  for (const InputEntry& entry : node.entries) {
    if (find_in(schema_table, entry.key) != nullptr) continue;
    const auto meant = nearest_key(joined(schema_table, entry.key));
    std::string way_out = "remove it, or see `ringward explain`";
    if (meant) {
      way_out = fmt::format("did you mean {}?", *meant);
      misspelt_.insert(joined(table, leaf_of(*meant)));
    }
    problems.add(entry.key_location, joined(table, entry.key), "unknown key; " + way_out);
  }
}

void InputValues::check_conditions(Problems& problems) const {
  for (const KeySpec& spec : input_schema()) {
    const Condition& condition = spec.only_if;
    if (condition.key.empty() || !has_table(table_of(spec.key))) continue;
    const std::string actual = text(condition.key);
    if (actual.empty()) continue;
    const bool holds = actual == condition.value;
    const bool is_given = spec.is_table() ? has_table(spec.key) : given(spec.key);
    if (is_given && !holds) {
      problems.add(
          location(spec.key), spec.key,
          fmt::format("belongs to {} = \"{}\", but {} is \"{}\"; remove it or change {}",
                      condition.key, condition.value, condition.key, actual, condition.key));
    } else if (!is_given && holds && spec.need == Need::required) {
      report_missing(spec, table_of(spec.key), problems);
    }
  }
}

const InputValues::Entry* InputValues::find(const std::string& key) const {
  const auto found = index_.find(key);
  return found == index_.end() ? nullptr : &entries_[found->second];
}

const InputValue& InputValues::value(const std::string& key) const {
  static const InputValue none;
  const Entry* entry = find(key);
  return entry == nullptr ? none : entry->value;
}

double InputValues::number(const std::string& key) const {
  const auto* number = std::get_if<double>(&value(key));
  return number == nullptr ? std::numeric_limits<double>::quiet_NaN() : *number;
}

std::string InputValues::text(const std::string& key) const {
  const auto* text = std::get_if<std::string>(&value(key));
  return text == nullptr ? std::string() : *text;
}

bool InputValues::has_table(const std::string& table) const { return tables_.count(table) > 0; }

std::size_t InputValues::group_count(const std::string& table) const {
  const auto found = groups_.find(table);
  return found == groups_.end() ? 0 : found->second;
}

bool InputValues::given(const std::string& key) const {
  const Entry* entry = find(key);
  return entry != nullptr && entry->given;
}

Location InputValues::location(const std::string& key) const {
  if (const Entry* entry = find(key)) return entry->location;
  const auto table = tables_.find(key);
  return table == tables_.end() ? Location{} : table->second;
}

void InputValues::set_computed(const std::string& key, InputValue value) {
  const auto found = index_.find(key);
  if (found != index_.end()) entries_[found->second].value = std::move(value);
}

std::vector<EchoEntry> InputValues::echo() const {
  std::vector<EchoEntry> echo;
  for (const Entry& entry : entries_) {
    if (std::holds_alternative<std::monostate>(entry.value)) continue;
    echo.push_back({entry.key, entry.value, entry.given});
  }
  return echo;
}

}  // namespace ringward::cli
