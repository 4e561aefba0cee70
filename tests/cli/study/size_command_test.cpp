#include <catch2/catch.hpp>
#include <nlohmann/json.hpp>

#include "tests/cli/commands/example_columns.hpp"
#include "tests/cli/commands/run_process.hpp"

using namespace ringward::testing;
using nlohmann::json;

namespace {

/// A protected round column with comments in its file, on the coarse grid.
std::string protected_column() {
  return "# The column of a test (invented example)\n" + round_tubed_column() +
         "[protection]\nthickness_mm = 25   # to be sized\nconductivity_W_mK = 0.2\n"
         "density_kg_m3 = 800\nspecific_heat_J_kgK = 1700\n";
}

class ColumnFolder {
 public:
  explicit ColumnFolder(const std::string& text) { write_content(column(), text); }
  [[nodiscard]] std::string column() const { return folder_ / "column.toml"; }
  [[nodiscard]] std::string operator/(const std::string& name) const { return folder_ / name; }

  [[nodiscard]] ProcessResult size(const std::vector<std::string>& more) const {
    std::vector<std::string> arguments{"size", column()};
    arguments.insert(arguments.end(), more.begin(), more.end());
    return run_ringward(arguments);
  }

  [[nodiscard]] json rating(const std::string& file, const std::string& set) const {
    return json::parse(run_ringward({"rate", folder_ / file, "--set", set, "--set",
                                     "rating.required_min=60", "--set", "fire.duration_min=90",
                                     "--json", "-"})
                           .out)
        .at("rating");
  }

 private:
  TemporaryFolder folder_;
};

}  // namespace

TEST_CASE("The sized protection meets the rating and one step less does not, rated by themselves",
          "[study]") {
  const ColumnFolder folder(protected_column());
  const ProcessResult run = folder.size(
      {"--vary", "protection.thickness_mm", "--between", "0,60", "--for", "60", "--json", "-"});
  REQUIRE(run.exit_code == 0);
  const json sized = json::parse(run.out);
  CHECK(sized.at("schema") == "ringward-size/1");
  CHECK(sized.at("response") == "rises");
  CHECK(sized.at("step") == 1);
  CHECK(sized.at("trials").size() <= 15);
  const double value = sized.at("value");
  const auto set = [](double mm) { return "protection.thickness_mm=" + std::to_string(mm); };
  const json rating = folder.rating("column.toml", set(value));
  CHECK(rating.at("met") == true);
  CHECK(rating.at("fire_resistance_min") == sized.at("rating").at("fire_resistance_min"));
  CHECK(rating.at("uncertainty_min") == sized.at("rating").at("uncertainty_min"));
  CHECK(folder.rating("column.toml", set(value - 1)).at("met") == false);
}

TEST_CASE("The largest load comes out where the rating falls with it", "[study]") {
  const ColumnFolder folder(protected_column());
  const ProcessResult run = folder.size({"--vary", "load.axial_kN", "--between", "2000,100",
                                         "--for", "60", "--step", "25", "--json", "-"});
  REQUIRE(run.exit_code == 0);
  const json sized = json::parse(run.out);
  CHECK(sized.at("response") == "falls");
  CHECK(sized.at("trials").size() <= 15);
  const double value = sized.at("value");
  CHECK(std::fmod(value, 25) == 0);
  const auto set = [](double kN) { return "load.axial_kN=" + std::to_string(kN); };
  CHECK(folder.rating("column.toml", set(value)).at("met") == true);
  CHECK(folder.rating("column.toml", set(value + 25)).at("met") == false);
}

