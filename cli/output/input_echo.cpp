#include "cli/output/input_echo.hpp"

#include <nlohmann/json.hpp>

namespace ringward::cli {
namespace {

using nlohmann::ordered_json;

struct ToJson {
  ordered_json operator()(std::monostate) const { return nullptr; }
  template <class Value>
  ordered_json operator()(const Value& value) const {
    return value;
  }
};

}  // namespace

ordered_json input_echo(const std::vector<EchoEntry>& echo) {
  ordered_json document = ordered_json::object();
  for (const EchoEntry& entry : echo) document[entry.key] = std::visit(ToJson{}, entry.value);
  return document;
}

}  // namespace ringward::cli
