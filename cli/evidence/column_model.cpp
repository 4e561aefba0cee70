#include <algorithm>
#include <optional>
#include <set>

#include "cli/evidence/case_model.hpp"
#include "cli/input/reader.hpp"
#include "mechanical/rating/rating.hpp"
#include "thermal/base/error.hpp"
#include "thermal/base/units.hpp"

namespace ringward::cli {
namespace {

using mechanical::CapacityState;

/// Material factors of cold design, for loads given as a share of the cold design resistance.
constexpr mechanical::MaterialFactors kColdDesign{.concrete = 1.5, .bar = 1.15, .steel = 1.0};

double cold_design_resistance_N(ColumnInput input) {
  input.column.factors = kColdDesign;
  const thermal::TemperatureHistory history = thermal::solve_heat_flow(
      input.column.section, input.fire, {.accuracy = thermal::Accuracy::coarse, .scale = 1.0});
  return mechanical::capacities(input.column, history, {0.0}).front().capacity_N;
}

ColumnInput column_of(const CaseInput& input, const EvidenceCase& evidence) {
  if (evidence.column_text.empty()) input.fail("column", "is missing");
  input.allow({"set", "load_share_of_cold_design"});
  const std::vector<std::string> overrides =
      input.has("set") ? input.texts("set") : std::vector<std::string>{};
  ColumnInput column = read_column({evidence.file, evidence.column_text, "."}, overrides);
  if (input.has("load_share_of_cold_design")) {
    column.column.load.axial_N =
        input.number("load_share_of_cold_design") * cold_design_resistance_N(column);
  }
  return column;
}

bool is_resistance(const std::string& quantity) { return quantity.ends_with(" resistance"); }

/// The times at which a resistance of section or member is asked for.
std::vector<double> capacity_times_s(const EvidenceCase& evidence) {
  std::set<double> times;
  for (const Check& check : evidence.checks) {
    if (!is_resistance(check.quantity) || check.quantity == "fire resistance") continue;
    for (const ExpectedPoint& point : check.points) times.insert(time_argument_s(point.at));
  }
  return {times.begin(), times.end()};
}

class ColumnModel : public CaseModel {
 public:
  ColumnModel(const CaseInput& input, const EvidenceCase& evidence)
      : input_(column_of(input, evidence)), times_s_(capacity_times_s(evidence)) {}

  double value(const std::string& quantity, const Arguments& at) override {
    if (quantity == "fire resistance") return fire_resistance_min();
    if (quantity == "temperature") {
      return history().T_C(
          {units::m_from_mm(argument(at, "x_mm")), units::m_from_mm(argument(at, "y_mm"))},
          time_argument_s(at));
    }
    return units::kN_from_N(resistance_N(quantity, at));
  }

 private:
  /// A column that stands counts with the followed time.
  double fire_resistance_min() {
    const mechanical::Rating rating = mechanical::rate(input_.column, input_.fire, input_.accuracy);
    return units::min_from_s(rating.chosen.fire_resistance_s.value_or(rating.followed_s));
  }

  double resistance_N(const std::string& quantity, const Arguments& at) {
    const CapacityState& state = state_at(time_argument_s(at));
    if (quantity == "plastic resistance") return state.plastic_N;
    if (quantity == "section resistance") return state.section_N;
    if (quantity == "member resistance") return state.capacity_N;
    unknown_quantity(quantity);
  }

  const CapacityState& state_at(double t_s) {
    if (states_.empty()) states_ = mechanical::capacities(input_.column, history(), times_s_);
    const auto found = std::find(times_s_.begin(), times_s_.end(), t_s);
    return states_.at(static_cast<std::size_t>(found - times_s_.begin()));
  }

  const thermal::TemperatureHistory& history() {
    if (!history_) {
      history_ = thermal::solve_heat_flow(input_.column.section, input_.fire,
                                          {.accuracy = input_.accuracy, .scale = 1.0});
    }
    return *history_;
  }

  ColumnInput input_;
  std::vector<double> times_s_;
  std::optional<thermal::TemperatureHistory> history_;
  std::vector<CapacityState> states_;
};

}  // namespace

CaseModelPtr column_model(const CaseInput& input, const EvidenceCase& evidence) {
  return std::make_unique<ColumnModel>(input, evidence);
}

}  // namespace ringward::cli
