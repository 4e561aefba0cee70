#include "mechanical/section/interaction.hpp"

#include <algorithm>
#include <catch2/catch.hpp>
#include <cmath>

#include "mechanical/section/hot_section.hpp"
#include "tests/support/columns.hpp"
#include "thermal/base/units.hpp"

using namespace ringward;
using namespace ringward::mechanical;

namespace {

thermal::TemperatureHistory heated(const Column& column, double minutes) {
  return thermal::solve_heat_flow(column.section, testing::standard_fire(minutes),
                                  {.accuracy = thermal::Accuracy::coarse});
}

double largest_moment(const InteractionDiagram& diagram) {
  double largest = 0.0;
  for (const InteractionPoint& p : diagram.points)
    largest = std::max(largest, std::abs(p.moment_Nm));
  return largest;
}

/// Twice the signed area of the turn at b: one sign all round means convex.
double turn(const InteractionPoint& a, const InteractionPoint& b, const InteractionPoint& c) {
  return (b.moment_Nm - a.moment_Nm) * (c.axial_N - b.axial_N) -
         (b.axial_N - a.axial_N) * (c.moment_Nm - b.moment_Nm);
}

bool is_inside(const InteractionDiagram& diagram, const InteractionPoint& point, double slack_Nm) {
  double least = 1e300, most = -1e300;
  const auto& p = diagram.points;
  const double top_N = p.front().axial_N;
  // The top is found by a search: a newton more is still at the top.
  if (point.axial_N > top_N && point.axial_N < top_N + 1.0) return true;
  for (std::size_t k = 0; k < p.size(); ++k) {
    const InteractionPoint& a = p[k];
    const InteractionPoint& b = p[(k + 1) % p.size()];
    if ((a.axial_N - point.axial_N) * (b.axial_N - point.axial_N) > 0.0 || a.axial_N == b.axial_N)
      continue;
    const double share = (point.axial_N - a.axial_N) / (b.axial_N - a.axial_N);
    const double moment = a.moment_Nm + share * (b.moment_Nm - a.moment_Nm);
    least = std::min(least, moment);
    most = std::max(most, moment);
  }
  return point.moment_Nm >= least - slack_Nm && point.moment_Nm <= most + slack_Nm;
}

}  // namespace

TEST_CASE("the N-M diagram of a symmetric section is symmetric, both ways alike for a square") {
  const Column column = testing::square_concrete_column(0.3);
  const auto history = heated(column, 60);
  const InteractionDiagram x = interaction(column, history, 3600, Axis::x);
  const InteractionDiagram y = interaction(column, history, 3600, Axis::y);
  REQUIRE(x.points.size() == y.points.size());
  const double scale = largest_moment(x);
  for (std::size_t k = 1; k < x.points.size(); ++k) {
    // Mirrored points are listed from the other end; solver tolerance 1e-6 of the largest moment.
    const InteractionPoint& mirror = x.points[x.points.size() - k];
    CHECK(x.points[k].moment_Nm == Approx(-mirror.moment_Nm).margin(1e-5 * scale));
    CHECK(x.points[k].moment_Nm == Approx(y.points[k].moment_Nm).margin(1e-4 * scale));
  }
}

TEST_CASE("the N-M diagram is closed by its tops: full compression and all bars in tension") {
  const Column column = testing::square_concrete_column(0.3);
  const auto history = heated(column, 1);
  const InteractionDiagram diagram = interaction(column, history, 0.0, Axis::x);
  const double bars_m2 = 4.0 * units::kPi * 0.025 * 0.025 / 4.0;
  const auto [low, high] = std::minmax_element(
      diagram.points.begin(), diagram.points.end(),
      [](const InteractionPoint& a, const InteractionPoint& b) { return a.axial_N < b.axial_N; });
  CHECK(low->axial_N == Approx(-bars_m2 * 500e6).epsilon(1e-9));
  // At 0.25 % all concrete is at its peak and the bars yield (500 MPa / 200 GPa): the plastic sum,
  // but for the 1.8e-7 that the standard's expansion of concrete leaves at 20 C: 1e-5.
  CHECK(high->axial_N == Approx((0.09 - bars_m2) * 30e6 + bars_m2 * 500e6).epsilon(1e-5));
  CHECK(high->moment_Nm == Approx(0.0).margin(1.0));
}

TEST_CASE("the cold N-M diagram is convex") {
  const Column column = testing::square_concrete_column(0.3);
  const InteractionDiagram diagram = interaction(column, heated(column, 1), 0.0, Axis::x);
  const auto& p = diagram.points;
  const double scale = 3e6 * largest_moment(diagram);
  for (std::size_t k = 0; k < p.size(); ++k) {
    CAPTURE(k, p[k].axial_N, p[k].moment_Nm);
    // Softening concrete rounds the corner where the bars start to yield: 1e-4 of N_0 M_0.
    CHECK(turn(p[k], p[(k + 1) % p.size()], p[(k + 2) % p.size()]) <= 1e-4 * scale);
  }
}

TEST_CASE("no strain plane gives forces outside the N-M diagram") {
  for (const double minutes : {1.0, 60.0}) {
    const Column column = testing::square_concrete_column(0.3);
    const auto history = heated(column, minutes);
    const double t_s = minutes == 1.0 ? 0.0 : 3600.0;
    const InteractionDiagram diagram = interaction(column, history, t_s, Axis::x);
    const SectionMaterials materials(column, history);
    const HotMaterials hot = materials.at(t_s);
    const FibreLayout layout = fibre_layout(column.section, history.grid(), Direction{1, 0});
    const HotSection section(layout, hot, TubeGrip{}, materials.cold_concrete_Pa());
    const double scale = largest_moment(diagram);
    double most = 0.0;
    for (double eps0 = -0.02; eps0 < 0.03; eps0 += 5e-4) {
      for (double kappa = 0.0; kappa < 0.3; kappa += 3e-3) {
        const SectionResponse r = section.response({eps0, kappa, 0.0});
        most = std::max(most, r.M_u_Nm);
        CAPTURE(minutes, eps0, kappa, r.N_N, r.M_u_Nm);
        // 40 levels of force: the chord lies within 1 % of the curve.
        CHECK(is_inside(diagram, {r.N_N, r.M_u_Nm}, 0.01 * scale));
      }
    }
    // The largest moment of all planes is found by the diagram (same steps, 1 %).
    CHECK(scale == Approx(most).epsilon(0.01));
  }
}

TEST_CASE("heating on one side shifts the N-M diagram and leaves it closed") {
  const Column column = testing::square_concrete_column(0.3);
  thermal::FireExposure fire = testing::standard_fire(60);
  fire.exposed.faces.fill(thermal::FaceCondition::ambient);
  fire.exposed.faces[0] = thermal::FaceCondition::heated;
  const auto history = thermal::solve_heat_flow(column.section, fire, {});
  const InteractionDiagram x = interaction(column, history, 3600, Axis::x);
  // The cold side (+x) is the strong one: the largest force acts there.
  CHECK(x.points.front().moment_Nm > 0.0);
  for (const InteractionPoint& p : x.points) {
    CHECK(std::isfinite(p.moment_Nm));
    CHECK(p.axial_N <= x.points.front().axial_N + 1.0);
  }
}
