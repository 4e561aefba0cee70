#include "cli/output/cautions.hpp"

#include <algorithm>
#include <string>

#include "cli/input/text_wrap.hpp"

namespace ringward::cli {
namespace {

constexpr std::size_t kBulletIndent = 4;
constexpr std::size_t kNoticeIndent = 11;

bool same(const Notice& a, const Notice& b) { return a.code == b.code && a.text == b.text; }

std::string bullet(const std::string& sentence) {
  return "  - " + wrapped(sentence, kBulletIndent, std::string(kBulletIndent, ' ')) + "\n";
}

std::string notice_line(const Notice& notice, const Style& style) {
  const bool is_caution = notice.severity == Severity::caution;
  const std::string label = is_caution ? style.caution("CAUTION") + "  " : "note     ";
  const std::string source = notice.source.empty() ? "" : " [" + notice.source + "]";
  return "  " + label +
         wrapped(notice.text + source, kNoticeIndent, std::string(kNoticeIndent, ' ')) + "\n";
}

}  // namespace

Notices ordered_notices(const Notices& notices) {
  Notices ordered;
  for (const Notice& notice : notices) {
    const bool known = std::any_of(ordered.begin(), ordered.end(),
                                   [&notice](const Notice& other) { return same(notice, other); });
    if (!known) ordered.push_back(notice);
  }
  std::stable_partition(ordered.begin(), ordered.end(),
                        [](const Notice& n) { return n.severity == Severity::caution; });
  return ordered;
}

std::string notices_text(const Notices& notices, const Style& style) {
  if (notices.empty()) return "";
  std::string text = style.bold("Notices") + "\n";
  for (const Notice& notice : ordered_notices(notices)) text += notice_line(notice, style);
  return text + "\n";
}

std::vector<std::string> standing_caution_sentences(CautionForm form) {
  if (form == CautionForm::brief) {
    return {
        "A calculation aid: a licensed engineer has to check it; local codes and the authority "
        "decide.",
        "Not in the model: spalling, joints, tube vents, restraint, construction defects."};
  }
  return {
      "This is a calculation aid. A licensed engineer has to check the input, the model and the "
      "result, and answers for them.",
      "Local codes and the authority decide what is accepted. Nothing here is an approval or a "
      "classification report.",
      "Not in the model: spalling of the concrete; the joints, and the strip of core that is bare "
      "at a tube's end gaps; steam pressure in a tube without vent holes; restraint by the rest of "
      "the building; construction defects."};
}

std::string standing_cautions(CautionForm form, const Style& style) {
  std::string text = style.bold("Before anyone relies on this") + "\n";
  for (const std::string& sentence : standing_caution_sentences(form)) text += bullet(sentence);
  return text;
}

}  // namespace ringward::cli
