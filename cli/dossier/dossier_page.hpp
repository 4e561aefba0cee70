#pragma once

#include <string>

#include "cli/dossier/dossier_data.hpp"

namespace ringward::cli {

/// The submission for code review as one self-contained page. The same data give the same bytes.
[[nodiscard]] std::string dossier_html(const DossierData& data);

}  // namespace ringward::cli
