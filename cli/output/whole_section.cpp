#include "cli/output/whole_section.hpp"

#include <algorithm>
#include <cmath>
#include <stdexcept>

#include "thermal/base/units.hpp"

namespace ringward::cli {
namespace {

using thermal::GridKind;
using thermal::Image;
using thermal::OrthogonalGrid;
using thermal::Point;

constexpr double kFullTurn_rad = 2.0 * units::kPi;
constexpr double kWidestPatch_rad = kFullTurn_rad / 72.0;
constexpr double kSameLine = 1e-9;  // m or rad: far below any cell, far above rounding

// Sorted, and lines that differ by rounding only taken once.
std::vector<double> merged(std::vector<double> lines) {
  std::sort(lines.begin(), lines.end());
  const auto end = std::unique(lines.begin(), lines.end(),
                               [](double a, double b) { return std::abs(a - b) < kSameLine; });
  lines.erase(end, lines.end());
  return lines;
}

double in_one_turn(double angle_rad) {
  const double turned = std::fmod(angle_rad, kFullTurn_rad);
  const double positive = turned < 0 ? turned + kFullTurn_rad : turned;
  return kFullTurn_rad - positive < kSameLine ? 0.0 : positive;
}

// An image turns or mirrors an angle: the sign of its determinant says which.
double image_of_angle(const Image& image, double angle_rad) {
  const double turn_rad = std::atan2(image.yx, image.xx);
  const bool mirrors = image.xx * image.yy - image.xy * image.yx < 0;
  return mirrors ? turn_rad - angle_rad : turn_rad + angle_rad;
}

double angle_before_image(const Image& image, double angle_rad) {
  const double turn_rad = std::atan2(image.yx, image.xx);
  const bool mirrors = image.xx * image.yy - image.xy * image.yx < 0;
  return mirrors ? turn_rad - angle_rad : angle_rad - turn_rad;
}

Point before_image(const Image& image, const Point& p) {
  // Images are orthogonal, so the transpose undoes them.
  return {image.xx * p.x_m + image.yx * p.y_m, image.xy * p.x_m + image.yy * p.y_m};
}

std::vector<double> divided(const std::vector<double>& lines, double widest) {
  std::vector<double> fine;
  for (std::size_t j = 0; j + 1 < lines.size(); ++j) {
    const double width = lines[j + 1] - lines[j];
    const auto parts = static_cast<int>(std::ceil(width / widest - kSameLine));
    for (int k = 0; k < parts; ++k) fine.push_back(lines[j] + width * k / parts);
  }
  fine.push_back(lines.back());
  return fine;
}

std::vector<double> whole_turn(const OrthogonalGrid& grid) {
  std::vector<double> angles;
  for (const Image& image : grid.images) {
    for (const double angle : grid.faces_2) {
      angles.push_back(in_one_turn(image_of_angle(image, angle)));
    }
  }
  angles = merged(std::move(angles));
  angles.push_back(angles.front() + kFullTurn_rad);
  return divided(angles, kWidestPatch_rad);
}

void add_image_of_lines(const OrthogonalGrid& grid, const Image& image, WholeSection& whole) {
  const bool swaps_axes = std::abs(image.xy) > std::abs(image.xx);
  const double factor_1 = swaps_axes ? image.yx : image.xx;
  const double factor_2 = swaps_axes ? image.xy : image.yy;
  for (const double x : grid.faces_1) {
    (swaps_axes ? whole.lines_2 : whole.lines_1).push_back(factor_1 * x);
  }
  for (const double y : grid.faces_2) {
    (swaps_axes ? whole.lines_1 : whole.lines_2).push_back(factor_2 * y);
  }
}

bool is_within(const std::vector<double>& faces, double value) {
  return value > faces.front() && value < faces.back();
}

std::size_t interval(const std::vector<double>& faces, double value) {
  const auto right = std::upper_bound(faces.begin(), faces.end(), value);
  return static_cast<std::size_t>(right - faces.begin()) - 1;
}

// The angle, plus as many turns as bring it into the solved part.
double turned_into(const std::vector<double>& faces, double angle_rad) {
  return faces.front() + in_one_turn(angle_rad - faces.front());
}

std::size_t solved_cell(const OrthogonalGrid& grid, double middle_1, double middle_2) {
  for (const Image& image : grid.images) {
    double at_1 = middle_1;
    double at_2 = middle_2;
    if (grid.kind == GridKind::polar) {
      at_2 = turned_into(grid.faces_2, angle_before_image(image, middle_2));
    } else {
      const Point point = before_image(image, {middle_1, middle_2});
      at_1 = point.x_m;
      at_2 = point.y_m;
    }
    if (!is_within(grid.faces_1, at_1) || !is_within(grid.faces_2, at_2)) continue;
    return grid.index(interval(grid.faces_1, at_1), interval(grid.faces_2, at_2));
  }
  throw std::logic_error("the images of the grid do not cover the section");
}

// Rings: the angle does not matter.
void find_rings(WholeSection& whole) {
  for (std::size_t j = 0; j < whole.count_2(); ++j) {
    for (std::size_t i = 0; i < whole.count_1(); ++i) whole.source_cell.push_back(i);
  }
}

void find_sources(const OrthogonalGrid& grid, WholeSection& whole) {
  whole.source_cell.reserve(whole.count_1() * whole.count_2());
  for (std::size_t j = 0; j < whole.count_2(); ++j) {
    const double middle_2 = 0.5 * (whole.lines_2[j] + whole.lines_2[j + 1]);
    for (std::size_t i = 0; i < whole.count_1(); ++i) {
      const double middle_1 = 0.5 * (whole.lines_1[i] + whole.lines_1[i + 1]);
      whole.source_cell.push_back(solved_cell(grid, middle_1, middle_2));
    }
  }
}

}  // namespace

Point WholeSection::corner(std::size_t i, std::size_t j) const {
  if (kind == GridKind::cartesian) return {lines_1[i], lines_2[j]};
  return {lines_1[i] * std::cos(lines_2[j]), lines_1[i] * std::sin(lines_2[j])};
}

WholeSection unfold(const OrthogonalGrid& grid) {
  WholeSection whole;
  whole.kind = grid.kind;
  if (grid.symmetry == thermal::Symmetry::axisymmetric) {
    whole.is_rings = true;
    whole.lines_1 = grid.faces_1;
    whole.lines_2 = divided({0.0, kFullTurn_rad}, kWidestPatch_rad);
    find_rings(whole);
    return whole;
  }
  if (grid.kind == GridKind::polar) {
    whole.lines_1 = grid.faces_1;
    whole.lines_2 = whole_turn(grid);
  } else {
    for (const Image& image : grid.images) add_image_of_lines(grid, image, whole);
    whole.lines_1 = merged(std::move(whole.lines_1));
    whole.lines_2 = merged(std::move(whole.lines_2));
  }
  find_sources(grid, whole);
  return whole;
}

WholeSection refined(const WholeSection& whole, double widest_m) {
  const bool polar = whole.kind == GridKind::polar;
  WholeSection fine;
  fine.kind = whole.kind;
  fine.is_rings = whole.is_rings;
  fine.lines_1 = divided(whole.lines_1, widest_m);
  fine.lines_2 = whole.lines_2;
  if (whole.is_rings) return fine;
  fine.lines_2 = divided(whole.lines_2, polar ? widest_m / whole.lines_1.back() : widest_m);
  return fine;
}

Point middle(const WholeSection& whole, std::size_t i, std::size_t j) {
  const double middle_1 = 0.5 * (whole.lines_1[i] + whole.lines_1[i + 1]);
  const double middle_2 = 0.5 * (whole.lines_2[j] + whole.lines_2[j + 1]);
  if (whole.kind == GridKind::cartesian) return {middle_1, middle_2};
  return {middle_1 * std::cos(middle_2), middle_1 * std::sin(middle_2)};
}

}  // namespace ringward::cli
