#include "tests/cli/page/xml_check.hpp"

#include <regex>
#include <sstream>

#include "tests/cli/commands/run_process.hpp"

namespace ringward::testing {

std::string xml_complaints(const std::string& document) {
  const TemporaryFolder folder;
  write_content(folder / "document.xml", document);
  const ProcessResult xmllint =
      run_program({"xmllint", "--noout", "--nonet", folder / "document.xml"});
  if (xmllint.exit_code == 0) return "";
  return xmllint.err.empty() ? "xmllint did not run" : xmllint.err;
}

std::string html_complaints(const std::string& page) {
  const TemporaryFolder folder;
  write_content(folder / "page.html", page);
  const ProcessResult tidy = run_program({"tidy", "-errors", "-quiet", folder / "page.html"});
  if (tidy.exit_code > 2) return "tidy did not run";
  const std::regex of_svg("Warning: <(svg|title)> proprietary attribute");
  std::istringstream lines(tidy.err);
  std::string complaints;
  for (std::string line; std::getline(lines, line);) {
    if (!std::regex_search(line, of_svg)) complaints += line + "\n";
  }
  return complaints;
}

std::size_t occurrences(const std::string& text, const std::string& part) {
  std::size_t count = 0;
  for (std::size_t at = text.find(part); at != std::string::npos;
       at = text.find(part, at + part.size())) {
    ++count;
  }
  return count;
}

std::vector<std::string> attribute_values(const std::string& document, const std::string& name) {
  const std::regex attribute("\\s" + name + "=[\"']([^\"']*)[\"']");
  std::vector<std::string> values;
  for (std::sregex_iterator it(document.begin(), document.end(), attribute), end; it != end; ++it) {
    values.push_back((*it)[1]);
  }
  return values;
}

}  // namespace ringward::testing
