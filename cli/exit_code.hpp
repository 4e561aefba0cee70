#pragma once

#include "thermal/base/error.hpp"

namespace ringward::cli {

/// What the process returns; part of the interface that scripts rely on.
enum class ExitCode {
  ok = 0,             ///< computed; the required rating, if any, is met
  not_met = 1,        ///< computed; the required rating is not met
  wrong_usage = 2,    ///< options that make no sense
  bad_input = 3,      ///< the column file is invalid or unreadable
  no_solution = 4,    ///< a solver broke down
  cannot_write = 5,   ///< an output could not be written
  bug = 70,           ///< an exception that nobody foresaw
  interrupted = 130,  ///< stopped by the user
};

/// The exit status of an error kind.
[[nodiscard]] constexpr ExitCode exit_code_of(ErrorKind kind) {
  switch (kind) {
    case ErrorKind::bad_input:
    case ErrorKind::out_of_validity:
      return ExitCode::bad_input;
    case ErrorKind::solver_breakdown:
      return ExitCode::no_solution;
    case ErrorKind::cannot_write:
      return ExitCode::cannot_write;
  }
  return ExitCode::bug;
}

}  // namespace ringward::cli
