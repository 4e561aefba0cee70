#pragma once

#include <limits>
#include <optional>
#include <string>

namespace ringward::cli {

/// What a picture is called and what it says to someone who cannot see it.
struct PictureAbout {
  std::string id;       ///< letters, digits and "-": unique in its page
  std::string title;    ///< what is shown
  std::string message;  ///< what the reader should take from it, with its figures
};

struct PicturePoint {
  double x = 0;
  double y = 0;
};

/// Stands for a missing value: the line has a gap there.
inline constexpr double kNoValue = std::numeric_limits<double>::quiet_NaN();

/// An axis with its unit in the label, e.g. "Time [min]"; limits follow from the data where they
/// are not given.
struct PictureAxis {
  std::string label;
  std::optional<double> low = {};
  std::optional<double> high = {};
};

/// An SVG element to stand in a page, 160 mm wide, or the reason why there is none.
struct Picture {
  std::string svg;
  std::string why_missing;  ///< a sentence for the page; empty when there is a picture

  [[nodiscard]] bool is_there() const { return !svg.empty(); }
};

/// Told once by a command whose pictures are missing: what to install.
inline constexpr const char* kHowToGetPictures =
    "no pictures: gnuplot is not installed (Debian: apt install gnuplot-nox)";

}  // namespace ringward::cli
