#include "thermal/materials/piecewise_capacity.hpp"

#include <cassert>
#include <limits>

namespace ringward::thermal {
namespace {

double value_of(const CapacityPiece& piece, double T_C) {
  const auto& c = piece.poly;
  return c[0] + T_C * (c[1] + T_C * (c[2] + T_C * c[3])) +
         piece.pole_J_m3 / (T_C - piece.pole_at_C);
}

}  // namespace

PiecewiseCapacity::PiecewiseCapacity(const std::vector<CapacityPiece>& pieces, double end_C) {
  assert(!pieces.empty() && pieces.front().from_C >= 0.0 && end_C > pieces.back().from_C);
  add_constant(-std::numeric_limits<double>::infinity(),
               value_of(pieces.front(), pieces.front().from_C));
  for (const CapacityPiece& p : pieces) {
    pieces_.push_back({.from = p.from_C,
                       .poly = p.poly,
                       .pole = p.pole_J_m3,
                       .pole_at = p.pole_at_C,
                       .offset = 0.0});
  }
  add_constant(end_C, value_of(pieces.back(), end_C));

  for (std::size_t i = 1; i < pieces_.size(); ++i) {
    const auto raw = [](const Piece& piece, double T_C) {
      const double poly = polynomial_integral(piece, T_C);
      return piece.pole == 0.0 ? poly : poly + piece.pole * std::log(std::abs(T_C - piece.pole_at));
    };
    const double T_C = pieces_[i].from;
    const Piece& left = pieces_[i - 1];
    pieces_[i].offset = left.offset + raw(left, T_C) - raw(pieces_[i], T_C);
  }
}

void PiecewiseCapacity::add_constant(double from_C, double value) {
  Piece piece;
  piece.from = from_C;
  piece.poly[0] = value;
  pieces_.push_back(piece);
}

}  // namespace ringward::thermal
