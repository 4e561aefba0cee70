#include "thermal/base/piecewise_linear.hpp"

#include <algorithm>
#include <cmath>

#include "thermal/base/error.hpp"

namespace ringward {
namespace {

void require_increasing(const std::vector<PiecewiseLinear::Point>& points) {
  if (points.empty()) throw Error(ErrorKind::bad_input, "a table needs at least one point");
  for (std::size_t i = 0; i < points.size(); ++i) {
    if (!std::isfinite(points[i].x) || !std::isfinite(points[i].y)) {
      throw Error(ErrorKind::bad_input, "a table holds a value that is not a finite number");
    }
    if (i > 0 && !(points[i].x > points[i - 1].x)) {
      throw Error(ErrorKind::bad_input, "the first column of a table must increase strictly");
    }
  }
}

}  // namespace

PiecewiseLinear::PiecewiseLinear(std::vector<Point> points) : points_(std::move(points)) {
  require_increasing(points_);
  integral_.assign(points_.size(), 0.0);
  for (std::size_t i = 1; i < points_.size(); ++i) {
    const double width = points_[i].x - points_[i - 1].x;
    integral_[i] = integral_[i - 1] + 0.5 * width * (points_[i].y + points_[i - 1].y);
  }
}

PiecewiseLinear::PiecewiseLinear(double constant)
    : PiecewiseLinear(std::vector<Point>{{0.0, constant}}) {}

double PiecewiseLinear::value(double x) const {
  if (x <= points_.front().x) return points_.front().y;
  if (x >= points_.back().x) return points_.back().y;
  const auto right = std::upper_bound(points_.begin(), points_.end(), x,
                                      [](double v, const Point& p) { return v < p.x; });
  const auto left = right - 1;
  return left->y + (right->y - left->y) * (x - left->x) / (right->x - left->x);
}

double PiecewiseLinear::slope(double x) const {
  if (x < points_.front().x || x >= points_.back().x) return 0.0;
  const auto right = std::upper_bound(points_.begin(), points_.end(), x,
                                      [](double v, const Point& p) { return v < p.x; });
  const auto left = right - 1;
  return (right->y - left->y) / (right->x - left->x);
}

double PiecewiseLinear::integral(double x) const {
  const Point& first = points_.front();
  const Point& last = points_.back();
  if (x <= first.x) return first.y * (x - first.x);
  if (x >= last.x) return integral_.back() + last.y * (x - last.x);
  const auto right = std::upper_bound(points_.begin(), points_.end(), x,
                                      [](double v, const Point& p) { return v < p.x; });
  const auto left = right - 1;
  const double base = integral_[static_cast<std::size_t>(left - points_.begin())];
  return base + 0.5 * (left->y + value(x)) * (x - left->x);
}

}  // namespace ringward
