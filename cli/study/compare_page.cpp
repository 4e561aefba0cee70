#include <fmt/format.h>

#include <algorithm>
#include <limits>
#include <map>

#include "cli/output/cautions.hpp"
#include "cli/output/numbers.hpp"
#include "cli/page/html_page.hpp"
#include "cli/study/compare_pictures.hpp"
#include "cli/study/compare_report.hpp"
#include "cli/study/layout_row_json.hpp"

namespace ringward::cli {
namespace {

std::string summary(const RankedStudy& study) {
  std::size_t met = 0;
  std::size_t judged = 0;
  std::size_t unsolved = 0;
  for (const LayoutRow& row : study.rows) {
    if (!row.verdict) ++unsolved;
    if (!row.verdict || !row.verdict->met) continue;
    ++judged;
    if (*row.verdict->met) ++met;
  }
  std::string text = fmt::format("{} layouts rated by ringward {}.", study.rows.size() - unsolved,
                                 RINGWARD_VERSION);
  if (judged > 0) text += fmt::format(" {} of them meet the required time.", met);
  if (unsolved > 0) text += fmt::format(" {} have no solution; their reasons are below.", unsolved);
  return text;
}

void add_cautions_box(HtmlPage& page, const RankedStudy& study) {
  Markup content;
  for (const std::string& sentence : standing_caution_sentences(CautionForm::full)) {
    content += Markup::element("p", Markup::text(sentence));
  }
  if (!study.kept_from.empty()) {
    content += Markup::element(
        "p", Markup::text("Some rows were kept by force from version " + study.kept_from +
                          " of the program, or from an earlier form of this study."));
  }
  page.boxed(content);
}

std::vector<HtmlTable::Column> table_columns(const RankedStudy& study) {
  using enum CellKind;
  std::vector<HtmlTable::Column> columns{
      {"Rank", "", number},      {"Layout", "", words},        {"Fire resistance", "min", number},
      {"Class", "", number},     {"Margin", "min", number},    {"Use", "", number},
      {"Steel", "kg/m", number}, {"Concrete", "m3/m", number}, {"Protection", "mm", number}};
  for (const std::string& key : study.varied) columns.push_back({key, "", number});
  return columns;
}

std::string value_words(const LayoutRow& row, const std::string& key) {
  for (const EchoEntry& entry : row.values) {
    if (entry.key != key) continue;
    if (const auto* number = std::get_if<double>(&entry.value)) return shortest(*number);
    if (const auto* text = std::get_if<std::string>(&entry.value)) return *text;
  }
  return "-";
}

std::vector<std::string> cells(const RankedStudy& study, std::size_t rank) {
  const LayoutRow& row = study.ranked(rank);
  const bool stands = row.verdict && row.verdict->survives();
  std::vector<std::string> cells{
      fmt::format("{}{}", study.undominated[study.order[rank]] ? "* " : "", rank + 1),
      row.name,
      resistance_words(row) +
          (row.verdict && !stands ? " \u00b1 " + tenths_up(row.verdict->uncertainty_min) : ""),
      class_words(row),
      margin_words(row.margin_min()),
      fixed(row.utilisation_at_required, 3),
      fixed(row.amounts.steel_kg_m(), 1),
      fixed(row.amounts.concrete_m3_m, 4),
      row.protection_mm > 0 ? shortest(row.protection_mm) : "-"};
  for (const std::string& key : study.varied) cells.push_back(value_words(row, key));
  return cells;
}

void add_ranking(HtmlPage& page, const RankedStudy& study) {
  page.heading(2, "Ranking");
  HtmlTable table("Layouts, the longest fire resistance less uncertainty first",
                  table_columns(study));
  for (std::size_t rank = 0; rank < study.rows.size(); ++rank) table.add(cells(study, rank));
  page.table(table);
  page.paragraph(
      "*: undominated, no other layout lasts as long with as little steel. Uncertainty is the "
      "numerical one (grid and time step), not that of the models. Margin: fire "
      "resistance less uncertainty, less the required time. Use: load over the resistance at the "
      "required time; none where the column has fallen before. Steel is tube, bars and embedded "
      "shape; concrete is the core.");
}

void add_unsolved(HtmlPage& page, const RankedStudy& study) {
  if (!study.has_unsolved()) return;
  page.heading(2, "Without a solution");
  HtmlTable table("Layouts that could not be solved", {{"Layout"}, {"Reason"}});
  for (const LayoutRow& row : study.rows) {
    if (!row.verdict) table.add(std::vector<std::string>{row.name, row.reason});
  }
  page.table(table);
}

std::vector<std::string> keys_with_words(const RankedStudy& study) {
  std::vector<std::string> keys;
  for (const std::string& key : study.varied) {
    const bool has_words =
        std::any_of(study.rows.begin(), study.rows.end(), [&](const LayoutRow& row) {
          return std::any_of(row.values.begin(), row.values.end(), [&](const EchoEntry& entry) {
            return entry.key == key && std::holds_alternative<std::string>(entry.value);
          });
        });
    if (has_words) keys.push_back(key);
  }
  return keys;
}

/// What a key that holds words makes of the fire resistance.
struct WordAnswers {
  std::size_t layouts = 0;
  double shortest_min = std::numeric_limits<double>::infinity();
  double longest_min = 0;
};

void add_word_table(HtmlPage& page, const RankedStudy& study, const std::string& key) {
  std::map<std::string, WordAnswers> answers;
  for (const LayoutRow& row : study.rows) {
    if (!row.verdict) continue;
    WordAnswers& of_value = answers[value_words(row, key)];
    ++of_value.layouts;
    of_value.shortest_min = std::min(of_value.shortest_min, row.verdict->assessed_min);
    of_value.longest_min = std::max(of_value.longest_min, row.verdict->assessed_min);
  }
  using enum CellKind;
  HtmlTable table("Fire resistance less uncertainty for each value of " + key,
                  {{key, "", words},
                   {"Layouts", "", number},
                   {"Shortest", "min", number},
                   {"Longest", "min", number}});
  for (const auto& [value, of_value] : answers) {
    table.add(std::vector<std::string>{value, std::to_string(of_value.layouts),
                                       tenths_down(of_value.shortest_min),
                                       tenths_down(of_value.longest_min)});
  }
  page.table(table);
}

/// @return why pictures are missing, empty when none is
std::string add_pictures(HtmlPage& page, const RankedStudy& study) {
  page.heading(2, "Trade-off");
  const CaptionedPicture trade_off = trade_off_picture(study);
  page.figure(trade_off.picture, trade_off.caption);
  std::string missing = trade_off.picture.why_missing;
  const std::vector<CaptionedPicture> pictures = key_pictures(study);
  const std::vector<std::string> with_words = keys_with_words(study);
  if (!pictures.empty() || !with_words.empty()) page.heading(2, "What moves the fire resistance");
  for (const CaptionedPicture& picture : pictures) page.figure(picture.picture, picture.caption);
  for (const std::string& key : with_words) add_word_table(page, study, key);
  return missing;
}

void add_shared_cautions(HtmlPage& page, const RankedStudy& study) {
  const std::vector<SharedCaution> cautions = shared_cautions(study);
  page.heading(2, "Cautions");
  HtmlTable table("Cautions of the ratings; figures are those of the layout named",
                  {{"Layouts", "", CellKind::number}, {"For example"}, {"Caution"}, {"Source"}});
  for (const SharedCaution& shared : cautions) {
    table.add(std::vector<std::string>{std::to_string(shared.count), shared.first_layout,
                                       shared.notice.text, shared.notice.source});
  }
  if (!table.is_empty()) page.table(table);
  page.paragraph(
      "ringward rate gives each layout's history, notes and the band of confinement models.");
}

}  // namespace

ComparePage compare_page(const RankedStudy& study) {
  const std::string title = study.title.empty() ? "Layouts compared" : study.title;
  HtmlPage page(title);
  page.heading(1, title);
  page.paragraph(summary(study));
  add_cautions_box(page, study);
  add_ranking(page, study);
  add_unsolved(page, study);
  const std::string missing = add_pictures(page, study);
  add_shared_cautions(page, study);
  page.paragraph("Study SHA-256: " + study.study_sha256);
  return {page.html(), missing};
}

}  // namespace ringward::cli
