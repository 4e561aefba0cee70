#pragma once

#include "cli/dossier/dossier_data.hpp"
#include "cli/pictures/picture.hpp"

namespace ringward::cli {

// The curves of a dossier.

/// Gas, tube, core face, hottest bar and core centre against time.
[[nodiscard]] Picture temperature_chart(const DossierData& data);

/// Capacity against time with the load, the failure, the required time and the range of the
/// confinement models.
[[nodiscard]] Picture capacity_chart(const DossierData& data);

/// N-M diagrams along one axis at all their times, with the load.
[[nodiscard]] Picture interaction_chart(const DossierData& data, mechanical::Axis axis);

/// Hoop stress of the tube against time, at the capacity and under the load; and its pressure.
[[nodiscard]] Picture hoop_chart(const DossierData& data);
[[nodiscard]] Picture pressure_chart(const DossierData& data);

/// First-order moment at mid-height along an axis under the load: the given eccentricity or moment
/// and the imperfection, both away from the centre.
[[nodiscard]] double load_moment_Nm(const DossierData& data, mechanical::Axis axis);

}  // namespace ringward::cli
