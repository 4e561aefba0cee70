#pragma once

#include <string>

#include "cli/study/ranking.hpp"
#include "cli/terminal.hpp"

namespace ringward::cli {

/// The best layouts, ranked, with their cautions.
/// @param folder where the rest is
[[nodiscard]] std::string compare_text(const RankedStudy& study, const std::string& folder,
                                       const Style& style);

/// Schema ringward-compare/1.
[[nodiscard]] std::string compare_json(const RankedStudy& study);

/// One row a layout in the order of the study, with the keys of the JSON and of the input.
[[nodiscard]] std::string compare_csv(const RankedStudy& study);

/// compare.html, and why pictures are missing in it; empty when none is.
struct ComparePage {
  std::string html;
  std::string lacks_pictures;
};

/// Ranked table, pictures and cautions in one file that needs no other.
[[nodiscard]] ComparePage compare_page(const RankedStudy& study);

/// What stands for the fire resistance in a table: "118.4", "above 240" or "no solution".
[[nodiscard]] std::string resistance_words(const LayoutRow& row);

/// "R 120", "< R 15", or "-" where the fire has no classes.
[[nodiscard]] std::string class_words(const LayoutRow& row);

/// "+0.9" or "-0.1": rounded down, so that a miss never reads as zero; "-" for none.
[[nodiscard]] std::string margin_words(const std::optional<double>& margin_min);

/// Cautions of all layouts, each kind once with the first text and how many layouts have it.
struct SharedCaution {
  Notice notice;
  std::string first_layout;
  std::size_t count = 0;
};
[[nodiscard]] std::vector<SharedCaution> shared_cautions(const RankedStudy& study);

}  // namespace ringward::cli
