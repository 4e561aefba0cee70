#include "thermal/temperature_history.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <limits>

#include "thermal/base/error.hpp"
#include "thermal/base/units.hpp"
#include "thermal/field_at_time.hpp"
#include "thermal/point_temperature.hpp"
#include "thermal/temperature_data.hpp"

namespace ringward::thermal {
namespace {

GridPoint located(const OrthogonalGrid& grid, const Point& point) {
  if (const std::optional<GridPoint> at = in_solved_part(grid, point)) return *at;
  throw Error(ErrorKind::bad_input,
              fmt::format("the point x = {} mm, y = {} mm lies outside the section",
                          units::mm_from_m(point.x_m), units::mm_from_m(point.y_m)));
}

FieldView view_of(const TemperatureHistory::Data& data, const FieldAtTime& field, double t_s) {
  return {data.equation.get(), [&field](std::size_t cell) { return field.state(cell); }, t_s};
}

double hottest_strip_C(const std::vector<Probe>& strips, const FieldAtTime& field) {
  double highest = -std::numeric_limits<double>::infinity();
  for (const Probe& strip : strips) {
    double mean = 0;
    for (const Probe::Term& term : strip.terms) mean += term.weight * field.state(term.cell).T_C;
    highest = std::max(highest, mean);
  }
  return highest;
}

void require_tube(const TemperatureHistory::Data& data) {
  if (data.tube_strips.empty()) throw Error(ErrorKind::bad_input, "the section has no tube");
}

}  // namespace

TemperatureHistory::TemperatureHistory(std::shared_ptr<const Data> data) : data_(std::move(data)) {}

const OrthogonalGrid& TemperatureHistory::grid() const { return data_->equation->grid(); }
const HeatFlowStatistics& TemperatureHistory::statistics() const { return data_->statistics; }
const Notices& TemperatureHistory::notices() const { return data_->notices; }
double TemperatureHistory::end_s() const { return data_->times_s.back(); }
const std::vector<double>& TemperatureHistory::kinks_s() const { return data_->kinks_s; }

void TemperatureHistory::temperatures_C(double t_s, std::span<double> cells_C) const {
  const FieldAtTime field(*data_, t_s);
  for (std::size_t k = 0; k < cells_C.size(); ++k) cells_C[k] = field.state(k).T_C;
}

void TemperatureHistory::peak_temperatures_C(double t_s, std::span<double> cells_C) const {
  const FieldAtTime field(*data_, t_s);
  for (std::size_t k = 0; k < cells_C.size(); ++k) cells_C[k] = field.peak_C(k);
}

Probe TemperatureHistory::core_probe(const Point& point) const {
  const GridPoint at = located(grid(), point);
  const CellIndex home = cell_at(grid(), at);
  if (grid().cells[grid().index(home.i, home.j)].layer != Layer::core) {
    throw Error(ErrorKind::bad_input,
                fmt::format("the point x = {} mm, y = {} mm lies outside the core",
                            units::mm_from_m(point.x_m), units::mm_from_m(point.y_m)));
  }
  return cell_probe(*data_->equation, at);
}

double TemperatureHistory::T_C(const Point& point, double t_s) const {
  const GridPoint at = located(grid(), point);
  const FieldAtTime field(*data_, t_s);
  return point_temperature_C(view_of(*data_, field, t_s), at);
}

double TemperatureHistory::gas_C(double t_s) const { return data_->gas_C(t_s); }

double TemperatureHistory::tube_C(double t_s) const {
  require_tube(*data_);
  return hottest_strip_C(data_->tube_strips, FieldAtTime(*data_, t_s));
}

double TemperatureHistory::tube_peak_C(double t_s) const {
  const double now_C = tube_C(t_s);
  const std::vector<double>& times = data_->times_s;
  const auto after = std::upper_bound(times.begin(), times.end(), t_s) - times.begin();
  if (after == 0) return now_C;
  return std::max(now_C, data_->tube_peak_C[static_cast<std::size_t>(after) - 1]);
}

double TemperatureHistory::core_face_C(double t_s) const {
  const FieldAtTime field(*data_, t_s);
  const FieldView view = view_of(*data_, field, t_s);
  double highest = -std::numeric_limits<double>::infinity();
  for (const CoreFace& face : data_->core_faces) {
    highest = std::max(highest, face_temperature_C(view, face.at, face.side));
  }
  for (const GridPoint& corner : data_->core_corners) {
    highest = std::max(highest, point_temperature_C(view, corner));
  }
  return highest;
}

double TemperatureHistory::core_centre_C(double t_s) const { return T_C(Point{}, t_s); }

}  // namespace ringward::thermal
