#include "tests/validation/page_template.hpp"

#include <stdexcept>
#include <vector>

namespace ringward::testing {
namespace {

struct Piece {
  std::string text;  ///< as it stands, or the name of a placeholder
  bool is_placeholder = false;
};

std::vector<Piece> pieces_of(const std::string& page_template) {
  std::vector<Piece> pieces;
  std::size_t from = 0;
  for (std::size_t open = page_template.find("{{"); open != std::string::npos;
       open = page_template.find("{{", from)) {
    const std::size_t close = page_template.find("}}", open);
    if (close == std::string::npos) throw std::runtime_error("a placeholder has no end");
    pieces.push_back({page_template.substr(from, open - from), false});
    pieces.push_back({page_template.substr(open + 2, close - open - 2), true});
    from = close + 2;
  }
  pieces.push_back({page_template.substr(from), false});
  return pieces;
}

const std::string& text_for(const PageTexts& texts, const std::string& name) {
  const auto found = texts.find(name);
  if (found == texts.end()) throw std::runtime_error("no text for {{" + name + "}}");
  return found->second;
}

}  // namespace

std::string filled(const std::string& page_template, const PageTexts& texts) {
  std::string page;
  std::set<std::string> used;
  for (const Piece& piece : pieces_of(page_template)) {
    page += piece.is_placeholder ? text_for(texts, piece.text) : piece.text;
    if (piece.is_placeholder) used.insert(piece.text);
  }
  for (const auto& [name, text] : texts) {
    if (used.count(name) == 0) throw std::runtime_error("{{" + name + "}} is not in the template");
  }
  return page;
}

std::string first_difference(const std::string& page, const std::string& page_template,
                             const PageTexts& texts, const std::set<std::string>& unknown) {
  constexpr std::size_t kShown = 200;
  std::size_t at = 0;
  bool anything_before = false;
  std::string expected;  // known text in one stretch
  const auto stands_there = [&]() {
    const std::size_t found = anything_before ? page.find(expected, at) : at;
    if (found == std::string::npos || page.compare(found, expected.size(), expected) != 0) {
      return false;
    }
    at = found + expected.size();
    return true;
  };
  for (const Piece& piece : pieces_of(page_template)) {
    if (!piece.is_placeholder || unknown.count(piece.text) == 0) {
      expected += piece.is_placeholder ? text_for(texts, piece.text) : piece.text;
      continue;
    }
    if (!stands_there()) return expected.substr(0, kShown);
    expected.clear();
    anything_before = true;
  }
  if (!stands_there()) return expected.substr(0, kShown);
  return at == page.size() ? "" : page.substr(at, kShown);
}

}  // namespace ringward::testing
