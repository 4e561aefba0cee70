#include "tests/support/generated_columns.hpp"

#include <fmt/format.h>

#include <cmath>
#include <initializer_list>
#include <random>
#include <stdexcept>
#include <vector>

#include "fires/fire_curve.hpp"
#include "mechanical/rating/rating.hpp"
#include "thermal/base/error.hpp"
#include "thermal/base/units.hpp"

namespace ringward::testing {
namespace {

using namespace mechanical;
using namespace thermal;

constexpr unsigned kSeed = 20'240;
constexpr double kFollowed_min = 240;

/// The engine is the same everywhere, the distributions of the standard library are not.
class Draw {
 public:
  explicit Draw(unsigned index) : engine_(kSeed + index) {}

  double between(double low, double high) {
    return low + (high - low) * static_cast<double>(engine_()) / 4294967295.0;
  }
  double whole(double low, double high, double step) {
    return low + step * std::round(between(0.0, (high - low) / step));
  }
  double mm(double low, double high, double step) {
    return units::m_from_mm(whole(low, high, step));
  }
  bool chance(double share) { return between(0.0, 1.0) < share; }
  template <class T>
  T one_of(std::initializer_list<T> values) {
    const auto last = static_cast<double>(values.size()) - 1e-9;
    return *(values.begin() + static_cast<std::ptrdiff_t>(between(0.0, last)));
  }

