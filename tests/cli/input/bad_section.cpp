#include <catch2/catch.hpp>

#include "tests/cli/input/column_texts.hpp"

namespace ringward::cli::testing {

TEST_CASE(
    "A section that contradicts itself is refused with its place, the value, the limit and the way "
    "out") {
  const std::vector<BadFile> files = {
      {"a value below its range", "round", "diameter_mm = 400", "diameter_mm = 0.4",
       "column.toml:4:15: section.diameter_mm: 0.4 mm is below the least allowed, 50 mm; lengths "
       "are in mm"},
      {"a dimension of another shape", "round", "diameter_mm = 400",
       "diameter_mm = 400\nside_mm = 400",
       "column.toml:5:11: section.side_mm: belongs to section.shape = \"square\", but "
       "section.shape is \"circular\"; remove it or change section.shape"},
      {"the dimension of the shape is missing", "square", "side_mm = 400\n", "",
       "column.toml:2:1: section.side_mm: missing; add e.g. side_mm = 400 (mm) to [section]"},
      {"a bar axis beyond the centre of a small core", "round", "diameter_mm = 400",
       "diameter_mm = 60",
       "column.toml:13:11: bars[0].axis_mm: 45 mm reaches the centre of the core or beyond; it "
       "must be below half the core, 25 mm"},
      {"a tube that leaves no core", "round", "thickness_mm = 5", "thickness_mm = 200",
       "column.toml:6:16: tube.thickness_mm: 200 mm leaves no core; it must be below half the "
       "section, 200 mm"},
      {"a bar with cover below zero", "round", "axis_mm = 45", "axis_mm = 9",
       "column.toml:13:11: bars[0].axis_mm: the cover is below zero: the axis is 9 mm from the "
       "core's face, the bar's radius is 10 mm; move the bar inwards"},
      {"a bar axis beyond the centre", "round", "axis_mm = 45", "axis_mm = 196",
       "column.toml:13:11: bars[0].axis_mm: 196 mm reaches the centre of the core or beyond; it "
       "must be below half the core, 195 mm"},
      {"a bar outside the core", "round", "count = 8\ndiameter_mm = 20\naxis_mm = 45",
       "diameter_mm = 20\npositions_mm = [[0, 120], [0, -200]]",
       "column.toml:12:16: bars[0].positions_mm: the bar at (0, -200) mm lies 5 mm outside the "
       "core; place it inside"},
      {"bars of one group that overlap", "round", "count = 8", "count = 60",
       "column.toml:13:11: bars[0].axis_mm: the bars at (149.178, 15.6793) mm and (150, 0) mm "
       "(bars[0]) overlap: 15.7 mm between axes, at least 20 mm needed; use fewer or smaller bars "
       "or move them"},
      {"bars of two groups that overlap", "round", "[member]",
       "[[bars]]\ndiameter_mm = 16\npositions_mm = [[150, 5]]\n[member]",
       "column.toml:16:16: bars[1].positions_mm: the bars at (150, 5) mm and (150, 0) mm (bars[0]) "
       "overlap: 5 mm between axes, at least 18 mm needed; use fewer or smaller bars or move them"},
      {"positions with count and axis", "round", "axis_mm = 45",
       "axis_mm = 45\npositions_mm = [[0, 120]]",
       "column.toml:11:9: bars[0].count: count and positions_mm exclude each other; remove one of "
       "the two\ncolumn.toml:13:11: bars[0].axis_mm: axis_mm and positions_mm exclude each other; "
       "remove one of the two"},
      {"neither count nor positions", "round", "count = 8\n", "",
       "column.toml:10:1: bars[0].count: missing; give count and axis_mm, or positions_mm = [[x, "
       "y], ...]"},
      {"a layout unsuited to a circle", "round", "axis_mm = 45",
       "axis_mm = 45\nlayout = \"perimeter\"",
       "column.toml:14:10: bars[0].layout: \"perimeter\" does not suit a circular section; use "
       "\"ring\" or positions_mm"},
      {"a ring in a square", "square", "axis_mm = 45", "axis_mm = 45\nlayout = \"ring\"",
       "column.toml:14:10: bars[0].layout: \"ring\" does not suit a square section; use "
       "\"corners\", \"perimeter\" or positions_mm"},
      {"an odd count along the perimeter", "square", "count = 8", "count = 7",
       "column.toml:11:9: bars[0].count: 7 bars in layout \"perimeter\"; it takes an even count of "
       "at least 4; use positions_mm for anything else"},
      {"too few bars along the perimeter", "square", "count = 8", "count = 2",
       "column.toml:11:9: bars[0].count: 2 bars in layout \"perimeter\"; it takes an even count of "
       "at least 4; use positions_mm for anything else"},
      {"corners with a count other than four", "square", "count = 8",
       "count = 8\nlayout = \"corners\"",
       "column.toml:11:9: bars[0].count: 8 bars in layout \"corners\"; it takes exactly 4; use "
       "\"perimeter\" for more"},
      {"a steel shape whose corners leave the round core", "round", "[member]",
       "[steel_shape]\nkind = \"I\"\ndepth_mm = 300\nwidth_mm = 300\nweb_mm = 9\nflange_mm = "
       "14\nyield_MPa = 355\nrotation_deg = 0\n[member]",
       "column.toml:13:11: bars[0].axis_mm: the bar at (0, 150) mm overlaps the steel shape: 0 mm "
       "from its axis to the steel, at least 10 mm needed; move one of them\ncolumn.toml:16:12: "
       "steel_shape.depth_mm: the shape of 300 x 300 mm, rotated by 0 deg, reaches 17.13 mm "
       "outside the core of 390 x 390 mm; take a smaller shape or another rotation"},
      {"a steel shape that leaves the square core only when rotated", "square",
       "count = 8\ndiameter_mm = 20\naxis_mm = 45\n[member]",
       "diameter_mm = 12\npositions_mm = [[180, 180]]\n[steel_shape]\nkind = \"I\"\ndepth_mm = "
       "300\nwidth_mm = 290\nweb_mm = 9\nflange_mm = 14\nyield_MPa = 355\nrotation_deg = "
       "45\n[member]",
       "column.toml:15:12: steel_shape.depth_mm: the shape of 300 x 290 mm, rotated by 45 deg, "
       "reaches 13.6 mm outside the core of 390 x 390 mm; take a smaller shape or another "
       "rotation"},
      {"flanges that leave no web", "round", "[member]",
       "[steel_shape]\nkind = \"I\"\ndepth_mm = 100\nwidth_mm = 100\nweb_mm = 9\nflange_mm = "
       "50\nyield_MPa = 355\nrotation_deg = 0\n[member]",
       "column.toml:19:13: steel_shape.flange_mm: two flanges of 50 mm leave no web; they must be "
       "below half the depth, 50 mm"},
      {"a web wider than the flanges", "round", "[member]",
       "[steel_shape]\nkind = \"I\"\ndepth_mm = 100\nwidth_mm = 20\nweb_mm = 30\nflange_mm = "
       "5\nyield_MPa = 355\nrotation_deg = 0\n[member]",
       "column.toml:18:10: steel_shape.web_mm: 30 mm is wider than the flanges, 20 mm; check "
       "web_mm and width_mm"},
      {"a cross whose flanges run into each other", "round", "[member]",
       "[steel_shape]\nkind = \"cross\"\ndepth_mm = 150\nwidth_mm = 140\nweb_mm = 8\nflange_mm = "
       "10\nyield_MPa = 355\nrotation_deg = 0\n[member]",
       "column.toml:17:12: steel_shape.width_mm: 140 mm makes the flanges of the two I shapes run "
       "into each other; at most depth less two flanges, 130 mm"},
      {"a bar that overlaps the steel shape", "round", "[member]",
       "[steel_shape]\nkind = \"I\"\ndepth_mm = 230\nwidth_mm = 230\nweb_mm = 9\nflange_mm = "
       "14\nyield_MPa = 355\nrotation_deg = 0\n[member]",
       "column.toml:13:11: bars[0].axis_mm: the bar at (106.066, 106.066) mm overlaps the steel "
       "shape: 0 mm from its axis to the steel, at least 10 mm needed; move one of them"},
  };
  for (const BadFile& file : files) {
    DYNAMIC_SECTION(file.claim) {
      CHECK(refusal(edited(file.base, file.from, file.to)) == file.expected);
    }
  }
}

}  // namespace ringward::cli::testing
