#include "cli/output/colour_bands.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <array>
#include <cmath>

namespace ringward::cli {
namespace {

constexpr int kMostBands = 12;
constexpr std::array kWidths_C{1.0, 2.0, 5.0, 10.0, 20.0, 25.0, 50.0, 100.0, 200.0, 500.0};

struct Rgb {
  double red = 0;
  double green = 0;
  double blue = 0;
};

// Straw to embers to soot.
constexpr std::array<Rgb, 7> kRamp{{{253, 249, 235},
                                    {248, 226, 160},
                                    {243, 183, 92},
                                    {224, 126, 60},
                                    {182, 68, 48},
                                    {112, 30, 46},
                                    {32, 10, 26}}};

int band_at(double T_C, double width_C) { return static_cast<int>(std::floor(T_C / width_C)); }

Rgb on_ramp(double share) {
  const double place = std::clamp(share, 0.0, 1.0) * static_cast<double>(kRamp.size() - 1);
  const auto left = std::min(static_cast<std::size_t>(place), kRamp.size() - 2);
  const double f = place - static_cast<double>(left);
  const Rgb& a = kRamp[left];
  const Rgb& b = kRamp[left + 1];
  return {a.red + f * (b.red - a.red), a.green + f * (b.green - a.green),
          a.blue + f * (b.blue - a.blue)};
}

}  // namespace

ColourBands::ColourBands(double min_C, double max_C) {
  for (const double width_C : kWidths_C) {
    width_C_ = width_C;
    if (band_at(max_C, width_C) - band_at(min_C, width_C) < kMostBands) break;
  }
  first_ = band_at(min_C, width_C_);
  last_ = band_at(max_C, width_C_);
}

int ColourBands::band_of(double T_C) const {
  return std::clamp(band_at(T_C, width_C_), first_, last_);
}

std::string ColourBands::colour(int band) const {
  const double share = static_cast<double>(band - first_) / std::max(1, last_ - first_);
  const Rgb rgb = on_ramp(share);
  return fmt::format("#{:02x}{:02x}{:02x}", static_cast<int>(std::lround(rgb.red)),
                     static_cast<int>(std::lround(rgb.green)),
                     static_cast<int>(std::lround(rgb.blue)));
}

}  // namespace ringward::cli
