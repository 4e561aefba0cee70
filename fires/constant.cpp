#include <cmath>

#include "fires/fire_curve.hpp"
#include "thermal/base/error.hpp"
#include "thermal/base/units.hpp"

namespace ringward::fires {
namespace {

class ConstantCurve final : public FireCurve {
 public:
  explicit ConstantCurve(double T_C) : T_C_(T_C) {}
  std::string name() const override { return "constant"; }
  double gas_C(double) const override { return T_C_; }
  bool is_nominal() const override { return false; }
  std::string source() const override { return "given in the input"; }

 private:
  double T_C_;
};

}  // namespace

FireCurvePtr constant_curve(double T_C) {
  if (!std::isfinite(T_C) || T_C <= -units::kKelvinOffset) {
    throw Error(ErrorKind::bad_input,
                "the constant gas temperature must be a number above absolute zero");
  }
  return std::make_shared<ConstantCurve>(T_C);
}

}  // namespace ringward::fires
