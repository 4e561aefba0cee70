#include <catch2/catch.hpp>
#include <cmath>

#include "mechanical/member/equilibrium_path.hpp"
#include "mechanical/member/member_model.hpp"
#include "thermal/base/units.hpp"

using namespace ringward::mechanical;

namespace {

/// Two steel flanges of an elastic sandwich section: EI and EA are exact, yielding is far away.
struct Sandwich {
  FibreLayout layout;
  HotMaterials hot;
  double E_Pa = 200e9;
  double area_m2 = 1e-3;
  double arm_m = 0.1;

  explicit Sandwich(double yield_Pa = 1e15) {
    layout.steel = {{arm_m, 0.0, area_m2, 0}, {-arm_m, 0.0, area_m2, 0}};
    layout.extent_m = arm_m;
    layout.concrete_area_m2 = 1.0;
    hot.steel = {{.f_y_Pa = yield_Pa, .f_p_Pa = yield_Pa, .E_Pa = E_Pa, .thermal_strain = 0.0}};
    hot.concrete = {HotConcrete{}};
  }
  [[nodiscard]] double EI_Nm2() const { return 2.0 * E_Pa * area_m2 * arm_m * arm_m; }
  [[nodiscard]] HotSection section() const { return {layout, hot, TubeGrip{}, 40e6}; }
};

PathPoint loaded(const MemberModel& model, double N) {
  const EquilibriumPath path(model);
  const auto walk = path.walk_to_force(path.start(1e-6).value(), model.scaled_N(N));
  REQUIRE(walk.end == EquilibriumPath::End::at_force);
  return walk.point;
}

constexpr double kLength_m = 4.0;

}  // namespace

TEST_CASE("an elastic column with a half-sine imperfection amplifies it by 1 / (1 - N / N_cr)") {
  const Sandwich sandwich;
  const HotSection section = sandwich.section();
  const double pi = ringward::units::kPi;
  const double N_cr = pi * pi * sandwich.EI_Nm2() / (kLength_m * kLength_m);
  for (const DeflectedShape& shape : {half_sine_shape(kLength_m), integrated_shape(kLength_m, 8)}) {
    const MemberModel model(section, shape, {.imperfection_m = 0.01}, N_cr);
    const PathPoint point = loaded(model, 0.6 * N_cr);
    // Euler, exact for the half-sine; the integrated shape interpolates the sine: 1e-4 relative,
    // amplified by 1 / (1 - 0.6).
    const double moment = model.plane(point.q, 0).kappa_u_1_m * sandwich.EI_Nm2();
    CHECK(moment == Approx(0.6 * N_cr * 0.01 / (1.0 - 0.6)).epsilon(5e-4));
  }
}

TEST_CASE("an elastic column with equal end eccentricities follows the secant formula") {
  const Sandwich sandwich;
  const HotSection section = sandwich.section();
  const DeflectedShape shape = integrated_shape(kLength_m, 8);
  const double pi = ringward::units::kPi;
  const double N_cr = pi * pi * sandwich.EI_Nm2() / (kLength_m * kLength_m);
  const MemberModel model(section, shape, {.eccentricity_u_m = 0.02}, N_cr);
  for (const double share : {0.2, 0.5, 0.8}) {
    const PathPoint point = loaded(model, share * N_cr);
    const double moment = model.plane(point.q, 0).kappa_u_1_m * sandwich.EI_Nm2();
    const double exact = share * N_cr * 0.02 / std::cos(0.5 * pi * std::sqrt(share));
    // Secant formula, elastic beam-column theory, exact; interpolation error 1e-4 times the
    // amplification of up to 1 / (1 - 0.8).
    CHECK(moment == Approx(exact).epsilon(1e-3));
  }
}

TEST_CASE("constant end moments and proportional eccentricities agree at one load") {
  const Sandwich sandwich;
  const HotSection section = sandwich.section();
  const DeflectedShape shape = integrated_shape(kLength_m, 8);
  const double N = 4e5;
  const MemberModel by_moment(section, shape, {.moment_u_Nm = 0.03 * N}, 1e6);
  const MemberModel by_eccentricity(section, shape, {.eccentricity_u_m = 0.03}, 1e6);
  const PathPoint a = loaded(by_moment, N);
  const PathPoint b = loaded(by_eccentricity, N);
  CHECK(a.q(1) == Approx(b.q(1)).epsilon(1e-7));  // two solves to 1e-9 of the reference force
}

TEST_CASE("a biaxial column bends in the plane of its oblique eccentricity") {
  Sandwich sandwich;
  sandwich.layout.steel = {
      {0.1, 0.0, 1e-3, 0}, {-0.1, 0.0, 1e-3, 0}, {0.0, 0.1, 1e-3, 0}, {0.0, -0.1, 1e-3, 0}};
  const HotSection section = sandwich.section();
  const DeflectedShape shape = integrated_shape(kLength_m, 8);
  const MemberLoading oblique{
      .eccentricity_u_m = 0.012, .eccentricity_v_m = 0.016, .biaxial = true};
  const MemberModel biaxial(section, shape, oblique, 1e6);
  const MemberModel uniaxial(section, shape, {.eccentricity_u_m = 0.02}, 1e6);
  const StrainPlane two = biaxial.plane(loaded(biaxial, 5e5).q, 0);
  const StrainPlane one = uniaxial.plane(loaded(uniaxial, 5e5).q, 0);
  // The section is isotropic in EI: the oblique column is the uniaxial one turned by atan(4/3).
  CHECK(two.kappa_u_1_m == Approx(0.6 * one.kappa_u_1_m).epsilon(1e-7));
  CHECK(two.kappa_v_1_m == Approx(0.8 * one.kappa_u_1_m).epsilon(1e-7));
}

TEST_CASE("the limit load of an elastic-plastic sandwich column is its first-yield load") {
  // Flange force N/2 + N a / ((1 - N/N_cr) 2 arm) reaches A f_y: a quadratic in N (Perry-Robertson
  // form). After first yield of one flange the tangent stiffness in bending vanishes: a limit
  // point.
  const double yield_Pa = 355e6;
  const Sandwich sandwich(yield_Pa);
  const HotSection section = sandwich.section();
  const DeflectedShape shape = half_sine_shape(kLength_m);
  const double a = 0.01;
  const MemberModel model(section, shape, {.imperfection_m = a}, section.plastic_N());
  const EquilibriumPath path(model);
  const PathPoint top = path.walk_to_maximum(path.start(1e-6).value());
  const double pi = ringward::units::kPi;
  const double N_cr = pi * pi * sandwich.EI_Nm2() / (kLength_m * kLength_m);
  const double N_pl = 2.0 * sandwich.area_m2 * yield_Pa;
  const double b = N_pl + N_cr * (1.0 + a / sandwich.arm_m);
  const double N_y = 0.5 * (b - std::sqrt(b * b - 4.0 * N_pl * N_cr));
  // A kink is closed in on to 1e-8 of the reference force at best; 1e-5 leaves room for its corner.
  CHECK(model.axial_N(top.q) == Approx(N_y).epsilon(1e-5));
}
