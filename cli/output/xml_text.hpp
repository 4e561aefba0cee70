#pragma once

#include <string>

namespace ringward::cli {

/// `text` fit for XML content and attributes: markup escaped, control characters as spaces.
[[nodiscard]] std::string xml_text(const std::string& text);

}  // namespace ringward::cli
