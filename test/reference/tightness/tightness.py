"""False air by its two balances and pressure decay in exact fractions: writes test/vectors/tightness.

Run from the top of the repository:  python test/reference/tightness/tightness.py
"""

import json
import pathlib
from fractions import Fraction

from scipy.optimize import brentq
from uncertainties import ufloat

FOLDER = pathlib.Path("test/vectors/tightness")
AIR = 0.2095


def write(name, content):
    (FOLDER / name).write_text(json.dumps(content, indent="\t") + "\n", encoding="utf-8")


def leak(before, after):
    """The air that has to be mixed to one part of dry gas until its oxygen is what was read after."""
    return brentq(lambda r: (before + r * AIR) / (1 + r) - after, -0.9, 1e3, xtol=1e-15)


cases = []
for before, after, u in [(6, 7, 0.2), (5, 8, 0.2), (8, 10, 0.1), (3, 4.5, 0.2), (10, 10.5, 0.2), (0.4, 12, 0.3)]:
    b, a = ufloat(before / 100, u / 100), ufloat(after / 100, u / 100)
    r = (a - b) / (AIR - a)
    solved = leak(before / 100, after / 100)
    cases.append({"before": before, "after": after, "U": u, "falseAir": solved, "ofOutlet": solved / (1 + solved), "UFalseAir": r.s})
write("false-air.json", cases)

decays = []
for p1, T1, p2, T2, V, t in [
    ("103300", "293.15", "102770", "293.75", "500", "3600"),
    ("103300", "293.15", "102770", "293.15", "500", "3600"),
    ("103300", "293.15", "103300", "293.25", "500", "3600"),
    ("150000", "293.15", "149000", "292.15", "12", "86400"),
]:
    p1, T1, p2, T2, V, t = map(Fraction, (p1, T1, p2, T2, V, t))
    drop = p1 - p2 * T1 / T2
    amount = lambda p, T: V * p / Fraction(101325) * Fraction("273.15") / T
    decays.append(
        {
            "p1": float(p1), "T1": float(T1), "p2": float(p2), "T2": float(T2), "V": float(V), "t": float(t),
            "correctedDrop": float(drop),
            "lost": float(drop / p1),
            "hourlyRate": float((p1 * T2 / (p2 * T1) - 1) / t),
            "leak": float((amount(p1, T1) - amount(p2, T2)) / t),
        }
    )
write("pressure-decay.json", decays)