 private:
  std::mt19937 engine_;
};

double mm(double m) { return units::mm_from_m(m); }

Outline outline(Draw& draw) {
  const double kind = draw.between(0.0, 1.0);
  if (kind < 0.6) {
    const double d = draw.mm(200, 700, 10);
    return {Shape::circular, d, d};
  }
  const double side = draw.mm(200, 550, 10);
  if (kind < 0.8) return {Shape::square, side, side};
  return {Shape::rectangular, side, side + draw.mm(20, 300, 10)};
}

void add_tube(Draw& draw, Section& section) {
  if (draw.chance(section.is_circular() ? 0.2 : 0.45)) return;
  Tube tube;
  tube.thickness_m = draw.mm(3, 12, 1);
  tube.yield_Pa = units::Pa_from_MPa(draw.one_of({235.0, 355.0, 460.0}));
  tube.role = draw.chance(0.6) ? TubeRole::confining : TubeRole::composite;
  tube.end_gap_m = draw.mm(5, 40, 5);
  tube.friction = draw.whole(0.3, 0.5, 0.1);
  tube.contact_resistance_m2K_W = draw.one_of({0.0, 0.0, 0.005, 0.01});
  section.tube = tube;
}

void add_protection(Draw& draw, Section& section) {
  if (!section.tube || !draw.chance(0.3)) return;
  Protection layer;
  layer.thickness_m = draw.mm(5, 30, 5);
  layer.conductivity_W_mK =
      draw.chance(0.5)
          ? PiecewiseLinear(draw.whole(0.1, 0.25, 0.05))
          : PiecewiseLinear({{20.0, 0.12}, {400.0, 0.16}, {800.0, 0.25}, {1200.0, 0.4}});
  layer.density_kg_m3 = draw.whole(300, 800, 100);
  layer.specific_heat_J_kgK = PiecewiseLinear(draw.whole(900, 1200, 100));
  layer.moisture_fraction = draw.one_of({0.0, 0.0, 0.03});
  section.protection = layer;
}

Core core(Draw& draw) {
  Core core;
  core.strength_Pa = units::Pa_from_MPa(draw.one_of({25.0, 30.0, 40.0, 50.0, 60.0, 80.0}));
  core.aggregate = draw.chance(0.7) ? Aggregate::siliceous : Aggregate::calcareous;
  core.moisture_fraction = draw.one_of({0.0, 0.015, 0.03, 0.06, 0.1});
  core.density_kg_m3 = draw.whole(2200, 2400, 50);
  core.conductivity =
      draw.one_of({ConductivityLimit::upper, ConductivityLimit::lower, ConductivityLimit::joined});
  return core;
}

void add_bars(Draw& draw, Section& section) {
  if (section.tube && draw.chance(0.25)) return;
  BarGroup group;
  group.diameter_m = draw.one_of({0.012, 0.016, 0.02, 0.025, 0.032});
  group.yield_Pa = 500e6;
  group.forming = draw.chance(0.7) ? BarForming::hot_rolled : BarForming::cold_worked;
  const double axis_m = draw.mm(30, 60, 5);
  const double x = 0.5 * section.core_width_m() - axis_m;
  const double y = 0.5 * section.core_depth_m() - axis_m;
  if (section.is_circular()) {
    const auto count = static_cast<int>(draw.whole(6, 12, 2));
    for (int k = 0; k < count; ++k) {
      const double angle = 2.0 * units::kPi * k / count;
      group.positions.push_back({x * std::cos(angle), x * std::sin(angle)});
    }
  } else {
    group.positions = {{x, y}, {-x, y}, {-x, -y}, {x, -y}};
    if (draw.chance(0.5)) group.positions.insert(group.positions.end(), {{x, 0.0}, {-x, 0.0}});
  }
  section.bars.push_back(group);
}

void add_steel_shape(Draw& draw, Section& section) {
  if (!draw.chance(0.1) || section.core_width_m() < 0.3) return;
  SteelShape shape;
  shape.kind = draw.chance(0.5) ? SteelShapeKind::i_section : SteelShapeKind::cross;
  shape.depth_m = 0.14;
  shape.width_m = 0.1;
  shape.web_m = 0.008;
  shape.flange_m = 0.012;
  shape.yield_Pa = 355e6;
  section.steel_shape = shape;
}

Section section(Draw& draw) {
  Section section;
  section.outline = outline(draw);
  section.core = core(draw);
  add_tube(draw, section);
  add_protection(draw, section);
  add_bars(draw, section);
  add_steel_shape(draw, section);
  return section;
}

struct NamedFire {
  std::string name;
  FireExposure exposure;
};

fires::FireCurvePtr curve(Draw& draw) {
  const double kind = draw.between(0.0, 1.0);
  if (kind < 0.75) return fires::nominal_curve("standard");
  if (kind < 0.85) return fires::nominal_curve("hydrocarbon");
  return fires::parametric_curve({.opening_factor_m05 = draw.one_of({0.04, 0.06, 0.08}),
                                  .fire_load_enclosure_J_m2 = draw.one_of({200e6, 300e6, 400e6}),
                                  .thermal_inertia_J_m2s05K = 1200.0,
                                  .growth = fires::GrowthRate::medium});
}

std::string heat_some_faces(Draw& draw, ExposedParts& parts) {
  const int cold = draw.one_of({1, 2, 3});
  for (int face = 0; face < cold; ++face) {
    parts.faces[static_cast<std::size_t>(face)] =
        draw.chance(0.7) ? FaceCondition::ambient : FaceCondition::built_in;
  }
  return fmt::format(", {} faces heated", 4 - cold);
}

NamedFire fire(Draw& draw, bool circular) {
  const fires::FireCurvePtr gas = curve(draw);
  NamedFire fire;
  fire.name = gas->name();
  fire.exposure.duration_s = units::s_from_min(kFollowed_min);
  fire.exposure.surface.convection_W_m2K = gas->convection_W_m2K();
  fire.exposure.gas = fires::gas_temperature(gas, fire.exposure.duration_s);
  if (!draw.chance(0.25)) return fire;
  if (circular) {
    const double arc_deg = draw.one_of({90.0, 180.0, 270.0});
    fire.exposure.exposed.heated_arc = Arc{0.0, units::rad_from_deg(arc_deg)};
    fire.name += fmt::format(", arc {:.0f}", arc_deg);
  } else {
    fire.name += heat_some_faces(draw, fire.exposure.exposed);
  }
  return fire;
}

Member member(Draw& draw) {
  Member member;
  member.length_m = draw.mm(2500, 6000, 100);
  member.buckling_length_m = draw.one_of({0.5, 0.7, 1.0}) * member.length_m;
  member.imperfection_m = member.buckling_length_m / 400.0;
  return member;
}

void add_eccentricity(Draw& draw, Column& column) {
  if (draw.chance(0.5)) return;
  column.load.eccentricity_x_m =
      std::round(250.0 * draw.between(0.1, 1.0) * column.section.outline.width_m) / 1000.0;
  if (draw.chance(0.3)) column.load.eccentricity_y_m = column.load.eccentricity_x_m / 2.0;
}

ConfinementModel model(Draw& draw, const Section& section) {
  if (!section.is_circular() || !section.tube || section.tube->role != TubeRole::confining) {
    return ConfinementModel::none;
  }
  return draw.one_of({ConfinementModel::contact, ConfinementModel::contact, ConfinementModel::yield,
                      ConfinementModel::none});
}

std::string tube_words(const Section& section) {
  if (!section.tube) return "bare";
  return fmt::format(
      "{} {:.0f}{}{}", section.tube->role == TubeRole::confining ? "confining" : "composite",
      mm(section.tube->thickness_m), section.tube->contact_resistance_m2K_W > 0.0 ? " gap" : "",
      section.protection ? " protected" : "");
}

std::string description(const Column& column, const std::string& fire) {
  const Section& section = column.section;
  const std::string size =
      section.is_circular()
          ? fmt::format("round {:.0f}", mm(section.outline.width_m))
          : fmt::format("{:.0f}x{:.0f}", mm(section.outline.width_m), mm(section.outline.depth_m));
  const char* const models[] = {"none", "contact", "yield"};
  return fmt::format("{}; {}; {}; C{:.0f} u {:.1f} %{}; l0 {:.2f} m; e {:.0f}/{:.0f}; {}", size,
                     tube_words(section), models[static_cast<int>(column.confinement)],
                     units::MPa_from_Pa(section.core.strength_Pa),
                     100.0 * section.core.moisture_fraction, section.steel_shape ? " shape" : "",
                     column.member.buckling_length_m, mm(column.load.eccentricity_x_m),
                     mm(column.load.eccentricity_y_m), fire);
}

double coarse_resistance_min(const Column& column, const FireExposure& fire) {
  const Rating rating =
      rate(column, fire, Accuracy::coarse, {.bounds = false, .uncertainty = false});
  return units::min_from_s(rating.chosen.fire_resistance_s.value_or(fire.duration_s));
}

/// Raises or lowers a drawn load until the column falls in time. False when it never does.
bool set_load(Draw& draw, Column& column, const FireExposure& fire) {
  const Section& section = column.section;
  double load_N = draw.between(0.1, 0.6) * section.core.strength_Pa * section.core_width_m() *
                  section.core_depth_m();
  for (int attempt = 0; attempt < 8; ++attempt) {
    column.load.axial_N = 1000.0 * std::round(1e-3 * load_N);
    if (column.load.axial_N < 50e3) return false;
    const double R_min = coarse_resistance_min(column, fire);
    if (R_min > 20.0 && R_min < 150.0) return true;
    load_N *= R_min <= 20.0 ? 0.7 : 1.3;
  }
  return false;
}

}  // namespace

GeneratedColumn generated_column(unsigned index) {
  Draw draw(index);
  for (int attempt = 0; attempt < 50; ++attempt) {
    Column column;
    column.section = section(draw);
    column.member = member(draw);
    column.confinement = model(draw, column.section);
    add_eccentricity(draw, column);
    const NamedFire fire = testing::fire(draw, column.section.is_circular());
    if (set_load(draw, column, fire.exposure)) {
      return {description(column, fire.name), column, fire.exposure};
    }
  }
  throw std::runtime_error("no column found");
}

}  // namespace ringward::testing
