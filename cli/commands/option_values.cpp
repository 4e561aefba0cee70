#include "cli/commands/option_values.hpp"

#include <algorithm>
#include <charconv>
#include <cmath>

#include "cli/commands/usage_error.hpp"
#include "cli/output/numbers.hpp"
#include "cli/output/verdict.hpp"
#include "thermal/base/error.hpp"
#include "thermal/base/units.hpp"

namespace ringward::cli {
namespace {

std::vector<std::string> split_at_commas(const std::string& text) {
  std::vector<std::string> parts(1);
  for (const char c : text) {
    if (c == ',') {
      parts.emplace_back();
    } else {
      parts.back() += c;
    }
  }
  return parts;
}

std::string trimmed(const std::string& text) {
  const std::size_t begin = text.find_first_not_of(" \t");
  if (begin == std::string::npos) return "";
  return text.substr(begin, text.find_last_not_of(" \t") - begin + 1);
}

}  // namespace

double number_option(const std::string& option, const std::string& text) {
  const std::string word = trimmed(text);
  // from_chars takes no plus sign.
  const char* begin = word.data() + (word.starts_with('+') ? 1 : 0);
  const char* end = word.data() + word.size();
  double value = 0;
  const auto [stop, problem] = std::from_chars(begin, end, value);
  if (problem != std::errc() || stop != end || !std::isfinite(value)) {
    throw UsageError(option + ": \"" + text + "\" is not a number");
  }
  return value;
}

std::vector<double> times_option(const std::string& option, const std::string& text) {
  std::vector<double> times_s;
  for (const std::string& part : split_at_commas(text)) {
    times_s.push_back(units::s_from_min(number_option(option, part)));
  }
  std::sort(times_s.begin(), times_s.end());
  times_s.erase(std::unique(times_s.begin(), times_s.end()), times_s.end());
  return times_s;
}

thermal::Point point_option(const std::string& option, const std::string& text) {
  const std::vector<std::string> parts = split_at_commas(text);
  if (parts.size() != 2) {
    throw UsageError(option + ": \"" + text + "\" is not X,Y, two numbers in mm");
  }
  return {units::m_from_mm(number_option(option, parts[0])),
          units::m_from_mm(number_option(option, parts[1]))};
}

std::vector<double> default_times_s(double end_s, bool from_start) {
  std::vector<double> times_s;
  if (from_start) times_s.push_back(0.0);
  for (const int time_min : class_times_min()) {
    if (units::s_from_min(time_min) <= end_s) times_s.push_back(units::s_from_min(time_min));
  }
  if (times_s.empty()) times_s.push_back(end_s);
  return times_s;
}

void require_followed(const std::vector<double>& times_s, double end_s) {
  for (const double time_s : times_s) {
    if (time_s >= 0 && time_s <= end_s) continue;
    throw Error(ErrorKind::bad_input,
                "--at " + shortest(rounded(units::min_from_s(time_s), kDigitsMinutes)) +
                    ": the fire is followed from 0 to " +
                    shortest(rounded(units::min_from_s(end_s), kDigitsMinutes)) +
                    " min (fire.duration_min); choose a time within, or follow it longer");
  }
}

}  // namespace ringward::cli
