#pragma once

#include <cstddef>
#include <memory>
#include <string>
#include <vector>

#include "cli/input/input_tree.hpp"

namespace ringward::cli {

/// One input key that a layout sets, as `--set` would.
struct LayoutSetting {
  std::string key;    ///< as in `--set`, e.g. "bars[0].axis_mm"
  std::string value;  ///< a TOML value
  std::string place;  ///< `file:line:column`
};

/// What makes one column of a study differ from its base.
struct Layout {
  std::string name;
  std::string place;  ///< `file:line:column`
  Location location;  ///< in the study file, to sort messages by
  std::vector<LayoutSetting> settings;
};

/// The layouts of a study. Each is put together when it is asked for, so that a long list takes no
/// more memory than the file it is written in.
class LayoutList {
 public:
  virtual ~LayoutList() = default;
  [[nodiscard]] virtual std::size_t count() const = 0;
  [[nodiscard]] virtual Layout at(std::size_t index) const = 0;
  /// Every key that some layout sets, in the order of the file.
  [[nodiscard]] virtual const std::vector<std::string>& keys() const = 0;
};

using LayoutListPtr = std::shared_ptr<const LayoutList>;

}  // namespace ringward::cli
