#include <catch2/catch.hpp>

#include "cli/study/study.hpp"
#include "tests/cli/study/study_folder.hpp"
#include "thermal/base/error.hpp"

using namespace ringward;
using namespace ringward::cli;
using namespace ringward::testing;

namespace {

/// The message with which a study is refused, without the folder that it is in.
std::string refusal(const StudyFolder& folder, const std::vector<std::string>& overrides = {}) {
  try {
    (void)read_study(folder.study(), overrides);
  } catch (const Error& error) {
    REQUIRE(error.kind() == ErrorKind::bad_input);
    std::string message = error.what();
    const std::string place = folder / "";
    for (std::size_t at = 0; (at = message.find(place)) != std::string::npos;) {
      message.erase(at, place.size());
    }
    return message;
  }
  return "";
}

bool has_line(const std::string& message, const std::string& line) {
  return ("\n" + message + "\n").find("\n" + line + "\n") != std::string::npos;
}

std::vector<std::string> names(const Study& study) {
  std::vector<std::string> names;
  for (std::size_t i = 0; i < study.count(); ++i) names.push_back(study.layouts->at(i).name);
  return names;
}

}  // namespace

TEST_CASE("A grid makes every combination, the last key changing fastest, named by what varies",
          "[study]") {
  const StudyFolder folder(
      "[grid]\n\"load.axial_kN\" = [300, 400]\n\"bars[0].axis_mm\" = [35, 40]\n"
      "\"core.strength_MPa\" = [35]\n");
  const Study study = read_study(folder.study(), {});
  CHECK(names(study) ==
        std::vector<std::string>{"axial_kN 300, axis_mm 35", "axial_kN 300, axis_mm 40",
                                 "axial_kN 400, axis_mm 35", "axial_kN 400, axis_mm 40"});
  CHECK(study.column(1).column.load.axial_N == 300e3);
  CHECK(study.column(2).column.load.axial_N == 400e3);
  CHECK(study.column(2).column.section.core.strength_Pa == 35e6);
}

TEST_CASE("A layout sets quoted, dotted and nested keys and leaves the rest of the base",
          "[study]") {
  const StudyFolder folder(
      "[[layout]]\nname = \"A\"\nset = { \"bars[0].axis_mm\" = 40, core.strength_MPa = 35, fire = "
      "{ surface = { emissivity = 0.5 } } }\n[[layout]]\nname = \"base as it is\"\n");
  const Study study = read_study(folder.study(), {});
  REQUIRE(study.count() == 2);
  const ColumnInput changed = study.column(0);
  const ColumnInput base = study.column(1);
  CHECK(changed.column.section.core.strength_Pa == 35e6);
  CHECK(changed.fire.surface.emissivity == 0.5);
  CHECK(changed.fire.surface.convection_W_m2K == base.fire.surface.convection_W_m2K);
  CHECK(changed.column.load.axial_N == base.column.load.axial_N);
  CHECK(base.column.section.core.strength_Pa == 30e6);
}

TEST_CASE("A table of columns takes words without quotes and empty cells for the base's value",
          "[study]") {
  const StudyFolder folder("columns_csv = \"columns.csv\"\n");
  write_content(folder / "columns.csv",
                "name,load.axial_kN,core.aggregate,bars[0].positions_mm,bars[0].count\n"
                "A,400,calcareous,,6\n\"B, left\",,,,8\n");
  const Study study = read_study(folder.study(), {});
  CHECK(names(study) == std::vector<std::string>{"A", "B, left"});
  CHECK(study.column(0).column.section.core.aggregate == thermal::Aggregate::calcareous);
  CHECK(study.column(0).column.load.axial_N == 400e3);
  CHECK(study.column(1).column.load.axial_N == 500e3);
  CHECK(study.column(1).column.section.bars[0].positions.size() == 8);
}

TEST_CASE("An override on the command line changes the base, and a layout's own value goes over it",
          "[study]") {
  const StudyFolder folder(load_grid(2));
  const Study study = read_study(folder.study(), {"core.strength_MPa=35", "load.axial_kN=1"});
  CHECK(study.column(0).column.section.core.strength_Pa == 35e6);
  CHECK(study.column(0).column.load.axial_N == 300e3);
  CHECK(study.sha256 != read_study(folder.study(), {}).sha256);
}

