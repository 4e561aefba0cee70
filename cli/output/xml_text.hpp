#pragma once

#include <cstddef>
#include <string>

namespace ringward::cli {

/// `text` fit for the content and the attributes of XML and HTML, whatever bytes it has: markup
/// escaped, control characters as spaces, what is no UTF-8 or no character of XML as U+FFFD. All
/// text in pages and pictures goes through it.
[[nodiscard]] std::string xml_text(const std::string& text);

/// At most `length` characters of UTF-8 with "..." after what was cut, never cut inside one.
[[nodiscard]] std::string shortened(const std::string& text, std::size_t length);

}  // namespace ringward::cli
