#include "cli/page/html_page.hpp"

#include <fmt/format.h>

#include <sstream>
#include <stdexcept>

#include "cli/output/xml_text.hpp"
#include "cli/page/page_style.hpp"

namespace ringward::cli {

void HtmlPage::heading(int level, const std::string& text) {
  if (level < 1 || level > 4 || level > level_ + 1) {
    throw std::logic_error("a heading skips a level: " + text);
  }
  level_ = level;
  block(Markup::element(fmt::format("h{}", level), Markup::text(text)));
}

void HtmlPage::paragraph(const std::string& text) { paragraph(Markup::text(text)); }

void HtmlPage::list(const std::vector<std::string>& items) {
  Markup entries;
  for (const std::string& item : items) entries += Markup::element("li", Markup::text(item));
  if (!items.empty()) block(Markup::element("ul", entries));
}

void HtmlPage::pairs(const std::vector<std::pair<std::string, Markup>>& pairs) {
  Markup entries;
  for (const auto& [name, value] : pairs) {
    entries += Markup::element("dt", Markup::text(name)) + Markup::element("dd", value);
  }
  block(Markup::own("<dl class=\"pairs\">" + entries.html() + "</dl>"));
}

void HtmlPage::figure(const Picture& picture, const std::string& caption) {
  const std::string content =
      picture.is_there() ? picture.svg
                         : "<p class=\"missing\">" + xml_text(picture.why_missing) + "</p>\n";
  block(Markup::own("<figure>\n" + content + "<figcaption>" + xml_text(caption) +
                    "</figcaption></figure>"));
}

void HtmlPage::boxed(const Markup& content) {
  block(Markup::own("<div class=\"boxed\">" + content.html() + "</div>"));
}

void HtmlPage::verbatim(const std::string& text) {
  std::string lines;
  std::istringstream stream(text);
  // Line by line, because escaped text keeps no line ends.
  for (std::string line; std::getline(stream, line);) lines += xml_text(line) + "\n";
  block(Markup::own("<pre>" + lines + "</pre>"));
}

std::string HtmlPage::html() const {
  std::string html =
      "<!DOCTYPE html>\n<html xmlns=\"http://www.w3.org/1999/xhtml\" lang=\"en\">\n<head>\n"
      "<meta charset=\"utf-8\"/>\n"
      "<meta name=\"viewport\" content=\"width=device-width, initial-scale=1\"/>\n<title>" +
      xml_text(title_) + "</title>\n<style>" + page_style() +
      "</style>\n</head>\n<body>\n<main>\n" + body_ + "</main>\n";
  if (!script_.empty()) html += "<script>\n" + script_ + "</script>\n";
  return html + "</body>\n</html>\n";
}

}  // namespace ringward::cli
