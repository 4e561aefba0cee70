#include "cli/study/shared_heat_flow.hpp"

#include <exception>
#include <optional>

namespace ringward::cli {

/// One solution, or the reason why there is none.
struct SharedHeatFlow::Slot {
  std::mutex solving;
  std::optional<thermal::TemperatureHistory> history;
  std::exception_ptr failure;
};

SharedHeatFlow::SharedHeatFlow(const std::vector<std::size_t>& group_of) {
  for (const std::size_t group : group_of) ++groups_[group].waiting;
}

std::shared_ptr<SharedHeatFlow::Slot> SharedHeatFlow::slot(std::size_t group, double scale) {
  const std::lock_guard lock(guard_);
  std::shared_ptr<Slot>& slot = groups_[group].by_scale[scale];
  if (!slot) slot = std::make_shared<Slot>();
  return slot;
}

thermal::TemperatureHistory SharedHeatFlow::get(std::size_t group, const thermal::Section& section,
                                                const thermal::FireExposure& fire,
                                                const thermal::Resolution& resolution) {
  const std::shared_ptr<Slot> shared = slot(group, resolution.scale);
  const std::lock_guard lock(shared->solving);
  if (!shared->history && !shared->failure) {
    try {
      shared->history = thermal::solve_heat_flow(section, fire, resolution);
    } catch (...) {
      shared->failure = std::current_exception();
    }
    const std::lock_guard count(guard_);
    ++solved_;
  }
  if (shared->failure) std::rethrow_exception(shared->failure);
  return *shared->history;
}

void SharedHeatFlow::release(std::size_t group) {
  const std::lock_guard lock(guard_);
  const auto found = groups_.find(group);
  if (found == groups_.end()) return;
  if (found->second.waiting <= 1) {
    groups_.erase(found);
  } else {
    --found->second.waiting;
  }
}

std::size_t SharedHeatFlow::solved() const {
  const std::lock_guard lock(guard_);
  return solved_;
}

std::size_t SharedHeatFlow::kept() const {
  const std::lock_guard lock(guard_);
  std::size_t kept = 0;
  for (const auto& [group, entry] : groups_) kept += entry.by_scale.size();
  return kept;
}

}  // namespace ringward::cli
