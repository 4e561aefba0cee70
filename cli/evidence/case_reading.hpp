#pragma once

#include <vector>

#include "cli/evidence/case_files.hpp"
#include "cli/evidence/evidence_case.hpp"

namespace ringward::cli {

/// Reads the cases of one file.
/// @throws Error(bad_input) with `file:line:column` for whatever is not well formed
[[nodiscard]] std::vector<EvidenceCase> read_cases(const CaseFile& file);

/// The cases of all built-in files.
[[nodiscard]] std::vector<EvidenceCase> built_in_cases();

}  // namespace ringward::cli
