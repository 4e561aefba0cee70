#include "cli/study/step_progress.hpp"

#include <fmt/format.h>

#include <cmath>

namespace ringward::cli {
namespace {

constexpr std::chrono::milliseconds kBetweenLines{200};

}  // namespace

StepProgress::StepProgress(std::string verb, std::size_t total, std::size_t done_before)
    : verb_(std::move(verb)),
      total_(total),
      before_(done_before),
      line_(fmt::format("{} {} of {}", verb_, before_, total_)) {}

void StepProgress::step() {
  ++done_;
  const Clock::time_point now = Clock::now();
  if (now - shown_ < kBetweenLines && before_ + done_ < total_) return;
  shown_ = now;
  show();
}

void StepProgress::show() {
  const double elapsed_s = std::chrono::duration<double>(shown_ - start_).count();
  const double per_s = static_cast<double>(done_) / std::max(elapsed_s, 1e-3);
  const double left_s = static_cast<double>(total_ - before_ - done_) / per_s;
  line_.show(fmt::format("{} {} of {}, {:.3g} per s, {} left", verb_, before_ + done_, total_,
                         per_s, duration_words(left_s)));
}

std::string duration_words(double seconds) {
  const auto whole = static_cast<long>(std::ceil(seconds));
  if (whole < 60) return fmt::format("{} s", whole);
  if (whole < 3600) return fmt::format("{} min {} s", whole / 60, whole % 60);
  return fmt::format("{} h {} min", whole / 3600, whole % 3600 / 60);
}

}  // namespace ringward::cli
