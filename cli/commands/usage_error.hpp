#pragma once

#include <stdexcept>

namespace ringward::cli {

/// Options that the parser takes but that make no sense together or as values.
class UsageError : public std::runtime_error {
 public:
  using std::runtime_error::runtime_error;
};

}  // namespace ringward::cli
