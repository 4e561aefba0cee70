#include <fcntl.h>
#include <fmt/format.h>
#include <sys/file.h>
#include <unistd.h>

#include <catch2/catch.hpp>
#include <chrono>
#include <csignal>
#include <filesystem>
#include <nlohmann/json.hpp>
#include <random>
#include <set>

#include "tests/cli/study/study_folder.hpp"

using namespace ringward::testing;

namespace {

constexpr int kLayouts = 24;

/// Layout numbers of the whole lines after the header; fails for one that stands twice.
std::set<int> finished_layouts(const std::string& folder) {
  std::set<int> finished;
  if (!std::filesystem::exists(folder + "/results.jsonl")) return finished;
  const std::vector<std::string> lines = whole_lines(file_content(folder + "/results.jsonl"));
  for (std::size_t i = 1; i < lines.size(); ++i) {
    const int layout = nlohmann::json::parse(lines[i]).at("layout").get<int>();
    INFO("layout " << layout << " stands twice");
    CHECK(finished.insert(layout).second);
  }
  return finished;
}

bool contains(const std::set<int>& all, const std::set<int>& part) {
  return std::includes(all.begin(), all.end(), part.begin(), part.end());
}

}  // namespace

TEST_CASE(
    "A study killed fifty times at random moments loses and doubles no layout and ends with "
    "the same bytes",
    "[study]") {
  const StudyFolder study(load_grid(kLayouts));
  const auto start = std::chrono::steady_clock::now();
  REQUIRE(study.compare("whole").exit_code == 0);
  const auto whole_ms = std::chrono::duration_cast<std::chrono::milliseconds>(
                            std::chrono::steady_clock::now() - start)
                            .count();
  const std::string expected = all_results(study / "whole");
  REQUIRE(finished_layouts(study / "whole").size() == kLayouts);

  std::mt19937 random(4);
  std::uniform_int_distribution<int> moment_ms(5, static_cast<int>(whole_ms) + 10);
  std::set<int> finished;
  int kills = 0;
  int finished_runs = 0;
  std::size_t kept_rows = 0;
  while (kills < 50 && finished_runs < 200) {
    const ProcessSetup killed{.interrupt_after_ms = moment_ms(random), .interrupt_signal = SIGKILL};
    const int exit_code = study.compare("cut", {"--resume"}, killed).exit_code;
    const std::set<int> now = finished_layouts(study / "cut");
    CHECK(contains(now, finished));
    finished = now;
    kept_rows += now.size();
    if (exit_code == 128 + SIGKILL) {
      ++kills;
      continue;
    }
    REQUIRE(exit_code == 0);
    ++finished_runs;
    CHECK(all_results(study / "cut") == expected);
    std::filesystem::remove_all(study / "cut");
    finished.clear();
  }
  REQUIRE(kills == 50);
  CHECK(kept_rows > 0);
  REQUIRE(study.compare("cut", {"--resume"}).exit_code == 0);
  CHECK(all_results(study / "cut") == expected);
  std::vector<std::string> names;
  for (const auto& file : std::filesystem::directory_iterator(study / "cut")) {
    names.push_back(file.path().filename().string());
  }
  CHECK(names.size() == 3);
}

TEST_CASE("Ctrl-C ends a study with 130 and keeps its finished layouts", "[study]") {
  const StudyFolder study(load_grid(400));
  int interrupt_ms = 100;
  std::set<int> finished;
  // Until the machine was quick enough to have finished something.
  for (; finished.empty() && interrupt_ms < 60'000; interrupt_ms *= 2) {
    std::filesystem::remove_all(study / "out");
    const ProcessResult run = study.compare("out", {}, {.interrupt_after_ms = interrupt_ms});
    REQUIRE(run.exit_code == 130);
    finished = finished_layouts(study / "out");
  }
  CHECK(finished.size() < 400);
}

TEST_CASE("A resumed study rates nothing again that is finished", "[study]") {
  const StudyFolder study(load_grid(6));
  REQUIRE(study.compare("out").exit_code == 0);
  const std::string path = study / "out/results.jsonl";
  std::vector<std::string> lines = whole_lines(file_content(path));
  REQUIRE(lines.size() == 7);
  // A mark in one finished row, and the last two rows taken away: only those may be new.
  const std::string criterion = "\"criterion\":\"";
  lines[2].insert(lines[2].find(criterion) + criterion.size(), "marked ");
  std::string cut;
  for (std::size_t i = 0; i < 5; ++i) cut += lines[i] + "\n";
  write_content(path, cut + lines[5].substr(0, 40));
  REQUIRE(study.compare("out", {"--resume"}).exit_code == 0);
  const std::vector<std::string> after = whole_lines(file_content(path));
  CHECK(after == lines);
}

