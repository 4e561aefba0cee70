#include <catch2/catch.hpp>
#include <regex>

#include "tests/cli/docs/tree.hpp"

using namespace ringward::testing;

namespace {

const std::vector<std::string> kAllRooms = {"thermal", "fires", "mechanical", "cli", "tests"};

}  // namespace

// The rules of style that DEVELOPERS.md states as kept by a test.

TEST_CASE("Every header guards itself with pragma once", "[docs]") {
  for (const TextFile& file : files_below(kAllRooms, {".hpp"})) {
    INFO(file.path);
    CHECK(file.text.find("#pragma once\n") != std::string::npos);
  }
}

TEST_CASE("No source file is longer than 450 lines", "[docs]") {
  for (const TextFile& file : files_below(kAllRooms, {".hpp", ".cpp"})) {
    INFO(file.path);
    CHECK(file.lines().size() <= 450);
  }
}

TEST_CASE("Library code never prints", "[docs]") {
  const std::regex prints(
      R"(\bstd::(cout|cerr|clog|puts|printf|fprintf)\b|\bfmt::print\b|\bprintf\()");
  for (const TextFile& file : files_below({"thermal", "fires", "mechanical"}, {".hpp", ".cpp"})) {
    INFO(file.path);
    CHECK_FALSE(std::regex_search(file.text, prints));
  }
}

TEST_CASE("No marker of unfinished work is left in the tree", "[docs]") {
  // Put together here so that this file does not hold them itself.
  const std::regex marker(std::string("\\b(TO") + "DO|FIX" + "ME|X" + "XX)\\b");
  for (const TextFile& file : files_below(kAllRooms, {".hpp", ".cpp", ".sh", ".txt", ".toml"})) {
    INFO(file.path);
    CHECK_FALSE(std::regex_search(file.text, marker));
  }
}

TEST_CASE("No test draws its random numbers from a changing seed", "[docs]") {
  const std::regex changing(std::string("random_") + "device|\\bs" +
                            "rand\\(|seed\\(.*(time|now)\\(");
  for (const TextFile& file : files_below({"tests"}, {".hpp", ".cpp"})) {
    INFO(file.path);
    CHECK_FALSE(std::regex_search(file.text, changing));
  }
}
