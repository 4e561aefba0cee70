#include <algorithm>
#include <cmath>

#include "fires/nominal_curves.hpp"
#include "thermal/base/units.hpp"

namespace ringward::fires {
namespace {

/// theta_g = 20 + 345 log10(8 t + 1), t in min.
/// @source en1991-1-2-2002 3.2.1
class StandardCurve final : public FireCurve {
 public:
  std::string name() const override { return "standard"; }
  double gas_C(double t_s) const override {
    const double t = units::min_from_s(std::max(t_s, 0.0));
    return kStart_C + 345.0 * std::log10(8.0 * t + 1.0);
  }
  std::string source() const override { return "en1991-1-2-2002 3.2.1"; }
};

}  // namespace

FireCurvePtr standard_curve() { return std::make_shared<StandardCurve>(); }

}  // namespace ringward::fires
