// Fire resistance of three examples against the resolution, with the stated uncertainty beside the
// difference to the finest answer.

#include <fmt/format.h>

#include <algorithm>
#include <cmath>
#include <string>
#include <vector>

#include "cli/input/reader.hpp"
#include "mechanical/rating/rating.hpp"
#include "tests/validation/markdown.hpp"
#include "tests/validation/page_part.hpp"
#include "tests/validation/page_pictures.hpp"
#include "thermal/base/units.hpp"

namespace ringward::testing {
namespace {

using thermal::Accuracy;
using thermal::Resolution;

struct Level {
  const char* name;
  Resolution resolution;
};
const std::vector<Level>& levels() {
  static const std::vector<Level> all = {
      {"coarse x 1.5", {Accuracy::coarse, 1.5}},     {"coarse", {Accuracy::coarse, 1.0}},
      {"standard x 1.5", {Accuracy::standard, 1.5}}, {"standard", {Accuracy::standard, 1.0}},
      {"fine x 1.5", {Accuracy::fine, 1.5}},         {"fine", {Accuracy::fine, 1.0}},
      {"fine x 0.7", {Accuracy::fine, 0.7}}};
  return all;
}

struct Answer {
  std::size_t cells = 0;
  std::size_t time_steps = 0;
  double R_s = 0;
  double stated_s = 0;
};

Answer answer_at(const cli::ColumnInput& input, const Resolution& resolution) {
  Answer answer;
  mechanical::RatingScope scope{.bounds = false, .uncertainty = true};
  // The rating asks for scale 1 and, for its uncertainty, a coarser one: both are multiplied.
  scope.heat_flow = [&](const Resolution& asked) {
    thermal::TemperatureHistory history = thermal::solve_heat_flow(
        input.column.section, input.fire, {asked.accuracy, asked.scale * resolution.scale});
    answer.cells = std::max(answer.cells, history.statistics().cells);
    answer.time_steps = std::max(answer.time_steps, history.statistics().time_steps);
    return history;
  };
  const mechanical::Rating rating = rate(input.column, input.fire, resolution.accuracy, scope);
  answer.R_s = rating.chosen.fire_resistance_s.value();
  answer.stated_s = rating.uncertainty_s;
  return answer;
}

struct Example {
  std::string name;
  std::vector<Answer> answers;

  [[nodiscard]] double error_s(std::size_t level) const {
    return answers[level].R_s - answers.back().R_s;
  }
};

Example rated_at_all_levels(const std::string& name) {
  Example example{.name = name, .answers = {}};
  const cli::ColumnInput input =
      cli::read_column_file(RINGWARD_SOURCE_DIR "/docs/examples/" + name + ".toml");
  for (const Level& level : levels()) {
    example.answers.push_back(answer_at(input, level.resolution));
  }
  return example;
}

std::string rows_of(const Example& example) {
  std::string rows;
  for (std::size_t k = 0; k < levels().size(); ++k) {
    const Answer& answer = example.answers[k];
    const bool finest = k + 1 == levels().size();
    const bool inside = std::abs(example.error_s(k)) <= answer.stated_s;
    rows += markdown_row({example.name, levels()[k].name, fmt::format("{}", answer.cells),
                          fmt::format("{}", answer.time_steps),
                          fmt::format("{:.2f}", units::min_from_s(answer.R_s)),
                          fmt::format("{:.1f}", answer.stated_s),
                          finest ? "-" : fmt::format("{:+.1f}", example.error_s(k)),
                          finest ? "-" : (inside ? "yes" : "**no**")});
  }
  return rows;
}

MarkedPoints points_of(const Example& example) {
  MarkedPoints points{.name = example.name, .points = {}};
  for (std::size_t k = 0; k + 1 < levels().size(); ++k) {
    points.points.push_back({static_cast<double>(example.answers[k].cells),
                             std::max(0.01, std::abs(example.error_s(k)))});
  }
  return points;
}

}  // namespace

PagePart convergence_part() {
  std::string table = markdown_head(
      {"example", "accuracy", "cells", "time steps", "R, min", "stated, s", "error, s", "inside"});
  LogPicture picture{
      .about = {.id = "convergence",
                .title = "Fire resistance of three examples: error against the number of cells",
                .message = "The difference to the finest answer falls with the cells."},
      .x = {.label = "Cells", .low = 10.0, .high = 5000.0},
      .y = {.label = "Error of the fire resistance [s]", .low = 0.01, .high = 200.0},
      .series = {}};
  for (const char* const name : {"atrium-column", "square-composite", "protected-column"}) {
    const Example example = rated_at_all_levels(name);
    table += rows_of(example);
    picture.series.push_back(points_of(example));
  }
  return {.texts = {{"convergence", table}}, .pictures = {log_picture(picture)}};
}

}  // namespace ringward::testing
