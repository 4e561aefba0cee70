#include "cli/dossier/svg_parts.hpp"

#include <fmt/format.h>

#include "cli/output/xml_text.hpp"

namespace ringward::cli {

std::string svg_opening(const PictureAbout& about, double width_px, double height_px) {
  return fmt::format(
      "<svg xmlns=\"http://www.w3.org/2000/svg\" class=\"picture\" viewBox=\"0 0 {0:.0f} {1:.0f}\" "
      "width=\"{0:.0f}\" height=\"{1:.0f}\" font-family=\"sans-serif\" role=\"img\" "
      "aria-labelledby=\"{2}-title {2}-desc\">\n<title id=\"{2}-title\">{3}</title>\n"
      "<desc id=\"{2}-desc\">{4}</desc>\n<rect width=\"{0:.0f}\" height=\"{1:.0f}\" "
      "fill=\"#fff\"/>\n",
      width_px, height_px, about.id, xml_text(about.title), xml_text(about.message));
}

std::string svg_text(const PicturePoint& at, const std::string& attributes,
                     const std::string& text) {
  return fmt::format("<text x=\"{:.1f}\" y=\"{:.1f}\" {}>{}</text>\n", at.x, at.y, attributes,
                     xml_text(text));
}

std::string svg_label(const PicturePoint& at, const std::string& text) {
  const std::string attributes = "text-anchor=\"middle\" font-size=\"10\" ";
  return svg_text(at, attributes + "fill=\"#fff\" stroke=\"#fff\" stroke-width=\"3\"", text) +
         svg_text(at, attributes + "fill=\"#000\"", text);
}

}  // namespace ringward::cli
