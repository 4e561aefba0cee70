#include "tests/cli/docs/tree.hpp"

#include <algorithm>
#include <fstream>
#include <sstream>
#include <stdexcept>

namespace ringward::testing {

std::vector<std::string> TextFile::lines() const {
  std::vector<std::string> result;
  std::istringstream stream(text);
  for (std::string line; std::getline(stream, line);) result.push_back(line);
  return result;
}

std::filesystem::path project_root() { return RINGWARD_SOURCE_DIR; }

TextFile read_file(const std::string& relative_path) {
  const std::filesystem::path path = project_root() / relative_path;
  std::ifstream stream(path, std::ios::binary);
  if (!stream) throw std::runtime_error("not there: " + relative_path);
  std::ostringstream text;
  text << stream.rdbuf();
  return {relative_path, text.str()};
}

std::vector<TextFile> files_below(const std::vector<std::string>& folders,
                                  const std::vector<std::string>& extensions) {
  std::vector<std::string> paths;
  for (const std::string& folder : folders) {
    for (const auto& entry :
         std::filesystem::recursive_directory_iterator(project_root() / folder)) {
      const std::string extension = entry.path().extension().string();
      if (entry.is_regular_file() &&
          std::find(extensions.begin(), extensions.end(), extension) != extensions.end()) {
        paths.push_back(std::filesystem::relative(entry.path(), project_root()).string());
      }
    }
  }
  std::sort(paths.begin(), paths.end());
  std::vector<TextFile> files;
  for (const std::string& path : paths) files.push_back(read_file(path));
  return files;
}

std::vector<TextFile> program_files() {
  return files_below({"thermal", "fires", "mechanical", "cli"}, {".hpp", ".cpp"});
}

}  // namespace ringward::testing
