"""Writes distributions.json: every function of the kernel at random points, in 25 digits.

The formulas differ from those of the kernel: gamma and beta by their hypergeometric series (positive terms), binomial and
hypergeometric by summing chances, noncentral t by integrating the chi-square law over the normal (the kernel does it the other way
round), bivariate normal by integrating the conditional law, Kolmogorov by its alternating series alone. A quantile is x moved to where
the rounded p lies: x + (p - F(x)) / F'(x), exact since p is F(x) rounded.

Run: python3 distributions.py > distributions.json   (mpmath 1.3.0, about ten minutes)
"""

import json
import math
import random

import mpmath
from mpmath import exp, gammainc, log, log1p, loggamma, mp, mpf, ncdf, npdf, pi, sqrt

mp.dps = 170
TINY = mpf(10) ** -150
rnd = random.Random()
rows = []


def number(x):
    return mpmath.nstr(x, 25, strip_zeros=False)


def put(fn, args, value):
    if abs(value) > mpf(10) ** -100:
        rows.append({"fn": fn, "args": args, "value": number(value)})


def spread(low, high):
    """A double between low and high, even on the scale of logarithms, of few digits."""
    return float("%.7g" % 10 ** rnd.uniform(mpmath.log10(low), mpmath.log10(high)))


def invertible(p, chance):
    """Whether rounding the chance to p moves x so little that one step of Newton is exact to 18 digits."""
    return 1e-100 < p < 1 and abs(p - chance) < 1e-9 * min(chance, 1 - chance)


def put_quantiles(name, parameters, x, lower, upper, density):
    """Rows for cdf, upper tail and the quantiles of both, at x."""
    put(name + "Cdf", [x, *parameters], lower)
    put(name + "UpperTail", [x, *parameters], upper)
    for suffix, chance, sign in (("Quantile", lower, 1), ("UpperTailQuantile", upper, -1)):
        p = float(chance)
        if invertible(p, chance):
            put(name + suffix, [p, *parameters], mpf(x) + sign * (mpf(p) - chance) / density)


def lower_gamma(x, a):
    with mp.workdps(170):
        term = total = mpf(1)
        n = 0
        while term > total * TINY:
            n += 1
            term = term * x / (a + n)
            total += term
        return total * exp(a * log(x) - x - loggamma(a + 1))


def series_length(x, a, b):
    """About how many terms the series in x needs until they are 1e-150 of the first."""
    x, a, b = float(x), float(a), float(b)
    n = 1.0
    rest = lambda n: math.lgamma(a + b + n) - math.lgamma(a + b) - math.lgamma(a + 1 + n) + math.lgamma(a + 1) + n * math.log(x)
    while rest(n) > -350 and n < 1e9:
        n *= 1.5
    return n


def lower_beta(x, y, a, b):
    """The lower and the upper tail, by the series that is the shorter one."""
    if y > 0 and series_length(y, b, a) < series_length(x, a, b):
        upper, lower = lower_series(y, x, b, a)
    else:
        lower, upper = lower_series(x, y, a, b)
    return lower, upper


def lower_series(x, y, a, b):
    with mp.workdps(170):
        term = total = mpf(1)
        n = 0
        while term > total * TINY:
            term = term * (a + b + n) / (a + 1 + n) * x
            total += term
            n += 1
        lower = total * exp(a * log(x) + b * log(y) + loggamma(a + b) - loggamma(a + 1) - loggamma(b))
        return lower, 1 - lower


def beta_density(x, y, a, b):
    return exp((a - 1) * log(x) + (b - 1) * log(y) + loggamma(a + b) - loggamma(a) - loggamma(b))


def normal(count):
    for _ in range(count):
        x = round(rnd.uniform(-20, 20), 6)
        put("normalPdf", [x], npdf(mpf(x)))
        put_quantiles("normal", [], x, ncdf(mpf(x)), ncdf(-mpf(x)), npdf(mpf(x)))


