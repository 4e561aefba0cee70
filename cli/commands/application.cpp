#include "cli/commands/application.hpp"

#include <CLI/CLI.hpp>
#include <optional>
#include <string>
#include <vector>

#include "cli/commands/command.hpp"
#include "cli/commands/usage_error.hpp"
#include "cli/exit_code.hpp"
#include "cli/input/key_suggestion.hpp"
#include "cli/terminal.hpp"
#include "thermal/base/error.hpp"

namespace ringward::cli {
namespace {

constexpr const char* kAbout =
    "How long a concrete column confined by a steel tube keeps carrying its load in a fire.\n"
    "A calculation aid: a licensed engineer has to check what it returns; local codes and the "
    "authority decide.\n"
    "Lengths in mm, forces in kN, strengths in MPa, temperatures in deg C, times in min.";

constexpr const char* kFooter =
    "ringward COMMAND --help explains one command; ringward new starts a column file.\n"
    "Exit status: 0 computed, required rating (if any) met; 1 not met; 2 wrong usage;\n"
    "3 input invalid; 4 no solution; 5 output not written; 70 a bug; 130 interrupted.";

void tell(const std::string& message) { write_stderr("ringward: " + message + "\n"); }

ExitCode wrong_usage(const std::string& message, const std::string& command) {
  tell(message);
  write_stderr("Run \"ringward" + (command.empty() ? "" : " " + command) +
               " --help\" for the options.\n");
  return ExitCode::wrong_usage;
}

std::string chosen_command(const CLI::App& root) {
  const std::vector<CLI::App*> chosen = root.get_subcommands();
  return chosen.empty() ? "" : chosen.front()->get_name();
}

ExitCode run_chosen(const std::vector<Command>& commands) {
  for (const Command& command : commands) {
    if (command.app->parsed()) return command.run();
  }
  throw std::logic_error("the command line was taken without a command");
}

std::vector<Command> add_commands(CLI::App& root) {
  return {add_rate(root),     add_field(root),   add_capacity(root),    add_gas(root),
          add_compare(root),  add_size(root),    add_sensitivity(root), add_dossier(root),
          add_evidence(root), add_explain(root), add_new(root)};
}

std::string unknown_command(const CLI::App& root, const std::string& word) {
  std::vector<std::string> names;
  for (const CLI::App* command : root.get_subcommands({})) names.push_back(command->get_name());
  const std::optional<std::string> meant = nearest(word, names);
  return "\"" + word + "\" is no command" + (meant ? "; did you mean \"" + *meant + "\"?" : "");
}

ExitCode parse_and_run(CLI::App& root, int argc, char** argv) {
  const std::vector<Command> commands = add_commands(root);
  try {
    root.parse(argc, argv);
  } catch (const CLI::CallForHelp&) {
    write_stdout(root.help());
    return ExitCode::ok;
  } catch (const CLI::CallForVersion&) {
    write_stdout("ringward " RINGWARD_VERSION "\n");
    return ExitCode::ok;
  } catch (const CLI::ParseError& problem) {
    if (chosen_command(root).empty() && argc > 1 && argv[1][0] != '-') {
      return wrong_usage(unknown_command(root, argv[1]), "");
    }
    return wrong_usage(problem.what(), chosen_command(root));
  }
  try {
    return run_chosen(commands);
  } catch (const UsageError& problem) {
    return wrong_usage(problem.what(), chosen_command(root));
  }
}

ExitCode run_guarded(int argc, char** argv) {
  CLI::App root(kAbout, "ringward");
  root.set_help_flag("-h,--help", "Print this help and exit");
  root.set_version_flag("--version", RINGWARD_VERSION, "Print the version and exit");
  root.require_subcommand(1);
  root.footer(kFooter);
  try {
    return parse_and_run(root, argc, argv);
  } catch (const BrokenPipe&) {
    return ExitCode::cannot_write;
  } catch (const Error& problem) {
    tell(problem.what());
    return exit_code_of(problem.kind());
  } catch (const std::exception& problem) {
    tell(std::string("this is a bug, please report it with the input that led here: ") +
         problem.what());
    return ExitCode::bug;
  }
}

}  // namespace

int run(int argc, char** argv) noexcept {
  try {
    prepare_process();
    return static_cast<int>(run_guarded(argc, argv));
  } catch (...) {
    write_stderr("ringward: this is a bug, please report it with the input that led here\n");
    return static_cast<int>(ExitCode::bug);
  }
}

}  // namespace ringward::cli
