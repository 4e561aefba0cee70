#include "cli/pictures/bar_picture.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <cmath>

#include "cli/pictures/gnuplot_script.hpp"

namespace ringward::cli {
namespace {

constexpr int kAboveAndBelow_px = 110;
constexpr int kRow_px = 30;
constexpr std::size_t kLongestName = 44;

double span(const BarRow& row, double centre) {
  return std::max({row.at_low, row.at_high, centre}) - std::min({row.at_low, row.at_high, centre});
}

bool has_values(const BarRow& row) {
  return std::isfinite(row.at_low) && std::isfinite(row.at_high);
}

// One half of a row's height for each of the two bars, so that neither can hide the other.
std::string bars(GnuplotScript& script, const std::vector<double>& values, double centre,
                 bool upper) {
  std::vector<std::vector<double>> rows;
  for (std::size_t i = 0; i < values.size(); ++i) {
    const double row = -static_cast<double>(i);
    const double low = upper ? row + 0.02 : row - 0.36;
    rows.push_back({0.5 * (centre + values[i]), low + 0.17, std::min(centre, values[i]),
                    std::max(centre, values[i]), low, low + 0.34});
  }
  return script.data(rows) + " using 1:2:3:4:5:6 with boxxyerror ";
}

std::string row_names(GnuplotScript& script, const std::vector<BarRow>& rows) {
  std::vector<std::string> tics;
  for (std::size_t i = 0; i < rows.size(); ++i) {
    tics.push_back(fmt::format("{} -{}", script.text(rows[i].name, kLongestName), i));
  }
  return fmt::format("set ytics ({}) scale 0", fmt::join(tics, ", "));
}

}  // namespace

std::vector<BarRow> largest_first(std::vector<BarRow> rows, double centre) {
  std::stable_sort(rows.begin(), rows.end(), [centre](const BarRow& a, const BarRow& b) {
    return span(a, centre) > span(b, centre);
  });
  return rows;
}

Picture draw(const BarPicture& picture) {
  std::vector<BarRow> rows;
  std::copy_if(picture.rows.begin(), picture.rows.end(), std::back_inserter(rows), has_values);
  if (rows.empty() || !std::isfinite(picture.centre)) {
    return {.svg = "", .why_missing = "There is no picture because no row has both values."};
  }
  rows = largest_first(std::move(rows), picture.centre);
  std::vector<double> at_low;
  std::vector<double> at_high;
  for (const BarRow& row : rows) {
    at_low.push_back(row.at_low);
    at_high.push_back(row.at_high);
  }
  const int count = static_cast<int>(rows.size());
  GnuplotScript script(picture.about, kAboveAndBelow_px + kRow_px * count);
  script.set_axes({.label = picture.axis_label}, {.label = "", .low = -count + 0.45, .high = 0.55});
  script.add("set offsets graph 0.04, graph 0.04, 0, 0");
  script.add("set border 1");
  // Long names leave a narrow plot: the key goes above all of the picture.
  script.add("set key at screen 0.99, screen 0.985 right top");
  script.add("set tmargin 3");
  script.add(row_names(script, rows));
  const std::string centre = gnuplot_number(picture.centre);
  script.add("set arrow from first " + centre + ", graph 0 to first " + centre +
             ", graph 1 nohead linewidth 1.4 linecolor rgb '#000000' front");
  const std::string low = bars(script, at_low, picture.centre, true) +
                          "linecolor rgb '#a03000' fillstyle pattern 4 border title " +
                          script.text(picture.low_name);
  const std::string high = bars(script, at_high, picture.centre, false) +
                           "linecolor rgb '#003f7f' fillstyle solid 0.8 border title " +
                           script.text(picture.high_name);
  script.add("plot " + low + ", " + high);
  return script.drawn();
}

}  // namespace ringward::cli
