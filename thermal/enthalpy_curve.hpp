#pragma once

#include <cstddef>
#include <cstdint>
#include <string>
#include <vector>

#include "thermal/materials/thermal_law.hpp"

namespace ringward::thermal {

/// The unit of the enthalpies that are stepped in time; near 1 K of concrete, so that an
/// enthalpy in this unit changes about as much as the temperature.
inline constexpr double kEnthalpyUnit_J_m3 = 2.0e6;

/// A material and its share of a cell's area.
struct MaterialShare {
  ThermalLawPtr law;
  double share = 1.0;
};

/// Temperature and conductivity integral of a material (or a mixture by area) against its
/// volumetric enthalpy: the inverse of the law, tabulated with knots on all its kinks.
/// Straight between knots that lie close enough for 1e-3 K, so values and slopes agree exactly.
/// Outside -100 to 1600 C the end pieces go on straight.
class EnthalpyCurve {
 public:
  /// At enthalpy u [kEnthalpyUnit_J_m3]. The potential is the integral of lambda dT from 0 C.
  struct State {
    double T_C = 0;
    double potential_W_m = 0;
    double T_slope = 0;          ///< dT/du
    double potential_slope = 0;  ///< dpotential/du
  };
  struct Conduction {
    double potential_W_m = 0;
    double conductivity_W_mK = 0;
  };

  /// @throws Error(bad_input) when an enthalpy does not rise with temperature
  explicit EnthalpyCurve(const std::vector<MaterialShare>& shares);

  [[nodiscard]] State first_heating(double u) const { return at(first_, u); }
  [[nodiscard]] State dried(double u) const { return at(dried_, u); }
  [[nodiscard]] Conduction conduction(double T_C) const;
  [[nodiscard]] double enthalpy(double T_C) const;        ///< first heating
  [[nodiscard]] double dried_enthalpy(double T_C) const;  ///< after drying
  /// Whether the two enthalpies differ anywhere.
  [[nodiscard]] bool dries() const { return dries_; }

 private:
  struct Knot {
    double u = 0;
    State state;  // with the slopes of the piece to the right
  };
  /// Knots with equal buckets along u, each naming the first piece that reaches into it.
  struct Table {
    std::vector<Knot> knots;  // the last one only ends the last piece
    std::vector<std::uint32_t> buckets;
    double buckets_per_u = 0;
  };

  static Table tabulate(const std::vector<double>& T_C, const std::vector<double>& u,
                        const std::vector<double>& potential);
  static std::size_t piece_at(const Table& table, double u) {
    const double raw = (u - table.knots.front().u) * table.buckets_per_u;
    const double last = static_cast<double>(table.buckets.size() - 1);
    const double bucket = !(raw > 0.0) ? 0.0 : raw > last ? last : raw;
    std::size_t piece = table.buckets[static_cast<std::size_t>(bucket)];
    const std::size_t last_piece = table.knots.size() - 2;
    while (piece < last_piece && u >= table.knots[piece + 1].u) ++piece;
    return piece;
  }
  static State at(const Table& table, double u) {
    const Knot& knot = table.knots[piece_at(table, u)];
    const double du = u - knot.u;
    State state = knot.state;
    state.T_C += state.T_slope * du;
    state.potential_W_m += state.potential_slope * du;
    return state;
  }
  [[nodiscard]] const Knot& knot_below(double T_C) const;

  Table first_;
  Table dried_;
  std::vector<std::uint32_t> pieces_by_T_;  // first piece reaching into each bucket of 2 K
  bool dries_ = false;
};

}  // namespace ringward::thermal
