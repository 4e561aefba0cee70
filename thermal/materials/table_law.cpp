#include <utility>

#include "thermal/materials/tabulated_range.hpp"
#include "thermal/materials/thermal_law.hpp"

namespace ringward::thermal {
namespace {

class TableLaw final : public ThermalLaw {
 public:
  TableLaw(std::string name, PiecewiseLinear conductivity, PiecewiseLinear capacity)
      : name_(std::move(name)),
        conductivity_(std::move(conductivity)),
        capacity_(std::move(capacity)),
        integral_at_zero_(capacity_.integral(0.0)) {}

  std::string name() const override { return name_; }
  double conductivity_W_mK(double T_C) const override { return conductivity_.value(T_C); }
  double heat_capacity_J_m3K(double T_C) const override { return capacity_.value(T_C); }
  double enthalpy_J_m3(double T_C) const override {
    return capacity_.integral(T_C) - integral_at_zero_;
  }
  double dried_heat_capacity_J_m3K(double T_C) const override { return capacity_.value(T_C); }
  double dried_enthalpy_J_m3(double T_C) const override { return enthalpy_J_m3(T_C); }
  std::vector<double> kinks_C() const override { return kinks_of(conductivity_, capacity_); }
  double valid_from_C() const override { return common_range(conductivity_, capacity_).from_C; }
  double valid_to_C() const override { return common_range(conductivity_, capacity_).to_C; }

 private:
  std::string name_;
  PiecewiseLinear conductivity_;
  PiecewiseLinear capacity_;
  double integral_at_zero_;
};

}  // namespace

ThermalLawPtr table_law(std::string name, PiecewiseLinear conductivity_W_mK,
                        PiecewiseLinear heat_capacity_J_m3K) {
  require_positive(conductivity_W_mK, "a tabulated conductivity");
  require_positive(heat_capacity_J_m3K, "a tabulated heat capacity");
  return std::make_shared<TableLaw>(std::move(name), std::move(conductivity_W_mK),
                                    std::move(heat_capacity_J_m3K));
}

}  // namespace ringward::thermal
