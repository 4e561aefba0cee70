#pragma once

#include <optional>
#include <string>
#include <vector>

#include "mechanical/column.hpp"
#include "thermal/boundary/exposure.hpp"

namespace ringward::testing {

/// Columns that are judged together.
enum class FireTestFamily {
  concrete_siliceous,
  concrete_calcareous,
  round_tube_siliceous,
  round_tube_calcareous,
  square_tube
};
[[nodiscard]] std::string family_name(FireTestFamily family);
[[nodiscard]] const std::vector<FireTestFamily>& fire_test_families();
[[nodiscard]] bool is_tube(FireTestFamily family);

struct TestedBars {
  int count = 0;
  double diameter_m = 0;
  double axis_m = 0;  ///< from the face of the concrete to the bar's centre
  double yield_Pa = 0;
};

/// A tested column as its row in tests/published/ describes it.
struct FireTest {
  std::string id;
  FireTestFamily family = FireTestFamily::concrete_siliceous;
  double width_m = 0;  ///< side or diameter, outside
  double wall_m = 0;   ///< of the tube; 0: none
  double tube_yield_Pa = 0;
  std::optional<TestedBars> bars;
  double strength_Pa = 0;  ///< cylinder, on the day of the test
  thermal::Aggregate aggregate = thermal::Aggregate::siliceous;
  double length_m = 0;
  double load_N = 0;  ///< 0: not loaded; the column did not fail
  double measured_min = 0;
  std::string confidence;  ///< in what is from memory, as the row says
};

/// All rows of rc_columns.csv and filled_tubes.csv.
[[nodiscard]] std::vector<FireTest> fire_tests();

/// What the rows leave open: one set for concrete columns, one for filled tubes.
struct Assumptions {
  thermal::ConductivityLimit conductivity = thermal::ConductivityLimit::lower;
  double moisture_fraction = 0.03;
  double buckling_length_m = 0;
  double length_per_imperfection = 400;
  double contact_resistance_m2K_W = 0;
};
[[nodiscard]] Assumptions assumptions_for(const FireTest& test);

[[nodiscard]] mechanical::Column column_of(const FireTest& test, const Assumptions& assumptions);

/// The ASTM E119 fire of all these tests.
[[nodiscard]] thermal::FireExposure test_fire(double duration_min);

/// Fire resistance in that fire by the program. A column that was tested without load is
/// given its own weight.
/// @return none when it stands for twice the measured time
[[nodiscard]] std::optional<double> predicted_min(const FireTest& test,
                                                  const Assumptions& assumptions);

}  // namespace ringward::testing
