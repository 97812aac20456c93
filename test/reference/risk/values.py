"""Writes values.json beside it: error rates and fairness figures by roads other than those of the code. Python 3.11, mpmath 1.3.0."""
import json, math, os
from fractions import Fraction
from mpmath import mp, mpf, npdf, erfc, erfinv, sqrt, quad, quadgl, gamma, loggamma, log, exp, betainc, atanh, tanh, linspace

mp.dps = 34
Q = lambda x: erfc(x / sqrt(mpf(2))) / 2
zq = lambda p: -sqrt(mpf(2)) * erfinv(2 * mpf(p) - 1)  # exceeded with chance p
num = lambda x: float(mp.nstr(x, 20))
out = {"by": "test/reference/risk/values.py", "with": "Python 3.11, mpmath 1.3.0 (34 digits)"}

def bisect(f, low, high, rounds=110):
    """f falls from above 0 to below it."""
    low, high = mpf(low), mpf(high)
    for _ in range(rounds):
        mid = (low + high) / 2
        if f(mid) > 0: low = mid
        else: high = mid
    return (low + high) / 2

def legendre(n):
    nodes, weights = [], []
    for i in range(1, n + 1):
        x = mp.cos(mp.pi * (i - mpf(1) / 4) / (n + mpf(1) / 2))
        for _ in range(8):
            p0, p1 = mpf(1), x
            for j in range(2, n + 1): p0, p1 = p1, ((2 * j - 1) * x * p1 - (j - 1) * p0) / j
            d = n * (x * p1 - p0) / (x * x - 1)
            x -= p1 / d
        nodes.append(x); weights.append(2 / ((1 - x * x) * d * d))
    return nodes, weights
mp.dps = 25
NODES, WEIGHTS = legendre(24)

def panels(f, edges):
    total = mpf(0)
    for a, b in zip(edges, edges[1:]):
        half = (b - a) / 2
        total += half * sum(w * f(a + half * (1 + x)) for x, w in zip(NODES, WEIGHTS))
    return total

def spread(v):
    """Panels for S = sqrt(chi2_v / v), and its density."""
    c = log(2) + (mpf(v) / 2) * log(mpf(v) / 2) - loggamma(mpf(v) / 2)
    density = lambda s: exp(c + (v - 1) * log(s) - v * s * s / 2)
    sd = 1 / sqrt(mpf(2 * v))
    if v < 60: return linspace(0, 1 + 13 * sd, 27), density
    return linspace(1 - 12 * sd, 1 + 12 * sd, 17), density

def error_rates(n, p, k):
    """E over S and Z of the positive and negative parts of the passing fraction less p: the definition itself."""
    p, k = mpf(p), mpf(k)
    root, z = sqrt(mpf(n)), zq(p)
    edges, density = spread(n - 1)
    def inner(s):
        cut = min(max(root * (z - k * s), mpf(-14)), mpf(14))
        f = lambda y: npdf(y) * (Q(k * s + y / root) - p)
        low = panels(f, linspace(-14, cut, 9)) if cut > -14 else mpf(0)
        high = panels(f, linspace(cut, 14, 9)) if cut < 14 else mpf(0)
        return low, -high
    parts = [mpf(0), mpf(0)]
    for a, b in zip(edges, edges[1:]):
        half = (b - a) / 2
        for x, w in zip(NODES, WEIGHTS):
            s = a + half * (1 + x)
            lo, hi = inner(s)
            parts[0] += half * w * density(s) * lo
            parts[1] += half * w * density(s) * hi
    average = p + parts[0] - parts[1]
    return [num(average), num(parts[0] / average), num(parts[1] / p)]

def t_tail_quantile(p, v):
    """The t exceeded with chance p < 1/2."""
    x = bisect(lambda x: p - betainc(mpf(v) / 2, mpf(1) / 2, 0, x, regularized=True) / 2, 0, 1)
    return sqrt(v * (1 / x - 1))

rates = []
for n, p in [(2, .05), (2, 1e-6), (3, .5), (5, .3), (30, .05), (30, 1e-6), (200, .9), (1000, .01), (1000000, .05), (1000000, 1e-6)]:
    rates.append([n, p, "plain", .95, error_rates(n, p, zq(p))])
for n, p in [(2, .05), (9, .2), (50, .001)]:
    rates.append([n, p, "next", .95, error_rates(n, p, t_tail_quantile(p, n - 1) * sqrt(1 + mpf(1) / n))])
out["errorRates"] = rates

mp.dps = 34
def true_top(t, p, r):
    h, k, r = zq(t), zq(p), mpf(r)
    turn = h / r if r else mpf(0)
    edges = sorted({k, k + mpf(1) / 2, k + 1, k + 2, k + 4, k + 8, k + 14} | {e for e in [turn - 6 * sqrt(1 - r * r) / abs(r or 1), turn, turn + 6 * sqrt(1 - r * r) / abs(r or 1)] if e > k})
    return quad(lambda x: npdf(x) * Q((h - r * x) / sqrt(1 - r * r)), edges) / mpf(p)
