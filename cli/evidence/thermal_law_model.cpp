#include "cli/evidence/case_model.hpp"
#include "cli/evidence/thermal_law_reading.hpp"

namespace ringward::cli {
namespace {

constexpr double kSteelDensity_kg_m3 = 7850.0;  // en1993-1-2-2005 3.2.3

thermal::ConductivityLimit limit_of(const CaseInput& input) {
  const std::string word = input.text("conductivity");
  if (word == "upper") return thermal::ConductivityLimit::upper;
  if (word == "lower") return thermal::ConductivityLimit::lower;
  if (word != "joined") input.fail("conductivity", "must be upper, lower or joined");
  return thermal::ConductivityLimit::joined;
}

GivenLaw concrete_of(const CaseInput& input) {
  input.allow({"law", "moisture_percent", "density_kg_m3", "conductivity"});
  thermal::Core core;
  core.moisture_fraction = 0.01 * input.number("moisture_percent");
  core.density_kg_m3 = input.number("density_kg_m3");
  core.conductivity = limit_of(input);
  return {thermal::concrete_law_en1992(core), core.density_kg_m3};
}

GivenLaw numbers_of(const CaseInput& input) {
  input.allow({"law", "conductivity_W_mK", "specific_heat_J_kgK", "density_kg_m3"});
  const double density_kg_m3 = input.number("density_kg_m3");
  std::vector<PiecewiseLinear::Point> capacity = input.curve("specific_heat_J_kgK").points();
  for (PiecewiseLinear::Point& point : capacity) point.y *= density_kg_m3;
  return {
      thermal::table_law("numbers", input.curve("conductivity_W_mK"), PiecewiseLinear(capacity)),
      density_kg_m3};
}

class ThermalLawModel : public CaseModel {
 public:
  explicit ThermalLawModel(const CaseInput& input) : given_(read_thermal_law(input)) {}

  double value(const std::string& quantity, const Arguments& at) override {
    const double T_C = argument(at, "T_C");
    if (quantity == "conductivity") return given_.law->conductivity_W_mK(T_C);
    if (quantity == "heat capacity per cold mass") {
      return given_.law->heat_capacity_J_m3K(T_C) / given_.density_kg_m3;
    }
    unknown_quantity(quantity);
  }

 private:
  GivenLaw given_;
};

}  // namespace

GivenLaw read_thermal_law(const CaseInput& input) {
  const std::string word = input.text("law");
  if (word == "concrete") return concrete_of(input);
  if (word == "numbers") return numbers_of(input);
  if (word != "steel") input.fail("law", "must be concrete, steel or numbers");
  input.allow({"law"});
  return {thermal::steel_law_en1993(), kSteelDensity_kg_m3};
}

CaseModelPtr thermal_law_model(const CaseInput& input) {
  return std::make_unique<ThermalLawModel>(input);
}

}  // namespace ringward::cli
