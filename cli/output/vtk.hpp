#pragma once

#include <string>
#include <vector>

#include "cli/output/field_states.hpp"
#include "cli/output/output_files.hpp"
#include "thermal/grid/orthogonal_grid.hpp"

namespace ringward::cli {

/// The whole section's temperatures as VTK XML files: one file a time (.vtr for a Cartesian grid,
/// .vts for a polar one) and temperature.pvd, which lists them with their times in minutes.
/// Coordinates are in mm; cell data are temperature_C and layer (0 core, 1 tube, 2 protection).
/// @param folder where they go
[[nodiscard]] std::vector<OutputFile> vtk_files(const thermal::OrthogonalGrid& grid,
                                                const std::vector<FieldState>& states,
                                                const std::string& folder);

}  // namespace ringward::cli
