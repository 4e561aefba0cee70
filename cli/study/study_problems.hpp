#pragma once

#include <cstddef>
#include <map>
#include <string>
#include <vector>

#include "cli/input/problems.hpp"
#include "cli/study/layout_list.hpp"

namespace ringward::cli {

/// What is wrong in the columns of a study, each mistake told once with the layouts that have it.
class StudyProblems {
 public:
  /// @param message of the reader of columns, one line a mistake
  void add(const Layout& layout, const std::string& message);

  /// @param layout_count a mistake in every layout is one of the base column
  void report(std::size_t layout_count, Problems& problems) const;

 private:
  struct Found {
    std::string place;  ///< of the value in the study; empty: the text has its own
    std::string text;
    Location location;
    std::string first_layout;
    std::size_t count = 0;
  };

  void add_line(const Layout& layout, const std::string& line);

  std::vector<Found> found_;
  std::map<std::string, std::size_t> index_;
};

}  // namespace ringward::cli
