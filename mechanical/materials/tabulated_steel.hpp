#pragma once

#include <string>

#include "mechanical/materials/hot_table.hpp"
#include "mechanical/materials/material_laws.hpp"

namespace ringward::mechanical {

/// A steel given by its cold values and three published factors against temperature.
struct SteelTables {
  PiecewiseLinear k_y;  ///< effective yield strength over f_y
  PiecewiseLinear k_p;  ///< proportional limit over f_y
  PiecewiseLinear k_E;  ///< slope of the linear range over E_20
};

struct ColdSteel {
  double yield_Pa = 0;
  double gamma = 1;
  double E_Pa = 0;
};

/// Hot steel from tables; what T_max took away stays away, the thermal strain follows T.
class TabulatedSteel final : public SteelLaw {
 public:
  /// @throws Error(bad_input) when the yield strength over gamma is not above 0 and up to 1000 MPa
  /// (beyond about 1300 MPa the ellipse of the law has no solution), or gamma not above zero
  TabulatedSteel(std::string name, const ColdSteel& cold, const SteelTables& tables);

  [[nodiscard]] std::string name() const override { return name_; }
  [[nodiscard]] HotSteel at(double T_C, double T_max_C) const override;

 private:
  std::string name_;
  double f_y_Pa_;
  double E_Pa_;
  HotTable<3> table_;
};

}  // namespace ringward::mechanical
