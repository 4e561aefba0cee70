#pragma once

#include <set>
#include <string>
#include <vector>

#include "tests/validation/page_template.hpp"

namespace ringward::testing {

/// A picture of the page: a file in docs/validation/.
struct PagePicture {
  std::string file;
  std::string svg;
};

/// What one study gives to the page.
struct PagePart {
  PageTexts texts = {};
  std::vector<PagePicture> pictures = {};
};

// Each of these takes seconds.
[[nodiscard]] PagePart fire_test_part();
[[nodiscard]] PagePart sensitivity_part();
[[nodiscard]] PagePart uncertainty_part();  ///< from uncertainty_study.csv

// These take a minute and more.
[[nodiscard]] PagePart variation_part();
[[nodiscard]] PagePart convergence_part();
[[nodiscard]] PagePart heat_flow_part();

/// The placeholders of these.
[[nodiscard]] inline std::set<std::string> slow_texts() {
  return {"variations", "worst cases", "convergence", "heat flow"};
}

}  // namespace ringward::testing
