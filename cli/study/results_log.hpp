#pragma once

#include <string>
#include <vector>

#include "cli/study/layout_row.hpp"
#include "cli/study/study.hpp"

namespace ringward::cli {

enum class Resume {
  no,    ///< start; the folder must be empty
  yes,   ///< go on; study and program must be the same
  force  ///< go on whatever changed, keeping the rows whose input is the same
};

/// The finished layouts of a study on the disk: DIR/results.jsonl, a header and one line a layout.
/// A process that is killed at any moment leaves every finished line; a line that it was still
/// writing is cut off when the study is resumed.
class ResultsLog {
 public:
  /// Creates the folder, or opens what an interrupted run left in it.
  /// @throws UsageError for a folder that holds something else
  /// @throws Error(bad_input) when study or program changed since
  /// @throws Error(cannot_write) when the folder cannot be written, or another run writes to it
  ResultsLog(std::string folder, const Study& study, Resume resume);
  ~ResultsLog();
  ResultsLog(const ResultsLog&) = delete;
  ResultsLog& operator=(const ResultsLog&) = delete;

  /// Layouts that have no line yet, layouts that share temperatures one after the other.
  [[nodiscard]] std::vector<std::size_t> unfinished(const Study& study) const;
  [[nodiscard]] std::size_t finished_count() const;

  /// Adds the line of one layout and waits until it is on the disk.
  void append(const LayoutRow& row);

  /// The whole content, lines in the order of the study: what the file is replaced with at the end.
  [[nodiscard]] std::string in_order() const;
  /// Versions of the program, other than this one, whose rows were kept; empty for none.
  [[nodiscard]] const std::string& kept_from() const { return kept_from_; }

  [[nodiscard]] std::string path() const;

 private:
  void open_file();
  void take_over(const Study& study, Resume resume);
  void keep_same_inputs(const Study& study, const std::string& rows);
  void start_anew(const Study& study);
  void write_all(const std::string& text);
  [[nodiscard]] std::string header(const Study& study) const;

  std::string folder_;
  int file_ = -1;
  std::string kept_from_;
  std::vector<bool> finished_;
};

}  // namespace ringward::cli
