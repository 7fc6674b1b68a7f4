"""Rows of independent.json: the same laws by two open libraries. Run: python independent.py > independent.json"""
import json
import fluids
import ht
from fluids.friction import Colebrook, Haaland, Swamee_Jain_1976, Churchill_1977
from fluids.packed_bed import Ergun, KTA
from ht.conv_internal import turbulent_Gnielinski, laminar_entry_thermal_Hausen, turbulent_Sieder_Tate, Nu_laminar_rectangular_Shan_London
from ht.conv_packed_bed import Nu_Wakao_Kagei, Nu_packed_bed_Gnielinski

rows = []
def row(fn, inputs, value, rtol, why):
    rows.append({"fn": fn, "inputs": inputs, "value": float(value), "rtol": rtol, "why": why})

for re in (5e3, 1e5, 3e7):
    for rr in (0.0, 1e-4, 0.02):
        i = {"reynolds": re, "relativeRoughness": rr}
        row("colebrook", i, Colebrook(re, rr), 1e-10, "the same equation solved another way")
        if rr:
            row("haaland", i, Haaland(re, rr), 1e-10, "the same formula")
            row("churchill", i, Churchill_1977(re, rr), 2e-3, "the constant 2.457 is printed with fewer digits in some places")
for re, pr in ((4e3, 0.7), (5e4, 7.0), (1e6, 50.0)):
    f = Colebrook(re, 0.0)
    row("gnielinski", {"reynolds": re, "prandtl": pr, "friction": f}, turbulent_Gnielinski(re, pr, f), 1e-10, "the same formula")
for gz in (2.0, 40.0, 1500.0):
    row("hausen", {"graetz": gz, "constant": 0.0668}, laminar_entry_thermal_Hausen(Re=gz, L=1.0, Di=1.0, Pr=1.0), 1e-10, "the same formula")
for a in (0.1, 0.25, 0.5, 1.0):
    row("ductNusseltFlux", {"aspect": a}, Nu_laminar_rectangular_Shan_London(a), 1e-10, "the same polynomial")
for re in (20.0, 300.0, 5000.0):
    row("wakao", {"reynolds": re, "prandtl": 0.7}, Nu_Wakao_Kagei(re, 0.7), 1e-10, "the same formula")
    row("gnielinskiBed", {"reynolds": re, "prandtl": 7.0, "voidFraction": 0.4}, Nu_packed_bed_Gnielinski(dp=1.0, voidage=0.4, vs=1.0, rho=re, mu=1.0, Pr=7.0), 1e-10, "the same formula")
for u in (0.01, 0.5):
    i = {"voidFraction": 0.4, "particleDiameter": 0.003, "viscosity": 18.1e-6, "density": 1.2, "speed": u}
    row("ktaGradient", i, KTA(dp=0.003, voidage=0.4, vs=u, rho=1.2, mu=18.1e-6, L=1.0), 1e-10, "the same formula")
    row("bedGradient", {**i, "drag": {"viscous": 150, "inertial": 1.75}}, Ergun(dp=0.003, voidage=0.4, vs=u, rho=1.2, mu=18.1e-6, L=1.0), 1e-10, "the same formula")
print(json.dumps({"source": f"fluids {fluids.__version__}, ht {ht.__version__} (PyPI)", "rows": rows}, indent=1))
