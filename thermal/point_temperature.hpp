#pragma once

#include <functional>

#include "thermal/grid/location.hpp"
#include "thermal/heat_equation.hpp"
#include "thermal/temperature_history.hpp"

namespace ringward::thermal {

/// The state of a cell at the time in question.
using StateOf = std::function<EnthalpyCurve::State(std::size_t cell)>;

/// A solved field at one time, as the functions below read it.
struct FieldView {
  const HeatEquation* equation = nullptr;
  StateOf state;
  double t_s = 0;
};

/// Temperature of a cell's face, on the cell's side of it [C].
[[nodiscard]] double face_temperature_C(const FieldView& field, CellIndex at, Side side);

/// Temperature at a point: cubic in both directions within the material that holds the point,
/// through the middles of its cells and the temperatures of its faces.
[[nodiscard]] double point_temperature_C(const FieldView& field, const GridPoint& at);

/// Weights of cell temperatures alone, cubic where the cells of one material allow it.
[[nodiscard]] Probe cell_probe(const HeatEquation& equation, const GridPoint& at);

}  // namespace ringward::thermal
