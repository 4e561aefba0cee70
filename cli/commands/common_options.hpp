#pragma once

#include <functional>
#include <string>
#include <vector>

#include "cli/output/output_files.hpp"
#include "cli/terminal.hpp"

namespace CLI {
class App;
}

namespace ringward::cli {

/// What every command that calculates takes.
struct CommonOptions {
  std::string column;                  ///< file, "-" for standard input
  std::vector<std::string> overrides;  ///< KEY=VALUE
  std::string json;                    ///< file, "-" for standard output, empty for none
  std::string csv;
  bool quiet = false;
  bool no_color = false;
};

/// Where the column file is named: always, or only where nothing else is asked for.
enum class ColumnNeed { required, optional };

void add_column_options(CLI::App& app, CommonOptions& options, ColumnNeed need);
/// `--set` alone, for a command whose first argument is no column file.
void add_set_option(CLI::App& app, CommonOptions& options);
void add_result_options(CLI::App& app, CommonOptions& options);

/// The forms a result can take; only those asked for are made.
struct Result {
  std::function<std::string(const Style&)> text;
  std::function<std::string()> json;
  std::function<std::string()> csv;
  std::vector<OutputFile> files;  ///< further ones that the command was asked for
};

/// Early complaints about targets, before any calculation.
/// @param others further files that the command was asked for
/// @throws UsageError for two results in one place, or one that would overwrite the input
/// @throws Error(cannot_write) for a target that could not be written
void check_targets(const CommonOptions& options, const std::vector<std::string>& others);

/// Writes the files, and to standard output what belongs there.
/// @throws Error(cannot_write), BrokenPipe
void deliver(const CommonOptions& options, const Result& result);

}  // namespace ringward::cli
