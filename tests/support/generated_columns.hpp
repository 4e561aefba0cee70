#pragma once

#include <string>

#include "mechanical/column.hpp"
#include "thermal/boundary/exposure.hpp"

namespace ringward::testing {

/// An invented column with its fire, drawn at random.
struct GeneratedColumn {
  std::string description;  ///< one line, sizes in mm, loads in kN
  mechanical::Column column;
  thermal::FireExposure fire;
};

/// Draws column number `index` of an endless set that is the same on every machine. Its load is
/// such that it falls between 20 and 150 min on a coarse grid; a section that does so under no load
/// is drawn again.
[[nodiscard]] GeneratedColumn generated_column(unsigned index);

}  // namespace ringward::testing
