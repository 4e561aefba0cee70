#include <algorithm>
#include <catch2/catch.hpp>
#include <cstdlib>
#include <set>

#include "cli/page/html_page.hpp"
#include "cli/pictures/bar_picture.hpp"
#include "cli/pictures/line_picture.hpp"
#include "cli/pictures/scatter_picture.hpp"
#include "tests/cli/commands/run_process.hpp"
#include "tests/cli/page/xml_check.hpp"

using namespace ringward::cli;
using namespace ringward::testing;

namespace {

LinePicture line_picture(const std::string& id, const std::string& words) {
  return {.about = {id, words, words},
          .x = {words, 0, 120},
          .y = {words},
          .series = {{words, {{0, 10}, {30, 8}, {60, kNoValue}, {90, 4}, {120, 1}}},
                     {words, {{0, 9}, {120, 2}}, SeriesStyle::strong},
                     {"", {{0, 9}, {120, 3}}, SeriesStyle::thin},
                     {words, {{0, 9}, {120, 4}}, SeriesStyle::points}},
          .vertical_marks = {{60, words}},
          .horizontal_marks = {{5, words}},
          .bands = {{words, {{0, 1, 2}, {120, 2, 4}}}}};
}

ScatterPicture scatter_picture(const std::string& words) {
  return {.about = {"scatter", words, words},
          .x = {words},
          .y = {words},
          .points = {{1, 2, true, words}, {2, 1, false, words}, {3, 5, true, ""}},
          .highlighted_name = words,
          .other_name = words};
}

BarPicture bar_picture(const std::string& words) {
  return {.about = {"bars", words, words},
          .axis_label = words,
          .centre = 100,
          .low_name = words,
          .high_name = words,
          .rows = {{words, 90, 105}, {words, 120, 70}}};
}

std::vector<Picture> all_kinds(const std::string& words) {
  return {draw(line_picture("lines", words)), draw(scatter_picture(words)),
          draw(bar_picture(words))};
}

/// PATH without any program, for as long as it lives.
class NoPrograms {
 public:
  NoPrograms() : before_(std::getenv("PATH")) { setenv("PATH", "/nonexistent", 1); }
  ~NoPrograms() { setenv("PATH", before_.c_str(), 1); }
  NoPrograms(const NoPrograms&) = delete;
  NoPrograms& operator=(const NoPrograms&) = delete;

 private:
  std::string before_;
};

}  // namespace

TEST_CASE("Every kind of picture is well-formed and says in words what it shows", "[pictures]") {
  for (const Picture& picture : all_kinds("Some words")) {
    INFO(picture.why_missing);
    REQUIRE(picture.is_there());
    CHECK(xml_complaints(picture.svg).empty());
    CHECK(attribute_values(picture.svg, "role") == std::vector<std::string>{"img"});
    CHECK(occurrences(picture.svg, "<title ") == 1);
    CHECK(occurrences(picture.svg, "<desc ") == 1);
    CHECK(picture.svg.find("GNUPLOT") == std::string::npos);
    CHECK(picture.svg.find("currentColor") == std::string::npos);
    CHECK(picture.svg.find("href") == std::string::npos);
  }
}

TEST_CASE("Words of a picture cannot run commands, name files or become markup", "[pictures]") {
  const TemporaryFolder folder;
  const std::string made = folder / "made";
  const std::vector<std::string> hostile = {
      "`touch " + made + "`",
      "'; system(\"touch " + made + "\") #",
      "\"; set output '" + made + "'; #",
      "a\nsystem(\"touch " + made + "\")\nEND\n!touch " + made + "\n",
      "@d0 $d0 %s \\n \\' {/Symbol a}_b^c ~",
      "</text></svg><script>alert(1)</script>",
      "\xEE\x80\x80"
      "0"
      "\xEE\x80\x81 \xEE\x80\x80 9999",
      "\xFF\x80 broken",
      std::string(500, 'w'),
      ""};
  for (const std::string& words : hostile) {
    for (const Picture& picture : all_kinds(words)) {
      INFO(words << picture.why_missing);
      REQUIRE(picture.is_there());
      CHECK(xml_complaints(picture.svg).empty());
      CHECK(picture.svg.find("<script") == std::string::npos);
    }
  }
  CHECK(folder.names().empty());
}

