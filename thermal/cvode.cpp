#include "thermal/cvode.hpp"

#include <cvode/cvode.h>
#include <cvode/cvode_ls.h>
#include <fmt/format.h>
#include <nvector/nvector_serial.h>
#include <sunlinsol/sunlinsol_klu.h>
#include <sunmatrix/sunmatrix_sparse.h>

#include <algorithm>
#include <cmath>
#include <exception>
#include <sundials/sundials_context.hpp>
#include <utility>

#include "thermal/base/error.hpp"
#include "thermal/base/units.hpp"

namespace ringward::thermal {
namespace {

constexpr long kMostFailedSteps = 40;
// Without a bound, steps would shrink for ever in front of a time at which no rate exists.
constexpr double kShortestStep_s = 1e-8;
constexpr int kOrderByMinimumDegree = 0;  // KLU's AMD: the pattern is symmetric

struct VectorDeleter {
  void operator()(N_Vector v) const { N_VDestroy(v); }
};
struct MatrixDeleter {
  void operator()(SUNMatrix m) const { SUNMatDestroy(m); }
};
struct SolverDeleter {
  void operator()(SUNLinearSolver s) const { SUNLinSolFree(s); }
};
struct CvodeDeleter {
  void operator()(void* memory) const { CVodeFree(&memory); }
};
using Vector = std::unique_ptr<_generic_N_Vector, VectorDeleter>;
using Matrix = std::unique_ptr<_generic_SUNMatrix, MatrixDeleter>;
using Solver = std::unique_ptr<_generic_SUNLinearSolver, SolverDeleter>;
using Cvode = std::unique_ptr<void, CvodeDeleter>;

std::span<double> values_of(N_Vector v) {
  return {N_VGetArrayPointer(v), static_cast<std::size_t>(N_VGetLength(v))};
}

bool all_finite(std::span<const double> values) {
  double sum = 0;
  for (double value : values) sum += value * 0.0;
  return sum == 0.0;
}

// The library never prints: CVODE's texts are dropped, its return values are read.
void drop_message(int, const char*, const char*, char*, void*) {}

}  // namespace

struct CvodeIntegrator::Memory {
  OdeSystem* system = nullptr;
  sundials::Context context;
  Vector state, scratch, weights;
  Matrix matrix;
  Solver solver;
  Cvode cvode;
  double t_s = 0;
  std::size_t steps_before_restart = 0;
  std::exception_ptr thrown;

