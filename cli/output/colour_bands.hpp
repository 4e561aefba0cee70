#pragma once

#include <string>

namespace ringward::cli {

/// Temperatures in bands of a round width, each with a colour. Cold is light and hot is dark, with
/// lightness falling all the way, so that the order survives a black-and-white print.
class ColourBands {
 public:
  /// @param min_C, max_C the temperatures to be shown [C]
  ColourBands(double min_C, double max_C);

  [[nodiscard]] int band_of(double T_C) const;
  [[nodiscard]] int first() const { return first_; }
  [[nodiscard]] int last() const { return last_; }
  /// Lower edge of a band [C]; the upper edge is that of the next band.
  [[nodiscard]] double lower_C(int band) const { return band * width_C_; }
  /// As "#rrggbb".
  [[nodiscard]] std::string colour(int band) const;

 private:
  double width_C_ = 100;
  int first_ = 0;
  int last_ = 0;
};

}  // namespace ringward::cli
