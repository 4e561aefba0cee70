#include <algorithm>
#include <cmath>

#include "fires/nominal_curves.hpp"
#include "thermal/base/units.hpp"

namespace ringward::fires {
namespace {

/// theta_g = 1080 (1 - 0.325 e^(-0.167 t) - 0.675 e^(-2.5 t)) + 20, t in min; alpha_c = 50 W/m2K.
/// @source en1991-1-2-2002 3.2.3
class HydrocarbonCurve final : public FireCurve {
 public:
  std::string name() const override { return "hydrocarbon"; }
  double gas_C(double t_s) const override {
    const double t = units::min_from_s(std::max(t_s, 0.0));
    return kStart_C + 1080.0 * (1.0 - 0.325 * std::exp(-0.167 * t) - 0.675 * std::exp(-2.5 * t));
  }
  double convection_W_m2K() const override { return 50.0; }
  std::string source() const override { return "en1991-1-2-2002 3.2.3"; }
};

}  // namespace

FireCurvePtr hydrocarbon_curve() { return std::make_shared<HydrocarbonCurve>(); }

}  // namespace ringward::fires