def gamma(count):
    for i in range(count):
        shape = spread(0.05, 1e6)
        z = rnd.uniform(-7, 12) if i % 3 else rnd.uniform(-1, 1)
        x = shape * (1 + z / sqrt(shape)) if shape > 60 else shape * 10 ** rnd.uniform(-3, 1)
        x = float("%.8g" % x)
        lower = lower_gamma(mpf(x), mpf(shape))
        density = exp((mpf(shape) - 1) * log(mpf(x)) - x - loggamma(mpf(shape)))
        put_quantiles("gamma", [shape], x, lower, 1 - lower, density)
        if 2 * shape > 0.5:
            put("chiSquareCdf", [2 * x, 2 * shape], lower)
            put("chiSquareUpperTail", [2 * x, 2 * shape], 1 - lower)


def beta(count):
    for i in range(count):
        a, b = spread(0.1, 1e5), spread(0.1, 1e5)
        z = rnd.uniform(-6, 6) if i % 3 else rnd.uniform(-1, 1)
        mean = a / (a + b)
        sd = mpmath.sqrt(mean * (1 - mean) / (a + b + 1))
        x = mean + z * sd
        if not 0 < x < 1:
            x = mean * rnd.random() if i % 2 else 1 - (1 - mean) * rnd.random()
        x = float("%.9g" % x)
        if not 0 < x < 1:
            continue
        lower, upper = lower_beta(mpf(x), 1 - mpf(x), mpf(a), mpf(b))
        put("betaCdf", [x, a, b], lower)
        put("betaUpperTail", [x, a, b], upper)
        p = float(lower)
        if invertible(p, lower):
            put("betaQuantile", [p, a, b], mpf(x) + (mpf(p) - lower) / beta_density(mpf(x), 1 - mpf(x), mpf(a), mpf(b)))


def student(count):
    for i in range(count):
        df = float(rnd.randint(1, 60)) if i % 3 == 0 else spread(0.5, 1e6)
        x = float("%.8g" % rnd.choice([rnd.uniform(-8, 8), 10 ** rnd.uniform(-6, 3 if df < 30 else 1)]))
        half, square = mpf(df) / 2, mpf(x) ** 2
        tail = lower_beta(df / (df + square), square / (df + square), half, mpf(1) / 2)[0] / 2
        density = exp(loggamma(half + 0.5) - loggamma(half) - (half + 0.5) * log1p(square / df)) / sqrt(df * pi)
        put("studentTPdf", [x, df], density)
        lower, upper = (1 - tail, tail) if x > 0 else (tail, 1 - tail)
        put_quantiles("studentT", [df], x, lower, upper, density)


def f_distribution(count):
    for i in range(count):
        df1, df2 = spread(1, 1e5), spread(1, 1e5)
        x = float("%.8g" % exp(rnd.uniform(-6, 6) * mpmath.sqrt(2 / df1 + 2 / df2)))
        a, b = mpf(df1) / 2, mpf(df2) / 2
        total = df1 * mpf(x) + df2
        lower, upper = lower_beta(df1 * mpf(x) / total, df2 / total, a, b)
        put("fCdf", [x, df1, df2], lower)
        put("fUpperTail", [x, df1, df2], upper)
        p = float(lower)
        density = beta_density(df1 * mpf(x) / total, df2 / total, a, b) * df1 * df2 / total**2
        if invertible(p, lower):
            put("fQuantile", [p, df1, df2], mpf(x) + (mpf(p) - lower) / density)


def binomial(count):
    for _ in range(count):
        n = int(spread(5, 1e8))
        p = rnd.choice([rnd.random(), spread(1e-6, 1)])
        p = float("%.9g" % p)
        sd = mpmath.sqrt(n * p * (1 - p))
        k = min(n - 1, max(1, int(n * p + rnd.uniform(-7, 7) * sd)))
        q = 1 - mpf(p)
        mass = exp(loggamma(mpf(n + 1)) - loggamma(mpf(k + 1)) - loggamma(mpf(n - k + 1)) + k * log(mpf(p)) + (n - k) * log(q))
        put("binomialPmf", [k, n, p], mass)
        odds = mpf(p) / q
        term = total = mpf(1)
        i = k
        if k < n * p:
            while i > 0 and term > total * mpf(10) ** -50:
                term = term * i / ((n - i + 1) * odds)
                total += term
                i -= 1
            lower = mass * total
            upper = 1 - lower + mass
        else:
            while i < n and term > total * mpf(10) ** -50:
                term = term * (n - i) * odds / (i + 1)
                total += term
                i += 1
            upper = mass * total
            lower = 1 - upper + mass
        put("binomialCdf", [k, n, p], lower)
        put("binomialUpperTail", [k, n, p], upper)


