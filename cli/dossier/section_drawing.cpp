#include "cli/dossier/section_drawing.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <cmath>
#include <string>
#include <vector>

#include "cli/dossier/svg_parts.hpp"
#include "cli/output/numbers.hpp"
#include "cli/output/picture_outlines.hpp"
#include "thermal/base/units.hpp"

namespace ringward::cli {
namespace {

using thermal::BarGroup;
using thermal::Outline;
using thermal::Section;

constexpr double kWidth_px = 605;
constexpr double kPx_per_paper_m = 96.0 / 0.0254;
constexpr double kMostPaper_m = 0.085;
constexpr double kLeft_px = 62;  ///< room for the dimension of the depth
constexpr double kTop_px = 26;
constexpr double kBelow_px = 64;
constexpr double kLine_px = 17;

std::string mm(double length_m) { return shortest(rounded(units::mm_from_m(length_m), 2)); }
std::string MPa(double stress_Pa) {
  return shortest(rounded(units::MPa_from_Pa(stress_Pa), 2)) + " MPa";
}

/// A part with the point that its number stands at, in m from the centroid.
struct Part {
  thermal::Point at;
  std::vector<std::string> words;
};

/// A point of the outline moved inwards by `depth_m`, to the upper right where leaders do not cross
/// the section.
thermal::Point near_outline(const Outline& outline, double depth_m, double turn_rad) {
  const double x = outline.width_m / 2;
  const double y = outline.depth_m / 2;
  if (outline.shape == thermal::Shape::circular) {
    return {(x - depth_m) * std::cos(turn_rad), (x - depth_m) * std::sin(turn_rad)};
  }
  return {x - depth_m, y * std::sin(turn_rad)};
}

std::string role_words(const thermal::Tube& tube) {
  return tube.role == thermal::TubeRole::confining
             ? "confining: end gaps " + mm(tube.end_gap_m) + " mm"
             : "composite: loaded with the core";
}

double least_axis_m(const Section& section, const BarGroup& group) {
  const double x = section.core_width_m() / 2;
  const double y = section.core_depth_m() / 2;
  double least = x + y;
  for (const thermal::Point& at : group.positions) {
    const double distance = section.is_circular()
                                ? x - std::hypot(at.x_m, at.y_m)
                                : std::min(x - std::abs(at.x_m), y - std::abs(at.y_m));
    least = std::min(least, distance);
  }
  return least;
}

/// The bar farthest to the right, the upper one of two.
thermal::Point shown_bar(const BarGroup& group) {
  return *std::max_element(group.positions.begin(), group.positions.end(),
                           [](const thermal::Point& a, const thermal::Point& b) {
                             return a.x_m + 0.1 * a.y_m < b.x_m + 0.1 * b.y_m;
                           });
}

Part bar_part(const Section& section, const BarGroup& group) {
  const double axis_m = least_axis_m(section, group);
  return {shown_bar(group),
          {fmt::format("{} bars {} mm, {}", group.positions.size(), mm(group.diameter_m),
                       MPa(group.yield_Pa)),
           fmt::format("axis {} mm from the core face,", mm(axis_m)),
           fmt::format("concrete cover {} mm", mm(axis_m - group.diameter_m / 2))}};
}

std::vector<Part> parts_of(const Section& section) {
  std::vector<Part> parts;
  const Outline overall = overall_outline(section);
  if (section.protection) {
    parts.push_back({near_outline(overall, section.protection->thickness_m / 2, 1.15),
                     {fmt::format("protection {} mm", mm(section.protection->thickness_m))}});
  }
  if (section.tube) {
    parts.push_back({near_outline(section.outline, section.tube_thickness_m() / 2, 0.85),
                     {fmt::format("tube {} mm, {}", mm(section.tube_thickness_m()),
                                  MPa(section.tube->yield_Pa)),
                      role_words(*section.tube)}});
  }
  for (const BarGroup& group : section.bars) parts.push_back(bar_part(section, group));
  if (section.steel_shape) {
    const thermal::SteelShape& shape = *section.steel_shape;
    parts.push_back({{0, 0},
                     {fmt::format("{} shape {} x {} mm,",
                                  shape.kind == thermal::SteelShapeKind::cross ? "cross" : "I",
                                  mm(shape.depth_m), mm(shape.width_m)),
                      fmt::format("web {} mm, flange {} mm, {}", mm(shape.web_m),
                                  mm(shape.flange_m), MPa(shape.yield_Pa))}});
  }
  parts.push_back(
      {near_outline(section.outline, 0.33 * section.outline.width_m, -0.9),
       {"concrete " + MPa(section.core.strength_Pa) + " (cylinder),",
        section.core.aggregate == thermal::Aggregate::siliceous ? "siliceous aggregate"
                                                                : "calcareous aggregate"}});
  return parts;
}

/// Draws in px from the top left corner.
class Sheet {
 public:
  Sheet(const Outline& overall, double px_per_m)
      : px_per_m_(px_per_m),
        width_px_(overall.width_m * px_per_m),
        depth_px_(overall.depth_m * px_per_m) {}

  [[nodiscard]] PicturePoint at(const thermal::Point& point) const {
    return {centre_x() + point.x_m * px_per_m_, centre_y() - point.y_m * px_per_m_};
  }
  [[nodiscard]] double centre_x() const { return kLeft_px + width_px_ / 2; }
  [[nodiscard]] double centre_y() const { return kTop_px + depth_px_ / 2; }
  [[nodiscard]] double right() const { return kLeft_px + width_px_; }
  [[nodiscard]] double bottom() const { return kTop_px + depth_px_; }

