#include <algorithm>
#include <catch2/catch.hpp>
#include <cmath>
#include <nlohmann/json.hpp>
#include <set>

#include "tests/cli/commands/example_columns.hpp"
#include "tests/cli/commands/run_process.hpp"

using namespace ringward::testing;
using nlohmann::ordered_json;

// Keys, their order and the rules for null are those of the project's interface page.

namespace {

std::vector<std::string> keys_of(const ordered_json& object) {
  std::vector<std::string> keys;
  for (const auto& [key, value] : object.items()) keys.push_back(key);
  return keys;
}

ordered_json json_of(const std::vector<std::string>& arguments, const std::string& column) {
  std::vector<std::string> all = arguments;
  all.insert(all.end(), {"--json", "-"});
  return ordered_json::parse(run_ringward(all, {.stdin_text = column}).out);
}

std::size_t line_count(const std::string& text) {
  return static_cast<std::size_t>(std::count(text.begin(), text.end(), '\n'));
}

std::string first_line(const std::string& text) { return text.substr(0, text.find('\n')); }

}  // namespace

TEST_CASE("rate --json holds exactly the keys of the contract in their order", "[cli]") {
  const ordered_json rate = json_of({"rate", "-"}, round_tubed_column());
  CHECK(keys_of(rate) == std::vector<std::string>{"schema", "program", "title", "input_sha256",
                                                  "input", "rating", "bounds", "history",
                                                  "numerics", "notices"});
  CHECK(rate["schema"] == "ringward-rate/1");
  CHECK(keys_of(rate["program"]) == std::vector<std::string>{"name", "version"});
  CHECK(rate["title"] == "Round tubed column (invented example)");
  CHECK(rate["input_sha256"].get<std::string>().size() == 64);
  CHECK(rate["input"]["tube.thickness_mm"] == 4);
  CHECK(rate["input"]["core.moisture_percent"] == 3);  // a default
  CHECK(keys_of(rate["rating"]) == std::vector<std::string>{"outcome", "fire_resistance_min",
                                                            "uncertainty_min", "class_min",
                                                            "required_min", "met", "criterion"});
  CHECK(keys_of(rate["bounds"]) ==
        std::vector<std::string>{"none_min", "contact_min", "yield_min"});
  CHECK(keys_of(rate["numerics"]) ==
        std::vector<std::string>{"cells", "time_steps", "energy_balance_error", "symmetry"});
  CHECK(rate["numerics"]["symmetry"] == "axisymmetric");
  REQUIRE_FALSE(rate["history"].empty());
  for (const ordered_json& row : rate["history"]) {
    CHECK(keys_of(row) == std::vector<std::string>{"time_min", "gas_C", "tube_C", "core_face_C",
                                                   "bar_max_C", "core_centre_C", "tube_hoop_MPa",
                                                   "lateral_pressure_MPa", "load_hoop_MPa",
                                                   "load_pressure_MPa", "capacity_kN", "demand_kN",
                                                   "utilisation"});
    for (const auto& [key, value] : row.items()) {
      INFO(key);
      CHECK(value.is_number());
    }
  }
  REQUIRE_FALSE(rate["notices"].empty());
  std::set<std::string> severities;
  for (const ordered_json& notice : rate["notices"]) {
    CHECK(keys_of(notice) == std::vector<std::string>{"code", "severity", "text", "source"});
    severities.insert(notice["severity"].get<std::string>());
  }
  CHECK(severities == std::set<std::string>{"caution", "note"});
}

TEST_CASE(
    "A column that fails: the history ends at its fire resistance, where the capacity has "
    "come down to the load",
    "[cli]") {
  const ordered_json rate = json_of({"rate", "-"}, round_bare_column());
  REQUIRE(rate["rating"]["outcome"] == "fails");
  const ordered_json& last = rate["history"].back();
  CHECK(last["time_min"] == rate["rating"]["fire_resistance_min"]);
  // The rating searches the crossing to 0.01 min, within which the capacity moves by far less.
  CHECK(last["utilisation"].get<double>() == Approx(1.0).margin(0.002));
  CHECK(rate["rating"]["required_min"].is_null());
  CHECK(rate["rating"]["met"].is_null());
  CHECK(rate["rating"]["class_min"].is_number_integer());
}

