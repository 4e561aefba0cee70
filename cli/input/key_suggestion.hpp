#pragma once

#include <cstddef>
#include <optional>
#include <string>
#include <vector>

namespace ringward::cli {

/// Least number of inserted, deleted, replaced or swapped neighbouring characters.
[[nodiscard]] std::size_t edit_distance(const std::string& a, const std::string& b);

/// The candidate nearest to `word`, if any is near enough to be meant.
[[nodiscard]] std::optional<std::string> nearest(const std::string& word,
                                                 const std::vector<std::string>& candidates);

/// The input key meant by an unknown one: in the same table first, then anywhere.
/// @param key schema spelling
[[nodiscard]] std::optional<std::string> nearest_key(const std::string& key);

}  // namespace ringward::cli
