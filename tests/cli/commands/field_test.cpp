#include <catch2/catch.hpp>
#include <cmath>
#include <cstdlib>
#include <filesystem>
#include <nlohmann/json.hpp>
#include <sstream>

#include "tests/cli/commands/example_columns.hpp"
#include "tests/cli/commands/run_process.hpp"

using namespace ringward::testing;
using nlohmann::ordered_json;

namespace {

/// The text between the tags of the DataArray with this name.
std::string array_text(const std::string& xml, const std::string& name) {
  const std::size_t tag = xml.find("Name=\"" + name + "\"");
  REQUIRE(tag != std::string::npos);
  const std::size_t begin = xml.find('>', tag) + 1;
  return xml.substr(begin, xml.find('<', begin) - begin);
}

std::vector<double> numbers_in(const std::string& text) {
  std::istringstream words(text);
  std::vector<double> numbers;
  for (double number = 0; words >> number;) numbers.push_back(number);
  return numbers;
}

void check_well_formed(const std::string& path) {
  const ProcessResult xmllint = run_program({"xmllint", "--noout", path});
  INFO(path << ": " << xmllint.err);
  CHECK(xmllint.exit_code == 0);
}

std::string number_text(double value) {
  std::ostringstream text;
  text.precision(12);
  text << value;
  return text.str();
}

/// The probes of one run at the given points, in mm.
std::vector<double> probed(const std::string& column, const std::vector<std::string>& points) {
  std::vector<std::string> arguments{"field", "-", "--at", "20", "--json", "-"};
  for (const std::string& point : points) arguments.insert(arguments.end(), {"--probe", point});
  const ProcessResult result = run_ringward(arguments, {.stdin_text = column});
  REQUIRE(result.exit_code == 0);
  std::vector<double> temperatures;
  const ordered_json field = ordered_json::parse(result.out);
  for (const ordered_json& probe : field["states"][0]["probes"]) {
    temperatures.push_back(probe["temperature_C"].get<double>());
  }
  return temperatures;
}

std::size_t count_of(const std::string& text, const std::string& part) {
  std::size_t count = 0;
  for (std::size_t at = text.find(part); at != std::string::npos; at = text.find(part, at + 1)) {
    ++count;
  }
  return count;
}

}  // namespace

TEST_CASE("field --json lists states, bars and probes", "[cli]") {
  const ProcessResult result = run_ringward(
      {"field", "-", "--at", "10,20", "--probe", "-20,10", "--probe=0,0", "--json", "-"},
      {.stdin_text = round_tubed_column()});
  REQUIRE(result.exit_code == 0);
  const ordered_json field = ordered_json::parse(result.out);
  CHECK(field["schema"] == "ringward-field/1");
  REQUIRE(field["states"].size() == 2);
  for (const ordered_json& state : field["states"]) {
    CHECK(state["gas_C"] > state["tube_C"]);
    CHECK(state["core_face_C"] > state["core_centre_C"]);
    REQUIRE(state["bars"].size() == 1);
    // One ring, heated all round: all bars are equally hot, to the printed digit.
    CHECK(state["bars"][0]["max_C"].get<double>() ==
          Approx(state["bars"][0]["min_C"].get<double>()).margin(0.011));
    REQUIRE(state["probes"].size() == 2);
    CHECK(state["probes"][0]["x_mm"] == -20);
    CHECK(state["probes"][1]["temperature_C"] == state["core_centre_C"]);
  }
}

TEST_CASE("A column without tube or bars has null and an empty list there", "[cli]") {
  std::string plain = round_bare_column();
  plain.erase(plain.find("[[bars]]"), plain.find("[member]") - plain.find("[[bars]]"));
  const ordered_json field = ordered_json::parse(
      run_ringward({"field", "-", "--at", "10", "--json", "-"}, {.stdin_text = plain}).out);
  CHECK(field["states"][0]["tube_C"].is_null());
  CHECK(field["states"][0]["bars"].empty());
}

TEST_CASE("field --csv has one row a time and probe", "[cli]") {
  const std::string csv = run_ringward({"field", "-", "--at", "0,10", "--probe", "0,0", "--probe",
                                        "10,-20", "--csv", "-"},
                                       {.stdin_text = round_bare_column()})
                              .out;
  CHECK(csv.find("time_min,x_mm,y_mm,temperature_C\n0,0,0,20\n0,10,-20,20\n10,0,0,") == 0);
  CHECK(count_of(csv, "\n") == 5);
}

