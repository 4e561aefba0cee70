#include "cli/commands/common_options.hpp"

#include <CLI/CLI.hpp>
#include <filesystem>
#include <set>

#include "cli/commands/usage_error.hpp"

namespace ringward::cli {
namespace {

constexpr const char* kStdout = "-";

// A path that differs only in spelling is the same place.
std::string place(const std::string& path) {
  std::error_code failed;
  const std::filesystem::path known = std::filesystem::weakly_canonical(path, failed);
  return failed ? path : known.string();
}

std::vector<std::string> named_files(const CommonOptions& options,
                                     const std::vector<std::string>& others) {
  std::vector<std::string> files;
  for (const std::string& file : {options.json, options.csv}) {
    if (!file.empty() && file != kStdout) files.push_back(file);
  }
  files.insert(files.end(), others.begin(), others.end());
  return files;
}

void check_overwriting(const CommonOptions& options, const std::vector<std::string>& files) {
  std::set<std::string> places;
  for (const std::string& file : files) {
    if (!places.insert(place(file)).second) {
      throw UsageError("two results cannot both go to " + file);
    }
    const bool reads_file = !options.column.empty() && options.column != "-";
    if (reads_file && place(file) == place(options.column)) {
      throw UsageError("the result would overwrite the column file " + file);
    }
  }
}

std::string text_for_stdout(const CommonOptions& options, const Result& result) {
  if (options.json == kStdout) return result.json();
  if (options.csv == kStdout) return result.csv();
  return options.quiet ? "" : result.text(stdout_style(options.no_color));
}

}  // namespace

void add_column_options(CLI::App& app, CommonOptions& options, ColumnNeed need) {
  CLI::Option* column =
      app.add_option("COLUMN.toml", options.column, "Column file; - reads standard input");
  column->type_name("");
  if (need == ColumnNeed::required) column->required();
  add_set_option(app, options);
}

void add_set_option(CLI::App& app, CommonOptions& options) {
  app.add_option("--set", options.overrides,
                 "Override one input key, in TOML: tube.thickness_mm=6 or bars[0].axis_mm=50; "
                 "repeatable")
      ->type_name("KEY=VALUE")
      ->allow_extra_args(false);
}

void add_result_options(CLI::App& app, CommonOptions& options) {
  app.add_option("--json", options.json, "Write the result as JSON; - for standard output")
      ->type_name("FILE");
  app.add_option("--csv", options.csv, "Write the table as CSV; - for standard output")
      ->type_name("FILE");
  app.add_flag("--quiet", options.quiet, "No text for a person; files and JSON are still written");
  app.add_flag("--no-color", options.no_color, "No colour, also with NO_COLOR set");
}

void check_targets(const CommonOptions& options, const std::vector<std::string>& others) {
  if (options.json == kStdout && options.csv == kStdout) {
    throw UsageError("--json - and --csv - cannot both go to standard output");
  }
  const std::vector<std::string> files = named_files(options, others);
  check_overwriting(options, files);
  for (const std::string& file : files) require_writable(file);
}

void deliver(const CommonOptions& options, const Result& result) {
  std::vector<OutputFile> files = result.files;
  if (!options.json.empty() && options.json != kStdout) {
    files.push_back({options.json, result.json()});
  }
  if (!options.csv.empty() && options.csv != kStdout) files.push_back({options.csv, result.csv()});
  const std::string text = text_for_stdout(options, result);
  try {
    write_files(files);
  } catch (...) {
    // The calculation may have been long; a file that fails must not take the text with it.
    write_stdout(text);
    throw;
  }
  write_stdout(text);
}

}  // namespace ringward::cli
