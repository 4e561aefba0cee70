// Largest error of temperature against the number of cells, for both grids.

#include <fmt/format.h>

#include <algorithm>
#include <array>
#include <cmath>
#include <string>

#include "tests/support/published_table.hpp"
#include "tests/thermal/field/problems.hpp"
#include "tests/validation/markdown.hpp"
#include "tests/validation/page_part.hpp"
#include "tests/validation/page_pictures.hpp"
#include "thermal/temperature_history.hpp"

namespace ringward::testing {
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

struct SolvedCase {
  std::string section;  ///< "A" round, "D" square
  std::string contact;
  MarkedPoints errors = {};  ///< largest error in K against cells
  std::string rows = {};
};

void solve(SolvedCase& solved) {
  const PublishedTable table("computed_section_" + solved.section + "_" + solved.contact + ".csv");
  const double R = solved.contact == "contact" ? 0.01 : 0.0;
  const bool round = solved.section == "A";
  const Section column =
      round ? tubed(Shape::circular, 0.4, 0.005, R) : tubed(Shape::square, 0.3, 0.006, R);
  solved.errors.name = fmt::format("{}, {}", round ? "round" : "square",
                                   R > 0.0 ? "contact resistance" : "perfect contact");
  constexpr std::array<const char*, 3> kNames{"coarse", "standard", "fine"};
  for (std::size_t k = 0; k < kNames.size(); ++k) {
    const TemperatureHistory history =
        solve_heat_flow(column, standard_fire(240), {static_cast<Accuracy>(k), 1.0});
    const HeatFlowStatistics& statistics = history.statistics();
    const double error_K = largest_error_K(history, table);
    solved.errors.points.push_back({static_cast<double>(statistics.cells), error_K});
    solved.rows +=
        markdown_row({solved.errors.name, kNames[k], fmt::format("{}", statistics.cells),
                      fmt::format("{}", statistics.time_steps), fmt::format("{:.2f}", error_K),
                      fmt::format("{:.0e}", statistics.energy_balance_error)});
  }
}

}  // namespace

PagePart heat_flow_part() {
  std::string table = markdown_head(
      {"section", "accuracy", "cells", "time steps", "largest error, K", "heat balance"});
  LogPicture picture{.about = {.id = "heat-flow",
                               .title = "Largest error of temperature against the number of cells",
                               .message = "The error falls with the cells on both grids."},
                     .x = {.label = "Cells", .low = 20.0, .high = 5000.0},
                     .y = {.label = "Largest error [K]", .low = 0.05, .high = 5.0},
                     .series = {}};
  for (const char* const section : {"A", "D"}) {
    for (const char* const contact : {"perfect", "contact"}) {
      SolvedCase solved{.section = section, .contact = contact};
      solve(solved);
      table += solved.rows;
      picture.series.push_back(solved.errors);
    }
  }
  return {.texts = {{"heat flow", table}}, .pictures = {log_picture(picture)}};
}

}  // namespace ringward::testing
