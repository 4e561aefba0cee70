"""Heat flow by linear finite elements with lumped enthalpy, integrated by scipy's BDF.

The program uses cells with balances between their middles; here the unknowns are the heat contents
of nodes, some of which lie on the interfaces, and the conductivity is that of an element's mean
temperature. Per quarter of a square and per radian of a circle.
"""

import numpy as np
from scipy.integrate import solve_ivp
from scipy.sparse import csr_matrix, diags

import laws

START_C = 20.0


class HeatProblem:
    """d(V h(T))/dt = - G' (A k) G T + surface + contact."""

    def __init__(self, size, mixtures, mixture_of):
        self.size = size
        self.mixtures = mixtures  # of laws.Enthalpy, per m3
        self.members = [np.flatnonzero(mixture_of == k) for k in range(len(mixtures))]
        self.volume = np.zeros(size)
        self.gradients = []  # (G, weight, mean, conductivity)
        self.surface = np.zeros(size)  # heated length
        self.contact = None

    def add_elements(self, gradient, weight, mean, conductivity):
        self.gradients.append((gradient, weight, mean, conductivity))

    def temperatures(self, h):
        T, slope = np.empty(self.size), np.empty(self.size)
        for mixture, members in zip(self.mixtures, self.members):
            T[members], slope[members] = mixture.temperature(h[members])
        return T, slope

    def rate(self, t_s, h):
        T, _ = self.temperatures(h)
        flow = np.zeros(self.size)
        for G, weight, mean, conductivity in self.gradients:
            flow -= G.T @ (weight * conductivity(mean @ T) * (G @ T))
        if self.contact is not None:
            flow -= self.contact @ T
        gas = laws.standard_fire(t_s)
        radiation = 0.7 * laws.SIGMA * ((gas + 273.15) ** 4 - (T + 273.15) ** 4)
        flow += self.surface * (25.0 * (gas - T) + radiation)
        return flow / self.volume

    def jacobian(self, _t_s, h):
        T, slope = self.temperatures(h)
        J = diags(-self.surface * (25.0 + 4 * 0.7 * laws.SIGMA * (T + 273.15) ** 3))
        for G, weight, mean, conductivity in self.gradients:
            at = mean @ T
            by_T = (conductivity(at + 0.5) - conductivity(at - 0.5)) * weight
            J = J - G.T @ (diags(weight * conductivity(at)) @ G + diags(by_T * (G @ T)) @ mean)
        if self.contact is not None:
            J = J - self.contact
        return (diags(1.0 / self.volume) @ J @ diags(slope)).tocsc()

    def solve(self, times_s):
        """Nodal temperatures, one row a time."""
        h0 = np.empty(self.size)
        for mixture, members in zip(self.mixtures, self.members):
            h0[members] = mixture.of(START_C)
        solution = solve_ivp(self.rate, (0.0, times_s[-1]), h0, method="BDF", jac=self.jacobian,
                             t_eval=times_s, rtol=3e-5, atol=2e4, first_step=0.1, max_step=60.0)
        if not solution.success:
            raise RuntimeError(solution.message)
        return [self.temperatures(h)[0] for h in solution.y.T]


def lines(ends, pieces):
    """Points from 0 outward through all the ends, each stretch in equal pieces."""
    points = [np.zeros(1)]
    start = 0.0
    for end, count in zip(ends, pieces):
        points.append(np.linspace(start, end, count + 1)[1:])
        start = end
    return np.concatenate(points)


def concrete_laws(core, scale):
    def capacity(T):
        return laws.concrete_capacity(T, core["density"], core["moisture"])

    def conductivity(T):
        return scale * laws.concrete_conductivity(T, core["conductivity"])

    return capacity, conductivity


