#pragma once

namespace ringward::cli {

/// The program: parses the command line, runs the command, tells failures, and returns the exit
/// status of the interface. Nothing is thrown.
[[nodiscard]] int run(int argc, char** argv) noexcept;

}  // namespace ringward::cli
