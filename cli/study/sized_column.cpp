#include "cli/study/sized_column.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <cmath>

#include "cli/commands/usage_error.hpp"
#include "cli/input/key_suggestion.hpp"
#include "cli/input/overrides.hpp"
#include "cli/input/reader.hpp"
#include "cli/output/numbers.hpp"
#include "cli/study/heat_key.hpp"
#include "cli/study/layout_rating.hpp"
#include "cli/study/toml_edit.hpp"
#include "cli/study/toml_text.hpp"
#include "thermal/base/error.hpp"

namespace ringward::cli {
namespace {

constexpr const char* kRequired = "rating.required_min";
constexpr const char* kFollowed = "fire.duration_min";
constexpr double kFollowedShare = 1.5;

InputNode tree_with(const InputSource& source, const std::vector<std::string>& overrides) {
  InputNode root = parse_toml(source.text, source.name);
  Problems problems(source.name);
  apply_overrides(root, overrides, problems);
  problems.throw_if_any();
  return root;
}

}  // namespace

const KeySpec& varied_key(const std::string& key) {
  const std::string spelt = schema_spelling(key);
  const KeySpec* spec = find_key(spelt);
  if (spec == nullptr) {
    const auto meant = nearest_key(spelt);
    throw UsageError("--vary: \"" + key + "\" is no input key" +
                     (meant ? "; did you mean " + *meant + "?" : ""));
  }
  const bool is_number = spec->type == KeyType::number || spec->type == KeyType::integer ||
                         spec->type == KeyType::number_or_pair_list;
  if (!is_number) throw UsageError("--vary: " + key + " is not a number");
  if (spelt == kRequired || spelt == kFollowed) {
    throw UsageError("--vary: " + key + " says what is asked for; vary something else");
  }
  return *spec;
}

double default_step(const KeySpec& spec, double low, double high) {
  const double power = std::floor(std::log10((high - low) / 50));
  const double step = rounded(std::pow(10.0, power), 12);
  return spec.type == KeyType::integer ? std::max(1.0, step) : step;
}

SizedColumn::SizedColumn(SizeQuestion question) : question_(std::move(question)) {
  unit_ = varied_key(question_.key).unit;
  const InputNode root = tree_with(question_.source, question_.overrides);
  const std::optional<double> required =
      question_.required_min ? question_.required_min : number_in(root, kRequired);
  if (!required) {
    throw UsageError("nothing is required: give --for MIN, or rating.required_min in the column");
  }
  required_min_ = *required;
  if (question_.required_min) settled_[kRequired] = required_min_;
  const KeySpec& followed = *find_key(kFollowed);
  const double wanted = std::min(followed.range.high, rounded(kFollowedShare * required_min_, 6));
  if (number_in(root, kFollowed).value_or(std::stod(followed.fallback)) < wanted) {
    settled_[kFollowed] = wanted;
  }
  title_ = read_column(question_.source, assignments(question_.bracket.low)).title;
  (void)read_column(question_.source, assignments(question_.bracket.high));
}

std::vector<std::string> SizedColumn::assignments(double value) const {
  std::vector<std::string> all = question_.overrides;
  for (const auto& [key, number] : settled_) all.push_back(key + "=" + shortest(number));
  all.push_back(question_.key + "=" + shortest(value));
  return all;
}

LayoutRow SizedColumn::rate(double value) {
  const std::string where = fmt::format("at {} = {}", question_.key, shortest(value));
  try {
    const ColumnInput input = read_column(question_.source, assignments(value));
    std::string key = heat_key(input);
    if (key != last_heat_.key) last_heat_ = {std::move(key), {}};
    const HeatFlow heat_flow = [&](const thermal::Resolution& resolution) {
      auto& kept = last_heat_.by_scale;
      const auto known = kept.find(resolution.scale);
      if (known != kept.end()) return known->second;
      return kept
          .emplace(resolution.scale,
                   thermal::solve_heat_flow(input.column.section, input.fire, resolution))
          .first->second;
    };
    LayoutRow row = rate_layout(input, heat_flow, {});
    if (!row.verdict) throw Error(ErrorKind::solver_breakdown, row.reason);
    return row;
  } catch (const Error& error) {
    throw error.within(where);
  }
}

std::string SizedColumn::file_text(double value) const {
  std::map<std::string, double> numbers = settled_;
  numbers[question_.key] = value;
  const ColumnInput wanted = read_column(question_.source, assignments(value));
  const auto is_right = [&](const std::string& text) {
    return same_values(wanted, {question_.source.name, text, question_.source.folder});
  };
  if (question_.overrides.empty()) {
    const std::string edited = with_numbers(question_.source.text, numbers);
    if (is_right(edited)) return edited;
  }
  const std::string rewritten = toml_document(tree_with(question_.source, assignments(value)));
  if (!is_right(rewritten)) {
    throw std::logic_error("the sized column does not read back as it was rated");
  }
  return rewritten;
}

}  // namespace ringward::cli
