#include "tests/cli/commands/run_process.hpp"

#include <fcntl.h>
#include <pty.h>
#include <sys/resource.h>
#include <sys/wait.h>
#include <unistd.h>

#include <algorithm>
#include <cerrno>
#include <csignal>
#include <cstdlib>
#include <fstream>
#include <sstream>
#include <stdexcept>

namespace ringward::testing {
namespace {

namespace fs = std::filesystem;

void put_on(int descriptor, const std::string& path, int flags) {
  const int opened = open(path.c_str(), flags, 0600);
  if (opened < 0 || dup2(opened, descriptor) < 0) _exit(126);
  if (opened != descriptor) close(opened);
}

[[noreturn]] void become(const std::vector<std::string>& command) {
  std::vector<char*> pointers;
  for (const std::string& word : command) pointers.push_back(const_cast<char*>(word.c_str()));
  pointers.push_back(nullptr);
  execvp(pointers.front(), pointers.data());
  _exit(127);
}

int exit_code_of(pid_t child, rusage* usage = nullptr) {
  int status = 0;
  while (wait4(child, &status, 0, usage) < 0) {
    if (errno != EINTR) throw std::runtime_error("wait4 failed");
  }
  return WIFEXITED(status) ? WEXITSTATUS(status) : 128 + WTERMSIG(status);
}

std::vector<std::string> with_binary(const std::vector<std::string>& arguments) {
  std::vector<std::string> command{RINGWARD_BINARY};
  command.insert(command.end(), arguments.begin(), arguments.end());
  return command;
}

void set_up_child(const ProcessSetup& setup) {
  for (const auto& [name, value] : setup.variables) setenv(name.c_str(), value.c_str(), 1);
  if (chdir(setup.folder.c_str()) != 0) _exit(126);
}

ProcessResult run_command(const std::vector<std::string>& command, const ProcessSetup& setup) {
  const TemporaryFolder streams;
  write_content(streams / "in", setup.stdin_text);
  for (const char* name : {"out", "err"})
    write_content(streams / name, "");  // killed before it starts
  const std::string out = setup.stdout_device.empty() ? streams / "out" : setup.stdout_device;
  const pid_t child = fork();
  if (child == 0) {
    put_on(STDIN_FILENO, streams / "in", O_RDONLY);
    put_on(STDOUT_FILENO, out, O_WRONLY | O_CREAT);
    put_on(STDERR_FILENO, streams / "err", O_WRONLY | O_CREAT);
    if (setup.close_stdout) close(STDOUT_FILENO);
    set_up_child(setup);
    become(command);
  }
  if (setup.interrupt_after_ms > 0) {
    usleep(static_cast<useconds_t>(setup.interrupt_after_ms) * 1000);
    kill(child, setup.interrupt_signal);
  }
  ProcessResult result;
  rusage usage{};
  result.exit_code = exit_code_of(child, &usage);
  result.peak_kB = usage.ru_maxrss;
  if (setup.stdout_device.empty()) result.out = file_content(streams / "out");
  result.err = file_content(streams / "err");
  return result;
}

// A terminal turns line feeds into carriage return and line feed.
std::string without_carriage_returns(std::string text) {
  text.erase(std::remove(text.begin(), text.end(), '\r'), text.end());
  return text;
}

}  // namespace

ProcessResult run_ringward(const std::vector<std::string>& arguments, const ProcessSetup& setup) {
  return run_command(with_binary(arguments), setup);
}

ProcessResult run_program(const std::vector<std::string>& command) {
  return run_command(command, {});
}

ProcessResult run_with_broken_pipe(const std::vector<std::string>& arguments) {
  const TemporaryFolder streams;
  int ends[2];
  if (pipe(ends) != 0) throw std::runtime_error("pipe failed");
  const std::vector<std::string> command = with_binary(arguments);
  const pid_t child = fork();
  if (child == 0) {
    close(ends[0]);
    dup2(ends[1], STDOUT_FILENO);
    close(ends[1]);
    put_on(STDERR_FILENO, streams / "err", O_WRONLY | O_CREAT);
    become(command);
  }
  close(ends[0]);
  close(ends[1]);
  ProcessResult result;
  result.exit_code = exit_code_of(child);
  result.err = file_content(streams / "err");
  return result;
}

ProcessResult run_on_terminal(const std::vector<std::string>& arguments,
                              const ProcessSetup& setup) {
  int terminal = -1;
  const std::vector<std::string> command = with_binary(arguments);
  const pid_t child = forkpty(&terminal, nullptr, nullptr, nullptr);
  if (child < 0) throw std::runtime_error("forkpty failed");
  if (child == 0) {
    setenv("TERM", "xterm", 1);
    unsetenv("NO_COLOR");
    set_up_child(setup);
    become(command);
  }
  ProcessResult result;
  char buffer[4096];
  for (ssize_t count = 0; (count = read(terminal, buffer, sizeof buffer)) > 0;) {
    result.out.append(buffer, static_cast<std::size_t>(count));
  }
  close(terminal);
  result.exit_code = exit_code_of(child);
  result.out = without_carriage_returns(result.out);
  return result;
}

TemporaryFolder::TemporaryFolder() {
  std::string name = (fs::temp_directory_path() / "ringward-test-XXXXXX").string();
  if (mkdtemp(name.data()) == nullptr) throw std::runtime_error("no temporary folder");
  path_ = name;
}

TemporaryFolder::~TemporaryFolder() {
  std::error_code ignored;
  fs::remove_all(path_, ignored);
}

std::vector<std::string> TemporaryFolder::names() const {
  std::vector<std::string> names;
  for (const auto& entry : fs::directory_iterator(path_)) {
    names.push_back(entry.path().filename().string());
  }
  std::sort(names.begin(), names.end());
  return names;
}

std::string file_content(const std::string& path) {
  std::ifstream file(path, std::ios::binary);
  if (!file) throw std::runtime_error("cannot read " + path);
  std::ostringstream text;
  text << file.rdbuf();
  return text.str();
}

void write_content(const std::string& path, const std::string& text) {
  std::ofstream file(path, std::ios::binary);
  file << text;
  if (!file) throw std::runtime_error("cannot write " + path);
}

}  // namespace ringward::testing
