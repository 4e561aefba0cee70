#pragma once

#include <string>
#include <string_view>

namespace ringward::cli {

/// Makes the process a well-behaved neighbour: an interrupt exits with 130, a broken pipe or a
/// file size limit becomes a write error, and a closed standard stream cannot be taken by a file.
void prepare_process();

/// Writes all of `text` to standard output.
/// @throws BrokenPipe when the reader has gone away
/// @throws Error(cannot_write) with the system's reason for anything else
void write_stdout(std::string_view text);

/// Writes to standard error; a failure there has nowhere to be told and is ignored.
void write_stderr(std::string_view text);

/// Whoever read our output stopped reading: the program ends without a word.
class BrokenPipe {};

/// Marks up human text for a terminal, or leaves it plain.
class Style {
 public:
  explicit Style(bool colour) : colour_(colour) {}

  [[nodiscard]] std::string bold(const std::string& text) const { return wrap("1", text); }
  [[nodiscard]] std::string good(const std::string& text) const { return wrap("1;32", text); }
  [[nodiscard]] std::string bad(const std::string& text) const { return wrap("1;31", text); }
  [[nodiscard]] std::string caution(const std::string& text) const { return wrap("1;33", text); }

 private:
  [[nodiscard]] std::string wrap(const char* code, const std::string& text) const;
  bool colour_;
};

/// Colour for standard output: only on a terminal, and only if neither the option nor the
/// environment (NO_COLOR set and not empty, TERM=dumb) forbids it.
[[nodiscard]] Style stdout_style(bool no_color);

/// One line on standard error while something takes its time; nothing unless it is a terminal.
class ProgressLine {
 public:
  explicit ProgressLine(const std::string& what);
  ~ProgressLine();
  /// Replaces the line, for something that goes on in steps.
  void show(const std::string& what);
  ProgressLine(const ProgressLine&) = delete;
  ProgressLine& operator=(const ProgressLine&) = delete;
};

}  // namespace ringward::cli
