"""Writes values.json beside it: stopping rules by roads other than those of the code. Python 3.11, mpmath 1.3.0, numpy for the last block."""
import json, os
from fractions import Fraction
import numpy as np
from mpmath import mp, mpf, npdf, erfc, sqrt, findroot, log, exp, nsum

mp.dps = 60
Q = lambda x: erfc(x / sqrt(mpf(2))) / 2
psi = lambda u: npdf(u) - u * Q(u)
out = {"by": "test/reference/stopping/values.py", "with": "Python 3.11, mpmath 1.3.0 (60 digits), numpy 2"}
num = lambda x: float(mp.nstr(x, 20))

us = ["-40", "-8.5", "-2.5", "-1", "-0.01", "0", "0.3", "1", "1.7", "2.5", "2.9999", "3", "3.0001", "3.4", "4.2", "6", "9.75", "14", "22", "30", "37"]
out["unitNormalLoss"] = [[float(u), num(psi(mpf(float(u))))] for u in us]

def reserve(mean, sd, cost, discount, better):
    sign = -1 if better == "low" else 1
    mean, sd, cost, discount = mpf(mean) * sign, mpf(sd), mpf(cost), mpf(discount)
    f = lambda u: discount * (sd * psi(u) - cost) - (1 - discount) * (mean + sd * u)
    low, high = mpf(-2000000), mpf(60)
    for _ in range(260):
        mid = (low + high) / 2
        if f(mid) > 0: low = mid
        else: high = mid
    return sign * (mean + sd * (low + high) / 2)
rows = [(62, 8.5, .4, 1, "high"), (62, 8.5, .4, 1, "low"), (0, 1, 1e-9, 1, "high"), (0, 1, 1e-200, 1, "high"), (0, 1, 30, 1, "high"), (500, 40, 0, .999, "high"),
        (-500, 40, 2, .9, "high"), (500, 40, 2, .9, "low"), (100, 7, 3, .25, "high"), (0, 1, 0, .5, "high"), (1000, 1, 0, .999999, "high")]
out["reserveScore"] = [[*r, num(reserve(*r))] for r in rows]

def schedule(mean, sd, looks, cost, fallback, better):
    sign = -1 if better == "low" else 1
    mean, sd, cost = mpf(mean) * sign, mpf(sd), mpf(cost)
    floor = None if fallback is None else mpf(fallback) * sign
    w, steps = floor, []
    for left in range(1, looks + 1):
        held = w
        # E max(X, w) as w Φ(u) + mean Q(u) + sd φ(u)
        if held is None: w = mean - cost
        else:
            u = (held - mean) / sd
            w = held * (1 - Q(u)) + mean * Q(u) + sd * npdf(u) - cost
        if floor is not None: w = max(w, floor)
        steps.append([left, None if held is None else num(sign * held), num(sign * w), 1.0 if held is None else num(Q((held - mean) / sd))])
    return steps
rows = [(0, 1, 300, 0, None, "high", [1, 2, 10, 100, 300]), (62, 8.5, 40, .4, None, "high", [1, 2, 3, 20, 40]), (62, 8.5, 40, 20, None, "high", [2, 3, 40]),
        (0, 1, 5, 12, None, "low", [2, 3, 5]), (62, 8.5, 40, .4, 70, "high", [1, 2, 40]), (200, 25, 30, 3, 150, "low", [1, 2, 30])]
out["reserveSchedule"] = [[*r[:6], [s for s in schedule(*r[:6]) if s[0] in r[6]]] for r in rows]

def percentile(j):
    """Root of the sum itself, by Newton's steps on x = 1/d."""
    x = 1 + mpf("0.8") / j
    for _ in range(60):
        total, power, slope = mpf(0), mpf(1), mpf(0)
        for i in range(1, j + 1):
            slope += power
            power *= x
            total += (power - 1) / i
        step = (1 - total) / slope
        x += step
        if abs(step) < mpf(10) ** -45: return 1 / x
mp.dps = 50
exact = {j: percentile(j) for j in list(range(1, 300)) + [500, 2000, 9999]}
out["percentile"] = [[j, num(exact[j])] for j in [1, 2, 3, 4, 5, 10, 25, 47, 48, 49, 100, 299, 500, 2000, 9999]]

def chance(n, d, one):
    """Before the equation of the percentiles is put in: b_i the percentile at look i."""
    b = [None] + [d(n - i) for i in range(1, n)] + [one * 0]
    total = (1 - b[1] ** n) / n if n > 1 else one
    for r in range(1, n):
        inner = sum((b[k] ** r / r - b[k] ** n / n) / (n - r) for k in range(1, r + 1))
        total += inner - b[r + 1] ** n / n
    return total
out["bestPickChance"] = [[n, num(chance(n, lambda j: exact[j], mpf(1)))] for n in [2, 3, 4, 7, 24, 25, 49, 50, 60, 100, 300]]

def chance_in_doubles(n):
    """The same in doubles, vectorised; good to 1e-12."""
    js = np.arange(1, n)
    a = np.full(n - 1, .8)
    nodes, weights = np.polynomial.legendre.leggauss(40)
    for _ in range(30):
        w = a[:, None] / 2 * (1 + nodes)
        f = np.expm1(w) / (-js[:, None] * np.expm1(-w / js[:, None]))
        a = a + (1 - a / 2 * (f @ weights)) / (np.expm1(a) / (-js * np.expm1(-a / js)))
    lb = (-a / js)[::-1]  # log b_1 .. b_(n-1)
    bn = np.exp(n * lb)
    parts = [(1 - bn[0]) / n]
    for r in range(1, n):
        parts.append(np.sum(np.exp(r * lb[:r]) / r - bn[:r] / n) / (n - r) - (bn[r] / n if r < n - 1 else 0.0))
    import math
    return math.fsum(parts)
out["bestPickChanceInDoubles"] = [[n, chance_in_doubles(n)] for n in [300, 2000, 10000]]

def by_rank(n):
    best = max(((Fraction(1, n) if s == 0 else Fraction(s, n) * sum(Fraction(1, i) for i in range(s, n))), -s) for s in range(n))
    return [n, -best[1], float(best[0])]
out["rankOnlyBest"] = [by_rank(n) for n in [1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 20, 37, 100, 150]]

def rank_schedule(n):
    """Exact fractions, rank by rank."""
    going_on, accept = None, []
    for i in range(n, 0, -1):
        own = [Fraction(s * (n + 1), i + 1) for s in range(1, i + 1)]
        taken = [x if going_on is None or x <= going_on else going_on for x in own]
        accept.append(sum(going_on is None or x <= going_on for x in own))
        going_on = sum(taken) / i
    return [n, accept[::-1], float(going_on)]
out["rankOnlySchedule"] = [rank_schedule(n) for n in [1, 2, 3, 4, 5, 6, 8, 10, 13, 20, 40, 75]]

json.dump(out, open(os.path.join(os.path.dirname(os.path.abspath(__file__)), "values.json"), "w"), indent=None, separators=(",", ":"))
