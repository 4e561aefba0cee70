#include "cli/dossier/source_list.hpp"

#include <toml++/toml.h>

#include <algorithm>
#include <cctype>

namespace ringward::cli {
namespace {

bool belongs_to_a_key(char c) {
  return std::isalnum(static_cast<unsigned char>(c)) != 0 || c == '-';
}

bool stands_in(const std::string& text, const std::string& key) {
  for (std::size_t at = text.find(key); at != std::string::npos; at = text.find(key, at + 1)) {
    const std::size_t end = at + key.size();
    const bool begins = at == 0 || !belongs_to_a_key(text[at - 1]);
    const bool ends = end == text.size() || !belongs_to_a_key(text[end]);
    if (begins && ends) return true;
  }
  return false;
}

std::string field(const toml::table& entry, const char* name) {
  return entry[name].value_or(std::string());
}

ListedSource listed(const std::string& key, const toml::table& entry) {
  const auto year = entry["year"].value<std::int64_t>();
  return {.key = key,
          .author = field(entry, "author"),
          .year = year ? std::to_string(*year) : "",
          .title = field(entry, "title"),
          .edition = field(entry, "edition"),
          .read = field(entry, "read")};
}

}  // namespace

std::vector<ListedSource> sources_cited_in(const std::string& text) {
  std::vector<std::pair<toml::source_position, ListedSource>> found;
  const toml::table list = toml::parse(source_list_text());
  for (const auto& [key, node] : list) {
    const std::string name(key.str());
    if (!node.is_table() || !stands_in(text, name)) continue;
    found.emplace_back(key.source().begin, listed(name, *node.as_table()));
  }
  std::sort(found.begin(), found.end(),
            [](const auto& a, const auto& b) { return a.first < b.first; });
  std::vector<ListedSource> sources;
  for (auto& [position, source] : found) sources.push_back(std::move(source));
  return sources;
}

}  // namespace ringward::cli
