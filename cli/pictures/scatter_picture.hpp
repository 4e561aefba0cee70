#pragma once

#include <string>
#include <vector>

#include "cli/pictures/picture.hpp"

namespace ringward::cli {

struct ScatterPoint {
  double x = 0;
  double y = 0;
  bool highlighted = false;
  std::string label = {};  ///< beside the point; empty for none
};

/// A trade-off: all points small, the highlighted ones large, filled and joined by a line.
struct ScatterPicture {
  PictureAbout about = {};
  PictureAxis x = {};
  PictureAxis y = {};
  std::vector<ScatterPoint> points = {};
  std::string highlighted_name = {};  ///< in the key
  std::string other_name = {};        ///< in the key
  int height_px = 380;
};

[[nodiscard]] Picture draw(const ScatterPicture& picture);

}  // namespace ringward::cli
