#include "cli/input/key_suggestion.hpp"

#include <algorithm>

#include "cli/input/schema.hpp"

namespace ringward::cli {
namespace {

constexpr std::size_t kLongestCompared = 200;

std::size_t tolerated(const std::string& word) { return std::max<std::size_t>(2, word.size() / 3); }

// A name without its unit, such as `thickness` for `thickness_mm`.
bool begins(const std::string& word, const std::string& candidate) {
  return word.size() >= 3 && candidate.compare(0, word.size(), word) == 0;
}

std::vector<std::string> leaves_in(const std::string& table) {
  std::vector<std::string> leaves;
  for (const KeySpec* spec : keys_in(table)) leaves.push_back(leaf_of(spec->key));
  return leaves;
}

std::optional<std::string> same_leaf_elsewhere(const std::string& leaf) {
  for (const KeySpec& spec : input_schema()) {
    if (leaf_of(spec.key) == leaf) return spec.key;
  }
  return std::nullopt;
}

}  // namespace

std::size_t edit_distance(const std::string& a, const std::string& b) {
  std::vector<std::size_t> before_last;
  std::vector<std::size_t> last(b.size() + 1);
  for (std::size_t j = 0; j <= b.size(); ++j) last[j] = j;
  for (std::size_t i = 1; i <= a.size(); ++i) {
    std::vector<std::size_t> row(b.size() + 1, i);
    for (std::size_t j = 1; j <= b.size(); ++j) {
      const std::size_t replaced = last[j - 1] + (a[i - 1] == b[j - 1] ? 0 : 1);
      row[j] = std::min({replaced, last[j] + 1, row[j - 1] + 1});
      if (i > 1 && j > 1 && a[i - 1] == b[j - 2] && a[i - 2] == b[j - 1]) {
        row[j] = std::min(row[j], before_last[j - 2] + 1);
      }
    }
    before_last = std::move(last);
    last = std::move(row);
  }
  return last.back();
}

std::optional<std::string> nearest(const std::string& word,
                                   const std::vector<std::string>& candidates) {
  if (word.empty() || word.size() > kLongestCompared) return std::nullopt;
  for (const std::string& candidate : candidates) {
    if (begins(word, candidate)) return candidate;
  }
  std::optional<std::string> best;
  std::size_t least = tolerated(word) + 1;
  for (const std::string& candidate : candidates) {
    const std::size_t distance = edit_distance(word, candidate);
    if (distance < least && distance < candidate.size()) {
      least = distance;
      best = candidate;
    }
  }
  return best;
}

std::optional<std::string> nearest_key(const std::string& key) {
  const std::string table = table_of(key);
  const std::string leaf = leaf_of(key);
  if (const auto inside = nearest(leaf, leaves_in(table))) {
    return table.empty() ? *inside : table + "." + *inside;
  }
  if (const auto elsewhere = same_leaf_elsewhere(leaf)) return elsewhere;
  std::vector<std::string> all;
  for (const KeySpec& spec : input_schema()) all.push_back(spec.key);
  if (const auto whole = nearest(key, all)) return whole;
  std::vector<std::string> leaves;
  for (const std::string& candidate : all) leaves.push_back(leaf_of(candidate));
  const auto by_leaf = nearest(leaf, leaves);
  return by_leaf ? same_leaf_elsewhere(*by_leaf) : std::nullopt;
}

}  // namespace ringward::cli