out["trueTop"] = [[t, p, r, num(true_top(t, p, r))] for t, p, r in [(.05, .05, .9), (.5, .2, .5), (.05, .1, -.4), (.01, .6, .2), (.3, .3, .999), (.2, .9, -.95), (1e-6, 1e-4, .6), (.9, .02, .1), (.5, .5, .7)]]

def guarded(limit, error, mean, true, wrong, better):
    sign = -1 if better == "low" else 1
    limit, error, mean, true = (mpf(limit) - mpf(mean)) * sign, mpf(error), mpf(mean), mpf(true)
    sd = sqrt(error ** 2 + true ** 2)
    slope, need = true / error, limit / true * sd / error
    def risk(a):
        turn = need / slope
        scale = 1 / max(mpf(1), a)
        edges = sorted({a, a + scale / 8, a + scale / 2, a + 2 * scale, a + 8 * scale, a + 30 * scale, a + 90 * scale} | {e for e in [turn - 9 / slope, turn - 3 / slope, turn, turn + 3 / slope, turn + 9 / slope] if a < e < a + 90 * scale})
        return quad(lambda x: exp(-(x - a) * (x + a) / 2) * Q(slope * x - need), edges) / quad(lambda x: exp(-(x - a) * (x + a) / 2), edges)
    root = bisect(lambda a: log(risk(a) / mpf(wrong)), -12, 60, 75)
    return num(mpf(mean) + sign * sd * root)
mp.dps = 25
out["guarded"] = [[*r, num(guarded(*r))] for r in [(60, 3, 55, 8, .05, "high"), (60, 3, 55, 8, .5, "high"), (20, 2, 22, 4, .03, "low"), (60, .01, 55, 8, .05, "high"), (60, 80, 55, 8, .05, "high"),
    (120, 3, 55, 8, .05, "high"), (60, 3, 55, 8, 1e-9, "high"), (40, 3, 55, 8, .01, "high")]]

mp.dps = 70
def koopman(x1, n1, x2, n2, confidence):
    x1, n1, x2, n2 = map(mpf, (x1, n1, x2, n2))
    chi = 2 * erfinv(mpf(confidence)) ** 2
    def u(theta):
        a, b, c = (n1 + n2) * theta, -(theta * (n1 + x2) + x1 + n2), x1 + x2
        p2 = (-b - sqrt(b * b - 4 * a * c)) / (2 * a)
        p1 = theta * p2
        part = lambda x, n, p: mpf(0) if x == n and abs(1 - p) < mpf(10) ** -40 else (x - n * p) ** 2 / (n * p * (1 - p))
        return part(x1, n1, p1) + part(x2, n2, p2)
    seen = x1 / n1 / (x2 / n2)
    low = mpf(0) if x1 == 0 else exp(bisect(lambda t: u(exp(t)) - chi, log(seen) - 25, log(seen), 125))
    high = exp(bisect(lambda t: chi - u(exp(t)), log(max(seen, mpf(1) / 10 ** 9)), log(max(seen, mpf(1) / 10 ** 9)) + 35, 125))
    return [num(low), num(high)]
out["ratioLimits"] = [[*r, koopman(*r)] for r in [(36, 40, 16, 80, .95), (12, 40, 48, 80, .99), (0, 7, 3, 11, .95), (5, 5, 9, 9, .95), (1, 1, 1, 1, .9), (3, 50, 50, 50, .95), (0, 4, 6, 6, .9),
    (1, 1000000, 9, 1000000, .95), (999000, 1000000, 1000000, 1000000, .95), (999990, 1000000, 999998, 1000000, .95), (400000, 1000000, 401000, 900000, .999)]]

mp.dps = 40
def fisher_exactly(xa, na, xb, nb):
    good, pool = xa + xb, na + nb
    ways = {k: math.comb(na, k) * math.comb(nb, good - k) for k in range(max(0, good - nb), min(good, na) + 1)}
    seen = ways[xa]
    return float(Fraction(sum(w for w in ways.values() if w * 10 ** 7 <= seen * (10 ** 7 + 1)), math.comb(pool, good)))
def fisher_by_ratios(xa, na, xb, nb):
    """Unnormalised weights from the table seen, 40 digits, until nothing is added."""
    good = xa + xb
    step = lambda k: mpf((na - k) * (good - k)) / ((k + 1) * (nb - good + k + 1))
    weights = [mpf(1)]
    w, k = mpf(1), xa
    while k < min(good, na):
        w *= step(k); k += 1
        if w < mpf(10) ** -60 and step(k) < 1: break
        weights.append(w)
    w, k = mpf(1), xa
    while k > max(0, good - nb):
        k -= 1; w /= step(k)
        if w < mpf(10) ** -60: break
        weights.append(w)
    return num(sum(w for w in weights if w <= 1 + mpf(10) ** -7) / sum(weights))
