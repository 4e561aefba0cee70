#include "tests/validation/page_template.hpp"

#include <catch2/catch.hpp>

using namespace ringward::testing;
using Catch::Matchers::Contains;

TEST_CASE("A page template takes its texts, and no text may be missing or left over") {
  CHECK(filled("a {{one}} b {{two}}{{one}}", {{"one", "1"}, {"two", "22"}}) == "a 1 b 221");
  CHECK_THROWS_WITH(filled("a {{one}}", {}), Contains("{{one}}"));
  CHECK_THROWS_WITH(filled("a", {{"one", "1"}}), Contains("{{one}}"));
  CHECK_THROWS_WITH(filled("a {{one", {{"one", "1"}}), Contains("no end"));
}

TEST_CASE("A page that is not what its template and texts make is noticed") {
  const std::string page_template = "start {{quick}} middle {{slow}} end {{quick}}\n";
  const PageTexts texts{{"quick", "7"}};
  const auto difference = [&](const std::string& page) {
    return first_difference(page, page_template, texts, {"slow"});
  };
  CHECK(difference("start 7 middle any thing end 7\n").empty());
  CHECK_THAT(difference("start 8 middle any thing end 7\n"), Contains("start 7"));
  CHECK_THAT(difference("start 7 middle any thing end 8\n"), Contains("end 7"));
  CHECK_THAT(difference("start 7 middle any thing end 7\nmore"), Contains("more"));
  CHECK_FALSE(difference("").empty());
}
