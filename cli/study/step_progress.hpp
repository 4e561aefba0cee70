#pragma once

#include <chrono>
#include <cstddef>
#include <string>

#include "cli/terminal.hpp"

namespace ringward::cli {

/// "rated 120 of 1000, 21.4 per s, 41 s left" on a terminal, nothing elsewhere.
class StepProgress {
 public:
  /// @param done_before steps of an earlier run, which say nothing about the rate of this one
  StepProgress(std::string verb, std::size_t total, std::size_t done_before);
  void step();

 private:
  void show();

  using Clock = std::chrono::steady_clock;
  std::string verb_;
  std::size_t total_;
  std::size_t before_;
  std::size_t done_ = 0;
  Clock::time_point start_ = Clock::now();
  Clock::time_point shown_ = start_;
  ProgressLine line_;
};

/// "41 s", "3 min 20 s", "2 h 5 min".
[[nodiscard]] std::string duration_words(double seconds);

}  // namespace ringward::cli
