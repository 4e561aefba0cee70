#include <catch2/catch.hpp>

#include "tests/thermal/field/problems.hpp"
#include "thermal/grid/distances.hpp"
#include "thermal/grid/graded_faces.hpp"
#include "thermal/temperature_history.hpp"

using namespace ringward;
using namespace ringward::testing;

// Manufactured solutions: a smooth T(x, y, t) is chosen, the heat source and the gas temperature
// along the outline follow from it, and the solver has to find T again. lambda = a + b T.
namespace {

constexpr double kAlpha_W_m2K = 100;
constexpr double kCapacity_J_m3K = 2e6;
constexpr double kSize_m = 0.1;
constexpr double kEnd_s = 300;
constexpr double kA = 2.0;
constexpr double kB = -1e-3;

/// T = 300 + 150 g(t) sin(x/s + 0.4) cos(1.5 y/s), s = 0.1 m, g = 1 + t/600.
struct Smooth {
  double value = 0, rate = 0, dx = 0, dy = 0, laplacian = 0;
};

Smooth smooth(double t_s, double x, double y) {
  const double s = kSize_m;
  const double g = 1.0 + t_s / 600.0;
  const double sx = std::sin(x / s + 0.4);
  const double cy = std::cos(1.5 * y / s);
  Smooth f;
  f.value = 300.0 + 150.0 * g * sx * cy;
  f.rate = 150.0 / 600.0 * sx * cy;
  f.dx = 150.0 * g / s * std::cos(x / s + 0.4) * cy;
  f.dy = -150.0 * g * 1.5 / s * sx * std::sin(1.5 * y / s);
  f.laplacian = -150.0 * g * (1.0 + 2.25) / (s * s) * sx * cy;
  return f;
}

double source(double t_s, double x, double y) {
  const Smooth f = smooth(t_s, x, y);
  const double conducted = (kA + kB * f.value) * f.laplacian + kB * (f.dx * f.dx + f.dy * f.dy);
  return kCapacity_J_m3K * f.rate - conducted;
}

/// Gas temperature that drives the flow lambda dT/dn through a face of outward normal (nx, ny).
SurfaceCondition driven(std::function<Point(double, double)> normal) {
  SurfaceCondition condition;
  condition.convection_W_m2K = kAlpha_W_m2K;
  condition.T_C_at = [normal](double t_s, double x, double y) {
    const Smooth f = smooth(t_s, x, y);
    const Point n = normal(x, y);
    return f.value + (kA + kB * f.value) * (f.dx * n.x_m + f.dy * n.y_m) / kAlpha_W_m2K;
  };
  return condition;
}

HeatProblem with_material_and_source(OrthogonalGrid grid) {
  HeatProblem problem;
  problem.grid = std::move(grid);
  problem.core =
      table_law("manufactured", PiecewiseLinear({{-100, kA - 100 * kB}, {1600, kA + 1600 * kB}}),
                PiecewiseLinear(kCapacity_J_m3K));
  problem.initial_C_at = [](double x, double y) { return smooth(0, x, y).value; };
  problem.source_W_m3 = source;
  return problem;
}

/// Graded from both ends; `factor` scales every cell.
std::vector<double> graded(double factor) {
  const SizeLaw size = SizeLaw{.first_m = 6e-3, .growth = 0.15, .largest_m = 12e-3}.scaled(factor);
  return graded_faces({{-kSize_m, 0, -kSize_m, size, 1}, {0, kSize_m, kSize_m, size, 1}});
}

HeatProblem cartesian(double factor) {
  HeatProblem problem =
      with_material_and_source(cartesian_grid(graded(factor), graded(factor), all_core));
  for (const Point n : {Point{-1, 0}, Point{1, 0}, Point{0, -1}, Point{0, 1}}) {
    problem.conditions.push_back(driven([n](double, double) { return n; }));
  }
  for (Side side : kSides) set_side(problem, side, static_cast<int>(side));
  return problem;
}

HeatProblem polar(double factor) {
  const SizeLaw size = SizeLaw{.first_m = 6e-3, .growth = 0.15, .largest_m = 12e-3}.scaled(factor);
  const auto angles = static_cast<std::size_t>(std::lround(24 / factor));
  HeatProblem problem = with_material_and_source(
      polar_grid(graded_faces({{0, kSize_m, kSize_m, size, 1}}), evenly(0, 2 * units::kPi, angles),
                 Symmetry::none, all_core));
  problem.closed_circle = true;
  problem.conditions.push_back(driven([](double x, double y) {
    const double r = std::hypot(x, y);
    return Point{x / r, y / r};
  }));
  set_side(problem, Side::high_1, 0);
  return problem;
}

/// Root mean square over the area, and the largest error at the middles of the cells.
struct Errors {
  double mean_K = 0, largest_K = 0;
};

Errors errors(HeatProblem problem) {
  const TemperatureHistory history =
      solve_heat_problem(std::move(problem), exact_run(kEnd_s, 1e-5, kCapacity_J_m3K));
  const OrthogonalGrid& grid = history.grid();
  std::vector<double> cells_C(grid.cells.size());
  history.temperatures_C(kEnd_s, cells_C);
  Errors found;
  double area = 0;
  for (std::size_t j = 0; j < grid.count_2(); ++j) {
    for (std::size_t i = 0; i < grid.count_1(); ++i) {
      const std::size_t cell = grid.index(i, j);
      const Point at = middle_point(grid, {i, j});
      const double off = std::abs(cells_C[cell] - smooth(kEnd_s, at.x_m, at.y_m).value);
      found.largest_K = std::max(found.largest_K, off);
      found.mean_K += off * off * grid.cells[cell].area_m2;
      area += grid.cells[cell].area_m2;
    }
  }
  found.mean_K = std::sqrt(found.mean_K / area);
  return found;
}

void check_second_order(const std::function<HeatProblem(double)>& pose) {
  const Errors coarse = errors(pose(1.0));
  const Errors middle = errors(pose(0.5));
  const Errors fine = errors(pose(0.25));
  INFO("mean " << coarse.mean_K << " " << middle.mean_K << " " << fine.mean_K << " K, largest "
               << coarse.largest_K << " " << middle.largest_K << " " << fine.largest_K << " K");
  CHECK(std::log2(coarse.mean_K / middle.mean_K) > 1.8);
  CHECK(std::log2(middle.mean_K / fine.mean_K) > 1.8);
  CHECK(std::log2(middle.largest_K / fine.largest_K) > 1.7);
}

}  // namespace

