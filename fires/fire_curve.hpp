#pragma once

#include <cmath>
#include <limits>
#include <memory>
#include <string>
#include <vector>

#include "thermal/base/notice.hpp"
#include "thermal/boundary/exposure.hpp"

namespace ringward::fires {

/// A fire: the gas temperature against time.
class FireCurve {
 public:
  virtual ~FireCurve() = default;
  [[nodiscard]] virtual std::string name() const = 0;        ///< as in the input, e.g. "standard"
  [[nodiscard]] virtual double gas_C(double t_s) const = 0;  ///< t_s >= 0
  [[nodiscard]] virtual std::vector<double> kinks_s() const { return {}; }
  /// The time after which the gas cools for the first time [s]; infinite when it never does.
  [[nodiscard]] virtual double cooling_starts_s() const {
    return std::numeric_limits<double>::infinity();
  }
  [[nodiscard]] bool has_cooling() const { return std::isfinite(cooling_starts_s()); }
  /// A fire of fire-resistance classes (R 30 ...): not parametric, table or constant.
  [[nodiscard]] virtual bool is_nominal() const { return true; }
  [[nodiscard]] virtual double convection_W_m2K() const {
    return 25.0;
  }                                                      ///< default of the surface
  [[nodiscard]] virtual std::string source() const = 0;  ///< key in docs/sources.toml + clause
  [[nodiscard]] virtual Notices notices() const {
    return {};
  }  ///< input outside the source's limits
};

using FireCurvePtr = std::shared_ptr<const FireCurve>;

enum class GrowthRate { slow, medium, fast };  ///< t_lim 25, 20, 15 min

/// EN 1991-1-2 Annex A. Fire load per m2 of the whole enclosure surface.
struct ParametricFire {
  double opening_factor_m05 = 0;
  double fire_load_enclosure_J_m2 = 0;
  double thermal_inertia_J_m2s05K = 0;
  GrowthRate growth = GrowthRate::medium;
};

struct TablePoint {
  double t_s = 0;
  double T_C = 0;
};

/// The curves that need no data: standard, external, hydrocarbon, slow, astm-e119.
[[nodiscard]] std::vector<std::string> nominal_curve_names();
/// @throws Error(bad_input) naming the known curves when `name` is none of them
[[nodiscard]] FireCurvePtr nominal_curve(const std::string& name);
[[nodiscard]] FireCurvePtr parametric_curve(const ParametricFire& fire);
/// @throws Error(bad_input) when times do not increase strictly from >= 0 or a value is not finite
[[nodiscard]] FireCurvePtr table_curve(std::vector<TablePoint> points);
[[nodiscard]] FireCurvePtr constant_curve(double T_C);

/// The curve as the heat flow takes it; kinks and cooling within [0, duration_s].
[[nodiscard]] thermal::GasTemperature gas_temperature(const FireCurvePtr& curve, double duration_s);

}  // namespace ringward::fires
