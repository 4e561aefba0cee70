#include <CLI/CLI.hpp>
#include <algorithm>
#include <memory>

#include "cli/commands/command.hpp"
#include "cli/commands/common_options.hpp"
#include "cli/commands/usage_error.hpp"
#include "cli/evidence/case_reading.hpp"
#include "cli/evidence/evidence_run.hpp"
#include "cli/output/evidence_report.hpp"

namespace ringward::cli {
namespace {

struct EvidenceOptions {
  CommonOptions common;
  std::string only;
  bool markdown = false;
};

std::string group_list() {
  std::string list;
  for (const std::string& group : evidence_groups()) {
    list += (list.empty() ? "\"" : ", \"") + group + "\"";
  }
  return list;
}

std::vector<EvidenceCase> chosen_cases(const std::string& only) {
  const std::vector<std::string>& groups = evidence_groups();
  if (!only.empty() && std::find(groups.begin(), groups.end(), only) == groups.end()) {
    throw UsageError("--only: no group \"" + only + "\"; the groups are " + group_list());
  }
  std::vector<EvidenceCase> cases = built_in_cases();
  std::erase_if(cases, [&](const EvidenceCase& one) { return !only.empty() && one.group != only; });
  return cases;
}

std::vector<CheckResult> rerun(const std::vector<EvidenceCase>& cases) {
  const ProgressLine progress("rerunning the published checks");
  return run_cases(cases);
}

ExitCode run_evidence(const EvidenceOptions& options) {
  const std::vector<EvidenceCase> cases = chosen_cases(options.only);
  check_targets(options.common, {});
  const std::vector<CheckResult> results = rerun(cases);
  deliver(options.common, {.text =
                               [&](const Style& style) {
                                 return options.markdown ? evidence_markdown(results)
                                                         : evidence_text(results, style);
                               },
                           .json = [&] { return evidence_json(results); },
                           .csv = [&] { return evidence_csv(results); },
                           .files = {}});
  return all_as_expected(results) ? ExitCode::ok : ExitCode::not_met;
}

}  // namespace

Command add_evidence(CLI::App& root) {
  const auto options = std::make_shared<EvidenceOptions>();
  CLI::App* app = root.add_subcommand(
      "evidence", "Reruns the built-in published checks: expected, computed, tolerance, source");
  app->add_option("--only", options->only, "One group: " + group_list())->type_name("GROUP");
  app->add_flag("--markdown", options->markdown, "The result as Markdown");
  add_result_options(*app, options->common);
  app->footer(
      "Exit status: 0 when everything that should pass does, 1 otherwise. A gap is shown with its\n"
      "reason; a known gap is not expected to pass.");
  return {app, [options] { return run_evidence(*options); }};
}

}  // namespace ringward::cli
