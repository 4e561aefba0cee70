#pragma once

#include <string>
#include <vector>

namespace ringward::cli {

/// A file of published checks as it was when the program was built.
struct CaseFile {
  std::string name;  ///< without its folder
  std::string text;  ///< TOML
};

/// All files of published checks, sorted by name; the build makes this list from the folder.
[[nodiscard]] const std::vector<CaseFile>& case_files();

}  // namespace ringward::cli