TEST_CASE("Parts that the column does not have are null: tube and bars", "[cli]") {
  std::string plain = round_bare_column();
  plain.erase(plain.find("[[bars]]"), plain.find("[member]") - plain.find("[[bars]]"));
  const ordered_json rate = json_of({"rate", "-"}, plain);
  const ordered_json& start = rate["history"].front();
  for (const char* key : {"tube_C", "tube_hoop_MPa", "lateral_pressure_MPa", "load_hoop_MPa",
                          "load_pressure_MPa", "bar_max_C"}) {
    INFO(key);
    CHECK(start[key].is_null());
  }
  CHECK(start["core_face_C"].is_number());
}

TEST_CASE("A column that survives has no fire resistance, and the followed time counts", "[cli]") {
  const ordered_json rate = json_of({"rate", "-", "--set", "load.axial_kN=1", "--set",
                                     "fire.duration_min=30", "--set", "rating.required_min=30"},
                                    round_bare_column());
  CHECK(rate["rating"]["outcome"] == "survives");
  CHECK(rate["rating"]["fire_resistance_min"].is_null());
  CHECK(rate["rating"]["class_min"] == 30);
  CHECK(rate["rating"]["met"] == true);
  CHECK(rate["bounds"]["none_min"].is_null());
}

TEST_CASE("A fire without classes gives no class", "[cli]") {
  const ordered_json rate = json_of({"rate", "-", "--set", "fire.curve=\"constant\"", "--set",
                                     "fire.constant_C=600", "--set", "fire.duration_min=30"},
                                    round_bare_column());
  CHECK(rate["rating"]["class_min"].is_null());
}

TEST_CASE("rate exits with 0 when the required rating is met and with 1 when it is not", "[cli]") {
  const ProcessSetup setup{.stdin_text = round_bare_column()};
  const ProcessResult met = run_ringward({"rate", "-", "--set", "rating.required_min=15"}, setup);
  CHECK(met.exit_code == 0);
  CHECK(met.out.find("15 min: met") != std::string::npos);
  const ProcessResult failed =
      run_ringward({"rate", "-", "--set", "rating.required_min=120"}, setup);
  CHECK(failed.exit_code == 1);
  CHECK(failed.out.find("NOT MET") != std::string::npos);
}

TEST_CASE("A load above the cold resistance is an outcome: resistance 0, class 0", "[cli]") {
  const ordered_json rate =
      json_of({"rate", "-", "--set", "load.axial_kN=5000"}, round_bare_column());
  CHECK(rate["rating"]["outcome"] == "fails");
  CHECK(rate["rating"]["fire_resistance_min"] == 0);
  CHECK(rate["rating"]["class_min"] == 0);
}

TEST_CASE("The same input gives the same bytes, whatever form and however often", "[cli]") {
  const ProcessSetup setup{.stdin_text = square_column()};
  for (const std::vector<std::string>& arguments : std::vector<std::vector<std::string>>{
           {"rate", "-", "--json", "-"},
           {"rate", "-", "--csv", "-"},
           {"rate", "-"},
           {"field", "-", "--at", "20", "--json", "-"},
           {"capacity", "-", "--at", "20", "--interaction", "--csv", "-"}}) {
    INFO(arguments.front());
    const std::string once = run_ringward(arguments, setup).out;
    CHECK_FALSE(once.empty());
    CHECK(once == run_ringward(arguments, setup).out);
  }
}

