#include "cli/study/csv_reading.hpp"

#include <catch2/catch.hpp>

#include "thermal/base/error.hpp"

using namespace ringward;
using namespace ringward::cli;

namespace {

std::vector<std::vector<std::string>> all_cells(const std::string& text) {
  CsvReader reader(text);
  CsvRecord record;
  std::vector<std::vector<std::string>> rows;
  while (reader.next(record)) {
    rows.emplace_back();
    for (const CsvCell& cell : record.cells) rows.back().push_back(cell.text);
  }
  return rows;
}

std::string refusal(const std::string& text) {
  try {
    (void)all_cells(text);
  } catch (const Error& error) {
    return error.what();
  }
  return "";
}

using Rows = std::vector<std::vector<std::string>>;

}  // namespace

// RFC 4180 section 2 (read): quoted cells hold commas, line breaks and doubled quotes.
TEST_CASE("CSV cells may be quoted and then hold commas, line breaks and quotes", "[study]") {
  CHECK(all_cells("a,b\n\"x, y\",\"say \"\"so\"\"\"\n\"two\nlines\",\n") ==
        Rows{{"a", "b"}, {"x, y", "say \"so\""}, {"two\nlines", ""}});
}

TEST_CASE(
    "Line ends of either kind, a byte order mark, empty lines and blanks around cells are "
    "no content",
    "[study]") {
  const Rows expected{{"a", "b"}, {"1", "2"}};
  CHECK(all_cells("a,b\n1,2\n") == expected);
  CHECK(all_cells("\xEF\xBB\xBF"
                  "a,b\r\n\r\n 1 ,\t2\r\n\n") == expected);
  CHECK(all_cells("a,b\n1,2") == expected);
  CHECK(all_cells("").empty());
}

TEST_CASE("Every CSV cell knows the line and column where it starts", "[study]") {
  const std::string text = "a,b\n\"two\nlines\",x\nlast,\"q\"";
  CsvReader reader(text);
  CsvRecord record;
  REQUIRE(reader.next(record));
  REQUIRE(reader.next(record));
  CHECK(record.line == 2);
  CHECK(record.cells.at(1).line == 3);
  CHECK(record.cells.at(1).column == 8);
  const std::size_t offset = reader.offset();
  const std::size_t line = reader.line();
  REQUIRE(reader.next(record));
  CHECK(record.line == 4);
  CHECK(record.cells.at(1).column == 6);
  CsvReader again(text, offset, line);
  REQUIRE(again.next(record));
  CHECK(record.cells.at(0).text == "last");
  CHECK(record.line == 4);
}

TEST_CASE("A quoted CSV cell that does not end, or goes on after its quote, is refused",
          "[study]") {
  CHECK(refusal("a,b\n1,\"x\n").find("2:3: this quoted cell never ends") == 0);
  CHECK(refusal("a,\"b\"c\n").find("1:6: text follows the closing quote") == 0);
}
