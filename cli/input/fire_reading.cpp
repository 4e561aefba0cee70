#include "cli/input/fire_reading.hpp"

#include <fmt/format.h>

#include <cmath>
#include <fstream>
#include <iterator>

#include "cli/input/exposure_reading.hpp"
#include "cli/input/fire_points_csv.hpp"
#include "thermal/base/error.hpp"
#include "thermal/base/units.hpp"

namespace ringward::cli {
namespace {

using namespace units;

class CurveReader {
 public:
  CurveReader(const InputValues& values, const std::filesystem::path& folder, Problems& problems)
      : values_(values), folder_(folder), problems_(problems) {}

  fires::FireCurvePtr read() {
    const std::string name = values_.text("fire.curve");
    if (name.empty()) return nullptr;
    try {
      if (name == "parametric") return parametric();
      if (name == "table") return table();
      if (name == "constant") return constant();
      return fires::nominal_curve(name);
    } catch (const Error& error) {
      problems_.add(values_.location("fire.curve"), "fire.curve", error.what());
      return nullptr;
    }
  }

  [[nodiscard]] const std::string& csv_text() const { return csv_text_; }

 private:
  fires::FireCurvePtr parametric() const {
    const std::string prefix = "fire.parametric.";
    const std::string growth = values_.text(prefix + "growth");
    const fires::ParametricFire fire{
        .opening_factor_m05 = values_.number(prefix + "opening_m05"),
        .fire_load_enclosure_J_m2 = 1e6 * values_.number(prefix + "fire_load_enclosure_MJ_m2"),
        .thermal_inertia_J_m2s05K = values_.number(prefix + "thermal_inertia_J_m2s05K"),
        .growth = growth == "slow"   ? fires::GrowthRate::slow
                  : growth == "fast" ? fires::GrowthRate::fast
                                     : fires::GrowthRate::medium};
    const double all =
        fire.opening_factor_m05 * fire.fire_load_enclosure_J_m2 * fire.thermal_inertia_J_m2s05K;
    return std::isnan(all) ? nullptr : fires::parametric_curve(fire);
  }

  fires::FireCurvePtr constant() const {
    const double T_C = values_.number("fire.constant_C");
    return std::isnan(T_C) ? nullptr : fires::constant_curve(T_C);
  }

  fires::FireCurvePtr table() {
    const bool has_points = values_.given("fire.points_min_C");
    const bool has_csv = values_.given("fire.points_csv");
    if (has_points == has_csv) {
      const std::string key = has_csv ? "fire.points_csv" : "fire.points_min_C";
      problems_.add(values_.location(key), key,
                    has_csv ? "points_csv and points_min_C exclude each other; remove one of the "
                              "two"
                            : "missing; curve = \"table\" needs points_min_C = [[min, C], ...] or "
                              "points_csv = \"file.csv\"");
      return nullptr;
    }
    if (has_csv) return curve_of(from_csv());
    const auto* pairs = std::get_if<std::vector<NumberPair>>(&values_.value("fire.points_min_C"));
    return pairs == nullptr ? nullptr : curve_of(*pairs);
  }

  static fires::FireCurvePtr curve_of(const std::vector<NumberPair>& pairs) {
    if (pairs.empty()) return nullptr;
    std::vector<fires::TablePoint> points;
    for (const NumberPair& pair : pairs) points.push_back({s_from_min(pair[0]), pair[1]});
    return fires::table_curve(std::move(points));
  }

  std::vector<NumberPair> from_csv() {
    const std::string name = values_.text("fire.points_csv");
    const Location where = values_.location("fire.points_csv");
    if (name.empty()) {
      if (std::holds_alternative<std::string>(values_.value("fire.points_csv"))) {
        problems_.add(where, "fire.points_csv", "the name is empty; give the path of a CSV file");
      }
      return {};
    }
    const std::filesystem::path path = folder_ / name;
    std::error_code ignored;
    std::ifstream file(path, std::ios::binary);
    if (!file || std::filesystem::is_directory(path, ignored)) {
      problems_.add(
          where, "fire.points_csv",
          fmt::format("\"{}\" cannot be read; the path is relative to the column file", name));
      return {};
    }
    csv_text_.assign(std::istreambuf_iterator<char>(file), std::istreambuf_iterator<char>());
    std::vector<std::string> mistakes;
    auto points =
        parse_fire_points(csv_text_, name, find_key("fire.points_min_C")->range, mistakes);
    for (const std::string& mistake : mistakes) problems_.add_foreign(where, mistake);
    return mistakes.empty() ? points : std::vector<NumberPair>{};
  }

  const InputValues& values_;
  const std::filesystem::path& folder_;
  Problems& problems_;
  std::string csv_text_;
};

}  // namespace

FireReading read_fire(InputValues& values, const std::filesystem::path& folder,
                      Problems& problems) {
  FireReading reading;
  reading.exposure.exposed = read_exposed_parts(values, problems);
  CurveReader curve(values, folder, problems);
  reading.curve = curve.read();
  reading.csv_text = curve.csv_text();
  reading.exposure.duration_s = s_from_min(values.number("fire.duration_min"));
  if (reading.curve && !values.given("fire.surface.convection_W_m2K")) {
    values.set_computed("fire.surface.convection_W_m2K", reading.curve->convection_W_m2K());
  }
  reading.exposure.surface = {.convection_W_m2K = values.number("fire.surface.convection_W_m2K"),
                              .emissivity = values.number("fire.surface.emissivity")};
  reading.exposure.ambient = {.temperature_C = values.number("fire.ambient.temperature_C"),
                              .convection_W_m2K = values.number("fire.ambient.convection_W_m2K")};
  if (reading.curve && problems.empty()) {
    reading.exposure.gas = fires::gas_temperature(reading.curve, reading.exposure.duration_s);
  }
  return reading;
}

}  // namespace ringward::cli
