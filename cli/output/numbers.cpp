#include "cli/output/numbers.hpp"

#include <fmt/format.h>

#include <cmath>

#include "thermal/base/units.hpp"

namespace ringward::cli {
namespace {

constexpr double kStepsPerMinute = 100.0;
// A time that is a whole number of steps up to floating-point noise stays where it is.
constexpr double kNoise_steps = 1e-6;

}  // namespace

double rounded(double value, int digits) {
  const double scale = std::pow(10.0, digits);
  return std::round(value * scale) / scale + 0.0;
}

double minutes_down(double time_s) {
  const double steps = units::min_from_s(time_s) * kStepsPerMinute;
  return std::floor(steps + kNoise_steps) / kStepsPerMinute;
}

double minutes_up(double time_s) {
  const double steps = units::min_from_s(time_s) * kStepsPerMinute;
  return std::ceil(steps - kNoise_steps) / kStepsPerMinute;
}

std::string fixed(double value, int digits) {
  if (!std::isfinite(value)) return "-";
  return fmt::format("{:.{}f}", rounded(value, digits), digits);
}

std::string fixed(const std::optional<double>& value, int digits) {
  return value ? fixed(*value, digits) : "-";
}

std::string tenths_down(double minutes) { return fixed(std::floor(minutes * 10 + 1e-6) / 10, 1); }

std::string tenths_up(double minutes) { return fixed(std::ceil(minutes * 10 - 1e-6) / 10, 1); }

std::string shortest(double value) { return fmt::format("{}", value); }

}  // namespace ringward::cli
