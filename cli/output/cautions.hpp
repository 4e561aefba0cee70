#pragma once

#include <string>
#include <vector>

#include "cli/terminal.hpp"
#include "thermal/base/notice.hpp"

namespace ringward::cli {

/// What a result leaves out differs between a rating and a bare table of temperatures.
enum class CautionForm { full, brief };

/// The notices of a result, cautions first, repeated ones once; empty when there are none.
[[nodiscard]] std::string notices_text(const Notices& notices, const Style& style);

/// What stands at the end of every result that a person reads.
[[nodiscard]] std::string standing_cautions(CautionForm form, const Style& style);
[[nodiscard]] std::vector<std::string> standing_caution_sentences(CautionForm form);

/// `notices` in the order they are shown: cautions first, repeated ones once.
[[nodiscard]] Notices ordered_notices(const Notices& notices);

}  // namespace ringward::cli
