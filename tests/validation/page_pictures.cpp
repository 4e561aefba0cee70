#include "tests/validation/page_pictures.hpp"

#include <fmt/format.h>

#include <array>
#include <stdexcept>

#include "cli/pictures/gnuplot_script.hpp"

namespace ringward::testing {
namespace {

using cli::GnuplotScript;
using Rows = std::vector<std::vector<double>>;

constexpr int kHeight_px = 520;

/// Told apart without colour: by symbol, open or filled, and by dashes.
struct Look {
  int symbol;
  const char* dash;
};
constexpr std::array<Look, 4> kLooks{
    {{6, "solid"}, {5, "(10,5)"}, {8, "(3,4)"}, {2, "(14,4,3,4)"}}};

Rows rows_of(const std::vector<cli::PicturePoint>& points) {
  Rows rows;
  for (const cli::PicturePoint& point : points) rows.push_back({point.x, point.y});
  return rows;
}

std::string series_plot(GnuplotScript& script, const MarkedPoints& series, std::size_t place,
                        bool joined) {
  const Look& look = kLooks.at(place % kLooks.size());
  const std::string block = script.data(rows_of(series.points));
  return block +
         fmt::format(
             " using 1:2 with {} pointtype {} pointsize 1 linewidth 1.4 dashtype {} "
             "linecolor rgb '#111111' title ",
             joined ? "linespoints" : "points", look.symbol, look.dash) +
         script.text(series.name);
}

std::vector<std::string> series_plots(GnuplotScript& script,
                                      const std::vector<MarkedPoints>& series, bool joined) {
  std::vector<std::string> plots;
  for (std::size_t place = 0; place < series.size(); ++place) {
    plots.push_back(series_plot(script, series[place], place, joined));
  }
  return plots;
}

/// y = factor x from the origin, in words where a key entry is wanted.
std::string ray(GnuplotScript& script, double factor, double last, const char* look) {
  return script.data({{0.0, 0.0}, {last, factor * last}}) + " using 1:2 with lines " + look;
}

}  // namespace

PagePicture page_picture(const cli::PictureAbout& about, const cli::Picture& picture) {
  if (!picture.is_there()) throw std::runtime_error(about.id + ": " + picture.why_missing);
  return {about.id + ".svg", picture.svg};
}

PagePicture agreement_picture(const cli::PictureAbout& about, double last_min,
                              const std::vector<MarkedPoints>& families) {
  GnuplotScript script(about, kHeight_px);
  script.set_axes({.label = "Measured [min]", .low = 0.0, .high = last_min},
                  {.label = "Predicted [min]", .low = 0.0, .high = last_min});
  std::vector<std::string> plots = {
      ray(script, 1.0, last_min, "linewidth 2 linecolor rgb '#000000' title ") +
      script.text("equal")};
  constexpr const char* kNear = "linewidth 1 dashtype (8,4) linecolor rgb '#444444' ";
  constexpr const char* kFar = "linewidth 1 dashtype (2,3) linecolor rgb '#444444' ";
  plots.push_back(ray(script, 0.9, last_min, kNear) + "title " + script.text("10 % off"));
  plots.push_back(ray(script, 1.1, last_min, kNear) + "notitle");
  plots.push_back(ray(script, 0.75, last_min, kFar) + "title " + script.text("25 % off"));
  plots.push_back(ray(script, 1.25, last_min, kFar) + "notitle");
  for (std::string& plot : series_plots(script, families, false)) plots.push_back(std::move(plot));
  script.add(fmt::format("plot {}", fmt::join(plots, ", ")));
  return page_picture(about, script.drawn());
}

PagePicture log_picture(const LogPicture& picture) {
  GnuplotScript script(picture.about, kHeight_px);
  script.set_axes(picture.x, picture.y);
  script.add("set logscale xy");
  std::vector<std::string> plots = series_plots(script, picture.series, picture.joined);
  if (picture.equality_line) {
    const double low = picture.x.low.value();
    const double high = picture.x.high.value();
    plots.push_back(script.data({{low, low}, {high, high}}) +
                    " using 1:2 with lines linewidth 2 linecolor rgb '#000000' title " +
                    script.text("equal"));
  }
  script.add(fmt::format("plot {}", fmt::join(plots, ", ")));
  return page_picture(picture.about, script.drawn());
}

}  // namespace ringward::testing
