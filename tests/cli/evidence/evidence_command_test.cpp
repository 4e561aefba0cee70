#include <catch2/catch.hpp>
#include <nlohmann/json.hpp>
#include <set>

#include "cli/evidence/evidence_case.hpp"
#include "tests/cli/commands/run_process.hpp"

using namespace ringward::testing;
using Catch::Matchers::Contains;
using ringward::cli::evidence_groups;

namespace {

nlohmann::json all_cases() {
  const ProcessResult run = run_ringward({"evidence", "--json", "-"});
  INFO(run.err);
  REQUIRE(run.exit_code == 0);
  const nlohmann::json document = nlohmann::json::parse(run.out);
  REQUIRE(document.at("schema") == "ringward-evidence/1");
  return document.at("cases");
}

}  // namespace

TEST_CASE("Everything that should pass does, and each gap says why", "[evidence]") {
  std::set<std::string> groups;
  const nlohmann::json cases = all_cases();
  CHECK(cases.size() > 500);
  for (const auto& entry : cases) {
    INFO(entry.dump());
    groups.insert(entry.at("group").get<std::string>());
    for (const char* key : {"name", "source", "locator", "quantity", "unit"}) {
      CHECK_FALSE(entry.at(key).get<std::string>().empty());
    }
    for (const char* key : {"expected", "computed", "tolerance"}) CHECK(entry.at(key).is_number());
    const bool passes = entry.at("status") == "pass";
    CHECK((passes || entry.at("status") == "gap"));
    CHECK((passes || entry.at("note").get<std::string>().size() > 20));
  }
  CHECK(groups == std::set<std::string>(evidence_groups().begin(), evidence_groups().end()));
}

TEST_CASE("The same checks give the same bytes", "[evidence]") {
  const std::vector<std::string> command = {"evidence", "--only", "whole columns", "--json", "-"};
  const ProcessResult first = run_ringward(command);
  CHECK(first.out.size() > 1000);
  CHECK(first.out == run_ringward(command).out);
}

TEST_CASE("One group can be rerun alone", "[evidence]") {
  const ProcessResult run = run_ringward({"evidence", "--only", "confinement"});
  CHECK(run.exit_code == 0);
  CHECK_THAT(run.out, Contains("confinement - ") && Contains("Before anyone relies on this"));
  CHECK_THAT(run.out, !Contains("heat flow - "));
  CHECK(run.err.empty());
}

TEST_CASE("A group that is not there is wrong usage, and the groups are named", "[evidence]") {
  const ProcessResult run = run_ringward({"evidence", "--only", "nonsense"});
  CHECK(run.exit_code == 2);
  CHECK(run.out.empty());
  for (const std::string& group : evidence_groups()) CHECK_THAT(run.err, Contains(group));
}

TEST_CASE("The text shows gaps and sources, the Markdown tables", "[evidence]") {
  const ProcessResult text = run_ringward({"evidence", "--only", "heat flow"});
  CHECK_THAT(text.out, Contains("known gap: ") && Contains("[nafems T3]"));
  const ProcessResult markdown = run_ringward({"evidence", "--only", "heat flow", "--markdown"});
  CHECK(markdown.exit_code == 0);
  CHECK_THAT(markdown.out, Contains("# Published checks") && Contains("| **gap** |"));
}

TEST_CASE("On a terminal a line says that the checks are running", "[evidence]") {
  const ProcessResult run = run_on_terminal({"evidence", "--only", "confinement"});
  CHECK(run.exit_code == 0);
  CHECK_THAT(run.out, Contains("rerunning the published checks"));
}
