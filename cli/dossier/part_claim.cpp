#include <fmt/format.h>

#include "cli/dossier/dossier_writer.hpp"
#include "cli/output/cautions.hpp"
#include "cli/output/numbers.hpp"
#include "cli/output/rate_words.hpp"

namespace ringward::cli {
namespace {

Markup particular(const DossierData& data, const std::string& key) {
  const auto found = data.report.input.submission.find(key);
  const bool given = found != data.report.input.submission.end() && !found->second.empty();
  return given ? Markup::text(found->second) : Markup::element("em", Markup::text("not given"));
}

std::string margin_words(const Verdict& verdict) {
  if (!verdict.required_min) return "nothing is required";
  const double margin_min = verdict.assessed_min - *verdict.required_min;
  const std::string words = tenths_down(std::abs(margin_min)) + " min";
  if (verdict.survives()) return "at least " + words + ": the fire was followed no longer";
  return (margin_min < 0 ? "missed by " : "") + words +
         ", the numerical uncertainty taken off the fire resistance";
}

Markup headline(const DossierData& data) {
  const Style plain(false);
  const RateReport& report = data.report;
  Markup words = Markup::element(
      "p", Markup::element(
               "strong", Markup::text("Fire resistance " + resistance_words(report, plain) + ".")));
  words += Markup::element(
      "p", Markup::text("Class: " + class_words(report, plain) +
                        ". Required: " + requirement_words(report.verdict, plain) + "."));
  return words;
}

}  // namespace

void write_title(DossierWriter& writer) {
  const DossierData& data = writer.data;
  const std::string& title = data.report.input.title;
  writer.page.heading(1, title.empty() ? "Fire resistance of a column" : title);
  writer.page.paragraph("Calculated fire resistance of one column, submitted for review");
  std::vector<std::pair<std::string, Markup>> pairs;
  for (const auto& [key, name] :
       std::initializer_list<std::pair<const char*, const char*>>{{"project", "Project"},
                                                                  {"element", "Element"},
                                                                  {"author", "Author"},
                                                                  {"checker", "Checker"},
                                                                  {"revision", "Revision"},
                                                                  {"date", "Date"},
                                                                  {"authority", "Authority"}}) {
    pairs.emplace_back(name, particular(data, key));
  }
  pairs.emplace_back("Program", Markup::text("Ringward " RINGWARD_VERSION));
  pairs.emplace_back("SHA-256 of the input",
                     Markup::element("code", Markup::text(data.report.input.input_sha256)));
  writer.page.pairs(pairs);
  writer.page.contents();
}

void write_claim(DossierWriter& writer) {
  const RateReport& report = writer.data.report;
  HtmlPage& page = writer.page;
  writer.part("What is claimed");
  page.boxed(headline(writer.data));
  std::vector<std::pair<std::string, Markup>> pairs{
      {"Margin", Markup::text(margin_words(report.verdict))},
      {"Numerical uncertainty",
       Markup::text(tenths_up(report.verdict.uncertainty_min) +
                    " min (grid and time step; not the error of the models)")},
      {"Confinement band", Markup::text(band_words(report))},
      {"Governs", Markup::text(report.rating.chosen.criterion)}};
  if (!report.rating.chosen.events.empty()) {
    pairs.emplace_back("Tube under load", Markup::text(event_words(report.rating.chosen.events)));
  }
  pairs.emplace_back("Fire", Markup::text(report.input.curve->name()));
  page.pairs(pairs);
  page.heading(3, "Before anyone relies on this");
  page.list(standing_caution_sentences(CautionForm::full));
  std::vector<std::string> cautions;
  for (const Notice& notice : ordered_notices(report.notices)) {
    if (notice.severity == Severity::caution) cautions.push_back(notice.text);
  }
  if (cautions.empty()) return;
  page.heading(3, "Cautions that belong to this column");
  page.list(cautions);
}

}  // namespace ringward::cli
