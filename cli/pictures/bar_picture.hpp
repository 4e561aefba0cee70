#pragma once

#include <string>
#include <vector>

#include "cli/pictures/picture.hpp"

namespace ringward::cli {

/// One quantity: the answer at its low and at its high value.
struct BarRow {
  std::string name;
  double at_low = 0;
  double at_high = 0;
};

/// Two bars a row, from the centre to the answer at the low and at the high value; the row that
/// spans most comes first.
struct BarPicture {
  PictureAbout about = {};
  std::string axis_label = {};  ///< with the unit
  double centre = 0;            ///< the answer with nothing changed
  std::string low_name = "at the low value";
  std::string high_name = "at the high value";
  std::vector<BarRow> rows = {};
};

[[nodiscard]] Picture draw(const BarPicture& picture);

/// The rows in the order of the picture.
[[nodiscard]] std::vector<BarRow> largest_first(std::vector<BarRow> rows, double centre);

}  // namespace ringward::cli
