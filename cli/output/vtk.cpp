#include "cli/output/vtk.hpp"

#include <fmt/format.h>

#include <filesystem>

#include "cli/output/numbers.hpp"
#include "cli/output/whole_section.hpp"
#include "thermal/base/units.hpp"

namespace ringward::cli {
namespace {

using thermal::GridKind;
using thermal::Layer;
using thermal::OrthogonalGrid;

constexpr int kDigitsCoordinate = 6;  // of a mm

int layer_number(Layer layer) {
  switch (layer) {
    case Layer::core:
      return 0;
    case Layer::tube:
      return 1;
    case Layer::protection:
      return 2;
  }
  return -1;
}

std::string data_array(const std::string& type, const std::string& name, int components,
                       const std::string& values) {
  return fmt::format(
      "<DataArray type=\"{}\" Name=\"{}\" NumberOfComponents=\"{}\" format=\"ascii\">\n{}\n"
      "</DataArray>\n",
      type, name, components, values);
}

std::string joined(const std::vector<std::string>& words) {
  std::string line;
  for (const std::string& word : words) line += (line.empty() ? "" : " ") + word;
  return line;
}

std::string cell_data(const OrthogonalGrid& grid, const WholeSection& whole,
                      const FieldState& state) {
  std::vector<std::string> temperatures;
  std::vector<std::string> layers;
  for (const std::size_t cell : whole.source_cell) {
    temperatures.push_back(fixed(state.cells_C[cell], kDigitsFieldTemperature));
    layers.push_back(std::to_string(layer_number(grid.cells[cell].layer)));
  }
  return "<CellData Scalars=\"temperature_C\">\n" +
         data_array("Float64", "temperature_C", 1, joined(temperatures)) +
         data_array("Int32", "layer", 1, joined(layers)) + "</CellData>\n";
}

std::string lines_in_mm(const std::vector<double>& lines_m) {
  std::vector<std::string> words;
  for (const double line : lines_m) {
    words.push_back(shortest(rounded(units::mm_from_m(line), kDigitsCoordinate)));
  }
  return joined(words);
}

std::string coordinates(const WholeSection& whole) {
  return "<Coordinates>\n" + data_array("Float64", "x_mm", 1, lines_in_mm(whole.lines_1)) +
         data_array("Float64", "y_mm", 1, lines_in_mm(whole.lines_2)) +
         data_array("Float64", "z_mm", 1, "0") + "</Coordinates>\n";
}

std::string corners(const WholeSection& whole) {
  std::vector<std::string> words;
  for (std::size_t j = 0; j <= whole.count_2(); ++j) {
    for (std::size_t i = 0; i <= whole.count_1(); ++i) {
      const thermal::Point corner = whole.corner(i, j);
      words.push_back(shortest(rounded(units::mm_from_m(corner.x_m), kDigitsCoordinate)));
      words.push_back(shortest(rounded(units::mm_from_m(corner.y_m), kDigitsCoordinate)));
      words.emplace_back("0");
    }
  }
  return "<Points>\n" + data_array("Float64", "corner_mm", 3, joined(words)) + "</Points>\n";
}

std::string grid_file(const OrthogonalGrid& grid, const WholeSection& whole,
                      const FieldState& state) {
  const bool polar = whole.kind == GridKind::polar;
  const std::string type = polar ? "StructuredGrid" : "RectilinearGrid";
  const std::string extent = fmt::format("0 {} 0 {} 0 0", whole.count_1(), whole.count_2());
  const std::string time_min =
      shortest(rounded(units::min_from_s(state.time_s), kDigitsCoordinate));
  return fmt::format(
             "<?xml version=\"1.0\"?>\n"
             "<VTKFile type=\"{0}\" version=\"0.1\" byte_order=\"LittleEndian\">\n"
             "<{0} WholeExtent=\"{1}\">\n<FieldData>\n"
             "<DataArray type=\"Float64\" Name=\"time_min\" NumberOfTuples=\"1\" "
             "format=\"ascii\">{2}</DataArray>\n"
             "</FieldData>\n<Piece Extent=\"{1}\">\n",
             type, extent, time_min) +
         cell_data(grid, whole, state) + (polar ? corners(whole) : coordinates(whole)) +
         fmt::format("</Piece>\n</{}>\n</VTKFile>\n", type);
}

std::string collection(const std::vector<std::string>& entries) {
  std::string text =
      "<?xml version=\"1.0\"?>\n"
      "<VTKFile type=\"Collection\" version=\"0.1\" byte_order=\"LittleEndian\">\n<Collection>\n";
  for (const std::string& entry : entries) text += entry;
  return text + "</Collection>\n</VTKFile>\n";
}

}  // namespace

std::vector<OutputFile> vtk_files(const OrthogonalGrid& grid, const std::vector<FieldState>& states,
                                  const std::string& folder) {
  const WholeSection whole = unfold(grid);
  const char* extension = whole.kind == GridKind::polar ? "vts" : "vtr";
  const std::filesystem::path place(folder);
  std::vector<OutputFile> files;
  std::vector<std::string> entries;
  for (const FieldState& state : states) {
    const std::string time_min =
        shortest(rounded(units::min_from_s(state.time_s), kDigitsCoordinate));
    const std::string name = fmt::format("temperature_{}min.{}", time_min, extension);
    files.push_back({.path = (place / name).string(), .content = grid_file(grid, whole, state)});
    entries.push_back(fmt::format("<DataSet timestep=\"{}\" group=\"\" part=\"0\" file=\"{}\"/>\n",
                                  time_min, name));
  }
  files.push_back({.path = (place / "temperature.pvd").string(), .content = collection(entries)});
  return files;
}

}  // namespace ringward::cli
