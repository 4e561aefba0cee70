#include "cli/study/compare_report.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <nlohmann/json.hpp>

#include "cli/output/cautions.hpp"
#include "cli/output/csv.hpp"
#include "cli/output/input_echo.hpp"
#include "cli/output/json_number.hpp"
#include "cli/output/numbers.hpp"
#include "cli/output/text_table.hpp"
#include "cli/study/layout_row_json.hpp"

namespace ringward::cli {
namespace {

using nlohmann::ordered_json;

constexpr std::size_t kShownLayouts = 20;

/// Names of one width stand flush left in the last column.
std::string padded(const RankedStudy& study, const std::string& name) {
  std::size_t width = 0;
  for (std::size_t rank = 0; rank < std::min(kShownLayouts, study.rows.size()); ++rank) {
    width = std::max(width, study.ranked(rank).name.size());
  }
  return fmt::format("{:<{}}", name, width);
}

std::vector<std::string> table_row(const RankedStudy& study, std::size_t rank) {
  const LayoutRow& row = study.ranked(rank);
  return {fmt::format("{}{}", rank + 1, study.undominated[study.order[rank]] ? "*" : " "),
          resistance_words(row),
          row.verdict && !row.verdict->survives() ? tenths_up(row.verdict->uncertainty_min) : "-",
          class_words(row),
          margin_words(row.margin_min()),
          fixed(row.utilisation_at_required, 2),
          fixed(row.amounts.steel_kg_m(), 1),
          fixed(row.amounts.concrete_m3_m, 3),
          row.protection_mm > 0 ? fixed(row.protection_mm, 1) : "-",
          padded(study, row.name)};
}

std::string ranked_table(const RankedStudy& study) {
  TextTable table({{"rank", "", 0},
                   {"fire res.", "min", 1},
                   {"+/-", "min", 1},
                   {"class", "", 0},
                   {"margin", "min", 1},
                   {"use", "-", 2},
                   {"steel", "kg/m", 1},
                   {"concrete", "m3/m", 3},
                   {"prot.", "mm", 1},
                   {padded(study, "layout"), "", 0}});
  for (std::size_t rank = 0; rank < std::min(kShownLayouts, study.rows.size()); ++rank) {
    table.add_cells(table_row(study, rank));
  }
  return table.text();
}

std::string unsolved(const RankedStudy& study, const Style& style) {
  std::string text;
  for (const LayoutRow& row : study.rows) {
    if (row.verdict) continue;
    text += "  " + style.bad("no solution") + "  " + row.name + ": " + row.reason + "\n";
  }
  return text.empty() ? "" : text + "\n";
}

Notices told_once(const RankedStudy& study) {
  Notices notices;
  for (const SharedCaution& shared : shared_cautions(study)) {
    Notice notice = shared.notice;
    notice.text = fmt::format("{} of {} layouts, e.g. {}: {}", shared.count, study.rows.size(),
                              shared.first_layout, notice.text);
    notices.push_back(std::move(notice));
  }
  return notices;
}

std::string csv_value(const InputValue& value) {
  if (const auto* number = std::get_if<double>(&value)) return shortest(*number);
  if (const auto* text = std::get_if<std::string>(&value)) return *text;
  if (std::holds_alternative<std::monostate>(value)) return "";
  return input_echo({{"value", value, true}}).at("value").dump();
}

}  // namespace

std::string class_words(const LayoutRow& row) {
  if (!row.verdict || !row.verdict->class_min) return "-";
  return *row.verdict->class_min == 0 ? "< R 15" : fmt::format("R {}", *row.verdict->class_min);
}

std::string margin_words(const std::optional<double>& margin_min) {
  if (!margin_min) return "-";
  return (*margin_min < 0 ? "" : "+") + tenths_down(*margin_min);
}

std::string resistance_words(const LayoutRow& row) {
  if (!row.verdict) return "no solution";
  if (row.verdict->survives()) return "above " + tenths_down(row.verdict->assessed_min);
  return tenths_down(*row.verdict->fire_resistance_min);
}

std::vector<SharedCaution> shared_cautions(const RankedStudy& study) {
  std::vector<SharedCaution> all;
  for (const LayoutRow& row : study.rows) {
    for (const Notice& caution : row.cautions) {
      const auto known = std::find_if(all.begin(), all.end(), [&](const SharedCaution& shared) {
        return shared.notice.code == caution.code;
      });
      if (known == all.end()) {
        all.push_back({caution, row.name, 1});
      } else {
        ++known->count;
      }
    }
  }
  return all;
}

std::string compare_text(const RankedStudy& study, const std::string& folder, const Style& style) {
  std::string text = style.bold(study.title) + "\n\n";
  text += ranked_table(study);
  text +=
      "  *: no other layout lasts as long with as little steel; use: load over resistance at "
      "the required time\n";
  if (study.rows.size() > kShownLayouts) {
    text += fmt::format("  {} more in {}/compare.html and summary.csv\n",
                        study.rows.size() - kShownLayouts, folder);
  }
  text += "\n" + unsolved(study, style) + notices_text(told_once(study), style);
  return text + standing_cautions(CautionForm::full, style);
}

std::string compare_json(const RankedStudy& study) {
  ordered_json document{{"schema", "ringward-compare/1"},
                        {"program", {{"name", "ringward"}, {"version", RINGWARD_VERSION}}},
                        {"title", study.title},
                        {"study_sha256", study.study_sha256},
                        {"layouts", ordered_json::array()}};
  if (!study.kept_from.empty()) document["kept_from_version"] = study.kept_from;
  std::vector<std::size_t> rank(study.rows.size());
  for (std::size_t place = 0; place < study.order.size(); ++place) {
    rank[study.order[place]] = place + 1;
  }
  for (std::size_t i = 0; i < study.rows.size(); ++i) {
    ordered_json row = row_json(study.rows[i]);
    row["rank"] = rank[i];
    row["undominated"] = static_cast<bool>(study.undominated[i]);
    document["layouts"].push_back(std::move(row));
  }
  return json_text(document);
}

std::string compare_csv(const RankedStudy& study) {
  const std::vector<std::string> numbers{"fire_resistance_min", "uncertainty_min",
                                         "assessed_min",        "class_min",
                                         "required_min",        "met",
                                         "margin_min",          "utilisation_at_required",
                                         "steel_kg_m",          "tube_kg_m",
                                         "bars_kg_m",           "shape_kg_m",
                                         "concrete_m3_m",       "protection_mm"};
  std::vector<std::string> header{"layout", "name", "outcome"};
  header.insert(header.end(), numbers.begin(), numbers.end());
  header.insert(header.end(), {"criterion", "undominated"});
  if (!study.rows.empty()) {
    for (const EchoEntry& entry : study.rows.front().values) header.push_back(entry.key);
  }
  header.insert(header.end(), {"reason", "cautions"});
  CsvTable table(header);
  for (std::size_t i = 0; i < study.rows.size(); ++i) {
    const LayoutRow& row = study.rows[i];
    const ordered_json line = row_json(row);
    std::vector<std::string> cells{std::to_string(row.index + 1), row.name, outcome_word(row)};
    for (const std::string& key : numbers) {
      cells.push_back(line.at(key).is_null() ? "" : line.at(key).dump());
    }
    cells.push_back(row.criterion);
    cells.push_back(study.undominated[i] ? "true" : "false");
    for (const EchoEntry& entry : row.values) cells.push_back(csv_value(entry.value));
    cells.push_back(row.reason);
    std::string codes;
    for (const Notice& caution : row.cautions) codes += (codes.empty() ? "" : " ") + caution.code;
    cells.push_back(codes);
    table.add(cells);
  }
  return table.text();
}

}  // namespace ringward::cli
