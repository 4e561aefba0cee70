#pragma once

#include <string>

#include "cli/study/ranking.hpp"
#include "cli/study/results_log.hpp"
#include "cli/study/study.hpp"

namespace ringward::cli {

struct ComparedStudy {
  RankedStudy ranked;
  std::string lacks_pictures;  ///< why compare.html has none; empty when it has them
};

/// Rates the layouts that are not finished yet and writes DIR/results.jsonl, summary.csv and
/// compare.html. The bytes of all three do not depend on threads or interruptions.
/// @param jobs threads; 0: as many as there are cores
/// @throws as ResultsLog; Error(cannot_write)
[[nodiscard]] ComparedStudy compare_layouts(const Study& study, const std::string& folder,
                                            Resume resume, std::size_t jobs);

}  // namespace ringward::cli
