#include "cli/input/member_reading.hpp"

#include <fmt/format.h>

#include <cmath>

#include "thermal/base/units.hpp"

namespace ringward::cli {
namespace {

using namespace units;
using mechanical::ConfinementModel;

class MemberReader {
 public:
  MemberReader(InputValues& values, Problems& problems) : values_(values), problems_(problems) {}

  void read_tube_height(thermal::Tube& tube) {
    const double length_mm = values_.number("member.length_mm");
    const double gaps_mm = 2 * values_.number("tube.end_gap_mm");
    if (!values_.given("tube.clear_height_mm")) {
      if (std::isnan(length_mm - gaps_mm)) return;
      if (length_mm <= gaps_mm) return report_gaps(length_mm, gaps_mm);
      values_.set_computed("tube.clear_height_mm", length_mm - gaps_mm);
      tube.clear_height_m = m_from_mm(length_mm - gaps_mm);
      return;
    }
    const double height_mm = values_.number("tube.clear_height_mm");
    const bool is_cut = tube.role == thermal::TubeRole::confining;
    if (is_cut && height_mm + gaps_mm > length_mm + kTouch_mm) {
      refuse("tube.clear_height_mm",
             fmt::format("{} mm with two end gaps of {} mm is longer than member.length_mm, {} mm; "
                         "at most {} mm",
                         height_mm, gaps_mm / 2, length_mm, length_mm - gaps_mm));
    }
  }

  ConfinementModel read_confinement(const thermal::Section& section) {
    const bool is_round = values_.text("section.shape") == "circular";
    const bool is_cut = section.tube && section.tube->role == thermal::TubeRole::confining;
    if (!values_.given("confinement.model")) {
      values_.set_computed("confinement.model",
                           std::string(is_round && is_cut ? "contact" : "none"));
    }
    const std::string model = values_.text("confinement.model");
    if (model.empty() || model == "none") return ConfinementModel::none;
    if (!(is_round && is_cut) && !values_.text("section.shape").empty()) {
      refuse("confinement.model",
             fmt::format("\"{}\" holds for circular confining tubes only, this column is {}; use "
                         "\"none\"",
                         model, kind_of_column(section)));
    }
    return model == "yield" ? ConfinementModel::yield : ConfinementModel::contact;
  }

  mechanical::Member read_member() {
    const double length_mm = values_.number("member.length_mm");
    const bool has_length = values_.given("member.buckling_length_mm");
    if (has_length && values_.given("member.buckling_factor")) {
      refuse("member.buckling_factor",
             fmt::format("buckling_factor = {} and buckling_length_mm = {} mm exclude each other; "
                         "remove one of the two",
                         values_.number("member.buckling_factor"),
                         values_.number("member.buckling_length_mm")));
    }
    if (has_length) {
      compute("member.buckling_factor", values_.number("member.buckling_length_mm") / length_mm);
    } else {
      compute("member.buckling_length_mm", values_.number("member.buckling_factor") * length_mm);
    }
    if (!values_.given("member.imperfection_mm")) {
      compute("member.imperfection_mm", values_.number("member.buckling_length_mm") / 400);
    }
    return {.length_m = m_from_mm(length_mm),
            .buckling_length_m = m_from_mm(values_.number("member.buckling_length_mm")),
            .imperfection_m = m_from_mm(values_.number("member.imperfection_mm"))};
  }

  mechanical::Load read_load(const thermal::Section& section) {
    mechanical::Load load{
        .axial_N = N_from_kN(values_.number("load.axial_kN")),
        .moments_given = values_.given("load.moment_x_kNm") || values_.given("load.moment_y_kNm"),
        .eccentricity_x_m = m_from_mm(values_.number("load.eccentricity_x_mm")),
        .eccentricity_y_m = m_from_mm(values_.number("load.eccentricity_y_mm"))};
    if (load.moments_given) {
      load.moment_x_Nm = moment_Nm("load.moment_x_kNm");
      load.moment_y_Nm = moment_Nm("load.moment_y_kNm");
      check_single_cause();
    }
    check_eccentricity(section, load);
    return load;
  }

 private:
  static constexpr double kTouch_mm = 1e-6;  ///< rounding of typed lengths

  void refuse(const std::string& key, const std::string& text) {
    problems_.add(values_.location(key), key, text);
  }

  void compute(const std::string& key, double value) {
    if (!values_.given(key) && !std::isnan(value)) values_.set_computed(key, value);
  }

  void report_gaps(double length_mm, double gaps_mm) {
    refuse("tube.end_gap_mm",
           fmt::format("two end gaps of {} mm leave no tube in a member of {} mm; shorten the gaps",
                       gaps_mm / 2, length_mm));
  }

  std::string kind_of_column(const thermal::Section& section) const {
    if (!section.tube) return "bare concrete without a tube";
    const std::string shape = values_.text("section.shape");
    return shape +
           (section.tube->role == thermal::TubeRole::composite ? " with role \"composite\"" : "");
  }

  double moment_Nm(const std::string& key) {
    if (!values_.given(key)) {
      compute(key, 0.0);
      return 0;
    }
    return Nm_from_kNm(values_.number(key));
  }

  /// An eccentricity of 0 written out beside a moment says nothing against it.
  void check_single_cause() {
    const std::string moment =
        values_.given("load.moment_x_kNm") ? "load.moment_x_kNm" : "load.moment_y_kNm";
    for (const char* key : {"load.eccentricity_x_mm", "load.eccentricity_y_mm"}) {
      const double eccentricity_mm = values_.number(key);
      if (std::isnan(eccentricity_mm) || eccentricity_mm == 0) continue;
      refuse(key, fmt::format("an eccentricity ({} mm) and an end moment ({} = {} kNm) exclude "
                              "each other; remove one of the two",
                              eccentricity_mm, moment, values_.number(moment)));
    }
  }

  void check_eccentricity(const thermal::Section& section, const mechanical::Load& load) {
    const thermal::Outline& outline = section.outline;
    if (section.is_circular()) {
      const double e_m = std::hypot(load.eccentricity_x_m, load.eccentricity_y_m);
      if (e_m > outline.width_m / 2) {
        report_outside(load.eccentricity_x_m != 0 ? "x" : "y", e_m, outline.width_m / 2);
      }
      return;
    }
    if (std::abs(load.eccentricity_x_m) > outline.width_m / 2) {
      report_outside("x", load.eccentricity_x_m, outline.width_m / 2);
    }
    if (std::abs(load.eccentricity_y_m) > outline.depth_m / 2) {
      report_outside("y", load.eccentricity_y_m, outline.depth_m / 2);
    }
  }

  void report_outside(const std::string& axis, double e_m, double limit_m) {
    refuse("load.eccentricity_" + axis + "_mm",
           fmt::format("the load acts {:.6g} mm from the centroid, outside the section; at most "
                       "{:.6g} mm; give a moment for a load that bends more than it presses",
                       std::abs(mm_from_m(e_m)), mm_from_m(limit_m)));
  }

  InputValues& values_;
  Problems& problems_;
};

}  // namespace

mechanical::Column read_column_of(thermal::Section section, InputValues& values,
                                  Problems& problems) {
  MemberReader reader(values, problems);
  if (section.tube) reader.read_tube_height(*section.tube);
  mechanical::Column column;
  column.confinement = reader.read_confinement(section);
  column.member = reader.read_member();
  column.load = reader.read_load(section);
  column.factors = {.concrete = values.number("rating.gamma_concrete"),
                    .bar = values.number("rating.gamma_bar"),
                    .steel = values.number("rating.gamma_steel")};
  column.section = std::move(section);
  return column;
}

}  // namespace ringward::cli
