#include <fmt/format.h>

#include <algorithm>
#include <cmath>

#include "fires/nominal_curves.hpp"
#include "thermal/base/error.hpp"
#include "thermal/base/piecewise_linear.hpp"
#include "thermal/base/units.hpp"

namespace ringward::fires {
namespace {

constexpr double kNaturalConvection_W_m2K = 35.0;  ///< @source en1991-1-2-2002 3.3.1
constexpr std::size_t kFewestPointsToCompare = 3;

std::vector<PiecewiseLinear::Point> checked(const std::vector<TablePoint>& points) {
  std::vector<PiecewiseLinear::Point> checked_points;
  for (const TablePoint& point : points) {
    if (!(point.t_s >= 0.0)) {
      throw Error(ErrorKind::bad_input, "the times of a fire table must not be negative");
    }
    if (!(point.T_C > -units::kKelvinOffset)) {
      throw Error(ErrorKind::bad_input,
                  "the temperatures of a fire table must be numbers above absolute zero");
    }
    checked_points.push_back({point.t_s, point.T_C});
  }
  return checked_points;
}

class TableCurve final : public FireCurve {
 public:
  explicit TableCurve(const std::vector<TablePoint>& points) : table_(checked(points)) {}

  std::string name() const override { return "table"; }
  double gas_C(double t_s) const override { return table_.value(t_s); }
  std::vector<double> kinks_s() const override {
    std::vector<double> kinks;
    for (const PiecewiseLinear::Point& point : table_.points()) kinks.push_back(point.x);
    return kinks;
  }
  double cooling_starts_s() const override {
    const auto& points = table_.points();
    const auto falls = [](const auto& left, const auto& right) { return right.y < left.y; };
    const auto found = std::adjacent_find(points.begin(), points.end(), falls);
    return found == points.end() ? FireCurve::cooling_starts_s() : found->x;
  }
  bool is_nominal() const override { return false; }
  double convection_W_m2K() const override { return kNaturalConvection_W_m2K; }
  std::string source() const override { return "given in the input"; }

  Notices notices() const override {
    for (const std::string& known : nominal_curve_names()) {
      const FireCurvePtr curve = nominal_curve(known);
      if (follows(*curve)) return {ask_for_convection_of(*curve)};
    }
    return {};
  }

 private:
  /// Every point lies within 1 % or 5 K of the curve, wide enough for values rounded by hand.
  [[nodiscard]] bool follows(const FireCurve& curve) const {
    const auto& points = table_.points();
    const auto after_start = std::count_if(points.begin(), points.end(),
                                           [](const auto& point) { return point.x > 0.0; });
    if (static_cast<std::size_t>(after_start) < kFewestPointsToCompare) return false;
    return std::all_of(points.begin(), points.end(), [&curve](const auto& point) {
      const double expected_C = curve.gas_C(point.x);
      return std::abs(point.y - expected_C) <= std::max(5.0, 0.01 * expected_C);
    });
  }

  [[nodiscard]] static Notice ask_for_convection_of(const FireCurve& curve) {
    return {.code = "table-follows-nominal-curve",
            .severity = Severity::caution,
            .text = fmt::format("The fire table follows the curve \"{}\", whose convection "
                                "coefficient is {:g} W/m2K; a table takes {:g} W/m2K unless "
                                "fire.surface says otherwise. Give "
                                "fire.surface.convection_W_m2K = {:g} or the curve by its name.",
                                curve.name(), curve.convection_W_m2K(), kNaturalConvection_W_m2K,
                                curve.convection_W_m2K()),
            .source = curve.source()};
  }

  PiecewiseLinear table_;
};

}  // namespace

FireCurvePtr table_curve(std::vector<TablePoint> points) {
  return std::make_shared<TableCurve>(points);
}

}  // namespace ringward::fires
