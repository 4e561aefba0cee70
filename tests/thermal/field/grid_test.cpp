#include <catch2/catch.hpp>
#include <numeric>

#include "tests/thermal/field/problems.hpp"
#include "thermal/grid/location.hpp"
#include "thermal/grid/section_grid.hpp"

using namespace ringward;
using namespace ringward::testing;

namespace {

SectionGrid grid_of(const Section& section, const ExposedParts& exposed = {}) {
  return grid_of_section(section, exposed, {Accuracy::standard, 1.0});
}

double area_of(const OrthogonalGrid& grid, Layer layer) {
  double area = 0;
  for (const Cell& cell : grid.cells) {
    if (cell.layer == layer) area += cell.area_m2;
  }
  return area * static_cast<double>(grid.images.size());
}

double steel_area(const OrthogonalGrid& grid) {
  double area = 0;
  for (const Cell& cell : grid.cells) area += cell.area_m2 * cell.steel_fraction;
  return area * static_cast<double>(grid.images.size());
}

Section protected_section(Shape shape) {
  Section section = tubed(shape, 0.3, 0.006);
  section.outline.depth_m = shape == Shape::rectangular ? 0.5 : 0.3;
  section.protection = Protection{};
  section.protection->thickness_m = 0.025;
  section.protection->conductivity_W_mK = PiecewiseLinear(0.2);
  section.protection->specific_heat_J_kgK = PiecewiseLinear(1700.0);
  section.protection->density_kg_m3 = 800;
  return section;
}

double I_area(const SteelShape& s) {
  return 2 * s.width_m * s.flange_m + (s.depth_m - 2 * s.flange_m) * s.web_m;
}

}  // namespace

// Exact geometry; tolerance is rounding.
TEST_CASE("Cells add up to the layers of the section") {
  for (Shape shape : {Shape::square, Shape::rectangular}) {
    const Section s = protected_section(shape);
    const OrthogonalGrid grid = grid_of(s).grid;
    const double w = s.outline.width_m;
    const double d = s.outline.depth_m;
    CHECK(area_of(grid, Layer::core) == Approx(s.core_width_m() * s.core_depth_m()).epsilon(1e-12));
    CHECK(area_of(grid, Layer::tube) ==
          Approx(w * d - s.core_width_m() * s.core_depth_m()).epsilon(1e-12));
    CHECK(area_of(grid, Layer::protection) ==
          Approx((w + 0.05) * (d + 0.05) - w * d).epsilon(1e-12));
  }
  const Section s = protected_section(Shape::circular);
  ExposedParts half_heated;
  half_heated.heated_arc = Arc{0.2, 2.9};
  for (const ExposedParts& exposed : {ExposedParts{}, half_heated}) {
    const OrthogonalGrid grid = grid_of(s, exposed).grid;
    const double pi = units::kPi;
    CHECK(area_of(grid, Layer::core) == Approx(pi * 0.144 * 0.144).epsilon(1e-12));
    CHECK(area_of(grid, Layer::tube) == Approx(pi * (0.15 * 0.15 - 0.144 * 0.144)).epsilon(1e-12));
    CHECK(area_of(grid, Layer::protection) ==
          Approx(pi * (0.175 * 0.175 - 0.15 * 0.15)).epsilon(1e-12));
  }
}

// First moment of half a disc about its diameter: 2 r^3 / 3, exact.
TEST_CASE("Centroids of polar cells give the exact first moment of half a disc") {
  const OrthogonalGrid grid =
      polar_grid(evenly(0, 0.3, 7), evenly(0, units::kPi, 5), Symmetry::half, all_core);
  double moment = 0;
  for (const Cell& cell : grid.cells) moment += cell.area_m2 * cell.y_m;
  CHECK(moment == Approx(2.0 * 0.027 / 3.0).epsilon(1e-12));
}

// A ring's x_m times its area is the integral of r dA, over the disc 2 pi r^3 / 3, exact.
TEST_CASE("A ring lies at its mean radius by area") {
  const OrthogonalGrid grid =
      polar_grid(evenly(0, 0.3, 7), {0, 2 * units::kPi}, Symmetry::axisymmetric, all_core);
  double moment = 0;
  for (const Cell& cell : grid.cells) moment += cell.area_m2 * cell.x_m;
  CHECK(moment == Approx(2.0 * units::kPi * 0.027 / 3.0).epsilon(1e-12));
}

TEST_CASE("Neighbouring cells of the core differ by a bounded ratio") {
  for (Shape shape : {Shape::circular, Shape::square}) {
    const OrthogonalGrid grid = grid_of(tubed(shape, 0.6, 0.01)).grid;
    for (std::size_t i = 0; i + 2 < grid.faces_1.size(); ++i) {
      const double here = grid.faces_1[i + 1] - grid.faces_1[i];
      const double next = grid.faces_1[i + 2] - grid.faces_1[i + 1];
      if (grid.cells[i + 1].layer != Layer::core) break;
      CHECK(here / next < 1.2);
      CHECK(here / next > 0.95);
    }
  }
}

TEST_CASE("An embedded shape keeps its area at any rotation on both kinds of grid") {
  SteelShape shape{SteelShapeKind::i_section, 0.16, 0.12, 0.009, 0.014, 355e6, 0.0};
  const double cross_area = 2 * I_area(shape) - shape.web_m * shape.web_m;
  for (Shape outline : {Shape::circular, Shape::square}) {
    for (double rotation : {0.0, 0.5 * units::kPi, 0.3, -1.1}) {
      Section section = tubed(outline, 0.3, 0.006);
      shape.rotation_rad = rotation;
      shape.kind = SteelShapeKind::i_section;
      section.steel_shape = shape;
      INFO("rotation " << rotation);
      CHECK(steel_area(grid_of(section).grid) == Approx(I_area(shape)).epsilon(1e-9));
      section.steel_shape->kind = SteelShapeKind::cross;
      CHECK(steel_area(grid_of(section).grid) == Approx(cross_area).epsilon(1e-9));
    }
  }
}

TEST_CASE("Grid lines on the edges of an upright shape leave no mixed cells") {
  Section section = tubed(Shape::square, 0.3, 0.006);
  section.steel_shape = SteelShape{SteelShapeKind::i_section, 0.16, 0.14, 0.009, 0.014, 355e6, 0.0};
  for (const Cell& cell : grid_of(section).grid.cells) {
    CHECK((cell.steel_fraction == 0.0 || cell.steel_fraction == 1.0));
  }
}

TEST_CASE("A point on an interface belongs to the inner layer") {
  const OrthogonalGrid grid = grid_of(tubed(Shape::square, 0.3, 0.006)).grid;
  const auto layer_at = [&](double x, double y) {
    const std::optional<GridPoint> at = in_solved_part(grid, {x, y});
    REQUIRE(at);
    const CellIndex cell = cell_at(grid, *at);
    return grid.cells[grid.index(cell.i, cell.j)].layer;
  };
  CHECK(layer_at(-0.144, 0.01) == Layer::core);
  CHECK(layer_at(-0.144, 0.144) == Layer::core);
  CHECK(layer_at(0.1445, -0.144) == Layer::tube);
  CHECK(layer_at(0.15, 0.15) == Layer::tube);
  CHECK_FALSE(in_solved_part(grid, {0.1501, 0.0}));
}
