#include "cli/dossier/hand_check.hpp"

#include <catch2/catch.hpp>
#include <cmath>

#include "cli/input/reader.hpp"
#include "mechanical/rating/rating.hpp"
#include "tests/cli/dossier/dossier_columns.hpp"
#include "tests/support/published_table.hpp"
#include "thermal/base/piecewise_linear.hpp"

using namespace ringward;
using namespace ringward::cli;
using namespace ringward::testing;

namespace {

struct Checked {
  HandCheck check;
  mechanical::CapacityState state;
};

Checked checked_at(const std::string& text, double time_min) {
  const ColumnInput input = read_column({"column", text, "."});
  const thermal::TemperatureHistory history = thermal::solve_heat_flow(
      input.column.section, input.fire, {.accuracy = input.accuracy, .scale = 1.0});
  return {hand_check(input.column, history, time_min * 60),
          mechanical::capacities(input.column, history, {time_min * 60}).front()};
}

double rounded_to(double value, double step) { return std::round(value / step) * step; }

/// Factors of strength against temperature, as a reviewer reads them off a table.
PiecewiseLinear factors(const std::string& file, const std::string& column) {
  const PublishedTable table(file);
  std::vector<PiecewiseLinear::Point> points;
  for (std::size_t row = 0; row < table.size(); ++row) {
    points.push_back({table.number(row, "theta_C"), table.number(row, column)});
  }
  return PiecewiseLinear(points);
}

/// The table redone as a reviewer does: printed areas and mean temperatures, factors read off.
/// EN 1992-1-2:2004 Tables 3.1 and 3.2a, EN 1993-1-2:2005 Table 3.1, whose k_y are those of hot
/// rolled bars; all from memory.
double redone_N(const HandCheck& check) {
  const PiecewiseLinear concrete =
      factors("EN1992-1-2_2004_T3.1_concrete.csv", "fc_theta/fck_siliceous");
  const PiecewiseLinear steel =
      factors("EN1992-1-2_2004_T3.2a_rebar_classN.csv", "fsy/fyk_hot_rolled");
  double sum_N = 0;
  for (const HandCheckRow& row : check.rows) {
    const PiecewiseLinear& table = row.part.rfind("Concrete", 0) == 0 ? concrete : steel;
    const double area_m2 = rounded_to(row.area_m2, 1e-6);
    const double factor = rounded_to(table.value(rounded_to(row.mean_C, 0.1)), 1e-4);
    sum_N += area_m2 * factor * row.strength_Pa;
  }
  return sum_N;
}

}  // namespace

TEST_CASE("The hand check redone from its printed figures is the program's plastic resistance",
          "[dossier]") {
  for (const std::string& text : {round_tubed_column(), round_bare_column(), square_column()}) {
    for (const double time_min : {0.0, 15.0, 45.0}) {
      const Checked checked = checked_at(text, time_min);
      INFO(text.substr(0, 40) << time_min << " min");
      CHECK_FALSE(checked.check.has_cooled);
      CHECK(checked.check.rows.size() <= 25);  // short enough for a calculator
      // The same sum in another order: equal to rounding of doubles.
      CHECK(checked.check.total_N == Approx(checked.state.plastic_N).epsilon(1e-12));
      // 0.1 %: areas to 1 mm2, temperatures to 0.1 K and factors to 0.0001.
      CHECK(redone_N(checked.check) == Approx(checked.state.plastic_N).epsilon(1e-3));
    }
  }
}

TEST_CASE("The rows of the hand check hold the whole section", "[dossier]") {
  const HandCheck check = checked_at(square_column(), 20).check;
  double area_m2 = 0;
  for (const HandCheckRow& row : check.rows) area_m2 += row.area_m2;
  // Core, bars in place of the concrete that they displace, and the composite tube: 0.2 m square.
  CHECK(area_m2 == Approx(0.2 * 0.2).epsilon(1e-9));
}

TEST_CASE("In cooling the hand check says that its factors are not those of the temperatures",
          "[dossier]") {
  std::string text = round_bare_column();
  const std::string curve = "curve = \"standard\"";
  text.replace(text.find(curve), curve.size(),
               "curve = \"table\"\npoints_min_C = [[0, 20], [20, 700], [40, 20]]");
  CHECK_FALSE(checked_at(text, 15).check.has_cooled);
  CHECK(checked_at(text, 60).check.has_cooled);
}
