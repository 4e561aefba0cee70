#include "cli/evidence/case_model.hpp"
#include "fires/fire_curve.hpp"
#include "thermal/base/units.hpp"

namespace ringward::cli {
namespace {

fires::GrowthRate growth_of(const CaseInput& input) {
  const std::string word = input.text_or("growth", "medium");
  if (word == "slow") return fires::GrowthRate::slow;
  if (word == "fast") return fires::GrowthRate::fast;
  if (word != "medium") input.fail("growth", "must be slow, medium or fast");
  return fires::GrowthRate::medium;
}

fires::FireCurvePtr curve_of(const CaseInput& input) {
  input.allow(
      {"curve", "opening_m05", "fire_load_enclosure_MJ_m2", "thermal_inertia_J_m2s05K", "growth"});
  const std::string name = input.text("curve");
  if (name != "parametric") return fires::nominal_curve(name);
  return fires::parametric_curve(
      {.opening_factor_m05 = input.number("opening_m05"),
       .fire_load_enclosure_J_m2 = input.number("fire_load_enclosure_MJ_m2") * 1e6,
       .thermal_inertia_J_m2s05K = input.number("thermal_inertia_J_m2s05K"),
       .growth = growth_of(input)});
}

class FireModel : public CaseModel {
 public:
  explicit FireModel(const CaseInput& input) : curve_(curve_of(input)) {}

  double value(const std::string& quantity, const Arguments& at) override {
    if (quantity == "gas temperature") return curve_->gas_C(time_argument_s(at));
    if (quantity == "time of the maximum") return units::min_from_s(curve_->cooling_starts_s());
    if (quantity == "highest gas temperature") return curve_->gas_C(curve_->cooling_starts_s());
    unknown_quantity(quantity);
  }

 private:
  fires::FireCurvePtr curve_;
};

}  // namespace

CaseModelPtr fire_model(const CaseInput& input) { return std::make_unique<FireModel>(input); }

}  // namespace ringward::cli
