#include <catch2/catch.hpp>

#include "tests/thermal/field/problems.hpp"
#include "thermal/grid/section_grid.hpp"
#include "thermal/temperature_history.hpp"

using namespace ringward;
using namespace ringward::testing;

namespace {

/// Same grid lines, other arithmetic: what the time integration leaves, standard tolerance.
constexpr double kTimeError_K = 0.1;

TemperatureHistory solved(const Section& section, FireExposure fire) {
  return solve_heat_flow(section, fire, {Accuracy::coarse, 1.0});
}

std::vector<double> with_mirrored(const std::vector<double>& faces) {
  std::vector<double> all;
  for (auto face = faces.rbegin(); face != faces.rend(); ++face) {
    if (*face > 0.0) all.push_back(-*face);
  }
  all.insert(all.end(), faces.begin(), faces.end());
  return all;
}

/// A quarter's problem posed on the whole section, its grid lines mirrored.
HeatProblem whole_of_quarter(HeatProblem quarter, const Section& section) {
  const double core = 0.5 * section.core_width_m();
  quarter.grid = cartesian_grid(with_mirrored(quarter.grid.faces_1),
                                with_mirrored(quarter.grid.faces_2), [core](double x, double y) {
                                  const bool inside = std::abs(x) < core && std::abs(y) < core;
                                  return inside ? Layer::core : Layer::tube;
                                });
  for (Side side : kSides) set_side(quarter, side, 0);
  return quarter;
}

/// A ring's problem posed on a closed circle of sectors.
HeatProblem sectors_of_ring(HeatProblem ring, const Section& section, std::size_t sectors) {
  const double core = 0.5 * section.core_width_m();
  ring.grid = polar_grid(ring.grid.faces_1, evenly(0, 2 * units::kPi, sectors), Symmetry::none,
                         [core](double r, double) { return r < core ? Layer::core : Layer::tube; });
  ring.closed_circle = true;
  set_side(ring, Side::high_1, 0);
  return ring;
}

HeatRun tight(const FireExposure& fire) {
  HeatRun run;
  run.end_s = fire.duration_s;
  run.gas = fire.gas;
  run.tolerance = {1e-6, 1e-3, 5};
  return run;
}

}  // namespace

// Exact symmetry of the problem. Tolerance 0.02 K: both runs at a time tolerance of about 1e-3 K.
TEST_CASE("A quarter of a square answers as the whole square does") {
  const Section section = tubed(Shape::square, 0.2, 0.006, 0.01);
  const FireExposure fire = standard_fire(30);
  const HeatProblem quarter = heat_problem_of(section, fire, {Accuracy::coarse, 1.0});
  REQUIRE(quarter.grid.symmetry == Symmetry::quarter);
  const TemperatureHistory whole =
      solve_heat_problem(whole_of_quarter(quarter, section), tight(fire));
  const TemperatureHistory part = solve_heat_problem(quarter, tight(fire));
  REQUIRE(whole.statistics().cells == 4 * part.statistics().cells);
  for (const Point p :
       {Point{-0.06, 0.03}, Point{0.0, 0.0}, Point{0.09, -0.09}, Point{0.097, 0.01}}) {
    CHECK(whole.T_C(p, 1800) == Approx(part.T_C(p, 1800)).margin(0.02).epsilon(0));
  }
  CHECK(whole.statistics().stored_J_m == Approx(part.statistics().stored_J_m).epsilon(1e-4));
  CHECK(whole.tube_C(1800) == Approx(part.tube_C(1800)).margin(0.02).epsilon(0));
  CHECK(whole.core_face_C(1800) == Approx(part.core_face_C(1800)).margin(0.02).epsilon(0));
}

TEST_CASE("Rings of a round column answer as a full circle of sectors does") {
  const Section section = tubed(Shape::circular, 0.2, 0.005, 0.01);
  const FireExposure fire = standard_fire(30);
  const HeatProblem ring = heat_problem_of(section, fire, {Accuracy::coarse, 1.0});
  REQUIRE(ring.grid.symmetry == Symmetry::axisymmetric);
  const TemperatureHistory sectors =
      solve_heat_problem(sectors_of_ring(ring, section, 7), tight(fire));
  const TemperatureHistory rings = solve_heat_problem(ring, tight(fire));
  for (const Point p : {Point{-0.06, 0.03}, Point{0, 0}, Point{0.003, -0.002}, Point{0, 0.0975}}) {
    CHECK(sectors.T_C(p, 1800) == Approx(rings.T_C(p, 1800)).margin(0.02).epsilon(0));
  }
  CHECK(sectors.statistics().stored_J_m == Approx(rings.statistics().stored_J_m).epsilon(1e-4));
  CHECK(sectors.tube_C(1800) == Approx(rings.tube_C(1800)).margin(0.02).epsilon(0));
}

