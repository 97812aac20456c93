"""Writes gated.json: maximum-likelihood curves of gated scores with 40 digits (mpmath).

Two equations, the partial derivatives of the log-likelihood itself, are solved for mean and ln sd by mpmath's multidimensional Newton; the
standard errors are from numerically differentiated second derivatives: another road than the implementation's single equation and closed
information. Data are invented. Run: python3 gated.py > gated.json
"""
import json, random
from mpmath import mp, mpf, log, exp, sqrt, diff, findroot, fsum, erfc, matrix

mp.dps = 40
rng = random.Random(19590801)


def case(name, scores, gate, below, start):
    x = [mpf(v) for v in scores]
    n, g = len(x), mpf(gate)
    total, squares = fsum(x), fsum(v * v for v in x)
    phi = lambda z: erfc(-z / sqrt(mpf(2))) / 2

    def loglik(mu, sd):
        counted = below * log(phi((g - mu) / sd)) if below else mpf(0)
        return counted - n * log(sd) - (squares - 2 * mu * total + n * mu * mu) / (2 * sd * sd)

    mu, logsd = findroot(
        lambda m, s: (diff(loglik, (m, exp(s)), (1, 0)), diff(loglik, (m, exp(s)), (0, 1))),
        (mpf(start[0]), log(mpf(start[1]))), tol=mpf(10) ** -40, maxsteps=200)
    sd = exp(logsd)
    info = -matrix([[diff(loglik, (mu, sd), (2, 0)), diff(loglik, (mu, sd), (1, 1))],
                    [diff(loglik, (mu, sd), (1, 1)), diff(loglik, (mu, sd), (0, 2))]])
    inverse = info**-1
    digits = lambda v: mp.nstr(v, 17)
    return {"name": name, "scores": scores, "gate": gate, "below": below, "mean": digits(mu), "sd": digits(sd),
            "meanError": digits(sqrt(inverse[0, 0])), "sdError": digits(sqrt(inverse[1, 1])),
            "logLikelihood": digits(loglik(mu, sd))}


def drawn(count, mean, sd, gate):
    kept, below = [], 0
    for _ in range(count):
        v = round(rng.gauss(mean, sd), 1)
        if v >= gate:
            kept.append(v)
        else:
            below += 1
    return kept, below


cases = []
for name, count, mean, sd, gate in [
    ("about 1 % below", 300, 70, 8, 51.4),
    ("a quarter below", 60, 70, 8, 65),
    ("about 70 % below", 120, 70, 8, 74.2),
    ("about 95 % below", 1000, 70, 8, 83.2),
    ("a negative scale", 50, -400, 25, -410),
]:
    scores, below = drawn(count, mean, sd, gate)
    cases.append(case(name, scores, gate, below, (mean, sd)))
cases.append(case("none below", [61.5, 70.2, 66.6, 80.1, 74.4], 60, 0, (70, 6)))
cases.append(case("two scores, 40 below", [81.0, 84.5], 80, 40, (72, 6)))
cases.append(case("one below a gate far away", [61.5, 70.2, 66.6, 80.1, 74.4], 0, 1, (55, 30)))
cases.append(case("a score at the gate", [60.0, 61.0, 63.5, 68.0, 72.5], 60, 3, (62, 7)))
print(json.dumps({"by": "gated.py", "with": "mpmath 1.3.0, 40 digits", "cases": cases}))
