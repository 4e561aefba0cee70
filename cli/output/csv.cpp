#include "cli/output/csv.hpp"

#include <cmath>

#include "cli/output/numbers.hpp"

namespace ringward::cli {
namespace {

std::string quoted_if_needed(const std::string& cell) {
  if (cell.find_first_of(",\"\r\n") == std::string::npos) return cell;
  std::string quoted = "\"";
  for (const char c : cell) {
    if (c == '"') quoted += '"';
    quoted += c;
  }
  return quoted + '"';
}

}  // namespace

void CsvTable::add(const std::vector<std::string>& cells) {
  for (std::size_t i = 0; i < cells.size(); ++i) {
    if (i > 0) text_ += ',';
    text_ += quoted_if_needed(cells[i]);
  }
  text_ += '\n';
}

std::string csv_number(const std::optional<double>& value, int digits) {
  if (!value || !std::isfinite(*value)) return "";
  return shortest(rounded(*value, digits));
}

}  // namespace ringward::cli
