#include "cli/dossier/hand_check.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <cmath>
#include <map>

#include "mechanical/section/fibres.hpp"
#include "mechanical/section/hot_materials.hpp"
#include "thermal/base/units.hpp"

namespace ringward::cli {
namespace {

using mechanical::Fibre;
using thermal::Layer;

constexpr double kZone_C = 100;
// Table 6.1N has a point at 50 C.
constexpr double kColdPoint_C = 50;
constexpr double kNoticeableCooling_K = 0.5;

// Temperatures of all points: cells, then bars.
struct Points {
  std::vector<double> now_C;
  std::vector<double> peak_C;
};

Points points_at(const mechanical::Column& column, const thermal::TemperatureHistory& history,
                 double time_s) {
  const std::size_t cells = history.grid().cells.size();
  Points points{std::vector<double>(cells), std::vector<double>(cells)};
  history.temperatures_C(time_s, points.now_C);
  history.peak_temperatures_C(time_s, points.peak_C);
  const std::vector<double> now_C = points.now_C;
  const std::vector<double> peak_C = points.peak_C;
  for (const thermal::BarGroup& group : column.section.bars) {
    for (const thermal::Point& at : group.positions) {
      const thermal::Probe probe = history.core_probe(at);
      points.now_C.push_back(probe.T_C(now_C));
      points.peak_C.push_back(probe.T_C(peak_C));
    }
  }
  return points;
}

int zone_of(double T_C) {
  if (T_C < kColdPoint_C) return -1;
  return static_cast<int>(std::floor(T_C / kZone_C));
}

std::string zone_words(int zone) {
  if (zone < 0) return "20 to 50 C";
  if (zone == 0) return "50 to 100 C";
  return fmt::format("{:.0f} to {:.0f} C", zone * kZone_C, (zone + 1) * kZone_C);
}

/// Sums of one row while it is filled.
struct Sums {
  double area_m2 = 0;
  double area_times_C = 0;
  double force_N = 0;
};

/// Rows in the order of the list of parts, then of temperature.
class Collector {
 public:
  void add(std::size_t part, double T_C, double area_m2, double strength_Pa) {
    Sums& sums = sums_[{part, zone_of(T_C)}];
    sums.area_m2 += area_m2;
    sums.area_times_C += area_m2 * T_C;
    sums.force_N += area_m2 * strength_Pa;
  }

  void write(HandCheck& check, const std::vector<std::string>& names,
             const std::vector<double>& cold_Pa) const {
    for (const auto& [place, sums] : sums_) {
      const auto& [part, zone] = place;
      check.rows.push_back({.part = names[part],
                            .range = zone_words(zone),
                            .area_m2 = sums.area_m2,
                            .mean_C = sums.area_times_C / sums.area_m2,
                            .factor = sums.force_N / (sums.area_m2 * cold_Pa[part]),
                            .strength_Pa = cold_Pa[part],
                            .force_N = sums.force_N});
      check.total_N += sums.force_N;
    }
  }

 private:
  std::map<std::pair<std::size_t, int>, Sums> sums_;
};

/// The parts of a section, numbered in the order in which they are listed.
struct Parts {
  static constexpr std::size_t kConcrete = 0;
  static constexpr std::size_t kDisplaced = 1;
  static constexpr std::size_t kTube = 2;
  static constexpr std::size_t kShape = 3;
  static constexpr std::size_t kFirstGroup = 4;
  std::vector<std::string> names{"Concrete", "Concrete displaced by bars", "Tube", "Steel shape"};
  std::vector<double> cold_Pa;
  std::vector<std::size_t> group_of_bar;
};

Parts parts_of(const mechanical::Column& column) {
  const thermal::Section& section = column.section;
  const double concrete_Pa = section.core.strength_Pa / column.factors.concrete;
  const double tube_Pa = section.tube ? section.tube->yield_Pa : 0.0;
  const double shape_Pa = section.steel_shape ? section.steel_shape->yield_Pa : 0.0;
  Parts parts;
  parts.cold_Pa = {concrete_Pa, concrete_Pa, tube_Pa / column.factors.steel,
                   shape_Pa / column.factors.steel};
  for (std::size_t g = 0; g < section.bars.size(); ++g) {
    parts.names.push_back(section.bars.size() == 1 ? "Bars" : fmt::format("Bars, group {}", g + 1));
    parts.cold_Pa.push_back(section.bars[g].yield_Pa / column.factors.bar);
    parts.group_of_bar.insert(parts.group_of_bar.end(), section.bars[g].positions.size(), g);
  }
  return parts;
}

}  // namespace

HandCheck hand_check(const mechanical::Column& column, const thermal::TemperatureHistory& history,
                     double time_s) {
  const mechanical::HotMaterials hot = mechanical::SectionMaterials(column, history).at(time_s);
  const mechanical::FibreLayout layout =
      mechanical::fibre_layout(column.section, history.grid(), mechanical::Direction{1, 0});
  const Points points = points_at(column, history, time_s);
  const std::vector<thermal::Cell>& cells = history.grid().cells;
  const Parts parts = parts_of(column);
  HandCheck check{.time_s = time_s};
  Collector collector;
  const auto add = [&](std::size_t part, const Fibre& fibre, double strength_Pa) {
    collector.add(part, points.now_C[fibre.source], fibre.area_m2, strength_Pa);
    if (points.peak_C[fibre.source] > points.now_C[fibre.source] + kNoticeableCooling_K) {
      check.has_cooled = true;
    }
  };
  for (const Fibre& fibre : layout.concrete) {
    const bool displaced = fibre.source >= cells.size();
    add(displaced ? Parts::kDisplaced : Parts::kConcrete, fibre, hot.concrete[fibre.source].f_c_Pa);
  }
  for (const Fibre& fibre : layout.steel) {
    std::size_t part = Parts::kShape;
    if (fibre.source >= cells.size()) {
      part = Parts::kFirstGroup + parts.group_of_bar[fibre.source - cells.size()];
    } else if (cells[fibre.source].layer == Layer::tube) {
      part = Parts::kTube;
    }
    add(part, fibre, hot.steel[fibre.source].f_y_Pa);
  }
  collector.write(check, parts.names, parts.cold_Pa);
  return check;
}

}  // namespace ringward::cli
