#include <catch2/catch.hpp>
#include <filesystem>
#include <sstream>

#include "tests/cli/commands/run_process.hpp"
#include "tests/cli/docs/tree.hpp"

using namespace ringward::testing;

namespace {

struct Quoted {
  std::vector<std::string> arguments;
  std::string output;
};

/// Blocks that start with `$ build/ringward ...` and what stands below.
std::vector<Quoted> quoted_outputs(const std::string& text) {
  const std::string prompt = "```text\n$ build/ringward ";
  std::vector<Quoted> all;
  for (std::size_t at = 0; (at = text.find(prompt, at)) != std::string::npos;) {
    const std::size_t line_end = text.find('\n', at + prompt.size());
    const std::size_t end = text.find("\n```", line_end);
    Quoted quoted;
    std::istringstream words(text.substr(at + prompt.size(), line_end - at - prompt.size()));
    for (std::string word; words >> word;) quoted.arguments.push_back(word);
    quoted.output = text.substr(line_end + 1, end - line_end);
    all.push_back(quoted);
    at = end;
  }
  return all;
}

/// A folder in which `docs` is the project's.
class DocsFolder {
 public:
  DocsFolder() {
    std::filesystem::create_directory_symlink(project_root() / "docs", folder_ / "docs");
  }
  [[nodiscard]] ProcessResult run(const std::vector<std::string>& arguments) const {
    return run_ringward(arguments, {.folder = folder_.path()});
  }
  [[nodiscard]] std::string operator/(const std::string& name) const { return folder_ / name; }

 private:
  TemporaryFolder folder_;
};

}  // namespace

TEST_CASE(
    "The outputs in docs/compare.md are what the program prints, and its pictures what it "
    "draws",
    "[docs]") {
  const DocsFolder folder;
  const std::vector<Quoted> outputs = quoted_outputs(read_file("docs/compare.md").text);
  REQUIRE(outputs.size() == 3);
  for (const Quoted& quoted : outputs) {
    INFO(quoted.arguments.front());
    const ProcessResult run = folder.run(quoted.arguments);
    CHECK(run.exit_code == 0);
    CHECK(quoted.output.size() > 300);
    CHECK(run.out.substr(0, quoted.output.size()) == quoted.output);
  }
  const std::string page = file_content(folder / "atrium/compare.html");
  for (const char* name : {"docs/compare/trade-off.svg", "docs/compare/axis-distance.svg"}) {
    INFO(name);
    CHECK(page.find(read_file(name).text) != std::string::npos);
  }
  REQUIRE(folder
              .run({"sensitivity", "docs/examples/atrium-column.toml", "--quiet", "--picture",
                    folder / "bars.svg"})
              .exit_code == 0);
  CHECK(file_content(folder / "bars.svg") == read_file("docs/compare/sensitivity.svg").text);
}

TEST_CASE("The study in docs/compare.md is the one that is rated", "[docs]") {
  const std::string study = read_file("docs/compare/atrium-study.toml").text;
  CHECK(read_file("docs/compare.md").text.find("```toml\n" + study + "```\n") != std::string::npos);
}
