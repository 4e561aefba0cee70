#include "cli/input/overrides.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <cctype>
#include <charconv>
#include <optional>

#include "cli/input/toml_reading.hpp"
#include "thermal/base/error.hpp"

namespace ringward::cli {
namespace {

/// One step of a path: a key, or an index into a list.
struct Step {
  bool is_index = false;
  std::string key;
  std::size_t index = 0;
};

struct Assignment {
  std::string key;
  std::string value;
  std::size_t rank = 0;
};

bool is_bare(char c) {
  return std::isalnum(static_cast<unsigned char>(c)) != 0 || c == '_' || c == '-';
}

/// Reads the steps of `bars[0].axis_mm` or `sensitivity."core.moisture_percent"`.
class PathReader {
 public:
  explicit PathReader(const std::string& path) : path_(path) {}

  std::optional<std::vector<Step>> steps() {
    std::vector<Step> steps;
    do {
      std::string key = take_key();
      if (key.empty()) return std::nullopt;
      steps.push_back({.key = std::move(key)});
      while (take('[')) {
        const auto index = take_index();
        if (!index || !take(']')) return std::nullopt;
        steps.push_back({.is_index = true, .key = {}, .index = *index});
      }
    } while (take('.'));
    if (at_ != path_.size()) return std::nullopt;
    return steps;
  }

 private:
  bool take(char c) {
    if (at_ >= path_.size() || path_[at_] != c) return false;
    ++at_;
    return true;
  }

  std::string take_key() {
    if (take('"')) {
      const auto end = path_.find('"', at_);
      if (end == std::string::npos) return {};
      const std::string key = path_.substr(at_, end - at_);
      at_ = end + 1;
      return key;
    }
    const std::size_t begin = at_;
    while (at_ < path_.size() && is_bare(path_[at_])) ++at_;
    return path_.substr(begin, at_ - begin);
  }

  std::optional<std::size_t> take_index() {
    std::size_t index = 0;
    const char* begin = path_.data() + at_;
    const auto [end, error] = std::from_chars(begin, path_.data() + path_.size(), index);
    if (error != std::errc{}) return std::nullopt;
    at_ += static_cast<std::size_t>(end - begin);
    return index;
  }

  const std::string& path_;
  std::size_t at_ = 0;
};

std::string trimmed(const std::string& text) {
  const auto begin = text.find_first_not_of(" \t");
  if (begin == std::string::npos) return {};
  return text.substr(begin, text.find_last_not_of(" \t") - begin + 1);
}

/// Where KEY ends: the first `=` outside quotes.
std::size_t separator(const std::string& text) {
  bool quoted = false;
  for (std::size_t i = 0; i < text.size(); ++i) {
    if (text[i] == '"') quoted = !quoted;
    if (text[i] == '=' && !quoted) return i;
  }
  return std::string::npos;
}

Location location_of(const Assignment& assignment) {
  Location location;
  location.override_key = assignment.key;
  location.override_rank = assignment.rank;
  return location;
}

void relocate(InputNode& node, const Location& location) {
  node.location = location;
  for (InputNode& item : node.items) relocate(item, location);
  for (InputEntry& entry : node.entries) {
    entry.key_location = location;
    relocate(entry.value, location);
  }
}

bool is_bare_word(const std::string& value) {
  const bool starts_with_letter =
      !value.empty() && std::isalpha(static_cast<unsigned char>(value.front())) != 0;
  return starts_with_letter && std::all_of(value.begin(), value.end(), [](char c) {
           return is_bare(c) || c == '.' || c == ' ' || c == '/';
         });
}

std::optional<InputNode> parse_value(const Assignment& assignment, Problems& problems) {
  const std::string& value = assignment.value;
  const Location location = location_of(assignment);
  try {
    if (value.find_first_of("\r\n") != std::string::npos) {
      problems.add(location, assignment.key, "the value holds a line break; give one TOML value");
      return std::nullopt;
    }
    InputNode parsed = parse_toml("value = " + value, "value");
    InputNode node = std::move(parsed.entries.front().value);
    relocate(node, location);
    return node;
  } catch (const Error&) {
    std::string advice = "write a number, \"text\" or [a list]";
    if (is_bare_word(value)) {
      advice = fmt::format("text needs quotes: --set '{}=\"{}\"'", assignment.key, value);
    } else if (!value.empty() && value.front() >= '0' && value.front() <= '9') {
      advice = "write the number alone, without its unit";
    }
    problems.add(
        location, assignment.key,
        fmt::format("{} is not a TOML value; {}", value.empty() ? "nothing" : value, advice));
    return std::nullopt;
  }
}

/// Walks the tree to the place of an override and puts the value there.
class Setter {
 public:
  Setter(const Assignment& assignment, Problems& problems)
      : assignment_(assignment), location_(location_of(assignment)), problems_(problems) {}

