#include <fmt/format.h>

#include <algorithm>
#include <cmath>

#include "tests/validation/fire_test_results.hpp"
#include "tests/validation/markdown.hpp"
#include "tests/validation/page_part.hpp"
#include "tests/validation/page_pictures.hpp"
#include "thermal/base/units.hpp"

namespace ringward::testing {
namespace {

using Results = std::vector<FireTestResult>;
using Value = double (FireTestResult::*)() const;

bool failed(const FireTestResult& result) { return result.test.load_N > 0.0; }

std::vector<double> ratios(const Results& results, FireTestFamily family, Value value) {
  std::vector<double> found;
  for (const FireTestResult& result : results) {
    if (failed(result) && result.test.family == family) found.push_back((result.*value)());
  }
  return found;
}

/// The laboratory's name of a column, without the number in the data set.
std::string short_id(const std::string& id) {
  const std::size_t slash = id.find("/ NRC ");
  return slash == std::string::npos ? id : id.substr(slash + 6);
}

std::string bars_text(const FireTest& test) {
  if (!test.bars) return "none";
  return fmt::format("{} x {:.1f}", test.bars->count, units::mm_from_m(test.bars->diameter_m));
}

std::string size_text(const FireTest& test) {
  const double width_mm = units::mm_from_m(test.width_m);
  if (!is_tube(test.family)) return fmt::format("{:.0f}", width_mm);
  const char* const shape = test.family == FireTestFamily::square_tube ? "square" : "round";
  return fmt::format("{} {:.1f} x {:.2f}", shape, width_mm, units::mm_from_m(test.wall_m));
}

const char* aggregate_text(const FireTest& test) {
  return test.aggregate == thermal::Aggregate::siliceous ? "siliceous" : "carbonate";
}

std::vector<std::string> row_cells(const FireTestResult& result) {
  const FireTest& test = result.test;
  return {short_id(test.id),
          size_text(test),
          bars_text(test),
          fmt::format("{:.1f}", units::MPa_from_Pa(test.strength_Pa)),
          aggregate_text(test),
          fmt::format("{:.0f}", units::kN_from_N(test.load_N)),
          fmt::format("{:.0f}", test.measured_min),
          result.predicted_min ? fmt::format("{:.1f}", *result.predicted_min) : "stands",
          fmt::format("{:.2f}", result.ratio()),
          fmt::format("{:.1f}", result.rule_min),
          fmt::format("{:.2f}", result.rule_ratio())};
}

std::string concrete_table(const Results& results) {
  std::string table =
      markdown_head({"column", "side, mm", "bars, mm", "f_c, MPa", "aggregate", "load, kN",
                     "measured, min", "program, min", "ratio", "eq. (5.7), min", "ratio"});
  for (const FireTestResult& result : results) {
    if (failed(result) && !is_tube(result.test.family)) table += markdown_row(row_cells(result));
  }
  return table;
}

std::string tube_table(const Results& results) {
  std::string table = markdown_head({"column", "tube, mm", "bars, mm", "f_c, MPa", "aggregate",
                                     "load, kN", "measured, min", "program, min", "ratio",
                                     "reserve, min", "formula, min", "ratio"});
  for (const FireTestResult& result : results) {
    if (!failed(result) || !is_tube(result.test.family)) continue;
    std::vector<std::string> cells = row_cells(result);
    cells.insert(cells.begin() + 9, fmt::format("{:.0f}", reserve_min(result.test)));
    table += markdown_row(cells);
  }
  return table;
}

std::string unloaded_table(const Results& results) {
  std::string table = markdown_head({"column", "side, mm", "lasted at least, min", "program"});
  for (const FireTestResult& result : results) {
    if (failed(result)) continue;
    const std::string answer = result.predicted_min
                                   ? fmt::format("{:.1f} min", *result.predicted_min)
                                   : fmt::format("stands for the {:.0f} min that were followed",
                                                 2.0 * result.test.measured_min);
    table += markdown_row({short_id(result.test.id), size_text(result.test),
                           fmt::format("{:.0f}", result.test.measured_min), answer});
  }
  return table;
}

/// Place of the ratio farthest from 1.
std::size_t worst_of(const std::vector<double>& ratios) {
  const auto error = [](double ratio) { return std::abs(std::log(ratio)); };
  const auto worst = std::max_element(ratios.begin(), ratios.end(),
                                      [&](double a, double b) { return error(a) < error(b); });
  return static_cast<std::size_t>(worst - ratios.begin());
}

std::vector<std::string> ids_of(FireTestFamily family) {
  std::vector<std::string> ids;
  for (const FireTest& test : fire_tests()) {
    if (test.family == family && test.load_N > 0.0) ids.push_back(short_id(test.id));
  }
  return ids;
}

std::string worst_text(FireTestFamily family, const std::vector<double>& found) {
  const std::size_t place = worst_of(found);
  return fmt::format("{}: {:.2f}", ids_of(family).at(place), found[place]);
}

std::string agreement_table(const Results& results) {
  std::string table =
      markdown_head({"family", "columns", "program: mean", "CoV", "worst", "formula: mean", "CoV"});
  for (const FireTestFamily family : fire_test_families()) {
    const Agreement program = agreement(ratios(results, family, &FireTestResult::ratio));
    const Agreement rule = agreement(ratios(results, family, &FireTestResult::rule_ratio));
    table +=
        markdown_row({family_name(family), fmt::format("{}", program.count),
                      fmt::format("{:.3f}", program.mean), fmt::format("{:.3f}", program.variation),
                      worst_text(family, ratios(results, family, &FireTestResult::ratio)),
                      fmt::format("{:.3f}", rule.mean), fmt::format("{:.3f}", rule.variation)});
  }
  return table;
}

struct Aim {
  FireTestFamily family;
  double least_mean;
  double largest_mean;
  double largest_variation;
};

std::string aims_table(const Results& results) {
  const std::vector<Aim> aims = {{FireTestFamily::concrete_siliceous, 0.95, 1.10, 0.08},
                                 {FireTestFamily::round_tube_siliceous, 0.9, 1.1, 0.10}};
  std::string table = markdown_head({"family", "aim: mean", "reached", "aim: CoV", "reached"});
  const auto verdict = [](double value, bool met) {
    return fmt::format("{:.3f}: {}", value, met ? "met" : "**not met**");
  };
  for (const Aim& aim : aims) {
    const Agreement a = agreement(ratios(results, aim.family, &FireTestResult::ratio));
    table += markdown_row({family_name(aim.family),
                           fmt::format("{:.2f} to {:.2f}", aim.least_mean, aim.largest_mean),
                           verdict(a.mean, a.mean >= aim.least_mean && a.mean <= aim.largest_mean),
                           fmt::format("at most {:.2f}", aim.largest_variation),
                           verdict(a.variation, a.variation <= aim.largest_variation)});
  }
  return table;
}

double rule_of(const FireTestResult& result) { return result.rule_min; }
double prediction_of(const FireTestResult& result) { return result.predicted_min.value_or(0.0); }

struct PictureOf {
  const char* id;
  const char* title;
  bool tubes;
  double last_min;
  double (*value)(const FireTestResult&);
};

PagePicture picture(const Results& results, const PictureOf& wanted) {
  std::vector<MarkedPoints> families;
  std::string message;
  for (const FireTestFamily family : fire_test_families()) {
    if (is_tube(family) != wanted.tubes) continue;
    MarkedPoints points{.name = family_name(family), .points = {}};
    std::vector<double> found;
    for (const FireTestResult& result : results) {
      if (!failed(result) || result.test.family != family) continue;
      points.points.push_back({result.test.measured_min, wanted.value(result)});
      found.push_back(wanted.value(result) / result.test.measured_min);
    }
    const Agreement a = agreement(found);
    message += fmt::format(
        "{}: predicted over measured {:.3f} in the mean, coefficient of "
        "variation {:.3f}. ",
        points.name, a.mean, a.variation);
    families.push_back(std::move(points));
  }
  return agreement_picture({.id = wanted.id, .title = wanted.title, .message = message},
                           wanted.last_min, families);
}

std::vector<PagePicture> pictures(const Results& results) {
  return {picture(results, {"concrete-program", "Concrete columns: program against fire tests",
                            false, 550.0, prediction_of}),
          picture(results, {"concrete-formula", "Concrete columns: eq. (5.7) against fire tests",
                            false, 550.0, rule_of}),
          picture(results, {"tubes-program", "Filled tubes: program against fire tests", true,
                            250.0, prediction_of}),
          picture(results, {"tubes-formula", "Filled tubes: simple formula against fire tests",
                            true, 250.0, rule_of})};
}

/// Ratios of every failed column of every family, one assumption changed; none where the change
/// does not concern the family.
struct Varied {
  std::string name;
  std::vector<std::vector<double>> of_family;
};

std::vector<Varied> varied_everything() {
  std::vector<Varied> all;
  for (const Variation& variation : variations()) {
    Varied varied{.name = variation.name, .of_family = {}};
    for (const FireTestFamily family : fire_test_families()) {
      const bool concerned = is_tube(family) ? variation.for_tubes : variation.for_concrete;
      varied.of_family.push_back(concerned ? varied_ratios(family, variation)
                                           : std::vector<double>{});
    }
    all.push_back(std::move(varied));
  }
  return all;
}

std::string family_cell(const std::vector<double>& ratios) {
  if (ratios.empty()) return "-";
  const Agreement a = agreement(ratios);
  return fmt::format("{:.2f} ({:.2f})", a.mean, a.variation);
}

std::string variation_table(const std::vector<Varied>& all) {
  std::vector<std::string> head = {"changed"};
  for (const FireTestFamily family : fire_test_families()) head.push_back(family_name(family));
  std::string table = markdown_head(head);
  for (const Varied& varied : all) {
    std::vector<std::string> cells = {varied.name};
    for (const auto& of_family : varied.of_family) cells.push_back(family_cell(of_family));
    table += markdown_row(cells);
  }
  return table;
}

std::string worst_case_table(const std::vector<Varied>& all) {
  std::vector<std::string> head = {"changed"};
  std::vector<std::size_t> places;
  for (std::size_t f = 0; f < fire_test_families().size(); ++f) {
    places.push_back(worst_of(all.front().of_family[f]));
    head.push_back(ids_of(fire_test_families()[f]).at(places.back()));
  }
  std::string table = markdown_head(head);
  for (const Varied& varied : all) {
    std::vector<std::string> cells = {varied.name};
    for (std::size_t f = 0; f < places.size(); ++f) {
      const std::vector<double>& ratios = varied.of_family[f];
      cells.push_back(ratios.empty() ? "-" : fmt::format("{:.2f}", ratios.at(places[f])));
    }
    table += markdown_row(cells);
  }
  return table;
}

}  // namespace

PagePart fire_test_part() {
  const Results results = fire_test_results();
  return {.texts = {{"concrete tests", concrete_table(results)},
                    {"tube tests", tube_table(results)},
                    {"unloaded tests", unloaded_table(results)},
                    {"agreement", agreement_table(results)},
                    {"aims", aims_table(results)}},
          .pictures = pictures(results)};
}

PagePart variation_part() {
  const std::vector<Varied> all = varied_everything();
  return {.texts = {{"variations", variation_table(all)}, {"worst cases", worst_case_table(all)}},
          .pictures = {}};
}

}  // namespace ringward::testing
