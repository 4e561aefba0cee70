#include "cli/dossier/assumptions.hpp"

#include <fmt/format.h>
#include <tbb/parallel_for.h>

#include <algorithm>
#include <cmath>

#include "cli/input/reader.hpp"
#include "cli/output/numbers.hpp"
#include "thermal/base/error.hpp"
#include "thermal/base/units.hpp"

namespace ringward::cli {
namespace {

const EchoEntry* entry_of(const ColumnInput& input, const std::string& key) {
  const auto found = std::find_if(input.echo.begin(), input.echo.end(),
                                  [&](const EchoEntry& entry) { return entry.key == key; });
  return found == input.echo.end() ? nullptr : &*found;
}

std::string given_words(const ColumnInput& input, const std::string& key) {
  const EchoEntry* entry = entry_of(input, key);
  return entry != nullptr && entry->given ? " (given)" : " (default)";
}

/// A number that another one could stand for.
struct NumberChoice {
  std::string key;
  std::string what;
  std::string unit;
  std::vector<double> others;
  std::string why;
};

void add_numbers(std::vector<OtherChoice>& choices, const ColumnInput& input,
                 const NumberChoice& number) {
  const EchoEntry* entry = entry_of(input, number.key);
  if (entry == nullptr || !std::holds_alternative<double>(entry->value)) return;
  const double used = std::get<double>(entry->value);
  const std::string unit = number.unit.empty() ? "" : " " + number.unit;
  for (const double other : number.others) {
    if (std::abs(other - used) <= 1e-9 * std::max(1.0, std::abs(used))) continue;
    choices.push_back({.what = number.what,
                       .used = shortest(rounded(used, 6)) + unit + given_words(input, number.key),
                       .other = shortest(rounded(other, 6)) + unit,
                       .why = number.why,
                       .overrides = {number.key + "=" + shortest(other)}});
  }
}

/// A word of a list of choices; `keys` are those that take it together (all bar groups).
struct WordChoice {
  std::vector<std::string> keys;
  std::string what;
  std::vector<std::string> others;
  std::string why;
};

void add_words(std::vector<OtherChoice>& choices, const ColumnInput& input,
               const WordChoice& word) {
  const EchoEntry* entry = word.keys.empty() ? nullptr : entry_of(input, word.keys.front());
  if (entry == nullptr || !std::holds_alternative<std::string>(entry->value)) return;
  const std::string used = std::get<std::string>(entry->value);
  for (const std::string& other : word.others) {
    if (other == used) continue;
    OtherChoice choice{.what = word.what,
                       .used = used + given_words(input, word.keys.front()),
                       .other = other,
                       .why = word.why};
    for (const std::string& key : word.keys) choice.overrides.push_back(key + "=\"" + other + "\"");
    choices.push_back(std::move(choice));
  }
}

std::vector<std::string> forming_keys(const ColumnInput& input) {
  std::vector<std::string> keys;
  for (std::size_t g = 0; g < input.column.section.bars.size(); ++g) {
    keys.push_back(fmt::format("bars[{}].forming", g));
  }
  return keys;
}

void add_buckling(std::vector<OtherChoice>& choices, const ColumnInput& input) {
  const mechanical::Member& member = input.column.member;
  const EchoEntry* length = entry_of(input, "member.buckling_length_mm");
  const bool by_length = length != nullptr && length->given;
  const double factor = member.buckling_length_m / member.length_m;
  for (const double other : {0.5, 0.7, 1.0}) {
    if (std::abs(other - factor) < 0.01) continue;
    const double other_mm = other * units::mm_from_m(member.length_m);
    choices.push_back(
        {.what = "Buckling length in the fire situation, over the length",
         .used = fixed(factor, 2) + given_words(input, by_length ? "member.buckling_length_mm"
                                                                 : "member.buckling_factor"),
         .other = fixed(other, 2),
         .why = "0.5 and 0.7 hold for braced frames whose colder members hold the ends, 1 for "
                "hinged ends; the imperfection follows it unless it is given",
         .overrides = {by_length ? "member.buckling_length_mm=" + shortest(rounded(other_mm, 3))
                                 : "member.buckling_factor=" + shortest(other)}});
  }
}

void add_heat(std::vector<OtherChoice>& choices, const ColumnInput& input) {
  add_numbers(choices, input,
              {"tube.contact_resistance_m2K_W",
               "Contact resistance between tube and core",
               "m2K/W",
               {0.0, 0.01},
               "0 keeps the core hottest; published values are about 0.005 to 0.01"});
  add_words(choices, input,
            {{"core.conductivity"},
             "Conductivity of concrete",
             {"upper", "lower", "joined"},
             "the upper limit heats the core most; national rules may choose"});
  add_numbers(choices, input,
              {"core.moisture_percent",
               "Moisture of concrete, by mass",
               "%",
               {0.0, 10.0},
               "moisture delays heating; 0 is the hottest, 10 that of a fresh filled tube"});
  add_words(choices, input,
            {{"core.aggregate"},
             "Aggregate of the concrete",
             {"siliceous", "calcareous"},
             "siliceous concrete loses strength sooner"});
}

AssumptionRow rated_with(const InputSource& source, std::vector<std::string> overrides,
                         const OtherChoice& choice) {
  AssumptionRow row{.choice = choice};
  overrides.insert(overrides.end(), choice.overrides.begin(), choice.overrides.end());
  try {
    const RateReport report =
        rate_report(read_column(source, overrides), {.bounds = false, .uncertainty = false});
    row.survives = report.verdict.survives();
    row.fire_resistance_min = report.verdict.fire_resistance_min;
  } catch (const Error& problem) {
    row.problem = problem.what();
  }
  return row;
}

}  // namespace

std::vector<OtherChoice> other_choices(const ColumnInput& input) {
  std::vector<OtherChoice> choices;
  add_heat(choices, input);
  add_words(choices, input,
            {forming_keys(input),
             "Forming of the bars",
             {"hot-rolled", "cold-worked"},
             "cold-worked bars lose strength sooner"});
  const bool confined = input.column.confinement != mechanical::ConfinementModel::none;
  if (confined) {
    add_numbers(choices, input,
                {"tube.friction",
                 "Friction between tube and core",
                 "",
                 {0.2, 0.6},
                 "0.4 is usual; it decides the hoop stress at mid-height"});
  }
  add_buckling(choices, input);
  const double bow_mm = units::mm_from_m(input.column.member.imperfection_m);
  add_numbers(choices, input,
              {"member.imperfection_mm",
               "Initial bow",
               "mm",
               {bow_mm / 2, bow_mm * 2},
               "the buckling length over 400 unless given"});
  return choices;
}

std::vector<AssumptionRow> rerun(const InputSource& source,
                                 const std::vector<std::string>& overrides,
                                 const std::vector<OtherChoice>& choices) {
  std::vector<AssumptionRow> rows(choices.size());
  tbb::parallel_for(std::size_t{0}, choices.size(),
                    [&](std::size_t i) { rows[i] = rated_with(source, overrides, choices[i]); });
  return rows;
}

}  // namespace ringward::cli
