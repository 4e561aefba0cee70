#include "cli/evidence/case_model.hpp"
#include "mechanical/confinement/confined_concrete.hpp"
#include "mechanical/confinement/slip.hpp"

namespace ringward::cli {
namespace {

class ConfinementModelCase : public CaseModel {
 public:
  double value(const std::string& quantity, const Arguments& at) override {
    if (quantity == "end of slip") return mechanical::slip_end_xi();
    if (quantity == "hoop share") return mechanical::wall_stress(argument(at, "xi")).hoop;
    if (quantity == "axial share") return mechanical::wall_stress(argument(at, "xi")).axial;
    // Over the strength and over the strain at the unconfined strength.
    const auto peak = [&at] {
      return mechanical::confined_peak(1.0, 1.0, argument(at, "pressure_over_strength"));
    };
    if (quantity == "confined strength ratio") return peak().strength_Pa;
    if (quantity == "confined strain ratio") return peak().eps_cc;
    unknown_quantity(quantity);
  }
};

}  // namespace

CaseModelPtr confinement_model(const CaseInput& input) {
  input.allow({});
  return std::make_unique<ConfinementModelCase>();
}

}  // namespace ringward::cli
