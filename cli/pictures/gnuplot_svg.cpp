#include "cli/pictures/gnuplot_svg.hpp"

#include <fmt/format.h>

#include <map>
#include <string_view>

namespace ringward::cli {
namespace {

void replace_all(std::string& text, std::string_view old_part, const std::string& new_part) {
  for (std::size_t at = text.find(old_part); at != std::string::npos;
       at = text.find(old_part, at + new_part.size())) {
    text.replace(at, old_part.size(), new_part);
  }
}

// What stands between two parts, the first time they follow each other from `from` on.
std::string between(const std::string& text, std::string_view before, std::string_view after,
                    std::size_t from = 0) {
  const std::size_t found = text.find(before, from);
  if (found == std::string::npos) return "";
  const std::size_t begin = found + before.size();
  const std::size_t end = text.find(after, begin);
  return end == std::string::npos ? "" : text.substr(begin, end - begin);
}

void erase_elements(std::string& text, const std::string& name) {
  const std::string end = "</" + name + ">";
  for (std::size_t at = text.find("<" + name); at != std::string::npos;
       at = text.find("<" + name, at)) {
    const std::size_t close = text.find(end, at);
    if (close == std::string::npos) return;
    text.erase(at, close + end.size() - at);
  }
}

// Our drawing of gnuplot's symbols, one unit large; the open ones hide the line below. Its
// pointtype n is defined as gpPt(n - 1).
std::string symbol(const std::string& number) {
  static const std::map<std::string, std::string> shapes{
      {"1", "path d=\"M-1,-1 L1,1 M1,-1 L-1,1\""},
      {"3", "rect x=\"-1\" y=\"-1\" width=\"2\" height=\"2\""},
      {"4", "rect x=\"-1\" y=\"-1\" width=\"2\" height=\"2\""},
      {"5", "circle r=\"1.1\""},
      {"6", "circle r=\"1.1\""},
      {"7", "path d=\"M0,-1.4 L-1.3,0.8 L1.3,0.8 z\""},
      {"9", "path d=\"M0,1.4 L-1.3,-0.8 L1.3,-0.8 z\""},
      {"11", "path d=\"M0,-1.45 L1.45,0 L0,1.45 L-1.45,0 z\""},
  };
  return shapes.at(number);
}

bool is_filled(const std::string& number) { return number == "4" || number == "6"; }

std::string drawn_symbol(const std::string& use) {
  const std::string number = between(use, "#gpPt", "'");
  const std::string colour = between(use, "color='", "'");
  return fmt::format("<{} transform=\"{}\" fill=\"{}\" stroke=\"{}\" stroke-width=\"0.35\"/>",
                     symbol(number), between(use, "transform='", "'"),
                     is_filled(number) ? colour : "#fff", colour);
}

void draw_symbols(std::string& svg) {
  for (std::size_t at = svg.find("<use "); at != std::string::npos; at = svg.find("<use ", at)) {
    const std::size_t length = svg.find("/>", at) + 2 - at;
    svg.replace(at, length, drawn_symbol(svg.substr(at, length)));
  }
}

// The first definitions are symbols; patterns of filled areas come later, where they are used.
void erase_symbol_definitions(std::string& svg) {
  const std::string end = "</defs>";
  const std::size_t first = svg.find("<defs>");
  const std::size_t close = svg.find(end);
  if (first != std::string::npos) svg.erase(first, close + end.size() - first);
}

// <g ... color="C" stroke="currentColor">: the colour takes the place of the word.
void write_out_colours(std::string& svg) {
  constexpr std::string_view kColour = " color=\"";
  for (std::size_t at = svg.find(kColour); at != std::string::npos; at = svg.find(kColour, at)) {
    const std::string colour = between(svg, kColour, "\"", at);
    svg.erase(at, kColour.size() + colour.size() + 1);
    const std::size_t word = svg.find("currentColor", at);
    if (word < svg.find('>', at)) svg.replace(word, 12, colour);
  }
  replace_all(svg, "style='fill:none; stroke:", "fill='none' stroke='");
}

}  // namespace

std::string inlined_svg(const std::string& svg, const std::string& id) {
  const std::size_t root = svg.find("<svg");
  const std::size_t begin = root == std::string::npos ? root : svg.find('>', root);
  const std::size_t end = svg.rfind("</svg>");
  if (begin == std::string::npos || end == std::string::npos) return "";
  std::string content = svg.substr(begin + 1, end - begin - 1);
  erase_elements(content, "title");
  erase_elements(content, "desc");
  erase_symbol_definitions(content);
  draw_symbols(content);
  write_out_colours(content);
  for (const char* const reference : {" id='", " id=\"", "url(#"}) {
    replace_all(content, reference, reference + id + "-");
  }
  return content;
}

}  // namespace ringward::cli
