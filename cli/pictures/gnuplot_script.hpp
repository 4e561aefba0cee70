#pragma once

#include <string>
#include <vector>

#include "cli/pictures/picture.hpp"

namespace ringward::cli {

/// A script for gnuplot. Text never reaches gnuplot: a placeholder of the same length stands for
/// it, and the escaped text takes its place in the finished SVG.
class GnuplotScript {
 public:
  /// @param height_px height of the picture; it is always kPictureWidth_px wide
  GnuplotScript(PictureAbout about, int height_px);

  /// Appends one line of our own making.
  void add(const std::string& line) { script_ += line + "\n"; }

  /// A gnuplot string that shows `text`, at most `longest` characters of it.
  [[nodiscard]] std::string text(const std::string& text, std::size_t longest = 80);

  /// Stores rows of numbers; a row with a missing value makes a gap.
  /// @return the name of the data block
  [[nodiscard]] std::string data(const std::vector<std::vector<double>>& rows);

  /// Labels and limits of the axes.
  void set_axes(const PictureAxis& x, const PictureAxis& y);

  /// Runs gnuplot on the script and makes the SVG fit for a page.
  [[nodiscard]] Picture drawn() const;

 private:
  PictureAbout about_;
  int height_px_;
  std::string script_;
  std::vector<std::string> texts_;
  std::size_t data_blocks_ = 0;
};

inline constexpr int kPictureWidth_px = 605;  ///< 160 mm at 96 px an inch

/// The shortest text of a number that gnuplot reads back as it is.
[[nodiscard]] std::string gnuplot_number(double value);

}  // namespace ringward::cli
