#pragma once

#include <string>

namespace ringward::cli {

/// Text that is safe to stand in a page as it is. Strings become markup through `text` only, so
/// that nothing from an input can turn into elements, attributes or script.
class Markup {
 public:
  Markup() = default;

  /// Any text, escaped.
  [[nodiscard]] static Markup text(const std::string& text);
  /// What our own code wrote as markup; never anything that holds text from an input unescaped.
  [[nodiscard]] static Markup own(std::string html);
  /// `<name>content</name>`.
  [[nodiscard]] static Markup element(const std::string& name, const Markup& content);

  [[nodiscard]] const std::string& html() const { return html_; }
  [[nodiscard]] bool is_empty() const { return html_.empty(); }
  Markup& operator+=(const Markup& other);
  [[nodiscard]] friend Markup operator+(Markup a, const Markup& b) { return a += b; }

 private:
  std::string html_;
};

}  // namespace ringward::cli
