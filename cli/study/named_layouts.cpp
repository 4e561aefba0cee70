#include <fmt/format.h>

#include <algorithm>
#include <set>

#include "cli/study/layout_reading.hpp"
#include "cli/study/toml_text.hpp"

namespace ringward::cli {
namespace {

class NamedLayouts final : public LayoutList {
 public:
  [[nodiscard]] std::size_t count() const override { return layouts_.size(); }
  [[nodiscard]] Layout at(std::size_t index) const override { return layouts_.at(index); }
  [[nodiscard]] const std::vector<std::string>& keys() const override { return keys_; }

  void add(Layout layout) {
    for (const LayoutSetting& setting : layout.settings) {
      if (std::find(keys_.begin(), keys_.end(), setting.key) == keys_.end()) {
        keys_.push_back(setting.key);
      }
    }
    layouts_.push_back(std::move(layout));
  }

 private:
  std::vector<Layout> layouts_;
  std::vector<std::string> keys_;
};

/// Reads the tables of `[[layout]]` one after the other.
class NamedLayoutReader {
 public:
  explicit NamedLayoutReader(Problems& problems) : problems_(problems) {}

  void read(const InputNode& node, std::size_t index, NamedLayouts& layouts) {
    const std::string key = fmt::format("layout[{}]", index);
    if (node.kind != NodeKind::table) {
      problems_.add(node.location, key,
                    fmt::format("expected a table, found {}; write [[layout]] and its keys below",
                                describe(node)));
      return;
    }
    report_unknown(node, key);
    Layout layout{.name = name_of(node, key),
                  .place = describe(node.location, problems_.file_name()),
                  .location = node.location,
                  .settings = {}};
    if (const InputEntry* set = node.find("set")) read_set(set->value, key, layout);
    layouts.add(std::move(layout));
  }

 private:
  void report_unknown(const InputNode& node, const std::string& key) {
    for (const InputEntry& entry : node.entries) {
      if (entry.key == "name" || entry.key == "set") continue;
      problems_.add(entry.key_location, key + "." + entry.key,
                    "unknown key; a layout has name and set = { \"input.key\" = value, ... }");
    }
  }

  std::string name_of(const InputNode& node, const std::string& key) {
    const InputEntry* name = node.find("name");
    if (name == nullptr || name->value.kind != NodeKind::text || name->value.text.empty()) {
      problems_.add(name == nullptr ? node.location : name->value.location, key + ".name",
                    "missing; give every layout a name, e.g. name = \"A\"");
      return key;
    }
    if (!names_.insert(name->value.text).second) {
      problems_.add(
          name->value.location, key + ".name",
          fmt::format("\"{}\" names another layout too; names must differ", name->value.text));
    }
    return name->value.text;
  }

  void read_set(const InputNode& set, const std::string& key, Layout& layout) {
    if (set.kind != NodeKind::table) {
      problems_.add(
          set.location, key + ".set",
          fmt::format("expected {{ \"input.key\" = value, ... }}, found {}", describe(set)));
      return;
    }
    for (const InputEntry& entry : set.entries) add_settings(entry.key, entry.value, layout);
  }

  // A table inside adds to the table of the base key by key, as a dotted key would.
  void add_settings(const std::string& path, const InputNode& value, Layout& layout) {
    if (value.kind == NodeKind::table && !value.entries.empty()) {
      for (const InputEntry& entry : value.entries) {
        add_settings(path + "." + toml_key(entry.key), entry.value, layout);
      }
      return;
    }
    layout.settings.push_back(
        {path, toml_value(value), describe(value.location, problems_.file_name())});
  }

  Problems& problems_;
  std::set<std::string> names_;
};

}  // namespace

LayoutListPtr read_named_layouts(const InputEntry& entry, Problems& problems) {
  auto layouts = std::make_shared<NamedLayouts>();
  if (entry.value.kind != NodeKind::list || entry.value.items.empty()) {
    problems.add(entry.value.location, entry.key,
                 fmt::format("expected layouts, found {}; write [[layout]] with two brackets",
                             describe(entry.value)));
    return layouts;
  }
  NamedLayoutReader reader(problems);
  for (std::size_t i = 0; i < entry.value.items.size(); ++i) {
    reader.read(entry.value.items[i], i, *layouts);
  }
  return layouts;
}

}  // namespace ringward::cli
