"""Saturation, sublimation and dew points by iapws, humidity by psychrolib, acid dew points: writes test/vectors/moisture.

Run from the top of the repository:  python test/reference/moisture/moisture.py
"""

import json
import math
import pathlib
import random

import psychrolib
from iapws._iapws import _Sublimation_Pressure
from iapws.iapws97 import _PSat_T, _TSat_P
from scipy.optimize import brentq

FOLDER = pathlib.Path("test/vectors/moisture")
P_TRIPLE = 611.657
rng = random.Random(1997)


def write(name, content):
    (FOLDER / name).write_text(json.dumps(content, indent="\t") + "\n", encoding="utf-8")


def dew_point(x, p):
    """Kelvin and which: over water from the triple point up, over ice below."""
    partial = x * p
    if partial >= P_TRIPLE:
        return _TSat_P(partial / 1e6), "dew"
    return brentq(lambda T: _Sublimation_Pressure(T) * 1e6 / partial - 1, 50, 273.16, xtol=1e-10), "frost"


temperatures = [273.15, 273.16, 278.15, 283.15, 293.15, 303.15, 313.15, 323.15, 333.15, 343.15, 353.15, 363.15, 373.15, 383.15, 393.15]
temperatures += [rng.uniform(273.15, 647) for _ in range(40)]
write("saturation-pressure.json", [{"T": T, "p": _PSat_T(T) * 1e6} for T in temperatures])

pressures = [10 ** rng.uniform(2.787, 7.34) for _ in range(40)]
write("saturation-temperature.json", [{"p": p, "T": _TSat_P(p / 1e6)} for p in pressures])

ice = [230, 243.15, 253.15, 263.15, 273.15, 273.16] + [rng.uniform(50, 273.16) for _ in range(20)]
write("sublimation-pressure.json", [{"T": T, "p": _Sublimation_Pressure(T) * 1e6} for T in ice])

gases = [(x, 101325) for x in (0.02, 0.05, 0.1, 0.12, 0.15, 0.2, 0.25, 0.3, 0.4, 0.005, 0.001, 0.0001)]
gases += [(0.2, 98500), (0.25, 84000), (0.01, 700000)]
gases += [(10 ** rng.uniform(-4, -0.3), rng.uniform(80e3, 900e3)) for _ in range(40)]
write("dew-point.json", [{"x": x, "p": p, "T": dew_point(x, p)[0], "kind": dew_point(x, p)[1]} for x, p in gases])

psychrolib.SetUnitSystem(psychrolib.SI)
write(
    "humidity-ratio-of-air.json",
    [{"Y": Y, "p": 101325, "p_w": psychrolib.GetVapPresFromHumRatio(Y, 101325)} for Y in (0.005, 0.02, 0.1, 0.25)],
)

# Acid dew points have no reference library. Both correlations written once more, in atmospheres and other variables:
# Verhoff and Banchero in its atmosphere form (from memory, verify), Okkes as published.


def verhoff_banchero_atm(w, a):
    return 1000 / (1.7842 + 0.0269 * math.log10(w) - 0.1029 * math.log10(a) + 0.0329 * math.log10(w) * math.log10(a))


def okkes(w, a):
    return 476.4 + 27.6 * math.log10(w) + 10.83 * math.log10(a) + 1.06 * pow(math.log10(a) + 8, 2.19)


write(
    "acid-dew-point.json",
    [
        {"water_atm": w, "acid_atm": a, "verhoff_banchero": verhoff_banchero_atm(w, a), "okkes": okkes(w, a)}
        for w, a in [(0.05, 1e-6), (0.1, 1e-6), (0.1, 5e-6), (0.1, 1e-5), (0.1, 5e-5), (0.15, 1e-5), (0.2, 2e-5), (0.25, 1e-5), (0.12, 1e-4)]
    ],
)
