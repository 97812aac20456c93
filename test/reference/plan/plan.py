"""Writes plan.json: coverage and precision of standard deviations, and what a plain mark really lets through, with 30 digits (mpmath).

The mark's distribution is integrated over s directly, P(x̄ + zs ≤ μ + tσ) = ∫ Φ(√n(t − zs)) p(s) ds with the density of s from the gamma
function: no noncentral t is used. Run: python3 plan.py > plan.json
"""
import json
from mpmath import mp, mpf, sqrt, exp, log, quad, erfc, erfinv, findroot, loggamma, gammainc, ceil

mp.dps = 30
phi = lambda z: erfc(-z / sqrt(mpf(2))) / 2
quantile = lambda p: sqrt(mpf(2)) * erfinv(2 * p - 1)
digits = lambda v: mp.nstr(v, 20)


def mark_cdf(n, z, t):
    v = n - 1
    const = log(mpf(2)) + mpf(v) / 2 * log(mpf(v) / 2) - loggamma(mpf(v) / 2)
    density = lambda s: exp(const + (v - 1) * log(s) - mpf(v) * s * s / 2) if s > 0 else (exp(const) if v == 1 else mpf(0))
    w = 1 / sqrt(mpf(2 * v))
    points = sorted({max(mpf(0), 1 + k * w) for k in (-20, -12, -8, -5, -3, -1, 0, 1, 3, 5, 8, 12, 20, 30)})
    return quad(lambda s: density(s) * phi(sqrt(mpf(n)) * (t - z * s)), points)


def limits(n, fraction, confidence):
    fraction, confidence = mpf(fraction), mpf(confidence)
    z = quantile(1 - fraction)
    alpha = (1 - confidence) / 2
    width = sqrt(mpf(1) / n + z * z / (2 * (n - 1)))
    roots = []
    for target, guess in ((alpha, z - 1.6 * width), (1 - alpha, z + 1.6 * width)):
        roots.append(findroot(lambda t: log(mark_cdf(n, z, t) / target) if target < 0.5 else log((1 - mark_cdf(n, z, t)) / (1 - target)),
                              (guess, guess + width / 10), solver="secant", tol=mpf(10) ** -20))
    return [phi(-roots[1]), phi(-roots[0])]


def covered(n, p):
    v = mpf(n - 1)
    return gammainc(v / 2, max(mpf(0), 1 - p) ** 2 * v / 2, (1 + p) ** 2 * v / 2, regularized=True)


precision = []
for n, confidence, guess in [(2, "0.9", 1.4), (3, "0.95", 0.9), (10, "0.95", 0.45), (30, "0.5", 0.1), (193, "0.95", 0.1), (5000, "0.99", 0.03), (100000, "0.95", 0.005)]:
    root = findroot(lambda p: covered(n, p) - mpf(confidence), (mpf(guess), mpf(guess) * mpf("1.05")), solver="secant", tol=mpf(10) ** -22)
    precision.append([n, float(confidence), digits(root)])
passing = [[n, f, c, *map(digits, limits(n, f, c))] for n, f, c in
           [(3, 0.25, 0.5), (5, 0.05, 0.9), (12, 0.8, 0.95), (60, 0.05, 0.9), (60, 0.05, 0.999), (400, 0.01, 0.95), (5000, 0.5, 0.9)]]
marks = [[n, z, t, digits(mark_cdf(n, mpf(z), mpf(t)))] for n, z, t in
         [(2, 1.5, 1.0), (4, 1.25, 1.75), (30, 1.75, 1.25), (30, -1.0, -0.5), (1000, 2.0, 2.125)]]
print(json.dumps({"by": "plan.py", "with": "mpmath 1.3.0, 30 digits",
                  "precision": {"columns": ["count", "confidence", "precision"], "cases": precision},
                  "passing": {"columns": ["count", "fraction", "confidence", "lowest", "highest"], "cases": passing},
                  "marks": {"columns": ["count", "z", "t", "P(T <= t)"], "cases": marks}}, indent=1))
