#pragma once

#include <cstddef>
#include <string>
#include <vector>

namespace ringward::testing {

/// What xmllint complains about; empty for well-formed XML.
[[nodiscard]] std::string xml_complaints(const std::string& document);

/// What HTML Tidy holds against a page as HTML5, a line each; empty for a valid page. Left out: its
/// doubts about attributes of SVG, whose vocabulary it does not know.
[[nodiscard]] std::string html_complaints(const std::string& page);

/// How often `part` stands in `text`.
[[nodiscard]] std::size_t occurrences(const std::string& text, const std::string& part);

/// Values of all attributes of this name, in order.
[[nodiscard]] std::vector<std::string> attribute_values(const std::string& document,
                                                        const std::string& name);

}  // namespace ringward::testing