TEST_CASE("A study is not resumed after a change of its files or of the program", "[study]") {
  const StudyFolder study("columns_csv = \"columns.csv\"\n");
  const std::string csv = "name,load.axial_kN\nA,300\nB,400\n";
  write_content(study / "columns.csv", csv);
  REQUIRE(study.compare("out").exit_code == 0);
  const std::string results = file_content(study / "out/results.jsonl");

  SECTION("the study file") {
    write_content(study.study(), file_content(study.study()) + "# a comment\n");
  }
  SECTION("the base column") {
    write_content(study.column(), file_content(study.column()) + "# a comment\n");
  }
  SECTION("the list of columns") { write_content(study / "columns.csv", csv + "C,500\n"); }
  SECTION("the program") {
    const std::size_t at = results.find("\"version\":\"") + 11;
    write_content(study / "out/results.jsonl",
                  results.substr(0, at) + "0.0.1-" + results.substr(at));
  }
  const ProcessResult refused = study.compare("out", {"--resume"});
  CHECK(refused.exit_code == 3);
  CHECK(refused.err.find("these results cannot be continued") != std::string::npos);
  CHECK(refused.err.find("--resume=force") != std::string::npos);
  CHECK(study.compare("out", {"--resume=force"}).exit_code == 0);
}

TEST_CASE("A changed table of a fire counts as a change of the study", "[study]") {
  const StudyFolder study(
      "[[layout]]\nname = \"A\"\nset = { \"fire.points_csv\" = \"fire.csv\", "
      "\"fire.curve\" = \"table\" }\n");
  write_content(study / "fire.csv", "0,20\n30,800\n120,1000\n");
  REQUIRE(study.compare("out").exit_code == 0);
  write_content(study / "fire.csv", "0,20\n30,801\n120,1000\n");
  CHECK(study.compare("out", {"--resume"}).exit_code == 3);
}

TEST_CASE("Resuming by force keeps the rows whose input is the same and says where they are from",
          "[study]") {
  const StudyFolder study(load_grid(3));
  REQUIRE(study.compare("out").exit_code == 0);
  const std::string path = study / "out/results.jsonl";
  std::string text = file_content(path);
  text.insert(text.find("\"version\":\"") + 11, "0.0.1-");
  const std::string criterion = "\"criterion\":\"";
  text.insert(text.find(criterion) + criterion.size(), "marked ");
  write_content(path, text);
  // One load more in front: the kept layouts move to other places.
  std::string changed = file_content(study.study());
  changed.insert(changed.find("300"), "290, ");
  write_content(study.study(), changed);
  REQUIRE(study.compare("out", {"--resume=force"}).exit_code == 0);
  const std::vector<std::string> lines = whole_lines(file_content(path));
  REQUIRE(lines.size() == 5);
  CHECK(nlohmann::json::parse(lines[0])
            .at("kept_from_version")
            .get<std::string>()
            .starts_with("0.0.1-"));
  const auto moved = nlohmann::json::parse(lines[2]);
  CHECK(moved.at("layout") == 2);
  CHECK(moved.at("name") == "axial_kN 300");
  CHECK(moved.at("criterion").get<std::string>().starts_with("marked "));
  CHECK(file_content(study / "out/compare.html").find("kept by force") != std::string::npos);
}

TEST_CASE("A folder that is not empty is not written to without --resume", "[study]") {
  const StudyFolder study(load_grid(2));
  REQUIRE(study.compare("out").exit_code == 0);
  const std::string before = all_results(study / "out");
  const ProcessResult again = study.compare("out");
  CHECK(again.exit_code == 2);
  CHECK(again.err.find("--resume") != std::string::npos);
  CHECK(all_results(study / "out") == before);
  std::filesystem::create_directory(study / "other");
  write_content(study / "other/notes.txt", "mine");
  for (const std::vector<std::string>& more : {std::vector<std::string>{}, {"--resume"}}) {
    CHECK(study.compare("other", more).exit_code == 2);
  }
  CHECK_FALSE(std::filesystem::exists(study / "other/results.jsonl"));
}

TEST_CASE("Two runs do not write to one folder at a time", "[study]") {
  const StudyFolder study(load_grid(2));
  REQUIRE(study.compare("out").exit_code == 0);
  const std::string path = study / "out/results.jsonl";
  const int file = open(path.c_str(), O_RDWR);
  REQUIRE(file >= 0);
  REQUIRE(flock(file, LOCK_EX | LOCK_NB) == 0);
  const ProcessResult second = study.compare("out", {"--resume"});
  CHECK(second.exit_code == 5);
  CHECK(second.err.find("another run") != std::string::npos);
  close(file);
}
