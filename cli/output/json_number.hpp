#pragma once

#include <nlohmann/json_fwd.hpp>
#include <optional>
#include <string>

#include "thermal/base/notice.hpp"

namespace ringward::cli {

/// A rounded number, or null when there is none or it is not finite.
[[nodiscard]] nlohmann::ordered_json json_number(const std::optional<double>& value, int digits);

/// Notices in the order they are shown to a person.
[[nodiscard]] nlohmann::ordered_json json_notices(const Notices& notices);

/// The indented text of a result file, with a line end.
[[nodiscard]] std::string json_text(const nlohmann::ordered_json& document);

}  // namespace ringward::cli