TEST_CASE("Mistakes of all layouts are reported together, each with its place and layout",
          "[study]") {
  const StudyFolder folder(
      "bse = \"x\"\n[[layout]]\nname = \"A\"\nset = { \"bars[0].axis_mm\" = 500, "
      "\"core.strenght_MPa\" = 3 }\n[[layout]]\nset = { load.axial_kN = \"much\" }\ncolour = 1\n"
      "[[layout]]\nname = \"A\"\n");
  const std::string message = refusal(folder);
  CHECK(has_line(message, "study.toml:3:1: bse: unknown key; did you mean base?"));
  CHECK(message.find("study.toml:6:29: layout \"A\": bars[0].axis_mm: 500 mm reaches the centre") !=
        std::string::npos);
  CHECK(message.find("study.toml:6:56: layout \"A\": core.strenght_MPa: unknown key") !=
        std::string::npos);
  CHECK(message.find("layout[1].name: missing") != std::string::npos);
  CHECK(message.find("study.toml:8:25: layout \"layout[1]\": load.axial_kN: expected a number, "
                     "found the text \"much\"") != std::string::npos);
  CHECK(message.find("study.toml:9:1: layout[1].colour: unknown key") != std::string::npos);
  CHECK(has_line(message,
                 "study.toml:11:8: layout[2].name: \"A\" names another layout too; names "
                 "must differ"));
}

TEST_CASE("A mistake that many layouts share is told once", "[study]") {
  const StudyFolder grid(
      "[grid]\n\"load.axial_kN\" = [300, 400, 500]\n\"bars[0].axis_mm\" = [35, 500]\n");
  const std::string message = refusal(grid);
  CHECK(message.find("study.toml:5:26: layout \"axial_kN 300, axis_mm 500\" and 2 more: "
                     "bars[0].axis_mm: 500 mm") == 0);
  CHECK(message.find('\n') == std::string::npos);
  const StudyFolder bad_base(load_grid(3));
  write_content(bad_base.column(), file_content(bad_base.column()) + "[tub]\n");
  CHECK(refusal(bad_base).find(":2: tub: unknown key; did you mean tube?") ==
        std::string("column.toml:22").size());
}

TEST_CASE("Mistakes in a table of columns name its line and column", "[study]") {
  const StudyFolder folder("columns_csv = \"columns.csv\"\n");
  const auto message = [&](const std::string& csv) {
    write_content(folder / "columns.csv", csv);
    return refusal(folder);
  };
  CHECK(message("name,load.axial_kN\nA,300\nB,-5\nB,300\nC\n,300\n")
            .find("columns.csv:3:3: layout \"B\": load.axial_kN: -5 kN must be above 0 kN") !=
        std::string::npos);
  const std::string many = message("name,load.axial_kN\nA,300\nB,-5\nB,300\nC\n,300\n");
  CHECK(has_line(many, "columns.csv:4: \"B\" names another row too; names must differ"));
  CHECK(has_line(many, "columns.csv:5: 1 cells where the header has 2"));
  CHECK(has_line(many, "columns.csv:6: the name is empty; every row needs a name"));
  CHECK(message("load.axial_kN\n300\n").find("no column is headed \"name\"") != std::string::npos);
  CHECK(message("name;load.axial_kN\nA;300\n").find("separated by semicolons") !=
        std::string::npos);
  CHECK(
      message("name,load.axial_kN\nA,3 kN\n").find("expected a number, found the text \"3 kN\"") !=
      std::string::npos);
  CHECK(message("").find("the file is empty") != std::string::npos);
  CHECK(message("name,x,x\n").find("\"x\" heads two columns") != std::string::npos);
}

TEST_CASE("A study without a base, without layouts or with two kinds of them is refused",
          "[study]") {
  CHECK(refusal(StudyFolder("")).find("there are no layouts") != std::string::npos);
  CHECK(refusal(StudyFolder("columns_csv = \"none.csv\"\n")).find("\"none.csv\" cannot be read") !=
        std::string::npos);
  CHECK(refusal(StudyFolder("columns_csv = \"c.csv\"\n" + load_grid(2))).find("keep one") !=
        std::string::npos);
  CHECK(refusal(StudyFolder("[grid]\n")).find("expected \"input.key\" = [values]") !=
        std::string::npos);
  CHECK(refusal(StudyFolder("[grid]\n\"load.axial_kN\" = [300, 300]\n")).find("listed twice") !=
        std::string::npos);
  const StudyFolder no_base(load_grid(1));
  write_content(no_base.study(), load_grid(1));
  CHECK(refusal(no_base).find("base: missing") != std::string::npos);
  write_content(no_base.study(), "base = \"gone.toml\"\n" + load_grid(1));
  CHECK(refusal(no_base).find("\"gone.toml\" cannot be read") != std::string::npos);
}

TEST_CASE("A grid of more than a million combinations is refused without counting them out",
          "[study]") {
  std::string grid = "[grid]\n";
  for (const char* key : {"load.axial_kN", "core.strength_MPa", "bars[0].axis_mm",
                          "bars[0].diameter_mm", "member.length_mm", "bars[0].yield_MPa"}) {
    grid += std::string("\"") + key + "\" = [1,2,3,4,5,6,7,8,9,10,11,12,13,14,15,16,17,18,19,20]\n";
  }
  CHECK(refusal(StudyFolder(grid)).find("more than 1000000 combinations") != std::string::npos);
}
