#include <CLI/CLI.hpp>
#include <memory>
#include <optional>

#include "cli/commands/command.hpp"
#include "cli/commands/explain.hpp"
#include "cli/terminal.hpp"

namespace ringward::cli {

Command add_explain(CLI::App& root) {
  struct Options {
    std::optional<std::string> key;
    bool markdown = false;
  };
  const auto options = std::make_shared<Options>();
  CLI::App* app = root.add_subcommand(
      "explain", "What an input key means: unit, range, default, source; without KEY, the list");
  CLI::Option* key =
      app->add_option("KEY", options->key, "As in a column file, e.g. tube.thickness_mm")
          ->type_name("");
  app->add_flag("--markdown", options->markdown, "The reference of all keys, as docs/input.md")
      ->excludes(key);
  return {
      app, [options] {
        write_stdout(options->markdown ? input_reference_markdown() : explain_text(options->key));
        return ExitCode::ok;
      }};
}

}  // namespace ringward::cli
