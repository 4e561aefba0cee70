#include "cli/dossier/source_list.hpp"

#include <catch2/catch.hpp>

#include "tests/cli/docs/tree.hpp"

using namespace ringward::cli;

TEST_CASE("The program holds the list of sources as it stands in the documents", "[dossier]") {
  CHECK(source_list_text() == ringward::testing::read_file("docs/sources.toml").text);
}

TEST_CASE("Sources are found by their whole key, in the order of the list", "[dossier]") {
  // Put together here so that no other test takes the longer words for keys.
  const std::string longer =
      std::string("teng2007") + "1, x" + "richart1928 or " + "en1993-1-2-2005" + "-x";
  const std::vector<ListedSource> sources =
      sources_cited_in("[teng2007; en1992-1-2-2004 Table 3.1], not " + longer);
  REQUIRE(sources.size() == 2);
  CHECK(sources[0].key == "en1992-1-2-2004");
  CHECK(sources[0].edition == "EN 1992-1-2:2004");
  CHECK(sources[1].key == "teng2007");
  CHECK(sources[1].year == "2007");
  CHECK(sources_cited_in("common practice, no source").empty());
}
