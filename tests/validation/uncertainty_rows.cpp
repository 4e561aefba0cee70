#include "tests/validation/uncertainty_rows.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <cmath>

#include "mechanical/rating/rating.hpp"
#include "tests/support/finer_reference.hpp"
#include "tests/support/generated_columns.hpp"
#include "tests/support/published_table.hpp"
#include "thermal/base/error.hpp"
#include "thermal/base/units.hpp"

namespace ringward::testing {
namespace {

UncertaintyRow studied(unsigned index) {
  const GeneratedColumn generated = generated_column(index);
  const mechanical::Rating rating =
      rate(generated.column, generated.fire, thermal::Accuracy::standard);
  const FinerReference reference = finer_reference(generated.column, generated.fire, rating);
  const double R_s = rating.chosen.fire_resistance_s.value_or(generated.fire.duration_s);
  return {.index = index,
          .column = generated.description,
          .load_kN = units::kN_from_N(generated.column.load.axial_N),
          .R_min = units::min_from_s(R_s),
          .stated_s = rating.uncertainty_s,
          .error_s = reference.error_s};
}

double number_or_zero(const PublishedTable& table, std::size_t row, const std::string& column) {
  return table.is_blank(row, column) ? 0.0 : table.number(row, column);
}

}  // namespace

bool UncertaintyRow::covered() const { return breakdown.empty() && std::abs(error_s) <= stated_s; }

UncertaintyRow study_uncertainty(unsigned index) {
  try {
    return studied(index);
  } catch (const Error& error) {
    UncertaintyRow row;
    row.index = index;
    row.breakdown = error.what();
    // A quotation mark would end the field of the CSV line, a new line the row.
    std::replace(row.breakdown.begin(), row.breakdown.end(), '"', '\'');
    std::replace(row.breakdown.begin(), row.breakdown.end(), '\n', ' ');
    return row;
  }
}

std::string csv_head() { return "index,column,load_kN,R_min,stated_s,error_s,breakdown\n"; }

std::string csv_line(const UncertaintyRow& row) {
  if (!row.breakdown.empty()) return fmt::format("{},,,,,,\"{}\"\n", row.index, row.breakdown);
  return fmt::format("{},\"{}\",{:.0f},{:.2f},{:.1f},{:+.1f},\n", row.index, row.column,
                     row.load_kN, row.R_min, row.stated_s, row.error_s);
}

std::vector<UncertaintyRow> stored_uncertainty_rows() {
  const PublishedTable table("../validation/uncertainty_study.csv");
  std::vector<UncertaintyRow> rows;
  for (std::size_t k = 0; k < table.size(); ++k) {
    rows.push_back({.index = static_cast<unsigned>(table.number(k, "index")),
                    .column = table.text(k, "column"),
                    .load_kN = number_or_zero(table, k, "load_kN"),
                    .R_min = number_or_zero(table, k, "R_min"),
                    .stated_s = number_or_zero(table, k, "stated_s"),
                    .error_s = number_or_zero(table, k, "error_s"),
                    .breakdown = table.text(k, "breakdown")});
  }
  return rows;
}

}  // namespace ringward::testing
