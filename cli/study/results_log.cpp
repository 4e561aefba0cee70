#include "cli/study/results_log.hpp"

#include <fcntl.h>
#include <fmt/format.h>
#include <sys/file.h>
#include <unistd.h>

#include <algorithm>
#include <cerrno>
#include <cstring>
#include <filesystem>
#include <map>

#include "cli/commands/usage_error.hpp"
#include "cli/input/toml_reading.hpp"
#include "cli/output/output_files.hpp"
#include "cli/study/results_text.hpp"
#include "thermal/base/error.hpp"

namespace ringward::cli {
namespace {

namespace fs = std::filesystem;

constexpr const char* kFileName = "results.jsonl";
constexpr mode_t kMode = 0666;

[[noreturn]] void fail(const std::string& path) {
  throw Error(ErrorKind::cannot_write, "cannot write " + path + ": " + std::strerror(errno));
}

/// What a run that was killed while it put files in place leaves behind.
bool is_leftover(const fs::path& file) {
  const std::string name = file.filename().string();
  return name.starts_with(".ringward-") && name.ends_with(".part");
}

bool holds_anything(const std::string& folder) {
  std::error_code missing;
  const fs::directory_iterator files(folder, missing);
  return std::any_of(begin(files), end(files),
                     [](const fs::directory_entry& file) { return !is_leftover(file.path()); });
}

void remove_leftovers(const std::string& folder) {
  std::vector<fs::path> leftovers;
  for (const fs::directory_entry& file : fs::directory_iterator(folder)) {
    if (is_leftover(file.path())) leftovers.push_back(file.path());
  }
  std::error_code ignored;
  for (const fs::path& file : leftovers) fs::remove(file, ignored);
}

std::string what_changed(const ResultsHeader& before, const ResultsHeader& now) {
  std::string changed;
  if (before.version != now.version) {
    changed = fmt::format("they were computed by version {}, this is version {}", before.version,
                          now.version);
  }
  if (before.study_sha256 != now.study_sha256) {
    changed += std::string(changed.empty() ? "" : ", and ") +
               "the study, its base column or a file that they name changed since";
  }
  return changed;
}

}  // namespace

ResultsLog::ResultsLog(std::string folder, const Study& study, Resume resume)
    : folder_(std::move(folder)), finished_(study.count(), false) {
  const bool has_results = fs::exists(path());
  if (holds_anything(folder_) && (resume == Resume::no || !has_results)) {
    throw UsageError(folder_ + " is not empty" +
                     (has_results
                          ? "; --resume goes on with the study in it, or name another folder"
                          : " and holds no study to go on with; name another folder"));
  }
  create_folder(folder_);
  open_file();
  try {
    take_over(study, resume);
  } catch (...) {
    close(file_);
    throw;
  }
}

ResultsLog::~ResultsLog() { close(file_); }

std::string ResultsLog::path() const { return (fs::path(folder_) / kFileName).string(); }

std::string ResultsLog::header(const Study& study) const {
  return header_line({.version = RINGWARD_VERSION,
                      .study_sha256 = study.sha256,
                      .layouts = study.count(),
                      .kept_from = kept_from_});
}

void ResultsLog::open_file() {
  file_ = open(path().c_str(), O_RDWR | O_CREAT | O_APPEND | O_CLOEXEC, kMode);
  if (file_ < 0) fail(path());
  if (flock(file_, LOCK_EX | LOCK_NB) != 0 && errno == EWOULDBLOCK) {
    close(file_);
    throw Error(ErrorKind::cannot_write,
                "cannot write " + path() + ": another run is working in this folder");
  }
}

void ResultsLog::take_over(const Study& study, Resume resume) {
  remove_leftovers(folder_);
  const std::string text = load_source(path()).text;
  const std::string expected = header(study);
  // Killed before the first line was whole.
  if (text.find('\n') == std::string::npos && expected.starts_with(text.substr(0, 10))) {
    return start_anew(study);
  }
  const std::optional<ResultsHeader> before = header_of(text);
  if (!before) throw UsageError(path() + " is no file of this program; name another folder");
  kept_from_ = before->kept_from;
  const std::string changed = what_changed(*before, *header_of(expected));
  if (!changed.empty() && resume != Resume::force) {
    throw Error(ErrorKind::bad_input,
                path() + ": these results cannot be continued: " + changed +
                    "; start in another folder, or keep what still fits with --resume=force");
  }
  if (!changed.empty()) {
    if (before->version != RINGWARD_VERSION) {
      kept_from_ += (kept_from_.empty() ? "" : ", ") + before->version;
    }
    return keep_same_inputs(study, text);
  }
  const std::size_t whole = read_rows(text, [&](const LayoutRow& row, const std::string&) {
    const bool fits = row.index < study.count() && !finished_[row.index] &&
                      row.input_sha256 == study.input_sha256[row.index];
    if (!fits) throw Error(ErrorKind::bad_input, "a row of another study");
    finished_[row.index] = true;
  });
  if (ftruncate(file_, static_cast<off_t>(whole)) != 0) fail(path());
}

void ResultsLog::keep_same_inputs(const Study& study, const std::string& text) {
  std::map<std::string, std::size_t> wanted;
  for (std::size_t i = 0; i < study.count(); ++i) {
    wanted[study.layouts->at(i).name + "\n" + study.input_sha256[i]] = i;
  }
  std::string kept;
  read_rows(text, [&](const LayoutRow& row, const std::string&) {
    const auto found = wanted.find(row.name + "\n" + row.input_sha256);
    if (found == wanted.end() || finished_[found->second]) return;
    LayoutRow moved = row;
    moved.index = found->second;
    finished_[moved.index] = true;
    kept += row_line(moved);
  });
  write_files({{path(), header(study) + kept}});
  close(file_);
  open_file();
}

void ResultsLog::start_anew(const Study& study) {
  if (ftruncate(file_, 0) != 0) fail(path());
  write_all(header(study));
}

void ResultsLog::write_all(const std::string& text) {
  std::size_t done = 0;
  while (done < text.size()) {
    const ssize_t written = write(file_, text.data() + done, text.size() - done);
    if (written < 0 && errno == EINTR) continue;
    if (written < 0) fail(path());
    done += static_cast<std::size_t>(written);
  }
  if (fdatasync(file_) != 0) fail(path());
}

void ResultsLog::append(const LayoutRow& row) {
  write_all(row_line(row));
  finished_.at(row.index) = true;
}

std::vector<std::size_t> ResultsLog::unfinished(const Study& study) const {
  std::vector<std::size_t> left;
  for (std::size_t i = 0; i < finished_.size(); ++i) {
    if (!finished_[i]) left.push_back(i);
  }
  std::stable_sort(left.begin(), left.end(), [&](std::size_t a, std::size_t b) {
    return study.heat_group[a] < study.heat_group[b];
  });
  return left;
}

std::size_t ResultsLog::finished_count() const {
  return static_cast<std::size_t>(std::count(finished_.begin(), finished_.end(), true));
}

std::string ResultsLog::in_order() const {
  const std::string text = load_source(path()).text;
  std::map<std::size_t, std::string> lines;
  read_rows(text, [&](const LayoutRow& row, const std::string& line) { lines[row.index] = line; });
  std::string ordered = text.substr(0, text.find('\n') + 1);
  for (const auto& [index, line] : lines) ordered += line;
  return ordered;
}

}  // namespace ringward::cli
