#include <CLI/CLI.hpp>
#include <algorithm>
#include <cmath>
#include <memory>

#include "cli/commands/command.hpp"
#include "cli/commands/common_options.hpp"
#include "cli/commands/option_values.hpp"
#include "cli/commands/usage_error.hpp"
#include "cli/input/reader.hpp"
#include "cli/output/gas_report.hpp"
#include "cli/output/numbers.hpp"
#include "fires/fire_curve.hpp"
#include "thermal/base/error.hpp"
#include "thermal/base/units.hpp"

namespace ringward::cli {
namespace {

constexpr double kDefaultUntil_min = 240;
constexpr double kDefaultStep_min = 5;
constexpr double kMostRows = 100000;

struct GasOptions {
  CommonOptions common;
  std::string curve;
  std::string until;
  std::string step;
};

struct TimeGrid {
  std::optional<double> until_s;
  double step_s = units::s_from_min(kDefaultStep_min);
};

TimeGrid time_grid_of(const GasOptions& options) {
  if (options.common.column.empty() == options.curve.empty()) {
    throw UsageError("name either a column file or a curve with --curve");
  }
  if (!options.curve.empty() && !options.common.overrides.empty()) {
    throw UsageError("--set changes a column file; --curve has no keys to set");
  }
  TimeGrid grid;
  if (!options.until.empty()) {
    grid.until_s = units::s_from_min(number_option("--until", options.until));
  }
  if (!options.step.empty()) grid.step_s = units::s_from_min(number_option("--step", options.step));
  if (grid.until_s.value_or(0.0) < 0) throw UsageError("--until: must not be negative, in min");
  if (grid.step_s <= 0) throw UsageError("--step: must be above 0 min");
  return grid;
}

std::vector<GasPoint> points_of(const fires::FireCurve& curve, double until_s, double step_s) {
  if (until_s / step_s > kMostRows) {
    throw UsageError("--step: more than 100000 rows; choose a longer step");
  }
  // A last step that is whole up to rounding is not taken twice.
  const auto steps = static_cast<int>(std::ceil(until_s / step_s - 1e-9));
  std::vector<GasPoint> points;
  for (int k = 0; k <= steps; ++k) {
    const double t_s = k == steps ? until_s : k * step_s;
    points.push_back({t_s, curve.gas_C(t_s)});
  }
  return points;
}

std::string curve_list() {
  std::string list;
  for (const std::string& name : fires::nominal_curve_names()) {
    list += (list.empty() ? "" : ", ") + name;
  }
  return list;
}

GasReport for_curve(const GasOptions& options, const TimeGrid& grid) {
  const std::vector<std::string> known = fires::nominal_curve_names();
  if (std::find(known.begin(), known.end(), options.curve) == known.end()) {
    throw UsageError("--curve: no curve \"" + options.curve + "\"; known: " + curve_list() +
                     "; parametric, table and constant fires need a column file");
  }
  const fires::FireCurvePtr curve = fires::nominal_curve(options.curve);
  const double until_s = grid.until_s.value_or(units::s_from_min(kDefaultUntil_min));
  return {.title = "Nominal fire curve",
          .fire = curve->name(),
          .points = points_of(*curve, until_s, grid.step_s),
          .notices = curve->notices()};
}

GasReport for_column(const GasOptions& options, const TimeGrid& grid) {
  const ColumnInput input = read_column_file(options.common.column, options.common.overrides);
  const double until_s = grid.until_s.value_or(input.fire.duration_s);
  if (until_s > input.fire.duration_s) {
    throw Error(ErrorKind::bad_input,
                "--until " + shortest(units::min_from_s(until_s)) + ": the fire is followed to " +
                    shortest(rounded(units::min_from_s(input.fire.duration_s), kDigitsMinutes)) +
                    " min (fire.duration_min); choose a time within, or follow it longer");
  }
  return {.title = input.title,
          .fire = input.curve->name(),
          .points = points_of(*input.curve, until_s, grid.step_s),
          .notices = input.curve->notices()};
}

ExitCode run_gas(const GasOptions& options) {
  const TimeGrid grid = time_grid_of(options);
  check_targets(options.common, {});
  const GasReport report =
      options.curve.empty() ? for_column(options, grid) : for_curve(options, grid);
  deliver(options.common, {.text = [&](const Style& style) { return gas_text(report, style); },
                           .json = [&] { return gas_json(report); },
                           .csv = [&] { return gas_csv(report); },
                           .files = {}});
  return ExitCode::ok;
}

}  // namespace

Command add_gas(CLI::App& root) {
  const auto options = std::make_shared<GasOptions>();
  CLI::App* app = root.add_subcommand("gas", "Gas temperature in deg C that a column sees");
  add_column_options(*app, options->common, ColumnNeed::optional);
  app->add_option("--curve", options->curve, "A curve instead of a column: " + curve_list())
      ->type_name("NAME");
  app->add_option("--until", options->until,
                  "Last time in min; default: the followed time, for a curve 240")
      ->type_name("MIN");
  app->add_option("--step", options->step, "Time step in min; default 5")->type_name("MIN");
  add_result_options(*app, options->common);
  app->footer("--csv: time_min,temperature_C.");
  return {app, [options] { return run_gas(*options); }};
}

}  // namespace ringward::cli
