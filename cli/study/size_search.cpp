#include "cli/study/size_search.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <boost/math/tools/toms748_solve.hpp>
#include <cmath>
#include <cstdint>

#include "cli/output/numbers.hpp"

namespace ringward::cli {
namespace {

constexpr double kSameValue = 1e-9;
/// A margin that rounds to zero is on one side all the same; the solver must not take it for the
/// crossing itself.
constexpr double kJustMet_min = 1e-6;

/// Thrown through the solver when no more ratings are allowed.
class OutOfRatings {};

class Search {
 public:
  Search(const SizeBracket& bracket, const std::function<LayoutRow(double)>& rate)
      : bracket_(bracket), rate_(rate) {}

  SizeResult run() {
    const double at_low = margin(bracket_.low);
    const double at_high = margin(bracket_.high);
    result_.response = at_high > at_low   ? Response::rises
                       : at_high < at_low ? Response::falls
                                          : Response::flat;
    if ((at_low > 0) != (at_high > 0)) close_in(at_low, at_high);
    choose();
    find_contradictions();
    return std::move(result_);
  }

 private:
  double margin(double value) {
    const double snapped = bracket_.snapped(value);
    std::vector<SizeTrial>& trials = result_.trials;
    auto place = std::lower_bound(
        trials.begin(), trials.end(), snapped - kSameValue,
        [](const SizeTrial& trial, double sought) { return trial.value < sought; });
    const bool is_known = place != trials.end() && place->value <= snapped + kSameValue;
    if (!is_known) {
      if (trials.size() >= kMostRatings) throw OutOfRatings();
      place = trials.insert(place, {snapped, rate_(snapped)});
    }
    return place->met() ? std::max(place->margin_min(), kJustMet_min)
                        : std::min(place->margin_min(), -kJustMet_min);
  }

  void close_in(double at_low, double at_high) {
    const auto is_close = [this](double a, double b) {
      return std::abs(bracket_.snapped(b) - bracket_.snapped(a)) <= bracket_.step + kSameValue;
    };
    std::uintmax_t steps = 1000;  // most of them meet a value that is known
    try {
      (void)boost::math::tools::toms748_solve([this](double value) { return margin(value); },
                                              bracket_.low, bracket_.high, at_low, at_high,
                                              is_close, steps);
    } catch (const OutOfRatings&) {
      result_.is_narrowed = false;
    }
  }

  /// On the safe side of every trial that does not meet the requirement.
  void choose() {
    const std::vector<SizeTrial>& trials = result_.trials;
    const std::size_t last = trials.size() - 1;
    const bool from_top = result_.response != Response::falls;
    for (std::size_t k = 0; k <= last; ++k) {
      const std::size_t index = from_top ? last - k : k;
      if (!trials[index].met()) {
        result_.next = index;
        return;
      }
      result_.chosen = index;
    }
  }

  void find_contradictions() {
    if (result_.response == Response::flat) return;
    const std::vector<SizeTrial>& trials = result_.trials;
    for (std::size_t k = 0; k + 1 < trials.size(); ++k) {
      const bool rises = result_.response == Response::rises;
      const SizeTrial& shorter = rises ? trials[k] : trials[k + 1];
      const SizeTrial& longer = rises ? trials[k + 1] : trials[k];
      if (contradicts(shorter, longer)) {
        result_.contradictions.push_back(
            fmt::format("{} min at {}, but {} at {}", resistance(shorter), shortest(shorter.value),
                        resistance(longer) + " min", shortest(longer.value)));
      }
    }
  }

  /// A column that survives counts as longer than what was followed.
  static bool contradicts(const SizeTrial& shorter, const SizeTrial& longer) {
    const Verdict& a = *shorter.row.verdict;
    const Verdict& b = *longer.row.verdict;
    if (b.survives()) return false;
    const double least_a =
        a.survives() ? a.assessed_min : *a.fire_resistance_min - a.uncertainty_min;
    return least_a > *b.fire_resistance_min + b.uncertainty_min;
  }

  static std::string resistance(const SizeTrial& trial) {
    const Verdict& verdict = *trial.row.verdict;
    return verdict.survives() ? "above " + shortest(verdict.assessed_min)
                              : shortest(*verdict.fire_resistance_min);
  }

  const SizeBracket& bracket_;
  const std::function<LayoutRow(double)>& rate_;
  SizeResult result_;
};

}  // namespace

double SizeBracket::snapped(double value) const {
  if (value <= low) return low;
  if (value >= high) return high;
  // Nine decimals, so that the value reads as it was meant: 0.3, not 0.30000000000000004.
  const double multiple = rounded(std::round(value / step) * step, 9);
  return std::clamp(multiple, low, high);
}

double SizeResult::misses_by_min() const {
  double best = trials.front().margin_min();
  for (const SizeTrial& trial : trials) best = std::max(best, trial.margin_min());
  return -best;
}

SizeResult find_size(const SizeBracket& bracket, const std::function<LayoutRow(double)>& rate) {
  return Search(bracket, rate).run();
}

}  // namespace ringward::cli
