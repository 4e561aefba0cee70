#include "cli/output/json_number.hpp"

#include <cmath>
#include <nlohmann/json.hpp>

#include "cli/output/cautions.hpp"
#include "cli/output/numbers.hpp"

namespace ringward::cli {

using nlohmann::ordered_json;

ordered_json json_number(const std::optional<double>& value, int digits) {
  if (!value || !std::isfinite(*value)) return nullptr;
  return rounded(*value, digits);
}

ordered_json json_notices(const Notices& notices) {
  ordered_json list = ordered_json::array();
  for (const Notice& notice : ordered_notices(notices)) {
    list.push_back({{"code", notice.code},
                    {"severity", notice.severity == Severity::caution ? "caution" : "note"},
                    {"text", notice.text},
                    {"source", notice.source}});
  }
  return list;
}

std::string json_text(const ordered_json& document) {
  constexpr int kIndent = 2;
  return document.dump(kIndent, ' ', false, ordered_json::error_handler_t::replace) + "\n";
}

}  // namespace ringward::cli
