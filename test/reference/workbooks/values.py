"""What the functions give, by SciPy: the values that the workbooks beside this file hold. It shares no code with the program under test."""

import statistics

from scipy import stats

# Invented: a town library scores second-hand bookcases offered to it, 0 to 100. The 14th was never scored.
SCORES = [
    61.5, 70.0, 55.5, 82.0, 66.5, 73.0, 48.0, 69.0, 77.5, 62.0,
    58.5, 84.5, 71.5, None, 64.0, 75.5, 67.0, 60.5, 79.0, 52.5,
    68.0, 72.5, 65.5, 57.0, 81.0, 63.5, 74.0, 59.5, 70.5, 66.0,
    76.0, 54.0, 69.5, 78.0, 62.5, 71.0, 56.5, 80.0, 64.5, 67.5,
]  # fmt: skip


def curve(scores, blank=None):
    used = [blank if score is None else score for score in scores if score is not None or blank is not None]
    return len(used), statistics.fmean(used), statistics.stdev(used)


def top_fraction_cutoff(scores, fraction, blank=None):
    _, mean, sd = curve(scores, blank)
    return mean + float(stats.norm.isf(fraction)) * sd


def bound(scores, fraction, confidence):
    """The mark that lies above the true one with this confidence: x̄ + ks, k by the noncentral t."""
    n, mean, sd = curve(scores)
    root = n**0.5
    return mean + float(stats.nct.ppf(confidence, n - 1, stats.norm.isf(fraction) * root)) / root * sd


def cutoff_limits(scores, fraction, confidence=0.95):
    outside = (1 - confidence) / 2
    return [
        ["lower limit", bound(scores, fraction, outside)],
        ["cutoff", top_fraction_cutoff(scores, fraction)],
        ["upper limit", bound(scores, fraction, 1 - outside)],
    ]


def next_score_cutoff(scores, fraction):
    n, mean, sd = curve(scores)
    return mean + float(stats.t.isf(fraction, n - 1)) * sd * (1 + 1 / n) ** 0.5


def tail_fraction(cutoff, mean, sd):
    return float(stats.norm.sf((cutoff - mean) / sd))


def hit_chance(fraction, trials, hits=1):
    return float(stats.binom.sf(hits - 1, trials, fraction))


def expected_trials(fraction, hits=1):
    return hits / fraction
