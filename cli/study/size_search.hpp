#pragma once

#include <cstddef>
#include <functional>
#include <optional>
#include <string>
#include <vector>

#include "cli/study/layout_row.hpp"

namespace ringward::cli {

/// The bracket that is searched, with the grid of values that may come out.
struct SizeBracket {
  double low = 0;
  double high = 0;
  double step = 1;  ///< only multiples of it, and the two ends, are rated

  /// The nearest value of the grid.
  [[nodiscard]] double snapped(double value) const;
};

/// One value that was rated.
struct SizeTrial {
  double value = 0;
  LayoutRow row;

  [[nodiscard]] double margin_min() const { return row.margin_min().value(); }
  [[nodiscard]] bool met() const { return *row.verdict->met; }
};

enum class Response { rises, falls, flat };

/// What the search found. All trials are kept, in the order of their values.
struct SizeResult {
  Response response = Response::flat;
  std::optional<std::size_t> chosen;  ///< of the trials; none: nothing in the bracket works
  std::optional<std::size_t> next;    ///< the nearest trial that does not meet the requirement
  std::vector<SizeTrial> trials;
  std::vector<std::string> contradictions;  ///< pairs of trials against a monotone response
  bool is_narrowed = true;  ///< chosen and next are one step apart, or the end itself works

  /// How much the better end misses, when nothing works [min].
  [[nodiscard]] double misses_by_min() const;
};

/// No search rates more columns than this.
inline constexpr std::size_t kMostRatings = 15;

/// Finds where the fire resistance less its uncertainty crosses the required time, on the side
/// that meets it: the smallest value where the rating rises with it, the largest where it falls.
/// TOMS algorithm 748 on the margin, kept between one value that meets the requirement and one
/// that does not.
/// @param rate gives a row whose verdict knows the required time
/// @throws whatever `rate` throws
/// @source alefeld1995
[[nodiscard]] SizeResult find_size(const SizeBracket& bracket,
                                   const std::function<LayoutRow(double)>& rate);

}  // namespace ringward::cli
