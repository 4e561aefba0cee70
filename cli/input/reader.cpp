#include "cli/input/reader.hpp"

#include <fmt/format.h>

#include <cmath>

#include "cli/input/fire_reading.hpp"
#include "cli/input/input_notices.hpp"
#include "cli/input/member_reading.hpp"
#include "cli/input/overrides.hpp"
#include "cli/input/section_reading.hpp"
#include "cli/input/sha256.hpp"
#include "thermal/base/units.hpp"

namespace ringward::cli {
namespace {

std::optional<double> read_required_s(const InputValues& values, Problems& problems) {
  const double required_min = values.number("rating.required_min");
  if (std::isnan(required_min)) return std::nullopt;
  const double duration_min = values.number("fire.duration_min");
  if (required_min > duration_min) {
    problems.add(values.location("rating.required_min"), "rating.required_min",
                 fmt::format("{} min is longer than the fire is followed, fire.duration_min = {} "
                             "min; raise fire.duration_min",
                             required_min, duration_min));
  }
  return units::s_from_min(required_min);
}

thermal::Accuracy read_accuracy(const InputValues& values) {
  const std::string accuracy = values.text("numerics.accuracy");
  if (accuracy == "coarse") return thermal::Accuracy::coarse;
  if (accuracy == "fine") return thermal::Accuracy::fine;
  return thermal::Accuracy::standard;
}

std::map<std::string, std::string> read_submission(const InputValues& values) {
  std::map<std::string, std::string> submission;
  for (const KeySpec* spec : keys_in("submission")) {
    if (values.given(spec->key)) submission[leaf_of(spec->key)] = values.text(spec->key);
  }
  return submission;
}

/// What decides the result: without overrides and CSV exactly the bytes of the file.
std::string effective_input(const InputSource& source, const std::vector<std::string>& overrides,
                            const std::string& csv_text) {
  std::string bytes = source.text;
  for (const std::string& assignment : overrides) bytes += "\n--set " + assignment;
  if (!csv_text.empty()) bytes += "\n--csv\n" + csv_text;
  return bytes;
}

}  // namespace

ColumnInput read_column(const InputSource& source, const std::vector<std::string>& overrides) {
  InputNode root = parse_toml(source.text, source.name);
  Problems problems(source.name);
  apply_overrides(root, overrides, problems);
  InputValues values(root, problems);

  ColumnInput input;
  thermal::Section section = read_section(values, problems);
  check_section(section, values, problems);
  input.column = read_column_of(std::move(section), values, problems);
  input.required_s = read_required_s(values, problems);
  FireReading fire = read_fire(values, source.folder, problems);
  problems.throw_if_any();

  input.title = values.text("title");
  input.fire = std::move(fire.exposure);
  input.curve = std::move(fire.curve);
  input.accuracy = read_accuracy(values);
  input.has_classes = input.curve->is_nominal();
  input.echo = values.echo();
  input.input_sha256 = sha256_hex(effective_input(source, overrides, fire.csv_text));
  input.submission = read_submission(values);
  input.sensitivity = values.sensitivity();
  input.notices = input_notices(input, values);
  return input;
}

ColumnInput read_column_file(const std::string& path, const std::vector<std::string>& overrides) {
  return read_column(load_source(path), overrides);
}

}  // namespace ringward::cli
