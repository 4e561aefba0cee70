#include "cli/terminal.hpp"

#include <fcntl.h>
#include <unistd.h>

#include <cerrno>
#include <csignal>
#include <cstdlib>
#include <cstring>

#include "cli/exit_code.hpp"
#include "thermal/base/error.hpp"

namespace ringward::cli {
namespace {

extern "C" void on_interrupt(int) {
  constexpr char kMessage[] = "\nringward: interrupted\n";
  // Only calls that are safe in a signal handler; there is nothing to do about a failed write.
  if (write(STDERR_FILENO, kMessage, sizeof kMessage - 1) < 0) _exit(130);
  _exit(static_cast<int>(ExitCode::interrupted));
}

void set_handler(int signal_number, void (*handler)(int)) {
  struct sigaction action {};
  action.sa_handler = handler;
  sigemptyset(&action.sa_mask);
  sigaction(signal_number, &action, nullptr);
}

// A closed descriptor would be handed to the next file opened. Opened the wrong way round on
// purpose, so that using it still fails.
void occupy_if_closed(int descriptor, int mode) {
  if (fcntl(descriptor, F_GETFD) != -1 || errno != EBADF) return;
  const int opened = open("/dev/null", mode);
  if (opened >= 0 && opened != descriptor) {
    dup2(opened, descriptor);
    close(opened);
  }
}

// Returns 0 or the errno of the write that failed.
int write_all(int descriptor, std::string_view text) {
  while (!text.empty()) {
    const ssize_t written = write(descriptor, text.data(), text.size());
    if (written < 0 && errno == EINTR) continue;
    if (written < 0) return errno;
    text.remove_prefix(static_cast<std::size_t>(written));
  }
  return 0;
}

bool is_set(const char* variable) {
  const char* value = std::getenv(variable);
  return value != nullptr && *value != '\0';
}

bool is_dumb_terminal() {
  const char* terminal = std::getenv("TERM");
  return terminal != nullptr && std::strcmp(terminal, "dumb") == 0;
}

}  // namespace

void prepare_process() {
  occupy_if_closed(STDIN_FILENO, O_WRONLY);
  occupy_if_closed(STDOUT_FILENO, O_RDONLY);
  occupy_if_closed(STDERR_FILENO, O_RDONLY);
  set_handler(SIGINT, on_interrupt);
  set_handler(SIGPIPE, SIG_IGN);
  set_handler(SIGXFSZ, SIG_IGN);
}

void write_stdout(std::string_view text) {
  const int failure = write_all(STDOUT_FILENO, text);
  if (failure == 0) return;
  if (failure == EPIPE) throw BrokenPipe();
  throw Error(ErrorKind::cannot_write,
              std::string("cannot write to standard output: ") + std::strerror(failure));
}

void write_stderr(std::string_view text) { write_all(STDERR_FILENO, text); }

std::string Style::wrap(const char* code, const std::string& text) const {
  if (!colour_) return text;
  return std::string("\x1b[") + code + "m" + text + "\x1b[0m";
}

Style stdout_style(bool no_color) {
  return Style(!no_color && !is_set("NO_COLOR") && !is_dumb_terminal() &&
               isatty(STDOUT_FILENO) == 1);
}

ProgressLine::ProgressLine(const std::string& what) {
  if (isatty(STDERR_FILENO) == 1) write_stderr(what + " ...");
}

void ProgressLine::show(const std::string& what) {
  if (isatty(STDERR_FILENO) == 1) write_stderr("\r\x1b[K" + what);
}

ProgressLine::~ProgressLine() {
  if (isatty(STDERR_FILENO) == 1) write_stderr("\r\x1b[K");
}

}  // namespace ringward::cli
