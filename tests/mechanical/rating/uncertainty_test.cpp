#include <catch2/catch.hpp>
#include <cmath>

#include "mechanical/rating/rating.hpp"
#include "tests/support/finer_reference.hpp"
#include "tests/support/generated_columns.hpp"

using namespace ringward;

// The first columns of the generated set of docs/validation.md that take no more than seconds. The
// aim for the whole set is nine in ten; of these seven one is missed (column 5, 3.3 s of error, 3.1
// s stated), so that a second one fails the test.
TEST_CASE("the stated uncertainty covers the error of varied columns against the fine grid") {
  int covered = 0;
  for (const unsigned index : {0U, 1U, 3U, 4U, 5U, 6U, 24U}) {
    const testing::GeneratedColumn generated = testing::generated_column(index);
    const mechanical::Rating rating =
        rate(generated.column, generated.fire, thermal::Accuracy::standard);
    const testing::FinerReference reference =
        testing::finer_reference(generated.column, generated.fire, rating);
    INFO(generated.description);
    // What is missed is missed by little: the difference of grids may hide a third of the error.
    CHECK(std::abs(reference.error_s) <= 1.5 * rating.uncertainty_s);
    CHECK(rating.uncertainty_s < 60.0);
    covered += std::abs(reference.error_s) <= rating.uncertainty_s ? 1 : 0;
  }
  CHECK(covered >= 6);
}
