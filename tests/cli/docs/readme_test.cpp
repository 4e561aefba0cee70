#include <catch2/catch.hpp>
#include <regex>

#include "tests/cli/commands/run_process.hpp"
#include "tests/cli/docs/tree.hpp"

using namespace ringward::testing;

namespace {

std::vector<TextFile> documents() {
  std::vector<TextFile> files = files_below({"docs"}, {".md"});
  files.push_back(read_file("README.md"));
  files.push_back(read_file("DEVELOPERS.md"));
  return files;
}

/// First groups of all matches.
std::vector<std::string> all_matches(const std::string& text, const std::regex& pattern) {
  std::vector<std::string> result;
  for (std::sregex_iterator it(text.begin(), text.end(), pattern), end; it != end; ++it) {
    result.push_back((*it)[1]);
  }
  return result;
}

}  // namespace

TEST_CASE("README states the cautions first and the two commands before everything else",
          "[docs]") {
  const std::string text = read_file("README.md").text;
  const std::size_t cautions = text.find("licensed engineer");
  const std::size_t quickstart = text.find("\n    bash cli/quickstart.sh");
  const std::size_t tests = text.find("\n    bash tests/run.sh");
  REQUIRE(cautions != std::string::npos);
  REQUIRE(quickstart != std::string::npos);
  REQUIRE(tests != std::string::npos);
  CHECK(cautions < quickstart);
  CHECK(quickstart < tests);
  CHECK(tests < text.find("\n## ", text.find("\n## ") + 1));
}

TEST_CASE("Every link between the documents leads somewhere", "[docs]") {
  const std::regex link(R"(\]\(([^)#:\s]+)\))");
  std::size_t links = 0;
  for (const TextFile& file : documents()) {
    const auto folder = (project_root() / file.path).parent_path();
    for (const std::string& target : all_matches(file.text, link)) {
      ++links;
      INFO(file.path << " links to " << target);
      CHECK(std::filesystem::exists(folder / target));
    }
  }
  CHECK(links > 5);
}

TEST_CASE("Every path that the developers' guide names is there", "[docs]") {
  const std::regex path(R"(`((?:thermal|fires|mechanical|cli|tests|docs)/[\w./-]*)`)");
  const std::vector<std::string> named = all_matches(read_file("DEVELOPERS.md").text, path);
  CHECK(named.size() > 10);
  for (const std::string& target : named) {
    INFO(target);
    CHECK(std::filesystem::exists(project_root() / target));
  }
}

TEST_CASE("Every command in README's table is one that the program knows", "[docs]") {
  const std::regex row(R"(\n\| `ringward (\w+))");
  const std::vector<std::string> commands = all_matches(read_file("README.md").text, row);
  CHECK(commands.size() >= 6);
  for (const std::string& command : commands) {
    INFO(command);
    CHECK(run_ringward({command, "--help"}).exit_code == 0);
  }
}

TEST_CASE("The first result in README is what the program prints", "[docs]") {
  const std::string text = read_file("README.md").text;
  const std::string prompt = "```text\n$ build/ringward rate docs/examples/atrium-column.toml\n";
  const std::size_t start = text.find(prompt);
  REQUIRE(start != std::string::npos);
  const std::size_t from = start + prompt.size();
  const std::string shown = text.substr(from, text.find("\n```", from) + 1 - from);
  const std::string column = (project_root() / "docs/examples/atrium-column.toml").string();
  const ProcessResult result = run_ringward({"rate", column});
  CHECK(result.exit_code == 0);
  CHECK(shown.size() > 200);
  CHECK(result.out.substr(0, shown.size()) == shown);
}
