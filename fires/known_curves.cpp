#include <fmt/format.h>
#include <fmt/ranges.h>

#include "fires/nominal_curves.hpp"
#include "thermal/base/error.hpp"

namespace ringward::fires {
namespace {

std::vector<FireCurvePtr> nominal_curves() {
  return {standard_curve(), external_curve(), hydrocarbon_curve(), slow_curve(), astm_e119_curve()};
}

}  // namespace

std::vector<std::string> nominal_curve_names() {
  std::vector<std::string> names;
  for (const FireCurvePtr& curve : nominal_curves()) names.push_back(curve->name());
  return names;
}

FireCurvePtr nominal_curve(const std::string& name) {
  for (const FireCurvePtr& curve : nominal_curves()) {
    if (curve->name() == name) return curve;
  }
  throw Error(ErrorKind::bad_input, fmt::format("no nominal fire curve is called \"{}\"; known: {}",
                                                name, fmt::join(nominal_curve_names(), ", ")));
}

thermal::GasTemperature gas_temperature(const FireCurvePtr& curve, double duration_s) {
  thermal::GasTemperature gas;
  gas.T_C = [curve](double t_s) { return curve->gas_C(t_s); };
  for (const double kink_s : curve->kinks_s()) {
    if (kink_s > 0.0 && kink_s < duration_s) gas.kinks_s.push_back(kink_s);
  }
  gas.has_cooling = curve->cooling_starts_s() < duration_s;
  return gas;
}

}  // namespace ringward::fires