// Method of manufactured solutions (common practice, no source). Order at least 1.8 on the mean;
// 1.7 on the largest error, which sits in single cells next to the outline or the pole.
TEST_CASE("A Cartesian grid converges with second order on a manufactured solution") {
  check_second_order(cartesian);
}

TEST_CASE("A polar grid converges with second order on a manufactured solution") {
  check_second_order(polar);
}

namespace {

// A round core in a ring, constant conductivities, contact resistance between them:
// core T = 200 + 100 g cos(r/s); ring T = T_face - R q - q/k (r - a) + 2e4 (r - a)^2 g.
constexpr double kFace_m = 0.08;
constexpr double kOuter_m = 0.1;
constexpr double kCoreLambda = 1.5;
constexpr double kRingLambda = 4.0;
constexpr double kContact_m2K_W = 0.01;

struct Radial {
  double value = 0, rate = 0, slope = 0, laplacian = 0;
};

Radial layered(double t_s, double r) {
  const double g = 1.0 + t_s / 600.0;
  const double s = 0.05;
  const auto core = [&](double at) {
    const double c = 100.0 * std::cos(at / s);
    const double d = -100.0 / s * std::sin(at / s);
    const double over_r = at > 0 ? d / at : -100.0 / (s * s);
    return Radial{200.0 + g * c, c / 600.0, g * d, g * (-c / (s * s) + over_r)};
  };
  if (r <= kFace_m) return core(r);
  const Radial face = core(kFace_m);
  const double q = -kCoreLambda * face.slope / g;  // of g = 1
  const double x = r - kFace_m;
  const double shape =
      (face.value - 200.0) / g - kContact_m2K_W * q - q / kRingLambda * x + 2e4 * x * x;
  const double slope = -q / kRingLambda + 4e4 * x;
  return {200.0 + g * shape, shape / 600.0, g * slope, g * (4e4 + slope / r)};
}

double layered_error_K(std::size_t cells) {
  std::vector<double> radii = evenly(0, kFace_m, 4 * cells);
  for (double r : evenly(kFace_m, kOuter_m, cells)) {
    if (r > kFace_m + 1e-9) radii.push_back(r);
  }
  HeatProblem problem;
  problem.grid =
      polar_grid(radii, {0, 2 * units::kPi}, Symmetry::axisymmetric,
                 [](double r, double) { return r < kFace_m ? Layer::core : Layer::tube; });
  problem.core = constant_law(kCoreLambda, kCapacity_J_m3K);
  problem.tube = constant_law(kRingLambda, kCapacity_J_m3K);
  problem.contact_resistance_m2K_W = kContact_m2K_W;
  SurfaceCondition gas = convection(kAlpha_W_m2K, 0);
  gas.T_C = [](double t_s) {
    const Radial f = layered(t_s, kOuter_m);
    return f.value + kRingLambda * f.slope / kAlpha_W_m2K;
  };
  problem.conditions = {gas};
  set_side(problem, Side::high_1, 0);
  problem.initial_C_at = [](double r, double) { return layered(0, r).value; };
  problem.source_W_m3 = [](double t_s, double r, double) {
    const Radial f = layered(t_s, r);
    return kCapacity_J_m3K * f.rate - (r < kFace_m ? kCoreLambda : kRingLambda) * f.laplacian;
  };
  const TemperatureHistory history =
      solve_heat_problem(std::move(problem), exact_run(kEnd_s, 1e-5, kCapacity_J_m3K));
  double largest = 0;
  for (double r : {0.0, 0.031, 0.0795, 0.0805, 0.09, 0.1}) {
    largest = std::max(largest, std::abs(history.T_C({r, 0}, kEnd_s) - layered(kEnd_s, r).value));
  }
  largest =
      std::max(largest, std::abs(history.core_face_C(kEnd_s) - layered(kEnd_s, kFace_m).value));
  return largest;
}

}  // namespace

// Manufactured as above; points within the layers, at the surface and on the core's face, so that
// the interpolation and the face temperatures are covered too.
TEST_CASE("Points in and on two layers with contact resistance converge with second order") {
  const double coarse = layered_error_K(5);
  const double middle = layered_error_K(10);
  const double fine = layered_error_K(20);
  INFO(coarse << " " << middle << " " << fine << " K");
  CHECK(std::log2(coarse / middle) > 1.8);
  CHECK(std::log2(middle / fine) > 1.8);
  CHECK(fine < 0.05);
}
