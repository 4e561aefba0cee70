#include "mechanical/rating/rating_notices.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <cmath>

#include "thermal/base/units.hpp"

namespace ringward::mechanical {
namespace {

constexpr const char* kCommonPractice = "common practice, no source";
/// Above this share of the cold strength, losing the confinement is news.
constexpr double kHighConfinementRatio = 1.3;
constexpr double kReserveWorthNaming = 1.01;
constexpr double kOneSecond = 1.0;

class NoticeWriter {
 public:
  void note(std::string code, std::string text, std::string source = kCommonPractice) {
    notices.push_back({std::move(code), Severity::note, std::move(text), std::move(source)});
  }
  void caution(std::string code, std::string text, std::string source = kCommonPractice) {
    notices.push_back({std::move(code), Severity::caution, std::move(text), std::move(source)});
  }
  Notices notices;
};

bool is_eccentric(const Load& load) {
  return load.moments_given ? load.moment_x_Nm != 0.0 || load.moment_y_Nm != 0.0
                            : load.eccentricity_x_m != 0.0 || load.eccentricity_y_m != 0.0;
}

bool is_heated_all_round(const thermal::FireExposure& fire) {
  const auto& faces = fire.exposed.faces;
  const bool all_faces = std::all_of(faces.begin(), faces.end(), [](thermal::FaceCondition f) {
    return f == thermal::FaceCondition::heated;
  });
  return all_faces && !fire.exposed.heated_arc && !fire.exposed.built_in_arc;
}

void tube_events(NoticeWriter& write, const Column& column, const SingleRating& chosen) {
  for (const TubeEvent& event : chosen.events) {
    const double t_min = units::min_from_s(event.time_s);
    switch (event.kind) {
      case TubeEventKind::contact_lost:
        write.caution("contact-lost",
                      fmt::format("Under the applied load the tube loses contact with the core at "
                                  "{:.2f} min: from then on it does not confine at this load.",
                                  t_min));
        break;
      case TubeEventKind::contact_regained:
        write.note("contact-regained",
                   fmt::format("Under the applied load the dilating core meets the tube again at "
                               "{:.2f} min.",
                               t_min));
        break;
      case TubeEventKind::end_gap_closed:
        write.caution(
            "end-gap-closed",
            fmt::format("The heated tube closes its end gaps of {:.0f} mm at {:.2f} min: it "
                        "then bears on the joint, carries axial force that is not credited "
                        "here, and is no longer counted as confinement.",
                        units::mm_from_m(column.section.tube->end_gap_m), t_min));
        break;
    }
  }
}

void confinement_worth(NoticeWriter& write, const Column& column, const Rating& rating) {
  if (!rating.cold_confinement_ratio) return;
  const double ratio = *rating.cold_confinement_ratio;
  const double level = column.load.axial_N / rating.chosen.cold_capacity_N;
  const std::string text = fmt::format(
      "At 20 C confinement multiplies the member's resistance by {:.2f}; the load is {:.0f} % of "
      "the "
      "cold resistance.",
      ratio, 100.0 * level);
  if (ratio > kHighConfinementRatio) {
    write.caution("cold-confinement-gain",
                  text + " A bare tube gives that gain up within the first half hour of a fire.");
  } else {
    write.note("cold-confinement-gain", text);
  }
}

void uniform_pressure(NoticeWriter& write, const Column& column,
                      const thermal::FireExposure& fire) {
  if (column.confinement == ConfinementModel::none) return;
  if (!is_eccentric(column.load) && is_heated_all_round(fire)) return;
  write.caution(
      "uniform-pressure",
      "One uniform pressure of the tube on the whole core is assumed although the load is "
      "eccentric or the heating one-sided.");
}

void yield_model(NoticeWriter& write, const Column& column) {
  if (column.confinement != ConfinementModel::yield) return;
  write.caution(
      "yield-upper-bound",
      "The model \"yield\" takes the hot yield strength of the tube whatever its strain, "
      "and ignores the closing of the end gaps: an upper bound of its pressure, not a rating.");
}

void unordered_bounds(NoticeWriter& write, const Rating& rating) {
  const auto or_end = [&](const std::optional<double>& s) { return s.value_or(rating.followed_s); };
  if (or_end(rating.bounds->yield_s) >= or_end(rating.bounds->none_s) - kOneSecond) return;
  write.note(
      "confinement-softens",
      "The model \"yield\" rates this column below \"none\" and is no upper bound here: the law "
      "for confined concrete moves the peak of its hot layers to larger strains, which costs "
      "the section and its stiffness more than a small pressure gives.",
      "richart1928");
}

void reserve(NoticeWriter& write, const SingleRating& chosen) {
  if (!chosen.fire_resistance_s || chosen.history.empty()) return;
  const double capacity_N = chosen.history.back().capacity_N;
  if (chosen.reserve_N < kReserveWorthNaming * capacity_N) return;
  write.note(
      "reserve-at-larger-strain",
      fmt::format("At the failure time a peak of {:.0f} kN exists at larger strain; the column "
                  "would have to drop onto it, so it is a reserve and never the rating.",
                  units::kN_from_N(chosen.reserve_N)));
}

void cold_overload(NoticeWriter& write, const Column& column, const SingleRating& chosen) {
  if (!chosen.fire_resistance_s || *chosen.fire_resistance_s > 0.0) return;
  write.caution(
      "load-above-cold-resistance",
      fmt::format("The load of {:.0f} kN exceeds the resistance of {:.0f} kN at 20 C.",
                  units::kN_from_N(column.load.axial_N), units::kN_from_N(chosen.cold_capacity_N)));
}

void cooling(NoticeWriter& write, const SingleRating& chosen, const thermal::FireExposure& fire) {
  if (!fire.gas.has_cooling) return;
  write.caution(
      "cooling-simplified",
      "Cooling: concrete follows its residual strength; bars, steel shape and tube keep the "
      "strength of their highest temperature. Columns have failed while cooling, after the "
      "fire.",
      "en1994-1-2-2005");
  if (!chosen.regained) return;
  write.note(
      "re-grip-not-credited",
      fmt::format("From {:.2f} min on the cooling, shrinking tube grips the core again, up to a "
                  "hoop stress of {:.0f} MPa under the load: reported, not credited.",
                  units::min_from_s(chosen.regained->time_s),
                  units::MPa_from_Pa(chosen.regained->hoop_Pa)));
}

void composite_tube(NoticeWriter& write, const Column& column) {
  if (!column.section.tube || column.section.tube->role != thermal::TubeRole::composite) return;
  write.note(
      "composite-tube",
      "The tube carries axial force with the core and is not counted as confinement as well; "
      "local buckling of its wall is not modelled.");
}

}  // namespace

Notices rating_notices(const Column& column, const thermal::FireExposure& fire,
                       const Rating& rating) {
  NoticeWriter write;
  cold_overload(write, column, rating.chosen);
  tube_events(write, column, rating.chosen);
  confinement_worth(write, column, rating);
  uniform_pressure(write, column, fire);
  yield_model(write, column);
  if (rating.bounds) unordered_bounds(write, rating);
  reserve(write, rating.chosen);
  cooling(write, rating.chosen, fire);
  composite_tube(write, column);
  write.note("transient-creep",
             "Transient creep of concrete is contained in the stress-strain law for heating, not "
             "modelled by itself.",
             "en1992-1-2-2004");
  return write.notices;
}

}  // namespace ringward::mechanical
