#include "fires/nominal_curves.hpp"
#include "thermal/base/piecewise_linear.hpp"
#include "thermal/base/units.hpp"

namespace ringward::fires {
namespace {

/// The tabulated points {min, C}, converted from the table's degrees Fahrenheit to 0.1 K.
/// @source astm-e119 standard time-temperature curve
std::vector<PiecewiseLinear::Point> points_min_C() {
  return {{0, 20.0},     {5, 537.8},    {10, 704.4},   {15, 759.4},  {20, 794.4},   {25, 821.1},
          {30, 843.3},   {35, 862.2},   {40, 878.3},   {45, 892.2},  {50, 905.0},   {55, 916.1},
          {60, 926.7},   {65, 936.7},   {70, 946.1},   {75, 954.4},  {80, 962.8},   {85, 970.6},
          {90, 977.8},   {95, 984.4},   {100, 990.6},  {105, 996.7}, {110, 1001.7}, {115, 1006.1},
          {120, 1010.0}, {180, 1051.7}, {240, 1093.3}, {480, 1260.0}};
}

std::vector<PiecewiseLinear::Point> points_s_C() {
  std::vector<PiecewiseLinear::Point> points = points_min_C();
  for (PiecewiseLinear::Point& point : points) point.x = units::s_from_min(point.x);
  return points;
}

/// The table, linear between its points and constant after the last.
/// @source astm-e119 standard time-temperature curve
class AstmE119Curve final : public FireCurve {
 public:
  std::string name() const override { return "astm-e119"; }
  double gas_C(double t_s) const override { return table_.value(t_s); }
  std::vector<double> kinks_s() const override {
    std::vector<double> kinks;
    for (const PiecewiseLinear::Point& point : table_.points()) kinks.push_back(point.x);
    return kinks;
  }
  std::string source() const override { return "astm-e119 standard time-temperature curve"; }

 private:
  PiecewiseLinear table_{points_s_C()};
};

}  // namespace

FireCurvePtr astm_e119_curve() { return std::make_shared<AstmE119Curve>(); }

}  // namespace ringward::fires
