#include "cli/input/section_reading.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <cmath>

#include "cli/input/bar_layout.hpp"
#include "thermal/base/units.hpp"

namespace ringward::cli {
namespace {

using namespace units;
using thermal::Section;
using thermal::Shape;

thermal::Outline read_outline(const InputValues& values) {
  const std::string shape = values.text("section.shape");
  const auto length_m = [&](const char* key) { return m_from_mm(values.number(key)); };
  if (shape == "square") {
    const double side_m = length_m("section.side_mm");
    return {Shape::square, side_m, side_m};
  }
  if (shape == "rectangular") {
    return {Shape::rectangular, length_m("section.width_mm"), length_m("section.depth_mm")};
  }
  const double diameter_m = length_m("section.diameter_mm");
  return {Shape::circular, diameter_m, diameter_m};
}

thermal::Tube read_tube(const InputValues& values) {
  return {.thickness_m = m_from_mm(values.number("tube.thickness_mm")),
          .yield_Pa = Pa_from_MPa(values.number("tube.yield_MPa")),
          .role = values.text("tube.role") == "composite" ? thermal::TubeRole::composite
                                                          : thermal::TubeRole::confining,
          .end_gap_m = m_from_mm(values.number("tube.end_gap_mm")),
          .friction = values.number("tube.friction"),
          .clear_height_m = m_from_mm(values.number("tube.clear_height_mm")),
          .contact_resistance_m2K_W = values.number("tube.contact_resistance_m2K_W")};
}

thermal::Core read_core(const InputValues& values) {
  const std::string limit = values.text("core.conductivity");
  return {.strength_Pa = Pa_from_MPa(values.number("core.strength_MPa")),
          .aggregate = values.text("core.aggregate") == "calcareous"
                           ? thermal::Aggregate::calcareous
                           : thermal::Aggregate::siliceous,
          .moisture_fraction = fraction_from_percent(values.number("core.moisture_percent")),
          .density_kg_m3 = values.number("core.density_kg_m3"),
          .conductivity = limit == "lower"    ? thermal::ConductivityLimit::lower
                          : limit == "joined" ? thermal::ConductivityLimit::joined
                                              : thermal::ConductivityLimit::upper};
}

thermal::SteelShape read_shape(const InputValues& values) {
  const auto length_m = [&](const char* leaf) {
    return m_from_mm(values.number(std::string("steel_shape.") + leaf));
  };
  return {.kind = values.text("steel_shape.kind") == "cross" ? thermal::SteelShapeKind::cross
                                                             : thermal::SteelShapeKind::i_section,
          .depth_m = length_m("depth_mm"),
          .width_m = length_m("width_mm"),
          .web_m = length_m("web_mm"),
          .flange_m = length_m("flange_mm"),
          .yield_Pa = Pa_from_MPa(values.number("steel_shape.yield_MPa")),
          .rotation_rad = rad_from_deg(values.number("steel_shape.rotation_deg"))};
}

PiecewiseLinear read_property(const InputValues& values, const std::string& key) {
  if (const auto* pairs = std::get_if<std::vector<NumberPair>>(&values.value(key))) {
    std::vector<PiecewiseLinear::Point> points;
    for (const NumberPair& pair : *pairs) points.push_back({pair[0], pair[1]});
    return PiecewiseLinear(std::move(points));
  }
  const double constant = values.number(key);
  return PiecewiseLinear(std::isnan(constant) ? 0.0 : constant);
}

thermal::Protection read_protection(const InputValues& values) {
  return {.thickness_m = m_from_mm(values.number("protection.thickness_mm")),
          .conductivity_W_mK = read_property(values, "protection.conductivity_W_mK"),
          .density_kg_m3 = values.number("protection.density_kg_m3"),
          .specific_heat_J_kgK = read_property(values, "protection.specific_heat_J_kgK"),
          .moisture_fraction = fraction_from_percent(values.number("protection.moisture_percent"))};
}

/// Reads one `[[bars]]` group: its keys, its layout, its positions.
class BarReader {
 public:
  BarReader(const Section& section, std::size_t group, InputValues& values, Problems& problems)
      : section_(section),
        prefix_(fmt::format("bars[{}].", group)),
        values_(values),
        problems_(problems) {}

  thermal::BarGroup read() {
    return {.diameter_m = m_from_mm(values_.number(prefix_ + "diameter_mm")),
            .yield_Pa = Pa_from_MPa(values_.number(prefix_ + "yield_MPa")),
            .forming = values_.text(prefix_ + "forming") == "cold-worked"
                           ? thermal::BarForming::cold_worked
                           : thermal::BarForming::hot_rolled,
            .positions = positions()};
  }

