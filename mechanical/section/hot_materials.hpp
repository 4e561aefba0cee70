#pragma once

#include <cstddef>
#include <optional>
#include <vector>

#include "mechanical/column.hpp"
#include "mechanical/materials/material_laws.hpp"
#include "thermal/temperature_history.hpp"

namespace ringward::mechanical {

/// The materials of the section at one time, per temperature point (cells, then bars).
struct HotMaterials {
  double time_s = 0;
  std::vector<HotConcrete> concrete;
  std::vector<HotSteel> steel;   ///< zero strength where a point has no steel
  std::optional<HotSteel> tube;  ///< the hottest strip; strength of its peak temperature
  double tube_strain_now = 0;    ///< thermal strain of the tube at its temperature now
  double bar_max_C = 0;
};

/// The laws of a column's materials, fed with the temperatures of one history.
/// Keeps references: column and history must outlive it.
class SectionMaterials {
 public:
  SectionMaterials(const Column& column, const thermal::TemperatureHistory& history);

  /// @param t_s time [s], 0..history.end_s()
  [[nodiscard]] HotMaterials at(double t_s) const;

  [[nodiscard]] std::size_t cell_count() const { return history_.grid().cells.size(); }
  [[nodiscard]] const thermal::TemperatureHistory& history() const { return history_; }
  [[nodiscard]] double cold_concrete_Pa() const { return concrete_->cold_strength_Pa(); }

 private:
  struct Bar {
    thermal::Probe probe;
    SteelLawPtr law;
  };
  [[nodiscard]] const SteelLaw* steel_law_of(const thermal::Cell& cell) const;
  void fill_cells(HotMaterials& hot, const std::vector<double>& now_C,
                  const std::vector<double>& peak_C) const;
  void fill_bars(HotMaterials& hot, const std::vector<double>& now_C,
                 const std::vector<double>& peak_C) const;
  void fill_tube(HotMaterials& hot, double t_s) const;

  const thermal::TemperatureHistory& history_;
  ConcreteLawPtr concrete_;
  SteelLawPtr tube_law_;
  SteelLawPtr shape_law_;
  bool tube_carries_ = false;
  std::vector<Bar> bars_;
};

}  // namespace ringward::mechanical
