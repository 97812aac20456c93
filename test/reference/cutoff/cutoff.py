"""Writes cutoff.json: hit chances beyond an estimated mark, gated limits, rank limits and search budgets by other roads than the code's.

hits: 1 − E[Φ(ks + V/√n)^m] as a double integral over the densities of s and V, Gauss-Legendre in numpy (1e-13),
no density of the mark.
gated: the profile likelihood maximised over sigma by root finding on its numerical derivative, 30 digits.
ranks, trials and budgets: whole fractions; the budget by playing look after look on the lattice of costs, no recursion of Panjer's.
Run: python3 cutoff.py > cutoff.json
"""
import json
from fractions import Fraction as F
from math import comb

import numpy as np
from mpmath import mp, mpf, sqrt, log, erfc, erfinv, findroot, diff
from scipy.special import gammaln, log_ndtr

mp.dps = 20
phi = lambda z: erfc(-z / sqrt(mpf(2))) / 2


NODES, WEIGHTS = np.polynomial.legendre.leggauss(60)


def panels(edges):
    edges = np.asarray(edges, dtype=float)
    half, middle = np.diff(edges)[:, None] / 2, (edges[1:] + edges[:-1])[:, None] / 2
    return (middle + half * NODES).ravel(), (half * WEIGHTS).ravel()


def hit_chance(n, k, m):
    v = n - 1
    w = 1 / np.sqrt(2 * v)
    s, ds = panels(np.unique(np.maximum(0, 1 + w * np.linspace(-14, 14, 57))))
    x, dx = panels(np.linspace(-10, 10, 61))
    density = np.exp(np.log(2) + v / 2 * np.log(v / 2) - gammaln(v / 2) + (v - 1) * np.log(s) - v * s * s / 2)
    miss = log_ndtr(k * s[:, None] + x[None, :] / np.sqrt(n))
    inner = (-np.expm1(m * miss)) @ (dx * np.exp(-x * x / 2) / np.sqrt(2 * np.pi))
    return float(np.sum(ds * density * inner))


def gated_limits(scores, gate, below, fraction, confidence):
    mp.dps = 30
    n = len(scores)
    z = sqrt(mpf(2)) * erfinv(1 - 2 * mpf(fraction))
    loglik = lambda mu, sd: (below * log(phi((gate - mu) / sd)) if below else 0) - n * log(sd) - sum((x - mu) ** 2 for x in scores) / (2 * sd * sd)
    allowed = 2 * erfinv(mpf(confidence)) ** 2
    mean = sum(scores) / n
    spread = sqrt(sum((x - mean) ** 2 for x in scores) / n)
    top = findroot([lambda m, s: diff(lambda q: loglik(q, s), m), lambda m, s: diff(lambda q: loglik(m, q), s)], (mean - spread * below / n / 2, spread * (1 + mpf(below) / n / 2)))
    mu, sd = top
    best = loglik(mu, sd)
    mark = mu + z * sd

    def fall(at, guess):
        s = findroot(lambda q: diff(lambda r: loglik(at - z * r, r), q), guess)
        return 2 * (best - loglik(at - z * s, s)) - allowed

    width = sqrt(allowed) * sd * sqrt(1 / mpf(n) + z * z / (2 * n))
    limits = [findroot(lambda at: fall(at, sd), (mark + side * width, mark + side * width * 1.2)) for side in (-1, 1)]
    mp.dps = 20
    return limits[0], mark, limits[1]


def rank_limits(n, fraction, confidence):
    p, alpha = F(fraction), (1 - F(confidence)) / 2
    pmf = [comb(n, i) * p**i * (1 - p) ** (n - i) for i in range(n + 1)]
    near = next((r for r in range(1, n + 1) if sum(pmf[r:]) <= alpha), 0)
    far = max((r for r in range(1, n + 1) if sum(pmf[:r]) <= alpha), default=0)
    return near, far, float(1 - (sum(pmf[near:]) if near else 0) - (sum(pmf[:far]) if far else 0))


def trials(fraction, chance, hits):
    p, c = F(fraction), F(chance)
    m = hits
    while 1 - sum(comb(m, i) * p**i * (1 - p) ** (m - i) for i in range(hits)) < c:
        m += 1
    return m


