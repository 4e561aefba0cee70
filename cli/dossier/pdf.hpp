#pragma once

#include <string>

namespace ringward::cli {

/// A page as A4 pages, through WeasyPrint, which fetches nothing because the page names nothing
/// outside itself.
/// @return the bytes of the PDF
/// @throws Error(cannot_write) saying what to install where WeasyPrint is missing, or why it failed
[[nodiscard]] std::string pdf_of(const std::string& html);

}  // namespace ringward::cli
