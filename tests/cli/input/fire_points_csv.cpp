#include "cli/input/fire_points_csv.hpp"

#include <unistd.h>

#include <catch2/catch.hpp>
#include <filesystem>
#include <fstream>

#include "cli/input/reader.hpp"
#include "tests/cli/input/column_texts.hpp"
#include "thermal/base/error.hpp"

namespace ringward::cli::testing {
namespace {

/// A folder of its own that goes away with the test.
class Folder {
 public:
  Folder()
      : path_(std::filesystem::temp_directory_path() /
              ("ringward-csv-" + std::to_string(::getpid()))) {
    std::filesystem::create_directories(path_);
  }
  ~Folder() {
    std::error_code ignored;
    std::filesystem::remove_all(path_, ignored);
  }
  Folder(const Folder&) = delete;
  Folder& operator=(const Folder&) = delete;

  void write(const std::string& name, const std::string& text) const {
    std::ofstream(path_ / name) << text;
  }
  [[nodiscard]] std::string file(const std::string& name) const { return (path_ / name).string(); }

 private:
  std::filesystem::path path_;
};

std::string column_with_csv() {
  return edited("round", "curve = \"standard\"", "curve = \"table\"\npoints_csv = \"fire.csv\"");
}

std::vector<std::string> mistakes_in(const std::string& text) {
  std::vector<std::string> mistakes;
  (void)parse_fire_points(text, "fire.csv", closed(-50, 2000), mistakes);
  return mistakes;
}

}  // namespace

TEST_CASE("A fire is read from a CSV beside the column file, and its bytes enter the hash") {
  const Folder folder;
  folder.write("column.toml", column_with_csv());
  folder.write("fire.csv", "time_min,temperature_C\n0,20\n30,800\n90,20\n");
  const ColumnInput input = read_column_file(folder.file("column.toml"));
  // Linear between points: 20 + 780 * 15 / 30 = 410 C at 15 min; rounding only.
  CHECK(input.fire.gas.T_C(900) == Approx(410).epsilon(1e-12));
  CHECK(input.fire.gas.has_cooling);
  folder.write("fire.csv", "time_min,temperature_C\n0,20\n30,801\n90,20\n");
  CHECK(read_column_file(folder.file("column.toml")).input_sha256 != input.input_sha256);
}

TEST_CASE("A CSV may lack the header, quote its cells and end its lines in any way") {
  std::vector<std::string> mistakes;
  const auto points = parse_fire_points("\xEF\xBB\xBF\"0\", \"20\"\r\n\r\n10,600", "f",
                                        closed(-50, 2000), mistakes);
  CHECK(mistakes.empty());
  REQUIRE(points.size() == 2);
  CHECK(points[0] == NumberPair{0, 20});
  CHECK(points[1] == NumberPair{10, 600});
}

TEST_CASE("A bad CSV is refused with the line, the value and the limit of every mistake") {
  CHECK(mistakes_in("time_min,temperature_C\n0,20\n10;600\n20,x\n20,700\n15,800\n30,9999\n") ==
        std::vector<std::string>{
            "fire.csv:3: fire.points_csv: 1 values where 2 are expected; write "
            "time_min,temperature_C",
            "fire.csv:4: fire.points_csv: \"x\" is not a number; write time_min,temperature_C with "
            "a decimal point",
            "fire.csv:6: fire.points_csv: the table does not increase: the time 15 follows 20; put "
            "the points in increasing order of time, each once",
            "fire.csv:7: fire.points_csv: 9999 deg C is outside -50 to 2000 deg C; temperatures "
            "are in deg C"});
  CHECK(mistakes_in("time_min,temperature_C\n") ==
        std::vector<std::string>{
            "fire.csv:1: fire.points_csv: no points; write time_min,temperature_C on each line"});
  CHECK(mistakes_in("-1,20\n") ==
        std::vector<std::string>{
            "fire.csv:1: fire.points_csv: the time -1 min is below 0; start at 0"});
  CHECK(mistakes_in("0,nan\n").size() == 1);
}

TEST_CASE("Mistakes of the CSV and of the column file are reported together") {
  const Folder folder;
  folder.write("column.toml", column_with_csv());
  folder.write("fire.csv", "0,20\n0,30\n");
  try {
    (void)read_column_file(folder.file("column.toml"), {"load.axial_kN=-1"});
    FAIL("a bad column was accepted");
  } catch (const Error& error) {
    const std::string message = error.what();
    CHECK(message.find("fire.csv:2: fire.points_csv: the table does not increase") == 0);
    CHECK(message.find("\n--set load.axial_kN: load.axial_kN: -1 kN must be above 0 kN") !=
          std::string::npos);
  }
}

}  // namespace ringward::cli::testing
