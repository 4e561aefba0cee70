#include <CLI/CLI.hpp>
#include <memory>

#include "cli/commands/command.hpp"
#include "cli/commands/common_options.hpp"
#include "cli/commands/option_values.hpp"
#include "cli/input/reader.hpp"
#include "cli/output/capacity_report.hpp"
#include "cli/output/interaction_report.hpp"

namespace ringward::cli {
namespace {

using mechanical::Axis;

struct CapacityOptions {
  CommonOptions common;
  std::string at;
  bool interaction = false;
};

struct CapacityTask {
  ColumnInput input;
  thermal::TemperatureHistory history;
  std::vector<double> times_s;
};

CapacityTask task_of(const CapacityOptions& options) {
  std::vector<double> times_s;
  if (!options.at.empty()) times_s = times_option("--at", options.at);
  check_targets(options.common, {});
  ColumnInput input = read_column_file(options.common.column, options.common.overrides);
  if (times_s.empty()) times_s = default_times_s(input.fire.duration_s, true);
  require_followed(times_s, input.fire.duration_s);
  const ProgressLine progress("solving the heat flow");
  thermal::TemperatureHistory history = thermal::solve_heat_flow(
      input.column.section, input.fire, {.accuracy = input.accuracy, .scale = 1.0});
  return {std::move(input), std::move(history), std::move(times_s)};
}

Notices all_notices(const CapacityTask& task) {
  Notices notices = task.input.notices;
  notices.insert(notices.end(), task.history.notices().begin(), task.history.notices().end());
  return notices;
}

CapacityReport capacities_of(const CapacityTask& task) {
  const ProgressLine progress("computing the resistance");
  return {.title = task.input.title,
          .fire = task.input.curve->name(),
          .confinement = task.input.column.confinement,
          .states = mechanical::capacities(task.input.column, task.history, task.times_s),
          .notices = all_notices(task)};
}

InteractionReport diagrams_of(const CapacityTask& task) {
  const ProgressLine progress("computing the N-M diagrams");
  InteractionReport report{.title = task.input.title,
                           .fire = task.input.curve->name(),
                           .confinement = confinement_word(task.input.column.confinement),
                           .diagrams = {},
                           .notices = all_notices(task)};
  for (const double time_s : task.times_s) {
    for (const Axis axis : {Axis::x, Axis::y}) {
      report.diagrams.push_back(
          mechanical::interaction(task.input.column, task.history, time_s, axis));
    }
  }
  return report;
}

ExitCode run_capacity(const CapacityOptions& options) {
  const CapacityTask task = task_of(options);
  if (options.interaction) {
    const InteractionReport report = diagrams_of(task);
    deliver(options.common,
            {.text = [&](const Style& style) { return interaction_text(report, style); },
             .json = [&] { return interaction_json(report); },
             .csv = [&] { return interaction_csv(report); },
             .files = {}});
    return ExitCode::ok;
  }
  const CapacityReport report = capacities_of(task);
  deliver(options.common, {.text = [&](const Style& style) { return capacity_text(report, style); },
                           .json = [&] { return capacity_json(report); },
                           .csv = [&] { return capacity_csv(report); },
                           .files = {}});
  return ExitCode::ok;
}

}  // namespace

Command add_capacity(CLI::App& root) {
  const auto options = std::make_shared<CapacityOptions>();
  CLI::App* app = root.add_subcommand("capacity", "Resistance in kN at given times of the fire");
  add_column_options(*app, options->common, ColumnNeed::required);
  app->add_option("--at", options->at,
                  "Times in min, separated by commas; default: 0 and the class times that are "
                  "followed")
      ->type_name("MIN,...");
  app->add_flag("--interaction", options->interaction,
                "The section's N-M diagrams instead, in kN and kNm, about both axes");
  add_result_options(*app, options->common);
  return {app, [options] { return run_capacity(*options); }};
}

}  // namespace ringward::cli
