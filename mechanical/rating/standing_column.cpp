#include "mechanical/rating/standing_column.hpp"

namespace ringward::mechanical {
namespace {

/// Constant end moments are reached through the eccentricity that gives them at the applied load.
MemberLoading as_eccentricity(const MemberLoading& loading, double load_N) {
  MemberLoading result = loading;
  result.eccentricity_u_m += loading.moment_u_Nm / load_N;
  result.eccentricity_v_m += loading.moment_v_Nm / load_N;
  result.moment_u_Nm = 0.0;
  result.moment_v_Nm = 0.0;
  return result;
}

constexpr double kStartStrain = 1e-5;

}  // namespace

void StandingColumn::build(const HotMaterials& hot) {
  const ConfinementModel model = gap_closed_ ? ConfinementModel::none : fixed_->model;
  const TubeGrip grip = tube_grip(fixed_->column, model, fixed_->bending.layout, hot);
  section_ = std::make_shared<HotSection>(fixed_->bending.layout, hot, grip,
                                          fixed_->materials.cold_concrete_Pa());
  model_ = std::make_shared<MemberModel>(*section_, fixed_->shape, fixed_->bending.loading,
                                         section_->plastic_N());
  time_s_ = hot.time_s;
  tube_strain_ = hot.tube_strain_now;
  tube_contraction_ = hot.tube ? hot.tube->thermal_strain - hot.tube_strain_now : 0.0;
}

Standing StandingColumn::settle(const PathPoint& from) {
  const EquilibriumPath path(*model_);
  const EquilibriumPath::Walk walk = path.walk_to_force(from, model_->scaled_N(fixed_->load_N));
  stance_.point = walk.point;
  stance_.mid_height = model_->plane(walk.point.q, 0);
  if (fixed_->column.section.tube) {
    const double elongation = -stance_.mid_height.eps0;
    stance_.gap_closure_m =
        fixed_->column.section.tube->clear_height_m * (tube_strain_ - elongation);
  }
  return walk.end == EquilibriumPath::End::at_force ? Standing::stands : Standing::falls;
}

Standing StandingColumn::load_cold(const HotMaterials& cold) {
  build(cold);
  const MemberLoading proportional = as_eccentricity(fixed_->bending.loading, fixed_->load_N);
  const MemberModel loading_up(*section_, fixed_->shape, proportional, section_->plastic_N());
  const EquilibriumPath path(loading_up);
  std::optional<PathPoint> start = path.start(kStartStrain);
  if (!start) return Standing::lost;
  const double target = loading_up.scaled_N(fixed_->load_N);
  const EquilibriumPath::Walk walk = path.walk_to_force(*start, target);
  stance_.point = walk.point;
  if (walk.end == EquilibriumPath::End::at_limit) return Standing::falls;
  const EquilibriumPath constant_moment(*model_);
  std::optional<PathPoint> there = constant_moment.project(walk.point.q, walk.point.tangent);
  if (!there) return Standing::lost;
  // Under constant moments more force can mean less curvature: forward is where the force grows.
  if (there->N_slope() < 0.0) there->tangent = -there->tangent;
  return settle(*there);
}

Standing StandingColumn::settle_near(const Eigen::VectorXd& before) {
  // Forces are scaled by the plastic resistance, which changes with time.
  Eigen::VectorXd guess = before;
  guess(guess.size() - 1) = model_->scaled_N(fixed_->load_N);
  const EquilibriumPath path(*model_);
  const std::optional<PathPoint> near = path.project(guess, stance_.point.tangent);
  return near ? settle(*near) : Standing::lost;
}

Standing StandingColumn::move_to(const HotMaterials& hot) {
  const Eigen::VectorXd before = stance_.point.q;
  build(hot);
  const Standing standing = settle_near(before);
  if (standing != Standing::stands) return standing;
  const Eigen::Index strains = before.size() - 1;
  const double moved =
      (stance_.point.q.head(strains) - before.head(strains)).lpNorm<Eigen::Infinity>();
  return moved > kLargestMove ? Standing::jumps : Standing::stands;
}

Standing StandingColumn::close_gap(const HotMaterials& hot) {
  gap_closed_ = true;
  const Eigen::VectorXd before = stance_.point.q;
  build(hot);
  return settle_near(before);
}

PathPoint StandingColumn::limit() const {
  return EquilibriumPath(*model_).walk_to_maximum(stance_.point);
}

double StandingColumn::reserve_N() const {
  const EquilibriumPath path(*model_);
  return path.largest_force(stance_.point) * section_->plastic_N();
}

double StandingColumn::regained_hoop_Pa() const {
  if (tube_contraction_ <= 0.0) return 0.0;
  return section_->hoop_after_contraction_Pa(stance_.mid_height, tube_contraction_);
}

double StandingColumn::force_N(const PathPoint& point) const { return model_->axial_N(point.q); }

}  // namespace ringward::mechanical
