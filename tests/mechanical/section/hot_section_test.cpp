#include "mechanical/section/hot_section.hpp"

#include <array>
#include <catch2/catch.hpp>

#include "mechanical/confinement/lateral_strain.hpp"
#include "tests/support/columns.hpp"
#include "thermal/base/units.hpp"

using namespace ringward;
using namespace ringward::mechanical;

namespace {

/// A round tubed column with bars, heated for a while, in oblique axes.
struct Heated {
  Column column = testing::round_column({.bars = 8});
  thermal::TemperatureHistory history;
  SectionMaterials materials;
  FibreLayout layout;

  Heated()
      : history(thermal::solve_heat_flow(column.section, testing::standard_fire(40), {})),
        materials(column, history),
        layout(fibre_layout(column.section, history.grid(), Direction{0.8, 0.6})) {}

  [[nodiscard]] HotSection at(double t_min, ConfinementModel model) const {
    const HotMaterials hot = materials.at(units::s_from_min(t_min));
    return {layout, hot, tube_grip(column, model, layout, hot), materials.cold_concrete_Pa()};
  }
};

const std::array<StrainPlane, 4> kPlanes{
    {{0.0008, 0.002, -0.001}, {0.004, 0.01, 0.006}, {0.009, 0.004, 0.0}, {0.006, -0.03, 0.02}}};

}  // namespace

// The pressure is the one root of a falling function: where the search starts cannot matter. Each
// search ends with a step below 1e-7 of the pressure at yield, some 0.5 Pa here: 1 Pa for two.
TEST_CASE("the pressure of the tube does not depend on where its search starts") {
  const Heated heated;
  int pressed = 0;
  for (const double t_min : {0.0, 5.0, 20.0}) {
    const HotSection section = heated.at(t_min, ConfinementModel::contact);
    for (double eps0 = 0.0; eps0 < 0.02; eps0 += 0.0004) {
      for (const double kappa : {0.0, 0.01, -0.04}) {
        const double from_none_Pa = section.response({eps0, kappa, 0.3 * kappa}).pressure_Pa;
        pressed += from_none_Pa > 0.0 ? 1 : 0;
        for (const double likely_Pa : {1e3, 1e6, 5e6, 1e9}) {
          CAPTURE(t_min, eps0, kappa, likely_Pa);
          CHECK(section.response({eps0, kappa, 0.3 * kappa}, likely_Pa).pressure_Pa ==
                Approx(from_none_Pa).margin(1.0));
        }
      }
    }
  }
  CHECK(pressed > 100);
}

TEST_CASE("the tangent of a section is the derivative of its forces, with every confinement") {
  const Heated heated;
  for (const ConfinementModel model :
       {ConfinementModel::none, ConfinementModel::contact, ConfinementModel::yield}) {
    for (const double t_min : {0.0, 5.0, 20.0}) {
      const HotSection section = heated.at(t_min, model);
      for (const StrainPlane& plane : kPlanes) {
        const SectionResponse r = section.response(plane);
        const double h = 1e-7;
        const SectionResponse up =
            section.response({plane.eps0 + h, plane.kappa_u_1_m, plane.kappa_v_1_m});
        const SectionResponse down =
            section.response({plane.eps0 - h, plane.kappa_u_1_m, plane.kappa_v_1_m});
        const SectionResponse bent =
            section.response({plane.eps0, plane.kappa_u_1_m + h, plane.kappa_v_1_m});
        const SectionResponse back =
            section.response({plane.eps0, plane.kappa_u_1_m - h, plane.kappa_v_1_m});
        CAPTURE(static_cast<int>(model), t_min, plane.eps0);
        // Central differences over kinks of single fibres: 0.2 % of the cold stiffness.
        const double EA_N = 4e9;
        CHECK((up.N_N - down.N_N) / (2 * h) == Approx(r.tangent(0, 0)).margin(2e-3 * EA_N));
        CHECK((up.M_u_Nm - down.M_u_Nm) / (2 * h) == Approx(r.tangent(1, 0)).margin(4e-4 * EA_N));
        CHECK((bent.N_N - back.N_N) / (2 * h) == Approx(r.tangent(0, 1)).margin(4e-4 * EA_N));
        CHECK((bent.M_v_Nm - back.M_v_Nm) / (2 * h) == Approx(r.tangent(2, 1)).margin(8e-5 * EA_N));
      }
    }
  }
}

TEST_CASE("the pressure of the tube is compatible with the strain of the core it presses") {
  const Heated heated;
  const double t_min = 15.0;
  const HotMaterials hot = heated.materials.at(units::s_from_min(t_min));
  const TubeGrip grip = tube_grip(heated.column, ConfinementModel::contact, heated.layout, hot);
  const HotSection section = heated.at(t_min, ConfinementModel::contact);
  int gripping = 0;
  for (const StrainPlane& plane : {StrainPlane{0.004, 0, 0}, StrainPlane{0.007, 0.004, 0},
                                   StrainPlane{0.010, 0, 0.004}, StrainPlane{0.016, 0, 0}}) {
    const double p_Pa = section.response(plane).pressure_Pa;
    // Lateral strain summed again, from the publication's equation solved by bisection per fibre.
    double mean = 0.0, area = 0.0;
    for (const Fibre& f : heated.layout.concrete) {
      if (f.area_m2 <= 0.0) continue;
      area += f.area_m2;
      const HotConcrete& c = hot.concrete[f.source];
      const double eps =
          plane.eps0 + plane.kappa_u_1_m * f.u_m + plane.kappa_v_1_m * f.v_m + c.thermal_strain;
      if (eps <= 0.0) continue;
      const double z = eps / (c.eps_c1 * 0.85 * (1.0 + 8.0 * p_Pa / std::max(c.f_c_Pa, 4e5)));
      double low = 0.0, high = 1e4;
      for (int k = 0; k < 200; ++k) {
        const double middle = 0.5 * (low + high);
        (LateralStrainCurve::phi(middle) < z ? low : high) = middle;
      }
      mean += f.area_m2 * low * c.eps_c1;
    }
    const double hoop_strain = mean / area + grip.free_hoop_strain;
    const double hoop_Pa =
        std::min(grip.hoop_cap_Pa, steel_stress(grip.steel, std::max(0.0, hoop_strain)).stress_Pa);
    CAPTURE(plane.eps0, hoop_strain);
    // The table's relative error 1e-8 times the steel's modulus: far below 1e-5 of yield.
    CHECK(p_Pa ==
          Approx(grip.pressure_per_hoop * hoop_Pa).margin(1e-5 * 355e6 * grip.pressure_per_hoop));
    gripping += p_Pa > 0.0 ? 1 : 0;
  }
  CHECK(gripping >= 2);
}

TEST_CASE("concrete under no strain but tension carries nothing, bars carry their yield") {
  const Heated heated;
  const SectionResponse pulled = heated.at(0.0, ConfinementModel::contact).response({-0.03, 0, 0});
  CHECK(pulled.pressure_Pa == 0.0);
  // 8 bars d 20 at 500 MPa, on the plateau between 2 % and 15 %: exact.
  CHECK(pulled.N_N == Approx(-8.0 * units::kPi * 1e-4 * 500e6).epsilon(1e-9));
}
