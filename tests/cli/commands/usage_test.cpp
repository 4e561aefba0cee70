#include <catch2/catch.hpp>
#include <sstream>

#include "tests/cli/commands/example_columns.hpp"
#include "tests/cli/commands/run_process.hpp"

using namespace ringward::testing;

// The exit statuses, options and streams are those of the interface page of the project.

namespace {

const std::vector<std::string> kCommands{"rate",     "field",   "capacity",    "gas",
                                         "compare",  "size",    "sensitivity", "dossier",
                                         "evidence", "explain", "new"};

bool contains(const std::string& text, const std::string& part) {
  return text.find(part) != std::string::npos;
}

std::string last_line(const std::string& text) {
  const std::size_t start = text.find_last_of('\n', text.size() - 2);
  return text.substr(start + 1);
}

}  // namespace

TEST_CASE("Every command explains itself on standard output and exits with 0", "[cli]") {
  for (const std::string& command : kCommands) {
    INFO(command);
    const ProcessResult result = run_ringward({command, "--help"});
    CHECK(result.exit_code == 0);
    CHECK(contains(result.out, "Usage: ringward " + command));
    CHECK(result.err.empty());
  }
}

TEST_CASE("The general help lists exactly the commands that exist, with the exit statuses",
          "[cli]") {
  const ProcessResult result = run_ringward({"--help"});
  CHECK(result.exit_code == 0);
  for (const std::string& command : kCommands) CHECK(contains(result.out, "\n  " + command + " "));
  std::istringstream help(result.out.substr(result.out.find("Subcommands:")));
  std::size_t listed = 0;
  for (std::string line; std::getline(help, line);) {
    if (line.starts_with("  ") && line[2] != ' ') ++listed;
  }
  CHECK(listed == kCommands.size());
  CHECK(contains(result.out, "130 interrupted"));
}

TEST_CASE("The help of options that take a quantity states its unit", "[cli]") {
  const std::string field = run_ringward({"field", "--help"}).out;
  CHECK(contains(field, "Times in min"));
  CHECK(contains(field, "A point in mm"));
  const std::string gas = run_ringward({"gas", "--help"}).out;
  CHECK(contains(gas, "Last time in min"));
  CHECK(contains(gas, "Time step in min"));
  CHECK(contains(run_ringward({"capacity", "--help"}).out, "in kN and kNm"));
}

TEST_CASE("The version is printed alone", "[cli]") {
  const ProcessResult result = run_ringward({"--version"});
  CHECK(result.exit_code == 0);
  CHECK(result.out == "ringward " RINGWARD_VERSION "\n");
}

TEST_CASE("Wrong usage exits with 2, says so on standard error and prints no result", "[cli]") {
  const TemporaryFolder folder;
  const std::string column = folder / "column.toml";
  write_content(column, round_bare_column());
  const std::vector<std::vector<std::string>> wrong{
      {},
      {"no-such-command"},
      {"rate"},
      {"rate", column, "--no-such-option"},
      {"rate", column, "another.toml"},
      {"rate", column, "--json", "-", "--csv", "-"},
      {"rate", column, "--json", folder / "same", "--csv", folder / "same"},
      {"rate", column, "--json", column},
      {"field", column, "--at", "30,soon"},
      {"field", column, "--at", "nan"},
      {"field", column, "--at", "30,"},
      {"field", column, "--probe", "10"},
      {"field", column, "--probe", "1,2,3"},
      {"field", column, "--csv", folder / "probes.csv"},
      {"gas"},
      {"gas", column, "--curve", "standard"},
      {"gas", "--curve", "no-such-curve"},
      {"gas", "--curve", "standard", "--step", "0"},
      {"gas", "--curve", "standard", "--step", "1e-9"},
      {"gas", "--curve", "standard", "--until", "-1"},
      {"gas", "--curve", "standard", "--set", "fire.duration_min=10"},
      {"new", "--shape", "hexagonal"},
      {"explain", "tube.thickness_mm", "core.strength_MPa"}};
  for (const std::vector<std::string>& arguments : wrong) {
    std::string line;
    for (const std::string& word : arguments) line += word + " ";
    INFO(line);
    const ProcessResult result = run_ringward(arguments);
    CHECK(result.exit_code == 2);
    CHECK(result.out.empty());
    CHECK(contains(result.err, "ringward: "));
    CHECK(contains(result.err, "--help"));
  }
  CHECK(file_content(column) == round_bare_column());
  CHECK(folder.names() == std::vector<std::string>{"column.toml"});
}

TEST_CASE("A mistyped command is answered with the nearest one", "[cli]") {
  const ProcessResult result = run_ringward({"rat"});
  CHECK(result.exit_code == 2);
  CHECK(contains(result.err, "did you mean \"rate\"?"));
}

