#include <algorithm>
#include <cmath>

#include "fires/nominal_curves.hpp"
#include "thermal/base/units.hpp"

namespace ringward::fires {
namespace {

constexpr double kKink_min = 21.0;

/// theta_g = 154 t^0.25 + 20 to 21 min, then 345 log10(8 (t - 20) + 1) + 20, t in min.
/// The two parts miss each other by 0.4 K at 21 min.
/// @source en1363-2-1999 slow heating curve
class SlowCurve final : public FireCurve {
 public:
  std::string name() const override { return "slow"; }
  double gas_C(double t_s) const override {
    const double t = units::min_from_s(std::max(t_s, 0.0));
    if (t <= kKink_min) return kStart_C + 154.0 * std::pow(t, 0.25);
    return kStart_C + 345.0 * std::log10(8.0 * (t - 20.0) + 1.0);
  }
  std::vector<double> kinks_s() const override { return {units::s_from_min(kKink_min)}; }
  std::string source() const override { return "en1363-2-1999 slow heating curve"; }
};

}  // namespace

FireCurvePtr slow_curve() { return std::make_shared<SlowCurve>(); }

}  // namespace ringward::fires
