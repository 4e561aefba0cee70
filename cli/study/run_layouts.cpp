#include "cli/study/run_layouts.hpp"

#include <tbb/global_control.h>
#include <tbb/info.h>
#include <tbb/parallel_pipeline.h>
#include <tbb/task_arena.h>
#include <tbb/task_scheduler_observer.h>

#include <algorithm>
#include <csignal>

namespace ringward::cli {
namespace {

/// An interrupt must find the main thread, which holds it back while files are put in place.
class SignalsForMainThread final : public tbb::task_scheduler_observer {
 public:
  explicit SignalsForMainThread(tbb::task_arena& arena) : tbb::task_scheduler_observer(arena) {
    observe(true);
  }
  ~SignalsForMainThread() override { observe(false); }
  SignalsForMainThread(const SignalsForMainThread&) = delete;
  SignalsForMainThread& operator=(const SignalsForMainThread&) = delete;

  void on_scheduler_entry(bool is_worker) override {
    if (!is_worker) return;
    sigset_t left_alone;
    sigemptyset(&left_alone);
    for (const int number : {SIGINT, SIGTERM, SIGHUP}) sigaddset(&left_alone, number);
    pthread_sigmask(SIG_BLOCK, &left_alone, nullptr);
  }
};

}  // namespace

void run_layouts(const std::vector<std::size_t>& layouts, std::size_t jobs,
                 const std::function<LayoutRow(std::size_t)>& rate,
                 const std::function<void(const LayoutRow&)>& done) {
  const auto cores = static_cast<std::size_t>(tbb::info::default_concurrency());
  const std::size_t threads = jobs == 0 ? cores : jobs;
  const tbb::global_control limit(tbb::global_control::max_allowed_parallelism,
                                  std::max(threads, cores));
  tbb::task_arena arena(static_cast<int>(threads));
  const SignalsForMainThread observer(arena);
  std::size_t next = 0;
  const auto take = tbb::make_filter<void, std::size_t>(
      tbb::filter_mode::serial_in_order, [&](tbb::flow_control& control) -> std::size_t {
        if (next < layouts.size()) return layouts[next++];
        control.stop();
        return 0;
      });
  const auto work = tbb::make_filter<std::size_t, LayoutRow>(
      tbb::filter_mode::parallel, [&](std::size_t index) { return rate(index); });
  const auto keep = tbb::make_filter<LayoutRow, void>(tbb::filter_mode::serial_out_of_order,
                                                      [&](const LayoutRow& row) { done(row); });
  arena.execute([&] { tbb::parallel_pipeline(threads, take & work & keep); });
}

}  // namespace ringward::cli
