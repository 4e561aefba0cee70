#include "cli/output/output_files.hpp"

#include <fcntl.h>
#include <sys/stat.h>
#include <unistd.h>

#include <cerrno>
#include <csignal>
#include <cstdio>
#include <cstring>
#include <filesystem>
#include <string_view>

#include "thermal/base/error.hpp"

namespace ringward::cli {
namespace {

namespace fs = std::filesystem;

[[noreturn]] void fail(const std::string& path, const std::string& reason) {
  throw Error(ErrorKind::cannot_write, "cannot write " + path + ": " + reason);
}

[[noreturn]] void fail_with_errno(const std::string& path) { fail(path, std::strerror(errno)); }

// Keeps the usual reasons to stop a process waiting while files are on their way to the disk.
class SignalsWait {
 public:
  SignalsWait() {
    sigset_t waiting;
    sigemptyset(&waiting);
    for (const int number : {SIGINT, SIGTERM, SIGHUP}) sigaddset(&waiting, number);
    pthread_sigmask(SIG_BLOCK, &waiting, &before_);
  }
  ~SignalsWait() { pthread_sigmask(SIG_SETMASK, &before_, nullptr); }
  SignalsWait(const SignalsWait&) = delete;
  SignalsWait& operator=(const SignalsWait&) = delete;

 private:
  sigset_t before_{};
};

class Descriptor {
 public:
  explicit Descriptor(int value) : value_(value) {}
  ~Descriptor() {
    if (value_ >= 0) close(value_);
  }
  Descriptor(const Descriptor&) = delete;
  Descriptor& operator=(const Descriptor&) = delete;

  [[nodiscard]] int get() const { return value_; }
  [[nodiscard]] bool close_now() {
    const int result = close(value_);
    value_ = -1;
    return result == 0;
  }

 private:
  int value_;
};

// Where the bytes really go: the file behind a symbolic link, so that the link stays a link.
fs::path resolved(const std::string& path) {
  std::error_code failed;
  if (!fs::is_symlink(path, failed)) return path;
  const fs::path target = fs::canonical(path, failed);
  return failed ? fs::path(path) : target;
}

fs::path folder_of(const fs::path& path) {
  return path.has_parent_path() ? path.parent_path() : fs::path(".");
}

bool is_special(const fs::path& path) {
  std::error_code failed;
  const fs::file_status status = fs::status(path, failed);
  return fs::exists(status) && !fs::is_regular_file(status) && !fs::is_directory(status);
}

void write_and_close(Descriptor& file, const OutputFile& output, bool flush_to_disk) {
  std::string_view rest = output.content;
  while (!rest.empty()) {
    const ssize_t written = write(file.get(), rest.data(), rest.size());
    if (written < 0 && errno == EINTR) continue;
    if (written < 0) fail_with_errno(output.path);
    rest.remove_prefix(static_cast<std::size_t>(written));
  }
  if (flush_to_disk && fsync(file.get()) != 0) fail_with_errno(output.path);
  if (!file.close_now()) fail_with_errno(output.path);
}

void write_special(const OutputFile& output) {
  Descriptor file(open(output.path.c_str(), O_WRONLY | O_CLOEXEC));
  if (file.get() < 0) fail_with_errno(output.path);
  write_and_close(file, output, false);
}

// A complete copy beside its target; removed again unless it is put in place.
class StagedFile {
 public:
  StagedFile(const OutputFile& output, std::size_t number) : name_(output.path) {
    target_ = resolved(output.path);
    staged_ = folder_of(target_) /
              (".ringward-" + std::to_string(getpid()) + "-" + std::to_string(number) + ".part");
    Descriptor file(open(staged_.c_str(), O_WRONLY | O_CREAT | O_EXCL | O_CLOEXEC, 0666));
    if (file.get() < 0) {
      staged_.clear();
      fail_with_errno(name_);
    }
    try {
      keep_mode_of_target(file.get());
      write_and_close(file, output, true);
    } catch (...) {
      discard();
      throw;
    }
  }
  ~StagedFile() { discard(); }
  StagedFile(StagedFile&& other) noexcept
      : name_(std::move(other.name_)),
        target_(std::move(other.target_)),
        staged_(std::move(other.staged_)) {
    other.staged_.clear();
  }
  StagedFile(const StagedFile&) = delete;
  StagedFile& operator=(const StagedFile&) = delete;
  StagedFile& operator=(StagedFile&&) = delete;

  void put_in_place() {
    if (std::rename(staged_.c_str(), target_.c_str()) != 0) fail_with_errno(name_);
    staged_.clear();
  }

 private:
  void keep_mode_of_target(int file) const {
    struct stat status {};
    if (stat(target_.c_str(), &status) != 0) return;
    if (fchmod(file, status.st_mode & 07777) != 0) fail_with_errno(name_);
  }

  void discard() noexcept {
    if (!staged_.empty()) unlink(staged_.c_str());
    staged_.clear();
  }

  std::string name_;
  fs::path target_;
  fs::path staged_;
};

}  // namespace

void require_writable(const std::string& path) {
  std::error_code failed;
  const fs::path target = resolved(path);
  if (fs::is_directory(target, failed)) fail(path, "it is a folder; name a file");
  if (is_special(target)) return;
  const fs::path folder = folder_of(target);
  if (!fs::exists(folder, failed)) fail(path, "the folder " + folder.string() + " does not exist");
  if (!fs::is_directory(folder, failed)) fail(path, folder.string() + " is not a folder");
  if (access(folder.c_str(), W_OK | X_OK) != 0) fail_with_errno(path);
  if (fs::exists(target, failed) && access(target.c_str(), W_OK) != 0) fail_with_errno(path);
}

void write_files(const std::vector<OutputFile>& files) {
  const SignalsWait wait;
  std::vector<StagedFile> staged;
  staged.reserve(files.size());
  for (const OutputFile& file : files) {
    require_writable(file.path);
    if (!is_special(resolved(file.path))) staged.emplace_back(file, staged.size());
  }
  for (const OutputFile& file : files) {
    if (is_special(resolved(file.path))) write_special(file);
  }
  for (StagedFile& file : staged) file.put_in_place();
}

void create_folder(const std::string& path) {
  std::error_code failed;
  fs::create_directories(path, failed);
  if (failed)
    throw Error(ErrorKind::cannot_write, "cannot create " + path + ": " + failed.message());
  if (!fs::is_directory(path, failed)) fail(path, "it is not a folder");
}

}  // namespace ringward::cli
