#pragma once

#include <string>
#include <vector>

#include "thermal/section/section.hpp"

namespace ringward::cli {

/// A finite number, the whole of `text`.
/// @param option its name, for the message
/// @throws UsageError
[[nodiscard]] double number_option(const std::string& option, const std::string& text);

/// Times in minutes, separated by commas, as seconds: sorted, each once.
/// @throws UsageError when one is no number
[[nodiscard]] std::vector<double> times_option(const std::string& option, const std::string& text);

/// "X,Y" in mm from the centroid.
/// @throws UsageError
[[nodiscard]] thermal::Point point_option(const std::string& option, const std::string& text);

/// The class times up to the end of the followed time, and the end where none fits.
/// @param from_start whether 0 comes first
[[nodiscard]] std::vector<double> default_times_s(double end_s, bool from_start);

/// @throws Error(bad_input) naming the limit when a time lies outside the followed fire
void require_followed(const std::vector<double>& times_s, double end_s);

}  // namespace ringward::cli
