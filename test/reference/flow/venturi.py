"""Venturi cases by fluids: recomputes the expected values of test/vectors/venturi from their inputs.

Run from the top of the repository:  python test/reference/flow/venturi.py
fluids knows the equation, not the limits of ISO 5167-4; `outside` is worked out here from the limits of the 2003 edition.
"""

import json
import math
import pathlib
import random

from fluids.flow_meter import (
    differential_pressure_meter_C_epsilon,
    differential_pressure_meter_solver,
    dP_venturi_tube,
)

FOLDER = pathlib.Path("test/vectors/venturi")
R = 8.31446261815324
MOLAR_MASS = {"N2": 28.0134, "O2": 31.9988, "CO2": 44.0095, "CO": 28.0101, "H2O": 18.01528, "Ar": 39.948}
METER = {
    "as_cast": "as cast convergent venturi tube",
    "machined": "machined convergent venturi tube",
    "rough_welded": "rough welded convergent venturi tube",
}
# ISO 5167-4:2003, 5.5.2 to 5.5.4: D [m], beta, Re_D.
LIMITS = {
    "as_cast": {"D": (0.1, 0.8), "beta": (0.3, 0.75), "Re_D": (2e5, 2e6)},
    "machined": {"D": (0.05, 0.25), "beta": (0.4, 0.75), "Re_D": (2e5, 1e6)},
    "rough_welded": {"D": (0.2, 1.2), "beta": (0.4, 0.7), "Re_D": (2e5, 2e6)},
}


def expected(kind, inputs):
    D, d, p1, dp = inputs["D"], inputs["d"], inputs["p1"], inputs["dp"]
    rho, mu, kappa = inputs["rho1"], inputs["mu"], inputs["kappa"]
    meter = METER[kind]
    qm = differential_pressure_meter_solver(D=D, D2=d, P1=p1, P2=p1 - dp, rho=rho, mu=mu, k=kappa, meter_type=meter)
    C, epsilon = differential_pressure_meter_C_epsilon(
        D=D, D2=d, m=qm, P1=p1, P2=p1 - dp, rho=rho, mu=mu, k=kappa, meter_type=meter
    )
    beta = d / D
    re = 4 * qm / (math.pi * mu * D)
    out = {
        "qm": qm,
        "qv": qm / rho,
        "v": qm / rho / (math.pi * D * D / 4),
        "Re_D": re,
        "C": C,
        "epsilon": epsilon,
        "tau": (p1 - dp) / p1,
        "permanent_loss": dP_venturi_tube(D=D, Do=d, P1=p1, P2=p1 - dp),
    }
    x = inputs.get("x")
    if x:
        molar_mass = sum(x[gas] * MOLAR_MASS[gas] for gas in x) / 1000
        out["M"] = molar_mass
        out["qn_wet"] = qm / molar_mass * R * 273.15 / 101325
        out["qn_dry"] = out["qn_wet"] * (1 - x.get("H2O", 0))
    limits = LIMITS[kind]
    found = {"D": D, "beta": beta, "Re_D": re}
    out["outside"] = [name for name, value in found.items() if not limits[name][0] * (1 - 1e-12) <= value <= limits[name][1] * (1 + 1e-12)]
    if out["tau"] < 0.75:
        out["outside"].append("tau")
    return out


def random_inputs(rng):
    kind = rng.choice(list(METER))
    (D_min, D_max), (b_min, b_max) = LIMITS[kind]["D"], LIMITS[kind]["beta"]
    D = rng.uniform(D_min, D_max)
    water, carbon_dioxide, oxygen = rng.uniform(0, 0.35), rng.uniform(0, 0.3), rng.uniform(0, 0.12)
    x = {"CO2": carbon_dioxide, "O2": oxygen, "H2O": water, "N2": 1 - water - carbon_dioxide - oxygen}
    T, p1 = rng.uniform(353.15, 573.15), rng.uniform(80e3, 900e3)
    molar_mass = sum(x[gas] * MOLAR_MASS[gas] for gas in x) / 1000
    return kind, {
        "D": D,
        "d": D * rng.uniform(b_min, b_max),
        "p1": p1,
        "dp": p1 * 10 ** rng.uniform(-3, math.log10(0.24)),
        "T": T,
        "x": x,
        "rho1": p1 * molar_mass / (R * T),
        "mu": rng.uniform(1.6e-5, 2.9e-5),
        "kappa": rng.uniform(1.2, 1.5),
    }


def write(path, content):
    path.write_text(json.dumps(content, indent="\t", ensure_ascii=False) + "\n", encoding="utf-8")


for path in sorted(FOLDER.glob("V*.json")):
    case = json.loads(path.read_text(encoding="utf-8"))
    case["expect"] = expected(case["type"], case["inputs"])
    write(path, case)

rng = random.Random(5167)
cases = []
while len(cases) < 40:
    kind, inputs = random_inputs(rng)
    result = expected(kind, inputs)
    # Below the limit fluids keeps C constant, which the standard does not; and moist gas must not be below its dew point.
    if result["Re_D"] >= 2e5 and inputs["x"]["H2O"] * inputs["p1"] < 47e3:
        cases.append({"type": kind, "inputs": inputs, "expect": result})
write(FOLDER / "random.json", cases)

# The way back: the difference pressure or the throat for 80 % of the flow.
inverse = []
for name in ("V05", "V07", "V12", "V16"):
    case = json.loads(next(FOLDER.glob(f"{name}*.json")).read_text(encoding="utf-8"))
    i, meter = case["inputs"], METER[case["type"]]
    qm = 0.8 * case["expect"]["qm"]
    gas = {"rho": i["rho1"], "mu": i["mu"], "k": i["kappa"]}
    p2 = differential_pressure_meter_solver(D=i["D"], D2=i["d"], P1=i["p1"], P2=None, m=qm, meter_type=meter, **gas)
    d = differential_pressure_meter_solver(D=i["D"], D2=None, P1=i["p1"], P2=i["p1"] - i["dp"], m=qm, meter_type=meter, **gas)
    inverse.append({"of": name, "C": case["expect"]["C"], "inputs": i, "qm": qm, "dp": i["p1"] - p2, "d": d})
write(FOLDER / "inverse.json", inverse)

# Expansibility alone, with exponents at and near one; kappa = 1 is the limit form of fluids.
from fluids.flow_meter import nozzle_expansibility

write(
    FOLDER / "expansibility.json",
    [
        {"beta": beta, "tau": tau, "kappa": kappa, "epsilon": nozzle_expansibility(D=1, Do=beta, P1=1e5, P2=tau * 1e5, k=kappa)}
        for beta in (0.3, 0.5, 0.6, 0.75)
        for tau in (0.75, 0.9, 0.99, 0.999)
        for kappa in (1, 1.1, 1.285, 1.4, 1.667)
    ],
)
