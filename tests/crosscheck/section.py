"""N-M points of a section, from its own fibres at Gauss points and a table over strain and curvature.

Both the section and its temperatures are symmetric about both axes, so that bending about one axis
makes no moment about the other.
"""

import numpy as np
from scipy.interpolate import PchipInterpolator
from scipy.optimize import minimize_scalar

import laws

GAUSS = np.array([0.5 - 0.5 / np.sqrt(3.0), 0.5 + 0.5 / np.sqrt(3.0)])


def panels(points):
    """Two Gauss points and weights in each interval."""
    width = np.diff(points)
    at = points[:-1, None] + width[:, None] * GAUSS
    return at.ravel(), np.repeat(0.5 * width, 2)


def round_fibres(inner, depths):
    """Concrete of a circle: x, y, area. Half of the circle, counted twice."""
    r, dr = panels(np.concatenate([[0.0], inner - np.array(depths), [inner]]))
    sectors = 30
    angle = np.pi * (np.arange(sectors) + 0.5) / sectors
    x, y = np.outer(r, np.cos(angle)), np.outer(r, np.sin(angle))
    area = np.outer(2.0 * r * dr, np.full(sectors, np.pi / sectors))
    return x.ravel(), y.ravel(), area.ravel()


def square_fibres(inner, depths):
    """Concrete of a square: its half y > 0, counted twice."""
    x, dx = panels(np.concatenate([[0.0], inner - np.array(depths), [inner]]))
    both, weight = np.concatenate([-x, x]), np.concatenate([dx, dx])
    X, Y = np.meshgrid(both, x, indexing="ij")
    return X.ravel(), Y.ravel(), np.outer(weight, 2.0 * dx).ravel()


def wall_fibres(inner, half):
    """Tube of a square: flanges x = +-, over the whole depth, and webs between them."""
    t, dt = panels(np.linspace(inner, half, 2))
    long, dlong = panels(np.linspace(0.0, half, 9))
    short, dshort = panels(np.linspace(0.0, inner, 9))
    result = []
    for sign in (-1.0, 1.0):
        X, Y = np.meshgrid(sign * t, long, indexing="ij")
        result.append((X.ravel(), Y.ravel(), np.outer(dt, 2.0 * dlong).ravel()))
        X, Y = np.meshgrid(sign * short, t, indexing="ij")
        result.append((X.ravel(), Y.ravel(), np.outer(dshort, 2.0 * dt).ravel()))
    return tuple(np.concatenate(part) for part in zip(*result))


class Section:
    """Groups of fibres: x, area, law."""

    def __init__(self, groups, extent):
        self.groups = groups
        self.extent = extent
        self.strains = np.linspace(-0.032, 0.024, 300)
        self.curvatures = np.concatenate([[0.0], np.geomspace(1e-3, 0.1, 40)]) / extent

    def forces(self, strains, curvature):
        N, M = np.zeros(len(strains)), np.zeros(len(strains))
        for x, area, law in self.groups:
            stress = law.stress(strains[:, None] + curvature * x[None, :])
            N += stress @ area
            M += stress @ (area * x)
        return N, M

    def table(self):
        self.rising = []
        for curvature in self.curvatures:
            N, M = self.forces(self.strains, curvature)
            if curvature == 0.0:
                top = int(np.argmax(N))
                window = np.linspace(self.strains[top - 1], self.strains[top + 1], 41)
                self.largest_N = self.forces(window, 0.0)[0].max()
            # The branch on which the force grows with the strain, up to its first maximum.
            start = int(np.argmax(N > 0.0))
            falls = np.flatnonzero(np.diff(N[start:]) <= 0.0)
            end = start + (falls[0] if len(falls) else len(N) - 1 - start) + 1
            first = max(start - 1, 0)
            N, M = N[first:end], M[first:end]
            self.rising.append(PchipInterpolator(N, M) if len(N) > 3 and N[-1] > 0 else None)
            self.rising[-1] = (self.rising[-1], N[0], N[-1])
        return self

    def largest_moment(self, N):
        """Over all curvatures that can be reached at the force N."""
        moments = []
        for moment, low, high in self.rising:
            if moment is None or not low <= N <= high:
                break
            moments.append(float(moment(N)))
        best = int(np.argmax(moments))
        if best == 0 or best + 1 >= len(moments):
            return moments[best]
        # The top of the smooth curve through the neighbours, against log curvature.
        near = slice(max(best - 2, 1), best + 3)
        curve = PchipInterpolator(np.log(self.curvatures[near][:len(moments[near])]), moments[near])
        found = minimize_scalar(lambda k: -curve(k), bounds=(curve.x[0], curve.x[-1]),
                                method="bounded")
        return max(moments[best], -float(found.fun))


def section_of(column, field, time):
    """Fibres with the temperatures of the field at one of its times."""
    half = 0.5 * column["width"]
    inner = half - column["wall"]
    depths = np.concatenate([np.linspace(inner, 0.04, 8)[1:], np.linspace(0.04, 0.0, 9)[1:-1]])
    shape = round_fibres if column["shape"] == "circular" else square_fibres
    x, y, area = shape(inner, depths)
    strength = column["core"]["strength"]
    groups = [(x, area, laws.Concrete(field.at(time, x, y), strength))]
    if column["role"] == "composite":
        x, y, area = wall_fibres(inner, half)
        groups.append((x, area, laws.Steel(field.at(time, x, y), column["tube_yield"], "tube")))
    x, y = np.array(column["bars"]).T
    area = np.full(len(x), 0.25 * np.pi * column["bar_diameter"] ** 2)
    T = field.at(time, x, y)
    groups.append((x, area, laws.Steel(T, column["bar_yield"], "bar")))
    groups.append((x, -area, laws.Concrete(T, strength)))
    return Section(groups, half)
