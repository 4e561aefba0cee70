#pragma once

#include <map>
#include <set>
#include <string>
#include <vector>

#include "cli/input/input_value.hpp"

namespace ringward::cli {

/// One input key with the value used.
struct EchoEntry {
  std::string key;  ///< in file spelling, e.g. "bars[0].axis_mm"
  InputValue value;
  bool given = false;  ///< written in the input, not a default
};

/// "key" = [low, high] of the table `sensitivity`.
struct SensitivityRange {
  std::string key;
  double low = 0;
  double high = 0;
};

/// The checked values of an input, by key in file spelling and in schema order. A value that was
/// refused, or is missing, reads as NaN or empty text, so that later checks pass over it.
class InputValues {
 public:
  /// Walks the tree along the schema: unknown and missing keys, types, ranges, choices.
  InputValues(const InputNode& root, Problems& problems);

  [[nodiscard]] double number(const std::string& key) const;
  [[nodiscard]] std::string text(const std::string& key) const;
  [[nodiscard]] const InputValue& value(const std::string& key) const;
  [[nodiscard]] bool has_table(const std::string& table) const;
  [[nodiscard]] std::size_t group_count(const std::string& table) const;
  [[nodiscard]] bool given(const std::string& key) const;  ///< written, whether valid or not
  /// Of the value, or of the table where the key would stand.
  [[nodiscard]] Location location(const std::string& key) const;

  /// The value used where the default follows from other keys.
  void set_computed(const std::string& key, InputValue value);

  [[nodiscard]] std::vector<EchoEntry> echo() const;
  [[nodiscard]] const std::vector<SensitivityRange>& sensitivity() const { return sensitivity_; }

 private:
  struct Entry {
    const KeySpec* spec = nullptr;
    std::string key;
    InputValue value;
    Location location;
    bool given = false;
  };

  void read_table(const InputNode& node, const std::string& schema_table, const std::string& table,
                  Problems& problems);
  void read_subtable(const KeySpec& spec, const InputNode& parent, const std::string& table,
                     Problems& problems);
  void read_groups(const KeySpec& spec, const InputEntry& entry, Problems& problems);
  void read_sensitivity(const InputEntry& entry, Problems& problems);
  void read_range(const InputEntry& entry, Problems& problems);
  void report_unknown(const InputNode& node, const std::string& schema_table,
                      const std::string& table, Problems& problems);
  void report_missing(const KeySpec& spec, const std::string& table, Problems& problems) const;
  void check_conditions(Problems& problems) const;
  void add(Entry entry);
  [[nodiscard]] const Entry* find(const std::string& key) const;

  std::vector<Entry> entries_;
  std::map<std::string, std::size_t> index_;
  std::map<std::string, Location> tables_;
  std::map<std::string, std::size_t> groups_;
  std::set<std::string> misspelt_;  ///< keys that an unknown key was probably meant to be
  std::vector<SensitivityRange> sensitivity_;
};

}  // namespace ringward::cli
