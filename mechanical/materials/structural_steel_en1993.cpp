#include "mechanical/materials/material_laws.hpp"
#include "mechanical/materials/tabulated_steel.hpp"

namespace ringward::mechanical {
namespace {

constexpr double kSteelE_Pa = 210e9;  ///< @source en1993-1-2-2005 3.2.1

/// k_y, k_p, k_E of carbon steel.
/// @source en1993-1-2-2005 Table 3.1
SteelTables carbon_steel() {
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
                                  {200, 0.807},
                                  {300, 0.613},
                                  {400, 0.42},
                                  {500, 0.36},
                                  {600, 0.18},
                                  {700, 0.075},
                                  {800, 0.05},
                                  {900, 0.0375},
                                  {1000, 0.025},
                                  {1100, 0.0125},
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
                                  {900, 0.0675},
                                  {1000, 0.045},
                                  {1100, 0.0225},
                                  {1200, 0.0}})};
}

}  // namespace

SteelLawPtr structural_steel_en1993(double yield_Pa, double gamma) {
  const ColdSteel cold{.yield_Pa = yield_Pa, .gamma = gamma, .E_Pa = kSteelE_Pa};
  return std::make_shared<TabulatedSteel>("steel EN 1993-1-2", cold, carbon_steel());
}

}  // namespace ringward::mechanical