TEST_CASE("The written column keeps its comments and rates as it was sized", "[study]") {
  const ColumnFolder folder(protected_column());
  const std::string written = folder / "sized.toml";
  const ProcessResult run =
      folder.size({"--vary", "protection.thickness_mm", "--between", "0,60", "--for", "60",
                   "--write", written, "--json", folder / "size.json", "--quiet"});
  REQUIRE(run.exit_code == 0);
  CHECK(run.out.empty());
  const json sized = json::parse(file_content(folder / "size.json"));
  const std::string text = file_content(written);
  CHECK(text.starts_with("# The column of a test"));
  CHECK(text.find("thickness_mm = " + std::to_string(sized.at("value").get<int>()) +
                  "   # to be sized\n") != std::string::npos);
  CHECK(text.find("duration_min = 90\n") != std::string::npos);
  const ProcessResult rated = run_ringward({"rate", written, "--json", "-"});
  CHECK(rated.exit_code == 0);
  const json rating = json::parse(rated.out).at("rating");
  CHECK(rating.at("required_min") == 60);
  CHECK(rating.at("fire_resistance_min") == sized.at("rating").at("fire_resistance_min"));
}

TEST_CASE("With overrides the written column holds them too", "[study]") {
  const ColumnFolder folder(protected_column());
  const std::string written = folder / "sized.toml";
  REQUIRE(folder
              .size({"--vary", "protection.thickness_mm", "--between", "0,60", "--for", "60",
                     "--set", "bars[0].positions_mm=[[0, 50], [0, -50]]", "--set",
                     "title=\"Say \\\"so\\\"\"", "--set",
                     "bars=[{diameter_mm=12, yield_MPa=500, positions_mm=[[0, 50], [0, -50]]}]",
                     "--write", written, "--quiet"})
              .exit_code == 0);
  const json echo = json::parse(run_ringward({"rate", written, "--json", "-"}).out);
  CHECK(echo.at("title") == "Say \"so\"");
  CHECK(echo.at("input").at("bars[0].positions_mm") == json::parse("[[0, 50], [0, -50]]"));
}

TEST_CASE("Nothing in the bracket: exit status 1, the miss is told and no file is written",
          "[study]") {
  const ColumnFolder folder(protected_column());
  const ProcessResult run =
      folder.size({"--vary", "protection.thickness_mm", "--between", "0,2", "--for", "90",
                   "--write", folder / "sized.toml", "--json", folder / "size.json"});
  CHECK(run.exit_code == 1);
  CHECK(run.out.find("nothing works") != std::string::npos);
  const json sized = json::parse(file_content(folder / "size.json"));
  CHECK(sized.at("found") == false);
  CHECK(sized.at("misses_by_min") == -sized.at("trials").at(1).at("margin_min").get<double>());
  CHECK(run_program({"test", "-e", folder / "sized.toml"}).exit_code != 0);
}

TEST_CASE("A search that makes no sense is wrong usage, a bad end of the bracket is bad input",
          "[study]") {
  const ColumnFolder folder(protected_column());
  const auto with = [&](const std::string& key, const std::string& between,
                        const std::vector<std::string>& more = {"--for", "60"}) {
    std::vector<std::string> arguments{"--vary", key, "--between", between};
    arguments.insert(arguments.end(), more.begin(), more.end());
    return folder.size(arguments);
  };
  CHECK(with("protection.thicknes_mm", "0,60").err.find("did you mean protection.thickness_mm") !=
        std::string::npos);
  CHECK(with("fire.curve", "0,60").exit_code == 2);
  CHECK(with("rating.required_min", "30,60").exit_code == 2);
  CHECK(with("load.axial_kN", "100").exit_code == 2);
  CHECK(with("load.axial_kN", "100,100").exit_code == 2);
  CHECK(with("load.axial_kN", "100,2000", {}).exit_code == 2);
  CHECK(with("load.axial_kN", "100,2000", {"--for", "60", "--step", "-1"}).exit_code == 2);
  const ProcessResult bad = with("bars[0].axis_mm", "5,60");
  CHECK(bad.exit_code == 3);
  CHECK(bad.err.find("bars[0].axis_mm: the cover is below zero") != std::string::npos);
}
