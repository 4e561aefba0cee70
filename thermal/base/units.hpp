#pragma once

// The only place where units are converted. Inside: SI, temperature in degrees Celsius.
namespace ringward::units {

inline constexpr double kKelvinOffset = 273.15;             ///< T[K] = T[C] + offset
inline constexpr double kStefanBoltzmann_W_m2K4 = 5.670374e-8;  ///< @source codata2018
inline constexpr double kPi = 3.14159265358979323846;

[[nodiscard]] constexpr double m_from_mm(double mm) { return mm * 1e-3; }
[[nodiscard]] constexpr double mm_from_m(double m) { return m * 1e3; }
[[nodiscard]] constexpr double Pa_from_MPa(double MPa) { return MPa * 1e6; }
[[nodiscard]] constexpr double MPa_from_Pa(double Pa) { return Pa * 1e-6; }
[[nodiscard]] constexpr double N_from_kN(double kN) { return kN * 1e3; }
[[nodiscard]] constexpr double kN_from_N(double N) { return N * 1e-3; }
[[nodiscard]] constexpr double Nm_from_kNm(double kNm) { return kNm * 1e3; }
[[nodiscard]] constexpr double kNm_from_Nm(double Nm) { return Nm * 1e-3; }
[[nodiscard]] constexpr double s_from_min(double min) { return min * 60.0; }
[[nodiscard]] constexpr double min_from_s(double s) { return s / 60.0; }
[[nodiscard]] constexpr double rad_from_deg(double deg) { return deg * kPi / 180.0; }
[[nodiscard]] constexpr double deg_from_rad(double rad) { return rad * 180.0 / kPi; }
[[nodiscard]] constexpr double fraction_from_percent(double percent) { return percent * 0.01; }

}  // namespace ringward::units
