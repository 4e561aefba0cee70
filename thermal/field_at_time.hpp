#pragma once

#include "thermal/temperature_data.hpp"

namespace ringward::thermal {

/// The kept fields seen at one time: a cubic in time for each cell, on demand.
class FieldAtTime {
 public:
  /// @throws Error(bad_input) when t_s lies outside the followed time
  FieldAtTime(const TemperatureHistory::Data& data, double t_s);

  [[nodiscard]] EnthalpyCurve::State state(std::size_t cell) const;
  [[nodiscard]] double peak_C(std::size_t cell) const;

 private:
  [[nodiscard]] double enthalpy(std::size_t cell) const;
  [[nodiscard]] double peak(std::size_t cell, double u) const;

  const TemperatureHistory::Data& data_;
  std::size_t left_ = 0;
  double value_left_ = 1, value_right_ = 0, rate_left_s_ = 0, rate_right_s_ = 0;
};

}  // namespace ringward::thermal
