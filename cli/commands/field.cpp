#include <CLI/CLI.hpp>
#include <memory>

#include "cli/commands/command.hpp"
#include "cli/commands/common_options.hpp"
#include "cli/commands/option_values.hpp"
#include "cli/commands/usage_error.hpp"
#include "cli/input/reader.hpp"
#include "cli/output/field_report.hpp"
#include "cli/output/section_picture.hpp"
#include "cli/output/vtk.hpp"

namespace ringward::cli {
namespace {

struct FieldOptions {
  CommonOptions common;
  std::string at;
  std::vector<std::string> probes;
  std::string vtk;
  std::string picture;
};

struct FieldRequest {
  std::vector<double> times_s;
  std::vector<thermal::Point> probes;
};

FieldRequest request_of(const FieldOptions& options) {
  FieldRequest request;
  if (!options.at.empty()) request.times_s = times_option("--at", options.at);
  for (const std::string& probe : options.probes) {
    request.probes.push_back(point_option("--probe", probe));
  }
  if (!options.common.csv.empty() && request.probes.empty()) {
    throw UsageError("--csv lists probes: name at least one with --probe X,Y");
  }
  return request;
}

void check_field_targets(const FieldOptions& options) {
  std::vector<std::string> others;
  if (!options.picture.empty()) others.push_back(options.picture);
  check_targets(options.common, others);
}

std::vector<OutputFile> pictures(const FieldOptions& options, const ColumnInput& input,
                                 const thermal::TemperatureHistory& history, const Field& field) {
  std::vector<OutputFile> files;
  if (!options.vtk.empty()) {
    create_folder(options.vtk);
    files = vtk_files(history.grid(), field.states, options.vtk);
  }
  if (!options.picture.empty()) {
    const PictureSubject subject{.title = input.title,
                                 .fire = input.curve->name(),
                                 .section = &input.column.section,
                                 .exposed = &input.fire.exposed};
    files.push_back({options.picture, section_picture(subject, history, field.states)});
  }
  return files;
}

thermal::TemperatureHistory solved(const ColumnInput& input) {
  const ProgressLine progress("solving the heat flow");
  return thermal::solve_heat_flow(input.column.section, input.fire,
                                  {.accuracy = input.accuracy, .scale = 1.0});
}

ExitCode run_field(const FieldOptions& options) {
  FieldRequest request = request_of(options);
  check_field_targets(options);
  const ColumnInput input = read_column_file(options.common.column, options.common.overrides);
  if (request.times_s.empty()) request.times_s = default_times_s(input.fire.duration_s, false);
  require_followed(request.times_s, input.fire.duration_s);
  const thermal::TemperatureHistory history = solved(input);
  FieldReport report{
      .title = input.title,
      .fire = input.curve->name(),
      .section = input.column.section,
      .field = field_of(input.column.section, history, request.times_s, request.probes),
      .notices = input.notices};
  report.notices.insert(report.notices.end(), history.notices().begin(), history.notices().end());
  deliver(options.common, {.text = [&](const Style& style) { return field_text(report, style); },
                           .json = [&] { return field_json(report); },
                           .csv = [&] { return field_csv(report); },
                           .files = pictures(options, input, history, report.field)});
  return ExitCode::ok;
}

}  // namespace

Command add_field(CLI::App& root) {
  const auto options = std::make_shared<FieldOptions>();
  CLI::App* app = root.add_subcommand("field", "Temperatures of the section in deg C");
  add_column_options(*app, options->common, ColumnNeed::required);
  app->add_option("--at", options->at,
                  "Times in min, separated by commas; default: the class times that are followed")
      ->type_name("MIN,...");
  app->add_option("--probe", options->probes,
                  "A point in mm from the centroid, x to the right, y up; repeatable")
      ->type_name("X,Y")
      ->allow_extra_args(false);
  app->add_option("--vtk", options->vtk,
                  "Write the whole section for ParaView into this folder: temperature.pvd and one "
                  "file a time, in mm and deg C")
      ->type_name("DIR");
  app->add_option("--picture", options->picture, "Draw the temperature field as an SVG picture")
      ->type_name("FILE.svg");
  add_result_options(*app, options->common);
  app->footer("--csv: time_min,x_mm,y_mm,temperature_C, one row a time and probe.");
  return {app, [options] { return run_field(*options); }};
}

}  // namespace ringward::cli
