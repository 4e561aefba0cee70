// How the fire resistance of one example moves with its uncertain inputs, one at a time.

#include <fmt/format.h>

#include <string>
#include <vector>

#include "cli/input/reader.hpp"
#include "cli/pictures/bar_picture.hpp"
#include "mechanical/rating/rating.hpp"
#include "tests/validation/markdown.hpp"
#include "tests/validation/page_part.hpp"
#include "tests/validation/page_pictures.hpp"
#include "thermal/base/units.hpp"

namespace ringward::testing {
namespace {

/// Two values of an input, in the words of `ringward rate --set`.
struct Range {
  const char* key;
  const char* low;
  const char* high;
};

/// Brackets of what is known when a column is designed (common practice, no source).
const std::vector<Range>& ranges() {
  static const std::vector<Range> all = {{"core.strength_MPa", "36", "44"},
                                         {"core.moisture_percent", "1.5", "5"},
                                         {"core.density_kg_m3", "2200", "2400"},
                                         {"core.conductivity", "\"upper\"", "\"lower\""},
                                         {"core.aggregate", "\"siliceous\"", "\"calcareous\""},
                                         {"bars[0].axis_mm", "35", "55"},
                                         {"bars[0].yield_MPa", "450", "550"},
                                         {"tube.yield_MPa", "320", "390"},
                                         {"tube.contact_resistance_m2K_W", "0", "0.01"},
                                         {"member.buckling_factor", "0.5", "0.7"},
                                         {"member.imperfection_mm", "2", "10"},
                                         {"load.axial_kN", "2160", "2640"},
                                         {"load.eccentricity_x_mm", "0", "20"},
                                         {"fire.surface.emissivity", "0.6", "0.8"},
                                         {"fire.surface.convection_W_m2K", "20", "30"}};
  return all;
}

double resistance_min(const std::vector<std::string>& overrides) {
  const cli::ColumnInput input =
      cli::read_column_file(RINGWARD_SOURCE_DIR "/docs/examples/atrium-column.toml", overrides);
  const mechanical::Rating rating = rate(input.column, input.fire, thermal::Accuracy::standard,
                                         {.bounds = false, .uncertainty = false});
  return units::min_from_s(rating.chosen.fire_resistance_s.value());
}

std::string signed_minutes(double minutes) { return fmt::format("{:+.1f}", minutes); }

}  // namespace

PagePart sensitivity_part() {
  const double base_min = resistance_min({});
  cli::BarPicture picture{
      .about = {.id = "sensitivity",
                .title = "Fire resistance of the atrium example with one input changed",
                .message = fmt::format("As given it is {:.1f} min.", base_min)},
      .axis_label = "Fire resistance [min]",
      .centre = base_min,
      .low_name = "from",
      .high_name = "to"};
  for (const Range& range : ranges()) {
    picture.rows.push_back(
        {.name = range.key,
         .at_low = resistance_min({fmt::format("{}={}", range.key, range.low)}),
         .at_high = resistance_min({fmt::format("{}={}", range.key, range.high)})});
  }
  std::string table = markdown_head({"input", "from", "to", "R moves by, min", "and by, min"});
  for (const cli::BarRow& row : cli::largest_first(picture.rows, base_min)) {
    for (const Range& range : ranges()) {
      if (row.name != range.key) continue;
      table += markdown_row({fmt::format("`{}`", range.key), range.low, range.high,
                             signed_minutes(row.at_low - base_min),
                             signed_minutes(row.at_high - base_min)});
    }
  }
  return {.texts = {{"sensitivity", table}, {"atrium", fmt::format("{:.1f}", base_min)}},
          .pictures = {page_picture(picture.about, cli::draw(picture))}};
}

}  // namespace ringward::testing
