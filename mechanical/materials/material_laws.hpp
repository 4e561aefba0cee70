#pragma once

#include <memory>
#include <string>

#include "thermal/section/section.hpp"

namespace ringward::mechanical {

struct StressAndTangent {
  double stress_Pa = 0;
  double tangent_Pa = 0;
};

/// Concrete at one temperature: compression positive, no tension.
struct HotConcrete {
  double f_c_Pa = 0;          ///< strength
  double eps_c1 = 0;          ///< strain at the peak
  double eps_cu1 = 0;         ///< strain at which the stress is zero again
  double thermal_strain = 0;  ///< free expansion from 20 C, elongation positive
};

/// Steel at one temperature, the same in tension and compression: linear, ellipse, plateau, and
/// linear descent between eps_t and eps_u.
struct HotSteel {
  double f_y_Pa = 0;  ///< effective yield strength, reached at 2 % strain
  double f_p_Pa = 0;  ///< proportional limit
  double E_Pa = 0;
  double thermal_strain = 0;
};

inline constexpr double kSteelYieldStrain = 0.02;
inline constexpr double kSteelDescentStrain = 0.15;
inline constexpr double kSteelRuptureStrain = 0.20;

/// What a fibre of concrete needs to know. `T_max_C` >= `T_C` is the highest temperature so far.
class ConcreteLaw {
 public:
  virtual ~ConcreteLaw() = default;
  [[nodiscard]] virtual std::string name() const = 0;
  [[nodiscard]] virtual HotConcrete at(double T_C, double T_max_C) const = 0;
  [[nodiscard]] virtual double cold_strength_Pa() const = 0;  ///< divided by its gamma
};

class SteelLaw {
 public:
  virtual ~SteelLaw() = default;
  [[nodiscard]] virtual std::string name() const = 0;
  [[nodiscard]] virtual HotSteel at(double T_C, double T_max_C) const = 0;
};

using ConcreteLawPtr = std::shared_ptr<const ConcreteLaw>;
using SteelLawPtr = std::shared_ptr<const SteelLaw>;

/// EN 1992-1-2:2004 3.2.2 and 6.1, residual strength after EN 1994-1-2:2005 Annex C.
/// @param gamma material factor in the fire situation, divides the strength
/// @throws Error(bad_input) above 90 MPa
[[nodiscard]] ConcreteLawPtr concrete_en1992(double strength_Pa, thermal::Aggregate aggregate,
                                             double gamma);
/// EN 1992-1-2:2004 3.2.3, class N. Bars keep the strength of T_max; thermal strain follows T.
[[nodiscard]] SteelLawPtr bars_en1992(double yield_Pa, thermal::BarForming forming, double gamma);
/// EN 1993-1-2:2005 3.2.2, E_20 = 210 GPa. Keeps the strength of T_max; thermal strain follows T.
[[nodiscard]] SteelLawPtr structural_steel_en1993(double yield_Pa, double gamma);

/// sigma(eps) of EN 1992-1-2 3.2.2.1: eps is the stress-related strain, compression positive.
[[nodiscard]] StressAndTangent concrete_stress(const HotConcrete& concrete, double eps);
/// sigma(eps) of EN 1993-1-2 3.2.2 / EN 1992-1-2 3.2.3; odd in eps. The constants of the ellipse
/// are computed once, for the many strains that a fibre sees at one temperature.
class SteelCurve {
 public:
  explicit SteelCurve(const HotSteel& steel);
  [[nodiscard]] StressAndTangent at(double eps) const;

 private:
  [[nodiscard]] StressAndTangent in_tension(double eps) const;

  double f_y_Pa_ = 0;
  double E_Pa_ = 0;
  double eps_p_ = 0;
  double ellipse_end_ = 0;      ///< where the plateau starts: eps_y, or eps_p where f_p = f_y
  double ellipse_base_Pa_ = 0;  ///< f_p - c
  double b_over_a_ = 0;
  double radicand_at_p_ = 0;
};

/// One strain of a steel curve.
[[nodiscard]] StressAndTangent steel_stress(const HotSteel& steel, double eps);

}  // namespace ringward::mechanical
