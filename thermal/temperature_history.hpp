#pragma once

#include <cstddef>
#include <memory>
#include <span>
#include <vector>

#include "thermal/base/notice.hpp"
#include "thermal/boundary/exposure.hpp"
#include "thermal/grid/orthogonal_grid.hpp"
#include "thermal/section/section.hpp"

namespace ringward::thermal {

/// How fine the heat flow is solved. `scale` 1 is the grid of the named accuracy; larger is
/// coarser: cell sizes and time tolerance grow together (used to estimate the numerical error).
enum class Accuracy { coarse, standard, fine };
struct Resolution {
  Accuracy accuracy = Accuracy::standard;
  double scale = 1.0;
};

struct HeatFlowStatistics {
  std::size_t cells = 0;
  std::size_t time_steps = 0;
  double absorbed_J_m = 0;  ///< heat through the surface, per metre of column, whole section
  double stored_J_m = 0;    ///< gain of enthalpy, whole section
  double energy_balance_error = 0;  ///< |absorbed - stored| / largest absorbed so far
  Symmetry symmetry = Symmetry::none;
};

/// A linear combination of cell temperatures that gives the temperature at a point of the core.
struct Probe {
  struct Term {
    std::size_t cell = 0;
    double weight = 0;
  };
  std::vector<Term> terms;
  [[nodiscard]] double T_C(std::span<const double> cells_C) const {
    double sum = 0;
    for (const Term& term : terms) sum += term.weight * cells_C[term.cell];
    return sum;
  }
};

/// The solved temperatures of a section: now, and the highest so far, at any time up to the end.
/// Between kept times (at most 1 min apart, closer early on and at kinks) the values are
/// interpolated. Read-only and safe to share between threads.
class TemperatureHistory {
 public:
  struct Data;
  explicit TemperatureHistory(std::shared_ptr<const Data> data);

  [[nodiscard]] const OrthogonalGrid& grid() const;
  [[nodiscard]] const HeatFlowStatistics& statistics() const;
  [[nodiscard]] const Notices& notices() const;
  [[nodiscard]] double end_s() const;
  [[nodiscard]] const std::vector<double>& kinks_s()
      const;  ///< of the fire, within the followed time

  /// Cell temperatures at time t_s in [0, end_s()], one per cell of grid().
  void temperatures_C(double t_s, std::span<double> cells_C) const;
  /// The highest temperature of each cell up to t_s (equal to the above while heating).
  void peak_temperatures_C(double t_s, std::span<double> cells_C) const;

  /// Weights for a point inside the core, for repeated use (bars). Same order as T_C().
  [[nodiscard]] Probe core_probe(const Point& point) const;

  /// Temperature at any point of the section; on an interface, the inner side.
  /// @throws Error(bad_input) when the point lies outside the section
  [[nodiscard]] double T_C(const Point& point, double t_s) const;

  [[nodiscard]] double gas_C(double t_s) const;
  /// Mean over the wall at the hottest strip of the circumference. Requires a tube.
  [[nodiscard]] double tube_C(double t_s) const;
  [[nodiscard]] double tube_peak_C(double t_s) const;  ///< the highest tube_C so far
  [[nodiscard]] double core_face_C(double t_s) const;  ///< hottest point of the core's face
  [[nodiscard]] double core_centre_C(double t_s) const;

 private:
  std::shared_ptr<const Data> data_;
};

/// Solves rho c(T) dT/dt = div(lambda(T) grad T) over the section for the whole fire.
/// @throws Error(solver_breakdown) with the time and the place when the integrator gives up
[[nodiscard]] TemperatureHistory solve_heat_flow(const Section& section, const FireExposure& fire,
                                                 const Resolution& resolution);

}  // namespace ringward::thermal
