#include "cli/pictures/line_picture.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <array>
#include <cmath>

#include "cli/pictures/gnuplot_script.hpp"

namespace ringward::cli {
namespace {

struct LineLook {
  const char* colour;
  const char* dash;  ///< a gnuplot dash pattern, in units of the line's width
  int marker;        ///< gnuplot's number of the symbol
};

// Dark enough on white to be told from the grid in grey too; told from each other by dash and
// marker.
constexpr std::array<LineLook, 8> kLooks{{
    {"#003f7f", "solid", 6},
    {"#a03000", "(12,5)", 4},
    {"#00603c", "(3,4)", 8},
    {"#6a1b6a", "(14,4,3,4)", 12},
    {"#5a5000", "(20,6)", 10},
    {"#222222", "(6,3)", 2},
    {"#005f73", "(14,3,3,3,3,3)", 7},
    {"#7f1d1d", "(2,2)", 5},
}};

constexpr std::size_t kMarkersOnLine = 9;

std::vector<std::vector<double>> rows_of(const std::vector<PicturePoint>& points) {
  std::vector<std::vector<double>> rows;
  for (const PicturePoint& point : points) rows.push_back({point.x, point.y});
  return rows;
}

std::string title(GnuplotScript& script, const std::string& name) {
  return name.empty() ? " notitle" : " title " + script.text(name);
}

std::string look_of(const PictureSeries& series, std::size_t place) {
  const LineLook& look = kLooks[place % kLooks.size()];
  switch (series.style) {
    case SeriesStyle::strong:
      return "with lines linewidth 2.6 dashtype solid linecolor rgb '#000000'";
    case SeriesStyle::thin:
      return "with lines linewidth 0.9 dashtype solid linecolor rgb '#777777'";
    case SeriesStyle::points:
      return fmt::format("with points pointtype {} pointsize 0.8 linecolor rgb '{}'", look.marker,
                         look.colour);
    case SeriesStyle::line:
      break;
  }
  const std::size_t every = std::max<std::size_t>(1, series.points.size() / kMarkersOnLine);
  return fmt::format(
      "with linespoints linewidth 1.5 dashtype {} linecolor rgb '{}' pointtype {} pointsize 0.6 "
      "pointinterval {}",
      look.dash, look.colour, look.marker, every);
}

std::string band_plot(GnuplotScript& script, const PictureBand& band) {
  std::vector<std::vector<double>> rows;
  for (const PictureBand::Range& range : band.ranges) {
    rows.push_back({range.x, range.low, range.high});
  }
  const std::string block = script.data(rows);
  return block +
         " using 1:2:3 with filledcurves fillstyle solid 1 noborder linecolor rgb "
         "'#dcdcdc'" +
         title(script, band.name);
}

constexpr const char* kMarkLine =
    "nohead linewidth 1.1 dashtype (8,3,2,3) linecolor rgb '#222222' front";

// The words stand beside their line, inside the frame.
void add_marks(GnuplotScript& script, const LinePicture& picture) {
  for (const PictureMark& mark : picture.vertical_marks) {
    const std::string at = gnuplot_number(mark.at);
    script.add("set arrow from first " + at + ", graph 0 to first " + at + ", graph 1 " +
               kMarkLine);
    script.add("set label " + script.text(mark.name, 50) + " at first " + at +
               ", graph 0.98 rotate by 90 right offset character -1.1,0 font ',10.5' front");
  }
  for (const PictureMark& mark : picture.horizontal_marks) {
    const std::string at = gnuplot_number(mark.at);
    script.add("set arrow from graph 0, first " + at + " to graph 1, first " + at + " " +
               kMarkLine);
    const std::string place = mark.name_at_start ? "0.012" : "0.99";
    script.add("set label " + script.text(mark.name) + " at graph " + place + ", first " + at +
               (mark.name_at_start ? " left" : " right") +
               " offset character 0,0.5 font ',10.5' front");
  }
}

bool has_value(const PictureSeries& series) {
  return std::any_of(series.points.begin(), series.points.end(), [](const PicturePoint& point) {
    return std::isfinite(point.x) && std::isfinite(point.y);
  });
}

}  // namespace

Picture draw(const LinePicture& picture) {
  if (std::none_of(picture.series.begin(), picture.series.end(), has_value)) {
    return {.svg = "", .why_missing = "There is no picture because there is nothing to draw."};
  }
  GnuplotScript script(picture.about, picture.height_px);
  script.set_axes(picture.x, picture.y);
  add_marks(script, picture);
  std::vector<std::string> plots;
  for (const PictureBand& band : picture.bands) plots.push_back(band_plot(script, band));
  std::size_t place = 0;
  for (const PictureSeries& series : picture.series) {
    if (!has_value(series)) continue;
    const std::string block = script.data(rows_of(series.points));
    plots.push_back(block + " using 1:2 " + look_of(series, place) + title(script, series.name));
    const bool has_own_look =
        series.style == SeriesStyle::line || series.style == SeriesStyle::points;
    if (has_own_look) ++place;
  }
  script.add(fmt::format("plot {}", fmt::join(plots, ", ")));
  return script.drawn();
}

}  // namespace ringward::cli