class RoundField:
    """Circular section with perfect contact: nodes along one radius, one of them on the interface."""

    def __init__(self, column, refinement, times_s, conductivity_scale=1.0):
        wall, outer = column["wall"], 0.5 * column["width"]
        inner = outer - wall
        stretches = [inner - depth for depth in column["depths"]] + [inner]
        pieces = [refinement * count for count in column["pieces"]]
        self.r = np.concatenate([lines(stretches, pieces),
                                 np.linspace(inner, outer, 2 * refinement + 1)[1:]])
        n = len(self.r)
        interface = n - 1 - 2 * refinement
        capacity, conductivity = concrete_laws(column["core"], conductivity_scale)
        edge = np.concatenate([[0.0], 0.5 * (self.r[1:] + self.r[:-1]), [outer]])
        volume = 0.5 * (edge[1:] ** 2 - edge[:-1] ** 2)
        inside = 0.5 * (inner**2 - edge[interface] ** 2) / volume[interface]
        mixtures = [laws.Enthalpy([(1.0, capacity)]), laws.Enthalpy([(1.0, laws.steel_capacity)]),
                    laws.Enthalpy([(inside, capacity), (1.0 - inside, laws.steel_capacity)])]
        kind = np.zeros(n, int)
        kind[interface + 1:] = 1
        kind[interface] = 2
        problem = HeatProblem(n, mixtures, kind)
        problem.volume = volume
        for first, last, law in [(0, interface, conductivity),
                                 (interface, n - 1, laws.steel_conductivity)]:
            at = np.arange(first, last)
            length = self.r[at + 1] - self.r[at]
            row = np.arange(len(at))
            rows, columns = np.concatenate([row, row]), np.concatenate([at, at + 1])
            G = csr_matrix((np.concatenate([-1 / length, 1 / length]), (rows, columns)), (len(at), n))
            mean = csr_matrix((np.full(2 * len(at), 0.5), (rows, columns)), (len(at), n))
            problem.add_elements(G, 0.5 * (self.r[at] + self.r[at + 1]) * length, mean, law)
        problem.surface[-1] = outer
        self.states = problem.solve(times_s)

    def at(self, time, x, y):
        return np.interp(np.hypot(x, y), self.r, self.states[time])


def triangles(xs, ys, number):
    """Both triangles of each rectangle of a lattice; `number` gives the node or -1 (no material)."""
    result = []
    for i in range(len(xs) - 1):
        for j in range(len(ys) - 1):
            a, b, c, d = number[i, j], number[i + 1, j], number[i + 1, j + 1], number[i, j + 1]
            if min(a, b, c, d) >= 0:
                result += [(a, b, c), (a, c, d)] if (i + j) % 2 else [(a, b, d), (b, c, d)]
    return np.array(result)


