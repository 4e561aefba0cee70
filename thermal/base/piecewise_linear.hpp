#pragma once

#include <vector>

namespace ringward {

/// A function given by points, linear between them and constant outside.
class PiecewiseLinear {
 public:
  struct Point {
    double x = 0;
    double y = 0;
  };

  /// @param points at least one, x strictly increasing, all finite
  /// @throws Error(bad_input) when the points are empty, not increasing or not finite
  explicit PiecewiseLinear(std::vector<Point> points);
  explicit PiecewiseLinear(double constant);

  [[nodiscard]] double value(double x) const;
  [[nodiscard]] double slope(double x) const;  ///< 0 outside; the right-hand slope at a point
  /// Integral from the first point's x (negative to the left of it).
  [[nodiscard]] double integral(double x) const;
  [[nodiscard]] const std::vector<Point>& points() const { return points_; }

 private:
  std::vector<Point> points_;
  std::vector<double> integral_;
};

}  // namespace ringward
