#include "tests/cli/input/column_texts.hpp"

#include <stdexcept>

#include "cli/input/reader.hpp"
#include "thermal/base/error.hpp"

namespace ringward::cli::testing {
namespace {

std::string replaced(std::string text, const std::string& from, const std::string& to) {
  const auto at = text.find(from);
  if (at == std::string::npos) throw std::logic_error("the text to edit is missing: " + from);
  return text.replace(at, from.size(), to);
}

}  // namespace

std::string base_text(const std::string& shape) {
  const std::string round = R"(title = "Round"
[section]
shape = "circular"
diameter_mm = 400
[tube]
thickness_mm = 5
yield_MPa = 355
[core]
strength_MPa = 40
[[bars]]
count = 8
diameter_mm = 20
axis_mm = 45
[member]
length_mm = 4000
[load]
axial_kN = 1500
[fire]
curve = "standard"
)";
  const std::string circle = "\"circular\"\ndiameter_mm = 400";
  if (shape == "round") return round;
  if (shape == "square") {
    return replaced(replaced(round, "Round", "Square"), circle, "\"square\"\nside_mm = 400");
  }
  if (shape == "rectangular") {
    return replaced(replaced(round, "Round", "Rectangular"), circle,
                    "\"rectangular\"\nwidth_mm = 500\ndepth_mm = 300");
  }
  throw std::logic_error("no base of shape " + shape);
}

std::string edited(const std::string& shape, const std::string& from, const std::string& to) {
  return replaced(base_text(shape), from, to);
}

std::string refusal(const std::string& text, const std::vector<std::string>& overrides) {
  try {
    (void)read_column({"column.toml", text, "."}, overrides);
  } catch (const Error& error) {
    if (error.kind() != ErrorKind::bad_input) throw;
    return error.what();
  }
  return {};
}

}  // namespace ringward::cli::testing
