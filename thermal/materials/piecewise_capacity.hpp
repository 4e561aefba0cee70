#pragma once

#include <array>
#include <cmath>
#include <cstddef>
#include <vector>

namespace ringward::thermal {

/// One piece of a volumetric heat capacity: c0 + c1 T + c2 T^2 + c3 T^3 + A/(T - T0).
struct CapacityPiece {
  double from_C = 0;             ///< the piece starts here and ends where the next one starts
  std::array<double, 4> poly{};  ///< coefficients of T^0 ... T^3, T in C [J/m3K ...]
  double pole_J_m3 = 0;          ///< A
  double pole_at_C = -1e6;       ///< T0, outside the piece
};

/// A volumetric heat capacity given in pieces, with its exact integral.
///
/// H(T) = integral of C from 0 to T; outside the given range C keeps the value of the nearest end,
/// so that H grows everywhere. At a start of a piece the right-hand value holds.
class PiecewiseCapacity {
 public:
  /// @param pieces from_C increasing, the first above 0 C
  /// @param end_C end of the last piece [C]
  PiecewiseCapacity(const std::vector<CapacityPiece>& pieces, double end_C);

  [[nodiscard]] double capacity(double T_C) const {
    const Piece& piece = at(T_C);
    const auto& c = piece.poly;
    const double value = c[0] + T_C * (c[1] + T_C * (c[2] + T_C * c[3]));
    return piece.pole == 0.0 ? value : value + piece.pole / (T_C - piece.pole_at);
  }

  [[nodiscard]] double enthalpy(double T_C) const {
    const Piece& piece = at(T_C);
    const double value = piece.offset + polynomial_integral(piece, T_C);
    return piece.pole == 0.0 ? value : value + piece.pole * std::log(std::abs(T_C - piece.pole_at));
  }

 private:
  struct Piece {
    double from = 0;
    std::array<double, 4> poly{};
    double pole = 0;
    double pole_at = 0;
    double offset = 0;  ///< makes H continuous and zero at 0 C
  };

  [[nodiscard]] const Piece& at(double T_C) const {
    std::size_t i = 0;
    while (i + 1 < pieces_.size() && T_C >= pieces_[i + 1].from) ++i;
    return pieces_[i];
  }

  [[nodiscard]] static double polynomial_integral(const Piece& piece, double T_C) {
    const auto& c = piece.poly;
    return T_C * (c[0] + T_C * (c[1] / 2.0 + T_C * (c[2] / 3.0 + T_C * (c[3] / 4.0))));
  }

  void add_constant(double from_C, double value);

  std::vector<Piece> pieces_;  ///< first: below the range; last: above it
};

}  // namespace ringward::thermal
