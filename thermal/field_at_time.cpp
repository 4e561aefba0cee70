#include "thermal/field_at_time.hpp"

#include <fmt/format.h>

#include <algorithm>

#include "thermal/base/error.hpp"
#include "thermal/base/units.hpp"

namespace ringward::thermal {

FieldAtTime::FieldAtTime(const TemperatureHistory::Data& data, double t_s) : data_(data) {
  const std::vector<double>& times = data.times_s;
  const double hair_s = 1e-6;
  if (!(t_s >= -hair_s && t_s <= times.back() + hair_s)) {
    throw Error(ErrorKind::bad_input,
                fmt::format("no temperatures at {} min: the fire was followed to {} min",
                            units::min_from_s(t_s), units::min_from_s(times.back())));
  }
  const auto right = std::upper_bound(times.begin(), times.end(), t_s) - times.begin();
  const auto last = static_cast<std::ptrdiff_t>(times.size()) - 2;
  left_ = static_cast<std::size_t>(std::clamp<std::ptrdiff_t>(right - 1, 0, last));
  const double width_s = times[left_ + 1] - times[left_];
  const double s = std::clamp((t_s - times[left_]) / width_s, 0.0, 1.0);
  value_right_ = s * s * (3.0 - 2.0 * s);
  value_left_ = 1.0 - value_right_;
  rate_left_s_ = s * (1.0 - s) * (1.0 - s) * width_s;
  rate_right_s_ = -s * s * (1.0 - s) * width_s;
}

double FieldAtTime::enthalpy(std::size_t cell) const {
  return value_left_ * data_.u[left_][cell] + value_right_ * data_.u[left_ + 1][cell] +
         rate_left_s_ * data_.du_dt[left_][cell] + rate_right_s_ * data_.du_dt[left_ + 1][cell];
}

double FieldAtTime::peak(std::size_t cell, double u) const {
  // At a kept time itself its own peaks hold; in between those of the one before.
  const std::vector<double>& peaks = data_.peaks[value_right_ == 1.0 ? left_ + 1 : left_];
  return peaks.empty() ? u : peaks[cell];
}

EnthalpyCurve::State FieldAtTime::state(std::size_t cell) const {
  const double u = enthalpy(cell);
  return data_.equation->state(cell, u, peak(cell, u));
}

double FieldAtTime::peak_C(std::size_t cell) const {
  const double u = enthalpy(cell);
  return data_.equation->curve(cell).first_heating(std::max(u, peak(cell, u))).T_C;
}

}  // namespace ringward::thermal
