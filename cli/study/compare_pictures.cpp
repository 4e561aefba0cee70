#include "cli/study/compare_pictures.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <cmath>

#include "cli/input/schema.hpp"
#include "cli/output/numbers.hpp"
#include "cli/pictures/line_picture.hpp"
#include "cli/pictures/scatter_picture.hpp"

namespace ringward::cli {
namespace {

constexpr const char* kResistance = "Fire resistance less uncertainty [min]";
constexpr std::size_t kMostLabels = 12;

std::size_t undominated_count(const RankedStudy& study) {
  return static_cast<std::size_t>(
      std::count(study.undominated.begin(), study.undominated.end(), true));
}

std::optional<double> number_at(const LayoutRow& row, const std::string& key) {
  for (const EchoEntry& entry : row.values) {
    const auto* number = std::get_if<double>(&entry.value);
    if (entry.key == key && number != nullptr) return *number;
  }
  return std::nullopt;
}

/// The required time where it is the same for all.
std::optional<double> common_requirement(const RankedStudy& study) {
  std::optional<double> common;
  for (const LayoutRow& row : study.rows) {
    if (!row.verdict) continue;
    if (!row.verdict->required_min) return std::nullopt;
    if (common && *common != *row.verdict->required_min) return std::nullopt;
    common = row.verdict->required_min;
  }
  return common;
}

struct Spread {
  std::vector<PicturePoint> met;
  std::vector<PicturePoint> not_met;
};

Spread spread_over(const RankedStudy& study, const std::string& key) {
  Spread spread;
  for (const LayoutRow& row : study.rows) {
    const std::optional<double> x = number_at(row, key);
    if (!x || !row.verdict) continue;
    auto& series = row.verdict->met.value_or(true) ? spread.met : spread.not_met;
    series.push_back({*x, row.verdict->assessed_min});
  }
  return spread;
}

std::vector<double> all_of(const Spread& spread, double PicturePoint::*part) {
  std::vector<double> all;
  for (const auto* series : {&spread.met, &spread.not_met}) {
    for (const PicturePoint& point : *series) all.push_back(point.*part);
  }
  return all;
}

std::string range_words(const Spread& spread) {
  const std::vector<double> all = all_of(spread, &PicturePoint::y);
  const auto [low, high] = std::minmax_element(all.begin(), all.end());
  return fmt::format("{} layouts, {} to {} min", all.size(), fixed(*low, 1), fixed(*high, 1));
}

/// Limits with room for markers at the ends.
PictureAxis axis_around(const std::string& label, const std::vector<double>& values) {
  const auto [low, high] = std::minmax_element(values.begin(), values.end());
  const double room = *high > *low ? 0.06 * (*high - *low) : std::max(0.1 * std::abs(*high), 1.0);
  return {.label = label, .low = *low - room, .high = *high + room};
}

CaptionedPicture key_picture(const RankedStudy& study, const std::string& key, std::size_t number) {
  const Spread spread = spread_over(study, key);
  const std::optional<double> required = common_requirement(study);
  std::vector<double> heights = all_of(spread, &PicturePoint::y);
  if (required) heights.push_back(*required);
  LinePicture picture{
      .about = {.id = fmt::format("key-{}", number),
                .title = "Fire resistance against " + key,
                .message = range_words(spread)},
      .x = axis_around(label_with_unit(key), all_of(spread, &PicturePoint::x)),
      .y = axis_around(kResistance, heights),
      .series = {
          {.name = required ? "meets what is required" : "",
           .points = spread.met,
           .style = SeriesStyle::points},
          {.name = "does not meet it", .points = spread.not_met, .style = SeriesStyle::points}}};
  if (required) {
    picture.horizontal_marks.push_back({*required, fmt::format("required {} min", *required)});
  }
  return {draw(picture), "Fire resistance less its numerical uncertainty against " + key + ": " +
                             picture.about.message +
                             ". Layouts in one column differ in the other quantities."};
}

}  // namespace

std::string label_with_unit(const std::string& key) {
  const KeySpec* spec = find_key(schema_spelling(key));
  return spec == nullptr || spec->unit.empty() ? key : key + " [" + spec->unit + "]";
}

CaptionedPicture trade_off_picture(const RankedStudy& study) {
  const std::size_t best = undominated_count(study);
  ScatterPicture picture{
      .about = {.id = "trade-off",
                .title = "Fire resistance against steel",
                .message =
                    fmt::format("{} of {} layouts are undominated", best, study.rows.size())},
      .x = {.label = "Steel: tube, bars and shape [kg/m]", .low = {}, .high = {}},
      .y = {.label = kResistance, .low = {}, .high = {}},
      .points = {},
      .highlighted_name = "undominated",
      .other_name = "another lasts as long with less steel, or longer with as much"};
  for (std::size_t rank = 0; rank < study.rows.size(); ++rank) {
    const LayoutRow& row = study.ranked(rank);
    if (!row.verdict) continue;
    const bool is_best = study.undominated[study.order[rank]];
    picture.points.push_back(
        {.x = row.amounts.steel_kg_m(),
         .y = row.verdict->assessed_min,
         .highlighted = is_best,
         .label = is_best && best <= kMostLabels ? fmt::format("rank {}", rank + 1) : ""});
  }
  return {draw(picture),
          "Fire resistance less its numerical uncertainty against the steel of one metre of "
          "column. " +
              picture.about.message + ": no other layout lasts as long with as little steel."};
}

std::vector<CaptionedPicture> key_pictures(const RankedStudy& study) {
  std::vector<CaptionedPicture> pictures;
  for (const std::string& key : study.varied) {
    const Spread spread = spread_over(study, key);
    if (spread.met.empty() && spread.not_met.empty()) continue;
    pictures.push_back(key_picture(study, key, pictures.size() + 1));
  }
  return pictures;
}

}  // namespace ringward::cli
