#include <fmt/format.h>

#include <algorithm>
#include <cmath>

#include "tests/validation/markdown.hpp"
#include "tests/validation/page_part.hpp"
#include "tests/validation/page_pictures.hpp"
#include "tests/validation/uncertainty_rows.hpp"

namespace ringward::testing {
namespace {

using Rows = std::vector<UncertaintyRow>;

double median(std::vector<double> values) {
  std::sort(values.begin(), values.end());
  return values[values.size() / 2];
}

std::string table(const Rows& rows) {
  std::string text = markdown_head({"no.",
                                    "column: section; tube; confinement; concrete; buckling "
                                    "length; eccentricity mm; fire",
                                    "R, min", "stated, s", "error, s", "covered"});
  for (const UncertaintyRow& row : rows) {
    const std::string number = fmt::format("{}", row.index);
    if (!row.breakdown.empty()) {
      text += markdown_row({number, row.breakdown, "-", "-", "-", "**no**"});
      continue;
    }
    text += markdown_row({number, row.column, fmt::format("{:.2f}", row.R_min),
                          fmt::format("{:.1f}", row.stated_s), fmt::format("{:+.1f}", row.error_s),
                          row.covered() ? "yes" : "**no**"});
  }
  return text;
}

std::string list_of_uncovered(const Rows& rows) {
  std::vector<unsigned> numbers;
  for (const UncertaintyRow& row : rows) {
    if (!row.covered()) numbers.push_back(row.index);
  }
  return numbers.empty() ? "none" : fmt::format("{}", fmt::join(numbers, ", "));
}

const UncertaintyRow& largest_error(const Rows& rows) {
  return *std::max_element(rows.begin(), rows.end(), [](const auto& a, const auto& b) {
    return std::abs(a.error_s) < std::abs(b.error_s);
  });
}

std::string summary(const Rows& rows) {
  std::vector<double> errors;
  std::vector<double> stated;
  std::size_t covered = 0;
  for (const UncertaintyRow& row : rows) {
    covered += row.covered() ? 1 : 0;
    if (!row.breakdown.empty()) continue;
    errors.push_back(std::abs(row.error_s));
    stated.push_back(row.stated_s);
  }
  const UncertaintyRow& worst = largest_error(rows);
  return fmt::format(
      "Of {} columns {} ({:.1f} %) have their error within the stated uncertainty; not covered, or "
      "without an answer: {}.\nError: median {:.1f} s, largest {:.1f} s (column {}). Stated: "
      "median "
      "{:.1f} s.\n",
      rows.size(), covered, 100.0 * static_cast<double>(covered) / static_cast<double>(rows.size()),
      list_of_uncovered(rows), median(errors), std::abs(worst.error_s), worst.index,
      median(stated));
}

PagePicture picture(const Rows& rows) {
  MarkedPoints covered{.name = "within the stated uncertainty", .points = {}};
  MarkedPoints beyond{.name = "beyond it", .points = {}};
  for (const UncertaintyRow& row : rows) {
    if (!row.breakdown.empty()) continue;
    // Printed to 0.1 s: a smaller error stands at the edge of the picture.
    const cli::PicturePoint point{std::max(0.05, std::abs(row.error_s)), row.stated_s};
    (row.covered() ? covered : beyond).points.push_back(point);
  }
  return log_picture({.about = {.id = "uncertainty",
                                .title = "Stated numerical uncertainty against the error",
                                .message = "Points above the line are covered: " + summary(rows)},
                      .x = {.label = "Error against the fine grid [s]", .low = 0.05, .high = 200.0},
                      .y = {.label = "Stated uncertainty [s]", .low = 0.05, .high = 200.0},
                      .series = {covered, beyond},
                      .joined = false,
                      .equality_line = true});
}

}  // namespace

PagePart uncertainty_part() {
  const Rows rows = stored_uncertainty_rows();
  return {.texts = {{"uncertainty summary", summary(rows)}, {"uncertainty", table(rows)}},
          .pictures = {picture(rows)}};
}

}  // namespace ringward::testing
