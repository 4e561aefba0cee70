#include "cli/dossier/charts.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <cmath>
#include <functional>
#include <map>

#include "cli/output/capacity_report.hpp"
#include "cli/output/numbers.hpp"
#include "cli/output/rate_words.hpp"
#include "cli/pictures/line_picture.hpp"
#include "thermal/base/units.hpp"

namespace ringward::cli {
namespace {

using mechanical::Axis;
using mechanical::HistoryRow;

using Quantity = std::function<std::optional<double>(const HistoryRow&)>;

std::vector<PicturePoint> against_time(const std::vector<HistoryRow>& history,
                                       const Quantity& quantity) {
  std::vector<PicturePoint> points;
  for (const HistoryRow& row : history) {
    points.push_back({units::min_from_s(row.time_s), quantity(row).value_or(kNoValue)});
  }
  return points;
}

const std::vector<HistoryRow>& history_of(const DossierData& data) {
  return data.report.rating.chosen.history;
}

using StateQuantity = std::function<double(const mechanical::CapacityState&)>;

/// A quantity at the member's capacity: the history, and the first minutes more closely.
std::vector<PicturePoint> at_capacity(const DossierData& data, const Quantity& of_row,
                                      const StateQuantity& of_state) {
  std::vector<PicturePoint> points = against_time(history_of(data), of_row);
  for (const mechanical::CapacityState& state : data.first_minutes) {
    const double time_min = units::min_from_s(state.time_s);
    const bool known = std::any_of(points.begin(), points.end(), [time_min](const PicturePoint& p) {
      return std::abs(p.x - time_min) < 1e-3;
    });
    if (!known) points.push_back({time_min, of_state(state)});
  }
  std::sort(points.begin(), points.end(),
            [](const PicturePoint& a, const PicturePoint& b) { return a.x < b.x; });
  return points;
}

PictureAxis time_axis() { return {.label = "Time [min]", .low = 0}; }

std::string failure_words(const DossierData& data) {
  return data.fails() ? "fails at " + tenths_down(*data.report.verdict.fire_resistance_min) + " min"
                      : "stands to the end";
}

void mark_times(LinePicture& picture, const DossierData& data) {
  if (data.fails()) {
    picture.vertical_marks.push_back(
        {*data.report.verdict.fire_resistance_min, failure_words(data)});
  }
  const std::optional<double>& required_min = data.report.verdict.required_min;
  if (required_min && units::s_from_min(*required_min) <= data.end_s) {
    picture.vertical_marks.push_back({*required_min, "required"});
  }
}

std::optional<double> MPa(const std::optional<double>& stress_Pa) {
  if (!stress_Pa) return std::nullopt;
  return units::MPa_from_Pa(*stress_Pa);
}

std::optional<double> capacity_kN(const HistoryRow& row) {
  return units::kN_from_N(row.capacity_N);
}

/// Between the least and the largest capacity of all models, at the times that all reach.
PictureBand model_band(const DossierData& data) {
  std::map<double, std::vector<double>> at_time;
  const auto collect = [&](const std::vector<HistoryRow>& history) {
    for (const HistoryRow& row : history) {
      at_time[units::min_from_s(row.time_s)].push_back(units::kN_from_N(row.capacity_N));
    }
  };
  collect(history_of(data));
  for (const ModelHistory& other : data.other_models) collect(other.history);
  PictureBand band{.name = "range of the models"};
  for (const auto& [time_min, values] : at_time) {
    if (values.size() != data.other_models.size() + 1) continue;
    const auto [low, high] = std::minmax_element(values.begin(), values.end());
    band.ranges.push_back({time_min, *low, *high});
  }
  return band;
}

std::vector<PicturePoint> diagram_points(const mechanical::InteractionDiagram& diagram) {
  std::vector<PicturePoint> points;
  for (const mechanical::InteractionPoint& point : diagram.points) {
    points.push_back({units::kNm_from_Nm(point.moment_Nm), units::kN_from_N(point.axial_N)});
  }
  if (!points.empty()) points.push_back(points.front());
  return points;
}

/// A quantity of the tube at the member's capacity and under the applied load.
/// The time up to which the tube does anything, and a little more; at least 15 min.
double tube_end_min(const DossierData& data) {
  double last_s = 0;
  for (const HistoryRow& row : history_of(data)) {
    const bool grips = row.tube_hoop_Pa.value_or(0) > 0 || row.load_hoop_Pa.value_or(0) > 0;
    if (grips) last_s = row.time_s;
  }
  const double shown_min = std::max(15.0, std::ceil(units::min_from_s(last_s) * 0.13) * 10);
  return std::min(shown_min, units::min_from_s(data.end_s));
}

Picture tube_chart(LinePicture picture, const DossierData& data,
                   std::vector<PicturePoint> at_capacity_points, const Quantity& under_load) {
  picture.x = time_axis();
  picture.x.high = tube_end_min(data);
  picture.y.low = 0;
  picture.height_px = 270;
  picture.series.push_back(
      {"at the member's capacity", std::move(at_capacity_points), SeriesStyle::strong});
  picture.series.push_back(
      {"under the applied load", against_time(history_of(data), under_load), SeriesStyle::line});
  return draw(picture);
}

}  // namespace

Picture temperature_chart(const DossierData& data) {
  const std::vector<HistoryRow>& history = history_of(data);
  LinePicture picture{
      .about = {"temperatures", "Temperatures against time",
                fmt::format("At {} min: gas {} C, core face {} C, core centre {} C.",
                            tenths_down(units::min_from_s(data.end_s)),
                            fixed(history.back().gas_C, 0), fixed(history.back().core_face_C, 0),
                            fixed(history.back().core_centre_C, 0))},
      .x = time_axis(),
      .y = {.label = "Temperature [\xC2\xB0"
                     "C]",
            .low = 0}};
  const auto add = [&](const std::string& name, SeriesStyle style, const Quantity& quantity) {
    picture.series.push_back({name, against_time(history, quantity), style});
  };
  add("gas", SeriesStyle::thin, [](const HistoryRow& row) { return row.gas_C; });
  add("tube", SeriesStyle::line, [](const HistoryRow& row) { return row.tube_C; });
  add("core face", SeriesStyle::line, [](const HistoryRow& row) { return row.core_face_C; });
  add("hottest bar", SeriesStyle::line, [](const HistoryRow& row) { return row.bar_max_C; });
  add("core centre", SeriesStyle::strong, [](const HistoryRow& row) { return row.core_centre_C; });
  mark_times(picture, data);
  return draw(picture);
}

Picture capacity_chart(const DossierData& data) {
  const std::vector<HistoryRow>& history = history_of(data);
  LinePicture picture{
      .about = {"capacity", "Capacity against time",
                fmt::format("The capacity falls from {} kN to {} kN at {} min; the load is {} kN: "
                            "the column {}.",
                            fixed(units::kN_from_N(history.front().capacity_N), 0),
                            fixed(units::kN_from_N(history.back().capacity_N), 0),
                            tenths_down(units::min_from_s(data.end_s)),
                            fixed(units::kN_from_N(data.column().load.axial_N), 0),
                            failure_words(data))},
      .x = time_axis(),
      .y = {.label = "Axial force [kN]", .low = 0},
      .height_px = 370};
  picture.series.push_back({"model \"" + confinement_word(data.column().confinement) + "\" (used)",
                            at_capacity(data, capacity_kN,
                                        [](const mechanical::CapacityState& state) {
                                          return units::kN_from_N(state.capacity_N);
                                        }),
                            SeriesStyle::strong});
  for (const ModelHistory& other : data.other_models) {
    picture.series.push_back({"model \"" + confinement_word(other.model) + "\"",
                              against_time(other.history, capacity_kN), SeriesStyle::line});
  }
  if (!data.other_models.empty()) picture.bands.push_back(model_band(data));
  picture.horizontal_marks.push_back(
      {units::kN_from_N(data.column().load.axial_N),
       "load " + shortest(rounded(units::kN_from_N(data.column().load.axial_N), 1)) + " kN", true});
  mark_times(picture, data);
  return draw(picture);
}

double load_moment_Nm(const DossierData& data, Axis axis) {
  const mechanical::Load& load = data.column().load;
  const bool along_x = axis == Axis::x;
  const double bow_Nm = load.axial_N * data.column().member.imperfection_m;
  const double eccentricity_m = along_x ? load.eccentricity_x_m : load.eccentricity_y_m;
  const double given_Nm = along_x ? load.moment_x_Nm : load.moment_y_Nm;
  const double moment_Nm = load.moments_given ? given_Nm : load.axial_N * eccentricity_m;
  return moment_Nm + std::copysign(bow_Nm, moment_Nm);
}

Picture interaction_chart(const DossierData& data, Axis axis) {
  const std::string name = axis == Axis::x ? "x" : "y";
  const double load_kN = units::kN_from_N(data.column().load.axial_N);
  const double moment_kNm = units::kNm_from_Nm(load_moment_Nm(data, axis));
  LinePicture picture{
      .about = {"n-m-" + name, "N-M diagrams of the section, bending along " + name,
                fmt::format("The diagrams shrink with time; the load stands at {} kN and {} kNm.",
                            fixed(load_kN, 0), fixed(moment_kNm, 1))},
      .x = {.label = "Moment along " + name + " [kNm]"},
      .y = {.label = "Axial force [kN]"},
      .height_px = 400};
  for (const mechanical::InteractionDiagram& diagram : data.diagrams) {
    if (diagram.axis != axis) continue;
    picture.series.push_back({shortest(units::min_from_s(diagram.time_s)) + " min",
                              diagram_points(diagram), SeriesStyle::line});
  }
  picture.series.push_back({"load", {{moment_kNm, load_kN}}, SeriesStyle::points});
  return draw(picture);
}

Picture hoop_chart(const DossierData& data) {
  const HistoryRow& cold = history_of(data).front();
  // sigma_h = p D / (2 t)
  const double hoop_per_pressure =
      data.section().core_width_m() / (2.0 * data.section().tube_thickness_m());
  const std::vector<PicturePoint> points = at_capacity(
      data, [](const HistoryRow& row) { return MPa(row.tube_hoop_Pa); },
      [hoop_per_pressure](const mechanical::CapacityState& state) {
        return units::MPa_from_Pa(state.lateral_pressure_Pa * hoop_per_pressure);
      });
  return tube_chart(
      {.about = {"hoop", "Hoop stress of the tube against time",
                 "Cold: " + fixed(MPa(cold.tube_hoop_Pa), 1) + " MPa at the capacity. " +
                     event_words(data.report.rating.chosen.events)},
       .y = {.label = "Hoop stress [MPa]"}},
      data, points, [](const HistoryRow& row) { return MPa(row.load_hoop_Pa); });
}

Picture pressure_chart(const DossierData& data) {
  const HistoryRow& cold = history_of(data).front();
  const std::vector<PicturePoint> points = at_capacity(
      data, [](const HistoryRow& row) { return MPa(row.lateral_pressure_Pa); },
      [](const mechanical::CapacityState& state) {
        return units::MPa_from_Pa(state.lateral_pressure_Pa);
      });
  return tube_chart(
      {.about = {"pressure", "Lateral pressure on the core against time",
                 "Cold: " + fixed(MPa(cold.lateral_pressure_Pa), 2) + " MPa at the capacity."},
       .y = {.label = "Lateral pressure [MPa]"}},
      data, points, [](const HistoryRow& row) { return MPa(row.load_pressure_Pa); });
}

}  // namespace ringward::cli
