#include "cli/study/layout_row.hpp"

#include <nlohmann/json.hpp>

#include "cli/output/input_echo.hpp"
#include "cli/output/json_number.hpp"
#include "cli/output/numbers.hpp"
#include "cli/study/layout_row_json.hpp"
#include "thermal/base/error.hpp"

namespace ringward::cli {
namespace {

using nlohmann::ordered_json;

constexpr int kDigitsMass = 2;
constexpr int kDigitsVolume = 5;
constexpr int kDigitsLength = 3;

template <class Value>
ordered_json null_or(const std::optional<Value>& value) {
  return value ? ordered_json(*value) : ordered_json(nullptr);
}

template <class Value>
std::optional<Value> read_optional(const ordered_json& node) {
  if (node.is_null()) return std::nullopt;
  return node.get<Value>();
}

InputValue read_value(const ordered_json& node) {
  if (node.is_number()) return node.get<double>();
  if (node.is_string()) return node.get<std::string>();
  if (!node.is_array() || node.empty()) return {};
  if (node.front().is_string()) return node.get<std::vector<std::string>>();
  if (node.front().is_array()) return node.get<std::vector<NumberPair>>();
  return node.get<NumberPair>();
}

void put_verdict(ordered_json& line, const LayoutRow& row) {
  const std::optional<Verdict>& verdict = row.verdict;
  const auto part = [&](auto member) -> ordered_json {
    return verdict ? null_or(std::optional((*verdict).*member)) : ordered_json(nullptr);
  };
  const auto optional_part = [&](auto member) -> ordered_json {
    return verdict ? null_or((*verdict).*member) : ordered_json(nullptr);
  };
  line["outcome"] = outcome_word(row);
  line["fire_resistance_min"] = optional_part(&Verdict::fire_resistance_min);
  line["uncertainty_min"] = part(&Verdict::uncertainty_min);
  line["assessed_min"] = part(&Verdict::assessed_min);
  line["class_min"] = optional_part(&Verdict::class_min);
  line["required_min"] = optional_part(&Verdict::required_min);
  line["met"] = optional_part(&Verdict::met);
  line["margin_min"] = null_or(row.margin_min());
}

std::optional<Verdict> read_verdict(const ordered_json& line) {
  if (line.at("assessed_min").is_null()) return std::nullopt;
  return Verdict{.fire_resistance_min = read_optional<double>(line.at("fire_resistance_min")),
                 .uncertainty_min = line.at("uncertainty_min").get<double>(),
                 .assessed_min = line.at("assessed_min").get<double>(),
                 .class_min = read_optional<int>(line.at("class_min")),
                 .required_min = read_optional<double>(line.at("required_min")),
                 .met = read_optional<bool>(line.at("met"))};
}

LayoutRow read_row(const ordered_json& line) {
  LayoutRow row{
      .index = line.at("layout").get<std::size_t>() - 1,
      .name = line.at("name").get<std::string>(),
      .input_sha256 = line.at("input_sha256").get<std::string>(),
      .verdict = read_verdict(line),
      .criterion = line.at("criterion").get<std::string>(),
      .reason = line.at("reason").get<std::string>(),
      .utilisation_at_required = read_optional<double>(line.at("utilisation_at_required")),
      .amounts = {.tube_kg_m = line.at("tube_kg_m").get<double>(),
                  .bars_kg_m = line.at("bars_kg_m").get<double>(),
                  .shape_kg_m = line.at("shape_kg_m").get<double>(),
                  .concrete_m3_m = line.at("concrete_m3_m").get<double>()},
      .protection_mm = line.at("protection_mm").get<double>(),
      .values = {},
      .cautions = {}};
  for (const auto& [key, value] : line.at("values").items()) {
    row.values.push_back({key, read_value(value), true});
  }
  for (const ordered_json& caution : line.at("cautions")) {
    row.cautions.push_back({caution.at("code").get<std::string>(), Severity::caution,
                            caution.at("text").get<std::string>(),
                            caution.at("source").get<std::string>()});
  }
  return row;
}

}  // namespace

std::string outcome_word(const LayoutRow& row) {
  if (!row.verdict) return "no solution";
  return row.verdict->survives() ? "survives" : "fails";
}

ordered_json row_json(const LayoutRow& row) {
  ordered_json line{{"layout", row.index + 1}, {"name", row.name}};
  put_verdict(line, row);
  line["criterion"] = row.criterion;
  line["utilisation_at_required"] = json_number(row.utilisation_at_required, kDigitsRatio);
  line["steel_kg_m"] = json_number(row.amounts.steel_kg_m(), kDigitsMass);
  line["tube_kg_m"] = json_number(row.amounts.tube_kg_m, kDigitsMass);
  line["bars_kg_m"] = json_number(row.amounts.bars_kg_m, kDigitsMass);
  line["shape_kg_m"] = json_number(row.amounts.shape_kg_m, kDigitsMass);
  line["concrete_m3_m"] = json_number(row.amounts.concrete_m3_m, kDigitsVolume);
  line["protection_mm"] = json_number(row.protection_mm, kDigitsLength);
  line["values"] = input_echo(row.values);
  line["reason"] = row.reason;
  line["cautions"] = json_notices(row.cautions);
  line["input_sha256"] = row.input_sha256;
  return line;
}

std::string row_line(const LayoutRow& row) {
  return row_json(row).dump(-1, ' ', false, ordered_json::error_handler_t::replace) + "\n";
}

LayoutRow row_of_line(const std::string& line) {
  try {
    return read_row(ordered_json::parse(line));
  } catch (const ordered_json::exception& problem) {
    throw Error(ErrorKind::bad_input, std::string("no line of results: ") + problem.what());
  }
}

}  // namespace ringward::cli
