#include "cli/study/heat_key.hpp"

#include <algorithm>
#include <nlohmann/json.hpp>

#include "cli/input/schema.hpp"
#include "cli/input/sha256.hpp"
#include "cli/output/input_echo.hpp"

namespace ringward::cli {
namespace {

bool enters(const std::string& key) {
  const std::string spelt = schema_spelling(key);
  const auto& without = keys_without_heat();
  return std::none_of(without.begin(), without.end(), [&](const std::string& listed) {
    return listed.back() == '.' ? spelt.starts_with(listed) : spelt == listed;
  });
}

}  // namespace

const std::vector<std::string>& keys_without_heat() {
  static const std::vector<std::string> keys{"title",
                                             "tube.yield_MPa",
                                             "tube.role",
                                             "tube.end_gap_mm",
                                             "tube.friction",
                                             "tube.clear_height_mm",
                                             "core.strength_MPa",
                                             "bars[].",
                                             "steel_shape.yield_MPa",
                                             "confinement.",
                                             "member.",
                                             "load.",
                                             "rating.",
                                             "submission."};
  return keys;
}

std::string heat_key(const ColumnInput& input) {
  std::vector<EchoEntry> heat;
  std::copy_if(input.echo.begin(), input.echo.end(), std::back_inserter(heat),
               [](const EchoEntry& entry) { return enters(entry.key); });
  return sha256_hex(input_echo(heat).dump());
}

}  // namespace ringward::cli
