#include "mechanical/materials/material_laws.hpp"
#include "mechanical/materials/tabulated_steel.hpp"

namespace ringward::mechanical {
namespace {

constexpr double kBarE_Pa = 200e9;  ///< @source en1992-1-1-2004 3.2.7(4)

/// f_sy, f_sp over f_yk and E_s over E_s,20 of class N.
/// @source en1992-1-2-2004 Table 3.2a, hot rolled
SteelTables hot_rolled() {
  return {.k_y = PiecewiseLinear({{400, 1.0},
                                  {500, 0.78},
                                  {600, 0.47},
                                  {700, 0.23},
                                  {800, 0.11},
                                  {900, 0.06},
                                  {1000, 0.04},
                                  {1100, 0.02},
                                  {1200, 0.0}}),
          .k_p = PiecewiseLinear({{20, 1.0},
                                  {100, 1.0},
                                  {200, 0.81},
                                  {300, 0.61},
                                  {400, 0.42},
                                  {500, 0.36},
                                  {600, 0.18},
                                  {700, 0.07},
                                  {800, 0.05},
                                  {900, 0.04},
                                  {1000, 0.02},
                                  {1100, 0.01},
                                  {1200, 0.0}}),
          .k_E = PiecewiseLinear({{20, 1.0},
                                  {100, 1.0},
                                  {200, 0.90},
                                  {300, 0.80},
                                  {400, 0.70},
                                  {500, 0.60},
                                  {600, 0.31},
                                  {700, 0.13},
                                  {800, 0.09},
                                  {900, 0.07},
                                  {1000, 0.04},
                                  {1100, 0.02},
                                  {1200, 0.0}})};
}

/// f_sy, f_sp over f_yk and E_s over E_s,20 of class N.
/// @source en1992-1-2-2004 Table 3.2a, cold worked
SteelTables cold_worked() {
  return {.k_y = PiecewiseLinear({{300, 1.0},
                                  {400, 0.94},
                                  {500, 0.67},
                                  {600, 0.40},
                                  {700, 0.12},
                                  {800, 0.11},
                                  {900, 0.08},
                                  {1000, 0.05},
                                  {1100, 0.03},
                                  {1200, 0.0}}),
          .k_p = PiecewiseLinear({{20, 1.0},
                                  {100, 0.96},
                                  {200, 0.92},
                                  {300, 0.81},
                                  {400, 0.63},
                                  {500, 0.44},
                                  {600, 0.26},
                                  {700, 0.08},
                                  {800, 0.06},
                                  {900, 0.05},
                                  {1000, 0.03},
                                  {1100, 0.02},
                                  {1200, 0.0}}),
          .k_E = PiecewiseLinear({{20, 1.0},
                                  {100, 1.0},
                                  {200, 0.87},
                                  {300, 0.72},
                                  {400, 0.56},
                                  {500, 0.40},
                                  {600, 0.24},
                                  {700, 0.08},
                                  {800, 0.06},
                                  {900, 0.05},
                                  {1000, 0.03},
                                  {1100, 0.02},
                                  {1200, 0.0}})};
}

}  // namespace

SteelLawPtr bars_en1992(double yield_Pa, thermal::BarForming forming, double gamma) {
  const ColdSteel cold{.yield_Pa = yield_Pa, .gamma = gamma, .E_Pa = kBarE_Pa};
  if (forming == thermal::BarForming::hot_rolled) {
    return std::make_shared<TabulatedSteel>("bars EN 1992-1-2, hot rolled", cold, hot_rolled());
  }
  return std::make_shared<TabulatedSteel>("bars EN 1992-1-2, cold worked", cold, cold_worked());
}

}  // namespace ringward::mechanical
