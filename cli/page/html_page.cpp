#include "cli/page/html_page.hpp"

#include <fmt/format.h>

#include <sstream>
#include <stdexcept>

#include "cli/input/sha256.hpp"
#include "cli/output/base64.hpp"
#include "cli/output/xml_text.hpp"
#include "cli/page/page_style.hpp"

namespace ringward::cli {

void HtmlPage::heading(int level, const std::string& text) {
  if (level < 1 || level > 4 || level > level_ + 1) {
    throw std::logic_error("a heading skips a level: " + text);
  }
  level_ = level;
  std::string id;
  if (level == 2) {
    parts_.push_back(xml_text(text));
    id = fmt::format(" id=\"part-{}\"", parts_.size());
  }
  block(Markup::own(fmt::format("<h{0}{1}>{2}</h{0}>", level, id, xml_text(text))));
}

void HtmlPage::contents() { contents_at_ = body_.size(); }

std::string HtmlPage::contents_list() const {
  std::string list = "<nav aria-label=\"Contents\"><ol class=\"contents\">\n";
  for (std::size_t i = 0; i < parts_.size(); ++i) {
    list += fmt::format("<li><a href=\"#part-{}\">{}</a></li>\n", i + 1, parts_[i]);
  }
  return list + "</ol></nav>\n";
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
    entries += Markup::own("<tr><th scope=\"row\">") + Markup::text(name) +
               Markup::own("</th><td>") + value + Markup::own("</td></tr>\n");
  }
  block(Markup::own("<table class=\"pairs\"><tbody>\n" + entries.html() + "</tbody></table>"));
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
  std::string body = body_;
  if (contents_at_) body.insert(*contents_at_, contents_list());
  // Whatever a page holds, a browser fetches nothing for it and runs no script but ours.
  const std::string script = "\n" + script_;
  const std::string allowed =
      script_.empty() ? "'none'" : "'sha256-" + base64(sha256_bytes(script)) + "'";
  std::string html =
      "<!DOCTYPE html>\n<html xmlns=\"http://www.w3.org/1999/xhtml\" lang=\"en\">\n<head>\n"
      "<meta charset=\"utf-8\"/>\n"
      "<meta http-equiv=\"Content-Security-Policy\" content=\"default-src 'none'; style-src "
      "'unsafe-inline'; img-src data:; script-src " +
      allowed +
      "\"/>\n<meta name=\"viewport\" content=\"width=device-width, initial-scale=1\"/>\n<title>" +
      xml_text(title_) + "</title>\n<style>" + page_style() +
      "</style>\n</head>\n<body>\n<main>\n" + body + "</main>\n";
  if (!script_.empty()) html += "<script>" + script + "</script>\n";
  return html + "</body>\n</html>\n";
}

}  // namespace ringward::cli
