#pragma once

#include <cstddef>
#include <functional>
#include <vector>

#include "cli/study/layout_row.hpp"

namespace ringward::cli {

/// Calls `rate` for every one of the given layouts on `jobs` threads, in this order as threads
/// become free, and `done` with each row as it is finished, one at a time. No more than `jobs`
/// rows are alive at once. Signals that stop the process are left to the calling thread.
/// @param jobs 1 or more; 0: as many as there are cores
/// @throws whatever `rate` or `done` throws first; rows that were done before are kept
void run_layouts(const std::vector<std::size_t>& layouts, std::size_t jobs,
                 const std::function<LayoutRow(std::size_t)>& rate,
                 const std::function<void(const LayoutRow&)>& done);

}  // namespace ringward::cli
