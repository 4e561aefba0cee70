#include "cli/evidence/evidence_run.hpp"

#include <catch2/catch.hpp>

#include "cli/evidence/case_reading.hpp"
#include "cli/output/evidence_report.hpp"
#include "thermal/base/error.hpp"

using namespace ringward::cli;
using Catch::Matchers::Contains;

namespace {

/// The standard curve at 60 min is 945.34 C (en1991-1-2-2002 3.2.1, evaluated).
struct Asked {
  std::string expected = "945.3";
  std::string more = "";
  std::string reason = "half a digit of the figure";
};

std::string text_of(const Asked& asked) {
  return R"(source = "en1991-1-2-2002"
[[case]]
group = "fire curves"
name = "Standard curve"
locator = "3.2.1"
kind = "fire-curve"
input = { curve = "standard" }
[[case.check]]
quantity = "gas temperature"
unit = "C"
at = { time_min = 60 }
tolerance = 0.05
provenance = "memory"
reason = ")" +
         asked.reason + "\"\nexpected = " + asked.expected + "\n" + asked.more + "\n";
}

std::vector<EvidenceCase> cases_of(const std::string& text) {
  return read_cases({"test.toml", text});
}

CheckResult only_result(const Asked& asked) {
  const std::vector<CheckResult> results = run_cases(cases_of(text_of(asked)));
  REQUIRE(results.size() == 1);
  return results.front();
}

std::string complaint(const std::string& text) {
  try {
    static_cast<void>(run_cases(cases_of(text)));
  } catch (const ringward::Error& problem) {
    return problem.what();
  }
  return "";
}

std::string with(std::string text, const std::string& from, const std::string& to) {
  const std::size_t at = text.find(from);
  REQUIRE(at != std::string::npos);
  return text.replace(at, from.size(), to);
}

}  // namespace

TEST_CASE("A right figure passes", "[evidence]") {
  const CheckResult result = only_result({});
  CHECK(result.passes);
  CHECK(result.quantity == "gas temperature at time 60 min");
  CHECK(result.computed == Approx(945.34).margin(0.005));  // evaluated by hand
  CHECK(all_as_expected({result}));
}

TEST_CASE("A wrong figure is an unexpected gap that gives its tolerance's reason", "[evidence]") {
  const CheckResult result = only_result({.expected = "944"});
  CHECK_FALSE(result.passes);
  CHECK(std::string(result.status()) == "gap");
  CHECK_THAT(result.note, Contains("half a digit of the figure"));
  CHECK_FALSE(all_as_expected({result}));
  CHECK_THAT(evidence_text({result}, Style(false)), Contains("1 unexpected gap"));
}

TEST_CASE("A known gap is shown with its reason and does not count as failure", "[evidence]") {
  const CheckResult result =
      only_result({.expected = "944", .more = "known_gap = \"a slip in the source\""});
  CHECK_FALSE(result.passes);
  CHECK(all_as_expected({result}));
  CHECK_THAT(result.note, Contains("a slip in the source"));
  CHECK_THAT(evidence_text({result}, Style(false)), Contains("a slip in the source"));
  CHECK_THAT(evidence_markdown({result}), Contains("**gap**") && Contains("a slip in the source"));
}

TEST_CASE("A known gap that passes says so", "[evidence]") {
  const CheckResult result = only_result({.more = "known_gap = \"a slip in the source\""});
  CHECK(result.passes);
  CHECK_THAT(result.note, Contains("passes, though listed as a gap"));
}

TEST_CASE("A one-sided check asks for one side only", "[evidence]") {
  CHECK(only_result({.expected = "900", .more = "one_sided = \"at least\""}).passes);
  CHECK_FALSE(only_result({.expected = "1000", .more = "one_sided = \"at least\""}).passes);
  CHECK(only_result({.expected = "1000", .more = "one_sided = \"at most\""}).passes);
  CHECK_FALSE(only_result({.expected = "900", .more = "one_sided = \"at most\""}).passes);
}

TEST_CASE("A file that is not well formed is refused with its place", "[evidence]") {
  const std::string good = text_of({});
  CHECK(complaint(good).empty());
  CHECK_THAT(complaint(with(good, "provenance", "origin")), Contains("origin"));
  CHECK_THAT(complaint(with(good, "\"memory\"", "\"hearsay\"")), Contains("test.toml:"));
  CHECK_THAT(complaint(with(good, "\"fire curves\"", "\"fires\"")), Contains("group"));
  CHECK_THAT(complaint(with(good, "tolerance = 0.05", "")), Contains("tolerance"));
  CHECK_THAT(complaint(text_of({.reason = ""})), Contains("reason"));
  CHECK_THAT(complaint(with(good, "\"fire-curve\"", "\"curve\"")), Contains("kind"));
  CHECK_THAT(complaint(with(good, "gas temperature", "gas colour")),
             Contains("gas colour") && Contains("Standard curve"));
  CHECK_THAT(complaint(with(good, "time_min", "hour")), Contains("time_min"));
  CHECK_THAT(complaint(with(good, "curve = \"standard\"", "curve = \"standard\", x = 1")),
             Contains("x: is not known"));
}
