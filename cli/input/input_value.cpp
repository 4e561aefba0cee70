#include "cli/input/input_value.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <charconv>
#include <cmath>

#include "cli/input/key_suggestion.hpp"

namespace ringward::cli {
namespace {

/// The checks of one value; problems go to the place of the offending part.
class ValueCheck {
 public:
  ValueCheck(const KeySpec& spec, const std::string& key, Problems& problems)
      : spec_(spec), key_(key), problems_(problems) {}

  InputValue check(const InputNode& node) {
    switch (spec_.type) {
      case KeyType::text:
        return node.kind == NodeKind::text ? InputValue(node.text) : wrong_type(node);
      case KeyType::choice:
        return choice(node);
      case KeyType::number:
        return number(node);
      case KeyType::integer:
        return whole(node);
      case KeyType::number_pair:
        return single_pair(node);
      case KeyType::pair_list:
        return pairs(node, spec_.key == "fire.points_min_C" ? "time" : "");
      case KeyType::number_or_pair_list:
        return node.kind == NodeKind::number ? number(node) : pairs(node, "temperature");
      case KeyType::choice_list:
        return choices(node);
      case KeyType::choice_or_list:
        return choice_or_list(node);
      default:
        return wrong_type(node);
    }
  }

 private:
  InputValue wrong_type(const InputNode& node) {
    const std::string example = spec_.example.empty() ? spec_.fallback : spec_.example;
    std::string text = fmt::format("expected {}, found {}", type_text(spec_), describe(node));
    if (!spec_.unit.empty()) text += fmt::format("; the unit is {}", spec_.unit);
    if (!example.empty()) text += fmt::format("; write e.g. {} = {}", leaf_of(key_), example);
    return refuse(node, text);
  }

  InputValue refuse(const InputNode& node, const std::string& text) {
    problems_.add(node.location, key_, text);
    return {};
  }

  std::string with_unit(double value) const {
    return spec_.unit.empty() ? fmt::format("{}", value) : fmt::format("{} {}", value, spec_.unit);
  }

  std::string with_advice(const std::string& text) const {
    return spec_.advice.empty() ? text : text + "; " + spec_.advice;
  }

  bool in_range(const InputNode& node) {
    const double value = node.number;
    const Range& range = spec_.range;
    if (!std::isfinite(value)) {
      refuse(node,
             fmt::format("{} is not a finite number; allowed is {}", value, range_text(spec_)));
      return false;
    }
    if (range.contains(value)) return true;
    std::string limit;
    if (value > range.high) {
      limit = fmt::format("is above the largest allowed, {}", with_unit(range.high));
    } else if (range.low_is_open) {
      limit = fmt::format("must be above {}", with_unit(range.low));
    } else {
      limit = fmt::format("is below the least allowed, {}", with_unit(range.low));
    }
    refuse(node, with_advice(fmt::format("{} {}", with_unit(value), limit)));
    return false;
  }

  InputValue number(const InputNode& node) {
    if (node.kind != NodeKind::number) return wrong_type(node);
    return in_range(node) ? InputValue(node.number) : InputValue();
  }

  InputValue whole(const InputNode& node) {
    if (node.kind != NodeKind::number) return wrong_type(node);
    if (!in_range(node)) return {};
    if (node.number != std::floor(node.number)) {
      return refuse(node, fmt::format("{} is not a whole number; allowed is {}", node.number,
                                      range_text(spec_)));
    }
    return node.number;
  }

  std::optional<NumberPair> pair(const InputNode& node) {
    const bool well_formed =
        node.kind == NodeKind::list && node.items.size() == 2 &&
        std::all_of(node.items.begin(), node.items.end(),
                    [](const InputNode& item) { return item.kind == NodeKind::number; });
    if (!well_formed) {
      wrong_type(node);
      return std::nullopt;
    }
    return NumberPair{node.items[0].number, node.items[1].number};
  }

  InputValue single_pair(const InputNode& node) {
    const auto both = pair(node);
    if (!both || !in_range(node.items[0]) || !in_range(node.items[1])) return {};
    return *both;
  }

  /// @param abscissa name of a first number that has to increase from >= 0; empty: it is a length
  InputValue pairs(const InputNode& node, const std::string& abscissa) {
    if (node.kind != NodeKind::list) return wrong_type(node);
    if (node.items.empty()) return refuse(node, "the list is empty; give at least one pair");
    std::vector<NumberPair> list;
    for (const InputNode& item : node.items) {
      const auto both = pair(item);
      if (!both) return {};
      const bool first_ok =
          abscissa.empty() ? in_range(item.items[0]) : follows(item.items[0], abscissa, list);
      if (!first_ok || !in_range(item.items[1])) return {};
      list.push_back(*both);
    }
    return list;
  }

  bool follows(const InputNode& node, const std::string& abscissa,
               const std::vector<NumberPair>& before) {
    if (!std::isfinite(node.number) || node.number < 0) {
      refuse(node,
             fmt::format("the {} {} is not a finite number of at least 0", abscissa, node.number));
      return false;
    }
    if (!before.empty() && node.number <= before.back()[0]) {
      refuse(node, fmt::format("the table does not increase: the {} {} follows {}; put the points "
                               "in increasing order of {}, each once",
                               abscissa, node.number, before.back()[0], abscissa));
      return false;
    }
    return true;
  }

  bool is_choice(const InputNode& node) {
    if (node.kind != NodeKind::text) {
      wrong_type(node);
      return false;
    }
    const auto& known = spec_.choices;
    if (std::find(known.begin(), known.end(), node.text) != known.end()) return true;
    std::string text = fmt::format("\"{}\" is none of {}", node.text, quoted_list(known));
    if (const auto meant = nearest(node.text, known)) {
      text += fmt::format("; did you mean \"{}\"?", *meant);
    } else {
      text += "; use one of these";
    }
    refuse(node, text);
    return false;
  }

  InputValue choice(const InputNode& node) {
    return is_choice(node) ? InputValue(node.text) : InputValue();
  }

  InputValue choices(const InputNode& node) {
    if (node.kind != NodeKind::list) return wrong_type(node);
    std::vector<std::string> list;
    for (const InputNode& item : node.items) {
      if (!is_choice(item)) return {};
      if (std::find(list.begin(), list.end(), item.text) != list.end()) {
        return refuse(item, fmt::format("\"{}\" is listed twice; list each once", item.text));
      }
      list.push_back(item.text);
    }
    return list;
  }

  InputValue choice_or_list(const InputNode& node) {
    if (node.kind == NodeKind::list) return choices(node);
    const auto word = default_value(spec_);
    if (node.kind != NodeKind::text || node.text != std::get<std::string>(word)) {
      return wrong_type(node);
    }
    return node.text;
  }

  const KeySpec& spec_;
  const std::string& key_;
  Problems& problems_;
};

}  // namespace

InputValue check_value(const KeySpec& spec, const std::string& key, const InputNode& node,
                       Problems& problems) {
  return ValueCheck(spec, key, problems).check(node);
}

InputValue default_value(const KeySpec& spec) {
  const std::string& text = spec.fallback;
  if (text.empty()) return {};
  if (text.front() == '"') return text.substr(1, text.size() - 2);
  double number = 0;
  std::from_chars(text.data(), text.data() + text.size(), number);
  return number;
}

}  // namespace ringward::cli
