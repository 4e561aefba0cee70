#include "cli/evidence/case_input.hpp"

#include <algorithm>

#include "thermal/base/error.hpp"

namespace ringward::cli {
namespace {

const char* word_of(NodeKind kind) {
  switch (kind) {
    case NodeKind::table:
      return "a table";
    case NodeKind::list:
      return "a list";
    case NodeKind::number:
      return "a number";
    case NodeKind::text:
      return "a text";
    case NodeKind::boolean:
      return "true or false";
    case NodeKind::date:
      return "a date";
  }
  return "";
}

}  // namespace

CaseInput::CaseInput(const InputNode& node, std::string file)
    : node_(&node), file_(std::move(file)) {
  if (node.kind != NodeKind::table) fail("", "must be a table");
}

void CaseInput::fail(const std::string& key, const std::string& what) const {
  const InputEntry* entry = node_->find(key);
  const Location& place = entry == nullptr ? node_->location : entry->key_location;
  throw Error(ErrorKind::bad_input, describe(place, file_) + ": " + key + ": " + what);
}

const InputNode& CaseInput::get(const std::string& key, NodeKind kind) const {
  const InputEntry* entry = node_->find(key);
  if (entry == nullptr) fail(key, "is missing");
  if (entry->value.kind != kind) fail(key, std::string("must be ") + word_of(kind));
  return entry->value;
}

double CaseInput::number(const std::string& key) const { return get(key, NodeKind::number).number; }

double CaseInput::number_or(const std::string& key, double fallback) const {
  return has(key) ? number(key) : fallback;
}

std::string CaseInput::text(const std::string& key) const {
  const std::string& value = get(key, NodeKind::text).text;
  if (value.empty()) fail(key, "must not be empty");
  return value;
}

std::string CaseInput::text_or(const std::string& key, const std::string& fallback) const {
  return has(key) ? text(key) : fallback;
}

bool CaseInput::is_text(const std::string& key) const {
  const InputEntry* entry = node_->find(key);
  return entry != nullptr && entry->value.kind == NodeKind::text;
}

CaseInput CaseInput::table(const std::string& key) const {
  return {get(key, NodeKind::table), file_};
}

std::vector<CaseInput> CaseInput::tables(const std::string& key) const {
  std::vector<CaseInput> list;
  for (const InputNode& item : get(key, NodeKind::list).items) list.emplace_back(item, file_);
  if (list.empty()) fail(key, "must not be empty");
  return list;
}

std::vector<std::string> CaseInput::texts(const std::string& key) const {
  std::vector<std::string> list;
  for (const InputNode& item : get(key, NodeKind::list).items) {
    if (item.kind != NodeKind::text) fail(key, "must be a list of texts");
    list.push_back(item.text);
  }
  return list;
}

std::vector<std::vector<double>> CaseInput::rows(const std::string& key) const {
  std::vector<std::vector<double>> rows;
  for (const InputNode& row : get(key, NodeKind::list).items) {
    rows.emplace_back();
    for (const InputNode& cell : row.items) {
      if (cell.kind != NodeKind::number) fail(key, "must hold numbers only");
      rows.back().push_back(cell.number);
    }
    if (rows.back().empty()) fail(key, "must be a list of lists of numbers");
  }
  if (rows.empty()) fail(key, "must not be empty");
  return rows;
}

PiecewiseLinear CaseInput::curve(const std::string& key) const {
  const InputEntry* entry = node_->find(key);
  if (entry != nullptr && entry->value.kind == NodeKind::number) {
    return PiecewiseLinear(entry->value.number);
  }
  std::vector<PiecewiseLinear::Point> points;
  for (const std::vector<double>& row : rows(key)) {
    if (row.size() != 2) fail(key, "must be a number or [[x, y], ...]");
    points.push_back({row[0], row[1]});
  }
  return PiecewiseLinear(points);
}

void CaseInput::allow(const std::vector<std::string>& keys) const {
  for (const InputEntry& entry : node_->entries) {
    if (std::find(keys.begin(), keys.end(), entry.key) == keys.end()) {
      fail(entry.key, "is not known here");
    }
  }
}

}  // namespace ringward::cli