TEST_CASE("The CSV of rate is the history of its JSON", "[cli]") {
  const std::string csv =
      run_ringward({"rate", "-", "--csv", "-"}, {.stdin_text = round_bare_column()}).out;
  const ordered_json rate = json_of({"rate", "-"}, round_bare_column());
  std::string header;
  for (const std::string& key : keys_of(rate["history"][0])) {
    header += (header.empty() ? "" : ",") + key;
  }
  CHECK(first_line(csv) == header);
  CHECK(line_count(csv) == rate["history"].size() + 1);
  // No tube: its cells are empty.
  CHECK(csv.find("\n0,20,,20,20,20,,,,,") != std::string::npos);
}

TEST_CASE("capacity holds the keys of the contract at exactly the times asked for", "[cli]") {
  const ordered_json capacity =
      json_of({"capacity", "-", "--at", "30,0,10,30"}, round_bare_column());
  CHECK(capacity["schema"] == "ringward-capacity/1");
  REQUIRE(capacity["states"].size() == 3);
  CHECK(capacity["states"][1]["time_min"] == 10);
  for (const ordered_json& state : capacity["states"]) {
    CHECK(keys_of(state) == std::vector<std::string>{"time_min", "plastic_kN", "section_kN",
                                                     "capacity_kN", "reserve_kN", "demand_kN",
                                                     "utilisation", "lateral_pressure_MPa"});
    const double capacity_kN = state["capacity_kN"].get<double>();
    CHECK(state["utilisation"].get<double>() ==
          Approx(state["demand_kN"].get<double>() / capacity_kN).margin(1e-4));
    CHECK(capacity_kN <= state["reserve_kN"].get<double>());
  }
}

TEST_CASE("interaction lists both axes with both signs at every time", "[cli]") {
  const std::string csv =
      run_ringward({"capacity", "-", "--at", "0,20", "--interaction", "--csv", "-"},
                   {.stdin_text = square_column()})
          .out;
  CHECK(first_line(csv) == "time_min,axis,axial_kN,moment_kNm");
  const ordered_json result =
      json_of({"capacity", "-", "--at", "0,20", "--interaction"}, square_column());
  CHECK(result["schema"] == "ringward-interaction/1");
  REQUIRE(result["diagrams"].size() == 4);
  std::size_t points = 0;
  for (const ordered_json& diagram : result["diagrams"]) {
    points += diagram["points"].size();
    double least = 0;
    double most = 0;
    for (const ordered_json& point : diagram["points"]) {
      least = std::min(least, point["moment_kNm"].get<double>());
      most = std::max(most, point["moment_kNm"].get<double>());
    }
    CHECK(least < 0);
    // A square heated all round looks the same from both sides.
    CHECK(most == Approx(-least).epsilon(0.001));
  }
  CHECK(line_count(csv) == points + 1);
}

TEST_CASE("gas prints the standard curve of EN 1991-1-2", "[cli]") {
  const ordered_json gas =
      ordered_json::parse(run_ringward({"gas", "--curve", "standard", "--json", "-"}).out);
  CHECK(gas["schema"] == "ringward-gas/1");
  CHECK(gas["points"].size() == 49);
  // EN 1991-1-2:2002 3.2.1: 20 + 345 log10(8 t + 1); printed to 0.01 C.
  const double expected = 20 + 345 * std::log10(8 * 60.0 + 1);
  CHECK(gas["points"][12]["time_min"] == 60);
  CHECK(gas["points"][12]["temperature_C"].get<double>() == Approx(expected).margin(0.0051));
}

TEST_CASE("gas ends at the last time, also where the steps do not", "[cli]") {
  const std::string csv =
      run_ringward({"gas", "--curve", "standard", "--until", "1", "--step", "0.4", "--csv", "-"})
          .out;
  CHECK(line_count(csv) == 5);
  CHECK(csv.find("\n0.8,") != std::string::npos);
  CHECK(csv.find("\n1,") != std::string::npos);
}
