#include "cli/output/section_picture.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <array>
#include <cmath>

#include "cli/output/colour_bands.hpp"
#include "cli/output/numbers.hpp"
#include "cli/output/picture_outlines.hpp"
#include "cli/output/picture_patches.hpp"
#include "cli/output/xml_text.hpp"
#include "thermal/base/units.hpp"

namespace ringward::cli {
namespace {

constexpr double kMargin_px = 24;
constexpr double kHeader_px = 64;
constexpr double kFooter_px = 92;
constexpr double kLegend_px = 110;
constexpr double kPanelHeading_px = 26;
constexpr double kAroundSection_px = 20;
constexpr double kSingleSection_px = 440;
constexpr double kOneOfManySections_px = 270;
constexpr double kWidestPatch_px = 3;
constexpr std::size_t kPanelsInRow = 3;
constexpr std::size_t kLongestTitle = 90;

// Places on the page.
struct Page {
  double section_width = 0;
  double section_depth = 0;
  double px_per_m = 0;
  std::size_t columns = 1;
  std::size_t rows = 1;

  [[nodiscard]] double panel_width() const { return section_width + 2 * kAroundSection_px; }
  [[nodiscard]] double panel_height() const {
    return section_depth + 2 * kAroundSection_px + kPanelHeading_px;
  }
  [[nodiscard]] double panels_width() const {
    // Room for the lines of text below, however narrow the section.
    return std::max(520.0, static_cast<double>(columns) * panel_width());
  }
  [[nodiscard]] double panels_height() const { return static_cast<double>(rows) * panel_height(); }
  [[nodiscard]] double width() const { return 2 * kMargin_px + panels_width() + kLegend_px; }
  [[nodiscard]] double height() const {
    return kHeader_px + std::max(panels_height(), 300.0) + kFooter_px;
  }
};

Page page_for(const thermal::Section& section, std::size_t panels) {
  const thermal::Outline outline = overall_outline(section);
  const double room = panels == 1 ? kSingleSection_px : kOneOfManySections_px;
  Page page;
  page.px_per_m = room / std::max(outline.width_m, outline.depth_m);
  page.section_width = outline.width_m * page.px_per_m;
  page.section_depth = outline.depth_m * page.px_per_m;
  page.columns = std::min(panels, kPanelsInRow);
  page.rows = (panels + page.columns - 1) / page.columns;
  return page;
}

std::string text_at(double x, double y, const std::string& attributes, const std::string& text) {
  return fmt::format("<text x=\"{:.1f}\" y=\"{:.1f}\"{}{}>{}</text>\n", x, y,
                     attributes.empty() ? "" : " ", attributes, xml_text(text));
}

std::string time_list(const std::vector<FieldState>& states) {
  std::string list;
  for (const FieldState& state : states) {
    list += (list.empty() ? "" : ", ") +
            shortest(rounded(units::min_from_s(state.time_s), kDigitsMinutes));
  }
  return list + " min";
}

std::string header(const PictureSubject& subject, const std::vector<FieldState>& states) {
  return text_at(kMargin_px, 30, "font-size=\"17\" font-weight=\"bold\"",
                 shortened(subject.title, kLongestTitle)) +
         text_at(kMargin_px, 50, "font-size=\"12\"",
                 shortened("Temperature of the section after " + time_list(states) + " of fire \"" +
                               subject.fire + "\"",
                           kLongestTitle + 20));
}

std::string legend(const ColourBands& bands, double x, double y) {
  constexpr double kBox_px = 22;
  std::string text = text_at(x, y - 10, "font-size=\"12\"",
                             "Temperature, \xC2\xB0"
                             "C");
  double top = y;
  for (int band = bands.last(); band >= bands.first(); --band, top += kBox_px) {
    text += fmt::format(
        "<rect x=\"{:.1f}\" y=\"{:.1f}\" width=\"26\" height=\"{}\" fill=\"{}\" stroke=\"#333\" "
        "stroke-width=\"0.5\"/>\n",
        x, top, kBox_px, bands.colour(band));
    text += text_at(x + 32, top + 4, "font-size=\"11\"", shortest(bands.lower_C(band + 1)));
  }
  return text +
         text_at(x + 32, top + 4, "font-size=\"11\"", shortest(bands.lower_C(bands.first())));
}

// A round length of about a fifth of the section.
double scale_bar_mm(const thermal::Section& section) {
  const double wanted = units::mm_from_m(section.outline.width_m) / 3.0;
  double length = 10;
  for (const double step : {20.0, 50.0, 100.0, 200.0, 500.0, 1000.0}) {
    if (step <= wanted) length = step;
  }
  return length;
}

std::string footer(const thermal::Section& section, const Page& page, double y) {
  const double length_mm = scale_bar_mm(section);
  const double length_px = units::m_from_mm(length_mm) * page.px_per_m;
  const double x = kMargin_px;
  std::string text = fmt::format(
      "<path d=\"M{0:.1f} {1:.1f} v8 m0 -4 h{2:.1f} m0 -4 v8\" fill=\"none\" stroke=\"#000\"/>\n",
      x, y, length_px);
  text += text_at(x + length_px + 8, y + 8, "font-size=\"11\"", shortest(length_mm) + " mm");
  const double key = x + length_px + 80;
  text += fmt::format(
      "<path d=\"M{:.1f} {:.1f} h36\" stroke=\"#000\" stroke-width=\"3\" "
      "stroke-dasharray=\"7 4\"/>\n",
      key, y + 4);
  text += text_at(key + 44, y + 8, "font-size=\"11\"", "sees the fire");
  text +=
      fmt::format("<circle cx=\"{:.1f}\" cy=\"{:.1f}\" r=\"4\" fill=\"#fff\" stroke=\"#000\"/>\n",
                  key + 134, y + 4);
  text += text_at(key + 144, y + 8, "font-size=\"11\"", "bar");
  text += text_at(key + 182, y + 8, "font-size=\"11\"", "x to the right, y up, from the centroid");
  text += text_at(x, y + 34, "font-size=\"10.5\"",
                  "A calculation aid: a licensed engineer has to check it; local codes and the "
                  "authority decide.");
  return text + text_at(x, y + 50, "font-size=\"10.5\"",
                        "Not in the model: spalling, joints, tube vents, restraint, construction "
                        "defects.");
}

// What all panels have in common.
struct Drawing {
  Page page;
  WholeSection whole;
  ColourBands bands;
};

std::string panel(const PictureSubject& subject, const Drawing& drawing,
                  const thermal::TemperatureHistory& history, const FieldState& state) {
  const Page& page = drawing.page;
  const std::vector<double> patches_C = patch_temperatures(drawing.whole, history, state.time_s);
  const double middle_y = kPanelHeading_px + kAroundSection_px + page.section_depth / 2;
  const std::string heading = fmt::format(
      "{} min, gas {} \xC2\xB0"
      "C",
      shortest(rounded(units::min_from_s(state.time_s), kDigitsMinutes)), fixed(state.gas_C, 0));
  return text_at(page.panel_width() / 2, 16, "font-size=\"13\" text-anchor=\"middle\"", heading) +
         fmt::format("<g transform=\"translate({:.2f} {:.2f})\">\n", page.panel_width() / 2,
                     middle_y) +
         temperature_patches(drawing.whole, patches_C, drawing.bands, page.px_per_m) +
         section_outlines(*subject.section, page.px_per_m) +
         heated_outline(*subject.section, *subject.exposed, page.px_per_m) + "</g>\n";
}

}  // namespace

std::string section_picture(const PictureSubject& subject,
                            const thermal::TemperatureHistory& history,
                            const std::vector<FieldState>& states) {
  const Page page = page_for(*subject.section, states.size());
  const Drawing drawing{page, refined(unfold(history.grid()), kWidestPatch_px / page.px_per_m),
                        bands_for(states)};
  std::string svg = fmt::format(
      "<svg xmlns=\"http://www.w3.org/2000/svg\" viewBox=\"0 0 {0:.0f} {1:.0f}\" width=\"{0:.0f}\" "
      "height=\"{1:.0f}\" font-family=\"Helvetica, Arial, sans-serif\">\n"
      "<title>{2}, {3}</title>\n<rect width=\"100%\" height=\"100%\" fill=\"#fff\"/>\n",
      page.width(), page.height(), xml_text(subject.title), time_list(states));
  svg += header(subject, states);
  for (std::size_t k = 0; k < states.size(); ++k) {
    const double x = kMargin_px + static_cast<double>(k % page.columns) * page.panel_width();
    const double y = kHeader_px + static_cast<double>(k / page.columns) * page.panel_height();
    svg += fmt::format("<g transform=\"translate({:.2f} {:.2f})\">\n", x, y) +
           panel(subject, drawing, history, states[k]) + "</g>\n";
  }
  svg += legend(drawing.bands, kMargin_px + page.panels_width() + 12, kHeader_px + 36);
  return svg + footer(*subject.section, page, page.height() - kFooter_px + 16) + "</svg>\n";
}

}  // namespace ringward::cli
