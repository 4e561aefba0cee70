#include "cli/evidence/case_reading.hpp"

#include <algorithm>

#include "cli/evidence/case_input.hpp"
#include "cli/input/toml_reading.hpp"

namespace ringward::cli {
namespace {

Provenance provenance_of(const CaseInput& check) {
  const std::string word = check.text("provenance");
  if (word == "read") return Provenance::read;
  if (word == "memory") return Provenance::memory;
  if (word != "computed") check.fail("provenance", "must be read, memory or computed");
  return Provenance::computed;
}

Comparison comparison_of(const CaseInput& check) {
  if (!check.has("one_sided")) return Comparison::within;
  const std::string word = check.text("one_sided");
  if (word == "at least") return Comparison::at_least;
  if (word != "at most") check.fail("one_sided", "must be at least or at most");
  return Comparison::at_most;
}

Arguments fixed_arguments(const CaseInput& check) {
  Arguments at;
  if (!check.has("at")) return at;
  const CaseInput given = check.table("at");
  for (const InputEntry& entry : given.node().entries) at[entry.key] = given.number(entry.key);
  return at;
}

/// `expected = x`, or `arguments = ["a", ...]` and `rows = [[a, ..., x], ...]`.
std::vector<ExpectedPoint> points_of(const CaseInput& check) {
  const Arguments fixed = fixed_arguments(check);
  if (!check.has("rows")) return {{fixed, check.number("expected")}};
  const std::vector<std::string> names = check.texts("arguments");
  std::vector<ExpectedPoint> points;
  for (const std::vector<double>& row : check.rows("rows")) {
    if (row.size() != names.size() + 1) check.fail("rows", "need the arguments and one figure");
    ExpectedPoint point{fixed, row.back()};
    for (std::size_t i = 0; i < names.size(); ++i) point.at[names[i]] = row[i];
    points.push_back(std::move(point));
  }
  return points;
}

Check check_of(const CaseInput& input) {
  input.allow({"quantity", "unit", "expected", "at", "arguments", "rows", "tolerance",
               "tolerance_percent", "reason", "provenance", "one_sided", "known_gap"});
  if (!input.has("tolerance") && !input.has("tolerance_percent")) {
    input.fail("tolerance", "is missing");
  }
  Check check;
  check.quantity = input.text("quantity");
  check.unit = input.text("unit");
  check.points = points_of(input);
  check.tolerance = input.number_or("tolerance", 0.0);
  check.relative = 0.01 * input.number_or("tolerance_percent", 0.0);
  check.reason = input.text("reason");
  check.provenance = provenance_of(input);
  check.comparison = comparison_of(input);
  if (input.has("known_gap")) check.known_gap = input.text("known_gap");
  return check;
}

std::string group_of(const CaseInput& input) {
  const std::string group = input.text("group");
  const std::vector<std::string>& known = evidence_groups();
  if (std::find(known.begin(), known.end(), group) == known.end()) {
    input.fail("group", "is none of the groups");
  }
  return group;
}

/// Columns that several cases share stand once, in the table `columns` of the file.
std::string column_text_of(const CaseInput& file, const CaseInput& input) {
  if (!input.has("column")) return "";
  const std::string name = input.text("column");
  if (file.has("columns") && file.table("columns").has(name)) {
    return file.table("columns").text(name);
  }
  input.fail("column", "is not in the table columns of this file");
}

EvidenceCase case_of(const CaseInput& file, const CaseInput& input) {
  input.allow({"group", "name", "source", "locator", "kind", "input", "column", "check"});
  static const InputNode none;
  EvidenceCase result;
  result.file = file.file();
  result.group = group_of(input);
  result.name = input.text("name");
  result.source = input.has("source") ? input.text("source") : file.text("source");
  result.locator = input.text("locator");
  result.kind = input.text("kind");
  result.inputs = input.has("input") ? input.table("input").node() : none;
  result.column_text = column_text_of(file, input);
  for (const CaseInput& check : input.tables("check")) result.checks.push_back(check_of(check));
  return result;
}

}  // namespace

const std::vector<std::string>& evidence_groups() {
  static const std::vector<std::string> groups = {"fire curves",   "heat flow",
                                                  "material laws", "section and member",
                                                  "confinement",   "whole columns"};
  return groups;
}

const char* provenance_words(Provenance provenance) {
  switch (provenance) {
    case Provenance::read:
      return "read";
    case Provenance::memory:
      return "from memory";
    case Provenance::computed:
      return "computed independently";
  }
  return "";
}

std::vector<EvidenceCase> read_cases(const CaseFile& file) {
  const InputNode root = parse_toml(file.text, file.name);
  const CaseInput input(root, file.name);
  input.allow({"source", "columns", "case"});
  std::vector<EvidenceCase> cases;
  for (const CaseInput& entry : input.tables("case")) cases.push_back(case_of(input, entry));
  return cases;
}

std::vector<EvidenceCase> built_in_cases() {
  std::vector<EvidenceCase> all;
  for (const CaseFile& file : case_files()) {
    for (EvidenceCase& one : read_cases(file)) all.push_back(std::move(one));
  }
  return all;
}

}  // namespace ringward::cli
