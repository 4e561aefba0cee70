#include <CLI/CLI.hpp>
#include <memory>

#include "cli/commands/command.hpp"
#include "cli/commands/new_file.hpp"
#include "cli/terminal.hpp"

namespace ringward::cli {

Command add_new(CLI::App& root) {
  const auto shape = std::make_shared<std::string>("circular");
  CLI::App* app =
      root.add_subcommand("new", "Print a commented starter file: ringward new > column.toml");
  app->add_option("--shape", *shape, "circular (the default), square or rectangular")
      ->type_name("SHAPE")
      ->check(CLI::IsMember({"circular", "square", "rectangular"}));
  return {app, [shape] {
            write_stdout(new_file_text(*shape));
            return ExitCode::ok;
          }};
}

}  // namespace ringward::cli