  static int rate(double t_s, N_Vector u, N_Vector du_dt, void* user);
  static int jacobian(double t_s, N_Vector u, N_Vector, SUNMatrix m, void* user, N_Vector, N_Vector,
                      N_Vector);
  template <typename F>
  int guarded(const F& call) {
    try {
      return call();
    } catch (...) {
      thrown = std::current_exception();
      return -1;
    }
  }
  [[nodiscard]] std::size_t size() const {
    return static_cast<std::size_t>(N_VGetLength(state.get()));
  }
  void create_matrix();
  [[noreturn]] void rethrow_with_time();
  [[noreturn]] void fail(int flag);
  [[nodiscard]] std::size_t worst_component();
};

namespace {

void require(int flag, const char* what) {
  if (flag < 0) throw Error(ErrorKind::solver_breakdown, fmt::format("CVODE: {} failed", what));
}

}  // namespace

int CvodeIntegrator::Memory::rate(double t_s, N_Vector u, N_Vector du_dt, void* user) {
  auto& memory = *static_cast<Memory*>(user);
  return memory.guarded([&] {
    memory.system->rate(t_s, values_of(u), values_of(du_dt));
    // A positive value asks CVODE for a smaller step.
    return all_finite(values_of(du_dt)) ? 0 : 1;
  });
}

int CvodeIntegrator::Memory::jacobian(double t_s, N_Vector u, N_Vector, SUNMatrix m, void* user,
                                      N_Vector, N_Vector, N_Vector) {
  auto& memory = *static_cast<Memory*>(user);
  return memory.guarded([&] {
    const SparsePattern& pattern = memory.system->pattern();
    std::copy(pattern.column_starts.begin(), pattern.column_starts.end(),
              SUNSparseMatrix_IndexPointers(m));
    std::copy(pattern.rows.begin(), pattern.rows.end(), SUNSparseMatrix_IndexValues(m));
    const std::span<double> values(SUNSparseMatrix_Data(m), pattern.rows.size());
    memory.system->jacobian(t_s, values_of(u), values);
    return all_finite(values) ? 0 : 1;
  });
}

void CvodeIntegrator::Memory::create_matrix() {
  const auto n = static_cast<sunindextype>(size());
  const auto entries = static_cast<sunindextype>(system->pattern().rows.size());
  matrix.reset(SUNSparseMatrix(n, n, entries, CSC_MAT, context));
  solver.reset(SUNLinSol_KLU(state.get(), matrix.get(), context));
  if (!matrix || !solver) throw Error(ErrorKind::solver_breakdown, "CVODE: out of memory");
  require(SUNLinSol_KLUSetOrdering(solver.get(), kOrderByMinimumDegree), "the ordering");
}

std::size_t CvodeIntegrator::Memory::worst_component() {
  if (CVodeGetEstLocalErrors(cvode.get(), scratch.get()) < 0) return 0;
  if (CVodeGetErrWeights(cvode.get(), weights.get()) < 0) return 0;
  const std::span<double> errors = values_of(scratch.get());
  const std::span<double> scale = values_of(weights.get());
  std::size_t worst = 0;
  for (std::size_t k = 0; k < errors.size(); ++k) {
    if (!std::isfinite(errors[k])) return k;
    if (std::abs(errors[k] * scale[k]) > std::abs(errors[worst] * scale[worst])) worst = k;
  }
  return worst;
}

void CvodeIntegrator::Memory::rethrow_with_time() {
  const std::string when = fmt::format("heat flow at {:.2f} min", units::min_from_s(t_s));
  try {
    std::rethrow_exception(std::exchange(thrown, nullptr));
  } catch (const Error& error) {
    throw error.within(when);
  } catch (const std::exception& error) {
    throw Error(ErrorKind::solver_breakdown, when + ": " + error.what());
  } catch (...) {
    throw Error(ErrorKind::solver_breakdown, when + ": unknown error");
  }
}

void CvodeIntegrator::Memory::fail(int flag) {
  const std::unique_ptr<char, void (*)(void*)> name(CVodeGetReturnFlagName(flag), std::free);
  throw Error(ErrorKind::solver_breakdown,
              fmt::format("heat flow: no solution after {:.3f} min, worst at {} ({})",
                          units::min_from_s(t_s), system->place(worst_component()), name.get()));
}

CvodeIntegrator::CvodeIntegrator(OdeSystem& system, const std::vector<double>& start,
                                 TimeTolerance tolerance)
    : memory_(std::make_unique<Memory>()) {
  Memory& m = *memory_;
  m.system = &system;
  const auto n = static_cast<sunindextype>(start.size());
  m.state.reset(N_VNew_Serial(n, m.context));
  m.scratch.reset(N_VClone(m.state.get()));
  m.weights.reset(N_VClone(m.state.get()));
  m.cvode.reset(CVodeCreate(CV_BDF, m.context));
  if (!m.state || !m.scratch || !m.weights || !m.cvode) {
    throw Error(ErrorKind::solver_breakdown, "CVODE: out of memory");
  }
  std::copy(start.begin(), start.end(), values_of(m.state.get()).begin());
  void* cvode = m.cvode.get();
  require(CVodeSetErrHandlerFn(cvode, drop_message, nullptr), "the message handler");
  require(CVodeInit(cvode, Memory::rate, 0.0, m.state.get()), "the start");
  require(CVodeSetUserData(cvode, &m), "the user data");
  require(CVodeSStolerances(cvode, tolerance.relative, tolerance.absolute), "the tolerance");
  require(CVodeSetMaxOrd(cvode, tolerance.highest_order), "the highest order");
  require(CVodeSetMinStep(cvode, kShortestStep_s), "the shortest step");
  require(CVodeSetMaxErrTestFails(cvode, kMostFailedSteps), "the limit of failed steps");
  m.create_matrix();
  require(CVodeSetLinearSolver(cvode, m.solver.get(), m.matrix.get()), "the linear solver");
  require(CVodeSetJacFn(cvode, Memory::jacobian), "the Jacobian");
}

CvodeIntegrator::~CvodeIntegrator() = default;
CvodeIntegrator::CvodeIntegrator(CvodeIntegrator&&) noexcept = default;
CvodeIntegrator& CvodeIntegrator::operator=(CvodeIntegrator&&) noexcept = default;

void CvodeIntegrator::stop_at(double t_s) {
  require(CVodeSetStopTime(memory_->cvode.get(), t_s), "the stop time");
}

double CvodeIntegrator::step() {
  Memory& m = *memory_;
  const int flag = CVode(m.cvode.get(), 1e300, m.state.get(), &m.t_s, CV_ONE_STEP);
  if (m.thrown) m.rethrow_with_time();
  if (flag < 0) m.fail(flag);
  if (!all_finite(values_of(m.state.get()))) m.fail(CV_CONV_FAILURE);
  return m.t_s;
}

void CvodeIntegrator::restart() {
  Memory& m = *memory_;
  m.steps_before_restart = steps();
  require(CVodeReInit(m.cvode.get(), m.t_s, m.state.get()), "the restart");
}

double CvodeIntegrator::time_s() const { return memory_->t_s; }

std::span<const double> CvodeIntegrator::state() const { return values_of(memory_->state.get()); }

void CvodeIntegrator::interpolate(double t_s, int derivative, std::span<double> values) const {
  require(CVodeGetDky(memory_->cvode.get(), t_s, derivative, memory_->scratch.get()),
          "the interpolation within a step");
  const std::span<double> found = values_of(memory_->scratch.get());
  std::copy(found.begin(), found.end(), values.begin());
}

std::size_t CvodeIntegrator::steps() const {
  long count = 0;
  require(CVodeGetNumSteps(memory_->cvode.get(), &count), "the count of steps");
  return memory_->steps_before_restart + static_cast<std::size_t>(count);
}

std::string CvodeIntegrator::work() const {
  void* cvode = memory_->cvode.get();
  long rates = 0, factorisations = 0, jacobians = 0, error_fails = 0, newton_fails = 0;
  require(CVodeGetNumRhsEvals(cvode, &rates), "a count");
  require(CVodeGetNumLinSolvSetups(cvode, &factorisations), "a count");
  require(CVodeGetNumJacEvals(cvode, &jacobians), "a count");
  require(CVodeGetNumErrTestFails(cvode, &error_fails), "a count");
  require(CVodeGetNumNonlinSolvConvFails(cvode, &newton_fails), "a count");
  return fmt::format("{} steps, {} rates, {} Jacobians, {} factorisations, {} + {} failures",
                     steps(), rates, jacobians, factorisations, error_fails, newton_fails);
}

}  // namespace ringward::thermal
