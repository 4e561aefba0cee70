#pragma once

#include <cstddef>
#include <string>
#include <vector>

#include "cli/input/column_input.hpp"
#include "cli/input/toml_reading.hpp"
#include "cli/study/layout_list.hpp"

namespace ringward::cli {

/// A base column and the layouts that differ from it, all of them checked.
struct Study {
  std::string title;
  InputSource base;
  std::vector<std::string> overrides;  ///< `--set` of the command line, below the layouts' own
  LayoutListPtr layouts;
  std::string sha256;                     ///< of everything that decides the results
  std::vector<std::string> input_sha256;  ///< one a layout
  /// One a layout: layouts with the same number share their temperatures.
  std::vector<std::size_t> heat_group;

  [[nodiscard]] std::size_t count() const { return layouts->count(); }

  /// The checked input of one layout.
  /// @throws Error(bad_input) when a file changed since the study was read
  [[nodiscard]] ColumnInput column(std::size_t index) const;
};

/// The input of one layout, checked.
/// @throws Error(bad_input) as read_column
[[nodiscard]] ColumnInput read_layout(const Study& study, const Layout& layout);

/// Reads a study file and checks every one of its layouts.
/// @param overrides `KEY=VALUE` for the base column
/// @throws Error(bad_input) with one line for everything that is wrong in the study and in any of
///   its layouts, each `file:line:column: layout "name": key: what is wrong`
[[nodiscard]] Study read_study(const std::string& path, const std::vector<std::string>& overrides);

}  // namespace ringward::cli
