#include <fmt/format.h>

#include <algorithm>
#include <set>

#include "cli/input/schema.hpp"
#include "cli/input/toml_reading.hpp"
#include "cli/study/csv_reading.hpp"
#include "cli/study/layout_reading.hpp"
#include "cli/study/toml_text.hpp"
#include "thermal/base/error.hpp"

namespace ringward::cli {
namespace {

constexpr const char* kNameColumn = "name";

std::string in_quotes(const std::string& text) {
  InputNode node;
  node.kind = NodeKind::text;
  node.text = text;
  return toml_value(node);
}

bool is_toml(const std::string& cell) {
  if (cell.find_first_of("\r\n") != std::string::npos) return false;
  try {
    return parse_toml("value = " + cell, "cell").entries.size() == 1;
  } catch (const Error&) {
    return false;
  }
}

bool takes_text(const std::string& key) {
  const KeySpec* spec = find_key(schema_spelling(key));
  return spec != nullptr && (spec->type == KeyType::text || spec->type == KeyType::choice ||
                             spec->type == KeyType::choice_or_list);
}

/// A cell as a TOML value: words need no quotes in a table made with a spreadsheet.
std::string value_of(const std::string& key, const CsvCell& cell) {
  const bool is_marked = !cell.text.empty() && (cell.text[0] == '"' || cell.text[0] == '[');
  if (takes_text(key) && !is_marked) return in_quotes(cell.text);
  return is_toml(cell.text) ? cell.text : in_quotes(cell.text);
}

class CsvLayouts final : public LayoutList {
 public:
  CsvLayouts(std::string file, std::string text, Location location)
      : file_(std::move(file)), text_(std::move(text)), location_(std::move(location)) {}

  [[nodiscard]] std::size_t count() const override { return rows_.size(); }

  [[nodiscard]] Layout at(std::size_t index) const override {
    const Row& row = rows_.at(index);
    CsvReader reader(text_, row.offset, row.line);
    CsvRecord record;
    if (!reader.next(record)) throw std::logic_error("a row of the CSV file is gone");
    Layout layout{.name = {},
                  .place = fmt::format("{}:{}", file_, record.line),
                  .location = location_,
                  .settings = {}};
    for (std::size_t i = 0; i < header_.size(); ++i) {
      const CsvCell& cell = record.cells.at(i);
      if (i == name_at_) layout.name = cell.text;
      if (i == name_at_ || cell.text.empty()) continue;
      layout.settings.push_back({header_[i], value_of(header_[i], cell),
                                 fmt::format("{}:{}:{}", file_, cell.line, cell.column)});
    }
    return layout;
  }

  [[nodiscard]] const std::vector<std::string>& keys() const override { return keys_; }

  /// Checks header and rows, and remembers where each row starts.
  void read(Problems& problems) {
    CsvReader reader(text_);
    CsvRecord record;
    if (!reader.next(record)) {
      return complain(problems, "the file is empty; its first line names the input keys");
    }
    read_header(record, problems);
    std::set<std::string> names;
    for (;;) {
      const Row row{reader.offset(), reader.line()};
      if (!reader.next(record)) break;
      if (accept(record, names, problems)) rows_.push_back(row);
    }
    if (rows_.empty()) complain(problems, "there is no row below the header");
  }

 private:
  struct Row {
    std::size_t offset = 0;
    std::size_t line = 1;
  };

  void complain(Problems& problems, const std::string& text) const {
    problems.add_foreign(location_, file_ + ": " + text);
  }

  void complain_at(Problems& problems, std::size_t line, const std::string& text) const {
    problems.add_foreign(location_, fmt::format("{}:{}: {}", file_, line, text));
  }

  void read_header(const CsvRecord& record, Problems& problems) {
    for (const CsvCell& cell : record.cells) {
      if (std::find(header_.begin(), header_.end(), cell.text) != header_.end()) {
        complain_at(problems, cell.line, "\"" + cell.text + "\" heads two columns");
      }
      header_.push_back(cell.text);
      if (cell.text != kNameColumn) keys_.push_back(cell.text);
    }
    const auto name = std::find(header_.begin(), header_.end(), kNameColumn);
    name_at_ = static_cast<std::size_t>(name - header_.begin());
    if (name != header_.end()) return;
    const bool has_semicolons = record.cells.front().text.find(';') != std::string::npos;
    complain_at(problems, record.line,
                has_semicolons ? "the cells are separated by semicolons; separate them by commas"
                               : "no column is headed \"name\"; every row needs a name");
  }

  bool accept(const CsvRecord& record, std::set<std::string>& names, Problems& problems) const {
    if (record.cells.size() != header_.size()) {
      complain_at(
          problems, record.line,
          fmt::format("{} cells where the header has {}", record.cells.size(), header_.size()));
      return false;
    }
    if (name_at_ >= header_.size()) return false;
    const std::string& name = record.cells[name_at_].text;
    if (name.empty()) {
      complain_at(problems, record.line, "the name is empty; every row needs a name");
    } else if (!names.insert(name).second) {
      complain_at(problems, record.line,
                  fmt::format("\"{}\" names another row too; names must differ", name));
    }
    return true;
  }

  std::string file_;
  std::string text_;
  Location location_;
  std::vector<std::string> header_;
  std::vector<std::string> keys_;
  std::size_t name_at_ = 0;
  std::vector<Row> rows_;
};

}  // namespace

LayoutListPtr read_columns_csv(const InputEntry& entry, const std::filesystem::path& folder,
                               Problems& problems, std::string& text) {
  const InputNode& node = entry.value;
  if (node.kind != NodeKind::text || node.text.empty()) {
    problems.add(node.location, entry.key,
                 fmt::format("expected the path of a CSV file, found {}", describe(node)));
    return std::make_shared<CsvLayouts>("", "", node.location);
  }
  const std::string path = (folder / node.text).string();
  try {
    text = load_source(path).text;
  } catch (const Error&) {
    problems.add(
        node.location, entry.key,
        fmt::format("\"{}\" cannot be read; the path is relative to the study file", node.text));
    return std::make_shared<CsvLayouts>("", "", node.location);
  }
  auto layouts = std::make_shared<CsvLayouts>(path, text, node.location);
  try {
    layouts->read(problems);
  } catch (const Error& error) {
    problems.add_foreign(node.location, path + ":" + error.what());
  }
  return layouts;
}

}  // namespace ringward::cli
