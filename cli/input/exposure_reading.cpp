#include "cli/input/exposure_reading.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <array>
#include <cmath>
#include <optional>

#include "thermal/base/units.hpp"

namespace ringward::cli {
namespace {

using thermal::FaceCondition;

// In the order of thermal::Face.
constexpr std::array<const char*, 4> kFaces = {"left", "right", "bottom", "top"};

// Angles are typed in degrees; this much rounding is no overlap.
constexpr double kTouch_deg = 1e-9;

class ExposureReader {
 public:
  ExposureReader(const InputValues& values, Problems& problems)
      : values_(values), problems_(problems) {}

  thermal::ExposedParts read() {
    const std::string shape = values_.text("section.shape");
    if (shape.empty()) return {};
    return shape == "circular" ? read_arcs() : read_faces(shape);
  }

 private:
  void refuse(const std::string& key, const std::string& text) {
    problems_.add(values_.location(key), key, text);
  }

  const std::vector<std::string>* list(const std::string& key) const {
    return std::get_if<std::vector<std::string>>(&values_.value(key));
  }

  thermal::ExposedParts read_faces(const std::string& shape) {
    for (const char* key : {"fire.arc_deg", "fire.built_in_arc_deg"}) {
      if (!values_.given(key)) continue;
      refuse(key, fmt::format("an arc belongs to circular sections, this one is {}; list faces "
                              "with exposed and built_in",
                              shape));
    }
    thermal::ExposedParts parts;
    const auto* exposed = list("fire.exposed");
    const auto* built_in = list("fire.built_in");
    for (std::size_t i = 0; i < kFaces.size(); ++i) {
      const auto names = [&](const std::vector<std::string>* faces) {
        return faces != nullptr &&
               std::find(faces->begin(), faces->end(), kFaces[i]) != faces->end();
      };
      const bool is_heated = exposed == nullptr || names(exposed);
      const bool is_built_in = names(built_in);
      if (is_heated && is_built_in) report_both(kFaces[i]);
      parts.faces[i] = is_heated     ? FaceCondition::heated
                       : is_built_in ? FaceCondition::built_in
                                     : FaceCondition::ambient;
    }
    if (exposed != nullptr && exposed->empty()) report_unheated();
    return parts;
  }

  void report_both(const std::string& face) {
    refuse("fire.built_in",
           fmt::format("the face \"{}\" is both exposed and built in; list only the heated faces "
                       "in exposed",
                       face));
  }

  void report_unheated() {
    refuse("fire.exposed", "no face is heated; list at least one face or use \"all\"");
  }

  /// An arc with `to` raised by full turns until it is above `from` [deg].
  std::optional<NumberPair> arc(const std::string& key) {
    const auto* given = std::get_if<NumberPair>(&values_.value(key));
    if (given == nullptr) return std::nullopt;
    auto [from, to] = *given;
    if (from == to) {
      refuse(key, fmt::format("[{}, {}] is an arc of zero; leave it out for none, or write [0, "
                              "360] for the whole circle",
                              from, to));
      return std::nullopt;
    }
    while (to <= from) to += 360;
    if (to - from > 360) {
      refuse(key, fmt::format("[{}, {}] covers {} deg; an arc covers at most 360 deg", from, to,
                              to - from));
      return std::nullopt;
    }
    return NumberPair{from, to};
  }

  thermal::ExposedParts read_arcs() {
    check_no_faces();
    const auto heated = arc("fire.arc_deg");
    const auto built_in = arc("fire.built_in_arc_deg");
    thermal::ExposedParts parts;
    if (heated) parts.heated_arc = radians(*heated);
    if (built_in) parts.built_in_arc = radians(*built_in);
    if (built_in) check_overlap(heated, *built_in);
    return parts;
  }

  void check_no_faces() {
    if (list("fire.exposed") != nullptr) {
      refuse("fire.exposed",
             "a circular section has no faces; use arc_deg = [from, to], e.g. [0, 180]");
    } else if (values_.given("fire.exposed") && values_.given("fire.arc_deg")) {
      refuse("fire.exposed", "exposed and arc_deg exclude each other; remove one of the two");
    }
    if (values_.given("fire.built_in")) {
      refuse("fire.built_in", "a circular section has no faces; use built_in_arc_deg = [from, to]");
    }
  }

  static thermal::Arc radians(const NumberPair& arc) {
    return {units::rad_from_deg(arc[0]), units::rad_from_deg(arc[1])};
  }

  void check_overlap(const std::optional<NumberPair>& heated, const NumberPair& built_in) {
    if (!heated) {
      if (values_.given("fire.arc_deg")) return;
      return refuse("fire.built_in_arc_deg",
                    "the column is heated all round, so the built-in arc is heated too; give the "
                    "heated arc with arc_deg");
    }
    const double length = (*heated)[1] - (*heated)[0];
    double start = std::fmod(built_in[0] - (*heated)[0], 360.0);
    if (start < 0) start += 360.0;
    const double end = start + built_in[1] - built_in[0];
    const bool starts_inside = start < length - kTouch_deg;
    const bool runs_round_into_it = end > 360.0 + kTouch_deg;
    if (!starts_inside && !runs_round_into_it) return;
    refuse("fire.built_in_arc_deg",
           fmt::format("[{}, {}] overlaps the heated arc [{}, {}]; an arc is either heated or "
                       "built in, so shorten one of them",
                       built_in[0], built_in[1], (*heated)[0], (*heated)[1]));
  }

  const InputValues& values_;
  Problems& problems_;
};

}  // namespace

thermal::ExposedParts read_exposed_parts(const InputValues& values, Problems& problems) {
  return ExposureReader(values, problems).read();
}

}  // namespace ringward::cli
