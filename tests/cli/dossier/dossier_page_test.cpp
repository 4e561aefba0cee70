#include <catch2/catch.hpp>
#include <cmath>
#include <cstdio>
#include <nlohmann/json.hpp>
#include <regex>
#include <set>

#include "tests/cli/commands/run_process.hpp"
#include "tests/cli/docs/tree.hpp"
#include "tests/cli/dossier/dossier_columns.hpp"
#include "tests/cli/page/xml_check.hpp"

using namespace ringward::testing;
using nlohmann::ordered_json;

namespace {

/// The text of all elements of this name, in order.
std::vector<std::string> element_texts(const std::string& html, const std::string& pattern) {
  const std::regex element("<" + pattern + "[^>]*>([^<]*)<");
  std::vector<std::string> texts;
  for (std::sregex_iterator it(html.begin(), html.end(), element), end; it != end; ++it) {
    texts.push_back((*it)[1]);
  }
  return texts;
}

/// The cells of the row of a table that begins with this text.
std::vector<std::string> row(const std::string& html, const std::string& table,
                             const std::string& first) {
  const std::size_t from = html.find(table);
  const std::size_t begin = html.find(">" + first + "</th>", from);
  if (from == std::string::npos || begin == std::string::npos) return {};
  const std::string text = html.substr(begin, html.find("</tr>", begin) - begin);
  return element_texts(text, "td");
}

std::string one_decimal(double value) {
  char text[32];
  std::snprintf(text, sizeof text, "%.1f", value);
  return text;
}

void check_headings(const std::string& html) {
  const std::regex heading("<h([1-6])[ >]");
  int level = 0;
  int count = 0;
  for (std::sregex_iterator it(html.begin(), html.end(), heading), end; it != end; ++it) {
    const int next = std::stoi((*it)[1]);
    CHECK(next <= level + 1);
    level = next;
    ++count;
  }
  CHECK(count > 15);
  CHECK(occurrences(html, "<h1>") == 1);
}

void check_nothing_outside(const std::string& html) {
  for (const char* const attribute : {"src", "href", "xlink:href", "action", "data"}) {
    for (const std::string& target : attribute_values(html, attribute)) {
      INFO(attribute << "=" << target);
      CHECK(target.rfind("#part-", 0) == 0);
    }
  }
  for (const char* const outside : {"@import", "file:", "<iframe", "<object", "<link"}) {
    INFO(outside);
    CHECK(html.find(outside) == std::string::npos);
  }
  // Addresses only name vocabularies of XML, which nobody fetches.
  const std::regex address("https?://[^\"' <]*");
  for (std::sregex_iterator it(html.begin(), html.end(), address), end; it != end; ++it) {
    CHECK(it->str().rfind("http://www.w3.org/", 0) == 0);
  }
}

void check_pictures(const std::string& html, std::size_t least) {
  const std::size_t pictures = occurrences(html, "<svg ");
  CHECK(pictures >= least);
  CHECK(occurrences(html, "role=\"img\"") == pictures);
  CHECK(occurrences(html, "<title id=") == pictures);
  CHECK(occurrences(html, "<desc id=") == pictures);
  const std::vector<std::string> ids = attribute_values(html, "id");
  CHECK(std::set<std::string>(ids.begin(), ids.end()).size() == ids.size());
}

}  // namespace

TEST_CASE("A dossier is one well-formed page with its parts in order and rate's numbers",
          "[dossier]") {
  const TemporaryFolder folder;
  write_content(folder / "c7.toml", submitted_column());
  const ProcessResult result = run_ringward(
      {"dossier", folder / "c7.toml", "-o", folder / "c7.html", "--json", folder / "c7.json"});
  INFO(result.err);
  CHECK(result.exit_code == 1);  // 60 min are not met, as `rate` says
  const ProcessResult rated =
      run_ringward({"rate", folder / "c7.toml", "--json", folder / "rate.json", "--quiet"});
  CHECK(rated.exit_code == 1);
  CHECK(file_content(folder / "c7.json") == file_content(folder / "rate.json"));

  const std::string html = file_content(folder / "c7.html");
  const ordered_json rate = ordered_json::parse(file_content(folder / "rate.json"));
  CHECK(xml_complaints(html).empty());
  CHECK(html_complaints(html) == "");
  check_headings(html);
  check_nothing_outside(html);
  check_pictures(html, 8);
  for (const char* const text :
       {"Invented hall", "C7", "A. Author", "C. Checker", "2026-02-03", "Invented authority"}) {
    INFO(text);
    CHECK(html.find(text) != std::string::npos);
  }
  CHECK(html.find(rate["input_sha256"].get<std::string>()) != std::string::npos);

  const double resistance_min = rate["rating"]["fire_resistance_min"];
  const std::string shown = one_decimal(std::floor(resistance_min * 10 + 1e-6) / 10);
  CHECK(html.find("Fire resistance " + shown + " min") != std::string::npos);
  CHECK(html.find("NOT MET") != std::string::npos);
  // The table of resistance holds what the history of `rate` holds.
  for (const ordered_json& state : rate["history"]) {
    if (state["time_min"] != 15 && state["time_min"] != 20) continue;
    const std::vector<std::string> cells = row(html, "Resistance at the times of classes</caption>",
                                               std::to_string(state["time_min"].get<int>()));
    REQUIRE(cells.size() == 5);
    CHECK(cells[2] == one_decimal(state["capacity_kN"]));
    const std::vector<std::string> warm =
        row(html, "Temperatures at the times of classes and at failure</caption>",
            std::to_string(state["time_min"].get<int>()));
    REQUIRE(warm.size() == 6);
    CHECK(warm[0] == one_decimal(state["gas_C"]));
    CHECK(warm[5] == one_decimal(state["core_centre_C"]));
  }
  // Every key of the input is listed.
  for (const auto& [key, value] : rate["input"].items()) {
    if (key == "title" || key.rfind("submission", 0) == 0) continue;
    INFO(key);
    CHECK(html.find(">" + key + "</th>") != std::string::npos);
  }
  // What `rate` notes is noted.
  CHECK(occurrences(html, "<td>caution</td>") + occurrences(html, ">caution</th>") > 0);
  // The file is there to be used again.
  CHECK(html.find("axial_kN = 400") != std::string::npos);

  SECTION("The same input gives the same bytes, from any folder") {
    const TemporaryFolder other;
    write_content(other / "c7.toml", submitted_column());
    const ProcessResult again =
        run_ringward({"dossier", "c7.toml", "-o", "again.html"}, {.folder = other.path()});
    CHECK(again.exit_code == 1);
    CHECK(file_content(other / "again.html") == html);
  }
  SECTION("A rerun of one other choice is what rate gives with it") {
    const ProcessResult lower = run_ringward(
        {"rate", folder / "c7.toml", "--set", "core.moisture_percent=0", "--json", "-"});
    const double other_min =
        ordered_json::parse(lower.out)["rating"]["fire_resistance_min"].get<double>();
    const std::size_t at = html.find("Moisture of concrete");
    REQUIRE(at != std::string::npos);
    const std::string cells = html.substr(at, html.find("</tr>", at) - at);
    CHECK(cells.find("<td>0 %</td>") != std::string::npos);
    CHECK(cells.find(">" + one_decimal(std::floor(other_min * 10 + 1e-6) / 10) + "</td>") !=
          std::string::npos);
  }
}

