"""Decays with noise, fitted by scipy: the expected values of test/vectors/purge. See SOURCE.md for how to run it."""

import json
import math
import pathlib
import sys

import numpy
import scipy
from scipy import optimize, stats
from statsmodels.sandbox.stats.runs import runstest_1samp

FOLDER = pathlib.Path(sys.argv[1])
P = 0.95


def curve(t, floor, start, rate):
    return floor + (start - floor) * numpy.exp(-rate * t)


def jacobian(t, floor, start, rate):
    e = numpy.exp(-rate * t)
    return numpy.column_stack([1 - e, e, -(start - floor) * t * e])


def squares(parameters, t, C):
    return float(numpy.sum((C - curve(t, *parameters)) ** 2))


def held(index, value, t, C, guess):
    """Sum of squares with one parameter held and the others fitted anew; the rate is searched for in its logarithm."""
    if index == 2:
        e = numpy.exp(-value * t)
        design = numpy.column_stack([1 - e, e])
        rest = C - design @ numpy.linalg.lstsq(design, C, rcond=None)[0]
        return float(rest @ rest)

    def left(log_rate):
        e = numpy.exp(-math.exp(log_rate) * t)
        height = (e @ (C - value)) / (e @ e)
        rest = C - value - height * e
        return float(rest @ rest)

    grid = numpy.linspace(math.log(guess[2]) - 8, math.log(guess[2]) + 4, 601)
    best = grid[int(numpy.argmin([left(x) for x in grid]))]
    found = optimize.minimize_scalar(left, bounds=(best - 0.04, best + 0.04), method="bounded", options={"xatol": 1e-12})
    return float(found.fun)


def bound(index, sign, t, C, fit, error, allowed):
    step = error
    for _ in range(40):
        value = fit[index] + sign * step
        if index == 0 and step > 50 * (max(C) - min(C)):
            return None
        if index == 2 and value <= 1e-3 / (t[-1] - t[0]):
            return None
        if held(index, value, t, C, fit) > allowed:
            return optimize.brentq(
                lambda x: held(index, x, t, C, fit) - allowed, fit[index], value, xtol=1e-14, rtol=1e-13
            )
        step *= 1.3
    return None


def fit_of(t, C):
    guess = [C[-1], C[0], 2 / (t[-1] - t[0])]
    fit, spread = optimize.curve_fit(
        curve, t, C, p0=guess, jac=jacobian, method="lm", ftol=1e-15, xtol=1e-15, gtol=1e-15, maxfev=20000
    )
    n = len(t)
    ssr = squares(fit, t, C)
    errors = numpy.sqrt(numpy.diag(spread))
    allowed = ssr * (1 + stats.f.ppf(P, 1, n - 3) / (n - 3))
    rest = C - curve(t, *fit)
    r = float(numpy.sum(rest[1:] * rest[:-1]) / numpy.sum(rest**2))
    return {
        "Cf": float(fit[0]),
        "C0": float(fit[1]),
        "lambda": float(fit[2]),
        "SE": {"Cf": float(errors[0]), "C0": float(errors[1]), "lambda": float(errors[2])},
        "SSR": ssr,
        "t": float(stats.t.ppf((1 + P) / 2, n - 3)),
        "lambda bounds": [bound(2, sign, t, C, fit, errors[2], allowed) for sign in (-1, 1)],
        "Cf bounds": [bound(0, sign, t, C, fit, errors[0], allowed) for sign in (-1, 1)],
        "runs z": float(runstest_1samp(rest, cutoff=0, correction=False)[0]),
        "inflation": max(1.0, (1 + r) / (1 - r)),
    }


def write(name, case):
    lines = [f"\t{json.dumps(key)}: {json.dumps(value)}" for key, value in case.items()]
    FOLDER.joinpath(name + ".json").write_text("{\n" + ",\n".join(lines) + "\n}\n")


def rows(values, decimals):
    return [round(float(value), decimals) for value in values]


