#include "cli/study/ranking.hpp"

#include <algorithm>
#include <catch2/catch.hpp>
#include <random>

#include "cli/study/compare_report.hpp"

using namespace ringward::cli;

namespace {

LayoutRow made(std::size_t index, double assessed_min, double steel_kg_m) {
  LayoutRow row;
  row.index = index;
  row.name = "L" + std::to_string(index);
  Verdict verdict;
  verdict.fire_resistance_min = assessed_min;
  verdict.assessed_min = assessed_min;
  row.verdict = verdict;
  row.amounts.tube_kg_m = steel_kg_m;
  return row;
}

bool beats(const LayoutRow& a, const LayoutRow& b) {
  const double t_a = a.verdict->assessed_min;
  const double t_b = b.verdict->assessed_min;
  const double s_a = a.amounts.steel_kg_m();
  const double s_b = b.amounts.steel_kg_m();
  return t_a >= t_b && s_a <= s_b && (t_a > t_b || s_a < s_b);
}

}  // namespace

TEST_CASE(
    "The longest lasting comes first, then the least steel, then the order of the study; no "
    "solution comes last",
    "[study]") {
  std::vector<LayoutRow> rows{made(0, 60, 50), made(1, 90, 80), made(2, 90, 70), made(3, 60, 50)};
  LayoutRow unsolved = made(4, 0, 10);
  unsolved.verdict = std::nullopt;
  rows.insert(rows.begin(), unsolved);
  CHECK(ranked_order(rows) == std::vector<std::size_t>{3, 2, 1, 4, 0});
  CHECK(undominated_rows(rows) == std::vector<bool>{false, true, false, true, true});
}

TEST_CASE("A layout is undominated exactly when comparing it with every other finds none better",
          "[study]") {
  std::mt19937 random(11);
  std::uniform_int_distribution<int> coarse(1, 12);  // few values, so that ties are common
  for (int round = 0; round < 200; ++round) {
    std::vector<LayoutRow> rows;
    for (std::size_t i = 0; i < 25; ++i) rows.push_back(made(i, coarse(random), coarse(random)));
    const std::vector<bool> found = undominated_rows(rows);
    for (std::size_t i = 0; i < rows.size(); ++i) {
      const bool expected = std::none_of(
          rows.begin(), rows.end(), [&](const LayoutRow& other) { return beats(other, rows[i]); });
      CHECK(found[i] == expected);
    }
  }
}

TEST_CASE("A row reads back from its line as it was written", "[study]") {
  LayoutRow row = made(3, 118.25, 51.7);
  row.name = "quotes \" and, commas\n";
  row.input_sha256 = "abc";
  row.criterion = "axial resistance";
  row.verdict->required_min = 120;
  row.verdict->met = false;
  row.verdict->class_min = 90;
  row.utilisation_at_required = 0.75;
  row.values = {{"tube.thickness_mm", 5.0, true},
                {"fire.curve", std::string("standard"), true},
                {"fire.arc_deg", NumberPair{0, 180}, true},
                {"protection.thickness_mm", InputValue(), true}};
  row.cautions = {{"contact-lost", ringward::Severity::caution, "Text.", "teng2007"}};
  const std::string line = row_line(row);
  CHECK(std::count(line.begin(), line.end(), '\n') == 1);
  const LayoutRow back = row_of_line(line.substr(0, line.size() - 1));
  CHECK(back.name == row.name);
  CHECK(back.margin_min() == -1.75);
  CHECK(back.values.at(2).value == row.values.at(2).value);
  CHECK(back.cautions.at(0).text == "Text.");
  CHECK(row_line(back) == line);
}

TEST_CASE("A miss never reads as a margin of zero", "[study]") {
  CHECK(margin_words(-0.01) == "-0.1");
  CHECK(margin_words(0.0) == "+0.0");
  CHECK(margin_words(0.99) == "+0.9");
  CHECK(margin_words(std::nullopt) == "-");
}
