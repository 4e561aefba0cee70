#include <catch2/catch.hpp>
#include <filesystem>

#include "tests/cli/commands/example_columns.hpp"
#include "tests/cli/commands/run_process.hpp"

using namespace ringward::testing;

namespace {

bool contains(const std::string& text, const std::string& part) {
  return text.find(part) != std::string::npos;
}

const std::string kEscape = "\x1b[";

}  // namespace

TEST_CASE("A full disk behind standard output exits with 5 and names the reason", "[cli]") {
  for (const std::vector<std::string>& arguments : std::vector<std::vector<std::string>>{
           {"gas", "--curve", "standard"}, {"new"}, {"explain"}, {"--help"}, {"--version"}}) {
    INFO(arguments.front());
    const ProcessResult result = run_ringward(arguments, {.stdout_device = "/dev/full"});
    CHECK(result.exit_code == 5);
    CHECK(contains(result.err, "No space left"));
  }
}

TEST_CASE("A closed standard output is noticed, and no file takes its place", "[cli]") {
  const TemporaryFolder folder;
  const ProcessResult result =
      run_ringward({"gas", "--curve", "standard", "--until", "5", "--csv", folder / "gas.csv"},
                   {.close_stdout = true});
  CHECK(result.exit_code == 5);
  CHECK(contains(result.err, "standard output"));
  CHECK(file_content(folder / "gas.csv") == "time_min,temperature_C\n0,20\n5,576.41\n");
}

TEST_CASE("A reader that has gone away ends the program with 5 and without a word", "[cli]") {
  const ProcessResult result = run_with_broken_pipe({"gas", "--curve", "standard"});
  CHECK(result.exit_code == 5);
  CHECK(result.err.empty());
}

TEST_CASE("Option --quiet leaves the text out, but not the files or JSON on standard output",
          "[cli]") {
  const TemporaryFolder folder;
  const ProcessResult to_file =
      run_ringward({"gas", "--curve", "standard", "--quiet", "--json", folder / "gas.json"});
  CHECK(to_file.exit_code == 0);
  CHECK(to_file.out.empty());
  const ProcessResult to_stdout =
      run_ringward({"gas", "--curve", "standard", "--quiet", "--json", "-"});
  CHECK(to_stdout.out == file_content(folder / "gas.json"));
}

TEST_CASE("A target that cannot be written exits with 5, names it, and leaves nothing", "[cli]") {
  const TemporaryFolder folder;
  std::filesystem::create_directory(folder.path() / "taken");
  const std::vector<std::pair<std::string, std::string>> targets{
      {folder / "taken", "folder"},
      {folder / "missing/result.json", "does not exist"},
      {"/dev/full", "No space left"},
      {"/proc/result.json", "/proc/result.json"}};
  for (const auto& [target, reason] : targets) {
    INFO(target);
    const ProcessResult result = run_ringward(
        {"gas", "--curve", "standard", "--csv", target, "--json", folder / "gas.json"});
    CHECK(result.exit_code == 5);
    CHECK(contains(result.err, target));
    CHECK(contains(result.err, reason));
    CHECK(folder.names() == std::vector<std::string>{"taken"});
  }
  CHECK(std::filesystem::is_character_file("/dev/full"));
}

TEST_CASE("A file size limit is a write error, and the old file stays whole", "[cli]") {
  const TemporaryFolder folder;
  write_content(folder / "gas.csv", "old\n");
  const std::string command = "ulimit -f 1; exec '" RINGWARD_BINARY
                              "' gas --curve standard --step 0.01 --csv " +
                              (folder / "gas.csv") + " >/dev/null";
  const ProcessResult result = run_program({"bash", "-c", command});
  CHECK(result.exit_code == 5);
  CHECK(contains(result.err, "File too large"));
  CHECK(file_content(folder / "gas.csv") == "old\n");
  CHECK(folder.names() == std::vector<std::string>{"gas.csv"});
}

TEST_CASE("A written file replaces the old one, keeps its mode and a link to it", "[cli]") {
  namespace fs = std::filesystem;
  const TemporaryFolder folder;
  write_content(folder / "kept.csv", "old\n");
  fs::permissions(folder / "kept.csv", fs::perms::owner_read | fs::perms::owner_write);
  fs::create_symlink("kept.csv", folder.path() / "link.csv");
  const ProcessResult result =
      run_ringward({"gas", "--curve", "standard", "--until", "0", "--csv", folder / "link.csv"});
  CHECK(result.exit_code == 0);
  CHECK(fs::is_symlink(folder.path() / "link.csv"));
  CHECK(file_content(folder / "kept.csv") == "time_min,temperature_C\n0,20\n");
  CHECK(fs::status(folder / "kept.csv").permissions() ==
        (fs::perms::owner_read | fs::perms::owner_write));
}

TEST_CASE("An interrupt during a long run exits with 130 and leaves no file", "[cli]") {
  const TemporaryFolder folder;
  // Fine grid, no symmetry, six hours: far longer than the time after which it is interrupted.
  const ProcessResult result = run_ringward(
      {"rate", "-", "--set", "numerics.accuracy=\"fine\"", "--set", "fire.duration_min=360",
       "--set", "fire.exposed=[\"left\",\"bottom\"]", "--set", "load.axial_kN=1", "--json",
       folder / "rate.json", "--csv", folder / "rate.csv"},
      {.stdin_text = square_column(), .interrupt_after_ms = 300});
  CHECK(result.exit_code == 130);
  CHECK(result.out.empty());
  CHECK(contains(result.err, "interrupted"));
  CHECK(folder.names().empty());
}

TEST_CASE("Colour is only for terminals, and NO_COLOR and --no-color take it away", "[cli]") {
  CHECK_FALSE(contains(run_ringward({"gas", "--curve", "slow"}).out, kEscape));
  CHECK(contains(run_on_terminal({"gas", "--curve", "slow"}).out, kEscape));
  CHECK_FALSE(contains(run_on_terminal({"gas", "--curve", "slow", "--no-color"}).out, kEscape));
  CHECK_FALSE(
      contains(run_on_terminal({"gas", "--curve", "slow"}, {.variables = {{"NO_COLOR", "1"}}}).out,
               kEscape));
}

TEST_CASE("Progress shows on a terminal only", "[cli]") {
  const TemporaryFolder folder;
  write_content(folder / "column.toml", round_bare_column());
  const std::vector<std::string> arguments{"field", folder / "column.toml", "--at", "10"};
  CHECK(contains(run_on_terminal(arguments).out, "solving the heat flow"));
  CHECK(run_ringward(arguments).err.empty());
}
