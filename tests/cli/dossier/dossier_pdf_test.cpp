#include <catch2/catch.hpp>
#include <chrono>
#include <cmath>
#include <cstdio>
#include <nlohmann/json.hpp>
#include <thread>

#include "cli/dossier/pdf.hpp"
#include "tests/cli/commands/run_process.hpp"
#include "tests/cli/dossier/dossier_columns.hpp"
#include "tests/cli/page/xml_check.hpp"

using namespace ringward::testing;
using nlohmann::ordered_json;

namespace {

std::string output_of(const std::vector<std::string>& command) {
  const ProcessResult result = run_program(command);
  INFO(command.front() << ": " << result.err);
  REQUIRE(result.exit_code == 0);
  return result.out;
}

}  // namespace

TEST_CASE("The PDF opens, has text, page numbers and bookmarks, and holds rate's numbers",
          "[dossier]") {
  const TemporaryFolder folder;
  write_content(folder / "c.toml", submitted_column());
  const ProcessResult result =
      run_ringward({"dossier", folder / "c.toml", "-o", folder / "c.html", "--pdf",
                    folder / "c.pdf", "--json", folder / "c.json"});
  INFO(result.err);
  REQUIRE(result.exit_code == 1);
  const std::string text = output_of({"pdftotext", "-layout", folder / "c.pdf", "-"});
  const ordered_json rate = ordered_json::parse(file_content(folder / "c.json"));
  const double resistance_min = rate["rating"]["fire_resistance_min"];
  char shown[32];
  std::snprintf(shown, sizeof shown, "%.1f", std::floor(resistance_min * 10 + 1e-6) / 10);
  CHECK(text.find("Fire resistance " + std::string(shown) + " min") != std::string::npos);
  CHECK(text.find(rate["input_sha256"].get<std::string>()) != std::string::npos);
  for (const ordered_json& state : rate["history"]) {
    if (state["time_min"] != 15) continue;
    std::snprintf(shown, sizeof shown, "%.1f", state["capacity_kN"].get<double>());
    CHECK(text.find(shown) != std::string::npos);
  }

  SECTION("The same input gives the same bytes, also a second later") {
    std::this_thread::sleep_for(std::chrono::milliseconds(1100));
    write_content(folder / "again.pdf", ringward::cli::pdf_of(file_content(folder / "c.html")));
    const bool same = file_content(folder / "again.pdf") == file_content(folder / "c.pdf");
    CHECK(same);  // not printed: the files are long
  }
  const std::string information = output_of({"pdfinfo", folder / "c.pdf"});
  CHECK(information.find("A4") != std::string::npos);
  const std::size_t at = information.find("Pages:");
  REQUIRE(at != std::string::npos);
  const int pages = std::stoi(information.substr(at + 6));
  // As many as the parts need; a page that breaks apart would need many more.
  CHECK(pages >= 10);
  CHECK(pages <= 22);
  for (int page = 1; page <= pages; ++page) {
    const std::string number = "Page " + std::to_string(page) + " of " + std::to_string(pages);
    INFO(number);
    CHECK(text.find(number) != std::string::npos);
  }
  // Bookmarks: one a heading.
  const std::string outline =
      output_of({"qpdf", "--json", "--json-key=outlines", folder / "c.pdf"});
  for (const char* const title : {"What is claimed", "Temperatures", "Hand check", "Sources"}) {
    INFO(title);
    CHECK(outline.find(title) != std::string::npos);
  }
}

TEST_CASE("Without WeasyPrint the page is kept, and the way to the PDF is told", "[dossier]") {
  const TemporaryFolder folder;
  const ProcessResult result =
      run_ringward({"dossier", "-", "-o", folder / "c.html", "--pdf", folder / "c.pdf"},
                   {.stdin_text = submitted_column(), .variables = {{"PATH", "/nonexistent"}}});
  CHECK(result.exit_code == 5);
  CHECK(result.err.find("apt install weasyprint") != std::string::npos);
  CHECK(result.err.find("c.html") != std::string::npos);
  CHECK(folder.names() == std::vector<std::string>{"c.html"});
  CHECK(xml_complaints(file_content(folder / "c.html")).empty());
}
