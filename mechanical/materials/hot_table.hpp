#pragma once

#include <algorithm>
#include <array>
#include <cstddef>

#include "thermal/base/piecewise_linear.hpp"

namespace ringward::mechanical {

/// N quantities against temperature, linear between the published points, on a grid of equal
/// steps: looked up once for every fibre and minute of a fire, so without search or allocation.
/// Constant below 20 C and above 1200 C.
template <std::size_t N>
class HotTable {
 public:
  using Row = std::array<double, N>;

  /// @param columns published points; T = 20 C, and multiples of 50 C up to 1200 C
  explicit HotTable(const std::array<PiecewiseLinear, N>& columns) {
    for (std::size_t k = 0; k < N; ++k) {
      for (std::size_t i = 1; i < kRows; ++i) {
        rows_[i][k] = columns[k].value(static_cast<double>(i) * kStep_C);
      }
      // No published point lies at 0 C: the line from 20 to 50 C is drawn back to it.
      const double at_from = columns[k].value(kFrom_C);
      rows_[0][k] = rows_[1][k] - (rows_[1][k] - at_from) * kStep_C / (kStep_C - kFrom_C);
    }
  }

  [[nodiscard]] Row at(double T_C) const {
    const double x = std::clamp(T_C, kFrom_C, kTo_C) / kStep_C;
    const std::size_t i = std::min(static_cast<std::size_t>(x), kRows - 2);
    const double share = x - static_cast<double>(i);
    Row row;
    for (std::size_t k = 0; k < N; ++k) {
      row[k] = rows_[i][k] * (1.0 - share) + rows_[i + 1][k] * share;
    }
    return row;
  }

 private:
  static constexpr double kFrom_C = 20.0;
  static constexpr double kTo_C = 1200.0;
  static constexpr double kStep_C = 50.0;
  static constexpr std::size_t kRows = 25;

  std::array<Row, kRows> rows_{};
};

}  // namespace ringward::mechanical
