#include <catch2/catch.hpp>
#include <filesystem>
#include <nlohmann/json.hpp>

#include "cli/study/layout_row.hpp"
#include "tests/cli/page/xml_check.hpp"
#include "tests/cli/study/study_folder.hpp"

using namespace ringward::testing;
using nlohmann::json;

namespace {

#ifdef __SANITIZE_ADDRESS__
constexpr bool kSanitized = true;  // keeps freed memory for a while
#else
constexpr bool kSanitized = false;
#endif

const char* const kMixedGrid =
    "[grid]\n\"section.diameter_mm\" = [200, 220]\n\"load.axial_kN\" = [400, 500, 600]\n"
    "\"rating.required_min\" = [30]\n";

bool mentions(const std::string& text, const std::string& words) {
  return text.find(words) != std::string::npos;
}

}  // namespace

TEST_CASE("Any number of threads gives the same bytes in all three files", "[study]") {
  const StudyFolder study(kMixedGrid);
  REQUIRE(study.compare("one", {"--jobs", "1"}).exit_code == 0);
  REQUIRE(study.compare("four", {"--jobs", "4"}).exit_code == 0);
  REQUIRE(study.compare("all").exit_code == 0);
  CHECK(all_results(study / "one") == all_results(study / "four"));
  CHECK(all_results(study / "one") == all_results(study / "all"));
}

TEST_CASE("Every row says what rate says of its column", "[study]") {
  const StudyFolder study(kMixedGrid);
  REQUIRE(study.compare("out", {"--json", study / "all.json"}).exit_code == 0);
  const json all = json::parse(file_content(study / "all.json"));
  CHECK(all.at("schema") == "ringward-compare/1");
  REQUIRE(all.at("layouts").size() == 6);
  for (const json& row : all.at("layouts")) {
    const auto set = [&](const std::string& key) {
      return key + "=" + row.at("values").at(key).dump();
    };
    const ProcessResult alone =
        run_ringward({"rate", study.column(), "--json", "-", "--set", set("section.diameter_mm"),
                      "--set", set("load.axial_kN"), "--set", set("rating.required_min")});
    const json rating = json::parse(alone.out).at("rating");
    for (const char* key : {"outcome", "fire_resistance_min", "uncertainty_min", "class_min",
                            "required_min", "met", "criterion"}) {
      INFO(row.at("name") << " " << key);
      CHECK(row.at(key) == rating.at(key));
    }
  }
}

TEST_CASE("The folder holds a whole log, a table in the order of the study and a page by itself",
          "[study]") {
  const StudyFolder study(kMixedGrid);
  REQUIRE(study.compare("out").exit_code == 0);
  const std::vector<std::string> log = whole_lines(file_content(study / "out/results.jsonl"));
  REQUIRE(log.size() == 7);
  const json header = json::parse(log.front());
  CHECK(header.at("schema") == "ringward-results/1");
  CHECK(header.at("layouts") == 6);
  const std::vector<std::string> table = whole_lines(file_content(study / "out/summary.csv"));
  REQUIRE(table.size() == 7);
  CHECK(table[0].starts_with("layout,name,outcome,fire_resistance_min,uncertainty_min,"));
  CHECK(table[1].starts_with("1,\"diameter_mm 200, axial_kN 400\","));
  CHECK(table[6].starts_with("6,\"diameter_mm 220, axial_kN 600\","));
  const std::string page = file_content(study / "out/compare.html");
  CHECK(mentions(page, "licensed engineer"));
  CHECK(mentions(page, "Fire resistance against steel"));
  CHECK(mentions(page, "Fire resistance against section.diameter_mm"));
  CHECK_FALSE(mentions(page, "<link"));
  CHECK_FALSE(mentions(page, "src="));
  CHECK(xml_complaints(file_content(study / "out/compare.html")) == "");
  CHECK(html_complaints(file_content(study / "out/compare.html")) == "");
}

TEST_CASE(
    "The page says for every varied quantity what it does, in a picture or, for words, a table",
    "[study]") {
  const StudyFolder study(
      "[grid]\n\"core.aggregate\" = [\"siliceous\", \"calcareous\"]\n\"load.axial_kN\" = [400, "
      "500]\n\"core.strength_MPa\" = [30]\n");
  REQUIRE(study.compare("out").exit_code == 0);
  const std::string page = file_content(study / "out/compare.html");
  CHECK(mentions(page, "Fire resistance against load.axial_kN"));
  CHECK(mentions(page, "Fire resistance less uncertainty for each value of core.aggregate"));
  CHECK_FALSE(mentions(page, "against core.strength_MPa"));  // the same in all
}

