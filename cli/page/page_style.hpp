#pragma once

namespace ringward::cli {

/// The style sheet of every page: for screens from 390 px and for A4. Holds no "<" and no "&".
[[nodiscard]] const char* page_style();

}  // namespace ringward::cli
