#pragma once

#include <limits>
#include <string>
#include <vector>

namespace ringward::cli {

// The one table of input keys. The reader's checks, the suggestions for misspelt keys, `explain`,
// `new` and docs/input.md all come from it.

enum class KeyType {
  table,                ///< [name]
  table_list,           ///< [[name]]
  text,                 ///< free text
  choice,               ///< one of `choices`
  number,               ///<
  integer,              ///< a whole number
  number_pair,          ///< [a, b]
  pair_list,            ///< [[a, b], ...]
  number_or_pair_list,  ///< a number, or [[T_C, value], ...] with T_C increasing
  choice_list,          ///< a list of `choices`
  choice_or_list,       ///< the default word, or a list of `choices`
  ranges_by_key         ///< a table "input.key" = [low, high]
};

enum class Need {
  required,  ///< where its condition (if any) holds
  optional,  ///< may be left out; a table left out means that the column has no such part
  defaulted  ///< a table whose defaults apply when it is left out
};

struct Range {
  double low = -std::numeric_limits<double>::infinity();
  double high = std::numeric_limits<double>::infinity();
  bool low_is_open = false;

  [[nodiscard]] bool contains(double value) const {
    return (low_is_open ? value > low : value >= low) && value <= high;
  }
};
[[nodiscard]] constexpr Range closed(double low, double high) { return {low, high, false}; }
[[nodiscard]] constexpr Range above(double low, double high) { return {low, high, true}; }

/// The key belongs only where another key has this value.
struct Condition {
  std::string key = {};
  std::string value = {};
};

struct KeySpec {
  std::string key = {};  ///< dotted, groups as `bars[]`
  KeyType type = KeyType::number;
  Need need = Need::optional;
  std::string unit = {};
  Range range = {};           ///< of numbers; of the second number in lists of pairs
  std::string fallback = {};  ///< default, as a TOML value
  std::string computed = {};  ///< default in words, where it follows from other keys
  std::vector<std::string> choices = {};
  Condition only_if = {};
  std::string example = {};  ///< a TOML value for the starter file
  std::string help = {};     ///< one sentence
  std::string source = {};   ///< key in docs/sources.toml with its locator; may be empty
  std::string advice = {};   ///< the way out when a value is refused

  [[nodiscard]] bool is_table() const {
    return type == KeyType::table || type == KeyType::table_list || type == KeyType::ranges_by_key;
  }
};

[[nodiscard]] const std::vector<KeySpec>& input_schema();

/// @param schema_key dotted, groups as `bars[]`
[[nodiscard]] const KeySpec* find_key(const std::string& schema_key);

/// `bars[0].axis_mm` and `bars.axis_mm` as the schema spells it: `bars[].axis_mm`.
[[nodiscard]] std::string schema_spelling(const std::string& key);

/// `bars[].axis_mm` -> `bars[]`; empty for a key of the top level.
[[nodiscard]] std::string table_of(const std::string& key);
/// `bars[].axis_mm` -> `axis_mm`.
[[nodiscard]] std::string leaf_of(const std::string& key);

/// Keys directly inside a table (schema spelling; empty for the top level), in schema order.
[[nodiscard]] std::vector<const KeySpec*> keys_in(const std::string& table);

/// `50 mm to 10000 mm`, `above 0 kN, at most 1000000 kN`; empty when there is no limit.
[[nodiscard]] std::string range_text(const KeySpec& spec);

/// `required`, the default as a TOML value, or the default in words.
[[nodiscard]] std::string default_text(const KeySpec& spec);

/// The type in words, e.g. `a whole number`.
[[nodiscard]] std::string type_text(const KeySpec& spec);

/// `"a", "b"`.
[[nodiscard]] std::string quoted_list(const std::vector<std::string>& words);

}  // namespace ringward::cli