  [[nodiscard]] std::string width_dimension(const std::string& words) const {
    const double y = bottom() + 30;
    return fmt::format(
               "<path d=\"M{0:.1f} {2:.1f} V{4:.1f} M{1:.1f} {2:.1f} V{4:.1f} M{0:.1f} {3:.1f} "
               "H{1:.1f}\" fill=\"none\" stroke=\"#000\" stroke-width=\"0.8\"/>\n",
               kLeft_px, right(), y - 14, y, y + 5) +
           ticks({kLeft_px, y}) + ticks({right(), y}) +
           svg_text({centre_x(), y + 15}, "text-anchor=\"middle\" font-size=\"11\"", words);
  }

  [[nodiscard]] std::string depth_dimension(const std::string& words) const {
    const double x = kLeft_px - 30;
    return fmt::format(
               "<path d=\"M{2:.1f} {0:.1f} H{4:.1f} M{2:.1f} {1:.1f} H{4:.1f} M{3:.1f} {0:.1f} "
               "V{1:.1f}\" fill=\"none\" stroke=\"#000\" stroke-width=\"0.8\"/>\n",
               kTop_px, bottom(), x + 14, x, x - 5) +
           ticks({x, kTop_px}) + ticks({x, bottom()}) +
           svg_text({0, 0},
                    fmt::format("text-anchor=\"middle\" font-size=\"11\" "
                                "transform=\"translate({:.1f} {:.1f}) rotate(-90)\"",
                                x - 9, centre_y()),
                    words);
  }

 private:
  static std::string ticks(const PicturePoint& at) {
    return fmt::format(
        "<path d=\"M{:.1f} {:.1f} l6 -6\" stroke=\"#000\" stroke-width=\"1.4\" "
        "fill=\"none\"/>\n",
        at.x - 3, at.y + 3);
  }

  double px_per_m_;
  double width_px_;
  double depth_px_;
};

std::string balloon(const PicturePoint& at, std::size_t number) {
  return fmt::format(
             "<circle cx=\"{:.1f}\" cy=\"{:.1f}\" r=\"8\" fill=\"#fff\" stroke=\"#000\"/>\n", at.x,
             at.y) +
         svg_text({at.x, at.y + 4}, "text-anchor=\"middle\" font-size=\"11\"",
                  std::to_string(number));
}

std::string leader(const PicturePoint& from, const PicturePoint& to) {
  return fmt::format(
      "<path d=\"M{:.1f} {:.1f} L{:.1f} {:.1f}\" stroke=\"#000\" stroke-width=\"0.7\" "
      "fill=\"none\"/>\n<circle cx=\"{:.1f}\" cy=\"{:.1f}\" r=\"1.8\"/>\n",
      from.x, from.y, to.x, to.y, from.x, from.y);
}

/// The list of parts to the right, each with a line to its place.
std::string part_list(const std::vector<Part>& parts, const Sheet& sheet) {
  std::string drawn;
  const double x = sheet.right() + 36;
  double y = kTop_px + 6;
  for (std::size_t i = 0; i < parts.size(); ++i) {
    drawn += leader(sheet.at(parts[i].at), {x, y}) + balloon({x, y}, i + 1);
    for (const std::string& line : parts[i].words) {
      drawn += svg_text({x + 16, y + 4}, "font-size=\"11.5\"", line);
      y += kLine_px;
    }
    y += 9;
  }
  return drawn;
}

std::string fire_key(const PicturePoint& at) {
  return fmt::format(
             "<path d=\"M{:.1f} {:.1f} h36\" stroke=\"#000\" stroke-width=\"3\" "
             "stroke-dasharray=\"7 4\"/>\n",
             at.x, at.y) +
         svg_text({at.x + 44, at.y + 4}, "font-size=\"11\"", "sees the fire");
}

double list_height(const std::vector<Part>& parts) {
  double height = kTop_px + 20;
  for (const Part& part : parts) {
    height += kLine_px * static_cast<double>(part.words.size()) + 9;
  }
  return height;
}

}  // namespace

int drawing_scale(const Section& section) {
  const Outline overall = overall_outline(section);
  const double longer = std::max(overall.width_m, overall.depth_m);
  for (const int scale : {1, 2, 5, 10, 20, 50, 100}) {
    if (longer / scale <= kMostPaper_m) return scale;
  }
  return 200;
}

Picture section_drawing(const PictureAbout& about, const Section& section,
                        const thermal::ExposedParts& exposed) {
  const Outline overall = overall_outline(section);
  const double px_per_m = kPx_per_paper_m / drawing_scale(section);
  const Sheet sheet(overall, px_per_m);
  const std::vector<Part> parts = parts_of(section);
  const double height = std::max(sheet.bottom() + kBelow_px, list_height(parts));
  std::string svg = svg_opening(about, kWidth_px, height);
  svg += fmt::format("<g transform=\"translate({:.2f} {:.2f})\">\n", sheet.centre_x(),
                     sheet.centre_y()) +
         section_outlines(section, px_per_m) + heated_outline(section, exposed, px_per_m) +
         "</g>\n";
  const std::string sign = section.is_circular() ? "\xC3\x98 " : "";
  svg += sheet.width_dimension(sign + mm(overall.width_m));
  if (!section.is_circular()) svg += sheet.depth_dimension(mm(overall.depth_m));
  svg += part_list(parts, sheet) + fire_key({sheet.right() + 38, sheet.bottom() + 41});
  return {.svg = svg + "</svg>\n", .why_missing = ""};
}

}  // namespace ringward::cli
