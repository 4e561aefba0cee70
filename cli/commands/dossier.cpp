#include <CLI/CLI.hpp>
#include <memory>

#include "cli/commands/command.hpp"
#include "cli/commands/common_options.hpp"
#include "cli/dossier/dossier_page.hpp"
#include "cli/dossier/pdf.hpp"
#include "cli/output/rate_words.hpp"
#include "thermal/base/error.hpp"

namespace ringward::cli {
namespace {

struct DossierOptions {
  CommonOptions common;
  std::string html;
  std::string pdf;
};

DossierData computed(const CommonOptions& options) {
  const ProgressLine progress("computing the dossier");
  return dossier_data(load_source(options.column), options.overrides);
}

std::string printed(const std::string& html) {
  const ProgressLine progress("printing to PDF");
  return pdf_of(html);
}

std::string summary(const DossierData& data, const DossierOptions& options, const Style& style) {
  std::string text = style.bold(data.report.input.title) + "\n";
  text += "  Fire resistance   " + resistance_words(data.report, style) + "\n";
  text += "  Required          " + requirement_words(data.report.verdict, style) + "\n";
  text += "  Written           " + options.html;
  return text + (options.pdf.empty() ? "" : " and " + options.pdf) + "\n";
}

ExitCode run_dossier(const DossierOptions& options) {
  std::vector<std::string> targets{options.html};
  if (!options.pdf.empty()) targets.push_back(options.pdf);
  check_targets(options.common, targets);
  const DossierData data = computed(options.common);
  const std::string html = dossier_html(data);
  // First, so that a missing printer does not take the page with it.
  write_files({{options.html, html}});
  if (!options.pdf.empty()) {
    try {
      write_files({{options.pdf, printed(html)}});
    } catch (const Error& problem) {
      throw Error(problem.kind(), std::string(problem.what()) + "; the page is in " + options.html);
    }
  }
  deliver(options.common,
          {.text = [&](const Style& style) { return summary(data, options, style); },
           .json = [&] { return rate_json(data.report); },
           .csv = [&] { return rate_csv(data.report); },
           .files = {}});
  return data.report.verdict.met.value_or(true) ? ExitCode::ok : ExitCode::not_met;
}

}  // namespace

Command add_dossier(CLI::App& root) {
  const auto options = std::make_shared<DossierOptions>();
  CLI::App* app =
      root.add_subcommand("dossier", "The submission for code review as one page, and as PDF");
  add_column_options(*app, options->common, ColumnNeed::required);
  app->add_option("-o,--output", options->html, "The page: HTML, self-contained")
      ->required()
      ->type_name("FILE.html");
  app->add_option("--pdf", options->pdf, "The same on A4; needs WeasyPrint")->type_name("FILE.pdf");
  add_result_options(*app, options->common);
  app->footer(
      "Project, element, author, checker, revision, date and authority come from the table\n"
      "[submission] of the column file. --json and --csv give the rating, as \"rate\" does.\n"
      "Exit status 1 when rating.required_min is not met; 5 when no PDF could be made (the page "
      "is\n"
      "kept).");
  return {app, [options] { return run_dossier(*options); }};
}

}  // namespace ringward::cli
