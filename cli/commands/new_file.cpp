#include "cli/commands/new_file.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <optional>
#include <vector>

#include "cli/input/key_suggestion.hpp"
#include "cli/input/schema.hpp"
#include "cli/input/text_wrap.hpp"
#include "thermal/base/error.hpp"

namespace ringward::cli {
namespace {

/// A value that the starter file sets although the key is optional, or that depends on the shape.
struct Sample {
  std::string shape;  ///< empty: every shape
  std::string key;
  std::string value;
};

const std::vector<Sample>& samples() {
  static const std::vector<Sample> list = {
      {"", "title", "\"Column C1 (invented example)\""},
      {"circular", "tube.role", "\"confining\""},
      {"square", "tube.role", "\"composite\""},
      {"rectangular", "tube.role", "\"composite\""},
      {"", "bars[].count", "8"},
      {"", "bars[].axis_mm", "45"},
      {"circular", "bars[].layout", "\"ring\""},
      {"square", "bars[].layout", "\"perimeter\""},
      {"rectangular", "bars[].layout", "\"perimeter\""},
      {"", "rating.required_min", "60"},
  };
  return list;
}

class StarterFile {
 public:
  explicit StarterFile(std::string shape) : shape_(std::move(shape)) {}

  std::string text() {
    text_ =
        "# A column for `ringward rate`. Lengths mm, strengths MPa, forces kN, moments kNm,\n"
        "# temperatures deg C, times min. x to the right, y up from the centroid of the section.\n"
        "# A line such as `#key = value` shows a default or an alternative: remove the # to set "
        "it.\n"
        "# `ringward explain KEY` tells more. The values are invented.\n\n";
    write_keys("", false);
    for (const KeySpec* spec : keys_in("")) {
      if (spec->is_table()) write_table(*spec, false);
    }
    return text_;
  }

 private:
  static std::string heading(const KeySpec& table) {
    if (table.type != KeyType::table_list) return "[" + table.key + "]";
    return "[[" + table.key.substr(0, table.key.size() - 2) + "]]";
  }

  static std::string comment(const std::string& text) {
    return "# " + wrapped(text, 2, "# ") + "\n";
  }

  /// Parts that the starter column has; other optional tables are shown commented out.
  static bool is_active(const KeySpec& table) {
    const bool is_part = table.key == "tube" || table.key == "bars[]";
    return is_part || (table.only_if.key.empty() && table.need != Need::optional);
  }

  void write_table(const KeySpec& table, bool inside_comment) {
    const bool is_comment = inside_comment || !is_active(table);
    text_ += "\n" + comment(table.help);
    text_ += (is_comment ? "#" : "") + heading(table) + "\n";
    if (!table.example.empty()) text_ += "#" + table.example + "\n";
    write_keys(table.key, is_comment);
    for (const KeySpec* spec : keys_in(table.key)) {
      if (spec->is_table()) write_table(*spec, is_comment);
    }
  }

  void write_keys(const std::string& table, bool is_comment) {
    for (const KeySpec* spec : keys_in(table)) {
      if (!spec->is_table() && belongs(*spec)) write_key(*spec, is_comment);
    }
  }

  bool belongs(const KeySpec& spec) const {
    return spec.only_if.key != "section.shape" || spec.only_if.value == shape_;
  }

  void write_key(const KeySpec& spec, bool is_comment) {
    const auto sample = sample_for(spec);
    const bool of_shape = spec.only_if.key == "section.shape";
    const bool must = spec.need == Need::required && (spec.only_if.key.empty() || of_shape);
    const std::string fallback = spec.fallback.empty() ? spec.example : spec.fallback;
    const std::string value = sample ? *sample : must ? spec.example : fallback;
    const bool is_set = !is_comment && (must || sample);
    text_ += comment(spec.help + limits(spec));
    text_ += fmt::format("{}{} = {}\n", is_set ? "" : "#", leaf_of(spec.key), value);
  }

  static std::string limits(const KeySpec& spec) {
    const std::string limits =
        spec.type == KeyType::choice ? quoted_list(spec.choices) : range_text(spec);
    return limits.empty() ? "" : " (" + limits + ")";
  }

  std::optional<std::string> sample_for(const KeySpec& spec) const {
    if (spec.key == "section.shape") return "\"" + shape_ + "\"";
    for (const Sample& sample : samples()) {
      if (sample.key == spec.key && (sample.shape.empty() || sample.shape == shape_)) {
        return sample.value;
      }
    }
    return std::nullopt;
  }

  std::string shape_;
  std::string text_;
};

}  // namespace

std::string new_file_text(const std::string& shape) {
  const auto& shapes = find_key("section.shape")->choices;
  if (std::find(shapes.begin(), shapes.end(), shape) == shapes.end()) {
    const auto meant = nearest(shape, shapes);
    throw Error(ErrorKind::bad_input,
                fmt::format("--shape: \"{}\" is none of {}; {}", shape, quoted_list(shapes),
                            meant ? "did you mean \"" + *meant + "\"?" : "use one of these"));
  }
  return StarterFile(shape).text();
}

}  // namespace ringward::cli
