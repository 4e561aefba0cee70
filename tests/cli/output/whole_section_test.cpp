#include "cli/output/whole_section.hpp"

#include <catch2/catch.hpp>
#include <cmath>

#include "thermal/base/units.hpp"

using namespace ringward;
using namespace ringward::cli;
using thermal::GridKind;
using thermal::Image;
using thermal::OrthogonalGrid;
using thermal::Symmetry;

namespace {

// Cells get their centroid; the tests below then ask where it went.
OrthogonalGrid grid_of(GridKind kind, Symmetry symmetry, std::vector<double> faces_1,
                       std::vector<double> faces_2, std::vector<Image> images) {
  OrthogonalGrid grid;
  grid.kind = kind;
  grid.symmetry = symmetry;
  grid.faces_1 = std::move(faces_1);
  grid.faces_2 = std::move(faces_2);
  grid.images = std::move(images);
  grid.cells.resize(grid.count_1() * grid.count_2());
  return grid;
}

const Image kSame{1, 0, 0, 1};
const Image kMirrorX{-1, 0, 0, 1};
const Image kMirrorY{1, 0, 0, -1};
const Image kTurned{-1, 0, 0, -1};

}  // namespace

TEST_CASE("A quarter unfolds into the whole, each part mirrored", "[cli]") {
  const OrthogonalGrid quarter = grid_of(GridKind::cartesian, Symmetry::quarter, {0.0, 0.1, 0.15},
                                         {0.0, 0.2}, {kSame, kMirrorX, kMirrorY, kTurned});
  const WholeSection whole = unfold(quarter);
  CHECK(whole.lines_1 == std::vector<double>{-0.15, -0.1, 0.0, 0.1, 0.15});
  CHECK(whole.lines_2 == std::vector<double>{-0.2, 0.0, 0.2});
  CHECK(whole.source_cell == std::vector<std::size_t>{1, 0, 0, 1, 1, 0, 0, 1});
}

TEST_CASE("A half unfolds about its own axis only", "[cli]") {
  const OrthogonalGrid half =
      grid_of(GridKind::cartesian, Symmetry::half, {-0.1, 0.0, 0.1}, {0.0, 0.2}, {kSame, kMirrorY});
  const WholeSection whole = unfold(half);
  CHECK(whole.count_1() == 2);
  CHECK(whole.count_2() == 2);
  CHECK(whole.source_cell == std::vector<std::size_t>{0, 1, 0, 1});
}

TEST_CASE("Rings become a full turn in which every sector shows its ring", "[cli]") {
  const OrthogonalGrid rings = grid_of(GridKind::polar, Symmetry::axisymmetric, {0.0, 0.1, 0.2},
                                       {0.0, 2 * units::kPi}, {kSame});
  const WholeSection whole = unfold(rings);
  CHECK(whole.lines_2.back() - whole.lines_2.front() == Approx(2 * units::kPi));
  CHECK(whole.count_2() >= 72);  // no patch spans more than 5 degrees
  for (std::size_t j = 0; j < whole.count_2(); ++j) {
    CHECK(whole.source(0, j) == 0);
    CHECK(whole.source(1, j) == 1);
  }
}

TEST_CASE("Half a turn is mirrored about its slanted axis", "[cli]") {
  // Sectors from 30 to 120 and to 210 degrees; the mirror line runs through 30 and 210 degrees.
  const double a = units::rad_from_deg(30);
  const double c = std::cos(2 * a);
  const double s = std::sin(2 * a);
  const OrthogonalGrid half =
      grid_of(GridKind::polar, Symmetry::half, {0.0, 0.2}, {a, a + units::kPi / 2, a + units::kPi},
              {kSame, {c, s, s, -c}});
  const WholeSection whole = unfold(half);
  CHECK(whole.lines_2.back() - whole.lines_2.front() == Approx(2 * units::kPi));
  for (std::size_t j = 0; j < whole.count_2(); ++j) {
    const double middle = 0.5 * (whole.lines_2[j] + whole.lines_2[j + 1]);
    // Within 90 degrees of the axis at 30 degrees lies sector 0, on either side.
    const bool near_axis = std::cos(middle - a) > 0;
    INFO(units::deg_from_rad(middle));
    CHECK(whole.source(0, j) == (near_axis ? 0u : 1u));
  }
}

TEST_CASE("More lines for drawing keep the lines that were there", "[cli]") {
  WholeSection whole;
  whole.kind = GridKind::cartesian;
  whole.lines_1 = {-0.1, 0.0, 0.025};
  whole.lines_2 = {0.0, 0.01};
  const WholeSection fine = refined(whole, 0.02);
  CHECK(fine.count_1() == 5 + 2);
  CHECK(fine.lines_1[5] == 0.0);
  CHECK(fine.lines_1.back() == 0.025);
  CHECK(fine.lines_2 == whole.lines_2);
  CHECK(middle(fine, 0, 0).x_m == Approx(-0.09));
  CHECK(middle(fine, 0, 0).y_m == Approx(0.005));
}
