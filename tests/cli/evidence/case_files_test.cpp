#define TOML_HEADER_ONLY 0
#define TOML_SHARED_LIB 1
#include <toml++/toml.h>

#include <catch2/catch.hpp>
#include <set>

#include "cli/evidence/case_reading.hpp"
#include "tests/cli/docs/tree.hpp"

using namespace ringward::cli;
using ringward::testing::files_below;
using ringward::testing::project_root;
using ringward::testing::TextFile;

TEST_CASE("Every file of published checks is in the program, byte for byte", "[evidence]") {
  const std::vector<TextFile> files = files_below({"tests/published/evidence"}, {".toml"});
  REQUIRE(files.size() == case_files().size());
  for (std::size_t k = 0; k < files.size(); ++k) {
    INFO(files[k].path);
    CHECK(files[k].path == "tests/published/evidence/" + case_files()[k].name);
    CHECK(files[k].text == case_files()[k].text);
  }
}

TEST_CASE("Every published check is well formed and its source is listed", "[evidence]") {
  const toml::table sources = toml::parse_file((project_root() / "docs/sources.toml").string());
  const std::vector<EvidenceCase> cases = built_in_cases();
  CHECK(cases.size() > 50);
  for (const EvidenceCase& evidence : cases) {
    INFO(evidence.file << ": " << evidence.name);
    CHECK(sources.contains(evidence.source));
    CHECK_FALSE(evidence.locator.empty());
    for (const Check& check : evidence.checks) {
      INFO(check.quantity);
      CHECK(check.reason.size() > 10);  // words, not a dash
      CHECK((check.tolerance > 0.0 || check.relative > 0.0));
      CHECK_FALSE(check.points.empty());
    }
  }
}

TEST_CASE("Every group of published checks has cases", "[evidence]") {
  std::set<std::string> filled;
  for (const EvidenceCase& evidence : built_in_cases()) filled.insert(evidence.group);
  CHECK(filled == std::set<std::string>(evidence_groups().begin(), evidence_groups().end()));
}

TEST_CASE("No two published checks have the same name and place", "[evidence]") {
  std::set<std::string> seen;
  for (const EvidenceCase& evidence : built_in_cases()) {
    INFO(evidence.name);
    CHECK(seen.insert(evidence.name + evidence.source + evidence.locator).second);
  }
}
