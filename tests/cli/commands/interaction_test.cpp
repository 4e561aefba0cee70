#include <catch2/catch.hpp>
#include <cmath>
#include <sstream>

#include "tests/cli/commands/run_process.hpp"
#include "tests/cli/dossier/dossier_columns.hpp"

using namespace ringward::testing;

TEST_CASE(
    "Under heating from one side every point of an N-M diagram is one that the section can "
    "reach",
    "[cli]") {
  const ProcessResult result =
      run_ringward({"capacity", "-", "--at", "0,30", "--interaction", "--csv", "-"},
                   {.stdin_text = surviving_column()});
  REQUIRE(result.exit_code == 0);
  std::istringstream lines(result.out);
  std::string line;
  std::getline(lines, line);
  REQUIRE(line == "time_min,axis,axial_kN,moment_kNm");
  std::size_t points = 0;
  for (; std::getline(lines, line); ++points) {
    const double moment_kNm = std::stod(line.substr(line.rfind(',') + 1));
    INFO(line);
    // More than all strength, 0.3 x 0.2 m2 of 30 MPa and 4 bars of 16 mm and 500 MPa, times half
    // the width.
    CHECK(std::abs(moment_kNm) < (0.06 * 30e3 + 4 * 0.000201 * 500e3) * 0.15);
  }
  CHECK(points > 100);
}
