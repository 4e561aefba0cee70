// Largest error of temperature against the number of cells, for both grids: prints the table of
// docs/validation.md.

#include <fmt/format.h>

#include <algorithm>
#include <array>
#include <cmath>
#include <iostream>
#include <string>

#include "tests/support/published_table.hpp"
#include "tests/thermal/field/problems.hpp"
#include "thermal/temperature_history.hpp"

using namespace ringward::testing;

namespace {

/// Over all points and times of the independent solution.
double largest_error_K(const TemperatureHistory& history, const PublishedTable& table) {
  double largest_K = 0;
  for (std::size_t row = 0; row < table.size(); ++row) {
    const Point point{1e-3 * table.number(row, "x_mm"), 1e-3 * table.number(row, "y_mm")};
    const double T_C = history.T_C(point, 60.0 * table.number(row, "time_min"));
    largest_K = std::max(largest_K, std::abs(T_C - table.number(row, "T_C")));
  }
  return largest_K;
}

void print_rows(const std::string& section, const std::string& contact) {
  const PublishedTable table("computed_section_" + section + "_" + contact + ".csv");
  const double R = contact == "contact" ? 0.01 : 0.0;
  const Section column =
      section == "A" ? tubed(Shape::circular, 0.4, 0.005, R) : tubed(Shape::square, 0.3, 0.006, R);
  const std::array<std::string, 3> names{"coarse", "standard", "fine"};
  for (std::size_t k = 0; k < names.size(); ++k) {
    const auto accuracy = static_cast<Accuracy>(k);
    const TemperatureHistory history = solve_heat_flow(column, standard_fire(240), {accuracy, 1.0});
    const HeatFlowStatistics& statistics = history.statistics();
    std::cout << fmt::format("| {} {} | {} | {} | {} | {:.2f} | {:.1e} |\n",
                             section == "A" ? "round" : "square", contact, names[k],
                             statistics.cells, statistics.time_steps,
                             largest_error_K(history, table), statistics.energy_balance_error);
  }
}

}  // namespace

int main() {
  std::cout << "| section | accuracy | cells | time steps | largest error, K | heat balance |\n"
               "|---|---|---|---|---|---|\n";
  for (const std::string section : {"A", "D"}) {
    for (const std::string contact : {"perfect", "contact"}) print_rows(section, contact);
  }
  return 0;
}
