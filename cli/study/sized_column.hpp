#pragma once

#include <map>
#include <optional>
#include <string>
#include <vector>

#include "cli/input/toml_reading.hpp"
#include "cli/study/size_search.hpp"

namespace ringward::cli {

/// What `size` is asked for.
struct SizeQuestion {
  InputSource source;
  std::vector<std::string> overrides;
  std::string key;
  SizeBracket bracket;
  std::optional<double> required_min;  ///< none: rating.required_min of the column
};

/// The number key that is varied.
/// @throws UsageError for a key that does not exist, is no number, or says what is required
[[nodiscard]] const KeySpec& varied_key(const std::string& key);

/// A power of ten, at most a fiftieth of the bracket; 1 or more for a whole number.
[[nodiscard]] double default_step(const KeySpec& spec, double low, double high);

/// A question whose two ends are valid columns, with the requirement and the followed time settled:
/// followed is at least 1.5 times what is required.
class SizedColumn {
 public:
  /// @throws UsageError when nothing is required
  /// @throws Error(bad_input) when an end of the bracket is no valid column
  explicit SizedColumn(SizeQuestion question);

  /// @throws Error(solver_breakdown) naming the value
  [[nodiscard]] LayoutRow rate(double value);

  [[nodiscard]] const SizeQuestion& question() const { return question_; }
  [[nodiscard]] double required_min() const { return required_min_; }
  [[nodiscard]] const std::string& title() const { return title_; }
  [[nodiscard]] const std::string& unit() const { return unit_; }

  /// The column file with the value in it: comments are kept where nothing but numbers changes.
  [[nodiscard]] std::string file_text(double value) const;

 private:
  [[nodiscard]] std::vector<std::string> assignments(double value) const;

  SizeQuestion question_;
  double required_min_ = 0;
  std::map<std::string, double> settled_;  ///< requirement and followed time where they change
  std::string title_;
  std::string unit_;
  struct LastHeat {
    std::string key;
    std::map<double, thermal::TemperatureHistory> by_scale;
  };
  LastHeat last_heat_;
};

}  // namespace ringward::cli
