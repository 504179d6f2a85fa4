"""Nitrogen in bottles as a real gas, by CoolProp: writes test/vectors/stock.

Run from the top of the repository:  python test/reference/stock/stock.py
"""

import json
import pathlib
import random

from CoolProp.CoolProp import PropsSI

FOLDER = pathlib.Path("test/vectors/stock")
R = 8.31446261815324
M = 28.0134e-3
V_M = R * 273.15 / 101325
rng = random.Random(1899)


def write(name, content):
    (FOLDER / name).write_text(json.dumps(content, indent="\t") + "\n", encoding="utf-8")


def moles(p, T):
    """Moles in a cubic metre; CoolProp counts in moles itself, so that its own molar mass does not matter."""
    return PropsSI("Dmolar", "T", T, "P", p, "Nitrogen")


def Z(p, T):
    return p / (moles(p, T) * R * T)


points = [(p * 1e5, round(t + 273.15, 2)) for t in (-20, 0, 15, 20, 30, 50) for p in (1.01325, 20, 50, 100, 150, 200, 250, 300)]
points += [(rng.uniform(1e5, 3.1e7), rng.uniform(253.15, 323.15)) for _ in range(60)]
write("nitrogen-compressibility.json", [{"p": p, "T": T, "Z": Z(p, T)} for p, T in points])

bottles = []
for n, litres, bar, least, celsius in [(1, 50, 200, 5, 15), (1, 50, 300, 5, 15), (12, 50, 185, 5, 15), (16, 80, 90, 10, -15), (1, 20000, 15, 5, 15)]:
    T, V = celsius + 273.15, n * litres / 1000
    high, low = moles(bar * 1e5 + 101325, T) * V, moles(least * 1e5 + 101325, T) * V
    bottles.append(
        {"bottles": n, "litres": litres, "bar": bar, "least": least, "celsius": celsius,
         "content": high * V_M, "usable": (high - low) * V_M, "mass": high * M}
    )
write("bottles.json", bottles)
