#pragma once

#include <optional>
#include <string>
#include <vector>

#include "cli/dossier/assumptions.hpp"
#include "cli/dossier/hand_check.hpp"
#include "cli/evidence/evidence_run.hpp"
#include "cli/input/toml_reading.hpp"
#include "cli/output/field_states.hpp"
#include "cli/output/rate_report.hpp"
#include "mechanical/section/interaction.hpp"

namespace ringward::cli {

/// The capacity against time that another confinement model gives.
struct ModelHistory {
  mechanical::ConfinementModel model = mechanical::ConfinementModel::none;
  std::vector<mechanical::HistoryRow> history;
};

/// Everything that a dossier shows, computed.
struct DossierData {
  InputSource source;
  std::vector<std::string> overrides;
  RateReport report;
  thermal::TemperatureHistory history;
  double end_s = 0;  ///< the failure, or the end of the followed fire
  Field field;       ///< at the class times up to the end, and at the end
  std::vector<mechanical::CapacityState> states;         ///< at the class times before the end
  std::vector<mechanical::CapacityState> first_minutes;  ///< closely, while a tube loses its grip
  std::vector<mechanical::InteractionDiagram> diagrams;  ///< along x, then along y if it differs
  std::vector<ModelHistory> other_models;                ///< of a confining tube
  std::vector<AssumptionRow> assumptions;
  HandCheck hand_check;
  mechanical::CapacityState hand_check_state;  ///< of the program, at the same time
  std::vector<CheckResult> evidence;

  [[nodiscard]] const mechanical::Column& column() const { return report.input.column; }
  [[nodiscard]] const thermal::Section& section() const { return column().section; }
  [[nodiscard]] bool fails() const { return !report.verdict.survives(); }
};

/// Rates the column and computes all that the dossier shows beside the rating.
/// @throws Error(bad_input, solver_breakdown)
[[nodiscard]] DossierData dossier_data(InputSource source,
                                       const std::vector<std::string>& overrides);

}  // namespace ringward::cli
