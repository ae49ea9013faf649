"""Makes shared-baths.csv: lots of several grades carried through baths that they share, to 30 digits.

No modes and no rates are found here. Every stage is solved in the Laplace variable s, where a grade's profile is a sum
of waves U(p x), U = cosh z, I0(z) or sinh z / z, and inverted on Talbot's contour (Abate and Valko, Int. J. Numer.
Meth. Engng 60 (2004) 979, from memory). Each node of the contour leaves one wave in the profile, so a profile is carried
exactly from stage to stage. Every case is computed with two numbers of nodes, which must agree to 1e-32.

theta = content of the piece / K; d = D / L^2; Bi = k L / (K D), infinite without film; S = K times volume.
"""

import os

from mpmath import besseli, cosh, cot, exp, inf, mp, mpc, mpf, nstr, pi, sinh, sqrt

mp.dps = 130

WAVE = {
    "SLAB": (1, cosh, sinh),
    "CYLINDER": (2, lambda z: besseli(0, z), lambda z: besseli(1, z)),
    "SPHERE": (3, lambda z: sinh(z) / z, lambda z: (cosh(z) - sinh(z) / z) / z),
}


def contour(nodes, t):
    """Nodes s and weights, both halves of the fixed Talbot contour: f(t) = sum of weight times F(s)."""
    r = mpf(2) * nodes / (5 * t)
    pairs = [(mpc(r), mpc(r / (2 * nodes) * exp(r * t)))]
    for k in range(1, nodes):
        a = k * pi / nodes
        c = cot(a)
        s = r * a * mpc(c, 1)
        w = r / (2 * nodes) * exp(t * s) * mpc(1, a + (a * c - 1) * c)
        pairs += [(s, w), (s.conjugate(), w.conjugate())]
    return pairs


class Grade:
    def __init__(self, axis, length, volume):
        self.m, self.wave, self.slope = WAVE[axis]
        self.length, self.volume = mpf(length), mpf(volume)


class Stage:
    """volume None: sealed. flow 0: closed. film None: no resistance. b: content poured, feed: content running in."""

    def __init__(self, t, D, K, film=None, volume=None, b=0, flow=0, feed=0, clinging=0):
        self.t, self.D, self.K = mpf(t), mpf(D), mpf(K)
        self.film = None if film is None else mpf(film)
        self.volume = None if volume is None else mpf(volume)
        self.b, self.flow, self.feed, self.clinging = mpf(b), mpf(flow), mpf(feed), mpf(clinging)


class Profile:
    """theta = constant + sum of a U(p x); waves holds (a, p, U(p), U'(p) p)."""

    def __init__(self, constant, waves=()):
        self.constant, self.waves = constant, list(waves)

    def times(self, factor):
        return Profile(self.constant * factor, [(a * factor, p, u, v) for a, p, u, v in self.waves])

    def mean(self, grade):
        return (self.constant + sum(grade.m * a * v / p**2 for a, p, u, v in self.waves)).real

    def core(self):
        return (self.constant + sum(a for a, p, u, v in self.waves)).real

    def surface(self):
        return (self.constant + sum(a * u for a, p, u, v in self.waves)).real


def step(lot, profiles, stage, bath, b0, volume, nodes):
    """One stage; answers the profiles and the content of the bath at its end."""
    carried = [[mpc(0)] * len(p.waves) for p in profiles]
    born = [[] for _ in lot]
    end = mpc(0)
    for s, w in contour(nodes, stage.t):
        sides = []
        for j, grade in enumerate(lot):
            d = stage.D / grade.length**2
            kappa = sqrt(s / d)
            u, v = grade.wave(kappa), kappa * grade.slope(kappa)
            over = [a / (s - d * p**2) for a, p, _, _ in profiles[j].waves]
            value = profiles[j].constant / s + sum(x * q[2] for x, q in zip(over, profiles[j].waves))
            slope = sum((x * q[3] for x, q in zip(over, profiles[j].waves)), mpc(0))
            if stage.volume is None:
                own, by_bath = -slope / v, mpc(0)
            elif stage.film is None:
                own, by_bath = -value / u, 1 / u
            else:
                biot = stage.film * grade.length / (stage.K * stage.D)
                own, by_bath = -(biot * value + slope) / (v + biot * u), biot / (v + biot * u)
            capacity = stage.K * grade.volume * d * grade.m
            sides.append((d, kappa, u, v, over, own, by_bath, capacity * (slope + own * v), capacity * by_bath * v))
        b = mpc(0)
        if stage.volume is not None:
            given = volume * b0 + stage.flow * stage.feed / s - sum(x[7] for x in sides)
            b = given / (volume * s + stage.flow + sum(x[8] for x in sides))
            end += w * b
        for j, (d, kappa, u, v, over, own, by_bath, _, _) in enumerate(sides):
            for i, x in enumerate(over):
                carried[j][i] += w * x
            born[j].append((w * (own + by_bath * b), kappa, u, v))
    after = []
    for j, p in enumerate(profiles):
        waves = [(c, q[1], q[2], q[3]) for c, q in zip(carried[j], p.waves)]
        after.append(Profile(p.constant, waves + born[j]))
    return after, (bath if stage.volume is None else end.real)


