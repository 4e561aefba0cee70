#include "tests/validation/uncertainty_rows.hpp"

#include <catch2/catch.hpp>

using namespace ringward::testing;

namespace {

/// Quick ones of different kinds: bare round and rectangular, composite, confining.
constexpr unsigned kRerun[] = {0, 1, 3, 21, 24, 36};

}  // namespace

TEST_CASE("The stored study of the uncertainty holds every column of its set once") {
  const std::vector<UncertaintyRow> rows = stored_uncertainty_rows();
  REQUIRE(rows.size() == kUncertaintyColumns);
  for (std::size_t k = 0; k < rows.size(); ++k) CHECK(rows[k].index == k);
}

// The aim of 90 % is the project's own: the uncertainty stands beside every answer.
TEST_CASE("The error lies within the stated uncertainty in nine columns of ten") {
  const std::vector<UncertaintyRow> rows = stored_uncertainty_rows();
  std::size_t covered = 0;
  for (const UncertaintyRow& row : rows) covered += row.covered() ? 1 : 0;
  CHECK(10 * covered >= 9 * rows.size());
}

// Tolerances: half a digit of what is stored, and as much again for another processor's rounding.
TEST_CASE("Rows of the stored study of the uncertainty are still what the program gives") {
  const std::vector<UncertaintyRow> rows = stored_uncertainty_rows();
  for (const unsigned index : kRerun) {
    const UncertaintyRow now = study_uncertainty(index);
    INFO("column " << index << ": " << now.column);
    CHECK(now.breakdown.empty());
    CHECK(now.column == rows.at(index).column);
    CHECK(now.R_min == Approx(rows.at(index).R_min).margin(0.01));
    CHECK(now.stated_s == Approx(rows.at(index).stated_s).margin(0.1));
    CHECK(now.error_s == Approx(rows.at(index).error_s).margin(0.1));
  }
}
