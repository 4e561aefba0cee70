#include "cli/dossier/temperature_map.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <cmath>

#include "cli/dossier/svg_parts.hpp"
#include "cli/output/colour_bands.hpp"
#include "cli/output/numbers.hpp"
#include "cli/output/picture_outlines.hpp"
#include "cli/output/picture_patches.hpp"
#include "thermal/base/units.hpp"

namespace ringward::cli {
namespace {

constexpr double kWidth_px = 605;
constexpr double kLargeSection_px = 360;
constexpr double kSmallSection_px = 150;
constexpr double kAround_px = 14;
constexpr double kHeading_px = 22;
constexpr double kKey_px = 60;
constexpr std::size_t kPanelsInRow = 3;
constexpr double kWidestPatch_px = 3.5;
constexpr double kLabelDistance_px = 17;
// Between the bars of the usual layouts, and off the axes of symmetry.
constexpr double kLabelRay_rad = 1.18;

// The scale and what is drawn with it.
struct Drawing {
  double px_per_m = 0;
  double width_px = 0;  ///< of the section over everything
  double depth_px = 0;
  WholeSection whole;
  ColourBands bands{0, 1};
};

Drawing drawing_of(const MapSubject& subject, const std::vector<FieldState>& states,
                   double room_px) {
  const thermal::Outline outline = overall_outline(*subject.section);
  Drawing drawing;
  drawing.px_per_m = room_px / std::max(outline.width_m, outline.depth_m);
  drawing.width_px = outline.width_m * drawing.px_per_m;
  drawing.depth_px = outline.depth_m * drawing.px_per_m;
  drawing.whole = refined(unfold(subject.history->grid()), kWidestPatch_px / drawing.px_per_m);
  drawing.bands = bands_for(states);
  return drawing;
}

std::string time_words(const FieldState& state) {
  return fmt::format(
      "{} min, gas {} \xC2\xB0"
      "C",
      shortest(minutes_down(state.time_s)), fixed(state.gas_C, 0));
}

std::string field(const MapSubject& subject, const Drawing& drawing, double time_s) {
  return temperature_patches(drawing.whole,
                             patch_temperatures(drawing.whole, *subject.history, time_s),
                             drawing.bands, drawing.px_per_m);
}

std::string outlines(const MapSubject& subject, const Drawing& drawing) {
  return section_outlines(*subject.section, drawing.px_per_m) +
         heated_outline(*subject.section, *subject.exposed, drawing.px_per_m);
}

// The key to the bands as a row of boxes with the temperatures at their limits.
std::string band_key(const ColourBands& bands, double y) {
  const int count = bands.last() - bands.first() + 1;
  const double box = std::min(44.0, (kWidth_px - 80) / count);
  double x = 0.5 * (kWidth_px - box * count);
  std::string key = svg_text({kWidth_px / 2, y + 16}, "text-anchor=\"middle\" font-size=\"11\"",
                             "Temperature, \xC2\xB0"
                             "C");
  for (int band = bands.first(); band <= bands.last(); ++band, x += box) {
    key += fmt::format(
        "<rect x=\"{:.1f}\" y=\"{:.1f}\" width=\"{:.1f}\" height=\"14\" fill=\"{}\" "
        "stroke=\"#333\" stroke-width=\"0.5\"/>\n",
        x, y + 22, box, bands.colour(band));
    key += svg_text({x, y + 49}, "text-anchor=\"middle\" font-size=\"10.5\"",
                    shortest(bands.lower_C(band)));
  }
  return key + svg_text({x, y + 49}, "text-anchor=\"middle\" font-size=\"10.5\"",
                        shortest(bands.lower_C(bands.last() + 1)));
}

bool is_inside(const thermal::Section& section, double x_m, double y_m) {
  const thermal::Outline outline = overall_outline(section);
  if (outline.shape == thermal::Shape::circular) {
    return std::hypot(x_m, y_m) < outline.width_m / 2;
  }
  return std::abs(x_m) < outline.width_m / 2 && std::abs(y_m) < outline.depth_m / 2;
}

/// A label with its place.
struct IsothermLabel {
  PicturePoint at;
  std::string text;
};

// Along one ray from the centre, at every crossing of a band's limit that is not too close to the
// last.
std::vector<IsothermLabel> labels_along(double ray_rad, const MapSubject& subject,
                                        const Drawing& drawing, double time_s) {
  const double step_m = 0.5 / drawing.px_per_m;
  const double dx = std::cos(ray_rad);
  const double dy = std::sin(ray_rad);
  int band = drawing.bands.band_of(subject.history->T_C({0, 0}, time_s));
  double last_px = -kLabelDistance_px;
  std::vector<IsothermLabel> labels;
  for (double r = step_m; is_inside(*subject.section, (r + step_m) * dx, (r + step_m) * dy);
       r += step_m) {
    const int here = drawing.bands.band_of(subject.history->T_C({r * dx, r * dy}, time_s));
    if (here == band) continue;
    const double r_px = r * drawing.px_per_m;
    if (r_px - last_px >= kLabelDistance_px) {
      labels.push_back(
          {{r_px * dx, -r_px * dy + 3.5}, shortest(drawing.bands.lower_C(std::max(band, here)))});
      last_px = r_px;
    }
    band = here;
  }
  return labels;
}

// Along the ray that crosses the most isotherms: towards a face that sees the fire.
std::string isotherm_labels(const MapSubject& subject, const Drawing& drawing, double time_s) {
  std::vector<IsothermLabel> most;
  for (const double ray_rad : {kLabelRay_rad, units::kPi - kLabelRay_rad, -kLabelRay_rad,
                               units::kPi / 2 - kLabelRay_rad, units::kPi / 2 + kLabelRay_rad}) {
    std::vector<IsothermLabel> labels = labels_along(ray_rad, subject, drawing, time_s);
    if (labels.size() > most.size()) most = std::move(labels);
  }
  std::string drawn;
  for (const IsothermLabel& label : most) drawn += svg_label(label.at, label.text);
  return drawn;
}

std::string at(double x, double y, const std::string& content) {
  return fmt::format("<g transform=\"translate({:.2f} {:.2f})\">\n", x, y) + content + "</g>\n";
}

}  // namespace

Picture map_panels(const PictureAbout& about, const MapSubject& subject,
                   const std::vector<FieldState>& states) {
  const Drawing drawing = drawing_of(subject, states, kSmallSection_px);
  const double panel_width = kWidth_px / kPanelsInRow;
  const double panel_height = kHeading_px + drawing.depth_px + 2 * kAround_px;
  const std::size_t rows = (states.size() + kPanelsInRow - 1) / kPanelsInRow;
  const double panels_height = static_cast<double>(rows) * panel_height;
  std::string svg = svg_opening(about, kWidth_px, panels_height + kKey_px);
  for (std::size_t k = 0; k < states.size(); ++k) {
    const double x = (static_cast<double>(k % kPanelsInRow) + 0.5) * panel_width;
    const double y = static_cast<double>(k / kPanelsInRow) * panel_height;
    svg +=
        svg_text({x, y + 14}, "text-anchor=\"middle\" font-size=\"11.5\"", time_words(states[k]));
    svg += at(x, y + kHeading_px + kAround_px + drawing.depth_px / 2,
              field(subject, drawing, states[k].time_s) + outlines(subject, drawing));
  }
  return {.svg = svg + band_key(drawing.bands, panels_height) + "</svg>\n", .why_missing = ""};
}

Picture large_map(const PictureAbout& about, const MapSubject& subject, const FieldState& state) {
  const Drawing drawing = drawing_of(subject, {state}, kLargeSection_px);
  const double height = kHeading_px + drawing.depth_px + 2 * kAround_px;
  std::string svg = svg_opening(about, kWidth_px, height + kKey_px);
  svg += svg_text({kWidth_px / 2, 14},
                  "class=\"map-heading\" text-anchor=\"middle\" font-size=\"12.5\"",
                  time_words(state));
  svg += at(kWidth_px / 2, kHeading_px + kAround_px + drawing.depth_px / 2,
            "<g class=\"map-field\">\n" + field(subject, drawing, state.time_s) + "</g>\n" +
                fmt::format("<image class=\"map-image\" x=\"{:.2f}\" y=\"{:.2f}\" "
                            "width=\"{:.2f}\" height=\"{:.2f}\" display=\"none\" "
                            "preserveAspectRatio=\"none\"/>\n",
                            -drawing.width_px / 2, -drawing.depth_px / 2, drawing.width_px,
                            drawing.depth_px) +
                outlines(subject, drawing) + "<g class=\"map-labels\">\n" +
                isotherm_labels(subject, drawing, state.time_s) + "</g>\n");
  return {.svg = svg + band_key(drawing.bands, height) + "</svg>\n", .why_missing = ""};
}

}  // namespace ringward::cli
