#include <catch2/catch.hpp>
#include <filesystem>
#include <fstream>
#include <iterator>
#include <sstream>

#include "cli/commands/explain.hpp"
#include "cli/commands/new_file.hpp"
#include "cli/input/reader.hpp"
#include "cli/input/schema.hpp"
#include "tests/cli/input/column_texts.hpp"

namespace ringward::cli::testing {
namespace {

/// Sets every commented key that shows its default and stands in a table that is set.
std::string with_defaults_set(const std::string& starter) {
  std::istringstream in(starter);
  std::string result;
  std::string table;
  bool table_is_set = true;
  for (std::string line; std::getline(in, line);) {
    const bool is_commented = line.size() > 1 && line[0] == '#' && line[1] != ' ';
    const std::string bare = is_commented ? line.substr(1) : line;
    if (!bare.empty() && bare[0] == '[') {
      table = bare.substr(0, bare.find(']') + 1);
      table = bare[1] == '[' ? bare.substr(2, bare.find(']') - 2) + "[]"
                             : bare.substr(1, bare.find(']') - 1);
      table_is_set = !is_commented;
    }
    const KeySpec* spec = find_key(table + "." + bare.substr(0, bare.find(' ')));
    const bool sets = is_commented && table_is_set && spec != nullptr && !spec->fallback.empty();
    result += (sets ? bare : line) + "\n";
  }
  return result;
}

}  // namespace

TEST_CASE("docs/input.md is what the schema generates") {
  std::ifstream file(std::string(RINGWARD_SOURCE_DIR) + "/docs/input.md");
  const std::string stored{std::istreambuf_iterator<char>(file), std::istreambuf_iterator<char>()};
  // Where it is stale: ringward explain --markdown > docs/input.md
  CHECK(stored == input_reference_markdown());
}

TEST_CASE("The reference names every key of the schema") {
  const std::string reference = input_reference_markdown();
  const std::string list = explain_text(std::nullopt);
  for (const KeySpec& spec : input_schema()) {
    CAPTURE(spec.key);
    const bool is_group = spec.type == KeyType::table_list;
    const std::string name = is_group          ? "[[" + spec.key.substr(0, spec.key.size() - 2)
                             : spec.is_table() ? "[" + spec.key + "]"
                                               : leaf_of(spec.key);
    CHECK(reference.find(name) != std::string::npos);
    CHECK(list.find(name) != std::string::npos);
  }
}

TEST_CASE("explain tells meaning, unit, range, default, choices and source of a key") {
  CHECK(explain_text("tube.end_gap_mm") ==
        "tube.end_gap_mm\n"
        "  Clear gap at each end of a confining tube; decides when the heated tube bears.\n"
        "\n"
        "  type     a number\n"
        "  unit     mm\n"
        "  range    0 to 500 mm\n"
        "  default  10\n"
        "  source   common practice, no source\n");
  CHECK(explain_text("bars[0].axis_mm") == explain_text("bars.axis_mm"));
  CHECK(explain_text("section.shape").find("\"circular\", \"square\", \"rectangular\"") !=
        std::string::npos);
  CHECK(explain_text("protection").find("specific_heat_J_kgK") != std::string::npos);
  CHECK_THROWS_WITH(explain_text("tube.thicknes_mm"),
                    "tube.thicknes_mm: unknown key; did you mean tube.thickness_mm?");
  CHECK_THROWS_WITH(explain_text("qqqqqqqqqqqq"),
                    "qqqqqqqqqqqq: unknown key; `ringward explain` lists all keys");
}

TEST_CASE("A starter file of every shape reads without error, also with its defaults set") {
  for (const std::string& shape : find_key("section.shape")->choices) {
    CAPTURE(shape);
    const std::string starter = new_file_text(shape);
    CHECK(refusal(starter).empty());
    const std::string complete = with_defaults_set(starter);
    CHECK(complete != starter);
    CHECK(refusal(complete).empty());
    const ColumnInput input = read_column({"new.toml", starter, "."});
    CHECK(input.column.section.bars.size() == 1);
    CHECK(input.column.section.tube);
    CHECK(input.required_s == 3600.0);
    CHECK(input.title.find("(invented example)") != std::string::npos);
  }
  CHECK_THROWS_WITH(new_file_text("round"),
                    "--shape: \"round\" is none of \"circular\", \"square\", \"rectangular\"; use "
                    "one of these");
}

TEST_CASE("A starter file shows every key that belongs to its shape") {
  const std::string starter = "\n" + new_file_text("circular");
  for (const KeySpec& spec : input_schema()) {
    const bool is_other_shape =
        spec.only_if.key == "section.shape" && spec.only_if.value != "circular";
    if (spec.is_table() || is_other_shape) continue;
    CAPTURE(spec.key);
    const std::string assignment = leaf_of(spec.key) + " = ";
    const bool is_shown = starter.find("\n" + assignment) != std::string::npos ||
                          starter.find("\n#" + assignment) != std::string::npos;
    CHECK(is_shown);
  }
}

TEST_CASE("Every example column reads without error and says that it is invented") {
  const std::filesystem::path folder = std::string(RINGWARD_SOURCE_DIR) + "/docs/examples";
  int columns = 0;
  for (const std::string name : {"atrium-column", "square-composite", "rectangular-three-sides",
                                 "protected-column", "embedded-shape"}) {
    CAPTURE(name);
    const ColumnInput input = read_column_file((folder / (name + ".toml")).string());
    CHECK(input.title.find("(invented example)") != std::string::npos);
    CHECK(input.required_s);
    ++columns;
  }
  CHECK(columns == 5);
}

}  // namespace ringward::cli::testing
