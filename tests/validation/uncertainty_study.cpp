// Rates a fixed set of generated columns with standard accuracy and against the fine grid, and
// prints whether the stated numerical uncertainty covers the error:
//   uncertainty_study [--csv]

#include <fmt/format.h>

#include <algorithm>
#include <cmath>
#include <cstring>
#include <iostream>
#include <string>
#include <vector>

#include "mechanical/rating/rating.hpp"
#include "tests/support/finer_reference.hpp"
#include "tests/support/generated_columns.hpp"
#include "thermal/base/error.hpp"
#include "thermal/base/units.hpp"

using namespace ringward;

namespace {

constexpr unsigned kColumns = 48;

struct Row {
  unsigned index = 0;
  std::string description;
  double load_N = 0;
  double R_s = 0;
  double uncertainty_s = 0;
  double error_s = 0;

  std::string breakdown = {};  ///< why there is no answer: counts as not covered

  [[nodiscard]] bool covered() const {
    return breakdown.empty() && std::abs(error_s) <= uncertainty_s;
  }
};

Row study(unsigned index) {
  const testing::GeneratedColumn generated = testing::generated_column(index);
  const mechanical::Rating rating =
      rate(generated.column, generated.fire, thermal::Accuracy::standard);
  const testing::FinerReference reference =
      testing::finer_reference(generated.column, generated.fire, rating);
  return {.index = index,
          .description = generated.description,
          .load_N = generated.column.load.axial_N,
          .R_s = rating.chosen.fire_resistance_s.value_or(generated.fire.duration_s),
          .uncertainty_s = rating.uncertainty_s,
          .error_s = reference.error_s};
}

Row study_or_breakdown(unsigned index) {
  try {
    return study(index);
  } catch (const Error& error) {
    Row row;
    row.index = index;
    row.description = row.breakdown = error.what();
    return row;
  }
}

void print_csv(const std::vector<Row>& rows) {
  std::cout << "index,column,load_kN,R_min,uncertainty_s,error_s,covered\n";
  for (const Row& row : rows) {
    std::cout << fmt::format("{},{},{:.0f},{:.3f},{:.2f},{:.2f},{}\n", row.index, row.description,
                             units::kN_from_N(row.load_N), units::min_from_s(row.R_s),
                             row.uncertainty_s, row.error_s, row.covered() ? 1 : 0);
  }
}

void print_table(const std::vector<Row>& rows) {
  std::cout << "| no. | column | load, kN | R, min | stated, s | error, s | covered |\n"
               "|---|---|---|---|---|---|---|\n";
  for (const Row& row : rows) {
    std::cout << fmt::format("| {} | {} | {:.0f} | {:.2f} | {:.1f} | {:+.1f} | {} |\n", row.index,
                             row.description, units::kN_from_N(row.load_N),
                             units::min_from_s(row.R_s), row.uncertainty_s, row.error_s,
                             row.covered() ? "yes" : "**no**");
  }
}

double median(std::vector<double> values) {
  std::sort(values.begin(), values.end());
  return values[values.size() / 2];
}

void print_summary(const std::vector<Row>& rows) {
  std::vector<double> errors;
  std::vector<double> stated;
  std::size_t covered = 0;
  for (const Row& row : rows) {
    errors.push_back(std::abs(row.error_s));
    stated.push_back(row.uncertainty_s);
    covered += row.covered() ? 1 : 0;
  }
  const auto largest = std::max_element(rows.begin(), rows.end(), [](const Row& a, const Row& b) {
    return std::abs(a.error_s) < std::abs(b.error_s);
  });
  const auto count = static_cast<double>(rows.size());
  std::cout << fmt::format(
      "\n{} of {} columns ({:.1f} %) have their error within the stated uncertainty. Error: median "
      "{:.1f} s, largest {:.1f} s (column {}); stated uncertainty: median {:.1f} s.\n",
      covered, rows.size(), 100.0 * static_cast<double>(covered) / count, median(errors),
      std::abs(largest->error_s), largest->index, median(stated));
}

}  // namespace

int main(int argc, char** argv) {
  const bool csv = argc > 1 && std::strcmp(argv[1], "--csv") == 0;
  std::vector<Row> rows;
  for (unsigned index = 0; index < kColumns; ++index) {
    rows.push_back(study_or_breakdown(index));
    std::cerr << fmt::format("{} of {}: stated {:.1f} s, error {:+.1f} s\n", index + 1, kColumns,
                             rows.back().uncertainty_s, rows.back().error_s);
  }
  csv ? print_csv(rows) : print_table(rows);
  print_summary(rows);
  return 0;
}
