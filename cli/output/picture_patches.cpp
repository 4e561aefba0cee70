#include "cli/output/picture_patches.hpp"

#include <fmt/format.h>

#include <cmath>
#include <map>

#include "thermal/base/units.hpp"

namespace ringward::cli {
namespace {

using thermal::GridKind;

// An SVG arc of a quarter turn or less is never ambiguous.
constexpr double kLongestArc_rad = units::kPi / 2 + 1e-9;

class PatchPainter {
 public:
  PatchPainter(const WholeSection& whole, double px_per_m) : whole_(whole), px_per_m_(px_per_m) {}

  // A run of patches along one row: for a Cartesian grid along x, for a polar one along the arc.
  [[nodiscard]] std::string run(std::size_t row, std::size_t begin, std::size_t end) const {
    if (is_polar()) {
      return fmt::format("M{}{}L{}{}Z", point(row + 1, begin), arc_to(row + 1, end, 0),
                         point(row, end), arc_to(row, begin, 1));
    }
    return fmt::format("M{}L{}L{}L{}Z", point(begin, row), point(end, row), point(end, row + 1),
                       point(begin, row + 1));
  }

  /// The line between patch (i, j) and its neighbour with the larger first index.
  [[nodiscard]] std::string edge_1(std::size_t i, std::size_t j) const {
    if (is_polar()) return fmt::format("M{}{}", point(i + 1, j), arc_to(i + 1, j + 1, 0));
    return fmt::format("M{}L{}", point(i + 1, j), point(i + 1, j + 1));
  }

  /// The line between patch (i, j) and its neighbour with the larger second index.
  [[nodiscard]] std::string edge_2(std::size_t i, std::size_t j) const {
    return fmt::format("M{}L{}", point(i, j + 1), point(i + 1, j + 1));
  }

  [[nodiscard]] bool is_polar() const { return whole_.kind == GridKind::polar; }

 private:
  [[nodiscard]] std::string point(std::size_t i, std::size_t j) const {
    const thermal::Point corner = whole_.corner(i, j);
    return fmt::format("{:.2f} {:.2f}", corner.x_m * px_per_m_, 0.0 - corner.y_m * px_per_m_);
  }

  [[nodiscard]] std::string arc_to(std::size_t i, std::size_t j, int sweep) const {
    return fmt::format("A{0:.2f} {0:.2f} 0 0 {1} ", whole_.lines_1[i] * px_per_m_, sweep) +
           point(i, j);
  }

  const WholeSection& whole_;
  double px_per_m_;
};

// The band of every patch.
std::vector<int> bands_of(const std::vector<double>& patches_C, const ColourBands& bands) {
  std::vector<int> result;
  result.reserve(patches_C.size());
  for (const double T_C : patches_C) result.push_back(bands.band_of(T_C));
  return result;
}

bool arc_is_full(const WholeSection& whole, std::size_t begin, std::size_t end) {
  return whole.kind == GridKind::polar &&
         whole.lines_2[end + 1] - whole.lines_2[begin] > kLongestArc_rad;
}

// One path a band; patches that follow each other in the same band become one shape.
std::map<int, std::string> band_paths(const WholeSection& whole, const std::vector<int>& band,
                                      const PatchPainter& painter) {
  const bool polar = painter.is_polar();
  const std::size_t rows = polar ? whole.count_1() : whole.count_2();
  const std::size_t length = polar ? whole.count_2() : whole.count_1();
  const auto band_at = [&](std::size_t row, std::size_t k) {
    return polar ? band[row + k * whole.count_1()] : band[k + row * whole.count_1()];
  };
  std::map<int, std::string> paths;
  for (std::size_t row = 0; row < rows; ++row) {
    std::size_t begin = 0;
    for (std::size_t k = 1; k <= length; ++k) {
      const bool goes_on = k < length && band_at(row, k) == band_at(row, begin);
      if (goes_on && !arc_is_full(whole, begin, k)) continue;
      paths[band_at(row, begin)] += painter.run(row, begin, k);
      begin = k;
    }
  }
  return paths;
}

std::string band_edges(const WholeSection& whole, const std::vector<int>& band,
                       const PatchPainter& painter) {
  std::string path;
  for (std::size_t j = 0; j < whole.count_2(); ++j) {
    for (std::size_t i = 0; i < whole.count_1(); ++i) {
      const std::size_t here = i + j * whole.count_1();
      if (i + 1 < whole.count_1() && band[here] != band[here + 1]) path += painter.edge_1(i, j);
      const bool has_next = j + 1 < whole.count_2() || painter.is_polar();
      const std::size_t next = i + (j + 1) % whole.count_2() * whole.count_1();
      if (has_next && band[here] != band[next]) path += painter.edge_2(i, j);
    }
  }
  return path;
}

}  // namespace

std::string temperature_patches(const WholeSection& whole, const std::vector<double>& patches_C,
                                const ColourBands& bands, double px_per_m) {
  const PatchPainter painter(whole, px_per_m);
  const std::vector<int> band = bands_of(patches_C, bands);
  std::string text;
  for (const auto& [number, path] : band_paths(whole, band, painter)) {
    // The stroke of the same colour closes the hairlines between neighbouring shapes.
    text += fmt::format("<path fill=\"{0}\" stroke=\"{0}\" stroke-width=\"0.6\" d=\"{1}\"/>\n",
                        bands.colour(number), path);
  }
  const std::string edges = band_edges(whole, band, painter);
  if (edges.empty()) return text;
  return text + fmt::format("<path fill=\"none\" stroke=\"#333\" stroke-width=\"0.5\" d=\"{}\"/>\n",
                            edges);
}

std::vector<double> patch_temperatures(const WholeSection& whole,
                                       const thermal::TemperatureHistory& history, double time_s) {
  std::vector<double> patches_C;
  patches_C.reserve(whole.count_1() * whole.count_2());
  for (std::size_t j = 0; j < whole.count_2(); ++j) {
    for (std::size_t i = 0; i < whole.count_1(); ++i) {
      patches_C.push_back(history.T_C(middle(whole, i, j), time_s));
    }
  }
  return patches_C;
}

}  // namespace ringward::cli
