#include <array>
#include <catch2/catch.hpp>
#include <cstdio>
#include <memory>

#include "tests/cli/docs/tree.hpp"

using namespace ringward::testing;

namespace {

struct Outcome {
  int status = 0;
  std::string out;
};

std::string quoted(const std::string& text) { return "'" + text + "'"; }

/// Runs a line of bash with cli/setup.sh sourced.
Outcome with_setup(const std::string& line) {
  const std::string script = (project_root() / "cli/setup.sh").string();
  const std::string command = "exec bash -c 'set -euo pipefail; source \"$1\"; " + line +
                              "' bash " + quoted(script) + " " + quoted(RINGWARD_BINARY) +
                              " 2>/dev/null";
  std::FILE* pipe = popen(command.c_str(), "r");
  REQUIRE(pipe != nullptr);
  Outcome outcome;
  std::array<char, 256> buffer{};
  while (std::fgets(buffer.data(), buffer.size(), pipe) != nullptr) outcome.out += buffer.data();
  outcome.status = pclose(pipe);
  return outcome;
}

#ifdef __SANITIZE_ADDRESS__
constexpr bool kSanitized = true;
#else
constexpr bool kSanitized = false;
#endif

}  // namespace

TEST_CASE("Set-up asks apt only for packages that are not installed", "[docs]") {
  const Outcome outcome = with_setup("missing_packages dpkg no-such-package-here coreutils");
  CHECK(outcome.status == 0);
  CHECK(outcome.out == "no-such-package-here\n");
}

TEST_CASE("Set-up builds with one job at least and never with more than there are cores",
          "[docs]") {
  CHECK(with_setup("(( $(job_count) >= 1 && $(job_count) <= $(nproc) ))").status == 0);
}

TEST_CASE("Set-up finds the project's root from its own place, not from the current folder",
          "[docs]") {
  const Outcome outcome = with_setup("cd /; printf %s \"$ringward_root\"");
  CHECK(std::filesystem::equivalent(outcome.out, project_root()));
}

// Holds in both builds: the check accepts the sanitized program and refuses the plain one.
TEST_CASE("A program built without sanitizers is told from one with", "[docs]") {
  const Outcome outcome = with_setup("require_sanitizers \"$2\"");
  CHECK((outcome.status == 0) == kSanitized);
}
