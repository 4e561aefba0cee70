#pragma once

#include "tests/validation/fire_tests.hpp"

namespace ringward::testing {

/// Fire resistance in min of a tested column by the simple formula for its kind, with the cold
/// design resistance taken as the squash load and K = 0.65 for fixed ends.
[[nodiscard]] double simple_rule_min(const FireTest& test);

}  // namespace ringward::testing
