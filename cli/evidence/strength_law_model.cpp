#include <cmath>

#include "cli/evidence/case_model.hpp"
#include "mechanical/materials/material_laws.hpp"
#include "thermal/base/units.hpp"

namespace ringward::cli {
namespace {

using namespace mechanical;

/// A specimen at one temperature; force and elongation need its area and length.
struct Specimen {
  explicit Specimen(const CaseInput& input)
      : area_m2(input.number_or("area_mm2", NAN) * 1e-6),
        length_mm(input.number_or("length_mm", NAN)) {}

  [[nodiscard]] double common(const std::string& quantity, double strength_Pa,
                              double thermal_strain) const {
    if (quantity == "thermal strain") return thermal_strain;
    if (quantity == "elongation") return length_mm * thermal_strain;
    // Compression counts as negative in the publications that ask for a force.
    if (quantity == "ultimate force") return -units::kN_from_N(area_m2 * strength_Pa);
    unknown_quantity(quantity);
  }

  double area_m2, length_mm;
};

ConcreteLawPtr concrete_of(const CaseInput& input) {
  input.allow({"law", "strength_MPa", "aggregate", "area_mm2", "length_mm"});
  const std::string aggregate = input.text("aggregate");
  if (aggregate != "siliceous" && aggregate != "calcareous") {
    input.fail("aggregate", "must be siliceous or calcareous");
  }
  return concrete_en1992(
      units::Pa_from_MPa(input.number("strength_MPa")),
      aggregate == "siliceous" ? thermal::Aggregate::siliceous : thermal::Aggregate::calcareous,
      1.0);
}

SteelLawPtr steel_of(const CaseInput& input) {
  const double yield_Pa = units::Pa_from_MPa(input.number("yield_MPa"));
  if (input.text("law") == "steel") {
    input.allow({"law", "yield_MPa", "area_mm2", "length_mm"});
    return structural_steel_en1993(yield_Pa, 1.0);
  }
  input.allow({"law", "yield_MPa", "forming", "area_mm2", "length_mm"});
  const std::string forming = input.text("forming");
  if (forming != "hot-rolled" && forming != "cold-worked") {
    input.fail("forming", "must be hot-rolled or cold-worked");
  }
  return bars_en1992(
      yield_Pa,
      forming == "hot-rolled" ? thermal::BarForming::hot_rolled : thermal::BarForming::cold_worked,
      1.0);
}

class ConcreteModel : public CaseModel {
 public:
  explicit ConcreteModel(const CaseInput& input) : law_(concrete_of(input)), specimen_(input) {}

  double value(const std::string& quantity, const Arguments& at) override {
    const double T_C = argument(at, "T_C");
    // Cooled concrete: the highest temperature that it has seen.
    const double T_max_C = at.count("T_max_C") > 0 ? argument(at, "T_max_C") : T_C;
    const HotConcrete hot = law_->at(T_C, T_max_C);
    if (quantity == "strength ratio") return hot.f_c_Pa / law_->cold_strength_Pa();
    if (quantity == "strain at the strength") return hot.eps_c1;
    if (quantity == "strain at the end") return hot.eps_cu1;
    if (quantity == "stress ratio") {
      return concrete_stress(hot, argument(at, "strain")).stress_Pa / hot.f_c_Pa;
    }
    return specimen_.common(quantity, hot.f_c_Pa, hot.thermal_strain);
  }

 private:
  ConcreteLawPtr law_;
  Specimen specimen_;
};

class SteelModel : public CaseModel {
 public:
  explicit SteelModel(const CaseInput& input) : law_(steel_of(input)), specimen_(input) {}

  double value(const std::string& quantity, const Arguments& at) override {
    const double T_C = argument(at, "T_C");
    const HotSteel hot = law_->at(T_C, T_C);
    const HotSteel cold = law_->at(20.0, 20.0);
    if (quantity == "yield ratio") return hot.f_y_Pa / cold.f_y_Pa;
    if (quantity == "proportional limit ratio") return hot.f_p_Pa / cold.f_y_Pa;
    if (quantity == "stiffness ratio") return hot.E_Pa / cold.E_Pa;
    if (quantity == "stress ratio") {
      return steel_stress(hot, argument(at, "strain")).stress_Pa / hot.f_y_Pa;
    }
    return specimen_.common(quantity, hot.f_y_Pa, hot.thermal_strain);
  }

 private:
  SteelLawPtr law_;
  Specimen specimen_;
};

}  // namespace

CaseModelPtr strength_law_model(const CaseInput& input) {
  const std::string law = input.text("law");
  if (law == "concrete") return std::make_unique<ConcreteModel>(input);
  if (law != "steel" && law != "bars") input.fail("law", "must be concrete, steel or bars");
  return std::make_unique<SteelModel>(input);
}

}  // namespace ringward::cli
