#include "cli/input/fire_points_csv.hpp"

#include <fmt/format.h>

#include <charconv>
#include <cmath>
#include <optional>
#include <sstream>

namespace ringward::cli {
namespace {

std::string stripped(std::string cell) {
  const auto drop = [](char c) { return c == ' ' || c == '\t' || c == '\r'; };
  while (!cell.empty() && drop(cell.back())) cell.pop_back();
  while (!cell.empty() && drop(cell.front())) cell.erase(cell.begin());
  if (cell.size() >= 2 && cell.front() == '"' && cell.back() == '"') {
    cell = cell.substr(1, cell.size() - 2);
  }
  return cell;
}

std::vector<std::string> cells_of(const std::string& line) {
  std::vector<std::string> cells;
  std::istringstream in(line);
  for (std::string cell; std::getline(in, cell, ',');) cells.push_back(stripped(cell));
  return cells;
}

std::optional<double> number_in(const std::string& cell) {
  double value = 0;
  const char* end = cell.data() + cell.size();
  const auto [stop, error] = std::from_chars(cell.data(), end, value);
  if (error != std::errc{} || stop != end || !std::isfinite(value)) return std::nullopt;
  return value;
}

/// What is wrong with the line, empty when its point was added.
std::string add_point(const std::string& line, const Range& limits,
                      std::vector<NumberPair>& points) {
  const auto cells = cells_of(line);
  if (cells.size() != 2) {
    return fmt::format("{} values where 2 are expected; write time_min,temperature_C",
                       cells.size());
  }
  const auto time = number_in(cells[0]);
  const auto temperature = number_in(cells[1]);
  if (!time || !temperature) {
    return fmt::format("\"{}\" is not a number; write time_min,temperature_C with a decimal point",
                       time ? cells[1] : cells[0]);
  }
  if (*time < 0) return fmt::format("the time {} min is below 0; start at 0", *time);
  if (!points.empty() && *time <= points.back()[0]) {
    return fmt::format(
        "the table does not increase: the time {} follows {}; put the points in "
        "increasing order of time, each once",
        *time, points.back()[0]);
  }
  if (!limits.contains(*temperature)) {
    return fmt::format("{} deg C is outside {} to {} deg C; temperatures are in deg C",
                       *temperature, limits.low, limits.high);
  }
  points.push_back({*time, *temperature});
  return {};
}

bool is_header(const std::string& line) {
  const auto cells = cells_of(line);
  return !cells.empty() && !cells[0].empty() && !number_in(cells[0]) &&
         cells[0].find_first_not_of("0123456789.+-eE ") != std::string::npos;
}

}  // namespace

std::vector<NumberPair> parse_fire_points(const std::string& text, const std::string& file_name,
                                          const Range& limits, std::vector<std::string>& mistakes) {
  std::vector<NumberPair> points;
  std::istringstream in(text);
  std::size_t number = 0;
  for (std::string line; std::getline(in, line);) {
    ++number;
    if (number == 1 && line.rfind("\xEF\xBB\xBF", 0) == 0) line.erase(0, 3);
    if (stripped(line).empty() || (number == 1 && is_header(line))) continue;
    const std::string mistake = add_point(line, limits, points);
    if (!mistake.empty())
      mistakes.push_back(fmt::format("{}:{}: fire.points_csv: {}", file_name, number, mistake));
  }
  if (points.empty() && mistakes.empty()) {
    mistakes.push_back(fmt::format(
        "{}:1: fire.points_csv: no points; write time_min,temperature_C on each line", file_name));
  }
  return points;
}

}  // namespace ringward::cli