out["fisher"] = [[*r, fisher_exactly(*r)] for r in [(3, 4, 1, 4), (48, 80, 12, 40), (1, 20, 8, 30), (10, 10, 0, 10), (5, 9, 5, 9), (7, 17, 13, 22), (0, 300, 7, 500), (130, 300, 250, 450), (999, 1000, 1970, 2000)]]
out["fisher"] += [[*r, fisher_by_ratios(*r)] for r in [(400000, 800000, 201500, 400000), (500, 1000000, 570, 1000000), (999500, 1000000, 999570, 1000000), (500000, 1000000, 501000, 1000000)]]

def f_quantile(p, d1, d2):
    x = bisect(lambda x: mpf(p) - betainc(mpf(d1) / 2, mpf(d2) / 2, 0, x, regularized=True), 0, 1, 100)
    return x / (1 - x) * mpf(d2) / mpf(d1)
def icc(rows, confidence):
    x = [[mpf(v) for v in row] for row in rows]
    n, k = len(x), len(x[0])
    total = sum(map(sum, x)); c = total ** 2 / (n * k)
    squares = sum(v * v for row in x for v in row)
    B = sum(sum(row) ** 2 for row in x) / k - c
    J = sum(sum(row[j] for row in x) ** 2 for j in range(k)) / n - c
    W = (squares - c - B) / (n * (k - 1)); E = (squares - c - B - J) / ((n - 1) * (k - 1)); B /= n - 1; J /= k - 1
    hi = 1 - (1 - mpf(confidence)) / 2
    f1, f3 = B / W, B / E
    r2 = (B - E) / (B + (k - 1) * E + k * (J - E) / n)
    a, b = k * r2 / (n * (1 - r2)), 1 + k * r2 * (n - 1) / (n * (1 - r2))   # McGraw & Wong's form
    v = (a * J + b * E) ** 2 / ((a * J) ** 2 / (k - 1) + (b * E) ** 2 / ((n - 1) * (k - 1)))
    F1, F2 = f_quantile(hi, n - 1, v), f_quantile(hi, v, n - 1)
    l2 = n * (B - F1 * E) / (F1 * (k * J + (k * n - k - n) * E) + n * B)
    u2 = n * (F2 * B - E) / (k * J + (k * n - k - n) * E + n * F2 * B)
    up = lambda r: k * r / (1 + (k - 1) * r)
    one = lambda f: (f - 1) / (f + k - 1)
    l1, u1 = f1 / f_quantile(hi, n - 1, n * (k - 1)), f1 * f_quantile(hi, n * (k - 1), n - 1)
    l3, u3 = f3 / f_quantile(hi, n - 1, (n - 1) * (k - 1)), f3 * f_quantile(hi, (n - 1) * (k - 1), n - 1)
    singles = [[one(f1), one(l1), one(u1)], [r2, l2, u2], [one(f3), one(l3), one(u3)]]
    return [[num(v) for v in s] for s in singles] + [[num(up(v)) for v in s] for s in singles]
sf = [[9, 2, 5, 8], [6, 1, 3, 2], [8, 4, 6, 8], [7, 1, 2, 6], [10, 5, 6, 9], [6, 2, 4, 7]]
two = [[71.5, 69], [64, 66.5], [80, 77.5], [58.5, 61], [75, 75.5]]
far = [[1000000 + v for v in row] for row in sf]
out["reliability"] = [[sf, .95, icc(sf, .95)], [sf, .999, icc(sf, .999)], [two, .9, icc(two, .9)], [far, .95, icc(far, .95)]]

def validity(x, y, confidence, k_sd):
    x, y = [mpf(v) for v in x], [mpf(v) for v in y]
    n = len(x); mx, my = sum(x) / n, sum(y) / n
    sxx, syy = sum((v - mx) ** 2 for v in x), sum((v - my) ** 2 for v in y)
    r = sum((a - mx) * (b - my) for a, b in zip(x, y)) / sqrt(sxx * syy)
    half = sqrt(mpf(2)) * erfinv(mpf(confidence)) / sqrt(mpf(n - 3))
    k = mpf(k_sd) / sqrt(sxx / (n - 1))
    return [num(r), num(tanh(atanh(r) - half)), num(tanh(atanh(r) + half)), num(r * k / sqrt(1 - r * r + r * r * k * k))]
a, b = [61.5, 70, 58, 66, 73.5, 64, 69], [3.1, 3.9, 3.0, 3.3, 3.6, 3.7, 3.2]
out["validity"] = [[a, b, .95, 9, validity(a, b, .95, 9)], [a, [-v for v in b], .8, 2, validity(a, [-v for v in b], .8, 2)], [[1e6 + v for v in a], b, .99, 6, validity([1e6 + v for v in a], b, .99, 6)]]

json.dump(out, open(os.path.join(os.path.dirname(os.path.abspath(__file__)), "values.json"), "w"), separators=(",", ":"))
