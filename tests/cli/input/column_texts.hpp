#pragma once

#include <string>
#include <vector>

namespace ringward::cli::testing {

/// A valid column with one edit that makes it bad, and the whole message expected.
struct BadFile {
  std::string claim;
  std::string base;  ///< "round", "square" or "rectangular"
  std::string from;
  std::string to;
  std::string expected;
};

/// A small valid column of the given shape.
[[nodiscard]] std::string base_text(const std::string& shape);

/// The base with the first `from` replaced; throws when `from` is not in it.
[[nodiscard]] std::string edited(const std::string& shape, const std::string& from,
                                 const std::string& to);

/// The message with which a column named column.toml is refused; empty when it is accepted.
/// Fails on any kind of error but bad_input.
[[nodiscard]] std::string refusal(const std::string& text,
                                  const std::vector<std::string>& overrides = {});

}  // namespace ringward::cli::testing
