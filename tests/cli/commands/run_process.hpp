#pragma once

#include <filesystem>
#include <map>
#include <string>
#include <vector>

namespace ringward::testing {

/// What a finished process left behind.
struct ProcessResult {
  int exit_code = -1;  ///< 128 + n when signal n killed it
  std::string out;
  std::string err;
  long peak_kB = 0;  ///< largest resident size of a process run without a terminal
};

/// How the real program is started. Output goes to files unless a device is named.
struct ProcessSetup {
  std::string stdin_text = {};
  std::filesystem::path folder = ".";                 ///< where it runs
  std::map<std::string, std::string> variables = {};  ///< added to the environment
  std::string stdout_device = {};                     ///< e.g. "/dev/full"
  bool close_stdout = false;
  int interrupt_after_ms = 0;  ///< 0: never
  int interrupt_signal = 2;    ///< SIGINT
};

/// Runs RINGWARD_BINARY and waits for its end.
[[nodiscard]] ProcessResult run_ringward(const std::vector<std::string>& arguments,
                                         const ProcessSetup& setup = {});

/// Runs it with standard output into a pipe whose reader is gone.
[[nodiscard]] ProcessResult run_with_broken_pipe(const std::vector<std::string>& arguments);

/// Runs it with standard output and standard error on a terminal; both come back in `out`.
[[nodiscard]] ProcessResult run_on_terminal(const std::vector<std::string>& arguments,
                                            const ProcessSetup& setup = {});

/// Runs another program of the system that is found by its name; exit code 127 if it is missing.
[[nodiscard]] ProcessResult run_program(const std::vector<std::string>& command);

/// A folder that disappears with its content.
class TemporaryFolder {
 public:
  TemporaryFolder();
  ~TemporaryFolder();
  TemporaryFolder(const TemporaryFolder&) = delete;
  TemporaryFolder& operator=(const TemporaryFolder&) = delete;

  [[nodiscard]] const std::filesystem::path& path() const { return path_; }
  [[nodiscard]] std::string operator/(const std::string& name) const {
    return (path_ / name).string();
  }
  /// Names of everything directly inside, sorted.
  [[nodiscard]] std::vector<std::string> names() const;

 private:
  std::filesystem::path path_;
};

[[nodiscard]] std::string file_content(const std::string& path);
void write_content(const std::string& path, const std::string& text);

}  // namespace ringward::testing
