#pragma once

#include <string>
#include <vector>

namespace ringward::cli {

/// docs/sources.toml as it was when the program was built.
[[nodiscard]] const std::string& source_list_text();

/// A source by its key, with how its text was at hand.
struct ListedSource {
  std::string key;
  std::string author;
  std::string year;     ///< empty where it is not known
  std::string title;    ///< empty where it is not known
  std::string edition;  ///< empty where it is not known
  std::string read;     ///< "text", "abstract", "memory" or "computed"
};

/// Those of the listed sources whose key stands in `text`, in the order of the list.
[[nodiscard]] std::vector<ListedSource> sources_cited_in(const std::string& text);

}  // namespace ringward::cli
