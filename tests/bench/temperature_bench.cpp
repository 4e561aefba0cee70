// Time of the temperature solves of a round and a square tubed column (invented sections).
// Run on a quiet machine: bench_ringward --benchmark_filter=Temperature
#include <benchmark/benchmark.h>

#include "fires/fire_curve.hpp"
#include "thermal/base/units.hpp"
#include "thermal/temperature_history.hpp"

namespace {

using namespace ringward;
using namespace ringward::thermal;

Section tubed(Shape shape, double width_m, double wall_m) {
  Section section;
  section.outline = {shape, width_m, width_m};
  section.tube = Tube{.thickness_m = wall_m};
  section.core.moisture_fraction = 0.015;
  section.core.conductivity = ConductivityLimit::lower;
  return section;
}

FireExposure standard_fire(double minutes) {
  FireExposure fire;
  fire.duration_s = units::s_from_min(minutes);
  fire.gas = fires::gas_temperature(fires::nominal_curve("standard"), fire.duration_s);
  return fire;
}

void run(benchmark::State& state, const Section& section, double minutes) {
  const FireExposure fire = standard_fire(minutes);
  const Resolution resolution{static_cast<Accuracy>(state.range(0)), 1.0};
  HeatFlowStatistics done;
  for (auto _ : state) {
    const TemperatureHistory history = solve_heat_flow(section, fire, resolution);
    done = history.statistics();
    benchmark::DoNotOptimize(done);
  }
  state.counters["cells"] = static_cast<double>(done.cells);
  state.counters["steps"] = static_cast<double>(done.time_steps);
}

void TemperatureRound240min(benchmark::State& state) {
  run(state, tubed(Shape::circular, 0.4, 0.005), 240);
}
void TemperatureSquare120min(benchmark::State& state) {
  run(state, tubed(Shape::square, 0.3, 0.006), 120);
}

BENCHMARK(TemperatureRound240min)->DenseRange(0, 2)->Unit(benchmark::kMillisecond);
BENCHMARK(TemperatureSquare120min)->DenseRange(0, 2)->Unit(benchmark::kMillisecond);

}  // namespace
