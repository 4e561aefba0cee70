#!/usr/bin/env python3
"""Converged row of example 3 of the German national annex to EN 1991-1-2, annex CC: the centre
of a light filling in a square steel sheet, heated all round. Independent of the C++ code: nodes
at cell corners, temperature as the unknown, scipy's BDF, Richardson extrapolation in the mesh.
Run: python3 annex_cc_example_3.py   (needs numpy and scipy; about a minute)

Square 201 mm outside, sheet 0.5 mm (EN 1993-1-2:2005 3.4.1, 7850 kg/m3), filling 200 mm:
lambda 0.05 W/mK, 50 kg/m3, 1000 J/kgK. Gas 1000 C from the start, alpha_c 10 W/m2K, resultant
emissivity 0.8, start 0 C. Inputs from memory of the annex.
"""
import numpy as np
import scipy.sparse as sp
from scipy.integrate import solve_ivp

SIGMA = 5.670374e-8
TIMES_S = [1800.0, 3600.0, 5400.0, 7200.0, 9000.0, 10800.0]


def steel_capacity(T):
    T = np.clip(T, 20.0, 1200.0)
    low = 425 + 0.773 * T - 1.69e-3 * T**2 + 2.22e-6 * T**3
    return 7850.0 * np.select(
        [T < 600, T < 735, T < 900],
        [low, 666 + 13002 / np.where(T < 737, 738 - T, 1), 545 + 17820 / np.where(T > 732, T - 731, 1)],
        650.0)


def steel_conductivity(T):
    return np.where(T < 800, 54 - 0.0333 * np.clip(T, 20.0, None), 27.3)


def centre_row(cells):
    """Temperatures of the centre at TIMES_S; quarter model, `cells` over half the filling."""
    x = np.append(np.linspace(0.0, 0.1, cells + 1), 0.1005)
    n = len(x)
    number = np.arange(n * n).reshape(n, n)
    steel = np.zeros(n * n)
    filling = np.zeros(n * n)
    edges = {"steel": [], "filling": []}
    for j in range(n - 1):
        for i in range(n - 1):
            dx, dy = x[i + 1] - x[i], x[j + 1] - x[j]
            is_steel = i == n - 2 or j == n - 2
            corners = [number[j, i], number[j, i + 1], number[j + 1, i], number[j + 1, i + 1]]
            (steel if is_steel else filling)[corners] += 0.25 * dx * dy
            kind = edges["steel" if is_steel else "filling"]
            kind.append((corners[0], corners[1], 0.5 * dy / dx))
            kind.append((corners[2], corners[3], 0.5 * dy / dx))
            kind.append((corners[0], corners[2], 0.5 * dx / dy))
            kind.append((corners[1], corners[3], 0.5 * dx / dy))
    outline = np.zeros(n * n)
    for k in range(n - 1):
        for a, b in ((number[k, -1], number[k + 1, -1]), (number[-1, k], number[-1, k + 1])):
            outline[[a, b]] += 0.5 * (x[k + 1] - x[k])
    arrays = {k: tuple(np.array(c) for c in zip(*v)) for k, v in edges.items()}
    pattern = sp.identity(n * n, format="lil")
    for a, b, _ in arrays.values():
        pattern[a, b] = 1
        pattern[b, a] = 1

    def rate(_, T):
        heat = outline * (10.0 * (1000.0 - T) + 0.8 * SIGMA * (1273.15**4 - (T + 273.15) ** 4))
        for kind, (a, b, shape) in arrays.items():
            k = 0.05 if kind == "filling" else steel_conductivity(0.5 * (T[a] + T[b]))
            flow = k * shape * (T[a] - T[b])
            np.add.at(heat, a, -flow)
            np.add.at(heat, b, flow)
        return heat / (steel * steel_capacity(T) + filling * 5.0e4)

    run = solve_ivp(rate, (0.0, TIMES_S[-1]), np.zeros(n * n), method="BDF", t_eval=TIMES_S,
                    rtol=1e-7, atol=1e-5, jac_sparsity=pattern.tocsc(), first_step=1e-3)
    return run.y[0]


if __name__ == "__main__":
    coarse, middle, fine = centre_row(10), centre_row(20), centre_row(40)
    print("t [min]     ", [t / 60 for t in TIMES_S])
    print("40 cells    ", np.round(fine, 3))
    print("order       ", np.round(np.log2(np.abs((coarse - middle) / (middle - fine))), 2))
    print("extrapolated", np.round(fine + (fine - middle) / 3.0, 3))
