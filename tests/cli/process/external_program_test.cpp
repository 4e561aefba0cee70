#include "cli/process/external_program.hpp"

#include <catch2/catch.hpp>
#include <csignal>
#include <filesystem>

#include "cli/terminal.hpp"
#include "tests/cli/commands/run_process.hpp"

using namespace ringward::cli;
using ringward::testing::TemporaryFolder;

TEST_CASE("Another program reads what it is given and its output comes back whole", "[process]") {
  const std::string input(3'000'000, 'x');  // more than any pipe holds
  const ProgramRun run = run_external({.name = "cat", .input = input});
  CHECK(run.succeeded());
  CHECK(run.out == input);
  CHECK(run.err.empty());
}

TEST_CASE("Bytes that mean something to a shell mean nothing to an external program", "[process]") {
  const TemporaryFolder folder;
  const std::string words = "$(touch " + (folder / "made") + ") `id` ; | > \" ' \\ *";
  const ProgramRun run = run_external({.name = "printf", .arguments = {"%s", words}});
  CHECK(run.out == words);
  CHECK(folder.names().empty());
}

TEST_CASE("A program that is not there is an outcome, not an error", "[process]") {
  const ProgramRun run = run_external({.name = "ringward-no-such-program"});
  CHECK(run.outcome == ProgramOutcome::not_installed);
  CHECK_FALSE(run.succeeded());
  CHECK_FALSE(run.err.empty());
}

TEST_CASE("The exit code and the complaints of a failing program come back", "[process]") {
  const ProgramRun run = run_external({.name = "ls", .arguments = {"/no/such/folder"}});
  CHECK(run.outcome == ProgramOutcome::finished);
  CHECK(run.exit_code == 2);
  CHECK(run.err.find("/no/such/folder") != std::string::npos);
}

TEST_CASE("A program that ends without reading its input does not end ours", "[process]") {
  prepare_process();
  const ProgramRun run = run_external({.name = "false", .input = std::string(3'000'000, 'x')});
  CHECK(run.outcome == ProgramOutcome::finished);
  CHECK(run.exit_code == 1);
  std::signal(SIGINT, SIG_DFL);
}

TEST_CASE("A program that a signal ends is told from one that exits", "[process]") {
  const ProgramRun run = run_external({.name = "sh", .arguments = {"-c", "kill -TERM $$"}});
  CHECK(run.outcome == ProgramOutcome::finished);
  CHECK(run.exit_code == 128 + SIGTERM);
}
