#pragma once

#include <memory>
#include <string>

#include "cli/evidence/case_input.hpp"
#include "cli/evidence/evidence_case.hpp"

namespace ringward::cli {

/// A problem of a case, posed to the program and ready to answer for its quantities.
class CaseModel {
 public:
  virtual ~CaseModel() = default;
  /// @throws Error(bad_input) for a quantity or an argument that the kind does not know
  [[nodiscard]] virtual double value(const std::string& quantity, const Arguments& at) = 0;
};

using CaseModelPtr = std::unique_ptr<CaseModel>;

/// @throws Error(bad_input) for an unknown kind or unusable inputs
[[nodiscard]] CaseModelPtr make_model(const EvidenceCase& evidence);

/// The argument of that name.
/// @throws Error(bad_input) when it is not given
[[nodiscard]] double argument(const Arguments& at, const std::string& name);

[[noreturn]] void unknown_quantity(const std::string& quantity);

/// `time_s`, or `time_min` in seconds.
[[nodiscard]] double time_argument_s(const Arguments& at);

// One kind each.
[[nodiscard]] CaseModelPtr fire_model(const CaseInput& input);
[[nodiscard]] CaseModelPtr thermal_law_model(const CaseInput& input);
[[nodiscard]] CaseModelPtr strength_law_model(const CaseInput& input);
[[nodiscard]] CaseModelPtr restrained_bar_model(const CaseInput& input);
[[nodiscard]] CaseModelPtr heat_model(const CaseInput& input, const EvidenceCase& evidence);
[[nodiscard]] CaseModelPtr confinement_model(const CaseInput& input);
[[nodiscard]] CaseModelPtr column_model(const CaseInput& input, const EvidenceCase& evidence);

}  // namespace ringward::cli
