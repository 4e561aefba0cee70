#include <algorithm>
#include <cmath>

#include "fires/nominal_curves.hpp"
#include "thermal/base/units.hpp"

namespace ringward::fires {
namespace {

/// theta_g = 660 (1 - 0.687 e^(-0.32 t) - 0.313 e^(-3.8 t)) + 20, t in min.
/// @source en1991-1-2-2002 3.2.2
class ExternalCurve final : public FireCurve {
 public:
  std::string name() const override { return "external"; }
  double gas_C(double t_s) const override {
    const double t = units::min_from_s(std::max(t_s, 0.0));
    return kStart_C + 660.0 * (1.0 - 0.687 * std::exp(-0.32 * t) - 0.313 * std::exp(-3.8 * t));
  }
  std::string source() const override { return "en1991-1-2-2002 3.2.2"; }
};

}  // namespace

FireCurvePtr external_curve() { return std::make_shared<ExternalCurve>(); }

}  // namespace ringward::fires