TEST_CASE("Names and values of users stay text in page, table and log", "[study]") {
  const std::string name = "<script>alert('x')</script> & \\\"quotes\\\", `date` $(id) {/Bold b}";
  const StudyFolder study("[[layout]]\nname = \"" + name +
                          "\"\nset = { title = \"</svg><b>t</b>\" }\n");
  REQUIRE(study.compare("out").exit_code == 0);
  const std::string page = file_content(study / "out/compare.html");
  CHECK_FALSE(mentions(page, "<script>alert"));
  CHECK_FALSE(mentions(page, "<b>t</b>"));
  CHECK(mentions(page, "&lt;script&gt;alert"));
  CHECK(xml_complaints(file_content(study / "out/compare.html")) == "");
  CHECK(html_complaints(file_content(study / "out/compare.html")) == "");
  const std::vector<std::string> log = whole_lines(file_content(study / "out/results.jsonl"));
  CHECK(mentions(json::parse(log.at(1)).at("name"), "\"quotes\", `date` $(id)"));
}

TEST_CASE("Without gnuplot the page has its tables and says how to get pictures", "[study]") {
  const StudyFolder study(load_grid(2));
  std::filesystem::create_directory(study / "nothing");
  const ProcessResult run = study.compare("out", {}, {.variables = {{"PATH", study / "nothing"}}});
  CHECK(run.exit_code == 0);
  CHECK(mentions(run.err, "apt install gnuplot-nox"));
  const std::string page = file_content(study / "out/compare.html");
  CHECK(mentions(page, "apt install gnuplot-nox"));
  CHECK(mentions(page, "axial_kN 310"));
  CHECK_FALSE(mentions(page, "<svg"));
}

TEST_CASE("A layout without a solution is a row with its reason, and the exit status is 4",
          "[study]") {
  const StudyFolder study(load_grid(3));
  REQUIRE(study.compare("out").exit_code == 0);
  const std::string path = study / "out/results.jsonl";
  std::vector<std::string> lines = whole_lines(file_content(path));
  ringward::cli::LayoutRow row = ringward::cli::row_of_line(lines.at(2));
  row.verdict = std::nullopt;
  row.reason = "the integrator gave up at 12.5 min";
  write_content(path, lines[0] + "\n" + lines[1] + "\n" + ringward::cli::row_line(row));
  const ProcessResult run = study.compare("out", {"--resume"});
  CHECK(run.exit_code == 4);
  CHECK(mentions(file_content(study / "out/compare.html"), "gave up at 12.5 min"));
  CHECK(mentions(file_content(study / "out/summary.csv"), "2,axial_kN 310,no solution,"));
  CHECK(whole_lines(file_content(path)).size() == 4);
}

TEST_CASE("Mistakes in the study end with 3 before anything is computed or written", "[study]") {
  const StudyFolder study("[grid]\n\"load.axial_kN\" = [300, -1]\n");
  const ProcessResult run = study.compare("out");
  CHECK(run.exit_code == 3);
  CHECK(mentions(run.err, "study.toml:4:25: layout \"axial_kN -1\": load.axial_kN:"));
  CHECK_FALSE(std::filesystem::exists(study / "out"));
  CHECK(study.compare("out", {"--resume=maybe"}).exit_code == 2);
  CHECK(study.compare("out", {"--jobs", "0"}).exit_code == 2);
  write_content(study / "file", "");
  const StudyFolder good(load_grid(1));
  write_content(good / "file", "");
  CHECK(good.compare("file").exit_code == 5);
}

TEST_CASE("Progress with count, rate and time left is shown on a terminal only", "[study]") {
  const StudyFolder study(load_grid(3));
  const ProcessResult shown =
      run_on_terminal({"compare", study.study(), "-o", study / "seen", "--quiet"});
  CHECK(mentions(shown.out, "rated 0 of 3"));
  CHECK(mentions(shown.out, "rated 3 of 3, "));
  CHECK(mentions(shown.out, " per s, 0 s left"));
  CHECK(study.compare("out").err.empty());
}

TEST_CASE("Ten times as many layouts take hardly more memory", "[study]") {
  const StudyFolder few(load_grid(40));
  const StudyFolder many(load_grid(400));
  const ProcessResult small = few.compare("out");
  const ProcessResult large = many.compare("out");
  REQUIRE(small.exit_code == 0);
  REQUIRE(large.exit_code == 0);
  INFO(small.peak_kB << " kB and " << large.peak_kB << " kB");
  // What stays of a layout is its line, about 2 kB, held twice while the files are written; a
  // rating with its temperatures would be some 100 kB.
  if (!kSanitized) CHECK(large.peak_kB < small.peak_kB + 360 * 15);
}