TEST_CASE("Turning the heated faces of a square turns the temperatures") {
  const Section section = tubed(Shape::square, 0.2, 0.006);
  FireExposure fire = standard_fire(60);
  fire.exposed.faces = {FaceCondition::heated, FaceCondition::heated, FaceCondition::heated,
                        FaceCondition::ambient};
  const TemperatureHistory top_free = solved(section, fire);
  fire.exposed.faces = {FaceCondition::ambient, FaceCondition::heated, FaceCondition::heated,
                        FaceCondition::heated};
  const TemperatureHistory left_free = solved(section, fire);
  CHECK(top_free.statistics().symmetry == Symmetry::half);
  CHECK(left_free.statistics().symmetry == Symmetry::half);
  for (const Point p : {Point{0.06, 0.09}, Point{-0.03, -0.05}, Point{0.09, 0.02}}) {
    // A quarter turn anticlockwise takes the top to the left.
    CHECK(left_free.T_C({-p.y_m, p.x_m}, 3600) ==
          Approx(top_free.T_C(p, 3600)).margin(kTimeError_K).epsilon(0));
  }
}

TEST_CASE("Two heated faces that meet leave no symmetry axis but the diagonal, which holds") {
  const Section section = tubed(Shape::square, 0.2, 0.006);
  FireExposure fire = standard_fire(30);
  fire.exposed.faces = {FaceCondition::heated, FaceCondition::ambient, FaceCondition::heated,
                        FaceCondition::built_in};
  fire.exposed.faces[static_cast<std::size_t>(Face::top)] = FaceCondition::ambient;
  const TemperatureHistory history = solved(section, fire);
  CHECK(history.statistics().symmetry == Symmetry::none);
  CHECK(history.T_C({-0.09, 0.03}, 1800) ==
        Approx(history.T_C({0.03, -0.09}, 1800)).margin(kTimeError_K).epsilon(0));
  CHECK(history.T_C({-0.09, 0.0}, 1800) > history.T_C({0.09, 0.0}, 1800) + 100.0);
}

TEST_CASE("Turning the heated arc of a circle turns the temperatures") {
  const Section section = tubed(Shape::circular, 0.2, 0.005);
  FireExposure fire = standard_fire(45);
  const double turn = units::rad_from_deg(37);
  fire.exposed.heated_arc = Arc{0, units::kPi};
  const TemperatureHistory plain = solved(section, fire);
  fire.exposed.heated_arc = Arc{turn, turn + units::kPi};
  const TemperatureHistory turned = solved(section, fire);
  CHECK(plain.statistics().symmetry == Symmetry::half);
  for (const Point p : {Point{0.06, 0.05}, Point{0.0, -0.07}, Point{0.0, 0.001}, Point{0.0, 0.0},
                        Point{0.02, 0.09}}) {
    const Point q{std::cos(turn) * p.x_m - std::sin(turn) * p.y_m,
                  std::sin(turn) * p.x_m + std::cos(turn) * p.y_m};
    CHECK(turned.T_C(q, 2700) == Approx(plain.T_C(p, 2700)).margin(kTimeError_K).epsilon(0));
  }
  CHECK(plain.T_C({0.05, 0.03}, 2700) ==
        Approx(plain.T_C({-0.05, 0.03}, 2700)).margin(kTimeError_K).epsilon(0));
  CHECK(plain.T_C({0.0, 0.09}, 2700) > plain.T_C({0.0, -0.09}, 2700) + 100.0);
}

TEST_CASE("Symmetry is found where outline, exposure and steel shape share it, and only there") {
  const ExposedParts all;
  Section circle = tubed(Shape::circular, 0.4, 0.005);
  const auto symmetry = [](const Section& section, const ExposedParts& exposed) {
    return grid_of_section(section, exposed, {Accuracy::coarse, 1.0}).grid.symmetry;
  };
  CHECK(symmetry(circle, all) == Symmetry::axisymmetric);
  SteelShape shape{SteelShapeKind::i_section, 0.2, 0.2, 0.01, 0.015, 355e6, 0.3};
  circle.steel_shape = shape;
  CHECK(symmetry(circle, all) == Symmetry::quarter);
  ExposedParts arc;
  arc.heated_arc = Arc{0.3 - 1.0, 0.3 + 1.0};
  CHECK(symmetry(circle, arc) == Symmetry::half);
  arc.heated_arc = Arc{0.5 - 1.0, 0.5 + 1.0};
  CHECK(symmetry(circle, arc) == Symmetry::none);
  circle.steel_shape.reset();
  arc.built_in_arc = Arc{0.5 + units::kPi - 0.2, 0.5 + units::kPi + 0.2};
  CHECK(symmetry(circle, arc) == Symmetry::half);
  arc.built_in_arc = Arc{0.5 + 2.0, 0.5 + 2.5};
  CHECK(symmetry(circle, arc) == Symmetry::none);

  Section square = tubed(Shape::square, 0.3, 0.006);
  CHECK(symmetry(square, all) == Symmetry::quarter);
  shape.rotation_rad = 0.5 * units::kPi;
  square.steel_shape = shape;
  CHECK(symmetry(square, all) == Symmetry::quarter);
  square.steel_shape->rotation_rad = 0.25 * units::kPi;
  CHECK(symmetry(square, all) == Symmetry::none);
  square.steel_shape->kind = SteelShapeKind::cross;
  CHECK(symmetry(square, all) == Symmetry::quarter);
}