def negative_binomial(count):
    for _ in range(count):
        r, p = spread(0.2, 1e4), spread(1e-3, 0.99)
        mean = r * (1 - p) / p
        k = max(1, int(mean + rnd.uniform(-5, 7) * mpmath.sqrt(mean / p)))
        put("negativeBinomialCdf", [k, r, p], lower_beta(mpf(p), 1 - mpf(p), mpf(r), mpf(k + 1))[0])
        put("negativeBinomialUpperTail", [k, r, p], lower_beta(mpf(p), 1 - mpf(p), mpf(r), mpf(k))[1])


def hypergeometric(count):
    for _ in range(count):
        pool = int(spread(5, 2e6))
        good, drawn = rnd.randint(1, pool - 1), rnd.randint(1, pool - 1)
        mean = good * drawn / pool
        sd = mpmath.sqrt(mean * (1 - good / pool) * (pool - drawn) / max(1, pool - 1))
        least, most = max(0, good + drawn - pool), min(good, drawn)
        k = min(most, max(least, int(mean + rnd.uniform(-7, 7) * sd)))

        def choose(n, m):
            return loggamma(mpf(n + 1)) - loggamma(mpf(m + 1)) - loggamma(mpf(n - m + 1))

        mass = exp(choose(good, k) + choose(pool - good, drawn - k) - choose(pool, drawn))
        put("hypergeometricPmf", [k, pool, good, drawn], mass)
        rest = pool - good - drawn
        for name, step in (("hypergeometricCdf", -1), ("hypergeometricUpperTail", 1)):
            term = total = mpf(1)
            i = k
            while (i > least if step < 0 else i < most) and term > total * mpf(10) ** -50:
                if step < 0:
                    term = term * (i * (rest + i)) / ((good - i + 1) * (drawn - i + 1))
                else:
                    term = term * ((good - i) * (drawn - i)) / ((i + 1) * (rest + i + 1))
                total += term
                i += step
            put(name, [k, pool, good, drawn], mass * total)


def gauss_nodes(n):
    import numpy

    nodes = []
    for start in numpy.polynomial.legendre.leggauss(n)[0]:
        x = mpf(float(start))
        for _ in range(5):
            before, value = mpf(1), x
            for j in range(2, n + 1):
                before, value = value, ((2 * j - 1) * x * value - (j - 1) * before) / j
            slope = n * (x * value - before) / (x * x - 1)
            x -= value / slope
        nodes.append((x, 2 / ((1 - x * x) * slope**2)))
    return nodes


NODES = gauss_nodes(40)


def integral(f, log_f, low, high, breaks=()):
    """Of a positive function with one peak in (low, high); log_f is its logarithm in doubles."""
    left, right = low, high
    for _ in range(200):
        one, two = left + (right - left) / 3, right - (right - left) / 3
        if log_f(one) < log_f(two):
            left = one
        else:
            right = two
    peak = (left + right) / 2
    top = log_f(peak)

    def edge(end):
        if log_f(end) > top - 70:
            return end
        inside, outside = peak, end
        for _ in range(100):
            middle = (inside + outside) / 2
            if log_f(middle) > top - 70:
                inside = middle
            else:
                outside = middle
        return outside

    a, b = edge(low), edge(high)
    points = sorted({mpf(a), mpf(b), *(mpf(a) + (mpf(b) - a) * i / 20 for i in range(1, 20)), *(mpf(z) for z in breaks if a < z < b)})
    total = mpf(0)
    for start, end in zip(points, points[1:]):
        middle, half = (start + end) / 2, (end - start) / 2
        total += half * sum(w * f(middle + half * x) for x, w in NODES)
    return total


def log_normal_cdf(x):
    return math.log(0.5 * math.erfc(-x / math.sqrt(2))) if x > -20 else -x * x / 2 - math.log(-x) - 0.92


