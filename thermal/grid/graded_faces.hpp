#pragma once

#include <vector>

namespace ringward::thermal {

/// Cell size against the depth below the nearest exposed face: h(d) = min(first + growth d,
/// largest). Scaling all three by the same factor refines every cell alike, so that the order of
/// convergence is kept and neighbouring cells differ by a factor of about 1 + growth.
struct SizeLaw {
  double first_m = 0;    ///< size at the exposed face [m], > 0
  double growth = 0;     ///< increase per metre of depth, > 0
  double largest_m = 0;  ///< bound [m], >= first_m

  [[nodiscard]] SizeLaw scaled(double factor) const {
    return {first_m * factor, growth * factor, largest_m * factor};
  }
  /// Number of cells (not whole) between the exposed face and depth d_m >= 0.
  [[nodiscard]] double count(double d_m) const;
  /// The depth [m] at which count(d) reaches `cells` >= 0.
  [[nodiscard]] double depth(double cells) const;
};

/// A stretch of an axis between two lines that must be kept, sized from one of its sides.
struct Stretch {
  double from_m = 0;
  double to_m = 0;
  double exposed_m = 0;  ///< where depth is measured from: <= from_m or >= to_m
  SizeLaw size;
  int least_cells = 1;
};

/// Faces along an axis: the ends of all stretches, and between them cells after each size law.
/// @param stretches adjoining, in increasing order, none empty
[[nodiscard]] std::vector<double> graded_faces(const std::vector<Stretch>& stretches);

}  // namespace ringward::thermal
