#include "mechanical/section/hot_materials.hpp"

#include <algorithm>

namespace ringward::mechanical {

using thermal::Cell;
using thermal::Layer;

SectionMaterials::SectionMaterials(const Column& column, const thermal::TemperatureHistory& history)
    : history_(history) {
  const thermal::Section& section = column.section;
  concrete_ =
      concrete_en1992(section.core.strength_Pa, section.core.aggregate, column.factors.concrete);
  if (section.tube) {
    tube_law_ = structural_steel_en1993(section.tube->yield_Pa, column.factors.steel);
    tube_carries_ = section.tube->role == thermal::TubeRole::composite;
  }
  if (section.steel_shape) {
    shape_law_ = structural_steel_en1993(section.steel_shape->yield_Pa, column.factors.steel);
  }
  for (const thermal::BarGroup& group : section.bars) {
    const SteelLawPtr law = bars_en1992(group.yield_Pa, group.forming, column.factors.bar);
    for (const thermal::Point& at : group.positions) {
      bars_.push_back({history.core_probe(at), law});
    }
  }
}

const SteelLaw* SectionMaterials::steel_law_of(const Cell& cell) const {
  if (cell.layer == Layer::tube && tube_carries_) return tube_law_.get();
  if (cell.layer == Layer::core && cell.steel_fraction > 0.0) return shape_law_.get();
  return nullptr;
}

void SectionMaterials::fill_cells(HotMaterials& hot, const std::vector<double>& now_C,
                                  const std::vector<double>& peak_C) const {
  const std::vector<Cell>& cells = history_.grid().cells;
  for (std::size_t k = 0; k < cells.size(); ++k) {
    if (cells[k].layer == Layer::core) hot.concrete[k] = concrete_->at(now_C[k], peak_C[k]);
    if (const SteelLaw* law = steel_law_of(cells[k])) hot.steel[k] = law->at(now_C[k], peak_C[k]);
  }
}

void SectionMaterials::fill_bars(HotMaterials& hot, const std::vector<double>& now_C,
                                 const std::vector<double>& peak_C) const {
  hot.bar_max_C = bars_.empty() ? 0.0 : -300.0;
  for (std::size_t b = 0; b < bars_.size(); ++b) {
    const double T_C = bars_[b].probe.T_C(now_C);
    const double T_peak_C = std::max(T_C, bars_[b].probe.T_C(peak_C));
    hot.concrete[cell_count() + b] = concrete_->at(T_C, T_peak_C);
    hot.steel[cell_count() + b] = bars_[b].law->at(T_C, T_peak_C);
    hot.bar_max_C = std::max(hot.bar_max_C, T_C);
  }
}

// The contraction of a cooling tube is not credited: it keeps the expansion of its peak.
void SectionMaterials::fill_tube(HotMaterials& hot, double t_s) const {
  if (!tube_law_) return;
  const double T_C = history_.tube_C(t_s);
  const double T_peak_C = std::max(T_C, history_.tube_peak_C(t_s));
  hot.tube = tube_law_->at(T_peak_C, T_peak_C);
  hot.tube_strain_now = tube_law_->at(T_C, T_peak_C).thermal_strain;
}

HotMaterials SectionMaterials::at(double t_s) const {
  const std::size_t points = cell_count() + bars_.size();
  HotMaterials hot{.time_s = t_s,
                   .concrete = std::vector<HotConcrete>(points),
                   .steel = std::vector<HotSteel>(points),
                   .tube = std::nullopt};
  std::vector<double> now_C(cell_count());
  std::vector<double> peak_C(cell_count());
  history_.temperatures_C(t_s, now_C);
  history_.peak_temperatures_C(t_s, peak_C);
  fill_cells(hot, now_C, peak_C);
  fill_bars(hot, now_C, peak_C);
  fill_tube(hot, t_s);
  return hot;
}

}  // namespace ringward::mechanical
