#include "cli/study/compare_run.hpp"

#include <filesystem>

#include "cli/output/output_files.hpp"
#include "cli/study/compare_report.hpp"
#include "cli/study/layout_rating.hpp"
#include "cli/study/run_layouts.hpp"
#include "cli/study/shared_heat_flow.hpp"
#include "cli/study/step_progress.hpp"

namespace ringward::cli {
namespace {

std::vector<std::size_t> groups_of(const Study& study, const std::vector<std::size_t>& layouts) {
  std::vector<std::size_t> groups;
  for (const std::size_t index : layouts) groups.push_back(study.heat_group[index]);
  return groups;
}

LayoutRow rate_one(const Study& study, std::size_t index, SharedHeatFlow& shared) {
  const ColumnInput input = study.column(index);
  const std::size_t group = study.heat_group[index];
  const HeatFlow heat_flow = [&](const thermal::Resolution& resolution) {
    return shared.get(group, input.column.section, input.fire, resolution);
  };
  LayoutRow row = rate_layout(input, heat_flow, study.layouts->keys());
  row.index = index;
  row.name = study.layouts->at(index).name;
  shared.release(group);
  return row;
}

void rate_unfinished(const Study& study, ResultsLog& log, std::size_t jobs) {
  const std::vector<std::size_t> left = log.unfinished(study);
  SharedHeatFlow shared(groups_of(study, left));
  StepProgress progress("rated", study.count(), log.finished_count());
  run_layouts(
      left, jobs, [&](std::size_t index) { return rate_one(study, index, shared); },
      [&](const LayoutRow& row) {
        log.append(row);
        progress.step();
      });
}

}  // namespace

ComparedStudy compare_layouts(const Study& study, const std::string& folder, Resume resume,
                              std::size_t jobs) {
  ResultsLog log(folder, study, resume);
  rate_unfinished(study, log, jobs);
  const std::string results = log.in_order();
  RankedStudy ranked = rank_study(study.title, results);
  ComparePage page = compare_page(ranked);
  const auto inside = [&](const char* name) {
    return (std::filesystem::path(folder) / name).string();
  };
  write_files({{log.path(), results},
               {inside("summary.csv"), compare_csv(ranked)},
               {inside("compare.html"), std::move(page.html)}});
  return {std::move(ranked), std::move(page.lacks_pictures)};
}

}  // namespace ringward::cli
