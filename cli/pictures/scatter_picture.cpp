#include "cli/pictures/scatter_picture.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <cmath>

#include "cli/pictures/gnuplot_script.hpp"

namespace ringward::cli {
namespace {

using Rows = std::vector<std::vector<double>>;

// In the order of x, so that the joining line does not run back.
Rows chosen(const std::vector<ScatterPoint>& points, bool highlighted) {
  Rows rows;
  for (const ScatterPoint& point : points) {
    const bool has_place = std::isfinite(point.x) && std::isfinite(point.y);
    if (has_place && point.highlighted == highlighted) rows.push_back({point.x, point.y});
  }
  std::sort(rows.begin(), rows.end());
  return rows;
}

void add_labels(GnuplotScript& script, const std::vector<ScatterPoint>& points) {
  for (const ScatterPoint& point : points) {
    if (point.label.empty() || !std::isfinite(point.x) || !std::isfinite(point.y)) continue;
    script.add("set label " + script.text(point.label, 30) + " at " + gnuplot_number(point.x) +
               "," + gnuplot_number(point.y) + " left offset character 0.7,-0.7 font ',10' front");
  }
}

}  // namespace

Picture draw(const ScatterPicture& picture) {
  const Rows others = chosen(picture.points, false);
  const Rows best = chosen(picture.points, true);
  if (others.empty() && best.empty()) {
    return {.svg = "", .why_missing = "There is no picture because no point has a value."};
  }
  GnuplotScript script(picture.about, picture.height_px);
  script.set_axes(picture.x, picture.y);
  script.add("set offsets graph 0.03, graph 0.12, graph 0.05, graph 0.08");
  add_labels(script, picture.points);
  std::vector<std::string> plots;
  if (!others.empty()) {
    plots.push_back(script.data(others) +
                    " using 1:2 with points pointtype 6 pointsize 0.5 linecolor rgb '#666666' "
                    "title " +
                    script.text(picture.other_name));
  }
  if (!best.empty()) {
    plots.push_back(script.data(best) +
                    " using 1:2 with linespoints linewidth 1.2 dashtype (8,4) pointtype 5 "
                    "pointsize 0.9 linecolor rgb '#003f7f' title " +
                    script.text(picture.highlighted_name));
  }
  script.add(fmt::format("plot {}", fmt::join(plots, ", ")));
  return script.drawn();
}

}  // namespace ringward::cli