TEST_CASE("The VTK files of a square show the whole section, cell by cell as the probes do",
          "[cli]") {
  const TemporaryFolder folder;
  const ProcessResult result =
      run_ringward({"field", "-", "--at", "10,20", "--vtk", folder / "new/vtk", "--quiet"},
                   {.stdin_text = square_column()});
  REQUIRE(result.exit_code == 0);
  for (const char* name : {"temperature.pvd", "temperature_10min.vtr", "temperature_20min.vtr"}) {
    check_well_formed(folder / ("new/vtk/" + std::string(name)));
  }
  const std::string collection = file_content(folder / "new/vtk/temperature.pvd");
  CHECK(collection.find("timestep=\"20\"") != std::string::npos);
  CHECK(collection.find("file=\"temperature_20min.vtr\"") != std::string::npos);

  const std::string grid = file_content(folder / "new/vtk/temperature_20min.vtr");
  const std::vector<double> x = numbers_in(array_text(grid, "x_mm"));
  const std::vector<double> y = numbers_in(array_text(grid, "y_mm"));
  const std::vector<double> T_C = numbers_in(array_text(grid, "temperature_C"));
  const std::vector<double> layer = numbers_in(array_text(grid, "layer"));
  const std::size_t columns = x.size() - 1;
  const std::size_t rows = y.size() - 1;
  CHECK(grid.find("WholeExtent=\"0 " + std::to_string(columns) + " 0 " + std::to_string(rows) +
                  " 0 0\"") != std::string::npos);
  REQUIRE(T_C.size() == columns * rows);
  REQUIRE(layer.size() == columns * rows);
  CHECK(x.front() == Approx(-100));
  CHECK(x.back() == Approx(100));
  CHECK(y.front() == Approx(-100));
  CHECK(layer.front() == 1);  // the corner is tube
  CHECK(layer[columns / 2 + rows / 2 * columns] == 0);

  std::vector<std::string> points;
  std::vector<double> expected;
  for (std::size_t k = 0; k < T_C.size(); k += T_C.size() / 23) {
    const std::size_t i = k % columns;
    const std::size_t j = k / columns;
    points.push_back(number_text((x[i] + x[i + 1]) / 2) + "," + number_text((y[j] + y[j + 1]) / 2));
    expected.push_back(T_C[k]);
  }
  const std::vector<double> probes = probed(square_column(), points);
  REQUIRE(probes.size() == expected.size());
  for (std::size_t k = 0; k < probes.size(); ++k) {
    INFO(points[k]);
    // Both are printed to 0.01 C.
    CHECK(probes[k] == Approx(expected[k]).margin(0.0101));
  }
}

TEST_CASE("The VTK files of a circle close the full turn, ring by ring as the probes do", "[cli]") {
  const TemporaryFolder folder;
  const ProcessResult result = run_ringward({"field", "-", "--at", "20", "--vtk", folder / "vtk"},
                                            {.stdin_text = round_bare_column()});
  REQUIRE(result.exit_code == 0);
  const std::string path = folder / "vtk/temperature_20min.vts";
  check_well_formed(path);
  const std::string grid = file_content(path);
  const std::vector<double> corners = numbers_in(array_text(grid, "corner_mm"));
  const std::vector<double> T_C = numbers_in(array_text(grid, "temperature_C"));
  // Around the outside: every corner lies on the circle of 100 mm, first and last are one.
  std::size_t rings = 0;
  while (std::hypot(corners[3 * rings], corners[3 * rings + 1]) < 100 - 1e-6) ++rings;
  const std::size_t sectors = T_C.size() / rings;
  REQUIRE(corners.size() == 3 * (rings + 1) * (sectors + 1));
  const std::size_t last_row = 3 * (rings + 1) * sectors;
  for (std::size_t k = 0; k < 3 * (rings + 1); ++k) {
    CHECK(corners[k] == Approx(corners[last_row + k]).margin(1e-6));
  }
  std::vector<std::string> points;
  for (std::size_t i = 0; i < rings; ++i) {
    const double inner = std::hypot(corners[3 * i], corners[3 * i + 1]);
    const double outer = std::hypot(corners[3 * i + 3], corners[3 * i + 4]);
    points.push_back("0," + number_text(-(inner + outer) / 2));
  }
  const std::vector<double> probes = probed(round_bare_column(), points);
  REQUIRE(probes.size() == rings);
  for (std::size_t i = 0; i < rings; ++i) CHECK(probes[i] == Approx(T_C[i]).margin(0.0101));
}

TEST_CASE("The picture is well-formed, escapes the title, names times and units", "[cli]") {
  const TemporaryFolder folder;
  const ProcessResult result =
      run_ringward({"field", "-", "--at", "10,20", "--picture", folder / "field.svg", "--quiet",
                    "--set", "title=\"Column <A&B> \\\"one\\\"\""},
                   {.stdin_text = square_column()});
  REQUIRE(result.exit_code == 0);
  check_well_formed(folder / "field.svg");
  const std::string svg = file_content(folder / "field.svg");
  CHECK(svg.find("Column &lt;A&amp;B&gt; &quot;one&quot;, 10, 20 min</title>") !=
        std::string::npos);
  CHECK(svg.find("10 min, gas 678 \xC2\xB0"
                 "C") != std::string::npos);
  CHECK(svg.find("Temperature, \xC2\xB0"
                 "C") != std::string::npos);
  CHECK(svg.find("licensed engineer") != std::string::npos);
  // Two panels with four bars each, and one bar in the key.
  CHECK(count_of(svg, "<circle") == 9);
  // Four heated faces a panel and one in the key.
  CHECK(count_of(svg, "stroke-dasharray") == 9);
}

TEST_CASE("A picture that cannot be written takes the VTK files with it", "[cli]") {
  const TemporaryFolder folder;
  const ProcessResult result =
      run_ringward({"field", "-", "--at", "10", "--vtk", folder / "vtk", "--picture", "/dev/full"},
                   {.stdin_text = square_column()});
  CHECK(result.exit_code == 5);
  CHECK(std::filesystem::is_empty(folder / "vtk"));
}

TEST_CASE("A file where the VTK folder should be exits with 5", "[cli]") {
  const TemporaryFolder folder;
  write_content(folder / "taken", "text\n");
  const ProcessResult result = run_ringward({"field", "-", "--at", "10", "--vtk", folder / "taken"},
                                            {.stdin_text = square_column()});
  CHECK(result.exit_code == 5);
  CHECK(result.err.find(folder / "taken") != std::string::npos);
  CHECK(file_content(folder / "taken") == "text\n");
}
