#include <algorithm>
#include <catch2/catch.hpp>

#include "cli/input/reader.hpp"
#include "cli/input/sha256.hpp"
#include "tests/cli/input/column_texts.hpp"

namespace ringward::cli::testing {
namespace {

using thermal::FaceCondition;

ColumnInput read_text(const std::string& text, const std::vector<std::string>& overrides = {}) {
  return read_column({"column.toml", text, "."}, overrides);
}

ColumnInput read_base(const std::string& shape, const std::vector<std::string>& overrides = {}) {
  return read_text(base_text(shape), overrides);
}

const EchoEntry& echoed(const ColumnInput& input, const std::string& key) {
  const auto found = std::find_if(input.echo.begin(), input.echo.end(),
                                  [&](const EchoEntry& entry) { return entry.key == key; });
  if (found == input.echo.end()) throw std::logic_error("not echoed: " + key);
  return *found;
}

double echoed_number(const ColumnInput& input, const std::string& key) {
  return std::get<double>(echoed(input, key).value);
}

bool has_notice(const ColumnInput& input, const std::string& code) {
  return std::any_of(input.notices.begin(), input.notices.end(),
                     [&](const Notice& notice) { return notice.code == code; });
}

}  // namespace

// Tolerances of 1e-14 are the rounding of one multiplication by a unit factor.

TEST_CASE("A column file arrives in SI units") {
  const ColumnInput input = read_base(
      "round", {"core.moisture_percent=1.5", "core.aggregate=\"calcareous\"",
                "core.conductivity=\"lower\"", "bars[0].forming=\"cold-worked\"",
                "bars[0].start_deg=90", "load.eccentricity_y_mm=-20", "member.buckling_factor=0.5",
                "rating.gamma_bar=1.15", "numerics.accuracy=\"fine\"", "tube.friction=0.5"});
  const auto& section = input.column.section;
  CHECK(input.title == "Round");
  CHECK(section.outline.width_m == Approx(0.4).epsilon(1e-14));
  CHECK(section.outline.depth_m == section.outline.width_m);
  CHECK(section.tube->thickness_m == Approx(0.005).epsilon(1e-14));
  CHECK(section.tube->yield_Pa == Approx(355e6).epsilon(1e-14));
  CHECK(section.tube->end_gap_m == Approx(0.01).epsilon(1e-14));
  CHECK(section.core.strength_Pa == Approx(40e6).epsilon(1e-14));
  CHECK(section.core.moisture_fraction == Approx(0.015).epsilon(1e-14));
  CHECK(section.core.aggregate == thermal::Aggregate::calcareous);
  CHECK(section.core.conductivity == thermal::ConductivityLimit::lower);
  CHECK(section.bars[0].forming == thermal::BarForming::cold_worked);
  CHECK(section.bars[0].diameter_m == Approx(0.02).epsilon(1e-14));
  // The axis is measured from the face of the core: 200 - 5 - 45 = 150 mm from the centre.
  CHECK(section.bars[0].positions[0].y_m == Approx(0.150).epsilon(1e-13));
  CHECK(section.bars[0].positions.size() == 8);
  CHECK(input.column.load.axial_N == Approx(1.5e6).epsilon(1e-14));
  CHECK(input.column.load.eccentricity_y_m == Approx(-0.02).epsilon(1e-14));
  CHECK_FALSE(input.column.load.moments_given);
  CHECK(input.column.member.buckling_length_m == Approx(2.0).epsilon(1e-14));
  CHECK(input.column.factors.bar == 1.15);
  CHECK(input.accuracy == thermal::Accuracy::fine);
  CHECK(input.fire.duration_s == 14400);
  CHECK(input.has_classes);
  CHECK_FALSE(input.required_s);
  // EN 1991-1-2 3.2.1 (from memory): 20 + 345 log10(8 * 30 + 1) = 841.8 C at 30 min.
  CHECK(input.fire.gas.T_C(1800) == Approx(841.8).margin(0.05));
}

TEST_CASE("Defaults follow from the other keys and are echoed as defaults") {
  const ColumnInput input = read_base("round");
  CHECK(echoed_number(input, "tube.clear_height_mm") == 3980);
  CHECK(echoed_number(input, "member.buckling_length_mm") == 4000);
  CHECK(echoed_number(input, "member.imperfection_mm") == 10);
  CHECK(echoed_number(input, "fire.surface.convection_W_m2K") == 25);
  CHECK(echoed_number(input, "fire.surface.emissivity") == 0.7);
  CHECK(echoed_number(input, "fire.ambient.temperature_C") == 20);
  CHECK(echoed_number(input, "fire.ambient.convection_W_m2K") == 9);
  CHECK(std::get<std::string>(echoed(input, "confinement.model").value) == "contact");
  CHECK(std::get<std::string>(echoed(input, "bars[0].layout").value) == "ring");
  CHECK_FALSE(echoed(input, "tube.clear_height_mm").given);
  CHECK(echoed(input, "tube.thickness_mm").given);
  CHECK(input.column.section.tube->clear_height_m == Approx(3.98).epsilon(1e-14));
  CHECK(input.column.confinement == mechanical::ConfinementModel::contact);
}

TEST_CASE("A given buckling length wins over the default factor, in the echo too") {
  const ColumnInput input = read_base("round", {"member.buckling_length_mm=3000"});
  CHECK(echoed_number(input, "member.buckling_factor") == 0.75);
  CHECK(echoed_number(input, "member.imperfection_mm") == 7.5);
  CHECK(input.column.member.imperfection_m == Approx(0.0075).epsilon(1e-14));
}

TEST_CASE("Confinement is on by default for round confining tubes only") {
  using mechanical::ConfinementModel;
  CHECK(read_base("square").column.confinement == ConfinementModel::none);
  CHECK(read_base("rectangular").column.confinement == ConfinementModel::none);
  CHECK(read_base("round", {"tube.role=\"composite\""}).column.confinement ==
        ConfinementModel::none);
  const std::string tube = "[tube]\nthickness_mm = 5\nyield_MPa = 355\n";
  const ColumnInput bare = read_text(edited("round", tube, ""));
  CHECK(bare.column.confinement == ConfinementModel::none);
  CHECK_FALSE(bare.column.section.tube);
  CHECK(read_base("round", {"confinement.model=\"yield\""}).column.confinement ==
        ConfinementModel::yield);
}

TEST_CASE("End moments replace the eccentricity, and one left out is zero") {
  const ColumnInput input =
      read_base("round", {"load.moment_x_kNm=12", "load.eccentricity_x_mm=0"});
  CHECK(input.column.load.moments_given);
  CHECK(input.column.load.moment_x_Nm == Approx(12e3).epsilon(1e-14));
  CHECK(input.column.load.moment_y_Nm == 0);
}

TEST_CASE("Faces are heated, built in, or lose heat to ambient") {
  const ColumnInput input =
      read_base("rectangular", {"fire.exposed=[\"left\", \"bottom\"]", "fire.built_in=[\"top\"]"});
  const auto& exposed = input.fire.exposed;
  CHECK(exposed.face(thermal::Face::left) == FaceCondition::heated);
  CHECK(exposed.face(thermal::Face::bottom) == FaceCondition::heated);
  CHECK(exposed.face(thermal::Face::top) == FaceCondition::built_in);
  CHECK(exposed.face(thermal::Face::right) == FaceCondition::ambient);
}

TEST_CASE("An arc ends above its start, by full turns") {
  const ColumnInput input =
      read_base("round", {"fire.arc_deg=[270, 90]", "fire.built_in_arc_deg=[90, 180]"});
  const double degree = 3.14159265358979323846 / 180;
  REQUIRE(input.fire.exposed.heated_arc);
  CHECK(input.fire.exposed.heated_arc->from_rad == Approx(270 * degree).epsilon(1e-14));
  CHECK(input.fire.exposed.heated_arc->to_rad == Approx(450 * degree).epsilon(1e-14));
  CHECK(input.fire.exposed.built_in_arc->to_rad == Approx(180 * degree).epsilon(1e-14));
  CHECK(read_base("round", {"fire.arc_deg=[0, 360]"}).fire.exposed.heated_arc->to_rad ==
        Approx(360 * degree).epsilon(1e-14));
  CHECK_FALSE(read_base("round").fire.exposed.heated_arc);
}

// EN 1991-1-2 3.2 and 3.3 (from memory).
TEST_CASE("The convection coefficient follows the curve unless it is given") {
  const std::string table = "fire.points_min_C=[[0, 20], [30, 800], [60, 20]]";
  CHECK(read_base("round", {"fire.curve=\"hydrocarbon\""}).fire.surface.convection_W_m2K == 50);
  const ColumnInput by_points = read_base("round", {"fire.curve=\"table\"", table});
  CHECK(by_points.fire.surface.convection_W_m2K == 35);
  CHECK_FALSE(by_points.has_classes);
  CHECK(by_points.fire.gas.has_cooling);
  CHECK(by_points.fire.gas.T_C(900) == Approx(410).epsilon(1e-12));
  CHECK(read_base("round", {"fire.curve=\"table\"", table, "fire.surface.convection_W_m2K=25"})
            .fire.surface.convection_W_m2K == 25);
}

TEST_CASE("A whole number is accepted where a number belongs, and the other way round") {
  CHECK(read_base("round", {"core.strength_MPa=40.0", "bars[0].count=6.0"})
            .column.section.bars[0]
            .positions.size() == 6);
}

TEST_CASE("A touch is no overlap and no lack of cover") {
  CHECK(refusal(base_text("round"), {"bars[0].axis_mm=10"}).empty());
  const std::string two_touching = "bars=[{diameter_mm=20, positions_mm=[[-10, 0], [10, 0]]}]";
  CHECK(refusal(base_text("round"), {two_touching}).empty());
}

TEST_CASE("The hash is that of the file's bytes, and overrides change it in their order") {
  // FIPS 180-2 (from memory): SHA-256 of "abc".
  CHECK(sha256_hex("abc") == "ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad");
  const std::string plain = read_base("round").input_sha256;
  CHECK(plain == sha256_hex(base_text("round")));
  const std::string a = "load.axial_kN=1000";
  const std::string b = "tube.friction=0.3";
  CHECK(read_base("round", {a}).input_sha256 != plain);
  CHECK(read_base("round", {a, b}).input_sha256 == read_base("round", {a, b}).input_sha256);
  CHECK(read_base("round", {a, b}).input_sha256 != read_base("round", {b, a}).input_sha256);
}

TEST_CASE("Submission and sensitivity are kept") {
  const ColumnInput input = read_base(
      "round", {"submission={project=\"P\", date=\"2025-01-01\"}",
                "sensitivity={\"tube.thickness_mm\"=[4, 6], \"bars[0].axis_mm\"=[40, 50]}"});
  CHECK(input.submission ==
        std::map<std::string, std::string>{{"project", "P"}, {"date", "2025-01-01"}});
  REQUIRE(input.sensitivity.size() == 2);
  CHECK(std::any_of(input.sensitivity.begin(), input.sensitivity.end(), [](const auto& range) {
    return range.key == "bars[0].axis_mm" && range.low == 40 && range.high == 50;
  }));
}

TEST_CASE("Several errors are reported together, in the order of the file") {
  const std::string text = edited("round", "strength_MPa = 40", "strength_MPa = 95\ncolour = 1");
  CHECK(refusal(text, {"load.axial_kN=-1"}) ==
        "column.toml:9:16: core.strength_MPa: 95 MPa is above the largest allowed, 90 MPa; the "
        "laws of EN 1992-1-2 end at 90 MPa; give the cylinder strength in MPa\n"
        "column.toml:10:1: core.colour: unknown key; remove it, or see `ringward explain`\n"
        "--set load.axial_kN: load.axial_kN: -1 kN must be above 0 kN; compression is positive, "
        "and columns without load or in tension are not covered");
}

TEST_CASE("A file that cannot be read is bad input with its path") {
  CHECK_THROWS_WITH(read_column_file("no-such-folder/column.toml"),
                    "no-such-folder/column.toml: cannot be read; check the path and its "
                    "permissions");
  CHECK_THROWS_WITH(read_column_file("/"), "/: is a folder; give the path of a column file");
}

TEST_CASE("Each limit of validity that shows in the input raises its notice, and only then") {
  struct Case {
    std::string code;
    std::vector<std::string> with;
    std::vector<std::string> without;
  };
  const std::string table = "fire.points_min_C=[[0, 20], [30, 800]]";
  const std::vector<Case> cases = {
      {"core-strength-step", {"core.strength_MPa=46"}, {"core.strength_MPa=44.9"}},
      {"spalling", {"core.strength_MPa=51"}, {"core.strength_MPa=50"}},
      {"contact-resistance", {"tube.contact_resistance_m2K_W=0.01"}, {}},
      {"end-gap-ring", {}, {"tube.end_gap_mm=0"}},
      {"slip-length", {}, {"tube.role=\"composite\""}},
      {"steel-grade", {"tube.yield_MPa=500"}, {"tube.yield_MPa=460"}},
      {"bar-grade", {"bars[0].yield_MPa=250"}, {}},
      {"buckling-length", {"member.buckling_factor=0.7"}, {"member.buckling_factor=1"}},
      {"table-convection", {"fire.curve=\"table\"", table}, {}},
      {"emissivity", {"fire.surface.emissivity=0.5"}, {}}};
  for (const Case& each : cases) {
    DYNAMIC_SECTION(each.code) {
      CHECK(has_notice(read_base("round", each.with), each.code));
      CHECK_FALSE(has_notice(read_base("round", each.without), each.code));
    }
  }
  CHECK(has_notice(read_base("square"), "vent-holes"));
}

TEST_CASE("A short tube is said to slip over its whole height") {
  // 0.364 D/mu = 0.364 * 390 / 0.1 = 1420 mm against half of 1980 mm.
  const ColumnInput input = read_base("round", {"tube.friction=0.1", "member.length_mm=2000"});
  const auto found = std::find_if(input.notices.begin(), input.notices.end(),
                                  [](const auto& n) { return n.code == "slip-length"; });
  REQUIRE(found != input.notices.end());
  CHECK(found->text.find("990 mm") != std::string::npos);
  CHECK(found->text.find("whole height") != std::string::npos);
}

}  // namespace ringward::cli::testing
