#include <CLI/CLI.hpp>
#include <memory>

#include "cli/commands/command.hpp"
#include "cli/commands/common_options.hpp"
#include "cli/commands/option_values.hpp"
#include "cli/commands/usage_error.hpp"
#include "cli/study/size_report.hpp"

namespace ringward::cli {
namespace {

struct SizeOptions {
  CommonOptions common;
  std::string key;
  std::string between;
  std::string required;
  std::string step;
  std::string write;
};

SizeBracket bracket_of(const SizeOptions& options) {
  const std::size_t comma = options.between.find(',');
  if (comma == std::string::npos) throw UsageError("--between takes two numbers: A,B");
  const double a = number_option("--between", options.between.substr(0, comma));
  const double b = number_option("--between", options.between.substr(comma + 1));
  if (a == b) throw UsageError("--between: the two ends are the same");
  const KeySpec& spec = varied_key(options.key);
  SizeBracket bracket{std::min(a, b), std::max(a, b), 1.0};
  bracket.step = options.step.empty() ? default_step(spec, bracket.low, bracket.high)
                                      : number_option("--step", options.step);
  if (!(bracket.step > 0)) throw UsageError("--step must be above 0");
  if (bracket.step > bracket.high - bracket.low) {
    throw UsageError("--step is wider than the bracket");
  }
  return bracket;
}

std::vector<std::string> files_of(const SizeOptions& options) {
  if (options.write.empty()) return {};
  if (options.write == "-") throw UsageError("--write takes the name of a file");
  return {options.write};
}

SizeQuestion question_of(const SizeOptions& options) {
  SizeQuestion question{.source = {},
                        .overrides = options.common.overrides,
                        .key = options.key,
                        .bracket = bracket_of(options),
                        .required_min = {}};
  if (!options.required.empty()) question.required_min = number_option("--for", options.required);
  check_targets(options.common, files_of(options));
  question.source = load_source(options.common.column);
  return question;
}

SizeReport sized(SizedColumn& column) {
  ProgressLine progress("sizing");
  std::size_t count = 0;
  const auto rate = [&](double value) {
    progress.show("sizing: rating " + std::to_string(++count));
    return column.rate(value);
  };
  return {.title = column.title(),
          .key = column.question().key,
          .unit = column.unit(),
          .bracket = column.question().bracket,
          .required_min = column.required_min(),
          .result = find_size(column.question().bracket, rate)};
}

ExitCode run_size(const SizeOptions& options) {
  SizedColumn column(question_of(options));
  const SizeReport report = sized(column);
  Result result{.text = [&](const Style& style) { return size_text(report, style); },
                .json = [&] { return size_json(report); },
                .csv = [&] { return size_csv(report); },
                .files = {}};
  const SizeTrial* chosen = report.chosen();
  if (!options.write.empty() && chosen != nullptr) {
    result.files.push_back({options.write, column.file_text(chosen->value)});
  }
  deliver(options.common, result);
  return chosen != nullptr ? ExitCode::ok : ExitCode::not_met;
}

}  // namespace

Command add_size(CLI::App& root) {
  const auto options = std::make_shared<SizeOptions>();
  CLI::App* app = root.add_subcommand(
      "size", "The smallest (or largest) value of one input key that meets the required rating");
  add_column_options(*app, options->common, ColumnNeed::required);
  app->add_option("--vary", options->key, "Input key, e.g. protection.thickness_mm, load.axial_kN")
      ->type_name("KEY")
      ->required();
  app->add_option("--between", options->between, "The two ends of what may come out")
      ->type_name("A,B")
      ->required();
  app->add_option("--for", options->required,
                  "Required fire resistance in min; default: rating.required_min")
      ->type_name("MIN");
  app->add_option("--step", options->step,
                  "Round to multiples of this, to the safe side; default: a power of ten, at most "
                  "a fiftieth of the bracket")
      ->type_name("S");
  app->add_option("--write", options->write, "Write the sized column file")->type_name("FILE.toml");
  add_result_options(*app, options->common);
  app->footer("Exit status 1 when nothing in the bracket meets what is required.");
  return {app, [options] { return run_size(*options); }};
}

}  // namespace ringward::cli
