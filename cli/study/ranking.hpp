#pragma once

#include <string>
#include <vector>

#include "cli/study/layout_row.hpp"

namespace ringward::cli {

/// All layouts of a study, ranked.
struct RankedStudy {
  std::string title;
  std::string study_sha256;
  std::string kept_from;            ///< other versions whose rows were kept by force
  std::vector<LayoutRow> rows;      ///< in the order of the study
  std::vector<std::size_t> order;   ///< of the rows, best first
  std::vector<bool> undominated;    ///< one a row
  std::vector<std::string> varied;  ///< keys whose value is not the same in all rows

  [[nodiscard]] bool has_unsolved() const;
  [[nodiscard]] const LayoutRow& ranked(std::size_t rank) const { return rows[order[rank]]; }
};

/// The longest assessed fire resistance first (a surviving column: the followed time), then the
/// least steel, then the order of the study; without a solution last.
[[nodiscard]] std::vector<std::size_t> ranked_order(const std::vector<LayoutRow>& rows);

/// Layouts that no other one beats: none has at least the fire resistance with at most the steel,
/// and one of the two better.
[[nodiscard]] std::vector<bool> undominated_rows(const std::vector<LayoutRow>& rows);

/// @param results the content of results.jsonl
[[nodiscard]] RankedStudy rank_study(const std::string& title, const std::string& results);

}  // namespace ringward::cli
