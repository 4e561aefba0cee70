#include <CLI/CLI.hpp>
#include <filesystem>
#include <memory>

#include "cli/commands/command.hpp"
#include "cli/commands/common_options.hpp"
#include "cli/commands/usage_error.hpp"
#include "cli/study/compare_report.hpp"
#include "cli/study/compare_run.hpp"

namespace ringward::cli {
namespace {

struct CompareOptions {
  CommonOptions common;  ///< `column` is the study file
  std::string folder;
  std::size_t jobs = 0;
  std::string resume;
};

Resume resume_of(const std::string& word) {
  if (word.empty()) return Resume::no;
  if (word == "yes") return Resume::yes;
  if (word == "force") return Resume::force;
  throw UsageError("--resume takes no value, or force: --resume=force");
}

ExitCode run_compare(const CompareOptions& options) {
  const Resume resume = resume_of(options.resume);
  check_targets(options.common, {});
  const Study study = read_study(options.common.column, options.common.overrides);
  const ComparedStudy compared = compare_layouts(study, options.folder, resume, options.jobs);
  const RankedStudy& ranked = compared.ranked;
  if (!compared.lacks_pictures.empty()) {
    write_stderr("ringward: compare.html: " + compared.lacks_pictures + "\n");
  }
  deliver(options.common,
          {.text = [&](const Style& style) { return compare_text(ranked, options.folder, style); },
           .json = [&] { return compare_json(ranked); },
           .csv = [&] { return compare_csv(ranked); },
           .files = {}});
  return ranked.has_unsolved() ? ExitCode::no_solution : ExitCode::ok;
}

}  // namespace

Command add_compare(CLI::App& root) {
  const auto options = std::make_shared<CompareOptions>();
  CLI::App* app =
      root.add_subcommand("compare", "Rate many layouts of a column, rank them, draw trade-offs");
  app->add_option("STUDY.toml", options->common.column, "Study file; see docs/compare.md")
      ->type_name("")
      ->required();
  app->add_option("-o,--output", options->folder,
                  "Folder for results.jsonl, summary.csv and compare.html; made if it is not there")
      ->type_name("DIR")
      ->required();
  app->add_option("--jobs", options->jobs, "Threads; default: all cores. Changes no result")
      ->type_name("N")
      ->check(CLI::Range(1, 1024));
  app->add_flag("--resume{yes}", options->resume,
                "Go on with an interrupted study; --resume=force also after a change of study or "
                "program, keeping the layouts whose input is the same");
  add_set_option(*app, options->common);
  add_result_options(*app, options->common);
  app->footer(
      "Exit status 4 when some layouts have no solution; the study is complete all the same.");
  return {app, [options] { return run_compare(*options); }};
}

}  // namespace ringward::cli
