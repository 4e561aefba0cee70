#include <CLI/CLI.hpp>
#include <memory>

#include "cli/commands/command.hpp"
#include "cli/commands/common_options.hpp"
#include "cli/input/reader.hpp"
#include "cli/output/rate_report.hpp"

namespace ringward::cli {
namespace {

RateReport rated(ColumnInput input) {
  const ProgressLine progress("rating the column");
  return rate_report(std::move(input));
}

ExitCode run_rate(const CommonOptions& options) {
  check_targets(options, {});
  const RateReport report = rated(read_column_file(options.column, options.overrides));
  deliver(options, {.text = [&](const Style& style) { return rate_text(report, style); },
                    .json = [&] { return rate_json(report); },
                    .csv = [&] { return rate_csv(report); },
                    .files = {}});
  return report.verdict.met.value_or(true) ? ExitCode::ok : ExitCode::not_met;
}

}  // namespace

Command add_rate(CLI::App& root) {
  const auto options = std::make_shared<CommonOptions>();
  CLI::App* app = root.add_subcommand(
      "rate", "Fire resistance of one column in min, with history, bounds and numerical error");
  add_column_options(*app, *options, ColumnNeed::required);
  add_result_options(*app, *options);
  app->footer(
      "Results: times in min, temperatures in deg C, stresses in MPa, forces in kN.\n"
      "Exit status 1 when rating.required_min is not met.");
  return {app, [options] { return run_rate(*options); }};
}

}  // namespace ringward::cli
