#include "cli/input/toml_reading.hpp"

#include <fmt/format.h>
#include <toml++/toml.h>

#include <algorithm>
#include <fstream>
#include <iostream>
#include <iterator>
#include <sstream>

#include "thermal/base/error.hpp"

namespace ringward::cli {
namespace {

Location position_of(const toml::source_region& region) {
  return {.line = std::max<std::size_t>(region.begin.line, 1),
          .column = std::max<std::size_t>(region.begin.column, 1),
          .override_key = {}};
}

bool comes_before(const InputEntry& a, const InputEntry& b) {
  const Location& left = a.key_location;
  const Location& right = b.key_location;
  return left.line != right.line ? left.line < right.line : left.column < right.column;
}

InputNode convert(const toml::node& node);

void convert_table(const toml::table& table, InputNode& result) {
  result.kind = NodeKind::table;
  for (const auto& [key, value] : table) {
    result.entries.push_back({std::string(key.str()), position_of(key.source()), convert(value)});
  }
  std::stable_sort(result.entries.begin(), result.entries.end(), comes_before);
}

template <typename T>
std::string as_written(const T& value) {
  std::ostringstream out;
  out << value;
  return out.str();
}

InputNode convert(const toml::node& node) {
  InputNode result;
  result.location = position_of(node.source());
  if (const auto* table = node.as_table()) {
    convert_table(*table, result);
  } else if (const auto* list = node.as_array()) {
    result.kind = NodeKind::list;
    for (const toml::node& item : *list) result.items.push_back(convert(item));
  } else if (const auto* text = node.as_string()) {
    result.kind = NodeKind::text;
    result.text = text->get();
  } else if (const auto* whole = node.as_integer()) {
    result.kind = NodeKind::number;
    result.number = static_cast<double>(whole->get());
  } else if (const auto* number = node.as_floating_point()) {
    result.kind = NodeKind::number;
    result.number = number->get();
  } else if (const auto* truth = node.as_boolean()) {
    result.kind = NodeKind::boolean;
    result.boolean = truth->get();
  } else {
    result.kind = NodeKind::date;
    if (const auto* date = node.as_date()) result.text = as_written(date->get());
    if (const auto* time = node.as_time()) result.text = as_written(time->get());
    if (const auto* both = node.as_date_time()) result.text = as_written(both->get());
  }
  return result;
}

std::string read_all(std::istream& in) {
  return {std::istreambuf_iterator<char>(in), std::istreambuf_iterator<char>()};
}

}  // namespace

InputSource load_source(const std::string& path) {
  if (path == "-") return {"stdin", read_all(std::cin), std::filesystem::path(".")};
  std::error_code ignored;
  if (std::filesystem::is_directory(path, ignored)) {
    throw Error(ErrorKind::bad_input, path + ": is a folder; give the path of a column file");
  }
  std::ifstream file(path, std::ios::binary);
  if (!file) {
    throw Error(ErrorKind::bad_input,
                path + ": cannot be read; check the path and its permissions");
  }
  return {path, read_all(file), std::filesystem::path(path).parent_path()};
}

InputNode parse_toml(const std::string& text, const std::string& name) {
  try {
    const toml::table table = toml::parse(std::string_view(text), name);
    InputNode root;
    convert_table(table, root);
    return root;
  } catch (const toml::parse_error& error) {
    const auto& at = error.source().begin;
    throw Error(ErrorKind::bad_input,
                fmt::format("{}:{}:{}: not valid TOML: {}; correct the syntax here", name,
                            std::max<unsigned>(at.line, 1), std::max<unsigned>(at.column, 1),
                            std::string(error.description())));
  }
}

}  // namespace ringward::cli
