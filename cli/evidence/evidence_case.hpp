#pragma once

#include <map>
#include <optional>
#include <string>
#include <vector>

#include "cli/input/input_tree.hpp"

namespace ringward::cli {

/// Where a quantity is asked for: `time_min`, `T_C`, `x_mm` ... with their values.
using Arguments = std::map<std::string, double>;

/// How an expected figure came here; a computed one is no published value.
enum class Provenance { read, memory, computed };

/// What passes: within the tolerance, or on one side of the expected figure.
enum class Comparison { within, at_least, at_most };

struct ExpectedPoint {
  Arguments at;
  double expected = 0;
};

/// Expected figures of one quantity, with one tolerance and its reason.
struct Check {
  std::string quantity;
  std::string unit;
  std::vector<ExpectedPoint> points;
  double tolerance = 0;  ///< in the unit
  double relative = 0;   ///< added: share of the expected figure
  std::string reason;    ///< of the tolerance
  Provenance provenance = Provenance::memory;
  Comparison comparison = Comparison::within;
  std::optional<std::string> known_gap;  ///< why it is expected not to pass
};

/// One problem with what a publication says about it.
struct EvidenceCase {
  std::string file;
  std::string group;
  std::string name;
  std::string source;  ///< key in docs/sources.toml
  std::string locator;
  std::string kind;
  InputNode inputs;
  std::string column_text;  ///< of kind "column": a column file
  std::vector<Check> checks;
};

/// The groups in the order they are shown.
[[nodiscard]] const std::vector<std::string>& evidence_groups();

[[nodiscard]] const char* provenance_words(Provenance provenance);

}  // namespace ringward::cli
