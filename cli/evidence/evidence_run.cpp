#include "cli/evidence/evidence_run.hpp"

#include <algorithm>
#include <atomic>
#include <cmath>
#include <exception>
#include <set>
#include <thread>

#include "cli/evidence/case_model.hpp"
#include "cli/output/numbers.hpp"
#include "thermal/base/error.hpp"

namespace ringward::cli {
namespace {

/// "time_min" with 60 as "time 60 min", "xi" with 0.1 as "xi 0.1".
std::string argument_words(const std::string& name, double value) {
  static const std::set<std::string> units = {"min", "s", "m", "mm", "C"};
  const std::size_t at = name.rfind('_');
  const bool has_unit = at != std::string::npos && units.count(name.substr(at + 1)) > 0;
  std::string words = has_unit ? name.substr(0, at) : name;
  std::replace(words.begin(), words.end(), '_', ' ');
  return words + " " + shortest(value) + (has_unit ? " " + name.substr(at + 1) : "");
}

std::string label_of(const Check& check, const Arguments& at) {
  std::string label = check.quantity;
  for (const auto& [name, value] : at) {
    label += (label.size() == check.quantity.size() ? " at " : ", ") + argument_words(name, value);
  }
  return label;
}

bool is_met(const CheckResult& result) {
  if (!std::isfinite(result.computed)) return false;
  switch (result.comparison) {
    case Comparison::within:
      return std::abs(result.difference()) <= result.tolerance;
    case Comparison::at_least:
      return result.difference() >= -result.tolerance;
    case Comparison::at_most:
      return result.difference() <= result.tolerance;
  }
  return false;
}

std::string note_of(const CheckResult& result, const Check& check) {
  if (check.known_gap) {
    return (result.passes ? "passes, though listed as a gap: " : "known gap: ") + *check.known_gap;
  }
  return result.passes ? "" : "off by more than the tolerance, which covers: " + check.reason;
}

CheckResult result_of(const EvidenceCase& evidence, const Check& check, const ExpectedPoint& point,
                      CaseModel& model) {
  CheckResult result;
  result.group = evidence.group;
  result.name = evidence.name;
  result.source = evidence.source;
  result.locator = evidence.locator;
  result.quantity = label_of(check, point.at);
  result.unit = check.unit;
  result.expected = point.expected;
  result.computed = model.value(check.quantity, point.at);
  result.tolerance = check.tolerance + check.relative * std::abs(point.expected);
  result.comparison = check.comparison;
  result.provenance = check.provenance;
  result.is_known_gap = check.known_gap.has_value();
  result.reason = check.reason;
  result.passes = is_met(result);
  result.note = note_of(result, check);
  return result;
}

std::vector<CheckResult> run_case(const EvidenceCase& evidence) {
  try {
    const CaseModelPtr model = make_model(evidence);
    std::vector<CheckResult> results;
    for (const Check& check : evidence.checks) {
      for (const ExpectedPoint& point : check.points) {
        results.push_back(result_of(evidence, check, point, *model));
      }
    }
    return results;
  } catch (const Error& problem) {
    throw problem.within("case \"" + evidence.name + "\"");
  }
}

/// What the threads share: each takes the next case that nobody has taken.
struct Work {
  const std::vector<EvidenceCase>* cases;
  std::vector<std::vector<CheckResult>> results;
  std::vector<std::exception_ptr> problems;
  std::atomic<std::size_t> next{0};

  void take_cases() {
    for (std::size_t k = next++; k < cases->size(); k = next++) {
      try {
        results[k] = run_case((*cases)[k]);
      } catch (...) {
        problems[k] = std::current_exception();
      }
    }
  }
};

}  // namespace

std::vector<CheckResult> run_cases(const std::vector<EvidenceCase>& cases) {
  Work work{.cases = &cases,
            .results = std::vector<std::vector<CheckResult>>(cases.size()),
            .problems = std::vector<std::exception_ptr>(cases.size())};
  {
    std::vector<std::jthread> threads;
    const std::size_t count = std::max(1U, std::thread::hardware_concurrency());
    for (std::size_t i = 0; i < std::min(count, cases.size()); ++i) {
      threads.emplace_back([&work] { work.take_cases(); });
    }
  }
  std::vector<CheckResult> all;
  for (std::size_t k = 0; k < cases.size(); ++k) {
    if (work.problems[k]) std::rethrow_exception(work.problems[k]);
    all.insert(all.end(), work.results[k].begin(), work.results[k].end());
  }
  return all;
}

bool all_as_expected(const std::vector<CheckResult>& results) {
  return std::all_of(results.begin(), results.end(), [](const CheckResult& result) {
    return result.passes || result.is_known_gap;
  });
}

}  // namespace ringward::cli
