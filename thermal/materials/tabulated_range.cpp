#include "thermal/materials/tabulated_range.hpp"

#include <algorithm>
#include <limits>
#include <string>

#include "thermal/base/error.hpp"

namespace ringward::thermal {
namespace {

TabulatedRange range_of(const PiecewiseLinear& table) {
  constexpr double kInfinity = std::numeric_limits<double>::infinity();
  if (table.points().size() == 1) return {-kInfinity, kInfinity};
  return {table.points().front().x, table.points().back().x};
}

}  // namespace

TabulatedRange common_range(const PiecewiseLinear& a, const PiecewiseLinear& b) {
  const TabulatedRange of_a = range_of(a);
  const TabulatedRange of_b = range_of(b);
  return {std::max(of_a.from_C, of_b.from_C), std::min(of_a.to_C, of_b.to_C)};
}

std::vector<double> kinks_of(const PiecewiseLinear& a, const PiecewiseLinear& b) {
  std::vector<double> kinks;
  for (const PiecewiseLinear* table : {&a, &b}) {
    if (table->points().size() == 1) continue;
    for (const auto& point : table->points()) kinks.push_back(point.x);
  }
  std::sort(kinks.begin(), kinks.end());
  kinks.erase(std::unique(kinks.begin(), kinks.end()), kinks.end());
  return kinks;
}

void require_positive(const PiecewiseLinear& table, const char* what) {
  for (const auto& point : table.points()) {
    if (!(point.y > 0.0)) {
      throw Error(ErrorKind::bad_input, std::string(what) + " must be above zero");
    }
  }
}

}  // namespace ringward::thermal
