#include "cli/pictures/gnuplot_script.hpp"

#include <fmt/format.h>

#include <cmath>
#include <string_view>

#include "cli/output/xml_text.hpp"
#include "cli/pictures/gnuplot_svg.hpp"
#include "cli/process/external_program.hpp"

namespace ringward::cli {
namespace {

// Two characters for private use (U+E000, U+E001) enclose what stands for a text. Nothing that
// gnuplot writes of its own holds them.
constexpr std::string_view kOpen = "\xEE\x80\x80";
constexpr std::string_view kClose = "\xEE\x80\x81";

std::size_t characters_in(const std::string& text) {
  std::size_t count = 0;
  for (const char c : text) count += (static_cast<unsigned char>(c) & 0xC0) != 0x80 ? 1 : 0;
  return count;
}

// As long as the text itself, as far as the number fits: gnuplot leaves room by characters.
std::string placeholder(std::size_t number, std::size_t length) {
  const std::size_t digits = length > 2 ? length - 2 : 1;
  return fmt::format("{}{:0{}}{}", kOpen, number, digits, kClose);
}

std::string with_texts(const std::string& svg, const std::vector<std::string>& texts) {
  std::string result;
  std::size_t from = 0;
  for (std::size_t open = svg.find(kOpen); open != std::string::npos;
       open = svg.find(kOpen, from)) {
    const std::size_t digits = open + kOpen.size();
    const std::size_t close = svg.find(kClose, digits);
    if (close == std::string::npos) break;
    result += svg.substr(from, open - from);
    result += xml_text(texts.at(std::stoul(svg.substr(digits, close - digits))));
    from = close + kClose.size();
  }
  return result + svg.substr(from);
}

std::string opening(const PictureAbout& about, int height_px) {
  const std::string id = about.id;
  return fmt::format(
      "<svg xmlns=\"http://www.w3.org/2000/svg\" "
      "class=\"picture\" viewBox=\"0 0 {0} {1}\" width=\"{0}\" height=\"{1}\" role=\"img\" "
      "aria-labelledby=\"{2}-title {2}-desc\">\n<title id=\"{2}-title\">{3}</title>\n"
      "<desc id=\"{2}-desc\">{4}</desc>\n",
      kPictureWidth_px, height_px, id, xml_text(about.title), xml_text(about.message));
}

constexpr const char* kLook =
    "set encoding utf8\n"
    "set border 3 linewidth 1 linecolor rgb '#222222'\n"
    "set tics nomirror out scale 0.6\n"
    "set grid linetype 1 linewidth 0.5 linecolor rgb '#d9d9d9', "
    "linetype 1 linewidth 0.5 linecolor rgb '#d9d9d9'\n"
    "set key outside top left horizontal Left reverse samplen 4 spacing 1.1\n"
    "set datafile separator whitespace\n";

std::string reason(const ProgramRun& run) {
  if (run.outcome == ProgramOutcome::not_installed) {
    return "The picture is missing: gnuplot is not installed (Debian: apt install gnuplot-nox).";
  }
  return "The picture is missing: gnuplot did not draw it (" + shortened(run.err, 200) + ").";
}

}  // namespace

std::string gnuplot_number(double value) { return fmt::format("{}", value); }

GnuplotScript::GnuplotScript(PictureAbout about, int height_px)
    : about_(std::move(about)), height_px_(height_px) {
  add(
      fmt::format("set terminal svg size {},{} dynamic noenhanced font 'sans-serif,12' "
                  "linewidth 1 dashlength 1 background '#ffffff'",
                  kPictureWidth_px, height_px_));
  script_ += kLook;
}

std::string GnuplotScript::text(const std::string& text, std::size_t longest) {
  texts_.push_back(shortened(text, longest));
  return "'" + placeholder(texts_.size() - 1, characters_in(texts_.back())) + "'";
}

std::string GnuplotScript::data(const std::vector<std::vector<double>>& rows) {
  const std::string name = fmt::format("$d{}", data_blocks_++);
  script_ += name + " << END\n";
  for (const std::vector<double>& row : rows) {
    std::string line;
    for (const double value : row) {
      if (!std::isfinite(value)) {
        line.clear();
        break;
      }
      line += gnuplot_number(value) + " ";
    }
    script_ += line + "\n";
  }
  script_ += "END\n";
  return name;
}

void GnuplotScript::set_axes(const PictureAxis& x, const PictureAxis& y) {
  const auto end = [](const std::optional<double>& limit) {
    return limit ? gnuplot_number(*limit) : std::string("*");
  };
  add("set xlabel " + text(x.label));
  add("set ylabel " + text(y.label));
  add("set xrange [" + end(x.low) + ":" + end(x.high) + "]");
  add("set yrange [" + end(y.low) + ":" + end(y.high) + "]");
}

Picture GnuplotScript::drawn() const {
  const ProgramRun run =
      run_external({.name = "gnuplot", .arguments = {"-d", "-"}, .input = script_});
  const std::string content = run.succeeded() ? inlined_svg(run.out, about_.id) : "";
  if (content.empty()) return {.svg = "", .why_missing = reason(run)};
  return {.svg = opening(about_, height_px_) + with_texts(content, texts_) + "</svg>\n",
          .why_missing = ""};
}

}  // namespace ringward::cli
