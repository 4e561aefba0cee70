#pragma once

#include <string>
#include <vector>

namespace ringward::cli {

/// A program of the system, its arguments and what it reads on standard input.
struct ProgramCall {
  std::string name;  ///< fixed in our code, never from input; looked up on PATH
  std::vector<std::string> arguments = {};
  std::string input = {};
};

enum class ProgramOutcome { finished, not_installed, could_not_run };

/// What came of the call. That a program is missing or fails is an outcome, not an error.
struct ProgramRun {
  ProgramOutcome outcome = ProgramOutcome::could_not_run;
  int exit_code = -1;  ///< of a finished program; 128 + n when signal n ended it
  std::string out;
  std::string err;  ///< its standard error, or why it could not run

  [[nodiscard]] bool succeeded() const {
    return outcome == ProgramOutcome::finished && exit_code == 0;
  }
};

/// Runs the program without a shell, in the locale "C" and with SOURCE_DATE_EPOCH set, so that its
/// output does not depend on place and time, and waits for its end.
[[nodiscard]] ProgramRun run_external(const ProgramCall& call);

}  // namespace ringward::cli
