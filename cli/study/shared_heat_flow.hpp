#pragma once

#include <cstddef>
#include <map>
#include <memory>
#include <mutex>
#include <vector>

#include "thermal/boundary/exposure.hpp"
#include "thermal/section/section.hpp"
#include "thermal/temperature_history.hpp"

namespace ringward::cli {

/// Temperatures that several layouts share: solved by the first that asks, dropped after the last
/// that could. Safe between threads; which thread solves changes no bit of the result.
class SharedHeatFlow {
 public:
  /// @param group_of number of the group of each layout that is still to be rated
  explicit SharedHeatFlow(const std::vector<std::size_t>& group_of);

  /// @throws Error(solver_breakdown) for every layout of the group alike
  [[nodiscard]] thermal::TemperatureHistory get(std::size_t group, const thermal::Section& section,
                                                const thermal::FireExposure& fire,
                                                const thermal::Resolution& resolution);

  /// One layout of the group is done.
  void release(std::size_t group);

  [[nodiscard]] std::size_t solved() const;  ///< heat flows so far
  [[nodiscard]] std::size_t kept() const;    ///< in memory now

 private:
  struct Slot;
  struct Group {
    std::size_t waiting = 0;
    std::map<double, std::shared_ptr<Slot>> by_scale;
  };

  [[nodiscard]] std::shared_ptr<Slot> slot(std::size_t group, double scale);

  mutable std::mutex guard_;
  std::map<std::size_t, Group> groups_;
  std::size_t solved_ = 0;
};

}  // namespace ringward::cli
