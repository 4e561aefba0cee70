#include <catch2/catch.hpp>

#include "tests/cli/commands/run_process.hpp"

using namespace ringward::testing;
using Catch::Matchers::Contains;

// The program itself, built with a file of checks whose one figure is wrong on purpose: nothing in
// the product can be made to fail from outside.
TEST_CASE("The program returns 1 when a published check fails, and shows the failure",
          "[evidence]") {
  const ProcessResult run = run_program({RINGWARD_FALSE_FIGURE, "evidence"});
  INFO(run.out << run.err);
  CHECK(run.exit_code == 1);
  CHECK_THAT(run.out, Contains("wrong on purpose") && Contains("1 unexpected gap"));
}