 private:
  void refuse(const std::string& leaf, const std::string& text) {
    problems_.add(values_.location(prefix_ + leaf), prefix_ + leaf, text);
  }

  std::vector<thermal::Point> positions() {
    if (!values_.given(prefix_ + "positions_mm")) return laid_out();
    for (const char* leaf : {"count", "axis_mm", "layout"}) {
      if (!values_.given(prefix_ + leaf)) continue;
      refuse(leaf,
             fmt::format("{} and positions_mm exclude each other; remove one of the two", leaf));
    }
    std::vector<thermal::Point> points;
    const auto* pairs =
        std::get_if<std::vector<NumberPair>>(&values_.value(prefix_ + "positions_mm"));
    if (pairs == nullptr) return points;
    for (const NumberPair& pair : *pairs) {
      points.push_back({m_from_mm(pair[0]), m_from_mm(pair[1])});
    }
    return points;
  }

  bool has_count_and_axis() {
    for (const char* leaf : {"count", "axis_mm"}) {
      if (values_.given(prefix_ + leaf)) continue;
      refuse(leaf, "missing; give count and axis_mm, or positions_mm = [[x, y], ...]");
    }
    return !std::isnan(values_.number(prefix_ + "count")) &&
           !std::isnan(values_.number(prefix_ + "axis_mm"));
  }

  std::string layout() {
    const std::string suited = section_.is_circular() ? "ring" : "perimeter";
    if (!values_.given(prefix_ + "layout")) values_.set_computed(prefix_ + "layout", suited);
    const std::string layout = values_.text(prefix_ + "layout");
    if (layout.empty() || section_.is_circular() == (layout == "ring")) return layout;
    const std::string shape = values_.text("section.shape");
    refuse("layout",
           fmt::format("\"{}\" does not suit a {} section; {}", layout, shape,
                       section_.is_circular() ? "use \"ring\" or positions_mm"
                                              : "use \"corners\", \"perimeter\" or positions_mm"));
    return {};
  }

  std::vector<thermal::Point> laid_out() {
    const std::string layout = this->layout();
    if (!has_count_and_axis() || layout.empty()) return {};
    const int count = static_cast<int>(values_.number(prefix_ + "count"));
    const double axis_m = m_from_mm(values_.number(prefix_ + "axis_mm"));
    const BarRectangle rectangle{section_.core_width_m() / 2 - axis_m,
                                 section_.core_depth_m() / 2 - axis_m};
    const double least_m = std::min(rectangle.half_width_m, rectangle.half_depth_m);
    // A tube that leaves no core is reported by itself.
    if (std::isnan(least_m) || least_m + axis_m <= 0) return {};
    if (least_m <= 0) {
      refuse("axis_mm",
             fmt::format("{:.6g} mm reaches the centre of the core or beyond; it must be below "
                         "half the core, {:.6g} mm",
                         mm_from_m(axis_m), mm_from_m(least_m + axis_m)));
      return {};
    }
    if (layout == "ring") {
      return ring_layout(count, least_m, rad_from_deg(values_.number(prefix_ + "start_deg")));
    }
    return on_rectangle(layout, count, rectangle);
  }

  std::vector<thermal::Point> on_rectangle(const std::string& layout, int count,
                                           const BarRectangle& rectangle) {
    if (layout == "corners" && count != 4) {
      refuse("count", fmt::format("{} bars in layout \"corners\"; it takes exactly 4; use "
                                  "\"perimeter\" for more",
                                  count));
      return {};
    }
    if (count < 4 || count % 2 != 0) {
      refuse("count", fmt::format("{} bars in layout \"perimeter\"; it takes an even count of at "
                                  "least 4; use positions_mm for anything else",
                                  count));
      return {};
    }
    return perimeter_layout(count, rectangle);
  }

  const Section& section_;
  std::string prefix_;
  InputValues& values_;
  Problems& problems_;
};

}  // namespace

Section read_section(InputValues& values, Problems& problems) {
  Section section;
  section.outline = read_outline(values);
  if (values.has_table("tube")) section.tube = read_tube(values);
  section.core = read_core(values);
  if (values.has_table("steel_shape")) section.steel_shape = read_shape(values);
  const bool has_layer = values.number("protection.thickness_mm") > 0;
  if (values.has_table("protection") && has_layer) section.protection = read_protection(values);
  if (values.text("section.shape").empty()) return section;
  for (std::size_t i = 0; i < values.group_count("bars"); ++i) {
    if (!values.has_table(fmt::format("bars[{}]", i))) continue;
    section.bars.push_back(BarReader(section, i, values, problems).read());
  }
  return section;
}

}  // namespace ringward::cli
