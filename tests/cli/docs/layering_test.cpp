#include <catch2/catch.hpp>
#include <map>
#include <regex>

#include "tests/cli/docs/tree.hpp"

using namespace ringward::testing;

namespace {

/// The rooms that a file includes a header of.
std::vector<std::string> included_rooms(const TextFile& file) {
  static const std::regex include(R"re(^\s*#\s*include\s*[<"](\.\./)*(\w+)/)re");
  std::vector<std::string> rooms;
  for (const std::string& line : file.lines()) {
    std::smatch match;
    if (std::regex_search(line, match, include)) rooms.push_back(match[2]);
  }
  return rooms;
}

std::string room_of(const TextFile& file) { return file.path.substr(0, file.path.find('/')); }

}  // namespace

// The one-way rule of DEVELOPERS.md: data flow from heat to strength to the command line.
TEST_CASE("No room includes a header of a room that it must not know", "[docs]") {
  const std::map<std::string, std::vector<std::string>> forbidden = {
      {"thermal", {"fires", "mechanical", "cli", "tests"}},
      {"fires", {"mechanical", "cli", "tests"}},
      {"mechanical", {"fires", "cli", "tests"}},
      {"cli", {"tests"}}};
  std::size_t includes = 0;
  for (const TextFile& file : program_files()) {
    for (const std::string& included : included_rooms(file)) {
      ++includes;
      for (const std::string& room : forbidden.at(room_of(file))) {
        INFO(file.path << " includes a header of " << included);
        CHECK(included != room);
      }
    }
  }
  CHECK(includes > 50);  // the scan sees the tree
}

TEST_CASE("A forbidden include is recognised however it is written", "[docs]") {
  const TextFile file{
      "thermal/x.hpp",
      "#include \"mechanical/a.hpp\"\n  # include <fires/b.hpp>\n"
      "#include \"../cli/c.hpp\"\n// #include \"tests/d.hpp\"\n#include <vector>\n"};
  CHECK(included_rooms(file) == std::vector<std::string>{"mechanical", "fires", "cli"});
}

TEST_CASE("Libraries with heavy headers are included in source files only", "[docs]") {
  const std::regex heavy(
      R"re(#\s*include\s*[<"](CLI/|toml\+\+/|nlohmann/json\.|cvode/|nvector/|sunmatrix/|sunlinsol/|Eigen/Sparse))re");
  for (const TextFile& file : files_below({"thermal", "fires", "mechanical", "cli"}, {".hpp"})) {
    INFO(file.path);
    CHECK_FALSE(std::regex_search(file.text, heavy));
  }
}
