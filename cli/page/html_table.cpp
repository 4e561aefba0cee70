#include "cli/page/html_table.hpp"

#include <algorithm>

#include "cli/output/xml_text.hpp"

namespace ringward::cli {
namespace {

std::string kind_attribute(const HtmlTable::Column& column) {
  return column.kind == CellKind::number ? " class=\"number\"" : "";
}

}  // namespace

void HtmlTable::add(const std::vector<std::string>& cells) {
  std::vector<Markup> row;
  for (const std::string& cell : cells) row.push_back(Markup::text(cell));
  add_marked(std::move(row));
}

bool HtmlTable::has_shares() const {
  return std::any_of(columns_.begin(), columns_.end(),
                     [](const Column& column) { return column.share_percent > 0; });
}

std::string HtmlTable::widths() const {
  std::string html = "<colgroup>";
  for (const Column& column : columns_) {
    html += column.share_percent == 0
                ? "<col/>"
                : "<col style=\"width: " + std::to_string(column.share_percent) + "%\"/>";
  }
  return html + "</colgroup>\n";
}

std::string HtmlTable::heading() const {
  std::string html = "<thead><tr>";
  for (const Column& column : columns_) {
    html += "<th scope=\"col\"" + kind_attribute(column) + ">" + xml_text(column.name);
    if (!column.unit.empty()) html += " <span class=\"unit\">" + xml_text(column.unit) + "</span>";
    html += "</th>";
  }
  return html + "</tr></thead>\n";
}

std::string HtmlTable::body() const {
  std::string html = "<tbody>\n";
  for (const std::vector<Markup>& row : rows_) {
    html += "<tr>";
    for (std::size_t i = 0; i < row.size(); ++i) {
      const std::string kind = kind_attribute(columns_.at(i));
      html += i == 0 ? "<th scope=\"row\"" + kind + ">" + row[i].html() + "</th>"
                     : "<td" + kind + ">" + row[i].html() + "</td>";
    }
    html += "</tr>\n";
  }
  return html + "</tbody>\n";
}

Markup HtmlTable::markup() const {
  const std::string caption = xml_text(caption_);
  // A table that is wider than the screen scrolls by itself, also with the keyboard.
  return Markup::own("<div class=\"wide\" role=\"region\" tabindex=\"0\" aria-label=\"" + caption +
                     "\"><table" + (has_shares() ? " class=\"shared\"" : "") + "><caption>" +
                     caption + "</caption>\n" + widths() + heading() + body() + "</table></div>");
}

}  // namespace ringward::cli
