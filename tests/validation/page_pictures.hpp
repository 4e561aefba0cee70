#pragma once

#include <string>
#include <vector>

#include "cli/pictures/picture.hpp"
#include "tests/validation/page_part.hpp"

namespace ringward::testing {

struct MarkedPoints {
  std::string name;
  std::vector<cli::PicturePoint> points;
};

/// Predicted against measured times, with lines of equality and of 10 and 25 % to either side.
[[nodiscard]] PagePicture agreement_picture(const cli::PictureAbout& about, double last_min,
                                            const std::vector<MarkedPoints>& families);

/// Lines between points, both axes logarithmic.
struct LogPicture {
  cli::PictureAbout about;
  cli::PictureAxis x;
  cli::PictureAxis y;
  std::vector<MarkedPoints> series;
  bool joined = true;  ///< points of a series are joined by a line
  bool equality_line = false;
};
[[nodiscard]] PagePicture log_picture(const LogPicture& picture);

/// A finished picture under the name of its id.
/// @throws std::runtime_error when there is none, with the reason
[[nodiscard]] PagePicture page_picture(const cli::PictureAbout& about, const cli::Picture& picture);

}  // namespace ringward::testing
