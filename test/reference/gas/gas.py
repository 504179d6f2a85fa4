"""Gas mixture properties by CoolProp and chemicals: writes test/vectors/gas.

Run from the top of the repository:  python test/reference/gas/gas.py

pure.json: heat capacity and viscosity of each pure gas, straight from CoolProp, against which our fits stand.
mixture.json: the mixing rules by other programs, Wilke by chemicals, on CoolProp's pure gases.
"""

import json
import pathlib

from chemicals.viscosity import Wilke
from CoolProp.CoolProp import PropsSI

FOLDER = pathlib.Path("test/vectors/gas")
R = 8.31446261815324
FLUID = {"N2": "Nitrogen", "O2": "Oxygen", "CO2": "CarbonDioxide", "CO": "CarbonMonoxide", "H2O": "Water", "Ar": "Argon"}
# kg/mol, the standard atomic weights that constants@1 uses; CoolProp's own differ by up to 7 ppm.
MOLAR_MASS = {"N2": 28.0134, "O2": 31.9988, "CO2": 44.0095, "CO": 28.0101, "H2O": 18.01528, "Ar": 39.948}


def heat_capacity(gas, T):
    return PropsSI("Cp0molar", "T", T, "P", 100, FLUID[gas])


def viscosity(gas, T):
    # CoolProp has no viscosity of carbon monoxide. Water below its boiling point is taken as vapour at 100 Pa.
    if gas == "CO":
        return viscosity("N2", T)
    return PropsSI("V", "T", T, "P", 100 if gas == "H2O" else 101325, FLUID[gas])


def write(name, content):
    (FOLDER / name).write_text(json.dumps(content, indent="\t") + "\n", encoding="utf-8")


temperatures = [274, 293.15, 323.15, 353.15, 368.15, 393.15, 423.15, 473.15, 523.15, 573.15, 623]
write(
    "pure.json",
    [
        {"gas": gas, "T": T, "cp0": heat_capacity(gas, T), "viscosity": viscosity(gas, T)}
        for gas in FLUID
        for T in temperatures
    ],
)

mixtures = [
    ("circuit gas", {"N2": 0.62, "CO2": 0.1, "O2": 0.08, "H2O": 0.2}, 368.15),
    ("air", {"N2": 0.7812, "O2": 0.2096, "Ar": 0.0092}, 293.15),
    ("carbon dioxide as inert gas", {"N2": 0.1, "CO2": 0.8, "O2": 0.02, "H2O": 0.08}, 353.15),
    ("with carbon monoxide", {"N2": 0.55, "CO2": 0.12, "O2": 0.06, "H2O": 0.26, "Ar": 0.006, "CO": 0.004}, 363.15),
    ("hot gas", {"N2": 0.62, "CO2": 0.1, "O2": 0.08, "H2O": 0.2}, 523.15),
]
write(
    "mixture.json",
    [
        {
            "name": name,
            "x": x,
            "T": T,
            "M": sum(x[gas] * MOLAR_MASS[gas] for gas in x) / 1000,
            "kappa": (cp := sum(x[gas] * heat_capacity(gas, T) for gas in x)) / (cp - R),
            "viscosity": Wilke(list(x.values()), [viscosity(gas, T) for gas in x], [MOLAR_MASS[gas] for gas in x]),
        }
        for name, x, T in mixtures
    ],
)

dry_air = PropsSI("D", "T", 293.15, "P", 101325, "Air")
write("density.json", [{"gas": "air", "T": 293.15, "p": 101325, "M": 0.02896546, "rho": dry_air}])
