#include <CLI/CLI.hpp>
#include <memory>

#include "cli/commands/command.hpp"
#include "cli/commands/common_options.hpp"
#include "cli/commands/usage_error.hpp"
#include "cli/study/sensitivity_report.hpp"

namespace ringward::cli {
namespace {

struct SensitivityOptions {
  CommonOptions common;
  std::string picture;
  std::size_t jobs = 0;
};

std::vector<std::string> files_of(const SensitivityOptions& options) {
  if (options.picture.empty()) return {};
  if (options.picture == "-") throw UsageError("--picture takes the name of a file");
  return {options.picture};
}

/// A picture that cannot be drawn must not take the table with it.
std::vector<OutputFile> picture_of(const SensitivityOptions& options,
                                   const SensitivityReport& report) {
  if (options.picture.empty()) return {};
  Picture picture = sensitivity_picture(report);
  if (picture.is_there()) return {{options.picture, std::move(picture.svg)}};
  write_stderr("ringward: " + options.picture + ": " + picture.why_missing + "\n");
  return {};
}

ExitCode run_sensitivity(const SensitivityOptions& options) {
  check_targets(options.common, files_of(options));
  const SensitivityReport report =
      sensitivity_of(load_source(options.common.column), options.common.overrides, options.jobs);
  const std::vector<OutputFile> pictures = picture_of(options, report);
  deliver(options.common,
          {.text = [&](const Style& style) { return sensitivity_text(report, style); },
           .json = [&] { return sensitivity_json(report); },
           .csv = [&] { return sensitivity_csv(report); },
           .files = pictures});
  const bool is_missing = !options.picture.empty() && pictures.empty();
  return is_missing ? ExitCode::cannot_write : ExitCode::ok;
}

}  // namespace

Command add_sensitivity(CLI::App& root) {
  const auto options = std::make_shared<SensitivityOptions>();
  CLI::App* app = root.add_subcommand(
      "sensitivity", "How the fire resistance moves with each uncertain input, largest first");
  add_column_options(*app, options->common, ColumnNeed::required);
  app->add_option("--picture", options->picture, "Write the bars as an SVG picture (gnuplot)")
      ->type_name("FILE.svg");
  app->add_option("--jobs", options->jobs, "Threads; default: all cores. Changes no result")
      ->type_name("N")
      ->check(CLI::Range(1, 1024));
  add_result_options(*app, options->common);
  app->footer("[sensitivity] in the column file gives low and high values of its own.");
  return {app, [options] { return run_sensitivity(*options); }};
}

}  // namespace ringward::cli
