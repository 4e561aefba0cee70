#pragma once

#include <cstddef>
#include <string>

namespace ringward::cli {

/// Text broken into lines of at most 100 columns.
/// @param first_column where the first line starts
/// @param indent put in front of every further line
[[nodiscard]] std::string wrapped(const std::string& text, std::size_t first_column,
                                  const std::string& indent);

}  // namespace ringward::cli
