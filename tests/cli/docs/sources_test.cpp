// The library is linked compiled, as the program does.
#define TOML_HEADER_ONLY 0
#define TOML_SHARED_LIB 1
#include <toml++/toml.h>

#include <catch2/catch.hpp>
#include <nlohmann/json.hpp>
#include <regex>
#include <set>
#include <sstream>

#include "cli/input/schema.hpp"
#include "fires/fire_curve.hpp"
#include "tests/cli/commands/run_process.hpp"
#include "tests/cli/docs/tree.hpp"

using namespace ringward::testing;

namespace {

const char* const kNoSource = "common practice, no source";

const toml::table& sources() {
  static const toml::table table =
      toml::parse_file((project_root() / "docs/sources.toml").string());
  return table;
}

bool known(const std::string& key) { return sources().contains(key); }

/// What stands after "@source", up to the first blank or punctuation.
std::vector<std::string> tagged_keys(const TextFile& file) {
  static const std::regex tag(R"(@source\s+(?:common practice, no source|([^\s,;:]*[^\s,;:.])))");
  std::vector<std::string> keys;
  for (std::sregex_iterator it(file.text.begin(), file.text.end(), tag), end; it != end; ++it) {
    if ((*it)[1].matched) keys.push_back((*it)[1]);
  }
  return keys;
}

/// The sources given to notices and input keys: `.source = "..."`.
std::vector<std::string> given_sources(const TextFile& file) {
  static const std::regex given(R"re(\.source\s*=\s*"([^"]*)")re");
  std::vector<std::string> result;
  for (std::sregex_iterator it(file.text.begin(), file.text.end(), given), end; it != end; ++it) {
    result.push_back((*it)[1]);
  }
  return result;
}

/// "key locator; key locator" or the words for no source, every key listed.
bool resolves(const std::string& source) {
  if (source == kNoSource) return true;
  std::istringstream parts(source);
  bool any = false;
  for (std::string part; std::getline(parts, part, ';'); any = true) {
    std::istringstream words(part);
    std::string key;
    words >> key;
    if (!known(key)) return false;
  }
  return any;
}

/// Words with the form of a key: a standard with its parts, or names with a year.
std::vector<std::string> words_like_keys(const TextFile& file) {
  static const std::regex word(
      R"(\b(?:(?:din-|ds-)?en1\d{3}-\d[a-z0-9-]*|(?!en1)[a-z]+(?:-[a-z]+)*(?:18|19|20)\d\d)\b)");
  std::vector<std::string> keys;
  for (std::sregex_iterator it(file.text.begin(), file.text.end(), word), end; it != end; ++it) {
    keys.push_back(it->str());
  }
  return keys;
}

std::vector<TextFile> files_that_cite() {
  std::vector<TextFile> files;
  for (TextFile& file : files_below({"thermal", "fires", "mechanical", "cli", "tests", "docs"},
                                    {".hpp", ".cpp", ".md", ".csv", ".toml"})) {
    const bool own = file.path.starts_with("tests/cli/docs/") || file.path == "docs/sources.toml";
    if (!own) files.push_back(std::move(file));
  }
  return files;
}

}  // namespace

TEST_CASE("Every source tag in the code names a source that is listed", "[docs]") {
  std::size_t tags = 0;
  for (const TextFile& file : files_that_cite()) {
    for (const std::string& key : tagged_keys(file)) {
      ++tags;
      INFO(file.path << " cites " << key);
      CHECK(known(key));
    }
  }
  CHECK(tags > 10);  // the scan sees the tree
}

TEST_CASE("Every source given to a notice resolves", "[docs]") {
  std::size_t given = 0;
  for (const TextFile& file : program_files()) {
    for (const std::string& source : given_sources(file)) {
      ++given;
      INFO(file.path << " gives " << source);
      CHECK(resolves(source));
    }
  }
  CHECK(given > 10);
}

TEST_CASE("Every source of an input key resolves", "[docs]") {
  for (const ringward::cli::KeySpec& key : ringward::cli::input_schema()) {
    INFO(key.key << " gives " << key.source);
    CHECK((key.source.empty() || resolves(key.source)));
  }
}

TEST_CASE("Every fire curve that needs no data gives a listed source", "[docs]") {
  for (const std::string& name : ringward::fires::nominal_curve_names()) {
    const std::string source = ringward::fires::nominal_curve(name)->source();
    INFO(name << " gives " << source);
    CHECK(resolves(source));
  }
}

TEST_CASE("Every notice that the example columns draw gives a listed source", "[docs]") {
  std::size_t notices = 0;
  for (const TextFile& example : files_below({"docs/examples"}, {".toml"})) {
    const ProcessResult run =
        run_ringward({"rate", (project_root() / example.path).string(), "--set",
                      "numerics.accuracy=\"coarse\"", "--json", "-"});
    INFO(example.path << ": " << run.err);
    REQUIRE(run.exit_code <= 1);
    const nlohmann::json result = nlohmann::json::parse(run.out);
    for (const auto& notice : result.at("notices")) {
      ++notices;
      const std::string source = notice.at("source");
      INFO(notice.at("code") << " gives " << source);
      CHECK(resolves(source));
    }
  }
  CHECK(notices > 10);
}

TEST_CASE("Every word with the form of a source key is a listed source", "[docs]") {
  for (const TextFile& file : files_that_cite()) {
    for (const std::string& key : words_like_keys(file)) {
      INFO(file.path << " names " << key);
      CHECK(known(key));
    }
  }
}

TEST_CASE("A misspelt source is found", "[docs]") {
  const TextFile file{"x.hpp",
                      "/// @source en1992-1-2-2005 3.3\n/// @source common practice, no "
                      "source\n\"teng2008 eq. 2\" concrete_en1992(x)"};
  CHECK(tagged_keys(file) == std::vector<std::string>{"en1992-1-2-2005"});
  CHECK(words_like_keys(file) == std::vector<std::string>{"en1992-1-2-2005", "teng2008"});
  CHECK_FALSE(resolves("en1992-1-2-2005 3.3"));
  CHECK_FALSE(resolves("teng2007; richart1929 eq. 1"));
  CHECK_FALSE(resolves(""));
  CHECK(resolves("teng2007; richart1928 eq. 1"));
  CHECK(resolves(kNoSource));
}

TEST_CASE("Every listed source says who wrote it, what it is and how it was read", "[docs]") {
  const std::set<std::string> ways = {"text", "memory", "abstract", "computed"};
  const std::set<std::string> fields = {"author", "year", "title",   "edition",   "read",
                                        "note",   "doi",  "licence", "background"};
  for (const auto& [key, node] : sources()) {
    INFO("source " << key.str());
    const toml::table* entry = node.as_table();
    REQUIRE(entry != nullptr);
    CHECK_FALSE((*entry)["author"].value_or(std::string()).empty());
    CHECK(((*entry)["title"].is_string() || (*entry)["note"].is_string()));
    CHECK(ways.count((*entry)["read"].value_or(std::string())) == 1);
    for (const auto& [field, value] : *entry) {
      INFO("field " << field.str());
      CHECK(fields.count(std::string(field.str())) == 1);
    }
  }
}

TEST_CASE("Every listed source is used by the program or its tests, or marked as background",
          "[docs]") {
  std::string everything;
  for (const TextFile& file : files_that_cite()) {
    if (!file.path.starts_with("docs/")) everything += file.text;
  }
  for (const auto& [key, node] : sources()) {
    INFO("source " << key.str());
    const bool background = (*node.as_table())["background"].value_or(false);
    CHECK((background || everything.find(key.str()) != std::string::npos));
  }
}
