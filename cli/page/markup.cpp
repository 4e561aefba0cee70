#include "cli/page/markup.hpp"

#include <utility>

#include "cli/output/xml_text.hpp"

namespace ringward::cli {

Markup Markup::text(const std::string& text) { return own(xml_text(text)); }

Markup Markup::own(std::string html) {
  Markup markup;
  markup.html_ = std::move(html);
  return markup;
}

Markup Markup::element(const std::string& name, const Markup& content) {
  return own("<" + name + ">" + content.html_ + "</" + name + ">");
}

Markup& Markup::operator+=(const Markup& other) {
  html_ += other.html_;
  return *this;
}

}  // namespace ringward::cli