TEST_CASE("An unreadable or invalid column exits with 3 and names the place", "[cli]") {
  const TemporaryFolder folder;
  const std::string column = folder / "column.toml";
  CHECK(run_ringward({"rate", folder / "missing.toml"}).exit_code == 3);
  CHECK(run_ringward({"rate", folder.path().string()}).exit_code == 3);

  write_content(column, round_bare_column() + "no_such_key = 1\n");
  const ProcessResult unknown = run_ringward({"rate", column});
  CHECK(unknown.exit_code == 3);
  CHECK(unknown.out.empty());
  CHECK(contains(unknown.err, "no_such_key"));

  const ProcessResult broken = run_ringward({"gas", "-"}, {.stdin_text = "title = \n"});
  CHECK(broken.exit_code == 3);
  CHECK(contains(broken.err, "stdin:1"));
}

TEST_CASE("Times outside the followed fire exit with 3 and name the limit", "[cli]") {
  const ProcessSetup setup{.stdin_text = round_bare_column()};
  for (const std::vector<std::string>& arguments :
       std::vector<std::vector<std::string>>{{"field", "-", "--at", "30,121"},
                                             {"field", "-", "--at", "-1"},
                                             {"capacity", "-", "--at", "121"},
                                             {"capacity", "-", "--interaction", "--at", "121"},
                                             {"gas", "-", "--until", "121"}}) {
    INFO(arguments.front());
    const ProcessResult result = run_ringward(arguments, setup);
    CHECK(result.exit_code == 3);
    CHECK(result.out.empty());
    CHECK(contains(result.err, "120"));
    CHECK(contains(result.err, "fire.duration_min"));
  }
}

TEST_CASE("A probe outside the section exits with 3", "[cli]") {
  const ProcessResult result = run_ringward({"field", "-", "--at", "5", "--probe", "0,100.1"},
                                            {.stdin_text = round_bare_column()});
  CHECK(result.exit_code == 3);
  CHECK(contains(result.err, "100.1"));
}

TEST_CASE("Option --set overrides a key and - reads standard input", "[cli]") {
  const ProcessSetup setup{.stdin_text = round_bare_column()};
  const ProcessResult result =
      run_ringward({"gas", "-", "--set", "fire.curve=\"constant\"", "--set", "fire.constant_C=700",
                    "--set", "fire.duration_min=10", "--csv", "-"},
                   setup);
  CHECK(result.exit_code == 0);
  CHECK(result.out == "time_min,temperature_C\n0,700\n5,700\n10,700\n");
  CHECK(run_ringward({"gas", "-", "--set", "bars[0].no_such=1"}, setup).exit_code == 3);
}

TEST_CASE("What new prints can be rated at once, for every shape", "[cli]") {
  for (const std::string shape : {"circular", "square", "rectangular"}) {
    INFO(shape);
    const ProcessResult fresh = run_ringward({"new", "--shape", shape});
    CHECK(fresh.exit_code == 0);
    CHECK(run_ringward({"gas", "-"}, {.stdin_text = fresh.out}).exit_code == 0);
  }
}

TEST_CASE("explain lists the keys, explains one, and refuses an unknown one with 3", "[cli]") {
  const ProcessResult list = run_ringward({"explain"});
  CHECK(list.exit_code == 0);
  CHECK(contains(list.out, "\n[tube]"));
  CHECK(contains(list.out, "\n  thickness_mm "));
  const ProcessResult one = run_ringward({"explain", "tube.thickness_mm"});
  CHECK(one.exit_code == 0);
  CHECK(contains(one.out, "mm"));
  const ProcessResult unknown = run_ringward({"explain", "tube.thicknes_mm"});
  CHECK(unknown.exit_code == 3);
  CHECK(contains(unknown.err, "tube.thickness_mm"));
}

TEST_CASE("Every result that a person reads ends with the cautions", "[cli]") {
  const ProcessSetup setup{.stdin_text = round_bare_column()};
  for (const std::vector<std::string>& arguments :
       std::vector<std::vector<std::string>>{{"rate", "-"},
                                             {"field", "-", "--at", "10"},
                                             {"capacity", "-", "--at", "10"},
                                             {"capacity", "-", "--at", "10", "--interaction"},
                                             {"gas", "-"}}) {
    INFO(arguments.front());
    const ProcessResult result = run_ringward(arguments, setup);
    CHECK(contains(result.out, "licensed engineer"));
    CHECK(contains(result.out, "the authority"));
    for (const std::string left_out : {"spalling", "joints", "restraint"}) {
      CHECK(contains(result.out, left_out));
    }
    CHECK(contains(last_line(result.out), "construction defects"));
  }
}
