#pragma once

#include <functional>

#include "cli/exit_code.hpp"

namespace CLI {
class App;
}

namespace ringward::cli {

/// A subcommand: its place on the command line and what it does once the options are read.
struct Command {
  CLI::App* app = nullptr;
  std::function<ExitCode()> run;
};

// Each adds its subcommand with options and help to the root.
[[nodiscard]] Command add_rate(CLI::App& root);
[[nodiscard]] Command add_field(CLI::App& root);
[[nodiscard]] Command add_capacity(CLI::App& root);
[[nodiscard]] Command add_gas(CLI::App& root);
[[nodiscard]] Command add_compare(CLI::App& root);
[[nodiscard]] Command add_size(CLI::App& root);
[[nodiscard]] Command add_sensitivity(CLI::App& root);
[[nodiscard]] Command add_dossier(CLI::App& root);
[[nodiscard]] Command add_evidence(CLI::App& root);
[[nodiscard]] Command add_explain(CLI::App& root);
[[nodiscard]] Command add_new(CLI::App& root);

}  // namespace ringward::cli
