#pragma once

#include <string>
#include <vector>

#include "cli/input/input_tree.hpp"
#include "thermal/base/piecewise_linear.hpp"

namespace ringward::cli {

/// A table of a case file, read by key; whatever is wrong is reported with its place.
class CaseInput {
 public:
  /// @param node a table that outlives this
  CaseInput(const InputNode& node, std::string file);

  [[nodiscard]] bool has(const std::string& key) const { return node_->find(key) != nullptr; }
  /// @throws Error(bad_input) when the key is missing or its value of another kind; so all below
  [[nodiscard]] double number(const std::string& key) const;
  [[nodiscard]] double number_or(const std::string& key, double fallback) const;
  [[nodiscard]] std::string text(const std::string& key) const;
  [[nodiscard]] std::string text_or(const std::string& key, const std::string& fallback) const;
  [[nodiscard]] CaseInput table(const std::string& key) const;
  [[nodiscard]] std::vector<CaseInput> tables(const std::string& key) const;
  [[nodiscard]] std::vector<std::string> texts(const std::string& key) const;
  [[nodiscard]] std::vector<std::vector<double>> rows(const std::string& key) const;
  [[nodiscard]] bool is_text(const std::string& key) const;
  /// A number, or [[x, y], ...].
  [[nodiscard]] PiecewiseLinear curve(const std::string& key) const;

  /// Complains about keys that are not in the list.
  void allow(const std::vector<std::string>& keys) const;
  [[noreturn]] void fail(const std::string& key, const std::string& what) const;

  [[nodiscard]] const InputNode& node() const { return *node_; }
  [[nodiscard]] const std::string& file() const { return file_; }

 private:
  [[nodiscard]] const InputNode& get(const std::string& key, NodeKind kind) const;

  const InputNode* node_;
  std::string file_;
};

}  // namespace ringward::cli
