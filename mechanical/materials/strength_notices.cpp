#include <fmt/format.h>

#include <cmath>

#include "mechanical/materials/material_laws.hpp"
#include "thermal/base/units.hpp"

namespace ringward::mechanical {
namespace {

constexpr double kClassStep_Pa = 50e6;
constexpr double kNearStep_Pa = 5e6;

Notices outside_range(double yield_Pa, double from_MPa, double to_MPa, Notice notice) {
  const double yield_MPa = units::MPa_from_Pa(yield_Pa);
  if (yield_MPa >= from_MPa && yield_MPa <= to_MPa) return {};
  notice.text = fmt::format(fmt::runtime(notice.text), yield_MPa, from_MPa, to_MPa);
  return {notice};
}

}  // namespace

Notices concrete_strength_notices(double strength_Pa) {
  if (std::abs(strength_Pa - kClassStep_Pa) > kNearStep_Pa) return {};
  return {{.code = "strength-class-step",
           .severity = Severity::note,
           .text = fmt::format("The concrete strength of {:g} MPa lies near 50 MPa, where the "
                               "published hot strength steps down from the law of normal concrete "
                               "to that of high-strength concrete; a core that turns out stronger "
                               "than stated may be rated lower.",
                               units::MPa_from_Pa(strength_Pa)),
           .source = "en1992-1-2-2004 6.1"}};
}

Notices bar_yield_notices(double yield_Pa) {
  return outside_range(yield_Pa, 400.0, 600.0,
                       {.code = "bar-yield-range",
                        .severity = Severity::note,
                        .text = "The bars' yield strength of {:g} MPa lies outside the {:g} to "
                                "{:g} MPa for which the hot law of bars is published.",
                        .source = "en1992-1-1-2004 3.2.2(3)"});
}

Notices steel_yield_notices(double yield_Pa) {
  return outside_range(yield_Pa, 235.0, 460.0,
                       {.code = "steel-yield-range",
                        .severity = Severity::note,
                        .text = "The steel's yield strength of {:g} MPa lies outside the {:g} to "
                                "{:g} MPa for which the hot law of steel is published.",
                        .source = "en1994-1-2-2005 1.1"});
}

}  // namespace ringward::mechanical