def follow(lot, start, stages, nodes):
    """Readings after each stage: (stage, quantity, grade, value), contents of pieces and of the liquor."""
    profiles = [Profile(mpf(start) / stages[0].K) for _ in lot]
    bath, clinging, before, out = mpf(0), mpf(0), stages[0].K, []
    for k, stage in enumerate(stages):
        profiles = [p.times(before / stage.K) for p in profiles]
        volume, b0 = mpf(0), mpf(0)
        if stage.volume is not None:
            # What clings joins the next liquor; a flowing vessel overflows to its volume.
            b0 = (stage.volume * stage.b + clinging * bath) / (stage.volume + clinging)
            volume = stage.volume + (clinging if stage.flow == 0 else 0)
            clinging = stage.clinging
        # Another number of nodes for each stage, so that no wave of one falls on a node of the next.
        profiles, bath = step(lot, profiles, stage, bath, b0, volume, nodes + 7 * k)
        before = stage.K
        for j, grade in enumerate(lot):
            out.append((k, "MEAN", j, stage.K * profiles[j].mean(grade)))
            out.append((k, "CORE", j, stage.K * profiles[j].core()))
            out.append((k, "SURFACE", j, stage.K * profiles[j].surface()))
        out.append((k, "LIQUOR", 0, bath))
    return out


LOT = [Grade("SLAB", "1", "1"), Grade("SPHERE", "0.6", "0.5")]
THREE = [Grade("SLAB", "1", "1"), Grade("CYLINDER", "0.8", "0.7"), Grade("SPHERE", "1.3", "0.4")]
CASES = {
    # Two grades, one closed bath, a film: one stage of three lengths.
    "FILM_BATH_SHORT": (LOT, 1, [Stage("0.03", 1, "1.7", film="3.4", volume="2.5", b="0.05")]),
    "FILM_BATH_MIDDLE": (LOT, 1, [Stage("0.2", 1, "1.7", film="3.4", volume="2.5", b="0.05")]),
    "FILM_BATH_LONG": (LOT, 1, [Stage("1.5", 1, "1.7", film="3.4", volume="2.5", b="0.05")]),
    # Three grades: closed soak through a film; rinse in a fed vessel, warmer, with other partition, into which the
    # soak's liquor is dragged; rest; closed bath without film, into which the rinse's is dragged across the rest.
    "CHAIN": (
        THREE,
        1,
        [
            Stage("0.15", 1, "1.5", film="4", volume="2", b="0.4", clinging="0.3"),
            Stage("0.08", "1.6", "0.8", film="6", volume="1.2", b="0.02", flow="5", feed="0.1", clinging="0.25"),
            Stage("0.05", "1.1", "0.8"),
            Stage("0.12", "0.9", "1.2", volume="3", b=0),
        ],
    ),
}


FOURTH_FILL = {
    "SLAB": "0.24705704281744451675",
    "CYLINDER": "0.054704546046550516822",
    "SPHERE": "0.013950628198379928329",
}


def departure(axis):
    """The method against successive-fills.csv, made from modes: alpha = 4, Bi = 5, X = 0.2, mean after fill 4."""
    fills = [Stage("0.2", 1, 1, film=5, volume=4) for _ in range(4)]
    found = [r[3] for r in follow([Grade(axis, 1, 1)], 1, fills, 50) if r[:2] == (3, "MEAN")]
    return abs(found[0] - mpf(FOURTH_FILL[axis]))


def main():
    for axis in WAVE:
        off = departure(axis)
        print(axis, "fourth fill differs by", nstr(off, 3))
        assert off < mpf(10) ** -19
    path = os.path.join(os.path.dirname(os.path.abspath(__file__)), "shared-baths.csv")
    with open(path, "w", encoding="ascii") as file:
        file.write("# Lots of several grades in shared baths, made by shared-baths.py, which states the cases:\n")
        file.write("# Laplace transforms inverted on a contour, two contours agreeing to 1e-32.\n")
        file.write("case,stage,quantity,grade,value,provenance\n")
        for name, (lot, start, stages) in CASES.items():
            fine, coarse = follow(lot, start, stages, 80), follow(lot, start, stages, 66)
            worst = max(abs(a[3] - b[3]) for a, b in zip(fine, coarse))
            print(name, "two contours differ by", nstr(worst, 3))
            assert worst < mpf(10) ** -32
            for k, quantity, grade, value in fine:
                file.write(f"{name},{k},{quantity},{grade},{nstr(value, 30)},recomputed\n")


if __name__ == "__main__":
    main()
