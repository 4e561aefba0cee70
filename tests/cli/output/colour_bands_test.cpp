#include "cli/output/colour_bands.hpp"

#include <catch2/catch.hpp>
#include <string>

using ringward::cli::ColourBands;

namespace {

// Luma of a "#rrggbb" colour with the weights of ITU-R BT.601, from memory.
double lightness(const std::string& colour) {
  const auto channel = [&](std::size_t at) {
    return static_cast<double>(std::stoi(colour.substr(at, 2), nullptr, 16));
  };
  return 0.299 * channel(1) + 0.587 * channel(3) + 0.114 * channel(5);
}

}  // namespace

TEST_CASE("Hotter is darker from band to band, so that a black-and-white print keeps the order",
          "[cli]") {
  const ColourBands bands(20, 1090);
  REQUIRE(bands.last() - bands.first() == 10);
  for (int band = bands.first(); band < bands.last(); ++band) {
    INFO(band);
    CHECK(lightness(bands.colour(band)) > lightness(bands.colour(band + 1)) + 5);
  }
}

TEST_CASE("Bands have a round width and enclose every temperature shown", "[cli]") {
  for (const double max_C : {20.0, 35.0, 100.0, 239.0, 700.0, 1100.0, 1350.0}) {
    const ColourBands bands(20, max_C);
    INFO(max_C);
    CHECK(bands.last() - bands.first() < 12);
    CHECK(bands.lower_C(bands.first()) <= 20);
    CHECK(bands.lower_C(bands.last() + 1) > max_C);
    CHECK(bands.band_of(20) == bands.first());
    CHECK(bands.band_of(max_C) == bands.last());
  }
}