  /// @return false when the path leads nowhere; then a problem was added
  bool set(InputNode& root, const std::vector<Step>& steps, InputNode value) {
    InputNode* node = &root;
    std::string done;
    for (std::size_t i = 0; i < steps.size(); ++i) {
      const bool before_index = i + 1 < steps.size() && steps[i + 1].is_index;
      node = steps[i].is_index ? element(*node, steps[i], done)
                               : member(*node, steps[i], before_index, done);
      if (node == nullptr) return false;
    }
    *node = std::move(value);
    return true;
  }

 private:
  InputNode* element(InputNode& node, const Step& step, std::string& done) {
    if (node.kind != NodeKind::list) {
      return refuse(fmt::format("{} is not a list; leave out [{}]", done, step.index));
    }
    if (step.index >= node.items.size()) {
      std::string way_out = "use index 0";
      if (node.items.empty()) way_out = "add one to the file first";
      if (node.items.size() > 1) {
        way_out = fmt::format("use an index from 0 to {}", node.items.size() - 1);
      }
      return refuse(fmt::format("{}[{}] does not exist: {} has {} {}; {}", done, step.index, done,
                                node.items.size(), node.items.size() == 1 ? "element" : "elements",
                                way_out));
    }
    done += fmt::format("[{}]", step.index);
    return &node.items[step.index];
  }

  InputNode* member(InputNode& node, const Step& step, bool is_list, std::string& done) {
    if (node.kind == NodeKind::list) {
      return refuse(fmt::format("{} is a list of {}; name the element, as in {}[0].{}", done,
                                node.items.size(), done, step.key));
    }
    if (node.kind != NodeKind::table) {
      return refuse(fmt::format("{} is {}, not a table", done, describe(node)));
    }
    done += (done.empty() ? "" : ".") + step.key;
    if (InputEntry* entry = node.find(step.key)) return &entry->value;
    InputEntry added{step.key, location_, {}};
    added.value.location = location_;
    added.value.kind = is_list ? NodeKind::list : NodeKind::table;
    node.entries.push_back(std::move(added));
    return &node.entries.back().value;
  }

  InputNode* refuse(const std::string& text) {
    problems_.add(location_, assignment_.key, text);
    return nullptr;
  }

  const Assignment& assignment_;
  Location location_;
  Problems& problems_;
};

}  // namespace

void apply_overrides(InputNode& root, const std::vector<std::string>& overrides,
                     Problems& problems) {
  for (std::size_t rank = 0; rank < overrides.size(); ++rank) {
    const std::size_t split = separator(overrides[rank]);
    Assignment assignment{
        .key = trimmed(overrides[rank].substr(0, split)), .value = {}, .rank = rank};
    if (split == std::string::npos) {
      problems.add(location_of(assignment), "",
                   "has no value; write KEY=VALUE, e.g. --set tube.thickness_mm=6");
      continue;
    }
    assignment.value = trimmed(overrides[rank].substr(split + 1));
    const auto steps = PathReader(assignment.key).steps();
    if (!steps) {
      if (assignment.key.empty()) assignment.key = "=" + assignment.value;
      problems.add(location_of(assignment), "",
                   "is not the name of an input key; write e.g. tube.thickness_mm or "
                   "bars[0].axis_mm");
      continue;
    }
    if (auto value = parse_value(assignment, problems)) {
      InputNode changed = root;
      if (Setter(assignment, problems).set(changed, *steps, std::move(*value))) {
        root = std::move(changed);
      }
    }
  }
}

}  // namespace ringward::cli
