#include <cmath>
#include <nlohmann/json.hpp>

#include "cli/dossier/temperature_map.hpp"
#include "cli/output/base64.hpp"
#include "cli/output/numbers.hpp"
#include "cli/output/picture_outlines.hpp"
#include "thermal/base/units.hpp"

namespace ringward::cli {
namespace {

constexpr int kRasterPoints = 80;  ///< along the longer side
constexpr double kStep_K = 5;
constexpr double kLowest_C = 20;

// Middles of the raster's cells; the first row is the top one.
struct Raster {
  int columns = 0;
  int rows = 0;
  double width_m = 0;
  double depth_m = 0;

  [[nodiscard]] thermal::Point point(int i, int j) const {
    return {width_m * ((i + 0.5) / columns - 0.5), depth_m * (0.5 - (j + 0.5) / rows)};
  }
};

Raster raster_of(const thermal::Outline& outline) {
  const double longer = std::max(outline.width_m, outline.depth_m);
  const auto count = [longer](double side) {
    return std::max(2, static_cast<int>(std::lround(kRasterPoints * side / longer)));
  };
  return {count(outline.width_m), count(outline.depth_m), outline.width_m, outline.depth_m};
}

// 0 outside of the section.
char code_of(double T_C) {
  const double steps = std::clamp(std::round((T_C - kLowest_C) / kStep_K) + 1, 1.0, 255.0);
  return static_cast<char>(static_cast<unsigned char>(steps));
}

std::string frame(const MapSubject& subject, const Raster& raster, double time_s) {
  const bool round = subject.section->is_circular();
  std::string bytes;
  for (int j = 0; j < raster.rows; ++j) {
    for (int i = 0; i < raster.columns; ++i) {
      const thermal::Point at = raster.point(i, j);
      const bool outside = round && std::hypot(at.x_m, at.y_m) >= raster.width_m / 2;
      bytes += outside ? '\0' : code_of(subject.history->T_C(at, time_s));
    }
  }
  return bytes;
}

}  // namespace

std::string map_frames_json(const MapSubject& subject, const FieldState& shown,
                            const std::vector<double>& times_s) {
  const Raster raster = raster_of(overall_outline(*subject.section));
  const ColourBands bands = bands_for({shown});
  nlohmann::ordered_json document = {{"columns", raster.columns},
                                     {"rows", raster.rows},
                                     {"lowest_C", kLowest_C},
                                     {"step_K", kStep_K},
                                     {"band_K", bands.lower_C(1) - bands.lower_C(0)},
                                     {"first_band", bands.first()}};
  document["colours"] = nlohmann::ordered_json::array();
  for (int band = bands.first(); band <= bands.last(); ++band) {
    document["colours"].push_back(bands.colour(band));
  }
  std::string frames;
  for (const double time_s : times_s) {
    document["times_min"].push_back(rounded(minutes_down(time_s), kDigitsMinutes));
    document["gas_C"].push_back(std::lround(subject.history->gas_C(time_s)));
    frames += frame(subject, raster, time_s);
  }
  document["frames"] = base64(frames);
  return document.dump();
}

const char* map_script() {
  // Without "less than" and ampersand, so that the page stays well-formed XML.
  return R"js((function () {
  'use strict';
  var data = JSON.parse(document.getElementById('map-frames').textContent);
  var bytes = atob(data.frames);
  var figure = document.getElementById('map-figure');
  var field = figure.querySelector('.map-field');
  var labels = figure.querySelector('.map-labels');
  var image = figure.querySelector('.map-image');
  var heading = figure.querySelector('.map-heading');
  var slider = document.getElementById('map-time');
  var shown = document.getElementById('map-shown');
  var last = data.times_min.length - 1;
  var fine = 6;
  var canvas = document.createElement('canvas');
  canvas.width = data.columns * fine;
  canvas.height = data.rows * fine;
  var pen = canvas.getContext('2d');
  var colours = data.colours.map(function (text) {
    return [1, 3, 5].map(function (at) { return parseInt(text.slice(at, at + 2), 16); });
  });
  function clamp(value, most) { return Math.max(0, Math.min(most, value)); }
  function code(frame, i, j) {
    return bytes.charCodeAt((frame * data.rows + clamp(j, data.rows - 1)) * data.columns +
                            clamp(i, data.columns - 1));
  }
  function bandAt(frame, x, y) {
    var i = Math.floor(x), j = Math.floor(y), u = x - i, v = y - j;
    var a = code(frame, i, j), b = code(frame, i + 1, j);
    var c = code(frame, i, j + 1), d = code(frame, i + 1, j + 1);
    var value = (1 - v) * ((1 - u) * a + u * b) + v * ((1 - u) * c + u * d);
    if (a * b * c * d === 0) value = code(frame, Math.round(x), Math.round(y));
    if (value === 0) return -1;
    var T = data.lowest_C + data.step_K * (value - 1);
    return clamp(Math.floor(T / data.band_K) - data.first_band, colours.length - 1);
  }
  function draw(frame) {
    var picture = pen.createImageData(canvas.width, canvas.height);
    var above = [], at = 0;
    for (var y = 0; y !== canvas.height; y += 1) {
      var before = -1;
      for (var x = 0; x !== canvas.width; x += 1) {
        var band = bandAt(frame, (x + 0.5) / fine - 0.5, (y + 0.5) / fine - 0.5);
        if (band !== -1) {
          var edge = before !== -1 ? before !== band : false;
          if (y !== 0) edge = edge || (above[x] !== -1 ? above[x] !== band : false);
          var colour = edge ? [51, 51, 51] : colours[band];
          picture.data[at] = colour[0];
          picture.data[at + 1] = colour[1];
          picture.data[at + 2] = colour[2];
          picture.data[at + 3] = 255;
        }
        above[x] = band;
        before = band;
        at += 4;
      }
    }
    pen.putImageData(picture, 0, 0);
    image.setAttribute('href', canvas.toDataURL());
  }
  function show(frame) {
    var words = data.times_min[frame] + ' min, gas ' + data.gas_C[frame] + ' \u00b0C';
    var still = frame === last;
    if (!still) draw(frame);
    field.style.display = still ? '' : 'none';
    labels.style.display = still ? '' : 'none';
    image.style.display = still ? 'none' : 'inline';
    heading.textContent = words;
    shown.textContent = words;
    slider.setAttribute('aria-valuetext', words);
  }
  slider.max = String(last);
  slider.value = String(last);
  slider.addEventListener('input', function () { show(Number(slider.value)); });
  window.addEventListener('beforeprint', function () { slider.value = String(last); show(last); });
  show(last);
  document.getElementById('map-control').hidden = false;
}());
)js";
}

}  // namespace ringward::cli
