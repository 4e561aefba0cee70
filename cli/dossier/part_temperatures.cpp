#include <fmt/format.h>

#include "cli/dossier/charts.hpp"
#include "cli/dossier/dossier_writer.hpp"
#include "cli/dossier/temperature_map.hpp"
#include "cli/output/numbers.hpp"
#include "cli/output/rate_words.hpp"
#include "thermal/base/units.hpp"

namespace ringward::cli {
namespace {

constexpr std::size_t kMostFrames = 36;
constexpr double kFrameSteps_min[] = {5, 10, 15, 30, 60, 120};

/// Every 5 min, or less often in a long fire, and the end.
std::vector<double> frame_times_s(double end_s) {
  double step_s = units::s_from_min(kFrameSteps_min[0]);
  for (const double step_min : kFrameSteps_min) {
    step_s = units::s_from_min(step_min);
    if (end_s / step_s < static_cast<double>(kMostFrames)) break;
  }
  std::vector<double> times_s;
  for (std::size_t k = 0; static_cast<double>(k) * step_s < end_s - 1; ++k) {
    times_s.push_back(static_cast<double>(k) * step_s);
  }
  times_s.push_back(end_s);
  return times_s;
}

std::string end_words(const DossierData& data) {
  return data.fails() ? "failure" : "the end of the followed fire";
}

std::string state_words(const DossierData& data, const FieldState& state) {
  std::string words = fmt::format("core face {} C, core centre {} C", fixed(state.core_face_C, 0),
                                  fixed(state.core_centre_C, 0));
  if (state.tube_C) words = "tube " + fixed(*state.tube_C, 0) + " C, " + words;
  for (const BarGroupRange& bars : state.bars) {
    words += ", bars up to " + fixed(bars.hottest_C, 0) + " C";
  }
  return "At " + end_words(data) + ": " + words + ".";
}

/// The cold section says nothing in a map.
std::vector<FieldState> without_start(std::vector<FieldState> states) {
  if (states.size() > 1) states.erase(states.begin());
  return states;
}

void write_maps(DossierWriter& writer) {
  const DossierData& data = writer.data;
  const MapSubject subject{&data.section(), &data.report.input.fire.exposed, &data.history};
  const FieldState& last = data.field.states.back();
  writer.page.figure(
      map_panels({"maps", "Temperatures of the section at the rating times and at the end",
                  state_words(data, last)},
                 subject, without_start(data.field.states)),
      writer.figure_caption("Temperatures of the section at the times of classes and at " +
                            end_words(data) + ". The bold dashed line sees the fire."));
  const Picture map = large_map(
      {"map", "Temperatures of the section at " + end_words(data), state_words(data, last)},
      subject, last);
  const std::string caption = writer.figure_caption(
      "Temperatures of the section at " + end_words(data) +
      "; the isotherms are labelled in C. Where scripts run, the slider shows other times.");
  const std::string control =
      "<div class=\"slider screen-only\" id=\"map-control\" hidden=\"hidden\">"
      "<label for=\"map-time\">Time of the map</label>"
      "<input type=\"range\" id=\"map-time\" min=\"0\" max=\"0\" step=\"1\" value=\"0\"/>"
      "<output id=\"map-shown\" for=\"map-time\"></output></div>\n";
  writer.page.block(Markup::own("<figure id=\"map-figure\">\n" + map.svg + control +
                                "<figcaption>" + Markup::text(caption).html() +
                                "</figcaption></figure>\n<script type=\"application/json\" "
                                "id=\"map-frames\">" +
                                map_frames_json(subject, last, frame_times_s(data.end_s)) +
                                "</script>"));
}

std::vector<HtmlTable::Column> columns_of(const DossierData& data) {
  const auto temperature = [](const std::string& name) {
    return HtmlTable::Column{name,
                             "\xC2\xB0"
                             "C",
                             CellKind::number};
  };
  std::vector<HtmlTable::Column> columns{{"Time", "min", CellKind::number}, temperature("Gas")};
  if (data.section().tube) columns.push_back(temperature("Tube"));
  columns.push_back(temperature("Core face"));
  for (std::size_t g = 0; g < data.section().bars.size(); ++g) {
    const std::string group =
        data.section().bars.size() == 1 ? "" : fmt::format(", group {}", g + 1);
    columns.push_back(temperature("Hottest bar" + group));
    columns.push_back(temperature("Coldest bar" + group));
  }
  columns.push_back(temperature("Core centre"));
  return columns;
}

std::vector<std::string> row_of(const FieldState& state) {
  std::vector<std::string> cells{shortest(minutes_down(state.time_s)), fixed(state.gas_C, 1)};
  if (state.tube_C) cells.push_back(fixed(*state.tube_C, 1));
  cells.push_back(fixed(state.core_face_C, 1));
  for (const BarGroupRange& bars : state.bars) {
    cells.push_back(fixed(bars.hottest_C, 1));
    cells.push_back(fixed(bars.coldest_C, 1));
  }
  cells.push_back(fixed(state.core_centre_C, 1));
  return cells;
}

}  // namespace

void write_temperatures(DossierWriter& writer) {
  const DossierData& data = writer.data;
  writer.part("Temperatures");
  write_maps(writer);
  writer.page.figure(
      temperature_chart(data),
      writer.figure_caption("Temperatures against time. Tube: mean of the wall at its hottest "
                            "strip; core face: its hottest point."));
  HtmlTable table(
      writer.table_caption("Temperatures at the times of classes and at " + end_words(data)),
      columns_of(data));
  for (const FieldState& state : data.field.states) table.add(row_of(state));
  writer.page.table(table);
}

}  // namespace ringward::cli
