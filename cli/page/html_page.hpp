#pragma once

#include <cstddef>
#include <optional>
#include <string>
#include <utility>
#include <vector>

#include "cli/page/html_table.hpp"
#include "cli/page/markup.hpp"
#include "cli/pictures/picture.hpp"

namespace ringward::cli {

/// One self-contained page in English: well-formed both as HTML and as XML, styled for screens
/// from 390 px and for A4, with nothing outside it.
class HtmlPage {
 public:
  explicit HtmlPage(std::string title) : title_(std::move(title)) {}

  /// @param level 1 to 4; the first is 1, and none is skipped going down
  /// @throws std::logic_error for a level that would skip one
  void heading(int level, const std::string& text);
  /// Here stands the list of all headings of level 2, with links to them.
  void contents();
  void paragraph(const std::string& text);
  void paragraph(const Markup& content) { block(Markup::element("p", content)); }
  void list(const std::vector<std::string>& items);
  /// Names with their values, each pair a line.
  void pairs(const std::vector<std::pair<std::string, Markup>>& pairs);
  void table(const HtmlTable& table) { block(table.markup()); }
  /// The picture with its caption; where it is missing, the sentence that says why.
  void figure(const Picture& picture, const std::string& caption);
  /// Words in a box that cannot be overlooked.
  void boxed(const Markup& content);
  /// Text as it stands, in a fixed-width face.
  void verbatim(const std::string& text);
  void block(const Markup& markup) { body_ += markup.html() + "\n"; }
  /// Our own script, run after the page is read; the page must not need it.
  void script(const std::string& source) { script_ += source; }

  [[nodiscard]] std::string html() const;

 private:
  std::string title_;
  std::string body_;
  std::string script_;
  std::vector<std::string> parts_;  ///< texts of the headings of level 2, escaped
  std::optional<std::size_t> contents_at_;
  int level_ = 0;

  [[nodiscard]] std::string contents_list() const;
};

}  // namespace ringward::cli
