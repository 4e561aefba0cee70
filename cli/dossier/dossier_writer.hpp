#pragma once

#include <cstddef>
#include <string>

#include "cli/dossier/dossier_data.hpp"
#include "cli/page/html_page.hpp"

namespace ringward::cli {

/// The page while it is written, with its running numbers.
struct DossierWriter {
  HtmlPage& page;
  const DossierData& data;
  std::size_t parts = 0;
  std::size_t figures = 0;
  std::size_t tables = 0;
  std::string cited = {};  ///< everything that names a source, for the list of them

  /// A paragraph that names sources.
  void citing_paragraph(const std::string& text) {
    cited += text + "\n";
    page.paragraph(text);
  }

  /// Heading of the next part.
  void part(const std::string& text) { page.heading(2, std::to_string(++parts) + "  " + text); }
  [[nodiscard]] std::string figure_caption(const std::string& text) {
    return "Figure " + std::to_string(++figures) + ". " + text;
  }
  [[nodiscard]] std::string table_caption(const std::string& text) {
    return "Table " + std::to_string(++tables) + ". " + text;
  }
};

// The parts, in the order of the page.
void write_title(DossierWriter& writer);
void write_claim(DossierWriter& writer);
void write_section(DossierWriter& writer);
void write_input(DossierWriter& writer);
void write_assumptions(DossierWriter& writer);
void write_method(DossierWriter& writer);
void write_temperatures(DossierWriter& writer);
void write_capacity(DossierWriter& writer);
void write_tube(DossierWriter& writer);
void write_hand_check(DossierWriter& writer);
void write_evidence(DossierWriter& writer);
void write_limits(DossierWriter& writer);
void write_checklist(DossierWriter& writer);
void write_reproduction(DossierWriter& writer);
/// The sources that the parts before have cited.
void write_sources(DossierWriter& writer);

}  // namespace ringward::cli
