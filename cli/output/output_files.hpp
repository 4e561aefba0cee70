#pragma once

#include <string>
#include <vector>

namespace ringward::cli {

/// A file to be written, as named by the user, and all of its bytes.
struct OutputFile {
  std::string path;
  std::string content;
};

/// Complains early, before a long calculation, about a target that could not be written after it.
/// @throws Error(cannot_write) for a folder as target, or a missing or read-only folder around it
void require_writable(const std::string& path);

/// Writes all files or none: each to a temporary name in its own folder, flushed to the disk, and
/// renamed when every one of them is complete. Interrupts wait until it is done. A target that is
/// no regular file (a pipe, a device) is written directly.
/// @throws Error(cannot_write) naming the file and the system's reason; no temporary file is left
void write_files(const std::vector<OutputFile>& files);

/// Creates a folder for results, with its parents, if it is not there.
/// @throws Error(cannot_write) naming the folder and the system's reason
void create_folder(const std::string& path);

}  // namespace ringward::cli
