#pragma once

#include <string>

namespace ringward::cli {

/// What gnuplot's SVG terminal wrote, as the inside of an <svg> element that can stand in a page
/// among others: ids made unique, colours and markers written out (not every renderer resolves
/// `currentColor` and `use`), without words of gnuplot's own.
/// @param id prefix of every id
/// @return empty when `svg` holds no picture
[[nodiscard]] std::string inlined_svg(const std::string& svg, const std::string& id);

}  // namespace ringward::cli
