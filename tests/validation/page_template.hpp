#pragma once

#include <map>
#include <set>
#include <string>

namespace ringward::testing {

/// Text by the name that stands for it in the template of the page, as {{name}}.
using PageTexts = std::map<std::string, std::string>;

/// The template with every placeholder replaced.
/// @throws std::runtime_error for a placeholder without text and for a text without placeholder
[[nodiscard]] std::string filled(const std::string& page_template, const PageTexts& texts);

/// Compares a page with what the template and `texts` make, where the placeholders of `unknown`
/// may stand for anything.
/// @return empty when they agree, else the beginning of what is not in the page at its place
[[nodiscard]] std::string first_difference(const std::string& page,
                                           const std::string& page_template, const PageTexts& texts,
                                           const std::set<std::string>& unknown);

}  // namespace ringward::testing