TEST_CASE("Text of an input stays text in the dossier, whatever it holds", "[dossier]") {
  const TemporaryFolder folder;
  const std::string hostile =
      "</title></svg><script>alert(1)</script>'\\\" onload=x `touch made` $(touch made) ; & ../..";
  std::string column = submitted_column();
  for (const char* const name : {"Round tubed column (invented example)", "Invented hall", "C7",
                                 "A. Author", "2026-02-03"}) {
    column.replace(column.find(name), std::string(name).size(), hostile);
  }
  const std::string name = "a';touch made;'<b>.toml";
  write_content(folder / name, column);
  const ProcessResult result =
      run_ringward({"dossier", name, "-o", "page.html", "--set", "core.aggregate=\"calcareous\""},
                   {.folder = folder.path()});
  INFO(result.err);
  REQUIRE(result.exit_code <= 1);
  const std::string html = file_content(folder / "page.html");
  CHECK(xml_complaints(html).empty());
  CHECK(html_complaints(html) == "");
  // Two scripts of our own: the frames of the map, and what moves it.
  CHECK(occurrences(html, "<script") == 2);
  CHECK(attribute_values(html, "onload").empty());
  CHECK(html.find("&lt;script&gt;alert(1)") != std::string::npos);
  check_nothing_outside(html);
  CHECK(folder.names() == std::vector<std::string>{name, "page.html"});
}

TEST_CASE("A column that survives, without tube, and without gnuplot, has a dossier too",
          "[dossier]") {
  const TemporaryFolder folder;
  const ProcessResult result =
      run_ringward({"dossier", "-", "-o", folder / "page.html"},
                   {.stdin_text = surviving_column(), .variables = {{"PATH", "/nonexistent"}}});
  INFO(result.err);
  CHECK(result.exit_code == 0);
  const std::string html = file_content(folder / "page.html");
  CHECK(xml_complaints(html).empty());
  CHECK(html_complaints(html) == "");
  CHECK(html.find("above 30.0 min") != std::string::npos);
  CHECK(html.find("gnuplot-nox") != std::string::npos);
  CHECK(html.find("The column has no tube.") != std::string::npos);
  CHECK(html.find("<em>not given</em>") != std::string::npos);
  check_headings(html);
  check_pictures(html, 3);  // section and maps are our own
}

TEST_CASE("A dossier complains of its targets before it computes", "[dossier]") {
  const TemporaryFolder folder;
  write_content(folder / "c.toml", submitted_column());
  const auto exit_code = [&](const std::vector<std::string>& rest) {
    std::vector<std::string> arguments{"dossier", folder / "c.toml"};
    arguments.insert(arguments.end(), rest.begin(), rest.end());
    return run_ringward(arguments).exit_code;
  };
  CHECK(exit_code({}) == 2);
  CHECK(exit_code({"-o", folder / "c.toml"}) == 2);
  CHECK(exit_code({"-o", folder / "a.html", "--pdf", folder / "a.html"}) == 2);
  CHECK(exit_code({"-o", folder / "no/such/a.html"}) == 5);
  CHECK(exit_code({"-o", folder / "a.html", "--pdf", folder / "no/such/a.pdf"}) == 5);
  CHECK(folder.names() == std::vector<std::string>{"c.toml"});
  CHECK(file_content(folder / "c.toml") == submitted_column());
}

TEST_CASE("The picture in README is the curve of the example's dossier", "[dossier]") {
  const TemporaryFolder folder;
  const std::string column = (project_root() / "docs/examples/atrium-column.toml").string();
  const ProcessResult result = run_ringward({"dossier", column, "-o", folder / "atrium.html"});
  INFO(result.err);
  REQUIRE(result.exit_code == 0);
  const std::string picture = read_file("docs/pictures/atrium-capacity.svg").text;
  CHECK(xml_complaints(picture).empty());
  CHECK(file_content(folder / "atrium.html").find(picture) != std::string::npos);
  CHECK(read_file("README.md").text.find("](docs/pictures/atrium-capacity.svg)") !=
        std::string::npos);
}
