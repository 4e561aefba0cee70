#include <catch2/catch.hpp>
#include <random>
#include <string>
#include <vector>

#include "cli/commands/new_file.hpp"
#include "cli/input/reader.hpp"
#include "tests/cli/input/column_texts.hpp"
#include "thermal/base/error.hpp"

namespace ringward::cli::testing {
namespace {

/// Random edits from a fixed seed, so that a failure can be repeated.
class Mutator {
 public:
  explicit Mutator(unsigned seed) : random_(seed) {}

  std::string mutate(std::string text) {
    for (std::size_t edits = 1 + below(4); edits > 0 && !text.empty(); --edits) {
      const std::size_t at = below(text.size());
      switch (below(5)) {
        case 0:
          text[at] = static_cast<char>(below(256));
          break;
        case 1:
          text.erase(at, 1 + below(12));
          break;
        case 2:
          text.insert(at, token());
          break;
        case 3:
          text.insert(below(text.size()), text.substr(at, 1 + below(60)));
          break;
        default:
          text = text.substr(0, at) + token() + text.substr(std::min(text.size(), at + 3));
      }
    }
    return text;
  }

 private:
  std::size_t below(std::size_t end) {
    return std::uniform_int_distribution<std::size_t>(0, end - 1)(random_);
  }

  std::string token() {
    static const std::vector<std::string> tokens = {"nan",
                                                    "-inf",
                                                    "1e308",
                                                    "-1",
                                                    "0",
                                                    "0.0000001",
                                                    "9223372036854775807",
                                                    "true",
                                                    "\"",
                                                    "'",
                                                    "[",
                                                    "]",
                                                    "[[",
                                                    "]]",
                                                    "{",
                                                    "}",
                                                    "=",
                                                    "\n",
                                                    "\n[",
                                                    ".",
                                                    ",",
                                                    "#",
                                                    "1979-05-27",
                                                    "\"\"\"",
                                                    "[[0, 0], [0, 0]]",
                                                    std::string(1, '\0'),
                                                    "\xff\xfe",
                                                    "\\u0000",
                                                    "bars",
                                                    "[tube]\n"};
    return tokens[below(tokens.size())];
  }

  std::mt19937 random_;
};

/// What is thrown other than Error(bad_input) with a message; empty when nothing is.
std::string wrong_behaviour(const std::string& text, const std::vector<std::string>& overrides) {
  try {
    (void)read_column({"column.toml", text, "."}, overrides);
  } catch (const Error& error) {
    if (error.kind() != ErrorKind::bad_input) return "another kind of error";
    if (std::string(error.what()).empty()) return "an error without a message";
  } catch (const std::exception& error) {
    return std::string("an exception that is no ringward::Error: ") + error.what();
  }
  return {};
}

}  // namespace

TEST_CASE("A damaged column file is read or refused, and nothing else happens") {
  Mutator mutator(20240601);
  std::size_t refused = 0;
  for (const std::string& text :
       {base_text("round"), base_text("rectangular"), new_file_text("circular"),
        edited("round", "[member]",
               "[steel_shape]\nkind = \"cross\"\ndepth_mm = 150\nwidth_mm = 60\nweb_mm = 8\n"
               "flange_mm = 12\nyield_MPa = 355\n[protection]\nthickness_mm = 25\n"
               "conductivity_W_mK = [[20, 0.2], [400, 0.3]]\ndensity_kg_m3 = 800\n"
               "specific_heat_J_kgK = 1700\n[member]")}) {
    for (int i = 0; i < 1000; ++i) {
      const std::string damaged = mutator.mutate(text);
      const std::string wrong = wrong_behaviour(damaged, {});
      if (!wrong.empty()) FAIL_CHECK(wrong << "\n" << damaged);
      if (!refusal(damaged).empty()) ++refused;
    }
  }
  // Most damage hits something that matters; comments of the starter file absorb the rest.
  CHECK(refused > 2000);
}

TEST_CASE("A damaged override is taken or refused, and nothing else happens") {
  Mutator mutator(7);
  for (const std::string assignment :
       {"bars[0].axis_mm=50", "load.axial_kN=2000", "fire.curve=\"hydrocarbon\"",
        "sensitivity.\"core.moisture_percent\"=[1.5, 10]", "bars[0].positions_mm[0][1]=5"}) {
    for (int i = 0; i < 400; ++i) {
      const std::string damaged = mutator.mutate(assignment);
      const std::string wrong = wrong_behaviour(base_text("round"), {damaged});
      if (!wrong.empty()) FAIL_CHECK(wrong << "\n" << damaged);
    }
  }
}

}  // namespace ringward::cli::testing
