#pragma once

#include <optional>
#include <string>

namespace ringward::cli {

// Results are rounded to fixed digits, so that the same input gives the same bytes.
inline constexpr int kDigitsMinutes = 2;
inline constexpr int kDigitsFieldTemperature =
    2;  ///< `field` and `gas`: the temperature is the result
inline constexpr int kDigitsTemperature = 1;
inline constexpr int kDigitsMPa = 3;
inline constexpr int kDigitsForce = 1;
inline constexpr int kDigitsRatio = 4;

/// `value` rounded to the nearest multiple of 10^-digits, never a negative zero.
[[nodiscard]] double rounded(double value, int digits);

/// Seconds as minutes, rounded down to 0.01 min: a time that the column has surely reached.
[[nodiscard]] double minutes_down(double time_s);

/// Seconds as minutes, rounded up to 0.01 min: for an uncertainty.
[[nodiscard]] double minutes_up(double time_s);

/// `value` with that many decimals; "-" when it is not finite.
[[nodiscard]] std::string fixed(double value, int digits);
[[nodiscard]] std::string fixed(const std::optional<double>& value, int digits);

/// Minutes with one decimal, rounded down: a time that the column has surely reached.
[[nodiscard]] std::string tenths_down(double minutes);
/// Minutes with one decimal, rounded up: for an uncertainty.
[[nodiscard]] std::string tenths_up(double minutes);

/// The shortest text that reads back as `value`: "30", "7.5".
[[nodiscard]] std::string shortest(double value);

}  // namespace ringward::cli
