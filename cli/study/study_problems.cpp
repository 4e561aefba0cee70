#include "cli/study/study_problems.hpp"

#include <fmt/format.h>

#include <sstream>

namespace ringward::cli {

void StudyProblems::add(const Layout& layout, const std::string& message) {
  std::istringstream lines(message);
  for (std::string line; std::getline(lines, line);) add_line(layout, line);
}

void StudyProblems::add_line(const Layout& layout, const std::string& line) {
  Found found{.place = {}, .text = line, .location = layout.location, .first_layout = layout.name};
  for (const LayoutSetting& setting : layout.settings) {
    const std::string mark = "--set " + setting.key + ": ";
    if (!line.starts_with(mark)) continue;
    found.place = setting.place;
    found.text = line.substr(mark.size());
    break;
  }
  const auto [known, is_new] = index_.try_emplace(found.place + "\n" + found.text, found_.size());
  if (is_new) found_.push_back(std::move(found));
  ++found_[known->second].count;
}

void StudyProblems::report(std::size_t layout_count, Problems& problems) const {
  for (const Found& found : found_) {
    if (found.place.empty() && found.count == layout_count) {
      problems.add_foreign(Location{}, found.text);
      continue;
    }
    const std::string others = found.count == 1 ? "" : fmt::format(" and {} more", found.count - 1);
    const std::string who = fmt::format("layout \"{}\"{}: ", found.first_layout, others);
    problems.add_foreign(found.location, found.place.empty()
                                             ? who + found.text
                                             : found.place + ": " + who + found.text);
  }
}

}  // namespace ringward::cli