def bivariate(count):
    for i in range(count):
        h, k = round(rnd.uniform(-8, 5), 5), round(rnd.uniform(-8, 5), 5)
        rho = round(rnd.uniform(-1, 1), 6) if i % 2 else float(rnd.choice([-1, 1]) * (1 - float("%.3g" % 10 ** rnd.uniform(-9, -1))))
        with mp.workdps(40):
            root = sqrt((1 - mpf(rho)) * (1 + mpf(rho)))
            width = float(root)
            turn = k / rho
            value = integral(
                lambda x: npdf(x) * ncdf((k - rho * x) / root),
                lambda x: -x * x / 2 + log_normal_cdf((k - rho * x) / width),
                -60.0,
                h,
                [turn + m * width / abs(rho) for m in (-20, -15, -12, -9, -7, -5, -3, -2, -1, 0, 1, 2, 3, 5, 7, 9, 12, 15, 20)],
            )
        put("bivariateNormalCdf", [h, k, rho], value)
        put("bivariateNormalUpperTail", [-h, -k, rho], value)


def noncentral_t(count):
    """P(T <= t) and P(T > t) for t > 0, ncp > 0, by the chi-square law under the normal."""
    for i in range(count):
        df = float(rnd.randint(1, 60)) if i % 2 else spread(1, 20000)
        ncp = float("%.7g" % (abs(rnd.gauss(0, 2)) * math.sqrt(df + 1)))
        sd = math.sqrt(1 + ncp * ncp / (2 * df)) * (1 if df > 4 else 3)
        t = float("%.8g" % abs(ncp + rnd.uniform(-5, 7) * sd))
        upper_wanted = t > ncp
        half = df / 2

        with mp.workdps(40):

            def q(z):
                x = mpf(df) * (z + ncp) ** 2 / (2 * mpf(t) ** 2)
                if x == 0:
                    return mpf(0) if upper_wanted else mpf(1)
                lower = lower_gamma_quick(x, mpf(half))
                return lower if upper_wanted else 1 - lower

            def rough(z):
                x = df * (z + ncp) ** 2 / (2 * t * t)
                if x <= 0:
                    return -1e300 if upper_wanted else -z * z / 2
                w = 3 * math.sqrt(half) * ((x / half) ** (1 / 3) - 1 + 1 / (9 * half))
                if upper_wanted:
                    lead = half * math.log(x) - x - math.lgamma(half + 1) if x < half else 0.0
                    return -z * z / 2 + (min(lead, 0) if x < half else 0)
                tail = half * math.log(x / half) - x + half if x > half else 0.0
                return -z * z / 2 + tail + 0 * w

            value = integral(lambda z: npdf(z) * q(z), rough, -ncp, max(40.0, 3 * t - ncp))
            if not upper_wanted:
                value += ncdf(-mpf(ncp))
            mirrored = "noncentralTUpperTail" if upper_wanted else "noncentralTCdf"
            put(mirrored, [t, df, ncp], value)
            put("noncentralTCdf" if upper_wanted else "noncentralTUpperTail", [t, df, ncp], 1 - value)
            put("noncentralTCdf" if upper_wanted else "noncentralTUpperTail", [-t, df, -ncp], value)


def lower_gamma_quick(x, a):
    with mp.workdps(80):
        term = total = mpf(1)
        n = 0
        while term > total * mpf(10) ** -80:
            n += 1
            term = term * x / (a + n)
            total += term
        return total * exp(a * log(x) - x - loggamma(a + 1))


def kolmogorov(count):
    for _ in range(count):
        x = round(rnd.uniform(0.3, 8), 6)
        put("kolmogorovUpperTail", [x], 2 * sum((-1) ** (j - 1) * exp(-2 * j * j * mpf(x) ** 2) for j in range(1, 80)))


PARTS = {
    normal: 24,
    gamma: 24,
    beta: 30,
    student: 24,
    f_distribution: 20,
    binomial: 20,
    negative_binomial: 20,
    hypergeometric: 15,
    kolmogorov: 12,
    bivariate: 20,
    noncentral_t: 20,
}
for part, count in PARTS.items():
    # Each part has its own seed, so that one can be made anew without the others.
    rnd.seed(part.__name__)
    part(count)
print("[")
print(",\n".join(json.dumps(row) for row in rows))
print("]")