TEST_CASE("Words are shown as they are", "[pictures]") {
  for (const Picture& picture : all_kinds("R\xC3\xA9sistance `x_1^2` {a} 'b' <c>")) {
    CHECK(picture.svg.find("R\xC3\xA9sistance `x_1^2` {a} &#39;b&#39; &lt;c&gt;</text>") !=
          std::string::npos);
  }
}

TEST_CASE("Two pictures in one page share no id", "[pictures]") {
  const std::string both = draw(line_picture("first", "a")).svg + draw(bar_picture("b")).svg +
                           draw(line_picture("second", "c")).svg;
  const std::vector<std::string> ids = attribute_values(both, "id");
  CHECK(ids.size() > 8);
  CHECK(std::set<std::string>(ids.begin(), ids.end()).size() == ids.size());
  // What is referred to is there.
  for (std::size_t at = both.find("url(#"); at != std::string::npos;
       at = both.find("url(#", at + 1)) {
    const std::string id = both.substr(at + 5, both.find(')', at) - at - 5);
    CHECK(std::count(ids.begin(), ids.end(), id) == 1);
  }
}

TEST_CASE("The same picture has the same bytes", "[pictures]") {
  const std::vector<Picture> once = all_kinds("w");
  const std::vector<Picture> again = all_kinds("w");
  for (std::size_t i = 0; i < once.size(); ++i) CHECK(once[i].svg == again[i].svg);
}

TEST_CASE("Without gnuplot there is a reason and a way out instead of a picture", "[pictures]") {
  const NoPrograms none;
  for (const Picture& picture : all_kinds("w")) {
    CHECK_FALSE(picture.is_there());
    CHECK(picture.why_missing.find("gnuplot-nox") != std::string::npos);
  }
}

TEST_CASE("Without a single value there is a reason instead of a picture", "[pictures]") {
  LinePicture lines = line_picture("lines", "w");
  lines.series = {{"w", {{0, kNoValue}}}};
  ScatterPicture scatter = scatter_picture("w");
  scatter.points = {{kNoValue, 1}};
  BarPicture bars = bar_picture("w");
  bars.rows = {{"w", 1, kNoValue}};
  for (const Picture& picture : {draw(lines), draw(scatter), draw(bars)}) {
    CHECK_FALSE(picture.is_there());
    CHECK(picture.why_missing.find("no picture") != std::string::npos);
  }
}

TEST_CASE("A single value, or equal ones, can be drawn", "[pictures]") {
  LinePicture lines = line_picture("lines", "w");
  lines.series = {{"w", {{60, 5}}}};
  lines.bands.clear();
  CHECK(draw(lines).is_there());
  ScatterPicture scatter = scatter_picture("w");
  scatter.points = {{1, 1}, {1, 1}};
  CHECK(draw(scatter).is_there());
  BarPicture bars = bar_picture("w");
  bars.rows = {{"w", 100, 100}};
  CHECK(draw(bars).is_there());
}

TEST_CASE("Lines are told apart without colour: no two share dash pattern and marker",
          "[pictures]") {
  LinePicture lines{.about = {"many", "t", "m"}, .x = {"x"}, .y = {"y"}};
  for (int i = 0; i < 6; ++i) {
    lines.series.push_back({"s" + std::to_string(i), {{0, i + 1.0}, {1, i + 2.0}}});
  }
  const Picture picture = draw(lines);
  REQUIRE(picture.is_there());
  std::set<std::string> looks;
  for (int i = 1; i <= 6; ++i) {
    const std::size_t from = picture.svg.find("_plot_" + std::to_string(i) + "\"");
    const std::string plot = picture.svg.substr(from, picture.svg.find("_plot_", from + 1) - from);
    const std::size_t dash = plot.find("stroke-dasharray");
    const std::string pattern =
        dash == std::string::npos ? "solid" : plot.substr(dash, plot.find('\'', dash + 18) - dash);
    const std::size_t symbol = plot.find(" scale(");
    looks.insert(pattern + plot.substr(plot.rfind('<', symbol), 8));
  }
  CHECK(looks.size() == 6);
}

TEST_CASE("The row that spans most comes first, and equal ones keep their order", "[pictures]") {
  const std::vector<BarRow> rows =
      largest_first({{"a", 99, 101}, {"b", 100, 140}, {"c", 60, 70}, {"d", 101, 99}}, 100);
  std::string order;
  for (const BarRow& row : rows) order += row.name;
  // b spans 40 from the centre, c 40 (60 to the centre), a and d 2.
  CHECK(order == "bcad");
}
