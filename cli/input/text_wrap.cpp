#include "cli/input/text_wrap.hpp"

#include <sstream>

namespace ringward::cli {

std::string wrapped(const std::string& text, std::size_t first_column, const std::string& indent) {
  constexpr std::size_t kWidth = 100;
  std::istringstream words(text);
  std::string result;
  std::size_t column = first_column;
  bool starts_line = true;
  for (std::string word; words >> word;) {
    if (!starts_line && column + 1 + word.size() > kWidth) {
      result += "\n" + indent;
      column = indent.size();
    } else if (!starts_line) {
      result += ' ';
      ++column;
    }
    result += word;
    column += word.size();
    starts_line = false;
  }
  return result;
}

}  // namespace ringward::cli
