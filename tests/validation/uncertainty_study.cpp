// Rates a fixed set of generated columns with standard accuracy and against the fine grid, and
// writes what stands in tests/validation/uncertainty_study.csv:
//   uncertainty_study [NUMBER of one column]...
// Half an hour and more for all of them.

#include <iostream>
#include <numeric>
#include <string>
#include <vector>

#include "tests/validation/uncertainty_rows.hpp"

using namespace ringward::testing;

int main(int argc, char** argv) {
  std::vector<unsigned> asked;
  for (int k = 1; k < argc; ++k) asked.push_back(static_cast<unsigned>(std::stoul(argv[k])));
  if (asked.empty()) {
    asked.resize(kUncertaintyColumns);
    std::iota(asked.begin(), asked.end(), 0U);
  }
  std::cout << "# Made by uncertainty_study.\n" << csv_head();
  for (const unsigned index : asked) {
    const UncertaintyRow row = study_uncertainty(index);
    std::cout << csv_line(row) << std::flush;
    std::cerr << index << (row.covered() ? ": covered\n" : ": NOT covered\n");
  }
  return 0;
}
