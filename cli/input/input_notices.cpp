#include "cli/input/input_notices.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <cmath>

#include "mechanical/confinement/slip.hpp"
#include "thermal/base/units.hpp"

namespace ringward::cli {
namespace {

using namespace units;

class NoticeWriter {
 public:
  NoticeWriter(const ColumnInput& input, const InputValues& values)
      : input_(input), values_(values) {}

  Notices write() {
    core();
    if (input_.column.section.tube) tube(*input_.column.section.tube);
    bars();
    member();
    fire();
    return std::move(notices_);
  }

 private:
  void add(const std::string& code, Severity severity, const std::string& text,
           const std::string& source) {
    notices_.push_back({code, severity, text, source});
  }

  void core() {
    const double f_c_MPa = MPa_from_Pa(input_.column.section.core.strength_Pa);
    if (std::abs(f_c_MPa - 50) <= 5) {
      add("core-strength-step", Severity::caution,
          fmt::format("The core's strength of {:.4g} MPa lies within 5 MPa of 50 MPa, where the "
                      "rules step from the strength loss of Table 3.1 (up to 50 MPa) to the "
                      "faster one of Table 6.1N: a small change of strength changes the rating.",
                      f_c_MPa),
          "en1992-1-2-2004 6.1");
    }
    if (f_c_MPa > 50) {
      add("spalling", Severity::caution,
          fmt::format("Concrete of {:.4g} MPa may spall in fire; spalling is not modelled.",
                      f_c_MPa),
          "en1992-1-2-2004 6.2");
    }
  }

  void tube(const thermal::Tube& tube) {
    if (tube.contact_resistance_m2K_W > 0) {
      add("contact-resistance", Severity::caution,
          fmt::format("A contact resistance of {} m2K/W between tube and core keeps the core "
                      "cooler and flatters the rating; 0 is the safe assumption.",
                      tube.contact_resistance_m2K_W),
          "common practice, no source");
    }
    add("vent-holes", Severity::caution,
        "Steam must leave the tube: vent holes of at least 20 mm at the top and bottom of each "
        "storey, at most 5 m apart, are assumed and not checked (figures from memory).",
        "en1994-1-2-2005 5.3.2");
    if (tube.yield_Pa > Pa_from_MPa(460)) steel_grade("tube", tube.yield_Pa);
    if (tube.role != thermal::TubeRole::confining) return;
    end_gap(tube);
    if (input_.column.section.is_circular()) slip_length(tube);
  }

  void end_gap(const thermal::Tube& tube) {
    if (tube.end_gap_m <= 0) return;
    const bool is_protected = input_.column.section.protection.has_value();
    add("end-gap-ring", Severity::caution,
        fmt::format("At each end a ring of concrete {:.4g} mm high stands without the tube: it is "
                    "not confined and sees the fire directly{}; its temperatures and strength are "
                    "not calculated.",
                    mm_from_m(tube.end_gap_m),
                    is_protected ? ", unless the protection covers it" : ""),
        "common practice, no source");
  }

  void slip_length(const thermal::Tube& tube) {
    const mechanical::TubeProfile profile = mechanical::tube_profile(
        tube.friction, input_.column.section.core_width_m(), tube.clear_height_m);
    const double half_m = tube.clear_height_m / 2;
    const bool reaches_plateau = profile.slip_length_m < half_m;
    add("slip-length", Severity::note,
        fmt::format("Friction feeds axial stress into the tube over {:.0f} mm from each cut end "
                    "(0.364 D/mu, at most half its height, {:.0f} mm{}). It leaves {:.3f} of yield "
                    "as hoop stress at mid-height, the value used, and {:.3f} on average over the "
                    "height, which is not used.",
                    mm_from_m(profile.slip_length_m), mm_from_m(half_m),
                    reaches_plateau ? "" : ": it slips over its whole height",
                    profile.mid_height_hoop, profile.mean_hoop),
        "common practice, no source");
  }

  void steel_grade(const std::string& part, double yield_Pa) {
    add("steel-grade", Severity::caution,
        fmt::format("The yield strength of the {}, {:.4g} MPa, is above 460 MPa, where the "
                    "published range of the hot steel law ends (from memory).",
                    part, MPa_from_Pa(yield_Pa)),
        "en1994-1-2-2005 1.1");
  }

  void bars() {
    const auto& section = input_.column.section;
    if (section.steel_shape && section.steel_shape->yield_Pa > Pa_from_MPa(460)) {
      steel_grade("steel shape", section.steel_shape->yield_Pa);
    }
    for (std::size_t i = 0; i < section.bars.size(); ++i) {
      const double yield_MPa = MPa_from_Pa(section.bars[i].yield_Pa);
      if (yield_MPa >= 400 - 1e-6 && yield_MPa <= 600 + 1e-6) continue;
      add("bar-grade", Severity::note,
          fmt::format("The yield strength of bars[{}], {:.4g} MPa, is outside the 400 to 600 MPa "
                      "for which the rules are published (from memory).",
                      i, yield_MPa),
          "en1992-1-1-2004 3.2.2");
    }
  }

  void member() {
    const auto& member = input_.column.member;
    const double factor = member.buckling_length_m / member.length_m;
    if (factor >= 1 - 1e-9) return;
    add("buckling-length", Severity::note,
        fmt::format("The buckling length is {:.3g} of the length: this holds for braced frames "
                    "whose colder members hold the column's ends (0.5 continuous at both ends, "
                    "0.7 in the top storey).",
                    factor),
        "en1992-1-2-2004 5.3.2");
  }

  void fire() {
    for (const Notice& notice : input_.curve->notices()) notices_.push_back(notice);
    const bool is_table = values_.text("fire.curve") == "table";
    const auto same = [](const Notice& notice) { return notice.code == "table-convection"; };
    if (is_table && !values_.given("fire.surface.convection_W_m2K") &&
        std::none_of(notices_.begin(), notices_.end(), same)) {
      add("table-convection", Severity::note,
          fmt::format("The convection coefficient is {} W/m2K, as for natural fires; set "
                      "fire.surface.convection_W_m2K = 25 where the table holds a nominal curve.",
                      input_.fire.surface.convection_W_m2K),
          "en1991-1-2-2002 3.3.1");
    }
    if (input_.fire.surface.emissivity < 0.7 - 1e-9) {
      add("emissivity", Severity::caution,
          fmt::format("An emissivity of {} is below the 0.7 of EN 1991-1-2 and EN 1992-1-2 and "
                      "keeps the column cooler; it needs evidence.",
                      input_.fire.surface.emissivity),
          "en1991-1-2-2002 3.1");
    }
  }

  const ColumnInput& input_;
  const InputValues& values_;
  Notices notices_;
};

}  // namespace

Notices input_notices(const ColumnInput& input, const InputValues& values) {
  return NoticeWriter(input, values).write();
}

}  // namespace ringward::cli
