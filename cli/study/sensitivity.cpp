#include "cli/study/sensitivity.hpp"

#include <algorithm>
#include <map>
#include <numeric>

#include "cli/input/reader.hpp"
#include "cli/study/heat_key.hpp"
#include "cli/study/layout_rating.hpp"
#include "cli/study/run_layouts.hpp"
#include "cli/study/shared_heat_flow.hpp"
#include "cli/study/step_progress.hpp"
#include "thermal/base/error.hpp"

namespace ringward::cli {
namespace {

/// One column to rate: the base, or the base with one value changed.
struct Variant {
  std::optional<ColumnInput> input;
  std::string reason;  ///< why it is no valid column
  std::size_t heat_group = 0;
};

class Variants {
 public:
  Variants(const InputSource& source, const std::vector<std::string>& overrides)
      : source_(source), overrides_(overrides) {}

  void add(ColumnInput input) {
    Variant variant;
    variant.heat_group = group_of(input);
    variant.input = std::move(input);
    all_.push_back(std::move(variant));
  }

  void add_with(const std::string& key, const std::string& value) {
    std::vector<std::string> assignments = overrides_;
    assignments.push_back(key + "=" + value);
    try {
      add(read_column(source_, assignments));
    } catch (const Error& error) {
      all_.push_back({.input = std::nullopt, .reason = error.what(), .heat_group = 0});
    }
  }

  /// Indices of the valid ones, those that share temperatures one after the other.
  [[nodiscard]] std::vector<std::size_t> order() const {
    std::vector<std::size_t> order;
    for (std::size_t i = 0; i < all_.size(); ++i) {
      if (all_[i].input) order.push_back(i);
    }
    std::stable_sort(order.begin(), order.end(), [&](std::size_t a, std::size_t b) {
      return all_[a].heat_group < all_[b].heat_group;
    });
    return order;
  }

  [[nodiscard]] const Variant& operator[](std::size_t index) const { return all_[index]; }
  [[nodiscard]] std::size_t count() const { return all_.size(); }

 private:
  std::size_t group_of(const ColumnInput& input) {
    return groups_.try_emplace(heat_key(input), groups_.size()).first->second;
  }

  const InputSource& source_;
  const std::vector<std::string>& overrides_;
  std::vector<Variant> all_;
  std::map<std::string, std::size_t> groups_;
};

std::vector<LayoutRow> rate_all(const Variants& variants, std::size_t jobs) {
  const std::vector<std::size_t> order = variants.order();
  std::vector<std::size_t> groups;
  for (const std::size_t index : order) groups.push_back(variants[index].heat_group);
  SharedHeatFlow shared(groups);
  StepProgress progress("rated", order.size(), 0);
  std::vector<LayoutRow> rows(variants.count());
  const auto rate = [&](std::size_t index) {
    const Variant& variant = variants[index];
    const HeatFlow heat_flow = [&](const thermal::Resolution& resolution) {
      return shared.get(variant.heat_group, variant.input->column.section, variant.input->fire,
                        resolution);
    };
    LayoutRow row = rate_layout(*variant.input, heat_flow, {});
    row.index = index;
    shared.release(variant.heat_group);
    return row;
  };
  run_layouts(order, jobs, rate, [&](const LayoutRow& row) {
    rows[row.index] = row;
    progress.step();
  });
  return rows;
}

SensitivityAnswer answer(const Variant& variant, const LayoutRow& row) {
  if (!variant.input) return {.verdict = std::nullopt, .reason = variant.reason};
  return {.verdict = row.verdict, .reason = row.reason};
}

}  // namespace

std::optional<double> SensitivityAnswer::time_min() const {
  if (!verdict) return std::nullopt;
  return verdict->fire_resistance_min.value_or(verdict->assessed_min);
}

double SensitivityRow::span_min(double base_min) const {
  const double low = at_low.time_min().value_or(base_min);
  const double high = at_high.time_min().value_or(base_min);
  return std::max({low, high, base_min}) - std::min({low, high, base_min});
}

SensitivityReport sensitivity_of(const InputSource& source,
                                 const std::vector<std::string>& overrides, std::size_t jobs) {
  ColumnInput base = read_column(source, overrides);
  const std::vector<UncertainInput> inputs = uncertain_inputs(base);
  SensitivityReport report{
      .title = base.title, .input_sha256 = base.input_sha256, .base = {}, .rows = {}};
  Variants variants(source, overrides);
  variants.add(std::move(base));
  for (const UncertainInput& input : inputs) {
    variants.add_with(input.key, input.low);
    variants.add_with(input.key, input.high);
  }
  const std::vector<LayoutRow> rated = rate_all(variants, jobs);
  report.base = rated.front();
  if (!report.base.verdict) throw Error(ErrorKind::solver_breakdown, report.base.reason);
  for (std::size_t i = 0; i < inputs.size(); ++i) {
    report.rows.push_back({inputs[i], answer(variants[2 * i + 1], rated[2 * i + 1]),
                           answer(variants[2 * i + 2], rated[2 * i + 2])});
  }
  const double base_min = SensitivityAnswer{report.base.verdict, ""}.time_min().value();
  std::stable_sort(report.rows.begin(), report.rows.end(),
                   [&](const SensitivityRow& a, const SensitivityRow& b) {
                     return a.span_min(base_min) > b.span_min(base_min);
                   });
  return report;
}

}  // namespace ringward::cli
