#pragma once

#include <functional>
#include <optional>
#include <string>

#include "cli/study/layout_row.hpp"

namespace ringward::cli {

/// First line of results.jsonl: what the rows belong to.
struct ResultsHeader {
  std::string version;
  std::string study_sha256;
  std::size_t layouts = 0;
  std::string kept_from;  ///< other versions whose rows were kept by force
};

[[nodiscard]] std::string header_line(const ResultsHeader& header);

/// @return none when the text does not start with such a line
[[nodiscard]] std::optional<ResultsHeader> header_of(const std::string& text);

/// Shows the rows after the header, in the order of the file, up to the first line that is not
/// whole.
/// @param show gets the row and its line
/// @return the length of the text up to there
std::size_t read_rows(const std::string& text,
                      const std::function<void(const LayoutRow&, const std::string&)>& show);

}  // namespace ringward::cli
