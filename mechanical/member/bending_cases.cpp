#include "mechanical/member/bending_cases.hpp"

#include <algorithm>
#include <cmath>

#include "thermal/base/units.hpp"

namespace ringward::mechanical {
namespace {

// A straight column has no second-order path to follow, so it never starts quite straight.
constexpr double kLeastImperfection = 1e-5;  // of the buckling length
constexpr double kSymmetryTolerance = 1e-5;  // of the sum of absolute contributions

// Mean lever of the thermal strain over the extent above which heating has a side.
constexpr double kOneSidedHeating = 1e-3;
// Cold thermal strains are rounding noise: differences count against this strain.
constexpr double kStrainScale = 1e-3;

/// Sums of area x hot property x u^m v^n over the fibres at a few times: equal sums mean sections
/// that bend alike, vanishing odd sums mean symmetry.
class SectionMoments {
 public:
  SectionMoments(const FibreLayout& layout, const std::vector<HotMaterials>& times)
      : layout_(layout), times_(times) {}

  struct Sum {
    double value = 0;
    double scale = 0;
  };

  [[nodiscard]] std::vector<Sum> sums(int m, int n) const {
    std::vector<Sum> result;
    for (const HotMaterials& hot : times_) {
      result.push_back(
          sum(layout_.concrete, m, n, [&](std::size_t s) { return hot.concrete[s].f_c_Pa; }));
      result.push_back(sum(layout_.concrete, m, n, [&](std::size_t s) {
        return kStrainScale + hot.concrete[s].thermal_strain;
      }));
      result.push_back(
          sum(layout_.steel, m, n, [&](std::size_t s) { return hot.steel[s].f_y_Pa; }));
      result.push_back(sum(layout_.steel, m, n, [&](std::size_t s) {
        return kStrainScale + hot.steel[s].thermal_strain;
      }));
    }
    return result;
  }

 private:
  /// std::pow would be a third of the whole rating of a round column.
  [[nodiscard]] static double power(double x, int exponent) {
    double product = 1.0;
    for (int k = 0; k < exponent; ++k) product *= x;
    return product;
  }

  template <class Property>
  [[nodiscard]] Sum sum(const std::vector<Fibre>& fibres, int m, int n, Property property) const {
    Sum total;
    for (const Fibre& f : fibres) {
      const double term = f.area_m2 * property(f.source) * power(f.u_m / layout_.extent_m, m) *
                          power(f.v_m / layout_.extent_m, n);
      total.value += term;
      total.scale += std::abs(f.area_m2 * property(f.source));
    }
    return total;
  }

