#include "cli/process/external_program.hpp"

#include <gio/gio.h>

#include <memory>

namespace ringward::cli {
namespace {

struct Release {
  void operator()(GBytes* bytes) const { g_bytes_unref(bytes); }
  void operator()(GError* error) const { g_error_free(error); }
  void operator()(GSubprocess* process) const { g_object_unref(process); }
  void operator()(GSubprocessLauncher* launcher) const { g_object_unref(launcher); }
};
template <class Type>
using Owned = std::unique_ptr<Type, Release>;

std::string text_of(const Owned<GBytes>& bytes) {
  if (!bytes) return "";
  gsize size = 0;
  const void* data = g_bytes_get_data(bytes.get(), &size);
  return size == 0 ? "" : std::string(static_cast<const char*>(data), size);
}

ProgramRun not_run(const GError& error) {
  const bool missing = error.domain == G_SPAWN_ERROR && error.code == G_SPAWN_ERROR_NOENT;
  return {.outcome = missing ? ProgramOutcome::not_installed : ProgramOutcome::could_not_run,
          .exit_code = -1,
          .out = "",
          .err = error.message};
}

Owned<GSubprocess> started(const ProgramCall& call, GError** failure) {
  std::vector<const char*> words{call.name.c_str()};
  for (const std::string& argument : call.arguments) words.push_back(argument.c_str());
  words.push_back(nullptr);
  const Owned<GSubprocessLauncher> launcher(g_subprocess_launcher_new(
      static_cast<GSubprocessFlags>(G_SUBPROCESS_FLAGS_STDIN_PIPE | G_SUBPROCESS_FLAGS_STDOUT_PIPE |
                                    G_SUBPROCESS_FLAGS_STDERR_PIPE)));
  g_subprocess_launcher_setenv(launcher.get(), "LC_ALL", "C", TRUE);
  // Programs that know it write this time in place of the present one.
  g_subprocess_launcher_setenv(launcher.get(), "SOURCE_DATE_EPOCH", "0", TRUE);
  return Owned<GSubprocess>(g_subprocess_launcher_spawnv(launcher.get(), words.data(), failure));
}

int exit_code_of(GSubprocess* process) {
  if (g_subprocess_get_if_exited(process) != FALSE) return g_subprocess_get_exit_status(process);
  return 128 + g_subprocess_get_term_sig(process);
}

}  // namespace

ProgramRun run_external(const ProgramCall& call) {
  GError* failure = nullptr;
  const Owned<GSubprocess> process = started(call, &failure);
  if (!process) return not_run(*Owned<GError>(failure));
  const Owned<GBytes> input(g_bytes_new_static(call.input.data(), call.input.size()));
  GBytes* out = nullptr;
  GBytes* err = nullptr;
  // A program that ends before it has read everything makes this fail; its exit code then tells.
  const bool exchanged =
      g_subprocess_communicate(process.get(), input.get(), nullptr, &out, &err, &failure) != FALSE;
  const Owned<GBytes> out_owned(out);
  const Owned<GBytes> err_owned(err);
  const Owned<GError> failure_owned(failure);
  g_subprocess_wait(process.get(), nullptr, nullptr);
  ProgramRun run{.outcome = ProgramOutcome::finished,
                 .exit_code = exit_code_of(process.get()),
                 .out = text_of(out_owned),
                 .err = text_of(err_owned)};
  if (!exchanged && run.exit_code == 0) {
    run.outcome = ProgramOutcome::could_not_run;
    run.err = failure_owned ? failure_owned->message : "its output could not be read";
  }
  return run;
}

}  // namespace ringward::cli
