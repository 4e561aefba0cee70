#pragma once

#include <cstddef>
#include <memory>
#include <span>
#include <string>
#include <vector>

#include "thermal/heat_equation.hpp"

namespace ringward::thermal {

/// A system of ordinary differential equations du/dt = f(t, u) with a sparse Jacobian.
class OdeSystem {
 public:
  virtual ~OdeSystem() = default;
  [[nodiscard]] virtual const SparsePattern& pattern() const = 0;
  virtual void rate(double t_s, std::span<const double> u, std::span<double> du_dt) = 0;
  virtual void jacobian(double t_s, std::span<const double> u, std::span<double> values) = 0;
  /// Where component k lies, for error texts, e.g. "x = 1.0 mm, y = 2.0 mm".
  [[nodiscard]] virtual std::string place(std::size_t k) const = 0;
};

struct TimeTolerance {
  double relative = 1e-4;
  double absolute = 0.05;  ///< in the unit of the state
  int highest_order = 5;
};

/// CVODE's variable-order BDF with Newton's iteration and the sparse direct solver KLU.
/// What is thrown in a call of the system is thrown again by step(), with the time put in front.
class CvodeIntegrator {
 public:
  CvodeIntegrator(OdeSystem& system, const std::vector<double>& start, TimeTolerance tolerance);
  ~CvodeIntegrator();
  CvodeIntegrator(CvodeIntegrator&&) noexcept;
  CvodeIntegrator& operator=(CvodeIntegrator&&) noexcept;

  /// No step passes t_s until the next call.
  void stop_at(double t_s);
  /// Takes one step. @return the time reached [s]
  /// @throws Error(solver_breakdown) with the time and the worst place
  double step();
  /// Forgets the past steps: for a time at which du/dt turns sharply.
  void restart();

  [[nodiscard]] double time_s() const;
  [[nodiscard]] std::span<const double> state() const;
  /// The solution or a time derivative of it, within the last step.
  void interpolate(double t_s, int derivative, std::span<double> values) const;
  [[nodiscard]] std::size_t steps() const;
  /// Counts of the work done: steps, evaluations of the rate and the Jacobian, factorisations.
  [[nodiscard]] std::string work() const;

 private:
  struct Memory;
  std::unique_ptr<Memory> memory_;
};

}  // namespace ringward::thermal