  const FibreLayout& layout_;
  const std::vector<HotMaterials>& times_;
};

bool vanish(const std::vector<SectionMoments::Sum>& sums) {
  return std::all_of(sums.begin(), sums.end(), [](const SectionMoments::Sum& s) {
    return std::abs(s.value) <= kSymmetryTolerance * s.scale;
  });
}

bool equal(const std::vector<SectionMoments::Sum>& a, const std::vector<SectionMoments::Sum>& b,
           double sign) {
  for (std::size_t i = 0; i < a.size(); ++i) {
    const double tolerance = kSymmetryTolerance * std::max(a[i].scale, b[i].scale);
    if (std::abs(a[i].value - sign * b[i].value) > tolerance) return false;
  }
  return true;
}

bool symmetric_about_u(const SectionMoments& moments) {
  for (int m = 0; m <= 4; ++m) {
    if (!vanish(moments.sums(m, 1)) || !vanish(moments.sums(m, 3))) return false;
  }
  return true;
}

bool symmetric_about_v(const SectionMoments& moments) {
  return vanish(moments.sums(1, 0)) && vanish(moments.sums(3, 0)) && vanish(moments.sums(5, 0)) &&
         vanish(moments.sums(1, 2)) && vanish(moments.sums(3, 2));
}

/// Two cases bend alike when all moments agree, with v turned around or not.
bool alike(const SectionMoments& a, const SectionMoments& b, bool biaxial, double v_sign) {
  for (int m = 0; m <= 6; ++m) {
    if (!equal(a.sums(m, 0), b.sums(m, 0), 1.0)) return false;
    if (!biaxial) continue;
    for (int n = 1; n <= 4; ++n) {
      if (!equal(a.sums(m, n), b.sums(m, n), n % 2 == 0 ? 1.0 : v_sign)) return false;
    }
  }
  return true;
}

bool same_loading(const MemberLoading& a, const MemberLoading& b, double v_sign) {
  const double scale_m = 1e-9;
  const double scale_Nm = 1e-6;
  return a.biaxial == b.biaxial && std::abs(a.eccentricity_u_m - b.eccentricity_u_m) < scale_m &&
         std::abs(a.eccentricity_v_m - v_sign * b.eccentricity_v_m) < scale_m &&
         std::abs(a.moment_u_Nm - b.moment_u_Nm) < scale_Nm &&
         std::abs(a.moment_v_Nm - v_sign * b.moment_v_Nm) < scale_Nm;
}

bool equivalent(const BendingCase& a, const BendingCase& b,
                const std::vector<HotMaterials>& times) {
  const SectionMoments moments_a(a.layout, times);
  const SectionMoments moments_b(b.layout, times);
  for (const double v_sign : {1.0, -1.0}) {
    if (same_loading(a.loading, b.loading, v_sign) &&
        alike(moments_a, moments_b, a.loading.biaxial, v_sign)) {
      return true;
    }
  }
  return false;
}

Direction towards(double angle_rad) { return {std::cos(angle_rad), std::sin(angle_rad)}; }

void add_ring_directions(std::vector<Direction>& directions, const thermal::Section& section) {
  for (const thermal::BarGroup& group : section.bars) {
    if (group.positions.size() < 2) continue;
    const thermal::Point& first = group.positions.front();
    const double angle = std::atan2(first.y_m, first.x_m);
    directions.push_back(towards(angle));
    directions.push_back(towards(angle + units::kPi / static_cast<double>(group.positions.size())));
  }
}

/// Towards and away from the hotter side, where heating has one: the column bows along it.
void add_heating_directions(std::vector<Direction>& directions, const FibreLayout& layout,
                            const HotMaterials& hot) {
  double x = 0.0, y = 0.0, scale = 0.0;
  for (const Fibre& fibre : layout.concrete) {
    const double weight = fibre.area_m2 * hot.concrete[fibre.source].thermal_strain;
    x += weight * fibre.u_m;
    y += weight * fibre.v_m;
    scale += std::abs(weight) * layout.extent_m;
  }
  const double size = std::hypot(x, y);
  if (size <= kOneSidedHeating * scale) return;
  directions.push_back({x / size, y / size});
  directions.push_back({-x / size, -y / size});
}

std::vector<Direction> candidate_directions(const Column& column,
                                            const thermal::OrthogonalGrid& grid,
                                            const std::vector<HotMaterials>& times) {
  std::vector<Direction> directions;
  const Load& load = column.load;
  const double along_x = load.moments_given ? load.moment_x_Nm : load.eccentricity_x_m;
  const double along_y = load.moments_given ? load.moment_y_Nm : load.eccentricity_y_m;
  const double size = std::hypot(along_x, along_y);
  if (size > 0.0) directions.push_back({along_x / size, along_y / size});
  for (const Direction& d :
       {Direction{1, 0}, Direction{-1, 0}, Direction{0, 1}, Direction{0, -1}}) {
    directions.push_back(d);
  }
  add_heating_directions(directions, fibre_layout(column.section, grid, Direction{1, 0}),
                         times.back());
  if (column.section.is_circular()) add_ring_directions(directions, column.section);
  return directions;
}

MemberLoading loading_in(const Column& column, const Direction& d) {
  const Load& load = column.load;
  const double least_m = kLeastImperfection * column.member.buckling_length_m;
  MemberLoading loading{.imperfection_m = std::max(column.member.imperfection_m, least_m)};
  if (load.moments_given) {
    loading.moment_u_Nm = load.moment_x_Nm * d.x + load.moment_y_Nm * d.y;
    loading.moment_v_Nm = load.moment_y_Nm * d.x - load.moment_x_Nm * d.y;
  } else {
    loading.eccentricity_u_m = load.eccentricity_x_m * d.x + load.eccentricity_y_m * d.y;
    loading.eccentricity_v_m = load.eccentricity_y_m * d.x - load.eccentricity_x_m * d.y;
  }
  return loading;
}

bool bends_sideways(const MemberLoading& loading) {
  return std::abs(loading.eccentricity_v_m) > 1e-12 || std::abs(loading.moment_v_Nm) > 1e-9;
}

bool is_concentric(const Load& load) {
  return load.moments_given ? load.moment_x_Nm == 0.0 && load.moment_y_Nm == 0.0
                            : load.eccentricity_x_m == 0.0 && load.eccentricity_y_m == 0.0;
}

/// In a section that is symmetric both ways an imperfection against the eccentricity only lessens
/// the moment of the one along it.
bool relieves_the_load(const MemberLoading& loading) {
  return loading.eccentricity_u_m < -1e-12 || loading.moment_u_Nm < -1e-9;
}

bool is_doubly_symmetric(const Column& column, const thermal::OrthogonalGrid& grid,
                         const std::vector<Direction>& directions,
                         const std::vector<HotMaterials>& times) {
  return std::all_of(directions.begin(), directions.end(), [&](const Direction& d) {
    const FibreLayout layout = fibre_layout(column.section, grid, d);
    return symmetric_about_v(SectionMoments(layout, times));
  });
}

std::vector<HotMaterials> sample_times(const SectionMaterials& materials) {
  const double end_s = materials.history().end_s();
  std::vector<HotMaterials> times;
  for (const double share : {0.0, 0.25, 1.0}) times.push_back(materials.at(share * end_s));
  return times;
}

}  // namespace

MemberSetup member_setup(const Column& column, const SectionMaterials& materials) {
  const std::vector<HotMaterials> times = sample_times(materials);
  const thermal::OrthogonalGrid& grid = materials.history().grid();
  MemberSetup setup;
  const std::vector<Direction> directions = candidate_directions(column, grid, times);
  const bool doubly_symmetric = is_doubly_symmetric(column, grid, directions, times);
  for (const Direction& direction : directions) {
    BendingCase bending{direction, fibre_layout(column.section, grid, direction),
                        loading_in(column, direction)};
    const SectionMoments moments(bending.layout, times);
    if (doubly_symmetric && relieves_the_load(bending.loading)) continue;
    bending.loading.biaxial = !symmetric_about_u(moments) || bends_sideways(bending.loading);
    if (!bending.loading.biaxial) bending.layout = merged_in_v(bending.layout);
    const bool known =
        std::any_of(setup.cases.begin(), setup.cases.end(),
                    [&](const BendingCase& c) { return equivalent(c, bending, times); });
    if (!known) setup.cases.push_back(std::move(bending));
  }
  const double length_m = column.member.buckling_length_m;
  setup.shape = is_concentric(column.load) && doubly_symmetric
                    ? half_sine_shape(length_m)
                    : integrated_shape(length_m, kHalfLengthIntervals);
  return setup;
}

}  // namespace ringward::mechanical
