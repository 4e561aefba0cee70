#pragma once

#include <array>
#include <functional>
#include <optional>
#include <span>
#include <vector>

#include "thermal/boundary/surface.hpp"
#include "thermal/enthalpy_curve.hpp"
#include "thermal/grid/distances.hpp"
#include "thermal/grid/orthogonal_grid.hpp"
#include "thermal/mixed_face.hpp"

namespace ringward::thermal {

/// Any problem of heat flow on an orthogonal grid: layers of material, conditions on the four
/// sides, contact between core and tube, a heat source. Sections in fire are one case of it.
struct HeatProblem {
  static constexpr int kNoFlow = -1;

  OrthogonalGrid grid;
  /// By layer; a law that no cell needs may be null. The last one fills steel_fraction of a cell.
  ThermalLawPtr core, tube, protection, steel_shape;
  double contact_resistance_m2K_W = 0;  ///< between core and tube
  /// Where the steel shape is, for cells that it cuts; without it these conduct as their mixture.
  InShape in_steel_shape;

  std::vector<SurfaceCondition> conditions;
  /// For each Side of the grid the condition (index or kNoFlow) of each cell along it; an empty
  /// list is a side without flow, e.g. a line of symmetry.
  std::array<std::vector<int>, 4> sides;
  bool closed_circle = false;  ///< the two ends of axis 2 are the same line

  double initial_C = 20;
  std::function<double(double x_m, double y_m)> initial_C_at;  ///< instead, where it varies
  std::function<double(double t_s, double x_m, double y_m)> source_W_m3;  ///< none when empty
};

/// Structure of a square sparse matrix by columns, rows increasing in each, diagonal present.
struct SparsePattern {
  std::vector<int> column_starts;
  std::vector<int> rows;
};

/// The control-volume equations A_k du_k/dt = sum of the heat flows into cell k, u the volumetric
/// enthalpy in kEnthalpyUnit_J_m3. Between cells of one material the flow is the difference of
/// the conductivity integrals over the distance. At an interface or the surface the temperatures
/// of the faces follow from the balance of the flows, with the gradient in the material from a
/// parabola through the face and the next two cells of the same material.
class HeatEquation {
 public:
  explicit HeatEquation(HeatProblem problem);
  // Its faces point at its curves.
  HeatEquation(const HeatEquation&) = delete;
  HeatEquation& operator=(const HeatEquation&) = delete;

  [[nodiscard]] const HeatProblem& problem() const { return problem_; }
  [[nodiscard]] const OrthogonalGrid& grid() const { return problem_.grid; }
  [[nodiscard]] std::size_t size() const { return problem_.grid.cells.size(); }
  [[nodiscard]] const SparsePattern& pattern() const { return pattern_; }
  [[nodiscard]] std::vector<double> initial_state() const;

  /// du/dt. Not thread-safe: works in the object's own store, as jacobian does.
  void rate(double t_s, std::span<const double> u, std::span<double> du_dt);
  /// d(du/dt)/du in the order of pattern().
  void jacobian(double t_s, std::span<const double> u, std::span<double> values);
  /// Heat flow through the outline into the solved part, without the source [W/m].
  [[nodiscard]] double absorbed_W_m(double t_s, std::span<const double> u);
  /// Enthalpy of the solved part [J/m].
  [[nodiscard]] double enthalpy_J_m(std::span<const double> u) const;

  /// Raises each cell's highest enthalpy so far; a cell below it is dry up to there.
  void note_peaks(std::span<const double> u);
  [[nodiscard]] const std::vector<double>& peaks() const { return peaks_; }

  /// State of a cell of enthalpy u whose highest enthalpy so far is `peak`.
  [[nodiscard]] EnthalpyCurve::State state(std::size_t cell, double u, double peak) const;
  [[nodiscard]] const EnthalpyCurve& curve(std::size_t cell) const {
    return curves_[curve_of_cell_[cell]];
  }
  /// The neighbour of a cell, none at the end of the grid.
  [[nodiscard]] std::optional<CellIndex> neighbour(CellIndex at, Side side) const;
  /// How the flow into a cell through one of its faces follows from the cells behind the face.
  struct FaceStencil {
    std::size_t near = 0, far = 0;  ///< far = near where only one cell can be used
    FaceSide side;
    double near_weight_1_m = 0, far_weight_1_m = 0;
  };
  [[nodiscard]] FaceStencil stencil(CellIndex at, Side side) const;
  /// Condition of a cell's face at the end of the grid; null where there is no flow.
  [[nodiscard]] const SurfaceCondition* condition(CellIndex at, Side side) const;
  /// Contact resistance between two neighbouring cells [m2K/W].
  [[nodiscard]] double resistance_m2K_W(std::size_t a, std::size_t b) const;
  /// Temperature of what a face at the end of the grid sees [C].
  [[nodiscard]] double outside_C(const SurfaceCondition& condition, const Point& point,
                                 double t_s) const;

 private:
  struct InnerFace {
    std::size_t a, b;
    double conductance;                  // length over distance
    std::array<std::size_t, 4> entries;  // of (a,a), (b,a), (a,b), (b,b) in the Jacobian
  };
  struct Interface {
    FaceStencil a, b;
    double length_m, resistance_m2K_W;
    std::array<std::size_t, 8> entries;  // rows a, b in columns a near, a far, b near, b far
  };
  struct MixedFace {
    std::size_t a, b;
    double length_m;
    MixedPath path;
    std::array<std::size_t, 4> entries;  // as of an InnerFace
  };
  struct SurfaceFace {
    FaceStencil in;
    double length_m;
    std::size_t condition;
    Point point;
    std::array<std::size_t, 2> entries;  // in columns near, far
  };

  void assign_curves();
  void connect();
  void connect_pair(CellIndex at, Side side);
  [[nodiscard]] bool is_cut_by_shape(std::size_t a, std::size_t b) const;
  void connect_surface(CellIndex at, Side side);
  void build_pattern();
  [[nodiscard]] std::size_t entry(std::size_t row, std::size_t column) const;

  void find_entries();
  void update_states(std::span<const double> u);
  void update_state(std::size_t cell, double u);
  void update_outside(double t_s);
  [[nodiscard]] double inner_W_m2(const FaceStencil& face) const {
    return face.near_weight_1_m * states_[face.near].potential_W_m +
           face.far_weight_1_m * states_[face.far].potential_W_m;
  }
  [[nodiscard]] SurfaceFlow flow(const SurfaceFace& face, double t_s) const;
  [[nodiscard]] InterfaceFlow flow(const Interface& face) const;
  [[nodiscard]] MixedFlow flow(const MixedFace& face) const;
  void add_interfaces(std::span<double> values) const;
  void add_mixed(std::span<double> values) const;
  void add_surface(double t_s, std::span<double> values) const;

  HeatProblem problem_;
  std::vector<EnthalpyCurve> curves_;
  std::vector<std::size_t> curve_of_cell_;
  std::vector<double> weight_;  // 1 / (area times the enthalpy unit)
  std::vector<Point> middle_;
  std::vector<InnerFace> inner_;
  std::vector<Interface> interfaces_;
  std::vector<MixedFace> mixed_;
  std::optional<EnthalpyCurve> pure_core_, pure_shape_;  // for the mixed faces
  std::vector<SurfaceFace> surface_;
  SparsePattern pattern_;

  std::vector<double> peaks_;
  std::vector<double> dried_shift_;  // dried enthalpy at the peak minus the peak; NaN: not known
  std::vector<EnthalpyCurve::State> states_;
  std::vector<double> outside_C_;  // by condition
};

}  // namespace ringward::thermal
