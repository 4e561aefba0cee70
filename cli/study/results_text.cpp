#include "cli/study/results_text.hpp"

#include <nlohmann/json.hpp>

#include "thermal/base/error.hpp"

namespace ringward::cli {
namespace {

using nlohmann::ordered_json;

constexpr const char* kSchema = "ringward-results/1";

}  // namespace

std::string header_line(const ResultsHeader& header) {
  ordered_json line{{"schema", kSchema},
                    {"program", {{"name", "ringward"}, {"version", header.version}}},
                    {"study_sha256", header.study_sha256},
                    {"layouts", header.layouts}};
  if (!header.kept_from.empty()) line["kept_from_version"] = header.kept_from;
  return line.dump() + "\n";
}

std::optional<ResultsHeader> header_of(const std::string& text) {
  const std::size_t end = text.find('\n');
  if (end == std::string::npos) return std::nullopt;
  try {
    const ordered_json line = ordered_json::parse(text.substr(0, end));
    if (line.at("schema") != kSchema) return std::nullopt;
    return ResultsHeader{.version = line.at("program").at("version").get<std::string>(),
                         .study_sha256 = line.at("study_sha256").get<std::string>(),
                         .layouts = line.at("layouts").get<std::size_t>(),
                         .kept_from = line.value("kept_from_version", std::string())};
  } catch (const ordered_json::exception&) {
    return std::nullopt;
  }
}

std::size_t read_rows(const std::string& text,
                      const std::function<void(const LayoutRow&, const std::string&)>& show) {
  std::size_t at = text.find('\n') + 1;
  for (std::size_t end = 0; (end = text.find('\n', at)) != std::string::npos; at = end + 1) {
    const std::string line = text.substr(at, end - at);
    try {
      show(row_of_line(line), line + "\n");
    } catch (const Error&) {
      break;
    }
  }
  return at;
}

}  // namespace ringward::cli
