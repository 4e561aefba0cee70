#include "cli/study/uncertain_inputs.hpp"

#include <algorithm>
#include <functional>
#include <optional>

#include "cli/input/schema.hpp"
#include "cli/output/numbers.hpp"

namespace ringward::cli {
namespace {

constexpr const char* kNoSource = "common practice, no source";

/// How far a key may be off, from its value.
struct DefaultRange {
  std::string key;  ///< schema spelling
  std::function<double(double)> low;
  std::function<double(double)> high;
  std::string basis;
  std::string source;
};

std::function<double(double)> times(double factor) {
  return [factor](double value) { return rounded(factor * value, 6); };
}

std::function<double(double)> plus(double amount) {
  return [amount](double value) { return rounded(value + amount, 6); };
}

std::function<double(double)> always(double number) {
  return [number](double) { return number; };
}

std::vector<DefaultRange> strengths_and_load() {
  return {{"core.strength_MPa", times(0.85), plus(8),
           "0.85 times (least strength in the structure) to 8 MPa more (mean of a class)",
           "en1992-1-1-2004 Table 3.1; en13791-2007"},
          {"bars[].yield_MPa", times(0.95), times(1.15), "5 % less to 15 % more", kNoSource},
          {"tube.yield_MPa", times(0.95), times(1.2), "5 % less to 20 % more", kNoSource},
          {"steel_shape.yield_MPa", times(0.95), times(1.2), "5 % less to 20 % more", kNoSource},
          {"load.axial_kN", times(0.9), times(1.1), "10 % less or more", kNoSource}};
}

std::vector<DefaultRange> geometry() {
  return {{"bars[].axis_mm", plus(-10), plus(10),
           "10 mm nearer the face or deeper: the allowance "
           "for deviation of the cover",
           "en1992-1-1-2004 4.4.1.3"},
          {"tube.thickness_mm", times(0.9), times(1.1), "10 % less or more", "en10219-2-2006"},
          {"protection.thickness_mm", times(0.8), times(1.1), "20 % less to 10 % more", kNoSource},
          {"tube.friction", always(0.2), always(0.6), "0.2 to 0.6", kNoSource}};
}

std::vector<DefaultRange> heat() {
  return {{"core.moisture_percent", always(1.5), always(10),
           "1.5 % (dry) to 10 % (fresh, enclosed)", "en1992-1-2-2004 3.3.2; en1994-1-2-2005 3.3.2"},
          {"fire.surface.emissivity", always(0.5), always(0.8), "0.5 to 0.8", kNoSource},
          {"tube.contact_resistance_m2K_W", always(0), always(0.01),
           "perfect contact to 0.01 m2K/W", kNoSource},
          {"protection.conductivity_W_mK", times(0.8), times(1.2), "20 % less or more", kNoSource}};
}

double within(const Range& range, double value) { return std::clamp(value, range.low, range.high); }

class RangesOfColumn {
 public:
  explicit RangesOfColumn(const ColumnInput& input) : input_(input) {}

  std::vector<UncertainInput> all() {
    for (const auto& part : {strengths_and_load(), geometry(), heat()}) {
      for (const DefaultRange& range : part) add_default(range);
    }
    add_imperfection();
    add_conductivity();
    for (const SensitivityRange& range : input_.sensitivity) {
      if (!is_listed(range.key)) add_given(range);
    }
    return std::move(inputs_);
  }

 private:
  void add_default(const DefaultRange& range) {
    for (const EchoEntry& entry : input_.echo) {
      const auto* value = std::get_if<double>(&entry.value);
      if (value == nullptr || schema_spelling(entry.key) != range.key) continue;
      add(entry.key, *value, range.low(*value), range.high(*value), range.basis, range.source);
    }
  }

  void add(const std::string& key, double base, double low, double high, const std::string& basis,
           const std::string& source) {
    if (const SensitivityRange* given = given_for(key)) return add_given(*given);
    const Range& allowed = find_key(schema_spelling(key))->range;
    inputs_.push_back({key, shortest(within(allowed, low)), shortest(base),
                       shortest(within(allowed, high)), basis, source});
  }

  void add_given(const SensitivityRange& range) {
    inputs_.push_back({range.key, shortest(range.low), shortest(value_of(range.key)),
                       shortest(range.high), "given in the column's [sensitivity]", "column file"});
  }

  void add_imperfection() {
    const double length_mm = value_of("member.buckling_length_mm");
    add("member.imperfection_mm", value_of("member.imperfection_mm"), rounded(length_mm / 1000, 3),
        rounded(length_mm / 200, 3), "buckling length / 1000 to / 200",
        "en1994-1-1-2004 Table 6.5");
  }

  void add_conductivity() {
    const auto found =
        std::find_if(input_.echo.begin(), input_.echo.end(),
                     [](const EchoEntry& entry) { return entry.key == "core.conductivity"; });
    if (found == input_.echo.end()) return;
    inputs_.push_back({"core.conductivity", "\"lower\"",
                       "\"" + std::get<std::string>(found->value) + "\"", "\"upper\"",
                       "the two limits of the standard", "en1992-1-2-2004 3.3.3"});
  }

  [[nodiscard]] double value_of(const std::string& key) const {
    for (const EchoEntry& entry : input_.echo) {
      const auto* value = std::get_if<double>(&entry.value);
      if (entry.key == key && value != nullptr) return *value;
    }
    return 0.0;
  }

  [[nodiscard]] const SensitivityRange* given_for(const std::string& key) const {
    for (const SensitivityRange& range : input_.sensitivity) {
      if (range.key == key) return &range;
    }
    return nullptr;
  }

  [[nodiscard]] bool is_listed(const std::string& key) const {
    return std::any_of(inputs_.begin(), inputs_.end(),
                       [&](const UncertainInput& input) { return input.key == key; });
  }

  const ColumnInput& input_;
  std::vector<UncertainInput> inputs_;
};

}  // namespace

std::vector<UncertainInput> uncertain_inputs(const ColumnInput& input) {
  return RangesOfColumn(input).all();
}

}  // namespace ringward::cli
