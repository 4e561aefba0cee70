#include "tests/cli/study/study_folder.hpp"

#include <fmt/format.h>

#include <sstream>

#include "tests/cli/commands/example_columns.hpp"

namespace ringward::testing {

StudyFolder::StudyFolder(const std::string& layouts) {
  write_content(column(), round_bare_column());
  write_content(study(),
                "title = \"Layouts (invented example)\"\nbase = \"column.toml\"\n" + layouts);
}

ProcessResult StudyFolder::compare(const std::string& out, const std::vector<std::string>& more,
                                   ProcessSetup setup) const {
  setup.folder = folder_.path();
  std::vector<std::string> arguments{"compare", "study.toml", "-o", out, "--quiet"};
  arguments.insert(arguments.end(), more.begin(), more.end());
  return run_ringward(arguments, setup);
}

std::string all_results(const std::string& folder) {
  std::string all;
  for (const char* name : {"results.jsonl", "summary.csv", "compare.html"}) {
    all += file_content(folder + "/" + name);
  }
  return all;
}

std::vector<std::string> whole_lines(const std::string& text) {
  std::vector<std::string> lines;
  std::istringstream stream(text.substr(0, text.rfind('\n') + 1));
  for (std::string line; std::getline(stream, line);) lines.push_back(line);
  return lines;
}

std::string load_grid(int count) {
  std::string loads;
  for (int i = 0; i < count; ++i) loads += fmt::format("{}{}", i > 0 ? ", " : "", 300 + 10 * i);
  return "[grid]\n\"load.axial_kN\" = [" + loads + "]\n";
}

}  // namespace ringward::testing
