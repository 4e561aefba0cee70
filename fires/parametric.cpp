#include <fmt/format.h>

#include <algorithm>
#include <cmath>

#include "fires/nominal_curves.hpp"
#include "thermal/base/error.hpp"

// EN 1991-1-2:2002 Annex A. The annex counts time in hours and fire load in MJ/m2; here t is in s.
namespace ringward::fires {
namespace {

constexpr double kHour_s = 3600.0;
constexpr double kJoules_per_MJ = 1e6;  ///< divided by, so that whole numbers come back whole
constexpr double kReferenceOpening_m05 = 0.04;
constexpr double kReferenceInertia_J_m2s05K = 1160.0;
constexpr double kSmallFireLoad_MJ_m2 = 75.0;
constexpr const char* kSource = "en1991-1-2-2002 Annex A";

double limit_time_h(GrowthRate growth) {
  if (growth == GrowthRate::slow) return 25.0 / 60.0;
  return growth == GrowthRate::medium ? 20.0 / 60.0 : 15.0 / 60.0;
}

/// Gamma = (O/b)^2/(0.04/1160)^2.
/// @source en1991-1-2-2002 Annex A (A.2)
double time_factor(double O, double b) {
  const double ratio = (O / b) / (kReferenceOpening_m05 / kReferenceInertia_J_m2s05K);
  return ratio * ratio;
}

/// theta_g = 20 + 1325 (1 - 0.324 e^(-0.2 t*) - 0.204 e^(-1.7 t*) - 0.472 e^(-19 t*)).
/// @param t_star expanded time t Gamma [h]
/// @source en1991-1-2-2002 Annex A (A.1)
double heating_C(double t_star) {
  return kStart_C + 1325.0 * (1.0 - 0.324 * std::exp(-0.2 * t_star) -
                              0.204 * std::exp(-1.7 * t_star) - 0.472 * std::exp(-19.0 * t_star));
}

/// Fall of the gas temperature in expanded time: 625, 250 (3 - t*_max) or 250 K/h.
/// @source en1991-1-2-2002 Annex A (A.11)
double cooling_rate_K_h(double t_star_max) {
  if (t_star_max <= 0.5) return 625.0;
  return t_star_max < 2.0 ? 250.0 * (3.0 - t_star_max) : 250.0;
}

/// Where a fuel-controlled fire is slower than its openings allow: Gamma_lim with
/// O_lim = 0.1e-3 q_t,d/t_lim, times k for O > 0.04, q_t,d < 75 and b < 1160.
/// @source en1991-1-2-2002 Annex A (A.8) to (A.10)
double fuel_controlled_factor(double O, double q, double b, double t_lim_h) {
  const double factor = time_factor(0.1e-3 * q / t_lim_h, b);
  if (!(O > kReferenceOpening_m05 && q < kSmallFireLoad_MJ_m2 && b < kReferenceInertia_J_m2s05K)) {
    return factor;
  }
  const double k = 1.0 + (O - kReferenceOpening_m05) / kReferenceOpening_m05 *
                             (q - kSmallFireLoad_MJ_m2) / kSmallFireLoad_MJ_m2 *
                             (kReferenceInertia_J_m2s05K - b) / kReferenceInertia_J_m2s05K;
  if (!(k > 0.0)) {
    throw Error(ErrorKind::out_of_validity,
                fmt::format("annex A of EN 1991-1-2 gives no fire for an opening factor of {:g} "
                            "m^0.5, a fire load of {:g} MJ/m2 and a thermal inertia of {:g} "
                            "J/m2s^0.5K: its factor k falls to {:.3g}",
                            O, q, b, k));
  }
  return k * factor;
}

void require_positive(double value, const char* what) {
  if (!(value > 0.0 && std::isfinite(value))) {
    throw Error(ErrorKind::bad_input,
                fmt::format("the {} of the parametric fire must be above zero", what));
  }
}

struct Limits {
  const char* what;
  const char* unit;
  double from;
  double to;
};

void add_outside(Notices& notices, double value, const Limits& limits) {
  if (value >= limits.from && value <= limits.to) return;
  notices.push_back(
      {.code = "parametric-limits",
       .severity = Severity::caution,
       .text = fmt::format("The {} of {:g} {} lies outside the {:g} to {:g} {} to "
                           "which annex A of EN 1991-1-2 limits its parametric fire.",
                           limits.what, value, limits.unit, limits.from, limits.to, limits.unit),
       .source = kSource});
}

class ParametricCurve final : public FireCurve {
 public:
  explicit ParametricCurve(const ParametricFire& fire)
      : O_(fire.opening_factor_m05),
        q_MJ_m2_(fire.fire_load_enclosure_J_m2 / kJoules_per_MJ),
        b_(fire.thermal_inertia_J_m2s05K) {
    require_positive(O_, "opening factor");
    require_positive(q_MJ_m2_, "fire load");
    require_positive(b_, "thermal inertia");
    const double t_lim_h = limit_time_h(fire.growth);
    const double burnout_h = 0.2e-3 * q_MJ_m2_ / O_;  // (A.7), ventilation-controlled
    const bool is_fuel_controlled = burnout_h <= t_lim_h;
    t_max_h_ = std::max(burnout_h, t_lim_h);
    gamma_ = time_factor(O_, b_);
    heating_gamma_ =
        is_fuel_controlled ? fuel_controlled_factor(O_, q_MJ_m2_, b_, t_lim_h) : gamma_;
    max_C_ = heating_C(t_max_h_ * heating_gamma_);
    // x t*_max of (A.12) is t_max Gamma in either case.
    cooling_K_h_ = cooling_rate_K_h(burnout_h * gamma_) * gamma_;
  }

  std::string name() const override { return "parametric"; }
  double gas_C(double t_s) const override {
    const double t_h = std::max(t_s, 0.0) / kHour_s;
    if (t_h <= t_max_h_) return heating_C(t_h * heating_gamma_);
    return std::max(kStart_C, max_C_ - cooling_K_h_ * (t_h - t_max_h_));
  }
  std::vector<double> kinks_s() const override {
    return {t_max_h_ * kHour_s, (t_max_h_ + (max_C_ - kStart_C) / cooling_K_h_) * kHour_s};
  }
  double cooling_starts_s() const override { return t_max_h_ * kHour_s; }
  bool is_nominal() const override { return false; }
  double convection_W_m2K() const override { return 35.0; }
  std::string source() const override { return kSource; }

  Notices notices() const override {
    Notices notices;
    add_outside(notices, O_, {"opening factor", "m^0.5", 0.02, 0.20});
    add_outside(notices, b_, {"thermal inertia", "J/m2s^0.5K", 100.0, 2200.0});
    add_outside(notices, q_MJ_m2_, {"fire load", "MJ/m2 of enclosure surface", 50.0, 1000.0});
    return notices;
  }

 private:
  double O_;
  double q_MJ_m2_;
  double b_;
  double t_max_h_ = 0;
  double gamma_ = 0;
  double heating_gamma_ = 0;
  double max_C_ = 0;
  double cooling_K_h_ = 0;  ///< in real time
};

}  // namespace

FireCurvePtr parametric_curve(const ParametricFire& fire) {
  return std::make_shared<ParametricCurve>(fire);
}

}  // namespace ringward::fires
