#pragma once

#include <string>
#include <vector>

namespace ringward {

enum class Severity { note, caution };

/// A limit of validity, an extrapolation or an assumption that the reader of a result must know.
struct Notice {
  std::string code;    ///< stable short name, e.g. "end-gap-closed"
  Severity severity = Severity::note;
  std::string text;    ///< a whole sentence, with values and units
  std::string source;  ///< key in docs/sources.toml, or "common practice, no source"
};

using Notices = std::vector<Notice>;

}  // namespace ringward
