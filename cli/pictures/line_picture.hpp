#pragma once

#include <string>
#include <vector>

#include "cli/pictures/picture.hpp"

namespace ringward::cli {

/// How a series is drawn: `line` has a dash pattern and markers of its own, by its place in the
/// list; `strong` is a thick solid line; `thin` a thin grey one; `points` markers without a line.
enum class SeriesStyle { line, strong, thin, points };

struct PictureSeries {
  std::string name;  ///< in the key; empty for none
  std::vector<PicturePoint> points = {};
  SeriesStyle style = SeriesStyle::line;
};

/// A line through the whole picture with words beside it.
struct PictureMark {
  double at = 0;
  std::string name;
  bool name_at_start = false;  ///< of a horizontal mark: at its left end, else at its right end
};

/// A shaded range between two curves.
struct PictureBand {
  struct Range {
    double x = 0;
    double low = 0;
    double high = 0;
  };
  std::string name;
  std::vector<Range> ranges = {};
};

struct LinePicture {
  PictureAbout about = {};
  PictureAxis x = {};
  PictureAxis y = {};
  std::vector<PictureSeries> series = {};
  std::vector<PictureMark> vertical_marks = {};    ///< at an x
  std::vector<PictureMark> horizontal_marks = {};  ///< at a y
  std::vector<PictureBand> bands = {};
  int height_px = 340;
};

/// Curves against a common axis, legible in black and white.
[[nodiscard]] Picture draw(const LinePicture& picture);

}  // namespace ringward::cli
