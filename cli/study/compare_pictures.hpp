#pragma once

#include <string>
#include <vector>

#include "cli/pictures/picture.hpp"
#include "cli/study/ranking.hpp"

namespace ringward::cli {

/// A picture with the words below it.
struct CaptionedPicture {
  Picture picture;
  std::string caption;
};

/// Fire resistance against the steel of one metre, the undominated layouts marked.
[[nodiscard]] CaptionedPicture trade_off_picture(const RankedStudy& study);

/// Fire resistance against each varied key that holds numbers, one picture a key.
[[nodiscard]] std::vector<CaptionedPicture> key_pictures(const RankedStudy& study);

/// "tube.thickness_mm" -> "tube.thickness_mm [mm]"
[[nodiscard]] std::string label_with_unit(const std::string& key);

}  // namespace ringward::cli
