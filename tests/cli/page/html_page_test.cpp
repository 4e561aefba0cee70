#include "cli/page/html_page.hpp"

#include <catch2/catch.hpp>

#include "cli/input/sha256.hpp"
#include "cli/output/base64.hpp"
#include "cli/output/xml_text.hpp"
#include "tests/cli/page/xml_check.hpp"

using namespace ringward::cli;
using namespace ringward::testing;

namespace {

/// Every kind of text that could break out of where it stands.
const char* const kHostile =
    "</title></h1><script>alert(1)</script>\" onload=\"x' -->]]>\n\x01\x7F &amp; \xFF\xC0\xAF "
    "\xED\xA0\x80 \xEF\xBF\xBF";

HtmlPage page_full_of(const std::string& text) {
  HtmlPage page(text);
  page.heading(1, text);
  page.boxed(Markup::text(text));
  page.heading(2, text);
  page.paragraph(text);
  page.list({text, text});
  page.pairs({{text, Markup::text(text)}});
  HtmlTable table(text, {{text, text}, {"number", text, CellKind::number}});
  table.add({text, text});
  page.table(table);
  page.figure({.svg = "", .why_missing = text}, text);
  page.verbatim(text);
  return page;
}

}  // namespace

TEST_CASE("Text from an input cannot become markup anywhere in a page", "[page]") {
  const std::string html = page_full_of(kHostile).html();
  CHECK(xml_complaints(html).empty());
  CHECK(html_complaints(html) == "");
  CHECK(html.find("<script") == std::string::npos);
  CHECK(html.find("alert(1)") != std::string::npos);  // it is shown
  CHECK(attribute_values(html, "onload").empty());
  CHECK(occurrences(html, "<h1>") == 1);
}

TEST_CASE("A page names its language, its characters and nothing outside itself", "[page]") {
  const std::string html = page_full_of("plain").html();
  CHECK(html.find("<!DOCTYPE html>") == 0);
  CHECK(attribute_values(html, "lang") == std::vector<std::string>{"en"});
  CHECK(html.find("<meta charset=\"utf-8\"/>") != std::string::npos);
  CHECK(html.find("@page") != std::string::npos);
  for (const char* const outside : {"src=", "href=", "@import", "url("}) {
    INFO(outside);
    CHECK(html.find(outside) == std::string::npos);
  }
}

TEST_CASE("Headings never skip a level", "[page]") {
  HtmlPage page("title");
  CHECK_THROWS_AS(page.heading(2, "too deep"), std::logic_error);
  page.heading(1, "one");
  page.heading(2, "two");
  page.heading(3, "three");
  page.heading(2, "two again");
  CHECK_THROWS_AS(page.heading(4, "too deep"), std::logic_error);
}

TEST_CASE("Every column and every row of a table has a heading with its scope", "[page]") {
  HtmlTable table("Caption",
                  {{"Time", "min", CellKind::number}, {"Force", "kN", CellKind::number}});
  table.add({"0", "1.5"});
  table.add({"30", "1.2"});
  const std::string html = table.markup().html();
  CHECK(occurrences(html, "<th scope=\"col\"") == 2);
  CHECK(occurrences(html, "<th scope=\"row\"") == 2);
  CHECK(occurrences(html, "<td") == 2);
  CHECK(html.find("<caption>Caption</caption>") != std::string::npos);
}

TEST_CASE("The contents list every heading of level 2 and link to it", "[page]") {
  HtmlPage page("title");
  page.heading(1, "one");
  page.contents();
  page.heading(2, "first <part>");
  page.heading(3, "no part");
  page.heading(2, "second");
  const std::string html = page.html();
  CHECK(attribute_values(html, "href") == std::vector<std::string>{"#part-1", "#part-2"});
  CHECK(occurrences(html, "id=\"part-") == 2);
  CHECK(html.find("#part-1\">first &lt;part&gt;</a>") < html.find("<h2"));
}

TEST_CASE("A page allows nothing to be fetched and no script but its own", "[page]") {
  HtmlPage page("title");
  page.heading(1, "one");
  CHECK(page.html().find("default-src 'none'; style-src 'unsafe-inline'; img-src data:; "
                         "script-src 'none'") != std::string::npos);
  page.script("let x = 1;\n");
  const std::string html = page.html();
  const std::string script = "\nlet x = 1;\n";
  CHECK(html.find("<script>" + script + "</script>") != std::string::npos);
  CHECK(html.find("script-src 'sha256-" + base64(sha256_bytes(script)) + "'\"") !=
        std::string::npos);
}

// RFC 4648, section 10: test vectors, from memory.
TEST_CASE("Bytes become base64", "[page]") {
  CHECK(base64("").empty());
  CHECK(base64("f") == "Zg==");
  CHECK(base64("fo") == "Zm8=");
  CHECK(base64("foobar") == "Zm9vYmFy");
  CHECK(base64(std::string("\xFF\x00\xFE", 3)) == "/wD+");
}

TEST_CASE("Lines of a verbatim text stay lines", "[page]") {
  HtmlPage page("title");
  page.verbatim("a = 1\n\n# \"two\" <three>\n");
  CHECK(page.html().find("<pre>a = 1\n\n# &quot;two&quot; &lt;three&gt;\n</pre>") !=
        std::string::npos);
}

TEST_CASE("Escaped text is valid UTF-8 that XML allows, whatever bytes come in", "[page]") {
  CHECK(xml_text("<&>\"'") == "&lt;&amp;&gt;&quot;&#39;");
  CHECK(xml_text("\xC3\xA4 \xE2\x82\xAC \xF0\x9D\x84\x9E") ==
        "\xC3\xA4 \xE2\x82\xAC \xF0\x9D\x84\x9E");
  const std::string replacement = "\xEF\xBF\xBD";
  CHECK(xml_text("\x80") == replacement);
  CHECK(xml_text("\xC3") == replacement);
  CHECK(xml_text("\xC0\xAF") == replacement + replacement);  // "/" in too many bytes
  CHECK(xml_text("\xEF\xBF\xBE") == replacement + replacement + replacement);
  CHECK(xml_text("a\tb\x1F") == "a b ");
  for (int first = 0; first < 256; ++first) {
    for (int second = 0; second < 256; second += 5) {
      const std::string bytes{static_cast<char>(first), static_cast<char>(second)};
      const std::string once = xml_text(bytes + "\x80\x80");
      // What is valid already passes unchanged but for the escapes.
      CHECK(occurrences(once, "\xEF\xBF\xBD") == occurrences(xml_text(once), "\xEF\xBF\xBD"));
    }
  }
}
