#pragma once

#include <stdexcept>
#include <string>

namespace ringward {

/// What went wrong; the command line maps each kind to an exit status.
enum class ErrorKind { bad_input, out_of_validity, solver_breakdown, cannot_write };

/// The one exception of the program: bad input, a broken-down solver, an unwritable file.
/// Outcomes of a calculation (a column that fails, or stands) are values, never errors.
class Error : public std::runtime_error {
 public:
  Error(ErrorKind kind, const std::string& message) : std::runtime_error(message), kind_(kind) {}

  [[nodiscard]] ErrorKind kind() const { return kind_; }

  /// The same error with `context` put in front, for use while it passes outward.
  [[nodiscard]] Error within(const std::string& context) const {
    return {kind_, context + ": " + what()};
  }

 private:
  ErrorKind kind_;
};

}  // namespace ringward
