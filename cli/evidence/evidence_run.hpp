#pragma once

#include <string>
#include <vector>

#include "cli/evidence/evidence_case.hpp"

namespace ringward::cli {

/// One expected figure beside what this machine computed.
struct CheckResult {
  std::string group, name, source, locator;
  std::string quantity;  ///< with its arguments
  std::string unit;
  double expected = 0;
  double computed = 0;
  double tolerance = 0;  ///< in the unit
  Comparison comparison = Comparison::within;
  Provenance provenance = Provenance::memory;
  bool passes = false;
  bool is_known_gap = false;  ///< not expected to pass
  std::string reason;         ///< of the tolerance
  std::string note;           ///< why there is a gap

  [[nodiscard]] double difference() const { return computed - expected; }
  [[nodiscard]] const char* status() const { return passes ? "pass" : "gap"; }
};

/// Reruns the cases, several at a time; the results come in the order of the cases.
/// @throws Error with the name of the case in front
[[nodiscard]] std::vector<CheckResult> run_cases(const std::vector<EvidenceCase>& cases);

/// Everything that should pass does.
[[nodiscard]] bool all_as_expected(const std::vector<CheckResult>& results);

}  // namespace ringward::cli