def decays():
    """name, seconds between samples, samples, true floor, start, rate [1/s], white noise, autoregression, decimals."""
    yield "sixteen-by-hand", 120, 16, 3.2, 20.95, 0.145 / 60, 0.08, 0, 2
    yield "eight-by-hand", 240, 8, 3.9, 20.9, 0.09 / 60, 0.06, 0, 1
    yield "ten-rows-of-a-quick-sheet", 180, 10, 4.4, 20.9, 0.06 / 60, 0.1, 0, 1
    yield "recorder-every-ten-seconds", 10, 270, 4.1, 20.9, 1 / 996, 0.09, 0, 3
    yield "recorder-autoregressive", 10, 270, 4.3, 20.9, 1 / 1056, 0.1, 0.55, 3
    yield "slow-filter-hopper", 20, 135, 4.55, 20.9, 1 / 1368, 0.17, 0.4, 2
    yield "fast-small-volume", 5, 60, 1.2, 20.9, 1 / 60, 0.05, 0, 2
    yield "very-quiet", 30, 60, 5.1, 20.95, 1 / 500, 0.002, 0, 4
    yield "very-noisy", 30, 60, 5.1, 20.95, 1 / 500, 0.6, 0, 2
    yield "floor-near-zero", 30, 80, 0.05, 20.95, 1 / 450, 0.03, 0, 3
    yield "high-floor-of-a-leaky-loop", 60, 40, 9.1, 20.9, 1 / 600, 0.1, 0, 2
    yield "short-span-of-one-exchange", 20, 45, 4.0, 20.9, 1 / 900, 0.05, 0, 3
    yield "short-span-bounds-open-below", 20, 30, 4.0, 20.9, 1 / 6000, 0.12, 0, 2
    yield "long-span-of-eight-exchanges", 60, 80, 3.0, 20.9, 1 / 600, 0.08, 0, 2
    yield "coarse-resolution", 15, 120, 4.2, 20.9, 1 / 700, 0.02, 0, 1
    yield "repeat-purge-from-eleven", 20, 90, 4.2, 11.3, 1 / 640, 0.07, 0.2, 2
    yield "few-and-far", 600, 9, 4.2, 20.9, 1 / 1500, 0.1, 0, 1
    yield "many-and-close", 2, 900, 4.6, 20.9, 1 / 400, 0.12, 0.8, 2
    yield "residuals-in-long-runs", 10, 200, 4.4, 20.9, 1 / 800, 0.05, 0.9, 3
    yield "first-half-only", 15, 64, 3.4, 20.9, 1 / 800, 0.08, 0, 2
    yield "uneven-times", 0, 50, 4.2, 20.9, 1 / 700, 0.07, 0, 2
    yield "carbon-dioxide-two-per-cent-oxygen", 30, 70, 2.6, 20.9, 1 / 520, 0.06, 0, 2
    yield "nearly-a-step", 30, 40, 4.0, 20.9, 1 / 45, 0.08, 0, 2
    yield "minutes-of-a-large-silo", 300, 48, 6.2, 20.9, 1 / 4200, 0.09, 0.3, 2


def main():
    chance = numpy.random.default_rng(20260311)
    for name, step, n, floor, start, rate, noise, like, decimals in decays():
        t = numpy.arange(n) * float(step) if step else numpy.sort(chance.uniform(0, 2500, n)).round(0)
        white = chance.normal(0, noise, n)
        error = numpy.zeros(n)
        for i in range(n):
            error[i] = (like * error[i - 1] if i else 0) + white[i]
        C = rows(curve(t, floor, start, rate) + error, decimals)
        write(
            name,
            {
                "desc": f"truth: floor {floor}, start {start}, rate {rate:.6g} 1/s; noise {noise}, autoregression {like}",
                "t": rows(t, 0),
                "C": C,
                "expect": fit_of(t, numpy.array(C)),
            },
        )
    write(
        "quantiles",
        {
            "desc": "scipy.stats.t.ppf(p, nu) and scipy.stats.f.ppf(p, d1, d2)",
            "t": [
                [p, nu, float(stats.t.ppf(p, nu))]
                for p in (0.025, 0.6, 0.9, 0.95, 0.975, 0.995, 0.9995)
                for nu in (1, 2, 3, 4, 5, 6.5, 10, 13, 30.25, 100, 897, 5000)
            ],
            "f": [
                [p, d1, d2, float(stats.f.ppf(p, d1, d2))]
                for p in (0.05, 0.5, 0.9, 0.95, 0.99)
                for d1 in (1, 2, 3, 7)
                for d2 in (1, 2, 5, 13, 60.5, 897)
            ],
        },
    )
    print(f"scipy {scipy.__version__}, numpy {numpy.__version__}")


main()
