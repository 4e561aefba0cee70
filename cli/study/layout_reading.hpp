#pragma once

#include <filesystem>

#include "cli/input/problems.hpp"
#include "cli/study/layout_list.hpp"

namespace ringward::cli {

// The three ways in which a study file lists its layouts. What is wrong with the list itself goes
// to the problems; the layouts that can be read are returned all the same.

/// `[[layout]] name = "...", set = { "bars[0].axis_mm" = 50 }`
[[nodiscard]] LayoutListPtr read_named_layouts(const InputEntry& entry, Problems& problems);

/// `[grid] "tube.thickness_mm" = [4, 5, 6]`: every combination, the last key changing fastest.
[[nodiscard]] LayoutListPtr read_grid(const InputEntry& entry, Problems& problems);

/// `columns_csv = "file.csv"`: header of input keys and `name`, one row a column; an empty cell
/// leaves the base's value.
/// @param folder of the study file, where a relative path starts
/// @param text receives the content of the file
[[nodiscard]] LayoutListPtr read_columns_csv(const InputEntry& entry,
                                             const std::filesystem::path& folder,
                                             Problems& problems, std::string& text);

}  // namespace ringward::cli
