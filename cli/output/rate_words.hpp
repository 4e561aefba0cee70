#pragma once

#include <string>
#include <vector>

#include "cli/output/rate_report.hpp"

namespace ringward::cli {

// The parts of a rating in words, for every form that a person reads.

/// "118.4 min +/- 0.6 min numerical uncertainty", or that it survives.
[[nodiscard]] std::string resistance_words(const RateReport& report, const Style& style);
/// "R 90", or why there is none.
[[nodiscard]] std::string class_words(const RateReport& report, const Style& style);
/// "120 min: met"
[[nodiscard]] std::string requirement_words(const Verdict& verdict, const Style& style);
/// The three answers of the confinement models, or that no tube confines the column.
[[nodiscard]] std::string band_words(const RateReport& report);
/// "contact lost", "contact regained", "end gap closed"
[[nodiscard]] std::string event_word(mechanical::TubeEventKind kind);
/// "contact lost at 3.1 min, end gap closed at 11.1 min"
[[nodiscard]] std::string event_words(const std::vector<mechanical::TubeEvent>& events);

/// Only a round tube that carries no axial load is credited with holding the core.
[[nodiscard]] bool has_confining_tube(const RateReport& report);

}  // namespace ringward::cli
