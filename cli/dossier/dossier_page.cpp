#include "cli/dossier/dossier_page.hpp"

#include "cli/dossier/dossier_writer.hpp"
#include "cli/dossier/temperature_map.hpp"

namespace ringward::cli {

std::string dossier_html(const DossierData& data) {
  const std::string& title = data.report.input.title;
  HtmlPage page("Fire resistance of a column" + (title.empty() ? "" : ": " + title));
  DossierWriter writer{page, data};
  write_title(writer);
  for (const auto write :
       {write_claim, write_section, write_input, write_assumptions, write_method,
        write_temperatures, write_capacity, write_tube, write_hand_check, write_evidence,
        write_limits, write_checklist, write_reproduction, write_sources}) {
    write(writer);
  }
  page.script(map_script());
  return page.html();
}

}  // namespace ringward::cli
