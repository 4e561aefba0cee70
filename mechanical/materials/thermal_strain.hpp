#pragma once

namespace ringward::mechanical {

/// eps_c = -1.8e-4 + 9e-6 T + 2.3e-11 T^3 to 700 C, 14e-3 above (siliceous aggregate).
/// @param T_C temperature [C], 20..1200
/// @return elongation from 20 C [-]
/// @source en1992-1-2-2004 3.3.1
[[nodiscard]] double siliceous_thermal_strain(double T_C);

/// eps_c = -1.2e-4 + 6e-6 T + 1.4e-11 T^3 to 805 C, 12e-3 above (calcareous aggregate).
/// @param T_C temperature [C], 20..1200
/// @return elongation from 20 C [-]
/// @source en1992-1-2-2004 3.3.1
[[nodiscard]] double calcareous_thermal_strain(double T_C);

/// eps_s = 1.2e-5 T + 0.4e-8 T^2 - 2.416e-4 below 750 C, 11e-3 to 860 C, 2e-5 T - 6.2e-3 above.
/// @param T_C temperature [C], 20..1200
/// @return elongation from 20 C [-]
/// @source en1993-1-2-2005 3.4.1.1, en1992-1-2-2004 3.4
[[nodiscard]] double steel_thermal_strain(double T_C);

}  // namespace ringward::mechanical
