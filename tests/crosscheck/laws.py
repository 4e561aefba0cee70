"""Laws of concrete and steel, typed from docs/theory.md; nothing is shared with the C++ code.

T in C, SI units otherwise; compression and shortening positive, thermal strain positive when it
lengthens.
"""

import numpy as np

SIGMA = 5.670374419e-8


def standard_fire(t_s):
    return 20.0 + 345.0 * np.log10(8.0 * t_s / 60.0 + 1.0)


# Heat ---------------------------------------------------------------------------------------------


def concrete_conductivity(T, limit):
    x = T / 100.0
    if limit == "upper":
        return 2.0 - 0.2451 * x + 0.0107 * x * x
    return 1.36 - 0.136 * x + 0.0057 * x * x


def concrete_capacity(T, density, moisture_percent):
    """rho c. The peak by moisture is constant from 100 to 115 C, then falls to 1000 at 200 C."""
    dry = np.where(T <= 100, 900.0, np.where(T <= 200, 900.0 + (T - 100), 1000 + (T - 200) / 2))
    dry = np.where(T > 400, 1100.0, dry)
    peak = np.interp(moisture_percent, [0.0, 1.5, 3.0, 10.0], [900.0, 1470.0, 2020.0, 5600.0])
    falling = peak + (1000.0 - peak) * (T - 115.0) / 85.0
    c = np.where((T >= 100) & (T < 115), peak, np.where((T >= 115) & (T < 200), falling, dry))
    share = np.where(T <= 115, 1.0, 1.0 - 0.02 * (T - 115) / 85)
    share = np.where(T > 200, 0.98 - 0.03 * (T - 200) / 200, share)
    share = np.where(T > 400, 0.95 - 0.07 * (T - 400) / 800, share)
    return density * share * c


def steel_conductivity(T):
    return np.where(T < 800, 54.0 - 0.0333 * T, 27.3)


def steel_capacity(T):
    first = 425 + 0.773 * T - 1.69e-3 * T**2 + 2.22e-6 * T**3
    with np.errstate(divide="ignore"):
        second = 666 + 13002.0 / (738.0 - T)
        third = 545 + 17820.0 / (T - 731.0)
    c = np.where(T < 600, first, np.where(T < 735, second, np.where(T < 900, third, 650.0)))
    return 7850.0 * c


class Enthalpy:
    """A mixture's heat content against temperature, by the midpoint rule between 0 and 1300 C.

    All kinks of the laws lie on the points, so that no interval holds a jump.
    """

    STEP = 0.05

    def __init__(self, parts):
        """parts: pairs of volume share and capacity function"""
        self.T = np.arange(0.0, 1300.0 + self.STEP / 2, self.STEP)
        middle = 0.5 * (self.T[1:] + self.T[:-1])
        self.capacity = sum(share * capacity(middle) for share, capacity in parts)
        self.h = np.concatenate([[0.0], np.cumsum(self.capacity) * self.STEP])

    def of(self, T):
        return np.interp(T, self.T, self.h)

    def temperature(self, h):
        """Temperature and its derivative by h."""
        k = np.clip(np.searchsorted(self.h, h, side="right") - 1, 0, len(self.capacity) - 1)
        return self.T[k] + (h - self.h[k]) / self.capacity[k], 1.0 / self.capacity[k]


# Strength, siliceous concrete up to 50 MPa --------------------------------------------------------

HUNDREDS = [20.0] + [100.0 * k for k in range(1, 13)]
CONCRETE_STRENGTH = [1, 1, 0.95, 0.85, 0.75, 0.60, 0.45, 0.30, 0.15, 0.08, 0.04, 0.01, 0]
CONCRETE_PEAK = [25, 40, 55, 70, 100, 150, 250, 250, 250, 250, 250, 250, 250]  # 1e-4
BAR_YIELD = [1, 1, 1, 1, 1, 0.78, 0.47, 0.23, 0.11, 0.06, 0.04, 0.02, 0]
BAR_PROPORTIONAL = [1, 1, 0.81, 0.61, 0.42, 0.36, 0.18, 0.07, 0.05, 0.04, 0.02, 0.01, 0]
BAR_MODULUS = [1, 1, 0.9, 0.8, 0.7, 0.6, 0.31, 0.13, 0.09, 0.07, 0.04, 0.02, 0]
TUBE_YIELD = BAR_YIELD
TUBE_PROPORTIONAL = [1, 1, 0.807, 0.613, 0.42, 0.36, 0.18, 0.075, 0.05, 0.0375, 0.025, 0.0125, 0]
TUBE_MODULUS = [1, 1, 0.9, 0.8, 0.7, 0.6, 0.31, 0.13, 0.09, 0.0675, 0.045, 0.0225, 0]


def concrete_thermal_strain(T):
    return np.where(T <= 700, -1.8e-4 + 9e-6 * T + 2.3e-11 * T**3, 14e-3)


def steel_thermal_strain(T):
    low = -2.416e-4 + 1.2e-5 * T + 0.4e-8 * T**2
    return np.where(T <= 750, low, np.where(T <= 860, 11e-3, -6.2e-3 + 2e-5 * T))


class Concrete:
    def __init__(self, T, strength):
        self.f = strength * np.interp(T, HUNDREDS, CONCRETE_STRENGTH)
        self.e1 = 1e-4 * np.interp(T, HUNDREDS, CONCRETE_PEAK)
        self.eu = np.interp(T, [20.0, 100.0, 1100.0], [0.02, 0.0225, 0.0475])
        self.free = concrete_thermal_strain(T)

    def stress(self, total):
        e = np.maximum(total + self.free, 0.0)
        x = e / self.e1
        rising = self.f * 3.0 * x / (2.0 + x**3)
        falling = np.maximum(self.f * (self.eu - e) / (self.eu - self.e1), 0.0)
        return np.where(e <= self.e1, rising, falling)


class Steel:
    """Straight, ellipse, level, straight down; e_y = 0.02, e_t = 0.15, e_u = 0.20."""

    def __init__(self, T, yield_stress, kind):
        y, p, m, E20 = {
            "bar": (BAR_YIELD, BAR_PROPORTIONAL, BAR_MODULUS, 200e9),
            "tube": (TUBE_YIELD, TUBE_PROPORTIONAL, TUBE_MODULUS, 210e9),
        }[kind]
        self.fy = yield_stress * np.interp(T, HUNDREDS, y)
        self.fp = yield_stress * np.interp(T, HUNDREDS, p)
        self.E = E20 * np.interp(T, HUNDREDS, m)
        self.free = steel_thermal_strain(T)

    def stress(self, total):
        strain = total + self.free
        e = np.abs(strain)
        fy, fp, E, ey = self.fy, self.fp, self.E, 0.02
        ep = fp / E
        c = (fy - fp) ** 2 / ((ey - ep) * E - 2.0 * (fy - fp))
        a = np.sqrt((ey - ep) * (ey - ep + c / E))
        b = np.sqrt(c * (ey - ep) * E + c * c)
        arc = fp - c + b / a * np.sqrt(np.maximum(a * a - (ey - np.minimum(e, ey)) ** 2, 0.0))
        late = np.where(e <= 0.15, fy, np.maximum(fy * (0.20 - e) / 0.05, 0.0))
        size = np.where(e <= ep, E * e, np.where(e <= ey, arc, late))
        return np.sign(strain) * size
