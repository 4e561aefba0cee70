#include "cli/evidence/case_model.hpp"
#include "mechanical/materials/material_laws.hpp"
#include "thermal/base/units.hpp"

namespace ringward::cli {
namespace {

using mechanical::HotSteel;

/// A square steel bar between rigid ends, its temperature linear over its depth. Compression
/// negative; the moment about the axis, positive where it pulls the hot edge.
class RestrainedBarModel : public CaseModel {
 public:
  explicit RestrainedBarModel(const CaseInput& input)
      : law_(mechanical::structural_steel_en1993(units::Pa_from_MPa(input.number("yield_MPa")),
                                                 1.0)),
        side_m_(units::m_from_mm(input.number("side_mm"))),
        cold_C_(input.number("cold_edge_C")),
        hot_C_(input.number("hot_edge_C")) {
    input.allow({"yield_MPa", "side_mm", "cold_edge_C", "hot_edge_C"});
  }

  double value(const std::string& quantity, const Arguments&) override {
    if (quantity == "stress at the hot edge") return units::MPa_from_Pa(stress_Pa(hot_C_));
    if (quantity == "axial force") return units::kN_from_N(integral(0));
    if (quantity == "moment") return units::kNm_from_Nm(integral(1));
    unknown_quantity(quantity);
  }

 private:
  [[nodiscard]] double stress_Pa(double T_C) const {
    const HotSteel hot = law_->at(T_C, T_C);
    return mechanical::steel_stress(hot, -hot.thermal_strain).stress_Pa;
  }

  /// Of the stress times the power of the distance from the middle; the midpoint rule leaves 1e-7.
  [[nodiscard]] double integral(int power) const {
    constexpr int kStrips = 4000;
    double sum = 0.0;
    for (int i = 0; i < kStrips; ++i) {
      const double share = (i + 0.5) / kStrips;
      const double z_m = (share - 0.5) * side_m_;
      sum += stress_Pa(cold_C_ + share * (hot_C_ - cold_C_)) * (power == 0 ? 1.0 : z_m);
    }
    return sum * side_m_ * side_m_ / kStrips;
  }

  mechanical::SteelLawPtr law_;
  double side_m_, cold_C_, hot_C_;
};

}  // namespace

CaseModelPtr restrained_bar_model(const CaseInput& input) {
  return std::make_unique<RestrainedBarModel>(input);
}

}  // namespace ringward::cli
