#include "cli/evidence/case_model.hpp"

#include "thermal/base/error.hpp"
#include "thermal/base/units.hpp"

namespace ringward::cli {

double argument(const Arguments& at, const std::string& name) {
  const auto found = at.find(name);
  if (found == at.end()) throw Error(ErrorKind::bad_input, "the argument " + name + " is missing");
  return found->second;
}

void unknown_quantity(const std::string& quantity) {
  throw Error(ErrorKind::bad_input, "this kind of case has no quantity \"" + quantity + "\"");
}

double time_argument_s(const Arguments& at) {
  if (at.count("time_s") > 0) return argument(at, "time_s");
  return units::s_from_min(argument(at, "time_min"));
}

CaseModelPtr make_model(const EvidenceCase& evidence) {
  const CaseInput input(evidence.inputs, evidence.file);
  const std::string& kind = evidence.kind;
  if (kind == "fire-curve") return fire_model(input);
  if (kind == "thermal-law") return thermal_law_model(input);
  if (kind == "strength-law" || kind == "stress-strain") return strength_law_model(input);
  if (kind == "restrained-bar") return restrained_bar_model(input);
  if (kind == "heat") return heat_model(input, evidence);
  if (kind == "confinement") return confinement_model(input);
  if (kind == "column") return column_model(input, evidence);
  throw Error(ErrorKind::bad_input, "there is no kind of case \"" + kind + "\"");
}

}  // namespace ringward::cli
