#include "cli/dossier/pdf.hpp"

#include "cli/output/xml_text.hpp"
#include "cli/process/external_program.hpp"
#include "thermal/base/error.hpp"

namespace ringward::cli {

std::string pdf_of(const std::string& html) {
  const ProgramRun run = run_external({.name = "weasyprint",
                                       .arguments = {"--quiet", "--encoding", "utf-8", "-", "-"},
                                       .input = html});
  if (run.outcome == ProgramOutcome::not_installed) {
    throw Error(ErrorKind::cannot_write,
                "no PDF: WeasyPrint is not installed (Debian: apt install weasyprint)");
  }
  if (!run.succeeded() || run.out.rfind("%PDF", 0) != 0) {
    throw Error(ErrorKind::cannot_write, "no PDF: WeasyPrint failed: " + shortened(run.err, 400));
  }
  return run.out;
}

}  // namespace ringward::cli