class SquareField:
    """A quarter of a square section with a contact resistance: core and tube are two meshes."""

    def __init__(self, column, refinement, times_s, conductivity_scale=1.0):
        wall, half = column["wall"], 0.5 * column["width"]
        self.inner = inner = half - wall
        stretches = [inner - depth for depth in column["depths"]] + [inner]
        self.core_lines = lines(stretches, [refinement * count for count in column["pieces"]])
        m = len(self.core_lines)
        steel = np.linspace(inner, half, 2 * refinement + 1)
        self.all_lines = all_lines = np.concatenate([self.core_lines, steel[1:]])
        n = len(all_lines)
        self.core_number = np.arange(m * m).reshape(m, m)
        self.tube_number = np.full((n, n), -1)
        is_tube = np.maximum.outer(np.arange(n), np.arange(n)) >= m - 1
        self.tube_number[is_tube] = m * m + np.arange(is_tube.sum())
        size = m * m + is_tube.sum()
        x, y = np.empty(size), np.empty(size)
        for number, points in [(self.core_number, self.core_lines), (self.tube_number, all_lines)]:
            i, j = np.nonzero(number >= 0)
            x[number[i, j]], y[number[i, j]] = points[i], points[j]
        capacity, conductivity = concrete_laws(column["core"], conductivity_scale)
        kind = (np.arange(size) >= m * m).astype(int)
        problem = HeatProblem(size, [laws.Enthalpy([(1.0, capacity)]),
                                     laws.Enthalpy([(1.0, laws.steel_capacity)])], kind)
        for number, points, law in [(self.core_number, self.core_lines, conductivity),
                                    (self.tube_number, all_lines, laws.steel_conductivity)]:
            self._add(problem, triangles(points, points, number), x, y, law)
        self._heat(problem, n)
        self._touch(problem, m, column["contact_resistance"])
        self.states = problem.solve(times_s)

    @staticmethod
    def _add(problem, corner, x, y, law):
        count = len(corner)
        X, Y = x[corner], y[corner]
        b = np.stack([Y[:, 1] - Y[:, 2], Y[:, 2] - Y[:, 0], Y[:, 0] - Y[:, 1]], axis=1)
        c = np.stack([X[:, 2] - X[:, 1], X[:, 0] - X[:, 2], X[:, 1] - X[:, 0]], axis=1)
        twice = np.abs(b[:, 0] * c[:, 1] - b[:, 1] * c[:, 0])
        rows = np.repeat(np.arange(count), 3)
        shape = (count, problem.size)
        flat = corner.ravel()
        along_x = csr_matrix(((b / twice[:, None]).ravel(), (rows, flat)), shape)
        along_y = csr_matrix(((c / twice[:, None]).ravel(), (rows, flat)), shape)
        mean = csr_matrix((np.full(3 * count, 1 / 3), (rows, flat)), shape)
        problem.add_elements(along_x, 0.5 * twice, mean, law)
        problem.add_elements(along_y, 0.5 * twice, mean, law)
        np.add.at(problem.volume, flat, np.repeat(twice / 6.0, 3))

    def _heat(self, problem, n):
        piece = np.diff(self.all_lines)
        for side in (self.tube_number[n - 1, :], self.tube_number[:, n - 1]):
            np.add.at(problem.surface, side[:-1], 0.5 * piece)
            np.add.at(problem.surface, side[1:], 0.5 * piece)

    def _touch(self, problem, m, resistance):
        length = np.zeros(m)
        length[:-1] += 0.5 * np.diff(self.core_lines)
        length[1:] += 0.5 * np.diff(self.core_lines)
        a = np.concatenate([self.core_number[m - 1, :], self.core_number[:, m - 1]])
        b = np.concatenate([self.tube_number[m - 1, :m], self.tube_number[:m, m - 1]])
        g = np.concatenate([length, length]) / resistance
        problem.contact = csr_matrix((np.concatenate([g, g, -g, -g]), (
            np.concatenate([a, b, a, b]), np.concatenate([a, b, b, a]))),
            (problem.size, problem.size))

    @staticmethod
    def _bilinear(points, values, x, y):
        i = np.clip(np.searchsorted(points, x, side="right") - 1, 0, len(points) - 2)
        j = np.clip(np.searchsorted(points, y, side="right") - 1, 0, len(points) - 2)
        p = (x - points[i]) / (points[i + 1] - points[i])
        q = (y - points[j]) / (points[j + 1] - points[j])
        return ((1 - p) * (1 - q) * values[i, j] + p * (1 - q) * values[i + 1, j]
                + p * q * values[i + 1, j + 1] + (1 - p) * q * values[i, j + 1])

    def at(self, time, x, y):
        """On the interface, the core's side."""
        x, y = np.abs(np.asarray(x, float)), np.abs(np.asarray(y, float))
        T = self.states[time]
        core = self._bilinear(self.core_lines, T[self.core_number], np.minimum(x, self.inner),
                              np.minimum(y, self.inner))
        tube = self._bilinear(self.all_lines, np.where(self.tube_number >= 0,
                                                       T[self.tube_number], np.nan), x, y)
        return np.where(np.maximum(x, y) <= self.inner + 1e-12, core, tube)
