#pragma once

#include <filesystem>
#include <string>
#include <vector>

namespace ringward::testing {

/// A text file of the project, with its path relative to the root.
struct TextFile {
  std::string path;
  std::string text;
  [[nodiscard]] std::vector<std::string> lines() const;
};

[[nodiscard]] std::filesystem::path project_root();
/// @throws std::runtime_error when the file is not there
[[nodiscard]] TextFile read_file(const std::string& relative_path);
/// The files below the given folders whose extension is in the list, sorted by path.
[[nodiscard]] std::vector<TextFile> files_below(const std::vector<std::string>& folders,
                                                const std::vector<std::string>& extensions);
/// All sources and headers of the program (not of its tests).
[[nodiscard]] std::vector<TextFile> program_files();

}  // namespace ringward::testing
