#include "thermal/law_range.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <map>

namespace ringward::thermal {
namespace {

struct Extremes {
  double lowest_C = 0;
  double highest_C = 0;
};

std::vector<const ThermalLaw*> laws_in(const HeatProblem& problem, const Cell& cell) {
  std::vector<const ThermalLaw*> laws;
  if (cell.steel_fraction < 1.0) {
    laws.push_back(cell.layer == Layer::core   ? problem.core.get()
                   : cell.layer == Layer::tube ? problem.tube.get()
                                               : problem.protection.get());
  }
  if (cell.steel_fraction > 0.0) laws.push_back(problem.steel_shape.get());
  return laws;
}

std::map<std::string, std::pair<const ThermalLaw*, Extremes>> extremes_by_law(
    const HeatEquation& equation) {
  std::map<std::string, std::pair<const ThermalLaw*, Extremes>> found;
  const std::vector<double> start = equation.initial_state();
  for (std::size_t k = 0; k < equation.size(); ++k) {
    const double start_C = equation.curve(k).first_heating(start[k]).T_C;
    const double peak_C = equation.curve(k).first_heating(equation.peaks()[k]).T_C;
    for (const ThermalLaw* law : laws_in(equation.problem(), equation.grid().cells[k])) {
      auto& [of_law, range] =
          found.try_emplace(law->name(), law, Extremes{start_C, peak_C}).first->second;
      range.lowest_C = std::min(range.lowest_C, start_C);
      range.highest_C = std::max(range.highest_C, peak_C);
    }
  }
  return found;
}

}  // namespace

Notices law_range_notices(const HeatEquation& equation) {
  constexpr double kHair_K = 0.01;  // the inverse of the law is tabulated to 1e-3 K
  Notices notices;
  for (const auto& [name, entry] : extremes_by_law(equation)) {
    const auto& [law, range] = entry;
    if (range.highest_C > law->valid_to_C() + kHair_K) {
      notices.push_back(
          {"thermal-law-above-range", Severity::caution,
           fmt::format("{}: the section reaches {:.0f} C; the thermal law is published "
                       "up to {:.0f} C and its last values are kept above.",
                       name, range.highest_C, law->valid_to_C()),
           "common practice, no source"});
    }
    if (range.lowest_C < law->valid_from_C() - kHair_K) {
      notices.push_back({"thermal-law-below-range", Severity::note,
                         fmt::format("{}: the section starts at {:.0f} C; the thermal law is "
                                     "published from {:.0f} C and its first values are kept below.",
                                     name, range.lowest_C, law->valid_from_C()),
                         "common practice, no source"});
    }
  }
  return notices;
}

}  // namespace ringward::thermal
