#include <fmt/format.h>

#include <algorithm>

#include "cli/input/schema.hpp"
#include "cli/study/layout_reading.hpp"
#include "cli/study/toml_text.hpp"

namespace ringward::cli {
namespace {

constexpr std::size_t kMostLayouts = 1'000'000;

struct Axis {
  std::string key;
  std::string label;     ///< the key, shortened to its last part where that is clear
  bool is_named = true;  ///< a single value says nothing in a name, unless there is nothing else
  std::vector<std::string> values;
  std::vector<std::string> places;
};

class GridLayouts final : public LayoutList {
 public:
  explicit GridLayouts(Location location) : location_(std::move(location)) {}

  [[nodiscard]] std::size_t count() const override {
    std::size_t count = axes_.empty() ? 0 : 1;
    for (const Axis& axis : axes_) {
      if (axis.values.empty()) return 0;
      count = count > kMostLayouts ? count : count * axis.values.size();
    }
    return count;
  }

  [[nodiscard]] Layout at(std::size_t index) const override {
    Layout layout{.name = {}, .place = {}, .location = location_, .settings = {}};
    std::size_t block = count();
    for (const Axis& axis : axes_) {
      block /= axis.values.size();
      const std::size_t k = index / block % axis.values.size();
      if (axis.is_named) {
        layout.name += (layout.name.empty() ? "" : ", ") + axis.label + " " + axis.values[k];
      }
      layout.settings.push_back({axis.key, axis.values[k], axis.places[k]});
    }
    layout.place = layout.settings.empty() ? "" : layout.settings.front().place;
    return layout;
  }

  [[nodiscard]] const std::vector<std::string>& keys() const override { return keys_; }

  void add(Axis axis) {
    keys_.push_back(axis.key);
    axes_.push_back(std::move(axis));
  }

  void make_names() {
    const bool any_varies = count() > 1;
    for (Axis& axis : axes_) {
      axis.is_named = axis.values.size() > 1 || !any_varies;
      const auto same_leaf = [&](const std::string& key) {
        return leaf_of(key) == leaf_of(axis.key);
      };
      const bool is_clear = std::count_if(keys_.begin(), keys_.end(), same_leaf) == 1;
      axis.label = is_clear ? leaf_of(axis.key) : axis.key;
    }
  }

 private:
  Location location_;
  std::vector<Axis> axes_;
  std::vector<std::string> keys_;
};

void read_axis(const std::string& path, const InputNode& node, GridLayouts& layouts,
               Problems& problems) {
  if (node.kind == NodeKind::table) {
    for (const InputEntry& entry : node.entries) {
      read_axis(path + "." + toml_key(entry.key), entry.value, layouts, problems);
    }
    return;
  }
  const std::string key = "grid.\"" + path + "\"";
  if (node.kind != NodeKind::list || node.items.empty()) {
    problems.add(
        node.location, key,
        fmt::format("expected a list of values, found {}; write [4, 5, 6]", describe(node)));
    return;
  }
  Axis axis{.key = path, .label = path, .is_named = true, .values = {}, .places = {}};
  for (const InputNode& item : node.items) {
    const std::string value = toml_value(item);
    for (const std::string& other : axis.values) {
      if (other == value) problems.add(item.location, key, value + " is listed twice");
    }
    axis.values.push_back(value);
    axis.places.push_back(describe(item.location, problems.file_name()));
  }
  layouts.add(std::move(axis));
}

}  // namespace

LayoutListPtr read_grid(const InputEntry& entry, Problems& problems) {
  auto layouts = std::make_shared<GridLayouts>(entry.key_location);
  if (entry.value.kind != NodeKind::table || entry.value.entries.empty()) {
    problems.add(entry.value.location, "grid",
                 fmt::format("expected \"input.key\" = [values] below [grid], found {}",
                             describe(entry.value)));
    return layouts;
  }
  for (const InputEntry& axis : entry.value.entries) {
    read_axis(axis.key, axis.value, *layouts, problems);
  }
  layouts->make_names();
  if (layouts->count() > kMostLayouts) {
    problems.add(
        entry.key_location, "grid",
        fmt::format("these are more than {} combinations; list fewer values", kMostLayouts));
    return std::make_shared<GridLayouts>(entry.key_location);
  }
  return layouts;
}

}  // namespace ringward::cli
