#include "cli/study/study.hpp"

#include <fmt/format.h>

#include <map>

#include "cli/input/key_suggestion.hpp"
#include "cli/input/problems.hpp"
#include "cli/input/reader.hpp"
#include "cli/input/sha256.hpp"
#include "cli/study/heat_key.hpp"
#include "cli/study/layout_reading.hpp"
#include "cli/study/study_problems.hpp"
#include "thermal/base/error.hpp"

namespace ringward::cli {
namespace {

const std::vector<std::string>& study_keys() {
  static const std::vector<std::string> keys{"title", "base", "layout", "grid", "columns_csv"};
  return keys;
}

/// Reads the study file itself, without its columns.
class StudyReader {
 public:
  StudyReader(const InputSource& source, Problems& problems)
      : source_(source), root_(parse_toml(source.text, source.name)), problems_(problems) {}

  void read(Study& study) {
    report_unknown();
    study.title = text("title").value_or("");
    read_layouts(study);
    read_base(study);
  }

  [[nodiscard]] const std::string& csv_text() const { return csv_text_; }

 private:
  void report_unknown() {
    for (const InputEntry& entry : root_.entries) {
      const auto& keys = study_keys();
      if (std::find(keys.begin(), keys.end(), entry.key) != keys.end()) continue;
      const auto meant = nearest(entry.key, keys);
      problems_.add(entry.key_location, entry.key,
                    "unknown key; " + (meant ? "did you mean " + *meant + "?"
                                             : "a study has title, base and one of [[layout]], "
                                               "[grid], columns_csv"));
    }
  }

  std::optional<std::string> text(const std::string& key) {
    const InputEntry* entry = root_.find(key);
    if (entry == nullptr) return std::nullopt;
    if (entry->value.kind == NodeKind::text) return entry->value.text;
    problems_.add(entry->value.location, key,
                  fmt::format("expected text in quotes, found {}", describe(entry->value)));
    return std::nullopt;
  }

  void read_base(Study& study) {
    const InputEntry* entry = root_.find("base");
    if (entry == nullptr) {
      problems_.add(root_.location, "base",
                    "missing; name the column file that the layouts start from, e.g. base = "
                    "\"column.toml\"");
      return;
    }
    const auto name = text("base");
    if (!name) return;
    try {
      study.base = load_source((source_.folder / *name).string());
    } catch (const Error&) {
      problems_.add(
          entry->value.location, "base",
          fmt::format("\"{}\" cannot be read; the path is relative to the study file", *name));
    }
  }

  void read_layouts(Study& study) {
    const InputEntry* named = root_.find("layout");
    const InputEntry* grid = root_.find("grid");
    const InputEntry* csv = root_.find("columns_csv");
    const int given = (named != nullptr) + (grid != nullptr) + (csv != nullptr);
    if (given != 1) {
      problems_.add(root_.location, "",
                    given == 0 ? "there are no layouts; add [[layout]], [grid] or columns_csv"
                               : "[[layout]], [grid] and columns_csv exclude each other; keep one");
    }
    if (csv != nullptr)
      study.layouts = read_columns_csv(*csv, source_.folder, problems_, csv_text_);
    if (grid != nullptr) study.layouts = read_grid(*grid, problems_);
    if (named != nullptr) study.layouts = read_named_layouts(*named, problems_);
  }

  const InputSource& source_;
  InputNode root_;
  Problems& problems_;
  std::string csv_text_;
};

std::vector<std::string> assignments(const Study& study, const Layout& layout) {
  std::vector<std::string> all = study.overrides;
  for (const LayoutSetting& setting : layout.settings) {
    all.push_back(setting.key + "=" + setting.value);
  }
  return all;
}

/// Reads every layout once, to find what is wrong before anything is computed.
void check_layouts(Study& study, Problems& problems) {
  StudyProblems found;
  std::map<std::string, std::size_t> groups;
  for (std::size_t i = 0; i < study.count(); ++i) {
    const Layout layout = study.layouts->at(i);
    try {
      const ColumnInput input = read_layout(study, layout);
      study.input_sha256.push_back(input.input_sha256);
      study.heat_group.push_back(groups.try_emplace(heat_key(input), groups.size()).first->second);
    } catch (const Error& error) {
      found.add(layout, error.what());
    }
  }
  found.report(study.count(), problems);
}

std::string hash_of(const Study& study, const std::string& study_text,
                    const std::string& csv_text) {
  std::string hash =
      sha256_hex(study_text + "\n--base\n" + study.base.text + "\n--csv\n" + csv_text);
  for (std::size_t i = 0; i < study.count(); ++i) {
    hash = sha256_hex(hash + study.layouts->at(i).name + study.input_sha256[i]);
  }
  return hash;
}

}  // namespace

ColumnInput read_layout(const Study& study, const Layout& layout) {
  return read_column(study.base, assignments(study, layout));
}

ColumnInput Study::column(std::size_t index) const {
  ColumnInput input = read_layout(*this, layouts->at(index));
  if (input.input_sha256 != input_sha256.at(index)) {
    throw Error(ErrorKind::bad_input,
                base.name + ": a file that it names changed while the study was running");
  }
  return input;
}

Study read_study(const std::string& path, const std::vector<std::string>& overrides) {
  const InputSource source = load_source(path);
  Problems problems(source.name);
  Study study;
  study.overrides = overrides;
  StudyReader reader(source, problems);
  reader.read(study);
  if (study.layouts && !study.base.name.empty()) check_layouts(study, problems);
  problems.throw_if_any();
  study.sha256 = hash_of(study, source.text, reader.csv_text());
  return study;
}

}  // namespace ringward::cli