def budget(fraction, reach, costs, chance, hits):
    p, c = F(fraction), F(chance)
    reach, costs = [F(r) for r in reach], [F(x) for x in costs]
    kinds = [(sum(costs[: j + 1]), reach[j] - (reach[j + 1] if j + 1 < len(reach) else p)) for j in range(len(reach))]
    kinds = [(cost, float(share)) for cost, share in kinds if share > 0]
    states = {(0, F(0)): 1.0}
    done = {}
    # Every look adds its cost; what is left after the last look has less than 1e-15 of the chance.
    while sum(states.values()) > 1e-15:
        following = {}
        for (got, spent), weight in states.items():
            for cost, share in kinds:
                key = (got, spent + cost)
                following[key] = following.get(key, 0.0) + weight * share
            total = spent + sum(costs)
            if got + 1 == hits:
                done[total] = done.get(total, 0.0) + weight * float(p)
            else:
                key = (got + 1, total)
                following[key] = following.get(key, 0.0) + weight * float(p)
        states = {key: weight for key, weight in following.items() if weight > 1e-22}
    reached = 0.0
    for total in sorted(done):
        reached += done[total]
        if reached >= float(c) * (1 - 1e-12):
            return float(total)


text = lambda v: mp.nstr(v, 17)
scores = [66.25, 71.5, 62, 80.75, 68, 64.5, 75.25, 61, 69.5, 66, 73, 63.5]
hits = [(2, 0.5, 1), (2, 1.645, 40), (3, 2.5, 1000), (5, -0.75, 3), (12, 0, 7), (20, 1.645, 14), (60, 2.326, 500), (60, 1.645, 14), (150, 3.5, 20), (1000, 2, 30), (8, 6, 100)]
gated = [(60, 5, "0.05", "0.95"), (60, 0, "0.2", "0.9"), (61, 30, "0.05", "0.95"), (50, 2, "0.6", "0.99")]
ranks = [(57, "1/10", "19/20"), (57, "1/20", "19/20"), (8, "1/2", "9/10"), (5, "1/4", "19/20"), (100, "1/100", "1/2"), (6, "1/2", "31/32"), (200, "3/4", "99/100")]
counts = [("1/2", "7/8", 1), ("1/2", "1/2", 3), ("1/20", "19/20", 2), ("1/3", "26/27", 1), ("1/3", "8/27", 1), ("9/10", "999999/1000000", 1), ("1/100", "1/100", 1), ("1/4", "3/4", 25)]
budgets = [
    ("1/20", ["1", "2/5", "1/10"], ["2", "31/2", "120"], "9/10", 1),
    ("1/10", ["1", "2/5", "1/10"], ["2", "31/2", "120"], "1/2", 2),
    ("1/4", ["1", "1/2"], ["0", "3"], "4/5", 3),
    ("1/2", ["1"], ["7"], "7/8", 1),
    ("1/5", ["1", "1", "1/4"], ["1/4", "0", "5/2"], "19/20", 2),
    ("3/10", ["1", "3/10"], ["1/10", "1/5"], "999/1000", 4),
]
print(
    json.dumps(
        {
            "by": "cutoff.py",
            "with": f"mpmath {__import__('mpmath').__version__}, numpy {np.__version__}, exact fractions",
            "hits": {"columns": ["count", "k", "trials", "chance"], "cases": [[*row, hit_chance(*row)] for row in hits]},
            "gated": {
                "scores": scores,
                "columns": ["gate", "below", "fraction", "confidence", "lower", "cutoff", "upper"],
                "cases": [[g, b, float(f), float(c), *map(text, gated_limits([mpf(x) for x in scores], g, b, f, c))] for g, b, f, c in gated],
            },
            "ranks": {
                "columns": ["count", "fraction", "confidence", "near rank, 0 for none", "far rank", "actual confidence"],
                "cases": [[n, float(F(f)), float(F(c)), *rank_limits(n, f, c)] for n, f, c in ranks],
            },
            "trials": {"columns": ["fraction", "chance", "hits", "trials"], "cases": [[float(F(f)), float(F(c)), h, trials(f, c, h)] for f, c, h in counts]},
            "budgets": {
                "columns": ["fraction", "reach", "costs", "chance", "hits", "budget"],
                "cases": [[float(F(f)), [float(F(x)) for x in r], [float(F(x)) for x in k], float(F(c)), h, budget(f, r, k, c, h)] for f, r, k, c, h in budgets],
            },
        },
        indent=1,
    )
)
