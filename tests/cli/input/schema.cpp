#include "cli/input/schema.hpp"

#include <catch2/catch.hpp>
#include <fstream>
#include <iterator>
#include <set>

#include "cli/input/input_value.hpp"
#include "cli/input/key_suggestion.hpp"
#include "cli/input/toml_reading.hpp"

namespace ringward::cli::testing {
namespace {

std::string file_text(const std::string& path) {
  std::ifstream file(std::string(RINGWARD_SOURCE_DIR) + "/" + path);
  return {std::istreambuf_iterator<char>(file), std::istreambuf_iterator<char>()};
}

}  // namespace

TEST_CASE("Every input key stands once in the schema, in a table that exists, with its help") {
  std::set<std::string> seen;
  for (const KeySpec& spec : input_schema()) {
    CAPTURE(spec.key);
    CHECK(seen.insert(spec.key).second);
    const std::string table = table_of(spec.key);
    CHECK((table.empty() || find_key(table) != nullptr));
    CHECK_FALSE(spec.help.empty());
    CHECK((spec.only_if.key.empty() || find_key(spec.only_if.key) != nullptr));
    CHECK((spec.type != KeyType::choice || !spec.choices.empty()));
  }
}

TEST_CASE("A number with a limit carries an advice, and its key ends in its unit") {
  for (const KeySpec& spec : input_schema()) {
    const bool is_number = spec.type == KeyType::number || spec.type == KeyType::integer;
    if (!is_number) continue;
    CAPTURE(spec.key);
    CHECK_FALSE(range_text(spec).empty());
    CHECK_FALSE(spec.advice.empty());
    const std::string leaf = leaf_of(spec.key);
    for (const std::string unit : {"mm", "MPa", "kN", "kNm", "min", "deg"}) {
      const std::string ending = "_" + unit;
      const bool ends = leaf.size() > ending.size() &&
                        leaf.compare(leaf.size() - ending.size(), ending.size(), ending) == 0;
      if (ends) CHECK(spec.unit == unit);
    }
  }
}

TEST_CASE("Every default and every example of the schema passes its own check") {
  for (const KeySpec& spec : input_schema()) {
    if (spec.is_table()) continue;
    for (const std::string& text : {spec.fallback, spec.example}) {
      if (text.empty()) continue;
      CAPTURE(spec.key, text);
      Problems problems("schema");
      const InputNode root = parse_toml("value = " + text, "schema");
      const InputValue value = check_value(spec, spec.key, root.entries.front().value, problems);
      CHECK(problems.empty());
      CHECK_FALSE(std::holds_alternative<std::monostate>(value));
    }
    if (!spec.fallback.empty()) {
      CHECK_FALSE(std::holds_alternative<std::monostate>(default_value(spec)));
    }
  }
}

TEST_CASE("Every source named by the schema stands in docs/sources.toml") {
  const InputNode sources = parse_toml(file_text("docs/sources.toml"), "sources.toml");
  REQUIRE(sources.entries.size() > 5);
  for (const KeySpec& spec : input_schema()) {
    if (spec.source.empty() || spec.source == "common practice, no source") continue;
    CAPTURE(spec.key, spec.source);
    CHECK(sources.find(spec.source.substr(0, spec.source.find(' '))) != nullptr);
  }
}

// Values by hand.
TEST_CASE("The edit distance counts insertions, deletions, replacements and swapped neighbours") {
  CHECK(edit_distance("", "abc") == 3);
  CHECK(edit_distance("axis_mm", "axis_mm") == 0);
  CHECK(edit_distance("axis_m", "axis_mm") == 1);
  CHECK(edit_distance("axsi_mm", "axis_mm") == 1);
  CHECK(edit_distance("kitten", "sitting") == 3);
  CHECK(edit_distance("abc", "") == 3);
}

TEST_CASE("The nearest key is looked for in its table, then by its name, then anywhere") {
  CHECK(nearest_key("tube.yeild_MPa") == "tube.yield_MPa");
  CHECK(nearest_key("core.friction") == "tube.friction");
  CHECK(nearest_key("bars[].axis") == "bars[].axis_mm");
  CHECK(nearest_key("setcion.shape") == "section.shape");
  CHECK_FALSE(nearest_key("qqqqqqqqqqqq"));
}

TEST_CASE("Keys of groups are found with a number, with brackets and without") {
  for (const std::string key :
       {"bars[0].axis_mm", "bars[12].axis_mm", "bars[].axis_mm", "bars.axis_mm"}) {
    CHECK(schema_spelling(key) == "bars[].axis_mm");
  }
  CHECK(schema_spelling("bars") == "bars[]");
  CHECK(schema_spelling("tube.friction") == "tube.friction");
}

}  // namespace ringward::cli::testing
