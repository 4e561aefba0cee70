#include "cli/study/ranking.hpp"

#include <algorithm>
#include <limits>
#include <numeric>

#include "cli/study/results_text.hpp"

namespace ringward::cli {
namespace {

double assessed_min(const LayoutRow& row) { return row.verdict ? row.verdict->assessed_min : -1.0; }

bool varies(const std::vector<LayoutRow>& rows, std::size_t place) {
  return std::any_of(rows.begin(), rows.end(), [&](const LayoutRow& row) {
    return row.values[place].value != rows.front().values[place].value;
  });
}

std::vector<std::string> varied_keys(const std::vector<LayoutRow>& rows) {
  std::vector<std::string> keys;
  if (rows.empty()) return keys;
  for (std::size_t place = 0; place < rows.front().values.size(); ++place) {
    if (varies(rows, place)) keys.push_back(rows.front().values[place].key);
  }
  return keys;
}

}  // namespace

bool RankedStudy::has_unsolved() const {
  return std::any_of(rows.begin(), rows.end(), [](const LayoutRow& row) { return !row.verdict; });
}

std::vector<std::size_t> ranked_order(const std::vector<LayoutRow>& rows) {
  std::vector<std::size_t> order(rows.size());
  std::iota(order.begin(), order.end(), std::size_t{0});
  std::stable_sort(order.begin(), order.end(), [&](std::size_t a, std::size_t b) {
    const double left = assessed_min(rows[a]);
    const double right = assessed_min(rows[b]);
    if (left != right) return left > right;
    return rows[a].amounts.steel_kg_m() < rows[b].amounts.steel_kg_m();
  });
  return order;
}

std::vector<bool> undominated_rows(const std::vector<LayoutRow>& rows) {
  std::vector<bool> undominated(rows.size(), false);
  double least_better = std::numeric_limits<double>::infinity();  // steel of all longer ratings
  double group_least = std::numeric_limits<double>::infinity();
  double group_min = std::numeric_limits<double>::quiet_NaN();
  // Best first, the least steel first among equals.
  for (const std::size_t index : ranked_order(rows)) {
    const LayoutRow& row = rows[index];
    if (!row.verdict) break;
    const double steel = row.amounts.steel_kg_m();
    if (row.verdict->assessed_min != group_min) {
      least_better = std::min(least_better, group_least);
      group_min = row.verdict->assessed_min;
      group_least = steel;
    }
    undominated[index] = steel < least_better && steel <= group_least;
  }
  return undominated;
}

RankedStudy rank_study(const std::string& title, const std::string& results) {
  RankedStudy study;
  study.title = title;
  if (const auto header = header_of(results)) {
    study.study_sha256 = header->study_sha256;
    study.kept_from = header->kept_from;
  }
  read_rows(results, [&](const LayoutRow& row, const std::string&) { study.rows.push_back(row); });
  std::sort(study.rows.begin(), study.rows.end(),
            [](const LayoutRow& a, const LayoutRow& b) { return a.index < b.index; });
  study.order = ranked_order(study.rows);
  study.undominated = undominated_rows(study.rows);
  study.varied = varied_keys(study.rows);
  return study;
}

}  // namespace ringward::cli
